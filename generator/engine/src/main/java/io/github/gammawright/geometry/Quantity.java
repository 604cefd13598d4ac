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
    HAMILTONIAN_FLOW("dx^i/dλ, dp_i/dλ", List.of("momentum"));

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

    /** The index structure in n dimensions. */
    public Shape shape(int n) {
        return switch (this) {
            case METRIC, INVERSE_METRIC -> new Shape(List.of(n, n), 0, true);
            case VOLUME_ELEMENT -> new Shape(List.of(), 0, false);
            case METRIC_DERIVATIVE, CHRISTOFFEL, CHRISTOFFEL_FIRST_KIND -> new Shape(List.of(n, n, n), 0, true);
            case CHRISTOFFEL_TRACE, CONTRACTED_CHRISTOFFEL, GEODESIC_ACCELERATION -> new Shape(List.of(n), 0, false);
            case HAMILTONIAN_FLOW -> new Shape(List.of(2 * n), 0, false);
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
