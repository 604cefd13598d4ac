package io.github.gammawright.generation;

import io.github.gammawright.algebra.FormStyle;
import io.github.gammawright.algebra.NormalForms;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.DomainSigns;
import io.github.gammawright.geometry.Geometry;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.MetricGraph;
import io.github.gammawright.geometry.MetricGraphBuilder;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Route;
import io.github.gammawright.geometry.Shape;
import io.github.gammawright.geometry.VolumeElement;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

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
        Route route = Route.candidates(metric, List.of(quantity)).get(0);
        Geometry geometry = new Geometry(metric, route, Applicability.framePlan(definition, List.of(quantity)));
        List<Node> entries = geometry.entries(quantity, Layout.PACKED);
        NormalForms forms = new NormalForms(metric.graph(), FormStyle.READABLE);
        ExpressionGraph graph = forms.target();
        ComponentLabels labels = new ComponentLabels(definition.coordinates(), quantity, form);
        Shape shape = quantity.shape(definition.dimension());
        Map<Node, Node> known = new HashMap<>();
        Map<String, Node> values = new LinkedHashMap<>();
        List<int[]> tuples = shape.independentTuples();
        for (int entry = 0; entry < tuples.size(); entry++) {
            int[] tuple = tuples.get(entry);
            Node component = entries.get(entry);
            if (!component.isZero()) {
                Node readable = quantity == Quantity.VOLUME_ELEMENT
                        ? VolumeElement.of(graph, readable(forms, geometry.determinant()), new DomainSigns(definition))
                        : known.computeIfAbsent(component, c -> readable(forms, c));
                values.put(labels.label(asWritten(shape, tuple)), readable);
            }
        }
        if (values.isEmpty()) {
            return List.of(
                    form == FormulaPrinter.Form.TEXT ? "every component is zero" : "\\text{every component is zero}");
        }
        return new FormulaPrinter(graph, form)
                .lines(values).stream()
                        .map(line -> line.name() + " = " + line.formula())
                        .toList();
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
