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
    /** −Γ^k_ij u^i u^j. */
    GEODESIC_ACCELERATION("−Γ^k_ij u^i u^j", List.of("velocity")),
    /** dx^i/dλ, then dp_i/dλ, of H = ½ g^ij p_i p_j. */
    HAMILTONIAN_FLOW("dx^i/dλ, dp_i/dλ", List.of("momentum")),
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
            case METRIC, INVERSE_METRIC -> new Shape(List.of(n, n), 0, true);
            case VOLUME_ELEMENT -> new Shape(List.of(), 0, false);
            case ORTHONORMAL_FRAME -> new Shape(List.of(n, n), 0, false);
            case ROTATION_COEFFICIENTS -> new Shape(List.of(n, n, n), 0, false);
            case METRIC_DERIVATIVE, CHRISTOFFEL, CHRISTOFFEL_FIRST_KIND, STRESS_SOURCE ->
                new Shape(List.of(n, n, n), 0, true);
            case CHRISTOFFEL_TRACE, CONTRACTED_CHRISTOFFEL, GEODESIC_ACCELERATION -> new Shape(List.of(n), 0, false);
            case HAMILTONIAN_FLOW -> new Shape(List.of(2 * n), 0, false);
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
