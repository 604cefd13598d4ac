package io.github.gammawright.graph;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.Collection;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.hipparchus.fraction.BigFraction;

/**
 * A growing set of nodes in which equal values exist once: the graph on which a metric is differentiated, inverted and
 * contracted.
 *
 * <p>Nodes are recognised as equal first by their form and then by their {@link Fingerprints values in a prime field},
 * so that a value that arises twice in different forms is one node, a value that vanishes identically is the constant
 * 0, and a rational multiple of a known value is a {@link Node.Multiple} of it. So the factory methods may return a
 * node of another form than the one asked for; it is always the same function.
 *
 * <p>Sums take nested sums apart and products nested products, but for nodes that are {@link #keep kept}, such as the
 * author's abbreviations, which stay what they are and give their names to temporaries.
 */
public final class ExpressionGraph {

    private final List<Node> nodes = new ArrayList<>();
    private final Map<Object, Node> byForm = new HashMap<>();
    private final Map<Long, List<Node>> byValue = new HashMap<>();
    private final Map<Symbol, Integer> symbolNumbers = new LinkedHashMap<>();
    private final Map<Integer, List<Symbol>> callerFunctionArguments = new HashMap<>();
    private final Map<Node, String> names = new LinkedHashMap<>();
    private final BitSet kept = new BitSet();
    private final Fingerprints fingerprints = new Fingerprints();
    private final SamplePoints samplePoints;
    private final RealValues realValues;
    private boolean hasBranches;

    private final Node zero;
    private final Node one;

    /** A graph that knows nothing of the domain of its symbols. */
    public ExpressionGraph() {
        this(SamplePoints.arbitrary(3));
    }

    /** A graph whose symbols range over a domain of which a few points are given. */
    public ExpressionGraph(SamplePoints samplePoints) {
        this.samplePoints = samplePoints;
        this.realValues = new RealValues(samplePoints);
        this.one = constant(BigFraction.ONE);
        this.zero = constant(BigFraction.ZERO);
    }

    /** All nodes, in order of creation. */
    public List<Node> nodes() {
        return java.util.Collections.unmodifiableList(nodes);
    }

    /** 0. */
    public Node zero() {
        return zero;
    }

    /** 1. */
    public Node one() {
        return one;
    }

    /** A rational number. */
    public Node constant(BigFraction value) {
        return intern(List.of("constant", value), id -> new Node.Constant(id, value));
    }

    /** A whole number. */
    public Node constant(long value) {
        return constant(new BigFraction(value));
    }

    /** The circle's constant. */
    public Node pi() {
        return intern("pi", Node.Pi::new);
    }

    /** A symbol. */
    public Node symbol(Symbol symbol) {
        int number = symbolNumbers.computeIfAbsent(symbol, s -> symbolNumbers.size());
        return intern(symbol, id -> {
            BitSet self = new BitSet();
            self.set(number);
            if (symbol.kind() == Symbol.Kind.CALLER_FUNCTION) {
                for (Symbol argument : callerFunctionArguments.get(symbol.index())) {
                    self.set(symbolNumbers.computeIfAbsent(argument, s -> symbolNumbers.size()));
                }
            }
            return new Node.Leaf(id, self, symbol);
        });
    }

    /**
     * A function that the caller supplies, not differentiated.
     *
     * @param arguments the coordinates that it depends on, in its own order
     */
    public Node callerFunction(String name, int index, List<Symbol> arguments) {
        callerFunctionArguments.put(index, List.copyOf(arguments));
        return symbol(new Symbol(
                Symbol.Kind.CALLER_FUNCTION, name, index, java.util.Collections.nCopies(arguments.size(), 0)));
    }

    /** The arguments of a caller's function. */
    List<Symbol> callerFunctionArguments(int index) {
        return callerFunctionArguments.get(index);
    }

    /** Gives a value the author's name and keeps it whole. */
    public void name(Node node, String name) {
        if (!(node instanceof Node.Constant) && !(node instanceof Node.Leaf)) {
            names.putIfAbsent(node, name);
            keep(node);
        }
    }

    /** The author's name of a value, if it has one. */
    public Optional<String> nameOf(Node node) {
        return Optional.ofNullable(names.get(node));
    }

    /** Keeps a value whole: sums and products made from it later do not take it apart. */
    public void keep(Node node) {
        kept.set(node instanceof Node.Multiple multiple ? multiple.node().id() : node.id());
    }

    /** Whether a value is kept whole. */
    public boolean isKept(Node node) {
        return kept.get(node.id());
    }

    /** Whether a value depends on a symbol. */
    public boolean dependsOn(Node node, Symbol symbol) {
        Integer number = symbolNumbers.get(symbol);
        return number != null && node.symbols().get(number);
    }

    /** Whether a value depends on parameters only. */
    public boolean isParameterOnly(Node node) {
        if (node.symbols().isEmpty()) {
            return true;
        }
        for (Map.Entry<Symbol, Integer> entry : symbolNumbers.entrySet()) {
            if (!entry.getKey().isParameter() && node.symbols().get(entry.getValue())) {
                return false;
            }
        }
        return true;
    }

    /** The values of a node at random points of the prime field, for which see {@link Fingerprints}. */
    public long[] fingerprint(Node node) {
        return fingerprints.of(node).clone();
    }

    /** The approximate values of a node at the sample points. */
    public double[] realValues(Node node) {
        return realValues.of(node).clone();
    }

    /** Where the approximate values are taken. */
    public SamplePoints samplePoints() {
        return samplePoints;
    }

    /**
     * Whether two values, both of this graph, are the same function as far as their fingerprints tell and, where the
     * graph has roots or absolute values, as far as their values at the sample points tell besides.
     */
    public boolean agree(Node a, Node b) {
        return a == b
                || (Arrays.equals(fingerprints.of(a), fingerprints.of(b))
                        && (!hasBranches || realValues.agree(a, b, 1)));
    }

    /** The values that have a name, in the order in which they got it. */
    public Map<Node, String> names() {
        return java.util.Collections.unmodifiableMap(names);
    }

    /** a + b. */
    public Node add(Node a, Node b) {
        return sum(List.of(a, b));
    }

    /** a − b. */
    public Node subtract(Node a, Node b) {
        return sum(List.of(a, negate(b)));
    }

    /** −a. */
    public Node negate(Node a) {
        return multiple(BigFraction.MINUS_ONE, a);
    }

    /** a · b. */
    public Node multiply(Node a, Node b) {
        return product(List.of(a, b));
    }

    /**
     * a / b.
     *
     * @throws ArithmeticException if b is identically zero
     */
    public Node divide(Node a, Node b) {
        return product(List.of(a, power(b, BigFraction.MINUS_ONE)));
    }

    /** A rational multiple of a value. */
    public Node multiple(BigFraction coefficient, Node node) {
        if (coefficient.signum() == 0) {
            return zero;
        }
        if (coefficient.equals(BigFraction.ONE)) {
            return node;
        }
        if (node instanceof Node.Constant constant) {
            return constant(coefficient.multiply(constant.value()));
        }
        if (node instanceof Node.Multiple multiple) {
            return multiple(coefficient.multiply(multiple.coefficient()), multiple.node());
        }
        return intern(List.of("multiple", coefficient, node.id()), id -> new Node.Multiple(id, coefficient, node));
    }

    /** The sum of any number of values. */
    public Node sum(Collection<Node> summands) {
        Map<Node, BigFraction> terms = new LinkedHashMap<>();
        BigFraction[] constant = {BigFraction.ZERO};
        for (Node summand : summands) {
            addTerm(summand, BigFraction.ONE, terms, constant);
        }
        terms.values().removeIf(coefficient -> coefficient.signum() == 0);
        if (terms.isEmpty()) {
            return constant(constant[0]);
        }
        if (terms.size() == 1 && constant[0].signum() == 0) {
            Map.Entry<Node, BigFraction> only = terms.entrySet().iterator().next();
            return multiple(only.getValue(), only.getKey());
        }
        List<Node> sorted = new ArrayList<>(terms.keySet());
        sorted.sort(java.util.Comparator.comparingInt(Node::id));
        BigFraction content = content(terms.values(), constant[0]);
        int sign = constant[0].signum() != 0
                ? constant[0].signum()
                : terms.get(sorted.get(0)).signum();
        if (sign < 0) {
            content = content.negate();
        }
        List<BigFraction> coefficients = new ArrayList<>();
        for (Node node : sorted) {
            coefficients.add(terms.get(node).divide(content));
        }
        BigFraction rest = constant[0].divide(content);
        List<Object> form = new ArrayList<>(List.of("sum", rest));
        BitSet symbols = new BitSet();
        for (int i = 0; i < sorted.size(); i++) {
            form.add(coefficients.get(i));
            form.add(sorted.get(i).id());
            symbols.or(sorted.get(i).symbols());
        }
        Node sum = intern(form, id -> new Node.Sum(id, symbols, rest, coefficients, sorted));
        return multiple(content, sum);
    }

    private void addTerm(Node node, BigFraction coefficient, Map<Node, BigFraction> terms, BigFraction[] constant) {
        if (node instanceof Node.Constant number) {
            constant[0] = constant[0].add(coefficient.multiply(number.value()));
        } else if (node instanceof Node.Multiple multiple) {
            addTerm(multiple.node(), coefficient.multiply(multiple.coefficient()), terms, constant);
        } else if (node instanceof Node.Sum sum && !isKept(node)) {
            constant[0] = constant[0].add(coefficient.multiply(sum.constant()));
            for (int i = 0; i < sum.operands().size(); i++) {
                addTerm(
                        sum.operands().get(i),
                        coefficient.multiply(sum.coefficients().get(i)),
                        terms,
                        constant);
            }
        } else {
            terms.merge(node, coefficient, BigFraction::add);
        }
    }

    /** The positive rational by which coefficients must be divided to become coprime integers. */
    private static BigFraction content(Collection<BigFraction> coefficients, BigFraction constant) {
        BigInteger numerator = constant.getNumerator();
        BigInteger denominator = constant.getDenominator();
        for (BigFraction coefficient : coefficients) {
            numerator = numerator.gcd(coefficient.getNumerator());
            denominator = denominator
                    .multiply(coefficient.getDenominator())
                    .divide(denominator.gcd(coefficient.getDenominator()));
        }
        return new BigFraction(numerator.abs(), denominator);
    }

    /** The product of any number of values. */
    public Node product(Collection<Node> factors) {
        ProductBuilder builder = new ProductBuilder(this);
        for (Node factor : factors) {
            builder.multiplyBy(factor);
        }
        return builder.build();
    }

    /** The product of factors that are already powers of different bases, none a constant or multiple. */
    Node primitiveProduct(List<Node> factors) {
        if (factors.isEmpty()) {
            return one;
        }
        if (factors.size() == 1) {
            return factors.get(0);
        }
        List<Node> sorted = new ArrayList<>(factors);
        sorted.sort(java.util.Comparator.comparingInt(Node::id));
        BitSet symbols = new BitSet();
        List<Object> form = new ArrayList<>(List.of("product"));
        for (Node factor : sorted) {
            form.add(factor.id());
            symbols.or(factor.symbols());
        }
        return intern(form, id -> new Node.Product(id, symbols, sorted));
    }

    /** √a. */
    public Node sqrt(Node a) {
        return power(a, BigFraction.ONE_HALF);
    }

    /** 1/a. */
    public Node reciprocal(Node a) {
        return power(a, BigFraction.MINUS_ONE);
    }

    /**
     * A rational power; for an exponent that is no integer the base is taken to be not negative.
     *
     * @throws ArithmeticException if the base is identically zero and the exponent negative, or if a negative number
     *     is raised to an exponent that is no integer
     */
    public Node power(Node base, BigFraction exponent) {
        return Powers.power(this, base, exponent);
    }

    /** An integer power. */
    public Node power(Node base, int exponent) {
        return power(base, new BigFraction(exponent));
    }

    /** A power whose exponent is any value: shared {@code Math.pow} for parameters, exp(e·log b) in general. */
    public Node power(Node base, Node exponent) {
        return Powers.power(this, base, exponent);
    }

    Node primitivePower(Node base, BigFraction exponent) {
        return intern(List.of("power", base.id(), exponent), id -> new Node.Power(id, base, exponent));
    }

    Node primitiveParameterPower(Node base, Node exponent) {
        BitSet symbols = (BitSet) base.symbols().clone();
        symbols.or(exponent.symbols());
        return intern(
                List.of("parameter-power", base.id(), exponent.id()),
                id -> new Node.ParameterPower(id, symbols, base, exponent));
    }

    /** A function of its arguments. */
    public Node call(RealFunction function, Node... arguments) {
        return Calls.call(this, function, arguments);
    }

    Node primitiveCall(RealFunction function, List<Node> arguments) {
        if (function == RealFunction.ABS || function == RealFunction.SIGNUM) {
            hasBranches = true;
        }
        BitSet symbols = new BitSet();
        List<Object> form = new ArrayList<>(List.of("call", function));
        for (Node argument : arguments) {
            symbols.or(argument.symbols());
            form.add(argument.id());
        }
        return intern(form, id -> new Node.Call(id, symbols, function, arguments));
    }

    private Node intern(Object form, java.util.function.IntFunction<Node> maker) {
        Node known = byForm.get(form);
        if (known != null) {
            return known;
        }
        Node node = maker.apply(nodes.size());
        if (node instanceof Node.Power power
                && !power.exponent().getDenominator().equals(BigInteger.ONE)) {
            hasBranches = true;
        }
        if (fingerprints.add(node, nodes)) {
            indexAnew();
        }
        realValues.add(node);
        Optional<Match> match =
                node instanceof Node.Constant || node instanceof Node.Multiple ? Optional.empty() : match(node);
        if (match.isPresent()) {
            fingerprints.removeLast();
            realValues.removeLast();
            Node equal = multiple(match.get().factor(), match.get().node());
            byForm.put(form, equal);
            return equal;
        }
        nodes.add(node);
        byForm.put(form, node);
        index(node);
        return node;
    }

    /** A known node of which another one is a rational multiple. */
    private record Match(BigFraction factor, Node node) {}

    /** Looks for a known node that a new one, not yet added, is a multiple of. */
    private Optional<Match> match(Node node) {
        long[] value = fingerprints.of(node);
        if (Arrays.stream(value).allMatch(v -> v == 0)) {
            return !hasBranches || realValues.isZero(node)
                    ? Optional.of(new Match(BigFraction.ZERO, one))
                    : Optional.empty();
        }
        if (Arrays.stream(value).anyMatch(v -> v == 0)) {
            return Optional.empty();
        }
        for (Node candidate : byValue.getOrDefault(projectiveKey(value), List.of())) {
            Optional<BigFraction> ratio = ratio(value, fingerprints.of(candidate));
            if (ratio.isPresent()
                    && (!hasBranches
                            || realValues.agree(node, candidate, ratio.get().doubleValue()))) {
                return Optional.of(new Match(ratio.get(), candidate));
            }
        }
        return Optional.empty();
    }

    private static Optional<BigFraction> ratio(long[] a, long[] b) {
        long quotient = PrimeField.VALUES.multiply(a[0], PrimeField.VALUES.inverse(b[0]));
        for (int k = 1; k < a.length; k++) {
            if (PrimeField.VALUES.multiply(quotient, b[k]) != a[k]) {
                return Optional.empty();
            }
        }
        return SmallRationals.reconstruct(quotient);
    }

    private static long projectiveKey(long[] value) {
        long inverse = PrimeField.VALUES.inverse(value[0]);
        long key = 0;
        for (int k = 1; k < value.length; k++) {
            key = key * 0x9E3779B97F4A7C15L + PrimeField.VALUES.multiply(inverse, value[k]);
        }
        return key;
    }

    private void index(Node node) {
        boolean isOne = node.isOne();
        if (!isOne && (node instanceof Node.Constant || node instanceof Node.Multiple)) {
            return;
        }
        long[] value = fingerprints.of(node);
        if (Arrays.stream(value).anyMatch(v -> v == 0)) {
            return;
        }
        byValue.computeIfAbsent(projectiveKey(value), k -> new ArrayList<>()).add(node);
    }

    private void indexAnew() {
        byValue.clear();
        nodes.forEach(this::index);
    }
}
