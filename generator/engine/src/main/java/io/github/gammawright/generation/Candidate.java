package io.github.gammawright.generation;

import io.github.gammawright.algebra.AlgebraBudget;
import io.github.gammawright.algebra.FormStyle;
import io.github.gammawright.algebra.NormalForms;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.DomainSigns;
import io.github.gammawright.geometry.FramePlan;
import io.github.gammawright.geometry.Geometry;
import io.github.gammawright.geometry.MetricGraph;
import io.github.gammawright.geometry.MetricGraphBuilder;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Route;
import io.github.gammawright.geometry.VolumeElement;
import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.Lowering;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Transfer;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A kernel's components as computed in one way.
 *
 * @param description the way in words
 * @param zero for each quantity which of its components vanish identically, row-major
 * @param program computes all components, in this order
 */
record Candidate(String description, List<List<Boolean>> zero, LoweredProgram program) {

    /** Up to how many different components are brought to closed form. */
    private static final int MOST_CLOSED_FORMS = 48;

    /** Along a route, and for the first route also in closed form, where the algebra finds one in its budget. */
    static List<Candidate> of(
            MetricDefinition definition,
            List<Quantity> quantities,
            Route route,
            Optional<FramePlan> framePlan,
            boolean closed) {
        MetricGraph metric = MetricGraphBuilder.build(definition);
        Geometry geometry = new Geometry(metric, route, framePlan);
        if (quantities.contains(Quantity.VOLUME_ELEMENT) || quantities.contains(Quantity.STRESS_SOURCE)) {
            shortVolumeElement(definition, metric, geometry).ifPresent(geometry::useVolumeElement);
        }
        List<Node> all = new ArrayList<>();
        List<List<Boolean>> zero = new ArrayList<>();
        for (Quantity quantity : quantities) {
            List<Node> components = geometry.components(quantity);
            all.addAll(components);
            zero.add(components.stream().map(Node::isZero).toList());
        }
        List<Candidate> candidates = new ArrayList<>();
        candidates.add(new Candidate(route.description(), zero, Lowering.lowerWithValues(metric.graph(), all)));
        if (closed) {
            closedForms(metric, all).ifPresent(program -> candidates.add(new Candidate("closed forms", zero, program)));
        }
        return candidates;
    }

    /** √|det g| from the factors of the determinant, so that squares lose their root. */
    private static Optional<Node> shortVolumeElement(
            MetricDefinition definition, MetricGraph metric, Geometry geometry) {
        NormalForms forms = new NormalForms(metric.graph(), FormStyle.CHEAP, AlgebraBudget.quick());
        return forms.factored(geometry.determinant())
                .map(factors -> VolumeElement.of(forms.target(), factors, new DomainSigns(definition)))
                .map(element -> new Transfer(forms.target(), metric.graph()).copy(element));
    }

    private static Optional<LoweredProgram> closedForms(MetricGraph metric, List<Node> components) {
        if (components.stream().distinct().count() > MOST_CLOSED_FORMS) {
            return Optional.empty();
        }
        NormalForms forms = new NormalForms(metric.graph(), FormStyle.CHEAP, AlgebraBudget.quick());
        Map<Node, Node> found = new HashMap<>();
        List<Node> closed = new ArrayList<>();
        for (Node component : components) {
            Node known = found.get(component);
            if (known == null) {
                Optional<Node> form = forms.factored(component);
                if (form.isEmpty()) {
                    return Optional.empty();
                }
                known = form.get();
                found.put(component, known);
            }
            closed.add(known);
        }
        return Optional.of(Lowering.lowerWithValues(forms.target(), closed));
    }
}
