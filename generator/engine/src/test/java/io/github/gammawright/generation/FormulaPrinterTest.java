package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import io.github.gammawright.graph.Differentiation;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;

/** Whole formulas, as they are printed. */
class FormulaPrinterTest {

    private final ExpressionGraph graph = new ExpressionGraph();
    private final FormulaPrinter text = new FormulaPrinter(graph, FormulaPrinter.Form.TEXT);
    private final FormulaPrinter latex = new FormulaPrinter(graph, FormulaPrinter.Form.LATEX);
    private final Symbol radius = Symbol.of(Symbol.Kind.COORDINATE, "r", 1);
    private final Node r = graph.symbol(radius);
    private final Node theta = graph.symbol(Symbol.of(Symbol.Kind.COORDINATE, "theta", 2));
    private final Node mass = graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, "M", 0));
    private final Node a = graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, "a", 1));
    private final Node sin = graph.call(RealFunction.SIN, theta);
    private final Node cos = graph.call(RealFunction.COS, theta);
    private final Node a2c2 = product(graph.power(a, 2), graph.power(cos, 2));
    private final Node sigma = sum(graph.power(r, 2), a2c2);
    private final Node delta = sum(graph.power(r, 2), product(number(-2), mass, r), graph.power(a, 2));

    private Node number(long value) {
        return graph.constant(value);
    }

    private Node sum(Node... terms) {
        return graph.sum(List.of(terms));
    }

    private Node product(Node... factors) {
        return graph.product(List.of(factors));
    }

    @Test
    void printsTheTermOfHighestDegreeFirst() {
        assertThat(text.print(sigma)).isEqualTo("r^2 + a^2*cos(theta)^2");
        assertThat(text.print(delta)).isEqualTo("r^2 - 2*M*r + a^2");
        assertThat(latex.print(delta)).isEqualTo("r^{2} - 2 M r + a^{2}");
    }

    @Test
    void printsFractionsOfNamedValues() {
        graph.name(sigma, "Sigma");
        graph.name(delta, "Delta");
        Node value = product(
                mass,
                sum(graph.power(r, 2), graph.power(a, 2)),
                graph.subtract(graph.power(r, 2), a2c2),
                graph.power(sigma, -2),
                graph.power(delta, -1));
        assertThat(text.print(value)).isEqualTo("M*(r^2 + a^2)*(r^2 - a^2*cos(theta)^2)/(Sigma^2*Delta)");
        assertThat(latex.print(value))
                .isEqualTo("\\frac{M \\left(r^{2} + a^{2}\\right) \\left(r^{2} - a^{2} \\cos^{2} \\theta\\right)}"
                        + "{\\Sigma^{2} \\Delta}");
        assertThat(text.print(sigma)).isEqualTo("r^2 + a^2*cos(theta)^2");
        assertThat(text.lines(Map.of("value", value)))
                .containsExactly(
                        new FormulaPrinter.Line("Sigma", "r^2 + a^2*cos(theta)^2"),
                        new FormulaPrinter.Line("Delta", "r^2 - 2*M*r + a^2"),
                        new FormulaPrinter.Line("value", text.print(value)));
    }

    @Test
    void printsSignsAndNumbers() {
        assertThat(text.print(number(-3))).isEqualTo("-3");
        assertThat(text.print(graph.constant(new BigFraction(3, 2)))).isEqualTo("3/2");
        assertThat(text.print(graph.constant(new BigFraction(-1, 2)))).isEqualTo("-1/2");
        assertThat(text.print(graph.divide(mass, product(number(2), r)))).isEqualTo("M/(2*r)");
        assertThat(text.print(product(number(-1), sin, cos))).isEqualTo("-sin(theta)*cos(theta)");
        assertThat(text.print(graph.negate(graph.subtract(r, mass)))).isEqualTo("-(r - M)");
        assertThat(text.print(graph.divide(cos, sin))).isEqualTo("cos(theta)/sin(theta)");
        assertThat(text.print(graph.reciprocal(r))).isEqualTo("1/r");
        assertThat(latex.print(graph.divide(mass, product(number(-2), r)))).isEqualTo("-\\frac{M}{2 r}");
        // the sign of a factor goes in front where that lets it start with a plus
        assertThat(text.print(graph.divide(graph.subtract(a, r), mass))).isEqualTo("-(r - a)/M");
        assertThat(text.print(graph.power(graph.subtract(a, r), 2))).isEqualTo("(r - a)^2");
    }

    @Test
    void printsPowersAndFunctions() {
        assertThat(text.print(graph.sqrt(sigma))).isEqualTo("sqrt(r^2 + a^2*cos(theta)^2)");
        assertThat(text.print(graph.power(sum(r, a), new BigFraction(-3, 2)))).isEqualTo("1/(r + a)^(3/2)");
        assertThat(latex.print(graph.power(sum(r, a), new BigFraction(1, 3)))).isEqualTo("\\sqrt[3]{r + a}");
        assertThat(text.print(graph.power(r, a))).isEqualTo("r^a");
        assertThat(text.print(graph.power(graph.power(r, a), -2))).isEqualTo("1/r^(2*a)");
        Node exp = graph.call(RealFunction.EXP, graph.multiple(new BigFraction(-2), product(mass, r)));
        assertThat(text.print(exp)).isEqualTo("exp(-2*M*r)");
        assertThat(latex.print(exp)).isEqualTo("\\mathrm{e}^{-2 M r}");
        Node angle = graph.call(RealFunction.ATAN2, r, a);
        assertThat(text.print(angle)).isEqualTo("atan2(r, a)");
        assertThat(latex.print(graph.call(RealFunction.LOG, sum(r, a)))).isEqualTo("\\ln\\left(r + a\\right)");
        assertThat(latex.print(graph.call(RealFunction.ABS, sum(theta, a)))).isEqualTo("\\left|\\theta + a\\right|");
        assertThat(text.print(product(graph.pi(), graph.power(r, 2)))).isEqualTo("pi*r^2");
    }

    @Test
    void printsDerivativesOfCallersFunctions() {
        Node nu = graph.callerFunction("nu", 0, List.of(radius));
        Node derivative = new Differentiation(graph).derivative(nu, radius);
        assertThat(text.print(product(nu, derivative))).isEqualTo("nu*nu[1]");
        assertThat(latex.print(product(nu, derivative))).isEqualTo("\\nu \\nu^{(1)}");
    }

    @Test
    void printsVelocities() {
        Node velocity = graph.symbol(Symbol.of(Symbol.Kind.VELOCITY, "theta", 2));
        Node value = product(number(-2), graph.power(velocity, 2), r);
        assertThat(text.print(value)).isEqualTo("-2*r*u_theta^2");
        assertThat(latex.print(value)).isEqualTo("-2 r \\left(u^{\\theta}\\right)^{2}");
    }

    @Test
    void namesCannotInjectLatex() {
        assertThat(LatexNames.of("Sigma")).isEqualTo("\\Sigma");
        assertThat(LatexNames.of("Σ")).isEqualTo("\\Sigma");
        assertThat(LatexNames.of("Alpha")).isEqualTo("\\mathrm{A}");
        assertThat(LatexNames.of("Ρ")).isEqualTo("\\mathrm{P}");
        assertThat(LatexNames.of("r_plus")).isEqualTo("r_{\\mathrm{plus}}");
        assertThat(LatexNames.of("x1")).isEqualTo("x_{1}");
        assertThat(LatexNames.of("mass")).isEqualTo("\\mathrm{mass}");
        assertThat(LatexNames.of("_")).isEqualTo("\\mathrm{\\_}");
        assertThat(LatexNames.of("_a_")).isEqualTo("\\mathrm{\\_a\\_}");
        assertThat(LatexNames.of("a__b")).isEqualTo("a_{b}");
        for (String hostile : List.of("\\input{x}", "a}b", "$$", "a^b", "%", "#1", "~", "a b", "{", "&", "\\")) {
            assertThat(LatexNames.of(hostile).replaceAll("\\\\(mathrm|mathtt)\\{", "{"))
                    .doesNotContain("\\", "$", "%", "#", "&", "~", "^", " ");
        }
    }

    @Test
    void namesPartsInCommonWhereAFormulaWouldNotEnd() {
        Node value = r;
        for (int i = 0; i < 60; i++) {
            value = product(sum(value, number(i + 1)), sum(value, mass, number(-i)));
            graph.keep(value);
        }
        Node endless = value;
        assertThatThrownBy(() -> text.print(endless)).isInstanceOf(IllegalArgumentException.class);
        Map<String, Node> values = new LinkedHashMap<>();
        values.put("result", endless);
        List<FormulaPrinter.Line> lines = text.lines(values);
        assertThat(lines)
                .hasSizeBetween(60, 200)
                .last()
                .satisfies(line -> assertThat(line.name()).isEqualTo("result"));
        assertThat(lines.get(1).name()).isEqualTo("w2");
        assertThat(lines.get(1).formula()).contains("w1");
    }
}
