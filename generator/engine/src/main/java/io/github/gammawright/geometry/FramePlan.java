package io.github.gammawright.geometry;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.ExpressionGraph;
import java.util.ArrayList;
import java.util.List;

/**
 * In which order the coordinate directions become legs of an orthonormal frame: at each step the last direction left
 * whose part across the legs so far has a square of one sign in the whole domain. So where a metric can be split by its
 * first coordinate, the legs of the others span space and the first is the normal. Where no direction is left but null
 * ones, two make a pair of legs.
 *
 * @param steps in order
 */
public record FramePlan(List<Step> steps) {

    private static final int POINTS = 256;

    /** Squares closer to zero than this, relative to what they are the difference of, may be rounding. */
    private static final double ROUNDING = 1e-10;

    public FramePlan {
        steps = List.copyOf(steps);
    }

    /** One or two legs; the number of a leg is that of its coordinate. */
    public sealed interface Step {}

    /**
     * The direction of a coordinate, made orthogonal to the legs so far and normalised.
     *
     * @param sign of its square
     */
    public record Single(int coordinate, int sign) implements Step {}

    /**
     * Two legs (N ∓ k)/√2 with squares ∓1 from a null direction and another one: k ∝ ∂_nullCoordinate, N a null vector
     * with N·k = 1. The timelike leg has the number of the partner.
     */
    public record NullPair(int partner, int nullCoordinate) implements Step {}

    /**
     * The plan for a definition's metric.
     *
     * @throws NoFrameException where no direction keeps clear of being null
     */
    public static FramePlan of(MetricDefinition definition) {
        return of(MetricGraphBuilder.build(definition, DomainPoints.guard(definition, POINTS)));
    }

    /** The plan by the points that the metric's graph knows. */
    static FramePlan of(MetricGraph metric) {
        return new FramePlan(new Search(metric).steps());
    }

    private static final class Search {
        private final int n;
        /** g of what is left of the directions, at each point. */
        private final List<double[][]> rests = new ArrayList<>();
        /** The largest number that went into each square. */
        private final List<double[]> sizes = new ArrayList<>();

        private final List<Integer> left = new ArrayList<>();

        Search(MetricGraph metric) {
            n = metric.dimension();
            ExpressionGraph graph = metric.graph();
            for (int p = 0; p < graph.samplePoints().count(); p++) {
                double[][] rest = new double[n][n];
                double[] size = new double[n];
                boolean finite = true;
                for (int i = 0; i < n; i++) {
                    for (int j = 0; j < n; j++) {
                        rest[i][j] = graph.realValues(metric.components()[i][j])[p];
                        finite &= Double.isFinite(rest[i][j]);
                    }
                    size[i] = Math.abs(rest[i][i]);
                }
                if (finite) {
                    rests.add(rest);
                    sizes.add(size);
                }
            }
            for (int i = 0; i < n; i++) {
                left.add(0, i);
            }
        }

        List<Step> steps() {
            List<Step> steps = new ArrayList<>();
            while (!left.isEmpty()) {
                steps.add(next());
            }
            return steps;
        }

        private Step next() {
            for (int k : left) {
                int sign = sign(k, k);
                if (sign != 0) {
                    left.remove((Integer) k);
                    for (int p = 0; p < rests.size(); p++) {
                        eliminate(rests.get(p), sizes.get(p), k);
                    }
                    return new Single(k, sign);
                }
            }
            for (int k : left) {
                for (int j : left) {
                    if (j != k && isNull(k) && sign(j, k) != 0) {
                        left.remove((Integer) k);
                        left.remove((Integer) j);
                        rests.forEach(rest -> eliminate(rest, j, k));
                        return new NullPair(j, k);
                    }
                }
            }
            throw new NoFrameException();
        }

        /** The sign that a product has at all points, 0 if it has not one sign everywhere. */
        private int sign(int i, int j) {
            int sign = 0;
            for (int p = 0; p < rests.size(); p++) {
                double value = rests.get(p)[i][j];
                if (Math.abs(value) <= ROUNDING * (i == j ? sizes.get(p)[i] : 1e-10) || sign * value < 0) {
                    return 0;
                }
                sign = value > 0 ? 1 : -1;
            }
            return sign;
        }

        private boolean isNull(int k) {
            for (int p = 0; p < rests.size(); p++) {
                if (Math.abs(rests.get(p)[k][k]) > ROUNDING * sizes.get(p)[k]) {
                    return false;
                }
            }
            return true;
        }

        private void eliminate(double[][] rest, double[] size, int k) {
            for (int i : left) {
                for (int j : left) {
                    double change = rest[i][k] * rest[k][j] / rest[k][k];
                    rest[i][j] -= change;
                    if (i == j) {
                        size[i] = Math.max(size[i], Math.abs(change));
                    }
                }
            }
        }

        private void eliminate(double[][] rest, int j, int k) {
            double[] alongN = new double[n];
            double[] alongK = new double[n];
            for (int i : left) {
                alongN[i] = rest[i][j] - rest[j][j] / (2 * rest[j][k]) * rest[i][k];
                alongK[i] = rest[i][k] / rest[j][k];
            }
            for (int i : left) {
                for (int l : left) {
                    rest[i][l] -= alongN[i] * alongK[l] + alongK[i] * alongN[l];
                }
            }
        }
    }
}
