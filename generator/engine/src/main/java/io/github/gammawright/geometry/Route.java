package io.github.gammawright.geometry;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * One way of several to compute the quantities of a metric.
 *
 * @param inversion how the inverse metric is found
 * @param flow how the acceleration of geodesics is found
 * @param bending how the extrinsic curvature is found
 */
public record Route(Inversion inversion, Flow flow, Bending bending) {

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

    /** How the extrinsic and the mean curvature are found. */
    public enum Bending {
        /** From the first kind's Christoffel symbols; the mean curvature as their trace. */
        CONNECTION,
        /** As rate of change of the spatial metric along the normal; the mean curvature as that of the volume. */
        LIE_DERIVATIVE,
        /** As rate of change of the one-forms whose squares make up the spatial metric. */
        SQUARES
    }

    /** The route in words, for reports. */
    public String description() {
        return words(inversion).replace(' ', '-')
                + " inverse, flow by "
                + words(flow)
                + (bending == Bending.CONNECTION ? "" : ", extrinsic curvature by " + words(bending));
    }

    private static String words(Enum<?> way) {
        return way.name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }

    /** The routes that are worth a try for some quantities of a metric. */
    public static List<Route> candidates(MetricGraph metric, List<Quantity> quantities) {
        List<Inversion> inversions = new ArrayList<>(List.of(Inversion.BLOCKS));
        boolean split = quantities.stream().anyMatch(Quantity::isOfSplit);
        if (RankOneInverse.of(metric).isPresent()
                || (split && RankOneInverse.of(metric.spatial()).isPresent())) {
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
                for (Bending bending : bendings(metric, quantities)) {
                    routes.add(new Route(inversion, flow, bending));
                }
            }
        }
        return routes;
    }

    private static List<Bending> bendings(MetricGraph metric, List<Quantity> quantities) {
        List<Bending> bendings = new ArrayList<>(List.of(Bending.CONNECTION));
        boolean tensor = quantities.contains(Quantity.EXTRINSIC_CURVATURE);
        if (tensor || quantities.contains(Quantity.MEAN_CURVATURE)) {
            bendings.add(Bending.LIE_DERIVATIVE);
        }
        if (tensor && metric.squares().isPresent()) {
            bendings.add(Bending.SQUARES);
        }
        return bendings;
    }

    /** The inverse of a metric or of its spatial part, to which the form of the other may not apply. */
    InverseMetric inverse(MetricGraph metric) {
        Optional<InverseMetric> updated =
                inversion == Inversion.RANK_ONE ? RankOneInverse.of(metric) : Optional.empty();
        if (updated.isPresent()) {
            return updated.get();
        }
        MatrixInverse inverse = MatrixInverse.of(metric.graph(), metric.components());
        return new ComponentInverse(metric.graph(), inverse.components(), inverse.determinant());
    }
}
