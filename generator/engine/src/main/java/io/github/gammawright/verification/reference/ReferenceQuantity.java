package io.github.gammawright.verification.reference;

import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * The quantities that the reference computes, under the names that definitions use, with the index structure that their
 * values have.
 */
public enum ReferenceQuantity {
    METRIC(0, Indices.SYMMETRIC_2),
    INVERSE_METRIC(0, Indices.SYMMETRIC_2),
    VOLUME_ELEMENT(0, Indices.SCALAR),
    METRIC_DERIVATIVE(1, Indices.SYMMETRIC_3),
    CHRISTOFFEL(1, Indices.SYMMETRIC_3),
    CHRISTOFFEL_FIRST_KIND(1, Indices.SYMMETRIC_3),
    CHRISTOFFEL_TRACE(1, Indices.VECTOR),
    CONTRACTED_CHRISTOFFEL(1, Indices.VECTOR),
    CHRISTOFFEL_DERIVATIVE(2, Indices.SYMMETRIC_4),
    GEODESIC_ACCELERATION(1, Indices.VECTOR, Input.FULL),
    GEODESIC_ACCELERATION_BY_TIME(1, Indices.SPATIAL_VECTOR, Input.SPATIAL),
    HAMILTONIAN_FLOW(1, Indices.PHASE, Input.FULL),
    HAMILTONIAN_FLOW_BY_TIME(1, Indices.SPATIAL_PHASE, Input.FULL),
    PARALLEL_TRANSPORT(1, Indices.VECTOR, Input.FULL, Input.FULL),
    GEODESIC_DEVIATION(2, Indices.VECTOR, Input.FULL, Input.FULL),
    RIEMANN(2, Indices.CURVATURE),
    WEYL(2, Indices.CURVATURE),
    /** R_klij, all indices below: what the packed layout of {@link #RIEMANN} holds. */
    LOWERED_RIEMANN(2, Indices.CURVATURE),
    /** C_klij, all indices below: what the packed layout of {@link #WEYL} holds. */
    LOWERED_WEYL(2, Indices.CURVATURE),
    RICCI(2, Indices.SYMMETRIC_2),
    RICCI_SCALAR(2, Indices.SCALAR),
    EINSTEIN(2, Indices.SYMMETRIC_2),
    KRETSCHMANN(2, Indices.SCALAR),
    /** e_a^i; a, i. */
    ORTHONORMAL_FRAME(0, Indices.MATRIX),
    /** γ_abc = g(e_a, ∇_c e_b); a, b, c. */
    ROTATION_COEFFICIENTS(1, Indices.TENSOR_3),
    LAPSE(0, Indices.SCALAR),
    SHIFT(0, Indices.SPATIAL_VECTOR),
    SPATIAL_METRIC(0, Indices.SPATIAL_SYMMETRIC_2),
    INVERSE_SPATIAL_METRIC(0, Indices.SPATIAL_SYMMETRIC_2),
    SPATIAL_VOLUME_ELEMENT(0, Indices.SCALAR),
    SPATIAL_CHRISTOFFEL(1, Indices.SPATIAL_SYMMETRIC_3),
    /** ∂_k α, k over the spatial coordinates. */
    LAPSE_DERIVATIVE(1, Indices.SPATIAL_VECTOR),
    /** ∂_k β^i; k, i over the spatial coordinates. */
    SHIFT_DERIVATIVE(1, Indices.SPATIAL_MATRIX),
    SPATIAL_METRIC_DERIVATIVE(1, Indices.SPATIAL_SYMMETRIC_3),
    EXTRINSIC_CURVATURE(1, Indices.SPATIAL_SYMMETRIC_2),
    MEAN_CURVATURE(1, Indices.SCALAR),
    STRESS_SOURCE(1, Indices.SYMMETRIC_3);

    private final int metricOrder;
    private final Indices indices;
    private final List<Input> inputs;

    ReferenceQuantity(int metricOrder, Indices indices, Input... inputs) {
        this.metricOrder = metricOrder;
        this.indices = indices;
        this.inputs = List.of(inputs);
    }

    /** The name in definitions, such as {@code geodesic-acceleration}. */
    public String symbol() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** The quantity of the given name, if the reference has it. */
    public static Optional<ReferenceQuantity> named(String symbol) {
        for (ReferenceQuantity quantity : values()) {
            if (quantity.symbol().equals(symbol)) {
                return Optional.of(quantity);
            }
        }
        return Optional.empty();
    }

    /** Whether the quantity belongs to an orthonormal frame. */
    boolean isOfFrame() {
        return this == ORTHONORMAL_FRAME || this == ROTATION_COEFFICIENTS;
    }

    /** How many derivatives of the metric the quantity needs. */
    int metricOrder() {
        return metricOrder;
    }

    /** The number of values of each index in n dimensions, outermost first; empty for a scalar. */
    public List<Integer> extents(int n) {
        return switch (indices) {
            case SCALAR -> List.of();
            case VECTOR -> List.of(n);
            case SYMMETRIC_2, MATRIX -> List.of(n, n);
            case SYMMETRIC_3, TENSOR_3 -> List.of(n, n, n);
            case SYMMETRIC_4, CURVATURE -> List.of(n, n, n, n);
            case PHASE -> List.of(2 * n);
            case SPATIAL_VECTOR -> List.of(n - 1);
            case SPATIAL_MATRIX, SPATIAL_SYMMETRIC_2 -> List.of(n - 1, n - 1);
            case SPATIAL_SYMMETRIC_3 -> List.of(n - 1, n - 1, n - 1);
            case SPATIAL_PHASE -> List.of(2 * (n - 1));
        };
    }

    /**
     * Whether the components are those of a curvature tensor: k, l, i, j, antisymmetric in i and j and, with all indices
     * below, in k and l, and symmetric under exchange of the pairs.
     */
    public boolean isCurvature() {
        return indices == Indices.CURVATURE;
    }

    /** The quantity whose independent components the layouts other than the full one hold. */
    public ReferenceQuantity packedForm() {
        return switch (this) {
            case RIEMANN -> LOWERED_RIEMANN;
            case WEYL -> LOWERED_WEYL;
            default -> this;
        };
    }

    /** Whether exchanging the last two indices leaves the value as it is. */
    public boolean isSymmetricInLastPair() {
        return indices.symmetric;
    }

    /** The lengths of the arrays that are needed beside the point, in order. */
    public List<Integer> inputLengths(int n) {
        return inputs.stream().map(input -> input == Input.FULL ? n : n - 1).toList();
    }

    private enum Input {
        FULL,
        SPATIAL
    }

    private enum Indices {
        SCALAR(false),
        VECTOR(false),
        MATRIX(false),
        TENSOR_3(false),
        SYMMETRIC_2(true),
        SYMMETRIC_3(true),
        SYMMETRIC_4(true),
        CURVATURE(false),
        PHASE(false),
        SPATIAL_VECTOR(false),
        SPATIAL_MATRIX(false),
        SPATIAL_SYMMETRIC_2(true),
        SPATIAL_SYMMETRIC_3(true),
        SPATIAL_PHASE(false);

        private final boolean symmetric;

        Indices(boolean symmetric) {
            this.symmetric = symmetric;
        }
    }
}
