package io.github.gammawright.verification.reference;

import io.github.gammawright.definition.ElementaryFunction;
import java.util.ArrayList;
import java.util.List;

/** The components of each quantity as power series, row-major over all its indices. */
final class QuantityFormulas {

    private QuantityFormulas() {}

    /**
     * The components of a quantity.
     *
     * @param geometry of a metric known to at least the order that the quantity needs
     * @param inputs velocities, momenta and other vectors, as many as the quantity takes
     */
    static Taylor[] components(ReferenceQuantity quantity, ReferenceGeometry geometry, List<Taylor[]> inputs) {
        return switch (quantity) {
            case METRIC -> flat(geometry.metric());
            case INVERSE_METRIC -> flat(geometry.inverse(geometry.order()));
            case VOLUME_ELEMENT -> one(volume(geometry));
            case METRIC_DERIVATIVE -> flat(geometry.metricDerivative());
            case CHRISTOFFEL -> flat(geometry.christoffel());
            case CHRISTOFFEL_FIRST_KIND -> flat(geometry.firstKind());
            case CHRISTOFFEL_TRACE -> trace(geometry);
            case CONTRACTED_CHRISTOFFEL -> contracted(geometry);
            case CHRISTOFFEL_DERIVATIVE -> christoffelDerivative(geometry);
            case GEODESIC_ACCELERATION -> ReferenceMotion.transport(geometry, inputs.get(0), inputs.get(0));
            case GEODESIC_ACCELERATION_BY_TIME -> ReferenceMotion.accelerationByTime(geometry, inputs.get(0));
            case HAMILTONIAN_FLOW -> ReferenceMotion.hamiltonianFlow(geometry, inputs.get(0));
            case HAMILTONIAN_FLOW_BY_TIME -> ReferenceMotion.hamiltonianFlowByTime(geometry, inputs.get(0));
            case PARALLEL_TRANSPORT -> ReferenceMotion.transport(geometry, inputs.get(0), inputs.get(1));
            case GEODESIC_DEVIATION -> ReferenceMotion.deviation(geometry, inputs.get(0), inputs.get(1));
            case RIEMANN -> flat(new ReferenceCurvature(geometry).riemann());
            case WEYL -> flat(new ReferenceCurvature(geometry).weyl());
            case LOWERED_RIEMANN -> flat(new ReferenceCurvature(geometry).loweredRiemann());
            case LOWERED_WEYL -> flat(new ReferenceCurvature(geometry).loweredWeyl());
            case RICCI -> flat(new ReferenceCurvature(geometry).ricci());
            case RICCI_SCALAR -> one(new ReferenceCurvature(geometry).scalar());
            case EINSTEIN -> flat(new ReferenceCurvature(geometry).einstein());
            case KRETSCHMANN -> one(new ReferenceCurvature(geometry).kretschmann());
            case STRESS_SOURCE -> stressSource(geometry);
            default -> slicing(quantity, new ReferenceSlicing(geometry));
        };
    }

    private static Taylor[] slicing(ReferenceQuantity quantity, ReferenceSlicing slicing) {
        ReferenceGeometry spatial = slicing.spatial();
        return switch (quantity) {
            case LAPSE -> one(slicing.lapse());
            case SHIFT -> slicing.shift();
            case SPATIAL_METRIC -> flat(spatial.metric());
            case INVERSE_SPATIAL_METRIC -> flat(spatial.inverse(spatial.order()));
            case SPATIAL_VOLUME_ELEMENT -> one(spatial.determinant().sqrt());
            case SPATIAL_CHRISTOFFEL -> flat(spatial.christoffel());
            case LAPSE_DERIVATIVE -> slicing.lapseDerivative();
            case SHIFT_DERIVATIVE -> flat(slicing.shiftDerivative());
            case SPATIAL_METRIC_DERIVATIVE -> flat(spatial.metricDerivative());
            case EXTRINSIC_CURVATURE -> flat(slicing.extrinsicCurvature());
            case MEAN_CURVATURE -> one(slicing.meanCurvature());
            default -> throw new IllegalArgumentException(quantity + " is not of the 3+1 split");
        };
    }

    /** √|det g|. */
    private static Taylor volume(ReferenceGeometry geometry) {
        return TaylorFunctions.apply(ElementaryFunction.ABS, geometry.determinant())
                .sqrt();
    }

    /** Γ^m_mk = ½ g^ij ∂_k g_ij. */
    private static Taylor[] trace(ReferenceGeometry geometry) {
        int n = geometry.dimension();
        Taylor[][] inverse = geometry.inverse(geometry.order() - 1);
        Taylor[] trace = new Taylor[n];
        for (int k = 0; k < n; k++) {
            trace[k] = contraction(geometry, inverse, geometry.metricDerivative()[k])
                    .half();
        }
        return trace;
    }

    /** g^ij Γ^k_ij. */
    private static Taylor[] contracted(ReferenceGeometry geometry) {
        int n = geometry.dimension();
        Taylor[][] inverse = geometry.inverse(geometry.order() - 1);
        Taylor[] contracted = new Taylor[n];
        for (int k = 0; k < n; k++) {
            contracted[k] = contraction(geometry, inverse, geometry.christoffel()[k]);
        }
        return contracted;
    }

    private static Taylor contraction(ReferenceGeometry geometry, Taylor[][] a, Taylor[][] b) {
        Taylor sum = geometry.zero(geometry.order() - 1);
        for (int i = 0; i < a.length; i++) {
            for (int j = 0; j < a.length; j++) {
                sum = ReferenceGeometry.plusProduct(sum, a[i][j], b[i][j]);
            }
        }
        return sum;
    }

    /** ∂_l Γ^k_ij; l, k, i, j. */
    private static Taylor[] christoffelDerivative(ReferenceGeometry geometry) {
        List<Taylor> all = new ArrayList<>();
        for (int l = 0; l < geometry.dimension(); l++) {
            for (Taylor component : flat(geometry.christoffel())) {
                all.add(geometry.derivative(component, l));
            }
        }
        return all.toArray(Taylor[]::new);
    }

    /** ½ √|g| ∂_k g_ij; k, i, j. */
    private static Taylor[] stressSource(ReferenceGeometry geometry) {
        Taylor half = volume(geometry).half();
        Taylor[] source = flat(geometry.metricDerivative());
        for (int i = 0; i < source.length; i++) {
            source[i] = source[i].times(half);
        }
        return source;
    }

    private static Taylor[] one(Taylor scalar) {
        return new Taylor[] {scalar};
    }

    private static Taylor[] flat(Object[] nested) {
        List<Taylor> all = new ArrayList<>();
        collect(nested, all);
        return all.toArray(Taylor[]::new);
    }

    private static void collect(Object[] nested, List<Taylor> all) {
        for (Object entry : nested) {
            if (entry instanceof Taylor component) {
                all.add(component);
            } else {
                collect((Object[]) entry, all);
            }
        }
    }
}
