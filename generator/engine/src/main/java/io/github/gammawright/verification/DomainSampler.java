package io.github.gammawright.verification;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Draws points from a definition's sample box and keeps those that meet its conditions, which are evaluated in high
 * precision. The same seed gives the same points on every machine.
 */
public final class DomainSampler {

    /** Draws beyond which the search ends: so many, and so many more for each point asked for. */
    private static final int DRAWS = 20_000;

    private static final int DRAWS_FOR_A_POINT = 50;

    private final ReferenceEvaluator evaluator;
    private final long seed;

    /** A sampler of the evaluator's definition. */
    public DomainSampler(ReferenceEvaluator evaluator, long seed) {
        this.evaluator = evaluator;
        this.seed = seed;
    }

    /**
     * Draws points.
     *
     * @param points how many are wanted
     * @param edgePoints how many more are wanted at edges of the domain; there may be fewer
     */
    public DomainSample draw(int points, int edgePoints) {
        SampleBox box = new SampleBox(evaluator);
        if (!box.missing().isEmpty()) {
            return new DomainSample(
                    List.of(),
                    0,
                    Optional.of("give " + String.join(", ", box.missing())
                            + " a default, or a range in [domain.sample]: without one there is nothing to draw from"));
        }
        PointSequence sequence = new PointSequence(box.dimension(), seed);
        int conditions = evaluator.definition().domain().conditions().size();
        int[] failures = new int[conditions];
        List<SamplePoint> found = new ArrayList<>();
        int draws = 0;
        int limit = DRAWS + DRAWS_FOR_A_POINT * points;
        while (found.size() < points && draws < limit) {
            double[] unit = sequence.next();
            draws++;
            double[] parameters = box.parameters(unit);
            double[] coordinates = box.coordinates(unit);
            int failed = evaluator.firstFailedCondition(parameters, coordinates);
            if (failed < 0) {
                found.add(new SamplePoint(parameters, coordinates, false));
            } else {
                failures[failed]++;
            }
        }
        Optional<String> shortage =
                found.size() < points ? Optional.of(shortage(found.size(), draws, failures)) : Optional.empty();
        if (edgePoints > 0 && !found.isEmpty()) {
            found.addAll(new EdgeSearch(evaluator, box).press(found, edgePoints));
        }
        return new DomainSample(found, draws, shortage);
    }

    private String shortage(int found, int draws, int[] failures) {
        int worst = 0;
        for (int i = 1; i < failures.length; i++) {
            worst = failures[i] > failures[worst] ? i : worst;
        }
        MetricDefinition.Condition condition =
                evaluator.definition().domain().conditions().get(worst);
        return (found == 0 ? "none" : "only " + found) + " of " + draws
                + " points of the sample box meets the conditions; the one that fails first most often is \""
                + condition.text() + "\" (" + failures[worst] + " times): narrow the ranges in [domain.sample]";
    }
}
