package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import io.github.gammawright.graph.Transfer;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.hipparchus.fraction.BigFraction;

/**
 * The relative acceleration of neighbouring geodesics, −R^k_ijl u^i ξ^j u^l (Misner, Thorne &amp; Wheeler 1973, section
 * 11.3), either from the independent components of the curvature tensor or by sweeps over inner products, which never
 * build one.
 */
final class GeodesicDeviation {

    private final Geometry geometry;
    private final ExpressionGraph graph;
    private final int n;
    private final InnerProduct product;
    private final List<Symbol> u;
    private final List<Symbol> xi;

    GeodesicDeviation(Geometry geometry) {
        this.geometry = geometry;
        this.graph = geometry.metric().graph();
        this.n = geometry.metric().dimension();
        this.product = new InnerProduct(geometry);
        this.u = geometry.metric().velocities();
        this.xi = product.symbols(Symbol.Kind.SEPARATION, 0);
    }

    /** D²ξ^k/dλ²; k. */
    List<Node> acceleration() {
        List<Node> force = geometry.route().flow() == Route.Flow.CONTRACTION ? contracted() : swept();
        return geometry.inverse().raise(force);
    }

    /** −R_kijl u^i ξ^j u^l, with the pair j, l summed once as a bivector. */
    private List<Node> contracted() {
        PairMatrix riemann = geometry.curvature().riemann();
        Node[] bivector = new Node[riemann.pairs()];
        for (int b = 0; b < bivector.length; b++) {
            int j = riemann.greater(b);
            int l = riemann.smaller(b);
            bivector[b] = graph.subtract(
                    graph.multiply(graph.symbol(xi.get(j)), graph.symbol(u.get(l))),
                    graph.multiply(graph.symbol(xi.get(l)), graph.symbol(u.get(j))));
            graph.keep(bivector[b]);
        }
        List<List<Node>> terms = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            terms.add(new ArrayList<>());
        }
        for (int a = 0; a < bivector.length; a++) {
            List<Node> sum = new ArrayList<>();
            for (int b = 0; b < bivector.length; b++) {
                sum.add(graph.multiply(riemann.at(a, b), bivector[b]));
            }
            Node tidal = graph.sum(sum);
            graph.keep(tidal);
            int k = riemann.greater(a);
            int i = riemann.smaller(a);
            terms.get(k).add(graph.negate(graph.multiply(tidal, graph.symbol(u.get(i)))));
            terms.get(i).add(graph.multiply(tidal, graph.symbol(u.get(k))));
        }
        List<Node> force = new ArrayList<>();
        for (List<Node> sum : terms) {
            Node component = graph.sum(sum);
            graph.keep(component);
            force.add(component);
        }
        return force;
    }

    /**
     * The same by sweeps. With A^f = Γ^f(u, u) and T^f = Γ^f(u, ξ), both held fixed, the second derivatives and the
     * products of Γ in R_kijl (Landau &amp; Lifshitz 1971, section 92) combine to the gradient of one scalar, ½ ((u·∂)
     * g(u, ξ) − (ξ·∂) g(u, u) + g(T, u) − g(A, ξ)), and to rates of change of lowered vectors along others.
     */
    private List<Node> swept() {
        List<Symbol> a = product.symbols(Symbol.Kind.VECTOR, n);
        List<Symbol> t = product.symbols(Symbol.Kind.VECTOR, 2 * n);
        List<Node> velocity = product.lowered(u);
        List<Node> separation = product.lowered(xi);
        Node scalar = graph.multiple(
                BigFraction.ONE_HALF,
                graph.sum(List.of(
                        along(u, product.of(u, xi)),
                        graph.negate(along(xi, product.of(u, u))),
                        product.of(t, u),
                        graph.negate(product.of(a, xi)))));
        List<Node> gradient =
                geometry.differentiation().gradient(scalar, geometry.metric().coordinates());
        List<Node> velocityAlongSeparation = product.along(xi, velocity);
        List<Node> separationAlongVelocity = product.along(u, separation);
        List<Node> loweredT = product.lowered(t);
        List<Node> outer = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            Node sum = graph.sum(List.of(
                    velocityAlongSeparation.get(k), graph.negate(separationAlongVelocity.get(k)), loweredT.get(k)));
            graph.keep(sum);
            outer.add(sum);
        }
        List<Node> second = product.along(u, outer);
        List<Node> velocityAlongT = product.along(t, velocity);
        List<Node> loweredAlongSeparation = product.along(xi, product.lowered(a));
        List<Node> separationAlongA = product.along(a, separation);
        Transfer values = Transfer.substituting(graph, values(a, t));
        List<Node> force = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            Node rates = graph.sum(List.of(
                    second.get(k),
                    graph.negate(velocityAlongT.get(k)),
                    graph.negate(loweredAlongSeparation.get(k)),
                    separationAlongA.get(k)));
            Node component = graph.negate(
                    graph.add(values.copy(gradient.get(k)), values.copy(graph.multiple(BigFraction.ONE_HALF, rates))));
            graph.keep(component);
            force.add(component);
        }
        return force;
    }

    private Map<Symbol, Node> values(List<Symbol> a, List<Symbol> t) {
        List<Node> acceleration = geometry.inverse().raise(product.connection(u, u));
        List<Node> transport = geometry.inverse().raise(product.connection(u, xi));
        Map<Symbol, Node> values = new LinkedHashMap<>();
        for (int k = 0; k < n; k++) {
            graph.keep(acceleration.get(k));
            graph.keep(transport.get(k));
            values.put(a.get(k), acceleration.get(k));
            values.put(t.get(k), transport.get(k));
        }
        return values;
    }

    private Node along(List<Symbol> vector, Node value) {
        return product.along(vector, List.of(value)).get(0);
    }
}
