package io.github.gammawright.generation;

import io.github.gammawright.algebra.FormStyle;
import io.github.gammawright.algebra.NormalForms;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.CommonRoot;
import io.github.gammawright.geometry.Geometry;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.MetricGraph;
import io.github.gammawright.geometry.MetricGraphBuilder;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Route;
import io.github.gammawright.geometry.Shape;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The components of a quantity as a reader would write them: the ones that are not zero, symmetric ones once, in closed
 * form where the algebra finds one, the author's abbreviations kept and listed first.
 */
public final class FormulaView {

    private FormulaView() {}

    /**
     * One line for each abbreviation that is used and for each component, such as {@code Γ^t_tr = …}; a single line that
     * says so if all components vanish.
     *
     * @throws io.github.gammawright.diagnostic.DefinitionException for mistakes of the definition that show only when
     *     its metric is built
     */
    public static List<String> lines(MetricDefinition definition, Quantity quantity, FormulaPrinter.Form form) {
        return MetricMistakes.reported(definition, () -> build(definition, quantity, form));
    }

    private static List<String> build(MetricDefinition definition, Quantity quantity, FormulaPrinter.Form form) {
        Applicability.require(definition, List.of(quantity));
        MetricGraph metric = MetricGraphBuilder.build(definition);
        List<Route> routes = Route.candidates(metric, List.of(quantity));
        // of the routes of a split the last makes use of most of what the author wrote
        Route route = routes.get(quantity.isOfSplit() ? routes.size() - 1 : 0);
        Geometry geometry = new Geometry(metric, route, Applicability.framePlan(definition, List.of(quantity)));
        List<Node> entries = geometry.entries(quantity, Layout.PACKED);
        ComponentLabels labels = new ComponentLabels(definition.coordinates(), quantity, form);
        Shape shape = quantity.shape(definition.dimension());
        Map<String, Node> values = new LinkedHashMap<>();
        List<int[]> tuples = shape.independentTuples();
        for (int entry = 0; entry < tuples.size(); entry++) {
            int[] tuple = tuples.get(entry);
            Node component = entries.get(entry);
            // γ_abc = −γ_bac
            boolean again = quantity == Quantity.ROTATION_COEFFICIENTS && tuple[0] < tuple[1];
            if (!component.isZero() && !again) {
                values.put(labels.label(asWritten(shape, tuple)), component);
            }
        }
        if (values.isEmpty()) {
            return List.of(
                    form == FormulaPrinter.Form.TEXT ? "every component is zero" : "\\text{every component is zero}");
        }
        List<String> computed = lines(metric.graph(), form, values);
        List<String> closed = closed(metric, geometry.commonRoot(quantity), form, values);
        // roots among the author's abbreviations can swell closed forms beyond reading
        return length(closed) > length(computed) ? computed : closed;
    }

    private static int length(List<String> lines) {
        return lines.stream().mapToInt(String::length).sum();
    }

    private static List<String> lines(ExpressionGraph graph, FormulaPrinter.Form form, Map<String, Node> values) {
        return new FormulaPrinter(graph, form)
                .lines(values).stream()
                        .map(line -> line.name() + " = " + line.formula())
                        .toList();
    }

    private static List<String> closed(
            MetricGraph metric, Optional<CommonRoot> root, FormulaPrinter.Form form, Map<String, Node> values) {
        NormalForms forms = new NormalForms(metric.graph(), FormStyle.READABLE);
        Map<Node, Node> known = new HashMap<>();
        Map<String, Node> closed = new LinkedHashMap<>();
        values.forEach((label, value) ->
                closed.put(label, known.computeIfAbsent(value, v -> readable(metric, forms, root, v))));
        return lines(forms.target(), form, closed);
    }

    private static Node readable(MetricGraph metric, NormalForms forms, Optional<CommonRoot> root, Node value) {
        if (root.isEmpty()) {
            return readable(forms, value);
        }
        Node radicand = root.get().radicand();
        Node plain = root.get().power(metric.graph(), radicand, metric.notNegative());
        Node rest = metric.graph().divide(value, plain);
        Node power = root.get().power(forms.target(), readable(forms, radicand), metric.notNegative());
        return forms.target().multiply(readable(forms, rest), power);
    }

    private static Node readable(NormalForms forms, Node value) {
        return forms.factored(value).orElseGet(() -> forms.copied(value));
    }

    /** Of a symmetric pair the earlier coordinate comes first, as one writes it; so it does in both antisymmetric ones. */
    private static int[] asWritten(Shape shape, int... tuple) {
        if (shape.symmetry() == Shape.Symmetry.CURVATURE) {
            return new int[] {tuple[1], tuple[0], tuple[3], tuple[2]};
        }
        int[] written = tuple.clone();
        if (shape.symmetricPair()) {
            int last = written.length - 1;
            written[last] = tuple[last - 1];
            written[last - 1] = tuple[last];
        }
        return written;
    }
}
