package io.github.gammawright.verification;

import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * What a check found.
 *
 * @param className the class with its package
 * @param definition the definition's name
 * @param settings how it was checked
 * @param points at how many points, those at edges included
 * @param edgePoints how many of them are at edges
 * @param quantities one for each quantity, in the order of the result arrays; empty when nothing could be compared
 * @param defects promises of the class's shape that it breaks, in words
 * @param notes what is worth knowing but no fault of the class, in words
 * @param notChecked why there was nothing to compare; empty when there was
 * @param warnings what the compiler warned of
 * @param largestMethod the method with the most bytecodes; empty when the class was not compiled
 */
public record KernelReport(
        String className,
        String definition,
        CheckSettings settings,
        int points,
        int edgePoints,
        List<QuantityReport> quantities,
        List<String> defects,
        List<String> notes,
        Optional<String> notChecked,
        List<String> warnings,
        Optional<MethodSize> largestMethod) {

    public KernelReport {
        quantities = List.copyOf(quantities);
        defects = List.copyOf(defects);
        notes = List.copyOf(notes);
        warnings = List.copyOf(warnings);
    }

    /** How a check can end. */
    public enum Verdict {
        /** Every value compared keeps the bounds. */
        PASSED,
        /** A bound or a promise of the class is broken. */
        FAILED,
        /** There was nothing to compare. */
        NOT_CHECKED;

        /** The verdict in words. */
        public String text() {
            return name().toLowerCase(Locale.ROOT).replace('_', ' ');
        }
    }

    /** How the check ended. */
    public Verdict verdict() {
        if (!defects.isEmpty()) {
            return Verdict.FAILED;
        }
        if (notChecked.isPresent()) {
            return Verdict.NOT_CHECKED;
        }
        return quantities.stream().allMatch(QuantityReport::passed) ? Verdict.PASSED : Verdict.FAILED;
    }
}
