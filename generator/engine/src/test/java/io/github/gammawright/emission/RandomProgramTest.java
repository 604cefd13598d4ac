package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Whatever the program, the emitted class computes its values to the last bit, in methods of bounded size. */
class RandomProgramTest {

    @Property(tries = 40)
    void emittedClassesComputeTheProgramToTheLastBit(
            @ForAll @IntRange(min = 0, max = 1_000_000) int seed,
            @ForAll @IntRange(min = 1, max = 5) int dimension,
            @ForAll @IntRange(min = 0, max = 150) int operations,
            @ForAll Layout layout) {
        check(RandomModels.model(seed, dimension, operations, 0, layout, Quantity.CHRISTOFFEL), seed);
    }

    @Property(tries = 15)
    void severalResultsShareTheirWork(@ForAll @IntRange(min = 0, max = 1_000_000) int seed, @ForAll Layout layout) {
        check(
                RandomModels.model(
                        seed,
                        3,
                        80,
                        20,
                        layout,
                        Quantity.METRIC,
                        Quantity.GEODESIC_ACCELERATION,
                        Quantity.VOLUME_ELEMENT,
                        Quantity.HAMILTONIAN_FLOW),
                seed);
    }

    @ParameterizedTest
    @CsvSource({"2, 900, 0", "2, 900, 40", "4, 3000, 60", "6, 15000, 100", "8, 5000, 5", "16, 4000, 0"})
    void largeProgramsAreSplit(int dimension, int operations, int recent) {
        check(
                RandomModels.model(
                        operations + recent, dimension, operations, recent, Layout.FULL, Quantity.CHRISTOFFEL),
                recent);
        check(
                RandomModels.model(
                        operations + recent,
                        dimension,
                        operations,
                        recent,
                        Layout.PACKED,
                        Quantity.GEODESIC_ACCELERATION,
                        Quantity.INVERSE_METRIC),
                recent);
    }

    @Test
    @Tag("campaign")
    void hundredThousandOperationsAreNotTooMany() {
        check(RandomModels.model(1, 16, 100_000, 200, Layout.FULL, Quantity.CHRISTOFFEL), 1);
    }

    private static void check(TestModel recipe, long seed) {
        KernelModel model = recipe.build();
        CompiledKernel kernel = CompiledKernel.of(model);
        double[] values = DoubleInterpreter.run(model.program(), symbol -> RandomModels.input(symbol, seed));
        Object created = kernel.create(
                RandomModels.input(Symbol.of(Symbol.Kind.PARAMETER, "p0", 0), seed),
                RandomModels.input(Symbol.of(Symbol.Kind.PARAMETER, "p1", 1), seed));
        List<Object> arguments = new ArrayList<>();
        for (KernelInput input : KernelInput.of(model)) {
            double[] array = new double[input.length()];
            for (int i = 0; i < array.length; i++) {
                array[i] = RandomModels.input(Symbol.of(input.kind(), "", i), seed);
            }
            arguments.add(array);
        }
        List<double[]> results = new ArrayList<>();
        for (KernelModel.Result result : model.results()) {
            double[] array = new double[result.slots().size()];
            java.util.Arrays.fill(array, Double.NaN);
            results.add(array);
        }
        arguments.addAll(results);
        kernel.call(created, "evaluate", arguments.toArray());
        for (int r = 0; r < results.size(); r++) {
            for (int slot = 0; slot < results.get(r).length; slot++) {
                int value = model.results().get(r).slots().get(slot);
                double expected = value < 0 ? 0.0 : values[value];
                assertThat(Double.doubleToLongBits(results.get(r)[slot]))
                        .as(
                                "result %d, entry %d, seed %d: %s instead of %s",
                                r, slot, seed, results.get(r)[slot], expected)
                        .isEqualTo(Double.doubleToLongBits(expected));
            }
        }
    }

    @Test
    void nothingIsTestedInVain() {
        TestModel recipe = RandomModels.model(7, 6, 15000, 100, Layout.FULL, Quantity.CHRISTOFFEL);
        double[] values = DoubleInterpreter.run(recipe.build().program(), symbol -> RandomModels.input(symbol, 7));
        assertThat(java.util.Arrays.stream(values).filter(Double::isFinite).count())
                .isGreaterThan(values.length * 7 / 10);
    }
}
