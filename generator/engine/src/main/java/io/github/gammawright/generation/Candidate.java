package io.github.gammawright.generation;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.Geometry;
import io.github.gammawright.geometry.MetricGraph;
import io.github.gammawright.geometry.MetricGraphBuilder;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Route;
import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.Lowering;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;

/**
 * A kernel's components as computed along one route.
 *
 * @param route the route
 * @param zero for each quantity which of its components vanish identically, row-major
 * @param program computes all components, in this order
 */
record Candidate(Route route, List<List<Boolean>> zero, LoweredProgram program) {

    static Candidate of(MetricDefinition definition, List<Quantity> quantities, Route route) {
        MetricGraph metric = MetricGraphBuilder.build(definition);
        Geometry geometry = new Geometry(metric, route);
        List<Node> all = new ArrayList<>();
        List<List<Boolean>> zero = new ArrayList<>();
        for (Quantity quantity : quantities) {
            List<Node> components = geometry.components(quantity);
            all.addAll(components);
            zero.add(components.stream().map(Node::isZero).toList());
        }
        return new Candidate(route, zero, Lowering.lowerWithValues(metric.graph(), all));
    }
}
