package io.github.gammawright.verification;

import java.util.Optional;

/**
 * How one quantity of a kernel compares with the reference.
 *
 * @param quantity its name
 * @param compared how many values were compared
 * @param undefined how many values were not, because they are not defined or not within the range of doubles there
 * @param medianUlps the median error in units of the last place, over the components that are not zero; NaN when all are
 * @param worstUlps where the error is greatest in that unit
 * @param medianLimits the median error in conditioning limits, over the components whose limit is not zero; NaN when
 *     there are none
 * @param worstLimits where the error is greatest in conditioning limits
 * @param worstZero the greatest absolute value where the reference has 0, in units of the largest component there
 * @param violations how many values break a bound
 * @param worstViolation the worst of them
 */
public record QuantityReport(
        String quantity,
        long compared,
        long undefined,
        double medianUlps,
        Optional<Deviation> worstUlps,
        double medianLimits,
        Optional<Deviation> worstLimits,
        double worstZero,
        long violations,
        Optional<Deviation> worstViolation) {

    /**
     * Whether no bound was broken and something was compared, unless the quantity has no components at all, as that of a
     * motion by time in one dimension.
     */
    public boolean passed() {
        return violations == 0 && (compared > 0 || undefined == 0);
    }
}
