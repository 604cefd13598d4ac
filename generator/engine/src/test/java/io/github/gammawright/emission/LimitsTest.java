package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import io.github.gammawright.definition.MetricDefinition.Comparison;
import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/**
 * Whatever there is much of, the class stays within what class files and the just-in-time compiler take: every class
 * that {@link CompiledKernel} compiles is held to 7,000 bytecodes a method. Limits: Lindholm et al., The Java Virtual
 * Machine Specification, Java SE 17 (2021), section 4.11.
 */
class LimitsTest {

    private static List<String> coordinates(int n) {
        return IntStream.range(0, n).mapToObj(i -> "x" + i).toList();
    }

    @Test
    void muchWorkOnParametersGoesIntoAnArray() {
        TestModel model = new TestModel();
        model.coordinates = coordinates(2);
        model.parameter("a", TestModel.number("0.3")).parameter("b", TestModel.number("0.2"));
        TestProgram p = model.program;
        int x = p.coordinate("x0", 0);
        int value = p.add(p.parameter("a", 0), p.constant(1));
        int sum = x;
        for (int i = 0; i < 1500; i++) {
            value = p.add(
                    p.multiply(value, p.parameter("b", 1)), p.call(RealFunction.SIN, p.add(value, p.constant(i))));
            sum = i % 3 == 0 ? p.add(p.multiply(sum, p.constant(1, 2)), p.multiply(value, x)) : sum;
        }
        int parameterValue = value;
        model.result(Quantity.CHRISTOFFEL_TRACE, sum, parameterValue);
        TestProgram d = model.domain;
        for (int i = 0; i < 120; i++) {
            int power = d.parameter("b", 1);
            for (int k = 0; k < 40; k++) {
                power = d.add(d.multiply(power, d.parameter("a", 0)), d.constant(i + 1, 1000));
            }
            model.condition(power, Comparison.LESS, d.constant(5 - (i == 119 ? 4 : 0)), "condition " + i);
        }
        KernelModel built = model.build();
        CompiledKernel kernel = CompiledKernel.of(built);
        double[] point = {0.25, 0};
        double[] expected = DoubleInterpreter.run(
                built.program(),
                symbol -> symbol.kind() == Symbol.Kind.COORDINATE
                        ? point[symbol.index()]
                        : symbol.index() == 0 ? 0.3 : 0.2);
        assertThat((double[]) kernel.call(kernel.create(), "valuesAt", (Object) point))
                .containsExactly(expected[sum], expected[parameterValue]);
        assertThatThrownBy(() -> kernel.create(0.9, 0.2))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("condition 119: ");
    }

    @Test
    void manyConditionsAreSplit() {
        TestModel model = new TestModel();
        model.coordinates = coordinates(16);
        model.parameter("a", null);
        model.result(Quantity.VOLUME_ELEMENT, model.program.coordinate("x0", 0));
        TestProgram d = model.domain;
        Random random = new Random(5);
        List<Integer> values = new ArrayList<>();
        for (int i = 0; i < 16; i++) {
            values.add(d.coordinate("x" + i, i));
        }
        for (int i = 0; i < 250; i++) {
            int value = values.get(random.nextInt(values.size()));
            for (int k = 0; k < 20; k++) {
                value = d.add(d.multiply(value, d.coordinate("x" + k % 16, k % 16)), d.parameter("a", 0));
            }
            values.add(value);
            model.condition(values.get(i % 16), Comparison.LESS_OR_EQUAL, value, "condition " + i);
        }
        KernelModel built = model.build();
        CompiledKernel kernel = CompiledKernel.of(built);
        Object created = kernel.create(0.5);
        int inside = 0;
        for (int trial = 0; trial < 50; trial++) {
            double[] point = random.doubles(16, trial % 2 == 0 ? 0 : -1, 1).toArray();
            double[] v = DoubleInterpreter.run(
                    built.domain().program(),
                    symbol -> symbol.kind() == Symbol.Kind.COORDINATE ? point[symbol.index()] : 0.5);
            boolean expected = built.domain().conditions().stream()
                    .allMatch(c -> v[c.operands().get(0)] <= v[c.operands().get(1)]);
            assertThat(kernel.call(created, "inDomain", (Object) point)).isEqualTo(expected);
            inside += expected ? 1 : 0;
        }
        assertThat(inside).isBetween(1, 49);
    }

    @Test
    void moreInputsThanArgumentsGoThroughMemory() {
        for (int operations : new int[] {100, 3000}) {
            TestModel model = RandomModels.model(3, 16, operations, 40, Layout.FULL, Quantity.GEODESIC_ACCELERATION);
            KernelModel built = model.build();
            CompiledKernel kernel = CompiledKernel.of(built);
            double[] point = new Random(1).doubles(16).toArray();
            double[] velocity = new Random(2).doubles(16).toArray();
            double[] v = DoubleInterpreter.run(built.program(), symbol -> switch (symbol.kind()) {
                case COORDINATE -> point[symbol.index()];
                case VELOCITY -> velocity[symbol.index()];
                default -> 0.75;
            });
            double[] expected = built.results().get(0).slots().stream()
                    .mapToDouble(slot -> slot < 0 ? 0 : v[slot])
                    .toArray();
            kernel.call(kernel.create(), "evaluate", point, velocity, velocity);
            assertThat(velocity).isEqualTo(expected);
            assertThat(kernel.type.getMethods()).noneMatch(m -> m.getName().equals("evaluateScalars"));
        }
    }

    @Test
    void lookUpTableFindsWhatTheSwitchWould() {
        TestModel model = new TestModel();
        model.coordinates = coordinates(16);
        model.layout = Layout.NON_ZERO;
        int[] components = new int[16 * 16 * 16];
        Random random = new Random(9);
        int x = model.program.coordinate("x3", 3);
        for (int k = 0; k < 16; k++) {
            for (int i = 0; i < 16; i++) {
                for (int j = 0; j <= i; j++) {
                    int value = random.nextInt(3) == 0 ? -1 : x;
                    components[(k * 16 + i) * 16 + j] = value;
                    components[(k * 16 + j) * 16 + i] = value;
                }
            }
        }
        model.result(Quantity.CHRISTOFFEL, components);
        CompiledKernel kernel = CompiledKernel.of(model.build());
        int next = 0;
        for (int k = 0; k < 16; k++) {
            for (int i = 0; i < 16; i++) {
                for (int j = 0; j <= i; j++) {
                    int expected = components[(k * 16 + i) * 16 + j] < 0 ? -1 : next++;
                    assertThat(kernel.call(null, "index", k, i, j)).isEqualTo(expected);
                    assertThat(kernel.call(null, "index", k, j, i)).isEqualTo(expected);
                }
            }
        }
        assertThat(kernel.constant("LENGTH")).isEqualTo(next).isGreaterThan(1000);
    }

    @Test
    void allQuantitiesFitIntoOneClass() {
        Quantity[] all = Quantity.values();
        TestModel model = RandomModels.model(21, 3, 300, 30, Layout.FULL, all);
        KernelModel built = model.build();
        CompiledKernel kernel = CompiledKernel.of(built);
        List<Object> arguments = new ArrayList<>();
        for (KernelInput input : KernelInput.of(built)) {
            double[] array = new double[input.length()];
            Arrays.fill(array, 0.5);
            arguments.add(array);
        }
        int first = arguments.size();
        built.results()
                .forEach(result -> arguments.add(new double[result.slots().size()]));
        kernel.call(kernel.create(), "evaluate", arguments.toArray());
        double[] v =
                DoubleInterpreter.run(built.program(), symbol -> symbol.kind() == Symbol.Kind.PARAMETER ? 0.75 : 0.5);
        for (int r = 0; r < all.length; r++) {
            double[] expected = built.results().get(r).slots().stream()
                    .mapToDouble(slot -> slot < 0 ? 0 : v[slot])
                    .toArray();
            assertThat((double[]) arguments.get(first + r)).isEqualTo(expected);
        }
        arguments.set(
                arguments.size() - 1,
                new double[built.results().get(all.length - 1).slots().size() + 1]);
        assertThatThrownBy(() -> kernel.call(kernel.create(), "evaluate", arguments.toArray()))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void moreParametersThanAConstructorTakesAreRefused() {
        TestModel model = new TestModel();
        model.coordinates = coordinates(1);
        for (int i = 0; i < 126; i++) {
            model.parameter("p" + i, null);
        }
        model.result(Quantity.METRIC, model.program.coordinate("x0", 0));
        assertThatThrownBy(() -> KernelEmitter.emit(model.build()))
                .isInstanceOf(DefinitionException.class)
                .hasMessageContaining("126 parameters");
        model.parameters.remove(125);
        assertThat(CompiledKernel.of(model.build()).type.getConstructors()[0].getParameterCount())
                .isEqualTo(125);
    }

    @Test
    void moreConstantsThanAClassHoldsAreRefused() {
        TestModel model = new TestModel();
        model.coordinates = coordinates(1);
        int sum = model.program.coordinate("x0", 0);
        for (int i = 0; i < 30_000; i++) {
            sum = model.program.add(sum, model.program.constant(i, 40_009));
        }
        model.result(Quantity.METRIC, sum);
        KernelModel built = model.build();
        assertThatThrownBy(() -> KernelEmitter.emit(built))
                .isInstanceOf(DefinitionException.class)
                .hasMessageContaining("constants")
                .hasMessageContaining("Ask for a smaller quantity");
    }
}
