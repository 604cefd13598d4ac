package io.github.gammawright.geometry;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/**
 * One way of several to compute the quantities of a metric.
 *
 * @param inversion how the inverse metric is found
 * @param flow how the acceleration of geodesics and other contractions with vectors are found
 * @param second how second derivatives of the metric enter
 * @param bending how the extrinsic curvature is found
 */
public record Route(Inversion inversion, Flow flow, Second second, Bending bending) {

    /** A route for quantities that need no extrinsic curvature. */
    public Route(Inversion inversion, Flow flow, Second second) {
        this(inversion, flow, second, Bending.CONNECTION);
    }

    /** A route for quantities that need no second derivatives either. */
    public Route(Inversion inversion, Flow flow) {
        this(inversion, flow, Second.METRIC);
    }

    /** How the inverse metric is found. */
    public enum Inversion {
        /** From the components, block by block. */
        BLOCKS,
        /** As the update of a diagonal metric by the square of one one-form, where the metric is one. */
        RANK_ONE
    }

    /** How second derivatives of the metric enter. */
    public enum Second {
        /** As such, with the components of the curvature tensor that have all indices below. */
        METRIC,
        /** As derivatives of the Christoffel symbols. */
        CONNECTION
    }

    /** How the acceleration of geodesics and other contractions with vectors are found. */
    public enum Flow {
        /** From the Christoffel symbols, or the independent components of the curvature tensor. */
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

    private static final Set<Quantity> CONTRACTED = EnumSet.of(
            Quantity.GEODESIC_ACCELERATION,
            Quantity.GEODESIC_ACCELERATION_BY_TIME,
            Quantity.PARALLEL_TRANSPORT,
            Quantity.GEODESIC_DEVIATION);

    private static final Set<Quantity> DIFFERENTIATED_TWICE = EnumSet.of(
            Quantity.CHRISTOFFEL_DERIVATIVE,
            Quantity.RIEMANN,
            Quantity.WEYL,
            Quantity.RICCI,
            Quantity.RICCI_SCALAR,
            Quantity.EINSTEIN);

    /** The route in words, for reports. */
    public String description() {
        return words(inversion).replace(' ', '-')
                + " inverse, flow by "
                + words(flow)
                + (second == Second.CONNECTION ? ", second derivatives by the connection" : "")
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
        if (!Collections.disjoint(quantities, CONTRACTED)) {
            flows.add(Flow.CONTRACTION);
            if (metric.quadraticForm().isPresent()) {
                flows.add(Flow.AUTHORS_FORM);
            }
        }
        List<Second> seconds = new ArrayList<>(List.of(Second.METRIC));
        if (!Collections.disjoint(quantities, DIFFERENTIATED_TWICE)) {
            seconds.add(Second.CONNECTION);
        }
        List<Route> routes = new ArrayList<>();
        for (Inversion inversion : inversions) {
            for (Flow flow : flows) {
                for (Second second : seconds) {
                    for (Bending bending : bendings(metric, quantities)) {
                        routes.add(new Route(inversion, flow, second, bending));
                    }
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
