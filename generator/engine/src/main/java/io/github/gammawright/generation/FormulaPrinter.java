package io.github.gammawright.generation;

import io.github.gammawright.generation.Notation.Piece;
import io.github.gammawright.generation.Notation.Signed;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.hipparchus.fraction.BigFraction;

/**
 * Writes values of a graph as a reader would: {@code M*(r^2 + a^2)*(r^2 - a^2*cos(theta)^2)/(Delta*Sigma^2)}. Values
 * that the author named stand by their names. The order of factors and terms depends on the formula alone.
 */
public final class FormulaPrinter {

    private final ExpressionGraph graph;
    private final Notation notation;
    private final FormulaOrder order;
    private final Map<Node, String> shared = new HashMap<>();

    /** How formulas are written. */
    public enum Form {
        /** As in a definition, and readable as one, but for derivatives of caller's functions. */
        TEXT,
        /** For LaTeX's mathematics mode. */
        LATEX
    }

    /** A name and what it stands for. */
    public record Line(String name, String formula) {}

    /** A printer for the values of a graph. */
    public FormulaPrinter(ExpressionGraph graph, Form form) {
        this.graph = graph;
        this.notation = form == Form.TEXT ? new TextNotation() : new LatexNotation();
        this.order = new FormulaOrder(graph);
    }

    /**
     * The formula of a value; if the value has a name itself, what the name stands for.
     *
     * @throws IllegalArgumentException if the formula would be endless; {@link #lines} has an answer for that
     */
    public String print(Node node) {
        if (SharedParts.size(graph, node) > SharedParts.LONGEST) {
            throw new IllegalArgumentException("a formula of more than " + SharedParts.LONGEST + " parts");
        }
        return notation.formula(signed(node, BigFraction.ONE, true));
    }

    /**
     * The formulas of several values, in their order, after the abbreviations that they use. Where a formula would be
     * too long, parts that occur several times come before it with names of their own.
     *
     * @param values by what the lines are to be called; the names of lines are left as they are
     */
    public List<Line> lines(Map<String, Node> values) {
        SharedParts parts = SharedParts.of(graph, values.values());
        Map<Node, String> first = new LinkedHashMap<>();
        for (Node part : parts.inOrder()) {
            String name = graph.nameOf(part).orElseGet(() -> parts.nameOf(part));
            if (graph.nameOf(part).isEmpty()) {
                shared.put(part, name);
            }
            first.put(part, name);
        }
        List<Line> lines = new ArrayList<>();
        first.forEach((part, name) ->
                lines.add(new Line(notation.name(name).text(), notation.formula(signed(part, BigFraction.ONE, true)))));
        values.forEach((name, value) -> lines.add(new Line(name, notation.formula(reference(value)))));
        shared.clear();
        return lines;
    }

    /** A value by its name where it has one. */
    private Signed reference(Node value) {
        return signed(value, BigFraction.ONE, false);
    }

    private Optional<String> nameOf(Node node) {
        String name = shared.get(node);
        return name != null ? Optional.of(name) : graph.nameOf(node);
    }

    private boolean isWhole(Node node) {
        return nameOf(node).isPresent();
    }

    /**
     * A value times a number.
     *
     * @param apart whether a named value is taken apart
     */
    private Signed signed(Node node, BigFraction factor, boolean apart) {
        if (!apart && isWhole(node)) {
            return signed(new FormulaTerm(factor, Map.of(node, BigFraction.ONE)));
        }
        if (node instanceof Node.Sum sum && factor.abs().equals(BigFraction.ONE)) {
            return new Signed(false, sum(sum, factor.signum() < 0));
        }
        if (node instanceof Node.Sum || node instanceof Node.Leaf || node instanceof Node.Call) {
            if (apart && factor.equals(BigFraction.ONE)) {
                return new Signed(false, base(node, true));
            }
            return signed(new FormulaTerm(factor, Map.of(node, BigFraction.ONE)));
        }
        return signed(FormulaTerm.of(node, factor, this::isWhole));
    }

    private Signed signed(FormulaTerm term) {
        boolean negative = term.coefficient().signum() < 0;
        List<Piece> numerator = new ArrayList<>();
        List<Piece> denominator = new ArrayList<>();
        BigInteger top = term.coefficient().getNumerator().abs();
        if (!top.equals(BigInteger.ONE)) {
            numerator.add(notation.number(top));
        }
        BigInteger bottom = term.coefficient().getDenominator();
        if (!bottom.equals(BigInteger.ONE)) {
            denominator.add(notation.number(bottom));
        }
        List<Node> bases =
                term.exponents().keySet().stream().sorted(order.factors()).toList();
        for (Node base : bases) {
            BigFraction exponent = term.exponents().get(base);
            boolean flipped = isOdd(exponent) && !isWhole(base) && base instanceof Node.Sum sum && leadsNegative(sum);
            negative ^= flipped;
            boolean exponential = isCall(base, RealFunction.EXP) && !isWhole(base);
            List<Piece> side = exponent.signum() > 0 || exponential ? numerator : denominator;
            side.add(power(base, exponential ? exponent : exponent.abs(), flipped));
        }
        if (numerator.isEmpty() && denominator.isEmpty()) {
            numerator.add(notation.number(BigInteger.ONE));
        }
        return new Signed(negative, notation.fraction(numerator, denominator));
    }

    private static boolean isOdd(BigFraction exponent) {
        return exponent.getDenominator().equals(BigInteger.ONE)
                && exponent.getNumerator().testBit(0);
    }

    private static boolean isCall(Node node, RealFunction function) {
        return node instanceof Node.Call call && call.function() == function;
    }

    private Piece power(Node base, BigFraction exponent, boolean flipped) {
        if (!isWhole(base)) {
            if (base instanceof Node.Sum sum) {
                Piece piece = sum(sum, flipped);
                return exponent.equals(BigFraction.ONE) ? piece : notation.power(piece, exponent);
            }
            if (base instanceof Node.ParameterPower power) {
                return notation.power(base(power.base(), false), signed(power.exponent(), exponent, false));
            }
            if (isCall(base, RealFunction.EXP)) {
                Signed argument = signed(base.operands().get(0), exponent, false);
                return notation.call(RealFunction.EXP, List.of(argument), BigInteger.ONE);
            }
            if (base instanceof Node.Call call && exponent.getDenominator().equals(BigInteger.ONE)) {
                return call(call, exponent.getNumerator());
            }
        }
        Piece piece = base(base, false);
        return exponent.equals(BigFraction.ONE) ? piece : notation.power(piece, exponent);
    }

    /** A value that is no product, without a sign in front. */
    private Piece base(Node node, boolean apart) {
        Optional<String> name = apart ? Optional.empty() : nameOf(node);
        if (name.isPresent()) {
            return notation.name(name.get());
        }
        if (node instanceof Node.Leaf leaf) {
            return notation.symbol(leaf.symbol());
        }
        if (node instanceof Node.Pi) {
            return notation.pi();
        }
        if (node instanceof Node.Sum sum) {
            return sum(sum, false);
        }
        if (node instanceof Node.Call call) {
            return call(call, BigInteger.ONE);
        }
        Signed signed = signed(node, BigFraction.ONE, apart);
        return signed.negative() ? notation.sum(List.of(signed)) : signed.piece();
    }

    private Piece call(Node.Call call, BigInteger exponent) {
        List<Signed> arguments = new ArrayList<>();
        for (Node argument : call.operands()) {
            arguments.add(signed(argument, BigFraction.ONE, false));
        }
        return notation.call(call.function(), arguments, exponent);
    }

    private Piece sum(Node.Sum sum, boolean flipped) {
        List<Signed> terms = new ArrayList<>();
        for (FormulaTerm term : terms(sum)) {
            Signed signed = signed(term);
            terms.add(new Signed(signed.negative() ^ flipped, signed.piece()));
        }
        return notation.sum(terms);
    }

    private boolean leadsNegative(Node.Sum sum) {
        return signed(terms(sum).get(0)).negative();
    }

    private List<FormulaTerm> terms(Node.Sum sum) {
        List<FormulaTerm> terms = new ArrayList<>();
        if (sum.constant().signum() != 0) {
            terms.add(new FormulaTerm(sum.constant(), Map.of()));
        }
        for (int i = 0; i < sum.operands().size(); i++) {
            Node operand = sum.operands().get(i);
            BigFraction coefficient = sum.coefficients().get(i);
            terms.add(
                    isWhole(operand)
                            ? new FormulaTerm(coefficient, Map.of(operand, BigFraction.ONE))
                            : FormulaTerm.of(operand, coefficient, this::isWhole));
        }
        Comparator<FormulaTerm> comparator = order.terms();
        terms.sort(comparator);
        return terms;
    }
}
