package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.ObjectInputStream;
import java.io.ObjectOutputStream;
import java.io.ObjectStreamClass;
import java.lang.reflect.Field;
import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Emitted classes are compiled, run, and compared with the program that they were made from. */
class KernelEmitterTest {

    private static final double[] POINT = {0.3, 6.25, 1.1, -2.0};

    @ParameterizedTest
    @EnumSource(Layout.class)
    void everyFormOfEvaluationGivesTheValuesOfTheProgram(Layout layout) {
        KernelModel model = Schwarzschild.christoffel(layout);
        CompiledKernel kernel = CompiledKernel.of(model);
        double[] values = Schwarzschild.values(model.program(), 1.25, POINT);
        List<Integer> slots = model.results().get(0).slots();
        double[] expected = slots.stream()
                .mapToDouble(slot -> slot < 0 ? 0.0 : values[slot])
                .toArray();
        assertThat(kernel.constant("LENGTH")).isEqualTo(expected.length);
        Object created = kernel.create(1.25);
        assertThat((double[]) kernel.call(created, "valuesAt", (Object) POINT)).isEqualTo(expected);
        double[] result = new double[expected.length];
        Arrays.fill(result, Double.NaN);
        kernel.call(created, "evaluate", POINT, result);
        assertThat(result).isEqualTo(expected);
        Arrays.fill(result, Double.NaN);
        kernel.call(created, "evaluateScalars", 0.3, 6.25, 1.1, -2.0, result);
        assertThat(result).isEqualTo(expected);
        double[] points = {7, 7, 0.3, 6.25, 1.1, -2.0};
        double[] results = new double[expected.length + 3];
        kernel.call(created, "evaluateAt", points, 2, results, 3);
        assertThat(Arrays.copyOfRange(results, 3, results.length)).isEqualTo(expected);
        assertThat(Arrays.copyOf(results, 3)).containsExactly(0, 0, 0);
    }

    @ParameterizedTest
    @EnumSource(Layout.class)
    void indexFindsEveryComponent(Layout layout) {
        KernelModel model = Schwarzschild.christoffel(layout);
        CompiledKernel kernel = CompiledKernel.of(model);
        List<Integer> full =
                Schwarzschild.christoffel(Layout.FULL).results().get(0).slots();
        List<Integer> slots = model.results().get(0).slots();
        for (int k = 0; k < 4; k++) {
            for (int i = 0; i < 4; i++) {
                for (int j = 0; j < 4; j++) {
                    int index = (int) kernel.call(null, "index", k, i, j);
                    int wanted = full.get((k * 4 + i) * 4 + j);
                    assertThat(index < 0 ? -1 : slots.get(index)).isEqualTo(wanted);
                    assertThat(kernel.call(null, "index", k, j, i))
                            .isEqualTo(layout == Layout.FULL ? (k * 4 + j) * 4 + i : index);
                }
            }
        }
        assertThatThrownBy(() -> kernel.call(null, "index", 0, 4, 0)).isInstanceOf(IndexOutOfBoundsException.class);
        assertThatThrownBy(() -> kernel.call(null, "index", -1, 0, 0)).isInstanceOf(IndexOutOfBoundsException.class);
    }

    @Test
    void packedAndFullPositionsAreThoseOfTheContract() {
        CompiledKernel packed = CompiledKernel.of(Schwarzschild.christoffel(Layout.PACKED));
        assertThat(packed.constant("LENGTH")).isEqualTo(40);
        assertThat(packed.call(null, "index", 2, 1, 3)).isEqualTo(2 * 10 + 3 * 4 / 2 + 1);
        CompiledKernel full = CompiledKernel.of(Schwarzschild.christoffel(Layout.FULL));
        assertThat(full.constant("LENGTH")).isEqualTo(64);
        assertThat(full.call(null, "index", 2, 1, 3)).isEqualTo((2 * 4 + 1) * 4 + 3);
    }

    @Test
    void evaluateExistsOnce() {
        CompiledKernel kernel = CompiledKernel.of(Schwarzschild.christoffel(Layout.FULL));
        assertThat(Arrays.stream(kernel.type.getMethods()).map(Method::getName).filter("evaluate"::equals))
                .hasSize(1);
    }

    @Test
    void wrongLengthsAreToldWithBothLengths() {
        CompiledKernel kernel = CompiledKernel.of(Schwarzschild.christoffel(Layout.FULL));
        Object created = kernel.create();
        assertThatThrownBy(() -> kernel.call(created, "evaluate", new double[3], new double[64]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("point has length 3, not the required 4");
        assertThatThrownBy(() -> kernel.call(created, "evaluate", new double[4], new double[63]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("christoffel has length 63, not the required 64");
        assertThatThrownBy(() -> kernel.call(created, "inDomain", (Object) new double[5]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("point has length 5, not the required 4");
    }

    @Test
    void aResultMayBeAnInput() {
        TestModel recipe = RandomModels.model(11, 4, 120, 0, Layout.FULL, Quantity.GEODESIC_ACCELERATION);
        CompiledKernel kernel = CompiledKernel.of(recipe.build());
        Object created = kernel.create(0.5, 0.25);
        double[] point = {0.1, 0.2, 0.3, 0.4};
        double[] velocity = {1.1, 1.2, 1.3, 1.4};
        double[] expected = (double[]) kernel.call(created, "valuesAt", point, velocity);
        double[] shared = velocity.clone();
        kernel.call(created, "evaluate", point, shared, shared);
        assertThat(shared).isEqualTo(expected);
        shared = point.clone();
        kernel.call(created, "evaluate", shared, velocity, shared);
        assertThat(shared).isEqualTo(expected);
        double[] all = {0.1, 0.2, 0.3, 0.4, 1.1, 1.2, 1.3, 1.4};
        kernel.call(created, "evaluateAt", all, 0, all, 4, all, 2);
        assertThat(Arrays.copyOfRange(all, 2, 6)).isEqualTo(expected);
    }

    @Test
    void conditionsOnParametersAreTestedByTheConstructor() {
        CompiledKernel kernel = CompiledKernel.of(Schwarzschild.christoffel(Layout.FULL));
        for (double mass : new double[] {0.0, -1.0, Double.NaN}) {
            assertThatThrownBy(() -> kernel.create(mass))
                    .isInstanceOf(IllegalArgumentException.class)
                    .hasMessage("the parameters do not meet the condition M > 0: M = " + mass);
        }
    }

    @Test
    void otherConditionsAreTestedAtAPoint() {
        CompiledKernel kernel = CompiledKernel.of(Schwarzschild.christoffel(Layout.FULL));
        Object created = kernel.create(1.0);
        assertThat(inDomain(kernel, created, 2.5, 1.0)).isTrue();
        assertThat(inDomain(kernel, created, 2.0, 1.0)).isFalse();
        assertThat(inDomain(kernel, created, 2.5, 0.0)).isFalse();
        assertThat(inDomain(kernel, created, 2.5, Math.PI)).isFalse();
        assertThat(inDomain(kernel, created, Double.NaN, 1.0)).isFalse();
        assertThat(inDomain(kernel, created, 2.5, Double.NaN)).isFalse();
    }

    private static boolean inDomain(CompiledKernel kernel, Object created, double r, double theta) {
        return (boolean) kernel.call(created, "inDomain", (Object) new double[] {0, r, theta, 0});
    }

    @Test
    void objectsSurviveSerialisationAndHoldNothingThatChanges() throws Exception {
        CompiledKernel kernel = CompiledKernel.of(Schwarzschild.christoffel(Layout.FULL));
        Object created = kernel.create(1.25);
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ObjectOutputStream out = new ObjectOutputStream(bytes)) {
            out.writeObject(created);
        }
        Object copy = read(kernel, bytes.toByteArray());
        assertThat(copy).isNotSameAs(created);
        assertThat(kernel.call(copy, "valuesAt", (Object) POINT))
                .isEqualTo(kernel.call(created, "valuesAt", (Object) POINT));
        for (Field field : kernel.type.getDeclaredFields()) {
            assertThat(Modifier.isFinal(field.getModifiers()))
                    .as(field.toString())
                    .isTrue();
        }
    }

    @Test
    void aForgedStreamMeetsTheConstructorsConditions() throws Exception {
        CompiledKernel kernel = CompiledKernel.of(Schwarzschild.christoffel(Layout.FULL));
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ObjectOutputStream out = new ObjectOutputStream(bytes)) {
            out.writeObject(kernel.create(1.25));
        }
        byte[] forged = bytes.toByteArray();
        // the one number in the stream is its last eight bytes
        java.nio.ByteBuffer.wrap(forged).putDouble(forged.length - 8, -1.25);
        assertThatThrownBy(() -> read(kernel, forged))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("M > 0");
    }

    private static Object read(CompiledKernel kernel, byte[] bytes) throws IOException, ClassNotFoundException {
        try (ObjectInputStream in = new ObjectInputStream(new ByteArrayInputStream(bytes)) {
            @Override
            protected Class<?> resolveClass(ObjectStreamClass description) throws ClassNotFoundException {
                return Class.forName(description.getName(), false, kernel.type.getClassLoader());
            }
        }) {
            return in.readObject();
        }
    }

    @Test
    void serialVersionDependsOnTheDefinition() {
        TestModel model = new TestModel();
        model.coordinates = List.of("x");
        model.result(Quantity.METRIC, model.program.coordinate("x", 0));
        long version = new DefinitionText(model.build().definition()).serialVersion();
        model.title = "another title";
        assertThat(new DefinitionText(model.build().definition()).serialVersion())
                .isEqualTo(version);
        model.parameter("b", null);
        assertThat(new DefinitionText(model.build().definition()).serialVersion())
                .isNotEqualTo(version);
    }

    @Test
    void withoutADefaultThereIsNoConstructorWithoutArguments() {
        TestModel model = new TestModel();
        model.coordinates = List.of("x");
        model.parameter("a", TestModel.number("1")).parameter("b", null);
        model.result(Quantity.METRIC, model.program.coordinate("x", 0));
        CompiledKernel kernel = CompiledKernel.of(model.build());
        assertThat(kernel.type.getConstructors()).hasSize(1);
        assertThat(kernel.type.getConstructors()[0].getParameterCount()).isEqualTo(2);
    }
}
