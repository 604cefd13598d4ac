package io.github.gammawright.algebra;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Transfer;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.UnaryOperator;
import org.hipparchus.fraction.BigFraction;

/**
 * Short factored forms of the values of a graph, taken as rational functions of coordinates, parameters, sines, roots
 * and whatever else is no arithmetic.
 *
 * <p>Since a graph keeps one form for each value, the forms are built in a second graph, the {@link #target}, which has
 * the author's abbreviations from the start. For Kerr's metric, with the abbreviations Σ and Δ, the value Γ^t_tr comes
 * out as M (r² + a²) (r² − a² cos²θ) / (Σ² Δ).
 *
 * <p>Each form is certified before it is given out: built in the source, its exact values in the prime field and, where
 * there are roots, its approximate ones at the points of the domain must be those of the value that was asked for. A
 * form that fails is dropped and counted. A request that exceeds its budget has no answer; none throws.
 *
 * <p>Not safe for use by several threads, as a graph isn't.
 */
public final class NormalForms {

    private final ExpressionGraph source;
    private final FormStyle style;
    private final AlgebraBudget budget;
    private final UnaryOperator<FactoredForm> seam;
    private final Transfer toTarget;
    private final Transfer toSource;
    private Conversion conversion;
    private Forms forms;
    private int rejected;

    /** Forms of the values of a graph, each within the normal budget. */
    public NormalForms(ExpressionGraph source, FormStyle style) {
        this(source, style, AlgebraBudget.normal());
    }

    /** Forms of the values of a graph, each within the given budget. */
    public NormalForms(ExpressionGraph source, FormStyle style, AlgebraBudget budget) {
        this(source, style, budget, UnaryOperator.identity());
    }

    /** With a seam at which tests can plant a wrong rewriting. */
    NormalForms(ExpressionGraph source, FormStyle style, AlgebraBudget budget, UnaryOperator<FactoredForm> seam) {
        this.source = source;
        this.style = style;
        this.budget = budget;
        this.seam = seam;
        this.toTarget = Transfer.toFreshGraph(source);
        this.toSource = new Transfer(source, source);
    }

    /** The graph in which the forms are built. */
    public ExpressionGraph target() {
        return toTarget.target();
    }

    /** A value of the source, as it is, in the target. */
    public Node copied(Node node) {
        return toTarget.copy(node);
    }

    /** How many forms failed their certificate. */
    public int rejected() {
        return rejected;
    }

    /**
     * A value of the source in factored form.
     *
     * @return a node of the target; empty if the budget ran out
     */
    public Optional<Node> factored(Node node) {
        return form(node).map(form -> form.build(toTarget));
    }

    /**
     * Whether a sum of products of values of the source vanishes. Each factor is brought to its normal form by itself, so
     * that the answer yes is a proof, where the graph's own zero is a matter of values at random points.
     *
     * @return true if the normal form of the sum is 0, false if it isn't; empty if the budget ran out
     */
    public Optional<Boolean> vanishes(List<Term> sum) {
        List<Node> factors =
                sum.stream().flatMap(term -> term.factors().stream()).toList();
        try {
            WorkMeter meter = new WorkMeter(budget);
            Generators needed = Generators.of(factors, Set.of(), meter);
            if (conversion == null || !conversion.generators().covers(needed)) {
                prepare(factors, meter);
            }
            FunctionField field = conversion.field();
            field.polynomials().meter(meter);
            List<Fraction> terms = new ArrayList<>();
            for (Term term : sum) {
                Fraction product = field.constant(term.coefficient());
                for (Node factor : term.factors()) {
                    product = field.multiply(product, conversion.convert(factor));
                }
                terms.add(product);
            }
            return Optional.of(field.cancel(field.sum(terms)).isZero());
        } catch (BudgetExceededException | ArithmeticException e) {
            return Optional.empty();
        }
    }

    /** A product with a rational coefficient. */
    public record Term(BigFraction coefficient, List<Node> factors) {

        public Term {
            factors = List.copyOf(factors);
        }
    }

    /** A certified form of a value. */
    Optional<FactoredForm> form(Node node) {
        try {
            Fraction fraction = convert(node);
            conversion.field().polynomials().meter(new WorkMeter(budget));
            FactoredForm form = seam.apply(forms.find(fraction));
            if (isCertified(form, node)) {
                return Optional.of(form);
            }
            rejected++;
        } catch (BudgetExceededException | ArithmeticException e) {
            return Optional.empty();
        }
        return Optional.empty();
    }

    private boolean isCertified(FactoredForm form, Node node) {
        try {
            return source.agree(form.build(toSource), node);
        } catch (ArithmeticException e) {
            return false;
        }
    }

    private Fraction convert(Node node) {
        WorkMeter meter = new WorkMeter(budget);
        Generators needed = Generators.of(List.of(node), Set.of(), meter);
        if (conversion == null || !conversion.generators().covers(needed)) {
            prepare(List.of(node), meter);
        }
        conversion.field().polynomials().meter(meter);
        return conversion.field().cancel(conversion.convert(node));
    }

    /** Makes a field for the generators of some values, and for the abbreviations that need no others. */
    private void prepare(List<Node> values, WorkMeter meter) {
        Generators needed = Generators.of(values, Set.of(), meter);
        List<Node> named = new ArrayList<>();
        List<Node> roots = new ArrayList<>(values);
        for (Node candidate : source.names().keySet()) {
            if (needed.coversButForPartners(Generators.of(List.of(candidate), Set.of(), meter), source)) {
                named.add(candidate);
            }
        }
        named.sort(Comparator.comparingInt(Node::id));
        roots.addAll(named);
        Generators generators = Generators.of(roots, Set.of(), meter);
        conversion = new Conversion(generators, Set.of(), generators.size() + named.size(), meter);
        List<Abbreviation> abbreviations = new ArrayList<>();
        for (Node candidate : named) {
            abbreviation(candidate, generators.size() + abbreviations.size()).ifPresent(abbreviations::add);
        }
        forms = new Forms(conversion, abbreviations, style);
    }

    private Optional<Abbreviation> abbreviation(Node named, int variable) {
        try {
            Fraction value = conversion.convert(named);
            if (value.isZero()
                    || !value.denominator().isEmpty()
                    || value.numerator().isConstant()) {
                return Optional.empty();
            }
            conversion
                    .field()
                    .factoring()
                    .factors(value.numerator())
                    .keySet()
                    .forEach(conversion.field().factoring()::remember);
            return Optional.of(new Abbreviation(named, variable, value.coefficient(), value.numerator()));
        } catch (ArithmeticException e) {
            return Optional.empty();
        }
    }

    /** The number that a value is, if its normal form is one. */
    Optional<BigFraction> constant(Node node) {
        try {
            Fraction fraction = convert(node);
            return fraction.isZero()
                            || (fraction.denominator().isEmpty()
                                    && fraction.numerator().isConstant())
                    ? Optional.of(fraction.coefficient())
                    : Optional.empty();
        } catch (BudgetExceededException | ArithmeticException e) {
            return Optional.empty();
        }
    }
}
