package io.github.gammawright.verification.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;

import io.github.gammawright.definition.ElementaryFunction;
import java.util.EnumMap;
import java.util.Map;
import java.util.function.UnaryOperator;
import org.hipparchus.analysis.differentiation.DSFactory;
import org.hipparchus.analysis.differentiation.DerivativeStructure;
import org.junit.jupiter.api.Test;

/** Partial derivatives up to the third order against Hipparchus's derivative structures, in doubles. */
class SecondLibraryDerivativesTest {

    private static final int ORDER = 3;
    private static final TaylorRing RING =
            new TaylorRing(new RealFunctions(RealArithmetic.ofDigits(30)), new TaylorBasis(2, ORDER), 2);
    private static final DSFactory FACTORY = new DSFactory(2, ORDER);

    private static final double X = 0.375;
    private static final double Y = 0.25;

    /** x y + x² / 2 − y + 1/2, with all its derivatives different from zero up to the second. */
    private static Taylor inner() {
        Taylor x = RING.variable(0, Real.of(X));
        Taylor y = RING.variable(1, Real.of(Y));
        return x.times(y).plus(x.times(x).half()).minus(y).plus(RING.constant(Real.of(0.5)));
    }

    private static DerivativeStructure theirInner() {
        DerivativeStructure x = FACTORY.variable(0, X);
        DerivativeStructure y = FACTORY.variable(1, Y);
        return x.multiply(y).add(x.multiply(x).divide(2)).subtract(y).add(0.5);
    }

    @Test
    void everyFunction() {
        Map<ElementaryFunction, UnaryOperator<DerivativeStructure>> theirs = new EnumMap<>(ElementaryFunction.class);
        theirs.put(ElementaryFunction.SIN, DerivativeStructure::sin);
        theirs.put(ElementaryFunction.COS, DerivativeStructure::cos);
        theirs.put(ElementaryFunction.TAN, DerivativeStructure::tan);
        theirs.put(ElementaryFunction.ASIN, DerivativeStructure::asin);
        theirs.put(ElementaryFunction.ACOS, DerivativeStructure::acos);
        theirs.put(ElementaryFunction.ATAN, DerivativeStructure::atan);
        theirs.put(ElementaryFunction.SINH, DerivativeStructure::sinh);
        theirs.put(ElementaryFunction.COSH, DerivativeStructure::cosh);
        theirs.put(ElementaryFunction.TANH, DerivativeStructure::tanh);
        theirs.put(ElementaryFunction.ASINH, DerivativeStructure::asinh);
        theirs.put(ElementaryFunction.ACOSH, d -> d.add(1).acosh());
        theirs.put(ElementaryFunction.ATANH, DerivativeStructure::atanh);
        theirs.put(ElementaryFunction.EXP, DerivativeStructure::exp);
        theirs.put(ElementaryFunction.LOG, DerivativeStructure::log);
        theirs.put(ElementaryFunction.SQRT, DerivativeStructure::sqrt);
        theirs.put(ElementaryFunction.ABS, d -> d.negate().abs());
        int compared = 0;
        for (Map.Entry<ElementaryFunction, UnaryOperator<DerivativeStructure>> entry : theirs.entrySet()) {
            Taylor argument = switch (entry.getKey()) {
                case ACOSH -> inner().plus(RING.constant(Real.ONE));
                case ABS -> inner().negate();
                default -> inner();
            };
            compare(
                    entry.getKey().symbol(),
                    TaylorFunctions.apply(entry.getKey(), argument),
                    entry.getValue().apply(theirInner()));
            compared++;
        }
        // All but atan2, which has two arguments.
        assertThat(compared).isEqualTo(ElementaryFunction.values().length - 1);
    }

    @Test
    void angleAndPower() {
        Taylor x = RING.variable(0, Real.of(-X));
        Taylor y = RING.variable(1, Real.of(Y));
        DerivativeStructure theirX = FACTORY.variable(0, -X);
        DerivativeStructure theirY = FACTORY.variable(1, Y);
        compare("atan2", TaylorFunctions.atan2(y, x), DerivativeStructure.atan2(theirY, theirX));
        compare("pow", TaylorFunctions.power(y, x), theirY.pow(theirX));
        compare("pow 2.5", TaylorFunctions.power(y, Real.of(2.5)), theirY.pow(2.5));
        compare("pow -3", TaylorFunctions.power(x, Real.of(-3)), theirX.pow(-3));
    }

    private static void compare(String name, Taylor ours, DerivativeStructure theirs) {
        for (int i = 0; i <= ORDER; i++) {
            for (int j = 0; i + j <= ORDER; j++) {
                Taylor derivative = ours;
                for (int k = 0; k < i; k++) {
                    derivative = derivative.derivative(0);
                }
                for (int k = 0; k < j; k++) {
                    derivative = derivative.derivative(1);
                }
                double expected = theirs.getPartialDerivative(i, j);
                assertThat(derivative.value().toDouble())
                        .as("%s: ∂x^%d ∂y^%d", name, i, j)
                        .isCloseTo(expected, offset(2e-12 * (1 + Math.abs(expected))));
            }
        }
    }
}
