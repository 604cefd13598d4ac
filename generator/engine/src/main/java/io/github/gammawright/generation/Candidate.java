package io.github.gammawright.generation;

import io.github.gammawright.algebra.AlgebraBudget;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.DomainSigns;
import io.github.gammawright.geometry.FramePlan;
import io.github.gammawright.geometry.Geometry;
import io.github.gammawright.geometry.MetricGraph;
import io.github.gammawright.geometry.MetricGraphBuilder;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Route;
import io.github.gammawright.geometry.VolumeElement;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.Lowering;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Transfer;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * A kernel's components as computed in one way.
 *
 * @param description the way in words
 * @param zero for each quantity which of the entries that its layout stores vanish identically
 * @param program computes all entries, in this order
 */
record Candidate(String description, List<List<Boolean>> zero, LoweredProgram program) {

    /** Along a route, and for the first route also in closed form, where the algebra finds one in its budget. */
    static List<Candidate> of(
            MetricDefinition definition,
            KernelSpecification specification,
            Route route,
            Optional<FramePlan> framePlan,
            boolean closed) {
        MetricGraph metric = MetricGraphBuilder.build(definition);
        Geometry geometry = new Geometry(metric, route, framePlan);
        if (specification.quantities().contains(Quantity.VOLUME_ELEMENT)
                || specification.quantities().contains(Quantity.STRESS_SOURCE)) {
            shortVolumeElement(definition, metric, geometry).ifPresent(geometry::useVolumeElement);
        }
        List<List<Node>> entries = entries(geometry, specification);
        List<Candidate> candidates = new ArrayList<>();
        candidates.add(of(route.description(), metric.graph(), entries));
        if (closed) {
            List<Node> all = entries.stream().flatMap(List::stream).toList();
            ClosedForms forms = new ClosedForms(metric.graph(), AlgebraBudget.quick());
            forms.ofAll(all)
                    .ifPresent(found -> candidates.add(new Candidate(
                            "closed forms",
                            candidates.get(0).zero(),
                            Lowering.lowerWithValues(forms.target(), found))));
            for (Geometry.Part part : Geometry.Part.values()) {
                if (specification.quantities().stream()
                        .anyMatch(quantity -> quantity.madeOf().equals(Optional.of(part)))) {
                    candidates.addAll(byClosedPart(part, metric, specification));
                }
            }
        }
        return candidates;
    }

    /** √|det g| from the factors of the determinant, so that squares lose their root. */
    private static Optional<Node> shortVolumeElement(
            MetricDefinition definition, MetricGraph metric, Geometry geometry) {
        ClosedForms forms = new ClosedForms(metric.graph(), AlgebraBudget.quick());
        return forms.of(geometry.determinant())
                .map(factors -> VolumeElement.of(forms.target(), factors, new DomainSigns(definition)))
                .map(element -> new Transfer(forms.target(), metric.graph()).copy(element));
    }

    /** From a part of the geometry whose components have been brought to closed form. */
    private static List<Candidate> byClosedPart(
            Geometry.Part part, MetricGraph metric, KernelSpecification specification) {
        Route contraction = new Route(
                Route.Inversion.BLOCKS,
                Route.Flow.CONTRACTION,
                part == Geometry.Part.CONNECTION ? Route.Second.CONNECTION : Route.Second.METRIC);
        ClosedForms forms = new ClosedForms(metric.graph(), AlgebraBudget.normal());
        Optional<Geometry> geometry =
                new Geometry(metric, contraction).withForms(part, metric.on(forms.target(), forms::copied), forms::of);
        if (geometry.isEmpty()) {
            return List.of();
        }
        List<List<Node>> entries = entries(geometry.get(), specification);
        List<Candidate> candidates = new ArrayList<>();
        String description = "closed forms of the " + part.name().toLowerCase(Locale.ROOT);
        candidates.add(of(description, forms.target(), entries));
        ClosedForms second = new ClosedForms(forms.target(), AlgebraBudget.normal());
        second.ofAll(entries.stream().flatMap(List::stream).toList())
                .ifPresent(found -> candidates.add(new Candidate(
                        "closed forms by " + description,
                        candidates.get(0).zero(),
                        Lowering.lowerWithValues(second.target(), found))));
        return candidates;
    }

    private static List<List<Node>> entries(Geometry geometry, KernelSpecification specification) {
        return specification.quantities().stream()
                .map(quantity -> geometry.entries(quantity, specification.layout()))
                .toList();
    }

    private static Candidate of(String description, ExpressionGraph graph, List<List<Node>> entries) {
        List<List<Boolean>> zero = entries.stream()
                .map(nodes -> nodes.stream().map(Node::isZero).toList())
                .toList();
        List<Node> all = entries.stream().flatMap(List::stream).toList();
        return new Candidate(description, zero, Lowering.lowerWithValues(graph, all));
    }
}
