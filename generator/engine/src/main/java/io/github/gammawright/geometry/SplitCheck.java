package io.github.gammawright.geometry;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.Optional;

/**
 * Tells whether a metric can be split by its first coordinate: γ_ij positive definite and −g^tt &gt; 0, that is, the
 * surfaces of constant t spacelike and the signature (−+…+). Decided by elimination at points of the domain.
 */
public final class SplitCheck {

    private static final int POINTS = 256;

    /** Pivots closer to zero than this, relative to their row, may be rounding. */
    private static final double ROUNDING = 1e-9;

    /** Why a metric cannot be split. */
    public enum Obstacle {
        /** There is one coordinate only. */
        NO_SPACE,
        /** γ is negative definite, and t timelike: the signature is (+−…−). */
        SIGNATURE_REVERSED,
        /** γ is not positive definite. */
        SLICES_NOT_SPACELIKE,
        /** γ is positive definite, and so is the whole metric. */
        NO_TIME
    }

    private SplitCheck() {}

    /** What stands against the split of a definition's metric; nothing if it can be split. */
    public static Optional<Obstacle> of(MetricDefinition definition) {
        if (definition.dimension() == 1) {
            return Optional.of(Obstacle.NO_SPACE);
        }
        MetricGraph metric = MetricGraphBuilder.build(definition, DomainPoints.draw(definition, POINTS));
        double[][][] values = values(metric);
        if (holds(values, 1)) {
            return Optional.empty();
        }
        if (holds(values, -1)) {
            return Optional.of(Obstacle.SIGNATURE_REVERSED);
        }
        return Optional.of(isSpacelike(values, 1) ? Obstacle.NO_TIME : Obstacle.SLICES_NOT_SPACELIKE);
    }

    /** The components at each point. */
    private static double[][][] values(MetricGraph metric) {
        ExpressionGraph graph = metric.graph();
        int n = metric.dimension();
        int points = graph.samplePoints().count();
        double[][][] values = new double[points][n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                Node component = metric.components()[i][j];
                double[] at = graph.realValues(component);
                for (int p = 0; p < points; p++) {
                    values[p][i][j] = at[p];
                }
            }
        }
        return values;
    }

    private static boolean isSpacelike(double[][][] values, int sign) {
        return pivots(values, sign, true);
    }

    private static boolean holds(double[][][] values, int sign) {
        return pivots(values, sign, false);
    }

    /** Eliminates the coordinates from the last to the first and looks at the signs of the pivots. */
    private static boolean pivots(double[][][] values, int sign, boolean spaceOnly) {
        int n = values[0].length;
        boolean[] clear = new boolean[n];
        for (double[][] point : values) {
            double[][] rest = new double[n][];
            double[] sizes = new double[n];
            for (int i = 0; i < n; i++) {
                rest[i] = point[i].clone();
                sizes[i] = Math.abs(point[i][i]);
            }
            for (int k = n - 1; k >= (spaceOnly ? 1 : 0); k--) {
                double pivot = rest[k][k] * (k == 0 ? -sign : sign);
                double scale = sizes[k];
                if (pivot < -ROUNDING * scale) {
                    return false;
                }
                clear[k] |= pivot > ROUNDING * scale;
                if (pivot == 0) {
                    continue;
                }
                for (int i = 0; i < k; i++) {
                    for (int j = 0; j < k; j++) {
                        rest[i][j] -= rest[i][k] * rest[k][j] / rest[k][k];
                    }
                    sizes[i] = Math.max(sizes[i], Math.abs(rest[i][k] * rest[k][i] / rest[k][k]));
                }
            }
        }
        for (int k = spaceOnly ? 1 : 0; k < n; k++) {
            if (!clear[k]) {
                return false;
            }
        }
        return true;
    }
}
