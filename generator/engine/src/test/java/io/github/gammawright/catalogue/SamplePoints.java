package io.github.gammawright.catalogue;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.DomainSampler;
import io.github.gammawright.verification.SamplePoint;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferencePoint;
import java.util.List;
import java.util.function.BiConsumer;
import java.util.function.Consumer;

/** Points of a definition's domain, with the reference there. */
final class SamplePoints {

    private static final long SEED = 1;

    private SamplePoints() {}

    /** Shows the reference at so many points. */
    static void visit(MetricDefinition definition, int points, Consumer<ReferencePoint> visitor) {
        visitBoth(definition, definition, points, (point, same) -> visitor.accept(point));
    }

    /** Shows the references of two definitions with the same names at so many points of the first's domain. */
    static void visitBoth(
            MetricDefinition first,
            MetricDefinition second,
            int points,
            BiConsumer<ReferencePoint, ReferencePoint> visitor) {
        ReferenceEvaluator evaluator = new ReferenceEvaluator(first);
        ReferenceEvaluator other = new ReferenceEvaluator(second);
        List<SamplePoint> sample =
                new DomainSampler(evaluator, SEED).draw(points, 0).points();
        if (sample.size() != points) {
            throw new AssertionError("only " + sample.size() + " points in the domain of " + first.name());
        }
        for (SamplePoint point : sample) {
            visitor.accept(
                    evaluator.at(point.parameters(), point.coordinates()),
                    other.at(point.parameters(), point.coordinates()));
        }
    }
}
