package io.github.gammawright.verification;

import java.util.List;
import java.util.Optional;

/**
 * How an identity between the quantities of a metric holds for its classes.
 *
 * @param name of the identity
 * @param formula what must vanish, in the notation of the trade
 * @param points at how many points it was tried
 * @param compared how many components were compared
 * @param worst the greatest residual in units of what the errors of its terms allow
 * @param violations how many residuals are greater than that
 * @param worstViolation the worst of them
 */
public record IdentityReport(
        String name,
        String formula,
        int points,
        long compared,
        double worst,
        long violations,
        Optional<Residual> worstViolation) {

    /** Whether something was compared and no residual was too large. */
    public boolean passed() {
        return compared > 0 && violations == 0;
    }

    /**
     * What is left where nothing should be.
     *
     * @param indices of the component, counted from 0
     * @param value what is left
     * @param allowed what the errors of the terms allow
     */
    public record Residual(
            List<Integer> indices, List<Double> parameters, List<Double> point, double value, double allowed) {

        public Residual {
            indices = List.copyOf(indices);
            parameters = List.copyOf(parameters);
            point = List.copyOf(point);
        }
    }
}
