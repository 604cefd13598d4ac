package io.github.gammawright.generation;

import io.github.gammawright.geometry.Quantity;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;

/** What components are called in formulas: Γ^t_{t r} in text, {@code \Gamma^{t}_{t r}} in LaTeX. */
final class ComponentLabels {

    private final List<String> names;
    private final Quantity quantity;
    private final boolean latex;

    ComponentLabels(List<String> coordinates, Quantity quantity, FormulaPrinter.Form form) {
        this.quantity = quantity;
        this.latex = form == FormulaPrinter.Form.LATEX;
        this.names = latex ? coordinates.stream().map(LatexNames::of).toList() : coordinates;
    }

    /** The label of the component with the given indices, counted from 0. */
    String label(int... tuple) {
        return switch (quantity) {
            case METRIC -> "g" + lower(tuple);
            case INVERSE_METRIC -> "g" + upper(tuple);
            case VOLUME_ELEMENT -> latex ? "\\sqrt{|g|}" : "√|g|";
            case METRIC_DERIVATIVE -> partial(tuple[0]) + " g" + lower(tuple[1], tuple[2]);
            case CHRISTOFFEL -> gamma() + upper(tuple[0]) + lower(tuple[1], tuple[2]);
            case CHRISTOFFEL_FIRST_KIND -> gamma() + lower(tuple);
            case CHRISTOFFEL_TRACE -> gamma() + "^m" + group("_", "m", names.get(tuple[0]));
            case CONTRACTED_CHRISTOFFEL ->
                "g" + group("^", "i", "j") + " " + gamma() + upper(tuple[0]) + group("_", "i", "j");
            case CHRISTOFFEL_DERIVATIVE ->
                partial(tuple[0]) + " " + gamma() + upper(tuple[1]) + lower(tuple[2], tuple[3]);
            case GEODESIC_ACCELERATION -> rate("u" + upper(tuple[0]));
            case GEODESIC_ACCELERATION_BY_TIME -> rateByTime("v" + upper(tuple[0] + 1));
            case HAMILTONIAN_FLOW ->
                tuple[0] < names.size() ? rate(names.get(tuple[0])) : rate("p" + lower(tuple[0] - names.size()));
            case HAMILTONIAN_FLOW_BY_TIME ->
                tuple[0] < names.size() - 1
                        ? rateByTime(names.get(tuple[0] + 1))
                        : rateByTime("p" + lower(tuple[0] - names.size() + 2));
            case PARALLEL_TRANSPORT -> rate("v" + upper(tuple[0]));
            case GEODESIC_DEVIATION ->
                latex ? "\\frac{D^2 \\xi" + upper(tuple[0]) + "}{d\\lambda^2}" : "D²ξ" + upper(tuple[0]) + "/dλ²";
            case RIEMANN -> "R" + lower(tuple);
            case WEYL -> "C" + lower(tuple);
            case RICCI -> "R" + lower(tuple);
            case RICCI_SCALAR -> "R";
            case EINSTEIN -> "G" + lower(tuple);
            case KRETSCHMANN -> latex ? "R_{klij} R^{klij}" : "R_klij R^klij";
            case ORTHONORMAL_FRAME -> "e" + legs(tuple[0]) + upper(tuple[1]);
            case ROTATION_COEFFICIENTS -> smallGamma() + legs(tuple);
            case STRESS_SOURCE ->
                (latex ? "\\tfrac{1}{2} \\sqrt{|g|} " : "½ √|g| ") + partial(tuple[0]) + " g"
                        + lower(tuple[1], tuple[2]);
            case LAPSE -> alpha();
            case SHIFT -> beta() + upper(space(tuple));
            case SPATIAL_METRIC -> smallGamma() + lower(space(tuple));
            case INVERSE_SPATIAL_METRIC -> smallGamma() + upper(space(tuple));
            case SPATIAL_VOLUME_ELEMENT -> latex ? "\\sqrt{\\gamma}" : "√γ";
            case SPATIAL_CHRISTOFFEL -> gamma() + upper(tuple[0] + 1) + lower(tuple[1] + 1, tuple[2] + 1);
            case LAPSE_DERIVATIVE -> partial(tuple[0] + 1) + " " + alpha();
            case SHIFT_DERIVATIVE -> partial(tuple[0] + 1) + " " + beta() + upper(tuple[1] + 1);
            case SPATIAL_METRIC_DERIVATIVE ->
                partial(tuple[0] + 1) + " " + smallGamma() + lower(tuple[1] + 1, tuple[2] + 1);
            case EXTRINSIC_CURVATURE -> "K" + lower(space(tuple));
            case MEAN_CURVATURE -> "K";
        };
    }

    /** Spatial indices as numbers of coordinates. */
    private static int[] space(int... tuple) {
        return Arrays.stream(tuple).map(i -> i + 1).toArray();
    }

    /** Legs of a frame are numbered. */
    private String legs(int... legs) {
        String numbers = Arrays.stream(legs).mapToObj(leg -> "(" + leg + ")").collect(Collectors.joining());
        return latex ? "_{" + numbers + "}" : "_" + numbers;
    }

    private String alpha() {
        return latex ? "\\alpha" : "α";
    }

    private String beta() {
        return latex ? "\\beta" : "β";
    }

    private String smallGamma() {
        return latex ? "\\gamma" : "γ";
    }

    private String gamma() {
        return latex ? "\\Gamma" : "Γ";
    }

    private String partial(int k) {
        return (latex ? "\\partial" : "∂") + lower(k);
    }

    private String rate(String of) {
        return latex ? "\\frac{d " + of + "}{d\\lambda}" : "d " + of + "/dλ";
    }

    private String rateByTime(String of) {
        String time = names.get(0);
        return latex ? "\\frac{d " + of + "}{d " + time + "}" : "d " + of + "/d" + time;
    }

    private String upper(int... indices) {
        return group("^", namesOf(indices));
    }

    private String lower(int... indices) {
        return group("_", namesOf(indices));
    }

    private String[] namesOf(int... indices) {
        return Arrays.stream(indices).mapToObj(names::get).toArray(String[]::new);
    }

    /** Index names without a space where each is one letter, as one writes them. */
    private String group(String position, String... indices) {
        boolean letters = Arrays.stream(indices).allMatch(name -> name.codePointCount(0, name.length()) == 1);
        String joined = Arrays.stream(indices).collect(Collectors.joining(letters ? "" : " "));
        boolean brace = latex || (indices.length > 1 && !letters);
        return position + (brace ? "{" + joined + "}" : joined);
    }
}
