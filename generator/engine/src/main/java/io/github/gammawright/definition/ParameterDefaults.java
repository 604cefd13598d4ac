package io.github.gammawright.definition;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.fraction.BigFraction;

/**
 * The doubles that stand for constant expressions: each is the exact value, rounded once to the nearest double. Rationals
 * are rounded exactly; of other values more and more digits are computed until the rounding is beyond doubt (Ziv 1991).
 */
public final class ParameterDefaults {

    private static final int[] DIGITS = {60, 120, 240, 480};
    private static final int GUARD_DIGITS = 25;

    private ParameterDefaults() {}

    /** The default of each parameter in declared order; empty for one that has none. */
    public static List<OptionalDouble> of(MetricDefinition definition) {
        return definition.parameters().stream()
                .map(parameter -> parameter
                        .defaultExpression()
                        .map(expression -> OptionalDouble.of(value(expression)))
                        .orElse(OptionalDouble.empty()))
                .toList();
    }

    /**
     * The double nearest to the value of an expression without names.
     *
     * @return an infinity if the value is beyond the largest double; NaN if there is no real value, as of
     *     {@code sqrt(-1)}, or none that a few hundred digits can tell
     * @throws IllegalArgumentException if there is a name in the expression
     */
    public static double value(Expression constant) {
        Optional<BigFraction> rational = ConstantCheck.rational(constant);
        if (rational.isPresent()) {
            return CorrectRounding.toDouble(rational.get());
        }
        double before = Double.NaN;
        boolean knownBefore = false;
        for (int digits : DIGITS) {
            PreciseEvaluator evaluator = new PreciseEvaluator(digits);
            Dfp value = evaluator.value(constant);
            double rounded = round(value);
            boolean cancelled = evaluator.digitsLost(value) >= digits - GUARD_DIGITS;
            boolean known = !evaluator.needsMoreDigits();
            if (known && knownBefore && !cancelled && Double.compare(before, rounded) == 0) {
                return rounded;
            }
            if (known && cancelled && digits == DIGITS[DIGITS.length - 1]) {
                return 0;
            }
            before = rounded;
            knownBefore = known;
        }
        return Double.NaN;
    }

    private static double round(Dfp value) {
        if (value.isNaN() || value.isInfinite()) {
            return value.toDouble();
        }
        return new BigDecimal(value.toString()).doubleValue();
    }
}
