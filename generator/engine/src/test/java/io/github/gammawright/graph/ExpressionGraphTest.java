package io.github.gammawright.graph;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;

/** Identities of school mathematics, which the graph must see, and near-identities, which it must not. */
class ExpressionGraphTest {

    private final ExpressionGraph graph = new ExpressionGraph();
    private final Node x = coordinate("x", 0);
    private final Node y = coordinate("y", 1);
    private final Node a = graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, "a", 0));

    private Node coordinate(String name, int index) {
        return graph.symbol(Symbol.of(Symbol.Kind.COORDINATE, name, index));
    }

    private Node call(RealFunction function, Node argument) {
        return graph.call(function, argument);
    }

    private Node square(Node node) {
        return graph.power(node, 2);
    }

    @Test
    void pythagoras() {
        Node sum = graph.add(square(call(RealFunction.SIN, x)), square(call(RealFunction.COS, x)));
        assertThat(sum).isSameAs(graph.one());
        Node difference = graph.subtract(square(call(RealFunction.COSH, x)), square(call(RealFunction.SINH, x)));
        assertThat(difference).isSameAs(graph.one());
    }

    @Test
    void anglesAddUp() {
        Node left = call(RealFunction.SIN, graph.add(x, y));
        Node right = graph.add(
                graph.multiply(call(RealFunction.SIN, x), call(RealFunction.COS, y)),
                graph.multiply(call(RealFunction.COS, x), call(RealFunction.SIN, y)));
        assertThat(right).isSameAs(left);
    }

    @Test
    void halfAngles() {
        Node half = graph.multiple(BigFraction.ONE_HALF, x);
        Node cos = call(RealFunction.COS, x);
        Node byHalf =
                graph.subtract(graph.one(), graph.multiple(BigFraction.TWO, square(call(RealFunction.SIN, half))));
        assertThat(byHalf).isSameAs(cos);
    }

    @Test
    void exponentialsMultiply() {
        Node product = graph.multiply(call(RealFunction.EXP, x), call(RealFunction.EXP, y));
        assertThat(call(RealFunction.EXP, graph.add(x, y))).isSameAs(product);
        assertThat(graph.multiply(call(RealFunction.EXP, x), call(RealFunction.EXP, graph.negate(x))))
                .isSameAs(graph.one());
    }

    @Test
    void powersShareOneParameterPower() {
        Node once = graph.power(x, a);
        Node more = graph.power(x, graph.add(a, graph.one()));
        assertThat(more).isSameAs(graph.multiply(x, once));
        assertThat(graph.power(x, graph.multiple(BigFraction.TWO, a))).isSameAs(square(once));
        assertThat(graph.nodes().stream().filter(Node.ParameterPower.class::isInstance))
                .hasSize(1);
    }

    @Test
    void binomialFormula() {
        Node product = graph.multiply(graph.add(x, y), graph.subtract(x, y));
        Node difference = graph.subtract(square(x), square(y));
        assertThat(difference).isSameAs(product);
        assertThat(graph.subtract(product, difference)).isSameAs(graph.zero());
    }

    @Test
    void multiplesOfKnownValuesAreSeen() {
        Node sum = graph.add(x, y);
        graph.keep(sum);
        Node other = graph.sum(
                List.of(graph.multiple(new BigFraction(-3, 7), x), graph.multiple(new BigFraction(-3, 7), y)));
        assertThat(other).isEqualTo(graph.multiple(new BigFraction(-3, 7), sum));
    }

    @Test
    void theRootOfASquareIsItsAbsoluteValue() {
        Node root = graph.sqrt(square(x));
        assertThat(root).isNotSameAs(x).isSameAs(call(RealFunction.ABS, x));
        assertThat(square(graph.sqrt(x))).isSameAs(x);
        assertThat(graph.multiply(graph.sqrt(x), graph.sqrt(y)))
                .isEqualTo(graph.multiply(graph.sqrt(y), graph.sqrt(x)));
    }

    @Test
    void nestedRootsKeepTheirRelation() {
        // with r² = (b + √(b² + 4c²))/2 follows r⁴ − b r² − c² = 0, as for the radius of Kerr–Schild coordinates
        Node b = x;
        Node c = y;
        Node root = graph.sqrt(graph.add(square(b), graph.multiple(new BigFraction(4), square(c))));
        Node r2 = graph.multiple(BigFraction.ONE_HALF, graph.add(b, root));
        Node r = graph.sqrt(r2);
        Node relation = graph.sum(
                List.of(graph.power(r, 4), graph.negate(graph.multiply(b, square(r))), graph.negate(square(c))));
        assertThat(relation).isSameAs(graph.zero());
    }

    @Test
    void whatOnlyLooksAlikeStaysApart() {
        assertThat(call(RealFunction.SIN, x)).isNotSameAs(call(RealFunction.TANH, x));
        assertThat(call(RealFunction.ATAN, x)).isNotSameAs(call(RealFunction.ATAN, y));
        assertThat(graph.subtract(square(x), square(y)).isZero()).isFalse();
        Node oneAndABit = graph.constant(new BigFraction(1_000_000_001L, 1_000_000_000L));
        assertThat(graph.multiply(x, oneAndABit)).isNotSameAs(x);
    }

    @Test
    void divisionByWhatVanishesIsRefused() {
        Node zero = graph.subtract(
                square(graph.add(x, y)),
                graph.sum(List.of(square(x), square(y), graph.multiple(BigFraction.TWO, graph.multiply(x, y)))));
        assertThat(zero).isSameAs(graph.zero());
        assertThatThrownBy(() -> graph.divide(x, zero)).isInstanceOf(ArithmeticException.class);
        assertThatThrownBy(() -> graph.sqrt(graph.constant(-2))).isInstanceOf(ArithmeticException.class);
    }

    @Test
    void aCallersFunctionHasDerivativesOfEveryOrder() {
        Symbol t = Symbol.of(Symbol.Kind.COORDINATE, "t", 5);
        Node function = graph.callerFunction("scale", 0, List.of(t));
        Differentiation differentiation = new Differentiation(graph);
        Node third = differentiation.derivative(
                differentiation.derivative(differentiation.derivative(square(function), t), t), t);
        Node f1 = differentiation.derivative(function, t);
        Node f2 = differentiation.derivative(f1, t);
        Node f3 = differentiation.derivative(f2, t);
        // (f²)''' = 2 f f''' + 6 f' f''
        Node expected = graph.add(
                graph.multiple(BigFraction.TWO, graph.multiply(function, f3)),
                graph.multiple(new BigFraction(6), graph.multiply(f1, f2)));
        assertThat(third).isSameAs(expected);
        assertThat(((Node.Leaf) f3).symbol().orders()).containsExactly(3);
    }
}
