package io.github.gammawright.geometry;

import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * The geometric quantities that kernels compute. Conventions: signature of any kind, Γ^k_ij in a coordinate basis,
 * signs of Misner, Thorne &amp; Wheeler (1973).
 */
public enum Quantity {
    /** g_ij. */
    METRIC("g_ij", List.of()),
    /** g^ij. */
    INVERSE_METRIC("g^ij", List.of()),
    /** √|det g|. */
    VOLUME_ELEMENT("√|det g|", List.of()),
    /** ∂_k g_ij; k, i, j. */
    METRIC_DERIVATIVE("∂_k g_ij", List.of()),
    /** Γ^k_ij; k, i, j. */
    CHRISTOFFEL("Γ^k_ij", List.of()),
    /** Γ_kij = ½ (∂_i g_kj + ∂_j g_ki − ∂_k g_ij); k, i, j. */
    CHRISTOFFEL_FIRST_KIND("Γ_kij", List.of()),
    /** Γ^m_mk = ∂_k ln √|g|. */
    CHRISTOFFEL_TRACE("Γ^m_mk", List.of()),
    /** g^ij Γ^k_ij. */
    CONTRACTED_CHRISTOFFEL("g^ij Γ^k_ij", List.of()),
    /** ∂_l Γ^k_ij; l, k, i, j. */
    CHRISTOFFEL_DERIVATIVE("∂_l Γ^k_ij", List.of()),
    /** −Γ^k_ij u^i u^j. */
    GEODESIC_ACCELERATION("−Γ^k_ij u^i u^j", List.of("velocity")),
    /** −Γ^k_ij v^i v^j + v^k Γ^0_ij v^i v^j, k ≥ 1, with v^k = dx^k/dt and v^0 = 1. */
    GEODESIC_ACCELERATION_BY_TIME("−Γ^k_ij v^i v^j + v^k Γ^0_ij v^i v^j", List.of("coordinateVelocity")),
    /** dx^i/dλ, then dp_i/dλ, of H = ½ g^ij p_i p_j. */
    HAMILTONIAN_FLOW("dx^i/dλ, dp_i/dλ", List.of("momentum")),
    /** The Hamiltonian flow divided by dx^0/dλ: dx^k/dt, then dp_k/dt, k ≥ 1. */
    HAMILTONIAN_FLOW_BY_TIME("dx^k/dt, dp_k/dt", List.of("momentum")),
    /** −Γ^k_ij u^i v^j. */
    PARALLEL_TRANSPORT("−Γ^k_ij u^i v^j", List.of("velocity", "vector")),
    /** D²ξ^k/dλ² = −R^k_ijl u^i ξ^j u^l. */
    GEODESIC_DEVIATION("−R^k_ijl u^i ξ^j u^l", List.of("velocity", "separation")),
    /** R^k_lij; k, l, i, j; where symmetric components are stored once, R_klij. */
    RIEMANN("R^k_lij", List.of()),
    /** C^k_lij; k, l, i, j; where symmetric components are stored once, C_klij. */
    WEYL("C^k_lij", List.of()),
    /** R_ij = R^k_ikj. */
    RICCI("R_ij", List.of()),
    /** R = g^ij R_ij. */
    RICCI_SCALAR("R", List.of()),
    /** R_ij − ½ g_ij R. */
    EINSTEIN("R_ij − ½ g_ij R", List.of()),
    /** R_klij R^klij. */
    KRETSCHMANN("R_klij R^klij", List.of()),
    /** e_a^i with g(e_a, e_b) = ±δ_ab; a, i. The coframe's frame, or else the one of {@link FramePlan}. */
    ORTHONORMAL_FRAME("e_a^i", List.of()),
    /** γ_abc = g(e_a, ∇_c e_b), Ricci's rotation coefficients, −γ_bac; a, b, c: c is the direction of the derivative. */
    ROTATION_COEFFICIENTS("γ_abc", List.of()),
    /** ½ √|g| ∂_k g_ij, to be multiplied with T^ij; k, i, j. */
    STRESS_SOURCE("½ √|g| ∂_k g_ij", List.of()),
    /** α = 1/√(−g^tt), t the first coordinate. */
    LAPSE("α", List.of()),
    /** β^i = −g^ti/g^tt; i from the second coordinate on, as all indices of spatial quantities. */
    SHIFT("β^i", List.of()),
    /** γ_ij = g_ij. */
    SPATIAL_METRIC("γ_ij", List.of()),
    /** γ^ij, the inverse of γ_ij. */
    INVERSE_SPATIAL_METRIC("γ^ij", List.of()),
    /** √det γ. */
    SPATIAL_VOLUME_ELEMENT("√det γ", List.of()),
    /** Γ^k_ij of γ_ij; k, i, j. */
    SPATIAL_CHRISTOFFEL("Γ^k_ij of γ_ij", List.of()),
    /** ∂_k α, k a spatial coordinate. */
    LAPSE_DERIVATIVE("∂_k α", List.of()),
    /** ∂_k β^i; k, i. */
    SHIFT_DERIVATIVE("∂_k β^i", List.of()),
    /** ∂_k γ_ij; k, i, j. */
    SPATIAL_METRIC_DERIVATIVE("∂_k γ_ij", List.of()),
    /** K_ij = −½ L_n γ_ij = (D_i β_j + D_j β_i − ∂_t γ_ij)/2α (York 1979): negative where space expands. */
    EXTRINSIC_CURVATURE("K_ij", List.of()),
    /** K = γ^ij K_ij. */
    MEAN_CURVATURE("K", List.of());

    private final String formula;
    private final List<String> furtherInputs;

    Quantity(String formula, List<String> furtherInputs) {
        this.formula = formula;
        this.furtherInputs = furtherInputs;
    }

    /** The part of the geometry from which the components can be made that takes the most work to compute itself. */
    public Optional<Geometry.Part> madeOf() {
        return switch (this) {
            case RIEMANN, WEYL, RICCI, RICCI_SCALAR, EINSTEIN, KRETSCHMANN, GEODESIC_DEVIATION ->
                Optional.of(Geometry.Part.CURVATURE);
            case CHRISTOFFEL_DERIVATIVE, PARALLEL_TRANSPORT, GEODESIC_ACCELERATION_BY_TIME ->
                Optional.of(Geometry.Part.CONNECTION);
            default -> Optional.empty();
        };
    }

    /** The name on the command line and in definitions, such as {@code geodesic-acceleration}. */
    public String symbol() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** The name as part of a class name, such as {@code GeodesicAcceleration}. */
    public String classSuffix() {
        StringBuilder suffix = new StringBuilder();
        for (String word : symbol().split("-")) {
            suffix.append(Character.toUpperCase(word.charAt(0))).append(word, 1, word.length());
        }
        return suffix.toString();
    }

    /** The name as a variable, such as {@code geodesicAcceleration}. */
    public String variableName() {
        String suffix = classSuffix();
        return Character.toLowerCase(suffix.charAt(0)) + suffix.substring(1);
    }

    /** The component in the notation of the trade. */
    public String formula() {
        return formula;
    }

    /** The component that a layout stores, in the notation of the trade. */
    public String formula(Layout layout) {
        return layout != Layout.FULL && isCurvatureTensor() ? formula.replace("^k_lij", "_klij") : formula;
    }

    /**
     * Whether the components are those of a curvature tensor: R^k_lij in the full layout, and in the others the
     * independent ones of R_klij.
     */
    public boolean isCurvatureTensor() {
        return this == RIEMANN || this == WEYL;
    }

    /** The arrays that {@code evaluate} takes between the point and the result, by their names. */
    public List<String> furtherInputs() {
        return furtherInputs;
    }

    /** Whether the quantity belongs to the 3+1 split by the first coordinate, which not every metric allows. */
    public boolean isOfSplit() {
        return switch (this) {
            case LAPSE,
                    SHIFT,
                    SPATIAL_METRIC,
                    INVERSE_SPATIAL_METRIC,
                    SPATIAL_VOLUME_ELEMENT,
                    SPATIAL_CHRISTOFFEL,
                    LAPSE_DERIVATIVE,
                    SHIFT_DERIVATIVE,
                    SPATIAL_METRIC_DERIVATIVE,
                    EXTRINSIC_CURVATURE,
                    MEAN_CURVATURE -> true;
            default -> false;
        };
    }

    /** Whether the quantity needs an orthonormal frame, which not every metric has in the whole domain. */
    public boolean isOfFrame() {
        return this == ORTHONORMAL_FRAME || this == ROTATION_COEFFICIENTS;
    }

    /** The index structure in n dimensions. */
    public Shape shape(int n) {
        return switch (this) {
            case METRIC, INVERSE_METRIC, RICCI, EINSTEIN -> new Shape(List.of(n, n), 0, true);
            case VOLUME_ELEMENT, RICCI_SCALAR, KRETSCHMANN -> new Shape(List.of(), 0, false);
            case METRIC_DERIVATIVE, CHRISTOFFEL, CHRISTOFFEL_FIRST_KIND, STRESS_SOURCE ->
                new Shape(List.of(n, n, n), 0, true);
            case CHRISTOFFEL_DERIVATIVE -> new Shape(List.of(n, n, n, n), 0, true);
            case CHRISTOFFEL_TRACE,
                    CONTRACTED_CHRISTOFFEL,
                    GEODESIC_ACCELERATION,
                    PARALLEL_TRANSPORT,
                    GEODESIC_DEVIATION -> new Shape(List.of(n), 0, false);
            case GEODESIC_ACCELERATION_BY_TIME -> new Shape(List.of(n - 1), 1, false);
            case HAMILTONIAN_FLOW -> new Shape(List.of(2 * n), 0, false);
            case HAMILTONIAN_FLOW_BY_TIME -> new Shape(List.of(2 * (n - 1)), 0, false);
            case RIEMANN, WEYL -> new Shape(List.of(n, n, n, n), 0, Shape.Symmetry.CURVATURE);
            case ORTHONORMAL_FRAME -> new Shape(List.of(n, n), 0, false);
            case ROTATION_COEFFICIENTS -> new Shape(List.of(n, n, n), 0, false);
            case LAPSE, SPATIAL_VOLUME_ELEMENT, MEAN_CURVATURE -> new Shape(List.of(), 1, false);
            case SHIFT, LAPSE_DERIVATIVE -> new Shape(List.of(n - 1), 1, false);
            case SHIFT_DERIVATIVE -> new Shape(List.of(n - 1, n - 1), 1, false);
            case SPATIAL_METRIC, INVERSE_SPATIAL_METRIC, EXTRINSIC_CURVATURE ->
                new Shape(List.of(n - 1, n - 1), 1, true);
            case SPATIAL_CHRISTOFFEL, SPATIAL_METRIC_DERIVATIVE -> new Shape(List.of(n - 1, n - 1, n - 1), 1, true);
        };
    }

    /** The quantity of the given name, if there is one. */
    public static Optional<Quantity> named(String symbol) {
        for (Quantity quantity : values()) {
            if (quantity.symbol().equals(symbol)) {
                return Optional.of(quantity);
            }
        }
        return Optional.empty();
    }
}
