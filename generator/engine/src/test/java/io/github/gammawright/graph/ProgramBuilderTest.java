package io.github.gammawright.graph;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigInteger;
import java.util.List;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;

class ProgramBuilderTest {

    private final ProgramBuilder builder = new ProgramBuilder();
    private final int x = builder.append(new Instruction.Load(Symbol.of(Symbol.Kind.COORDINATE, "x", 0)));

    private int constant(int numerator, int denominator) {
        return builder.constant(new BigFraction(numerator, denominator));
    }

    private Instruction instruction(int number) {
        return builder.build(List.of(number)).instruction(number);
    }

    @Test
    void numbersAreCombinedExactly() {
        int third = constant(1, 3);
        int two = constant(2, 1);
        assertThat(instruction(builder.add(third, third))).isEqualTo(new Instruction.Constant(new BigFraction(2, 3)));
        assertThat(instruction(builder.subtract(third, two)))
                .isEqualTo(new Instruction.Constant(new BigFraction(-5, 3)));
        assertThat(builder.multiply(two, builder.divide(constant(1, 1), two))).isEqualTo(constant(1, 1));
    }

    @Test
    void factorsAndDivisorsOfOneVanish() {
        int one = constant(1, 1);
        assertThat(builder.multiply(x, one)).isEqualTo(x);
        assertThat(builder.multiply(one, x)).isEqualTo(x);
        assertThat(builder.divide(x, one)).isEqualTo(x);
        assertThat(builder.divide(one, x)).isNotEqualTo(x);
    }

    @Test
    void divisionByZeroStaysWhatItIs() {
        assertThat(instruction(builder.divide(constant(1, 1), constant(0, 1))))
                .isInstanceOf(Instruction.Arithmetic.class);
    }

    @Test
    void hugeNumbersStayApart() {
        int huge =
                builder.constant(new BigFraction(BigInteger.ONE.shiftLeft(1500).add(BigInteger.ONE)));
        assertThat(instruction(builder.multiply(huge, huge))).isInstanceOf(Instruction.Arithmetic.class);
    }
}
