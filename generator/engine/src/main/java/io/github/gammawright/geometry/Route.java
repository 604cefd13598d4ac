package io.github.gammawright.geometry;

import java.util.ArrayList;
import java.util.List;

/**
 * One way of several to compute the quantities of a metric.
 *
 * @param inversion how the inverse metric is found
 * @param flow how the acceleration of geodesics is found
 */
public record Route(Inversion inversion, Flow flow) {

    /** How the inverse metric is found. */
    public enum Inversion {
        /** From the components, block by block. */
        BLOCKS,
        /** As the update of a diagonal metric by the square of one one-form, where the metric is one. */
        RANK_ONE
    }

    /** How the acceleration of geodesics is found. */
    public enum Flow {
        /** From the Christoffel symbols. */
        CONTRACTION,
        /** By sweeps over g_ij u^i u^j, its components multiplied out. */
        COMPONENTS,
        /** By sweeps over g_ij u^i u^j as the author wrote it. */
        AUTHORS_FORM
    }

    /** The route in words, for reports. */
    public String description() {
        return inversion.name().toLowerCase(java.util.Locale.ROOT).replace('_', '-')
                + " inverse, flow by "
                + flow.name().toLowerCase(java.util.Locale.ROOT).replace('_', ' ');
    }

    /** The routes that are worth a try for some quantities of a metric. */
    public static List<Route> candidates(MetricGraph metric, List<Quantity> quantities) {
        List<Inversion> inversions = new ArrayList<>(List.of(Inversion.BLOCKS));
        if (RankOneInverse.of(metric).isPresent()) {
            inversions.add(Inversion.RANK_ONE);
        }
        List<Flow> flows = new ArrayList<>(List.of(Flow.COMPONENTS));
        if (quantities.contains(Quantity.GEODESIC_ACCELERATION)) {
            flows.add(Flow.CONTRACTION);
            if (metric.quadraticForm().isPresent()) {
                flows.add(Flow.AUTHORS_FORM);
            }
        }
        List<Route> routes = new ArrayList<>();
        for (Inversion inversion : inversions) {
            for (Flow flow : flows) {
                routes.add(new Route(inversion, flow));
            }
        }
        return routes;
    }

    InverseMetric inverse(MetricGraph metric) {
        if (inversion == Inversion.RANK_ONE) {
            return RankOneInverse.of(metric).orElseThrow();
        }
        MatrixInverse inverse = MatrixInverse.of(metric.graph(), metric.components());
        return new ComponentInverse(metric.graph(), inverse.components(), inverse.determinant());
    }
}
