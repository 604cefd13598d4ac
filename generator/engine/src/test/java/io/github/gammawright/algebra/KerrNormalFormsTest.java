package io.github.gammawright.algebra;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/**
 * Kerr's metric in Boyer–Lindquist coordinates: every Christoffel symbol has a closed form that is the published one.
 *
 * <p>Closed forms from memory, as commonly given after Boyer &amp; Lindquist (1967); Bardeen, Press &amp; Teukolsky
 * (1972); Frolov &amp; Novikov (1998), appendix.
 */
class KerrNormalFormsTest {

    private final TestMetric kerr = TestMetric.kerr();

    /** The closed forms, written into a graph of their own that has never seen the metric. */
    private static final class Published {
        final ExpressionGraph graph;
        final Node r;
        final Node mass;
        final Node a;
        final Node s;
        final Node c;
        final Node sigma;
        final Node delta;
        final Map<String, Node> symbols = new TreeMap<>();

        Published(ExpressionGraph graph) {
            this.graph = graph;
            TestMetric names = TestMetric.kerr();
            this.r = graph.symbol(names.coordinates.get(1));
            this.mass = graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, "M", 0));
            this.a = graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, "a", 1));
            Node theta = graph.symbol(names.coordinates.get(2));
            this.s = graph.call(RealFunction.SIN, theta);
            this.c = graph.call(RealFunction.COS, theta);
            Node a2c2 = graph.multiply(power(a, 2), power(c, 2));
            Node a2s2 = graph.multiply(power(a, 2), power(s, 2));
            Node r2 = power(r, 2);
            Node a2 = power(a, 2);
            this.sigma = graph.add(r2, a2c2);
            this.delta = sum(r2, product(n(-2), mass, r), a2);
            Node radius = graph.add(r2, a2);
            Node difference = graph.subtract(r2, a2c2);
            Node big = graph.subtract(power(radius, 2), product(delta, a2s2));
            Node sc = product(s, c);
            symbols.put("001", product(mass, radius, difference, over(sigma, 2), over(delta, 1)));
            symbols.put("002", product(n(-2), mass, a2, r, sc, over(sigma, 2)));
            Node mixed = sum(product(r2, sum(product(n(3), r2), a2)), product(a2c2, graph.subtract(r2, a2)));
            symbols.put("013", product(n(-1), mass, a, power(s, 2), mixed, over(sigma, 2), over(delta, 1)));
            symbols.put("023", product(n(2), mass, power(a, 3), r, power(s, 3), c, over(sigma, 2)));
            symbols.put("100", product(mass, delta, difference, over(sigma, 3)));
            symbols.put("103", product(n(-1), mass, a, delta, power(s, 2), difference, over(sigma, 3)));
            Node radial = graph.subtract(product(r, a2s2), product(mass, difference));
            symbols.put("111", product(radial, over(sigma, 1), over(delta, 1)));
            symbols.put("112", product(n(-1), a2, sc, over(sigma, 1)));
            symbols.put("122", product(n(-1), r, delta, over(sigma, 1)));
            Node axial = graph.subtract(product(r, power(sigma, 2)), product(mass, a2s2, difference));
            symbols.put("133", product(n(-1), delta, power(s, 2), axial, over(sigma, 3)));
            symbols.put("200", product(n(-2), mass, a2, r, sc, over(sigma, 3)));
            symbols.put("203", product(n(2), mass, a, r, radius, sc, over(sigma, 3)));
            symbols.put("211", product(a2, sc, over(sigma, 1), over(delta, 1)));
            symbols.put("212", product(r, over(sigma, 1)));
            symbols.put("222", product(n(-1), a2, sc, over(sigma, 1)));
            Node polar = sum(product(big, sigma), product(n(2), mass, r, a2s2, radius));
            symbols.put("233", product(n(-1), sc, polar, over(sigma, 3)));
            symbols.put("301", product(mass, a, difference, over(sigma, 2), over(delta, 1)));
            symbols.put("302", product(n(-2), mass, a, r, c, over(s, 1), over(sigma, 2)));
            Node azimuthal = graph.add(
                    product(r, power(sigma, 2)),
                    product(mass, graph.subtract(product(a2, a2s2, power(c, 2)), product(r2, sum(sigma, r2, a2)))));
            symbols.put("313", product(azimuthal, over(sigma, 2), over(delta, 1)));
            Node twisted = graph.add(power(sigma, 2), product(n(2), mass, r, a2s2));
            symbols.put("323", product(c, over(s, 1), twisted, over(sigma, 2)));
        }

        Node n(long value) {
            return graph.constant(value);
        }

        Node power(Node base, int exponent) {
            return graph.power(base, exponent);
        }

        Node over(Node base, int exponent) {
            return graph.power(base, -exponent);
        }

        Node sum(Node... terms) {
            return graph.sum(List.of(terms));
        }

        Node product(Node... factors) {
            return graph.product(List.of(factors));
        }
    }

    @ParameterizedTest
    @EnumSource(FormStyle.class)
    void everyChristoffelSymbolHasItsPublishedClosedForm(FormStyle style) {
        Map<String, Node> symbols = kerr.christoffel();
        NormalForms forms = new NormalForms(kerr.graph, style);
        Map<String, Node> found = new TreeMap<>();
        symbols.forEach((index, node) -> found.put(index, forms.factored(node).orElseThrow()));
        // The published forms are recognised in the target, which has none but what the algebra built.
        Published published = new Published(forms.target());
        assertThat(found.keySet()).isEqualTo(published.symbols.keySet()).hasSize(20);
        published.symbols.forEach(
                (index, node) -> assertThat(found.get(index)).as("Γ " + index).isSameAs(node));
        assertThat(forms.rejected()).isZero();
    }

    @Test
    void theSymbolOfAccelerationComesOutAsProductOfItsFactors() {
        NormalForms forms = new NormalForms(kerr.graph, FormStyle.READABLE);
        Node found = forms.factored(kerr.christoffel().get("001")).orElseThrow();
        // M (r² + a²) (r² − a² cos²θ) / (Σ² Δ), but for the sign that the graph gives to a difference
        ExpressionGraph target = forms.target();
        Published published = new Published(target);
        Node product = found instanceof Node.Multiple multiple ? multiple.node() : found;
        Node difference = target.subtract(
                published.power(published.r, 2),
                published.product(published.power(published.a, 2), published.power(published.c, 2)));
        assertThat(product.operands())
                .containsExactlyInAnyOrder(
                        published.mass,
                        published.sum(published.power(published.r, 2), published.power(published.a, 2)),
                        difference instanceof Node.Multiple multiple ? multiple.node() : difference,
                        published.over(published.sigma, 2),
                        published.over(published.delta, 1));
        assertThat(target.nameOf(published.sigma)).contains("Sigma");
        assertThat(target.nameOf(published.delta)).contains("Delta");
    }

    @Test
    void theDeterminantOfTheCyclicBlockIsMinusDeltaSineSquared() {
        ExpressionGraph graph = kerr.graph;
        Node[][] g = kerr.components;
        Node determinant = graph.subtract(graph.multiply(g[0][0], g[3][3]), graph.power(g[0][3], 2));
        NormalForms forms = new NormalForms(graph, FormStyle.READABLE);
        Node found = forms.factored(determinant).orElseThrow();
        Published published = new Published(forms.target());
        assertThat(found).isInstanceOfSatisfying(Node.Multiple.class, multiple -> {
            assertThat(multiple.coefficient().intValue()).isEqualTo(-1);
            assertThat(multiple.node().operands())
                    .containsExactlyInAnyOrder(published.delta, published.power(published.s, 2));
        });
    }

    @Test
    void closedFormsAreTheSameInEveryRun() {
        assertThat(forms()).isEqualTo(forms());
    }

    private static Map<String, FactoredForm> forms() {
        TestMetric metric = TestMetric.kerr();
        NormalForms forms = new NormalForms(metric.graph, FormStyle.CHEAP);
        Map<String, FactoredForm> found = new TreeMap<>();
        metric.christoffel()
                .forEach((index, node) -> found.put(index, forms.form(node).orElseThrow()));
        found.replaceAll((index, form) -> new FactoredForm(form.coefficient(), form.factors(), null, List.of()));
        return found;
    }
}
