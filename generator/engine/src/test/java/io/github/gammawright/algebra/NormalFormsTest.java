package io.github.gammawright.algebra;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.util.List;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;

/** Normal forms of small expressions, their certificate and their budget. */
class NormalFormsTest {

    private final ExpressionGraph graph = new ExpressionGraph();
    private final Node x = graph.symbol(Symbol.of(Symbol.Kind.COORDINATE, "x", 0));
    private final Node y = graph.symbol(Symbol.of(Symbol.Kind.COORDINATE, "y", 1));
    private final Node a = graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, "a", 0));
    private final Node c = graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, "c", 1));

    private Node factored(Node node) {
        NormalForms forms = new NormalForms(graph, FormStyle.CHEAP);
        return forms.factored(node).orElseThrow();
    }

    /** The factors of a value, without the number in front. */
    private static List<Node> factors(Node found) {
        Node product = found instanceof Node.Multiple multiple ? multiple.node() : found;
        return product instanceof Node.Product ? product.operands() : List.of(product);
    }

    @Test
    void cancelsCommonFactors() {
        // (x² − y²) / (x − y)² with numerator and denominator multiplied out
        Node numerator = graph.subtract(graph.power(x, 2), graph.power(y, 2));
        Node denominator = graph.sum(List.of(
                graph.power(x, 2), graph.multiple(new BigFraction(-2), graph.multiply(x, y)), graph.power(y, 2)));
        Node found = factored(graph.divide(numerator, denominator));
        assertThat(factors(found))
                .hasSize(2)
                .anyMatch(Node.Sum.class::isInstance)
                .anyMatch(Node.Power.class::isInstance);
    }

    @Test
    void doesNotRepeatAMistakeOfCancelling() {
        // Symja 3.0.0: Cancel(a^2/(a*c+r)^2) gives a/(a*c^2+2*c*r)
        Node sum = graph.add(graph.multiply(a, c), x);
        Node quotient = graph.divide(graph.power(a, 2), graph.power(sum, 2));
        NormalForms forms = new NormalForms(graph, FormStyle.CHEAP);
        Node found = forms.factored(quotient).orElseThrow();
        assertThat(found).isSameAs(forms.copied(quotient));
        Node wrong = graph.divide(
                a,
                graph.add(graph.multiply(a, graph.power(c, 2)), graph.multiple(BigFraction.TWO, graph.multiply(c, x))));
        assertThat(found).isNotSameAs(forms.copied(wrong));
        assertThat(forms.rejected()).isZero();
    }

    @Test
    void knowsThatSineAndCosineAreAPointOfTheCircle() {
        Node sin = graph.call(RealFunction.SIN, x);
        Node cos = graph.call(RealFunction.COS, x);
        // s⁴ − c⁴ + 2c² + x − 1 = x
        Node value = graph.sum(List.of(
                graph.power(sin, 4),
                graph.negate(graph.power(cos, 4)),
                graph.multiple(BigFraction.TWO, graph.power(cos, 2)),
                x,
                graph.constant(-1)));
        assertThat(factored(value)).isInstanceOf(Node.Leaf.class);
        // s² (1 − s²) y = s² c² y, a product of powers
        Node product = graph.product(List.of(
                y, graph.power(sin, 2), graph.subtract(graph.one(), graph.power(sin, 2)), graph.power(cos, -1)));
        Node found = factored(product);
        assertThat(found.operands()).noneMatch(Node.Sum.class::isInstance).hasSize(3);
    }

    @Test
    void knowsHyperbolicFunctionsAndExponentials() {
        Node sinh = graph.call(RealFunction.SINH, x);
        Node cosh = graph.call(RealFunction.COSH, x);
        Node unit = graph.subtract(graph.power(cosh, 2), graph.power(sinh, 2));
        assertThat(factored(graph.multiply(unit, y))).isInstanceOf(Node.Leaf.class);
        Node exp = graph.call(RealFunction.EXP, graph.multiple(BigFraction.TWO, x));
        Node quotient = graph.divide(
                graph.subtract(graph.power(exp, 2), graph.one()), graph.multiply(y, graph.add(exp, graph.one())));
        assertThat(factors(factored(quotient))).hasSize(2);
    }

    @Test
    void rationalisesRoots() {
        Node radicand = graph.add(graph.power(x, 2), graph.power(y, 2));
        Node root = graph.sqrt(radicand);
        // (ρ − x)(ρ + x) = y²
        Node product = graph.multiply(graph.subtract(root, x), graph.add(root, x));
        assertThat(factored(product)).isInstanceOfSatisfying(Node.Power.class, power -> {
            assertThat(power.base()).isInstanceOf(Node.Leaf.class);
            assertThat(power.exponent()).isEqualTo(BigFraction.TWO);
        });
        // x/ρ³ − 3 x y²/ρ⁵ has one power of the radicand
        Node value = graph.subtract(
                graph.multiply(x, graph.power(radicand, new BigFraction(-3, 2))),
                graph.product(List.of(
                        graph.constant(3), x, graph.power(y, 2), graph.power(radicand, new BigFraction(-5, 2)))));
        assertThat(factors(factored(value))).hasSize(3);
    }

    @Test
    void rejectsAWrongRewriting() {
        Node value = graph.divide(graph.subtract(graph.power(x, 2), graph.power(y, 2)), graph.add(x, a));
        NormalForms forms = new NormalForms(
                graph,
                FormStyle.CHEAP,
                AlgebraBudget.normal(),
                form -> new FactoredForm(
                        form.coefficient().multiply(2), form.factors(), form.generators(), form.abbreviations()));
        int nodes = forms.target().nodes().size();
        assertThat(forms.factored(value)).isEmpty();
        assertThat(forms.rejected()).isEqualTo(1);
        assertThat(forms.target().nodes()).hasSize(nodes);
        // the value itself is none the worse
        assertThat(new NormalForms(graph, FormStyle.CHEAP).factored(value)).isPresent();
    }

    @Test
    void rejectsTheWrongBranchOfARoot() {
        // the positive root of 2(1 − x)² is √2 |1 − x|, never √2 (1 − x): fingerprints alone cannot tell
        Node root = graph.sqrt(graph.power(graph.subtract(x, y), 2));
        NormalForms forms = new NormalForms(
                graph,
                FormStyle.CHEAP,
                AlgebraBudget.normal(),
                form -> new FactoredForm(
                        form.coefficient().negate(), form.factors(), form.generators(), form.abbreviations()));
        assertThat(forms.factored(root)).isEmpty();
        assertThat(forms.rejected()).isEqualTo(1);
    }

    @Test
    void answersNothingWhenTheBudgetIsUsedUp() {
        Node power = graph.one();
        for (int i = 0; i < 12; i++) {
            Node other = graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, "p" + i, i + 2));
            power = graph.add(graph.one(), graph.multiply(graph.add(x, other), graph.power(power, 2)));
        }
        NormalForms forms = new NormalForms(graph, FormStyle.CHEAP);
        assertThat(forms.factored(power)).isEmpty();
        assertThat(forms.rejected()).isZero();
        assertThat(forms.factored(graph.add(x, y))).isPresent();
    }
}
