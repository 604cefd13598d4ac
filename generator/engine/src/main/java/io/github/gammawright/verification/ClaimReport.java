package io.github.gammawright.verification;

import java.util.List;
import java.util.Optional;

/**
 * What became of one claim of a definition.
 *
 * @param claim as the definition makes it, such as {@code vacuum = true}
 * @param verdict how it ended
 * @param points at how many points it was tried
 * @param explanation why the verdict is what it is, in words
 * @param witness the point that decides, where one does: a counter-example, or where a quantity that must not vanish
 *     everywhere doesn't
 */
public record ClaimReport(
        String claim, ClaimVerdict verdict, int points, String explanation, Optional<Witness> witness) {

    /** Whether the claim is shown to be false. */
    public boolean refuted() {
        return verdict == ClaimVerdict.REFUTED;
    }

    /**
     * A component at a point.
     *
     * @param component the component, such as {@code R[0, 1]}
     * @param value its value there
     */
    public record Witness(List<Double> parameters, List<Double> point, String component, double value) {

        public Witness {
            parameters = List.copyOf(parameters);
            point = List.copyOf(point);
        }
    }
}
