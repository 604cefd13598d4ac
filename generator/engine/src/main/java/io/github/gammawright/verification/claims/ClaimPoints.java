package io.github.gammawright.verification.claims;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.ClaimReport.Witness;
import io.github.gammawright.verification.DomainSampler;
import io.github.gammawright.verification.SamplePoint;
import io.github.gammawright.verification.reference.Real;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import io.github.gammawright.verification.reference.ReferenceResiduals;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.Function;

/**
 * Points at which claims are tried, some at edges of the domain. A claim is one for all parameters that meet the
 * conditions, so that at every other point the parameters differ from their defaults.
 */
final class ClaimPoints {

    private static final int INSIDE = 16;
    private static final int AT_EDGES = 8;
    private static final int MORE_DIGITS = 30;

    /** Two precisions agree on a value to better than this part of it, and on rounding never. */
    private static final double AGREES = 0.1;

    private final ReferenceEvaluator evaluator;
    private final ReferenceEvaluator finer;
    private final List<SamplePoint> points;

    ClaimPoints(ReferenceEvaluator evaluator, long seed) {
        this.evaluator = evaluator;
        this.finer = evaluator.finer(MORE_DIGITS);
        this.points =
                varied(new DomainSampler(evaluator, seed).draw(INSIDE, AT_EDGES).points(), seed);
    }

    private List<SamplePoint> varied(List<SamplePoint> drawn, long seed) {
        Random random = new Random(seed);
        List<SamplePoint> all = new ArrayList<>();
        for (SamplePoint point : drawn) {
            double[] parameters = point.parameters();
            for (int i = 0; i < parameters.length; i++) {
                double by = 0.6 * random.nextDouble() - 0.3;
                parameters[i] = parameters[i] == 0 ? by : parameters[i] * (1 + by);
            }
            SamplePoint other = point.withParameters(parameters);
            boolean vary = all.size() % 2 == 1 && evaluator.inDomain(parameters, point.coordinates());
            all.add(vary ? other : point);
        }
        return all;
    }

    List<SamplePoint> all() {
        return points;
    }

    MetricDefinition definition() {
        return evaluator.definition();
    }

    /** What a search found. */
    record Search(int points, Optional<Witness> nonZero) {}

    /**
     * Looks for a point where a component is not 0.
     *
     * @param name of the tensor, for the witness
     * @param residual its components, row-major over indices of the given rank
     */
    Search search(String name, int rank, Function<ReferenceResiduals, List<Real>> residual) {
        int tried = 0;
        for (SamplePoint point : points) {
            List<Real> coarse = residual.apply(
                    evaluator.at(point.parameters(), point.coordinates()).residuals());
            boolean defined = coarse.stream().anyMatch(value -> !value.isUndefined()) || coarse.isEmpty();
            tried += defined ? 1 : 0;
            int component = nonZero(coarse, point, residual);
            if (component >= 0) {
                return new Search(
                        tried,
                        Optional.of(new Witness(
                                boxed(point.parameters()),
                                boxed(point.coordinates()),
                                name + Arrays.toString(indices(component, rank)),
                                coarse.get(component).toDouble())));
            }
        }
        return new Search(tried, Optional.empty());
    }

    /** The largest component that is no rounding, −1 if there is none. */
    private int nonZero(List<Real> coarse, SamplePoint point, Function<ReferenceResiduals, List<Real>> residual) {
        if (coarse.stream().noneMatch(value -> value.signum() != 0)) {
            return -1;
        }
        List<Real> fine =
                residual.apply(finer.at(point.parameters(), point.coordinates()).residuals());
        int largest = -1;
        for (int i = 0; i < coarse.size(); i++) {
            double value = coarse.get(i).toDouble();
            boolean agrees = value != 0 && Math.abs(fine.get(i).toDouble() - value) <= AGREES * Math.abs(value);
            if (agrees
                    && (largest < 0
                            || Math.abs(value) > Math.abs(coarse.get(largest).toDouble()))) {
                largest = i;
            }
        }
        return largest;
    }

    /** The inertia of the metric at a point; empty where it is undefined or degenerate. */
    Optional<Inertia> inertia(SamplePoint point) {
        return Inertia.of(
                evaluator.at(point.parameters(), point.coordinates()).values(ReferenceQuantity.METRIC),
                definition().dimension());
    }

    private int[] indices(int component, int rank) {
        int[] indices = new int[rank];
        int rest = component;
        for (int i = rank - 1; i >= 0; i--) {
            indices[i] = rest % definition().dimension();
            rest /= definition().dimension();
        }
        return indices;
    }

    static List<Double> boxed(double[] values) {
        return Arrays.stream(values).boxed().toList();
    }
}
