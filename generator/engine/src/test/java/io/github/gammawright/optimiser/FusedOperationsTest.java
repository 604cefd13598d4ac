package io.github.gammawright.optimiser;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.ProgramBuilder;
import io.github.gammawright.graph.ProgramInterpreter;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;

class FusedOperationsTest {

    private static final SamplePoints POINTS = SamplePoints.arbitrary(8);

    private final ProgramBuilder builder = new ProgramBuilder();
    private final int x = load("x", 0);
    private final int y = load("y", 1);
    private final int z = load("z", 2);

    private int load(String name, int index) {
        return builder.append(new Instruction.Load(Symbol.of(Symbol.Kind.COORDINATE, name, index)));
    }

    private static long fused(StraightLineProgram program) {
        return program.instructions().stream()
                .filter(Instruction.MultiplyAdd.class::isInstance)
                .count();
    }

    @Property(tries = 50)
    void eachFormRoundsOnce(
            @ForAll @DoubleRange(min = -9, max = 9) double a,
            @ForAll @DoubleRange(min = -9, max = 9) double b,
            @ForAll @DoubleRange(min = -9, max = 9) double c) {
        FusedOperationsTest fresh = new FusedOperationsTest();
        StraightLineProgram program = FusedOperations.of(fresh.threeForms(), POINTS);
        double[] values =
                ProgramInterpreter.run(program, symbol -> List.of(a, b, c).get(symbol.index()));
        assertThat(program.outputs().stream().map(o -> values[o]))
                .containsExactly(Math.fma(a, b, c), Math.fma(a, c, -b), Math.fma(-b, c, a));
    }

    private StraightLineProgram threeForms() {
        return builder.build(List.of(
                builder.add(builder.multiply(x, y), z),
                builder.subtract(builder.multiply(x, z), y),
                builder.subtract(x, builder.multiply(y, z))));
    }

    @Test
    void aFusedOperationCountsTwo() {
        StraightLineProgram plain = threeForms();
        StraightLineProgram program = FusedOperations.of(plain, POINTS);
        assertThat(fused(program)).isEqualTo(3);
        assertThat(program.count()).isEqualTo(plain.count());
        assertThat(program.count().operations()).isEqualTo(6);
    }

    @Test
    void productsThatAreUsedTwiceStay() {
        int product = builder.multiply(x, y);
        StraightLineProgram program = FusedOperations.of(
                builder.build(List.of(builder.add(product, z), builder.subtract(product, z))), POINTS);
        assertThat(fused(program)).isZero();
    }

    @Test
    void productsWithTheAuthorsNameStay() {
        int product = builder.multiply(x, y);
        builder.name(product, "Sigma");
        StraightLineProgram program = FusedOperations.of(builder.build(List.of(builder.add(product, z))), POINTS);
        assertThat(fused(program)).isZero();
        assertThat(program.names()).containsValue("Sigma");
    }

    /** x + 10⁹ ((2x)² − 4x²): what cancels to the last bit would leave the rounding of a product. */
    @Test
    void contractionsThatSpoilWhatCancelsAreLeftOut() {
        int twice = builder.multiply(constant(2), x);
        int zero =
                builder.subtract(builder.multiply(twice, twice), builder.multiply(constant(4), builder.multiply(x, x)));
        int output = builder.add(x, builder.multiply(constant(1_000_000_000), zero));
        StraightLineProgram contracted = FusedOperations.of(builder.build(List.of(output)), POINTS);
        assertThat(fused(contracted)).isEqualTo(1);
        double[] values = ProgramInterpreter.run(contracted, symbol -> 0.1);
        assertThat(values[contracted.outputs().get(0)]).isEqualTo(0.1);
        assertThat(Math.fma(0.2, 0.2, -4 * (0.1 * 0.1))).isNotZero();
    }

    private int constant(int value) {
        return builder.constant(new BigFraction(value));
    }
}
