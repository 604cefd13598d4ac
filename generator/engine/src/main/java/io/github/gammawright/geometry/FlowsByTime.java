package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import io.github.gammawright.graph.Transfer;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The motion of particles with the first coordinate as the independent variable. */
final class FlowsByTime {

    private final MetricGraph metric;
    private final ExpressionGraph graph;
    private final int n;

    FlowsByTime(Geometry geometry) {
        this.metric = geometry.metric();
        this.graph = metric.graph();
        this.n = metric.dimension();
    }

    /**
     * dv^k/dt = a^k − v^k a^0, k ≥ 1, for v^k = dx^k/dt.
     *
     * @param affine the acceleration a^k = −Γ^k_ij u^i u^j by an affine parameter
     */
    List<Node> acceleration(List<Node> affine) {
        Map<Symbol, Node> values = new LinkedHashMap<>();
        List<Node> velocity = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            Node component = k == 0
                    ? graph.one()
                    : graph.symbol(Symbol.of(
                            Symbol.Kind.COORDINATE_VELOCITY,
                            metric.coordinates().get(k).name(),
                            k - 1));
            velocity.add(component);
            values.put(metric.velocities().get(k), component);
        }
        Transfer byTime = Transfer.substituting(graph, values);
        Node time = byTime.copy(affine.get(0));
        graph.keep(time);
        List<Node> acceleration = new ArrayList<>();
        for (int k = 1; k < n; k++) {
            Node component = byTime.copy(affine.get(k));
            acceleration.add(graph.subtract(component, graph.multiply(velocity.get(k), time)));
        }
        return acceleration;
    }

    /**
     * dx^k/dt, then dp_k/dt, k ≥ 1.
     *
     * @param flow dx^i/dλ, then dp_i/dλ
     */
    List<Node> hamiltonianFlow(List<Node> flow) {
        graph.keep(flow.get(0));
        Node rate = graph.reciprocal(flow.get(0));
        List<Node> byTime = new ArrayList<>();
        for (int i = 1; i < 2 * n; i++) {
            if (i != n) {
                byTime.add(graph.multiply(flow.get(i), rate));
            }
        }
        return byTime;
    }
}
