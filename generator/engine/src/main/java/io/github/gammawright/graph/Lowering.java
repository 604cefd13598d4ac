package io.github.gammawright.graph;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.hipparchus.fraction.BigFraction;

/**
 * Turns the values of a graph into a program of binary operations: what depends on parameters alone is gathered so that
 * a constructor can compute it, powers become multiplications along short chains, a denominator that serves several
 * values is inverted once, and signs are carried along instead of being computed.
 */
public final class Lowering {

    private final ExpressionGraph graph;
    private final ProgramBuilder program = new ProgramBuilder();
    private final Map<Node, Signed> lowered = new HashMap<>();
    private final Map<Node, Integer> reciprocalUses = new HashMap<>();
    private final Map<Node, Signed> reciprocals = new HashMap<>();
    private final Map<Integer, Node> atoms = new HashMap<>();

    private Lowering(ExpressionGraph graph) {
        this.graph = graph;
    }

    /** The number of an instruction, and whether its negative is meant. */
    private record Signed(int number, boolean negative) {
        Signed times(boolean minus) {
            return minus ? new Signed(number, !negative) : this;
        }
    }

    /** A program whose outputs are the given values, in their order. */
    public static StraightLineProgram lower(ExpressionGraph graph, List<Node> outputs) {
        return lowerWithValues(graph, outputs).program();
    }

    /** The same together with the prime-field values of what is not arithmetic. */
    public static LoweredProgram lowerWithValues(ExpressionGraph graph, List<Node> outputs) {
        Lowering lowering = new Lowering(graph);
        lowering.countReciprocals(outputs);
        List<Integer> numbers = new ArrayList<>();
        for (Node output : outputs) {
            numbers.add(lowering.plain(lowering.lower(output)));
        }
        // only now: a node made on the way may have had a point drawn anew
        Map<Integer, long[]> values = new HashMap<>();
        lowering.atoms.forEach((number, node) -> values.put(number, graph.fingerprint(node)));
        return new LoweredProgram(lowering.program.build(numbers), values);
    }

    /** Counts in how many products each denominator occurs. */
    private void countReciprocals(List<Node> outputs) {
        Set<Node> seen = new HashSet<>();
        List<Node> stack = new ArrayList<>(outputs);
        while (!stack.isEmpty()) {
            Node node = stack.remove(stack.size() - 1);
            if (!seen.add(node)) {
                continue;
            }
            List<Node> factors = node instanceof Node.Product ? node.operands() : List.of(node);
            for (Node factor : factors) {
                if (factor instanceof Node.Power power && power.exponent().signum() < 0) {
                    // a square in the denominator is the reciprocal's square
                    int weight = power.exponent().equals(BigFraction.MINUS_ONE) ? 1 : 2;
                    reciprocalUses.merge(power.base(), weight, Integer::sum);
                }
            }
            if (node instanceof Node.Product) {
                for (Node factor : factors) {
                    if (factor instanceof Node.Power power && power.exponent().signum() < 0) {
                        stack.add(power.base());
                    } else {
                        stack.add(factor);
                    }
                }
            } else {
                stack.addAll(node.operands());
            }
        }
    }

    private int plain(Signed value) {
        return value.negative() ? program.negate(value.number()) : value.number();
    }

    /** The value of a node, where it depends on parameters alone without a sign before a difference. */
    private int plain(Node node) {
        Signed value = lower(node);
        if (value.negative()
                && graph.isParameterOnly(node)
                && program.instruction(value.number()) instanceof Instruction.Arithmetic difference
                && difference.operator() == Instruction.Operator.SUBTRACT) {
            return program.subtract(difference.right(), difference.left());
        }
        return plain(value);
    }

    private Signed lower(Node node) {
        Signed known = lowered.get(node);
        if (known != null) {
            return known;
        }
        Signed value = compute(node);
        lowered.put(node, value);
        graph.nameOf(node).ifPresent(name -> {
            if (!value.negative()) {
                program.name(value.number(), name);
            }
        });
        return value;
    }

    private Signed compute(Node node) {
        if (node instanceof Node.Constant constant) {
            boolean negative = constant.value().signum() < 0;
            return new Signed(program.constant(constant.value().abs()), negative);
        }
        if (node instanceof Node.Pi) {
            return atom(node, new Instruction.Pi());
        }
        if (node instanceof Node.Leaf leaf) {
            return atom(node, new Instruction.Load(leaf.symbol()));
        }
        if (node instanceof Node.Multiple multiple) {
            return product(
                    multiple.coefficient(),
                    multiple.node() instanceof Node.Product p && !isShared(p)
                            ? p.operands()
                            : List.of(multiple.node()));
        }
        if (node instanceof Node.Product) {
            return product(BigFraction.ONE, node.operands());
        }
        if (node instanceof Node.Sum sum) {
            return sum(sum);
        }
        if (node instanceof Node.Power power) {
            return product(BigFraction.ONE, List.of(power));
        }
        if (node instanceof Node.ParameterPower power) {
            return call(node, RealFunction.POW, power.operands());
        }
        Node.Call call = (Node.Call) node;
        return call(node, call.function(), call.operands());
    }

    /** Whether a product under a multiple is worth keeping whole; a parameter-only coefficient is better merged. */
    private boolean isShared(Node.Product product) {
        return graph.isKept(product) || lowered.containsKey(product);
    }

    private Signed call(Node node, RealFunction function, List<Node> arguments) {
        List<Integer> numbers = new ArrayList<>();
        for (Node argument : arguments) {
            numbers.add(plain(argument));
        }
        return atom(node, new Instruction.Call(function, numbers));
    }

    /** Appends an instruction that is no arithmetic and notes the prime-field value of the node that it computes. */
    private Signed atom(Node node, Instruction instruction) {
        int number = program.append(instruction);
        atoms.putIfAbsent(number, node);
        return new Signed(number, false);
    }

    private Signed sum(Node.Sum sum) {
        // what depends on parameters alone comes first, as one value
        Signed total = null;
        if (sum.constant().signum() != 0) {
            total = new Signed(
                    program.constant(sum.constant().abs()), sum.constant().signum() < 0);
        }
        for (int pass = 0; pass < 2; pass++) {
            for (int i = 0; i < sum.operands().size(); i++) {
                Node term = sum.operands().get(i);
                if (graph.isParameterOnly(term) == (pass == 0)) {
                    total = plus(total, scaled(sum.coefficients().get(i), term));
                }
            }
        }
        return total;
    }

    private Signed scaled(BigFraction coefficient, Node term) {
        BigFraction magnitude = coefficient.abs();
        Signed value = magnitude.equals(BigFraction.ONE) ? lower(term) : lower(graph.multiple(magnitude, term));
        return value.times(coefficient.signum() < 0);
    }

    private Signed plus(Signed a, Signed b) {
        if (a == null) {
            return b;
        }
        if (a.negative() == b.negative()) {
            return new Signed(program.add(a.number(), b.number()), a.negative());
        }
        return a.negative()
                ? new Signed(program.subtract(b.number(), a.number()), false)
                : new Signed(program.subtract(a.number(), b.number()), false);
    }

    private Signed product(BigFraction coefficient, List<Node> factors) {
        boolean negative = coefficient.signum() < 0;
        BigFraction magnitude = coefficient.abs();
        Integer total = magnitude.equals(BigFraction.ONE) ? null : program.constant(magnitude);
        List<Integer> divisors = new ArrayList<>();
        for (int pass = 0; pass < 2; pass++) {
            for (Node factor : factors) {
                if (graph.isParameterOnly(factor) != (pass == 0)) {
                    continue;
                }
                if (factor instanceof Node.Power power
                        && power.exponent().equals(BigFraction.MINUS_ONE)
                        && factors.size() + (total == null ? 0 : 1) > 1
                        && (pass == 0 || reciprocalUses.getOrDefault(power.base(), 0) <= 1)) {
                    Signed divisor = lower(power.base());
                    negative ^= divisor.negative();
                    if (pass == 0) {
                        total = program.divide(
                                total == null ? program.constant(BigFraction.ONE) : total, divisor.number());
                    } else {
                        divisors.add(divisor.number());
                    }
                    continue;
                }
                Signed value = factor instanceof Node.Power power ? power(power) : lower(factor);
                negative ^= value.negative();
                total = total == null ? value.number() : program.multiply(total, value.number());
            }
        }
        for (int divisor : divisors) {
            total = program.divide(total == null ? program.constant(BigFraction.ONE) : total, divisor);
        }
        return new Signed(total, negative);
    }

    private Signed power(Node.Power power) {
        Signed known = lowered.get(power);
        if (known == null) {
            known = computePower(power);
            lowered.put(power, known);
        }
        return known;
    }

    private Signed reciprocal(Node base) {
        Node inverse = graph.reciprocal(base);
        if (inverse instanceof Node.Power power && power.base() == base) {
            return power(power);
        }
        // the graph knows the reciprocal in another form, which may be computed from what is being computed here
        return reciprocals.computeIfAbsent(base, b -> {
            Signed divisor = lower(b);
            return new Signed(program.divide(program.constant(BigFraction.ONE), divisor.number()), divisor.negative());
        });
    }

    private Signed computePower(Node.Power power) {
        BigFraction exponent = power.exponent();
        BigInteger denominator = exponent.getDenominator();
        BigInteger numerator = exponent.getNumerator();
        if (numerator.signum() < 0) {
            if (exponent.equals(BigFraction.MINUS_ONE)) {
                Signed base = lower(power.base());
                return new Signed(program.divide(program.constant(BigFraction.ONE), base.number()), base.negative());
            }
            if (denominator.equals(BigInteger.ONE)) {
                return whole(reciprocal(power.base()), numerator.negate());
            }
            // x^(−m/n) is the reciprocal of x^(m/n), which is likely to be there
            Signed positive = positivePower(power.base(), exponent.negate());
            return new Signed(
                    program.divide(program.constant(BigFraction.ONE), positive.number()), positive.negative());
        }
        if (denominator.equals(BigInteger.ONE)) {
            return whole(lower(power.base()), numerator);
        }
        return root(power.base(), numerator, denominator);
    }

    private Signed positivePower(Node base, BigFraction exponent) {
        Node positive = graph.power(base, exponent);
        if (positive instanceof Node.Power power && power.base() == base) {
            return power(power);
        }
        // as for reciprocals, the graph's other form may be computed from what is being computed here
        return root(base, exponent.getNumerator(), exponent.getDenominator());
    }

    private Signed root(Node base, BigInteger numerator, BigInteger denominator) {
        int radicand = plain(base);
        boolean named = denominator.equals(BigInteger.TWO)
                || denominator.equals(BigInteger.valueOf(3))
                || denominator.equals(BigInteger.valueOf(4));
        if (!named || numerator.bitLength() > 6) {
            BigFraction exponent = new BigFraction(numerator, denominator);
            int number = program.constant(exponent);
            return atom(graph.power(base, exponent), new Instruction.Call(RealFunction.POW, List.of(radicand, number)));
        }
        Node rootNode = graph.power(base, new BigFraction(BigInteger.ONE, denominator));
        Signed root;
        if (denominator.equals(BigInteger.TWO)) {
            root = atom(rootNode, new Instruction.Call(RealFunction.SQRT, List.of(radicand)));
        } else if (denominator.equals(BigInteger.valueOf(3))) {
            root = atom(rootNode, new Instruction.Call(RealFunction.CBRT, List.of(radicand)));
        } else {
            Signed half = atom(graph.sqrt(base), new Instruction.Call(RealFunction.SQRT, List.of(radicand)));
            root = atom(rootNode, new Instruction.Call(RealFunction.SQRT, List.of(half.number())));
        }
        BigInteger[] parts = numerator.divideAndRemainder(denominator);
        Signed fraction = whole(root, parts[1]);
        if (parts[0].signum() == 0) {
            return fraction;
        }
        Signed full = whole(lower(base), parts[0]);
        return new Signed(program.multiply(full.number(), fraction.number()), full.negative());
    }

    /** A positive integer power by the binary method, its squares shared. */
    private Signed whole(Signed base, BigInteger exponent) {
        if (exponent.bitLength() > 40) {
            throw new IllegalStateException("exponent " + exponent);
        }
        Integer result = null;
        int square = base.number();
        for (long e = exponent.longValueExact(); ; ) {
            if ((e & 1) != 0) {
                result = result == null ? square : program.multiply(result, square);
            }
            e >>>= 1;
            if (e == 0) {
                break;
            }
            square = program.multiply(square, square);
        }
        return new Signed(result, base.negative() && exponent.testBit(0));
    }
}
