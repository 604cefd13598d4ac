package io.github.gammawright.generation;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.geometry.FramePlan;
import io.github.gammawright.geometry.NoFrameException;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.SplitCheck;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** Tells which quantities a metric has: not each can be split into space and time, or has a frame in its whole domain. */
public final class Applicability {

    private Applicability() {}

    /** The quantities that a definition's metric has. */
    public static List<Quantity> quantities(MetricDefinition definition) {
        return MetricMistakes.reported(definition, () -> {
            boolean split = SplitCheck.of(definition).isEmpty();
            boolean frame = hasFrame(definition);
            return Arrays.stream(Quantity.values())
                    .filter(quantity -> split || !quantity.isOfSplit())
                    .filter(quantity -> frame || !quantity.isOfFrame())
                    .toList();
        });
    }

    private static boolean hasFrame(MetricDefinition definition) {
        try {
            framePlan(definition, List.of(Quantity.ORTHONORMAL_FRAME));
            return true;
        } catch (NoFrameException e) {
            return false;
        }
    }

    /**
     * The plan for the frame that the quantities need; none where they need none or the author gives one.
     *
     * @throws NoFrameException where there is none for the whole domain
     */
    static Optional<FramePlan> framePlan(MetricDefinition definition, List<Quantity> quantities) {
        boolean needed =
                quantities.stream().anyMatch(Quantity::isOfFrame) && !(definition.form() instanceof MetricForm.Coframe);
        return needed ? Optional.of(FramePlan.of(definition)) : Optional.empty();
    }

    /**
     * Stops if one of the quantities needs a split that the metric does not allow.
     *
     * @throws io.github.gammawright.diagnostic.DefinitionException with why, and how to mend it
     */
    static void require(MetricDefinition definition, List<Quantity> quantities) {
        Optional<Quantity> first =
                quantities.stream().filter(Quantity::isOfSplit).findFirst();
        if (first.isEmpty()) {
            return;
        }
        SplitCheck.of(definition).ifPresent(obstacle -> {
            Diagnostics diagnostics = new Diagnostics(definition.source());
            String time = definition.coordinates().get(0);
            diagnostics.report(
                    DiagnosticCode.METRIC_NOT_SPLIT,
                    MetricMistakes.position(definition.form()),
                    first.get().symbol(),
                    time,
                    reason(obstacle, time),
                    remedy(obstacle));
            diagnostics.throwIfAny();
        });
    }

    private static String reason(SplitCheck.Obstacle obstacle, String time) {
        return switch (obstacle) {
            case NO_SPACE -> "there is no other coordinate";
            case SIGNATURE_REVERSED -> "the signature is +−…−, so that space has a negative definite metric";
            case SLICES_NOT_SPACELIKE ->
                "where " + time + " is constant the metric is not positive definite in the whole domain";
            case NO_TIME -> "g^ij is not negative along " + time + " in the whole domain";
        };
    }

    private static String remedy(SplitCheck.Obstacle obstacle) {
        return switch (obstacle) {
            case NO_SPACE -> "Ask for another quantity.";
            case SIGNATURE_REVERSED -> "Change the sign of the whole metric, which leaves Γ as it is.";
            case SLICES_NOT_SPACELIKE ->
                "Name a coordinate first whose surfaces are spacelike, or restrict the domain.";
            case NO_TIME -> "Name the time coordinate first, or restrict the domain.";
        };
    }
}
