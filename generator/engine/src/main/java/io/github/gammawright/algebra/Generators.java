package io.github.gammawright.algebra;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/** The generators over which some values of a graph are rational functions, in an order that depends on them alone. */
final class Generators {

    private final List<Generator> all;
    private final Map<Node, Integer> byNode = new HashMap<>();
    private final Map<Node, Integer> rootsByRadicand = new HashMap<>();

    private Generators(List<Generator> all) {
        this.all = List.copyOf(all);
        for (int i = 0; i < all.size(); i++) {
            Generator generator = all.get(i);
            if (generator instanceof Generator.Free free) {
                byNode.put(free.node(), i);
            } else if (generator instanceof Generator.Paired paired) {
                byNode.put(paired.node(), i);
            } else if (generator instanceof Generator.Absolute absolute) {
                byNode.put(absolute.node(), i);
            } else if (generator instanceof Generator.Root root) {
                rootsByRadicand.put(root.radicand(), i);
            }
        }
    }

    List<Generator> all() {
        return all;
    }

    int size() {
        return all.size();
    }

    /** The number of the generator that a node is, or −1. */
    int indexOf(Node node) {
        return byNode.getOrDefault(node, -1);
    }

    /** The number of the root of a radicand, or −1. */
    int rootOf(Node radicand) {
        return rootsByRadicand.getOrDefault(radicand, -1);
    }

    /** Whether all the generators of another set are among these. */
    boolean covers(Generators other) {
        return all.containsAll(other.all.stream()
                        .filter(generator -> !(generator instanceof Generator.Paired))
                        .toList())
                && byNode.keySet().containsAll(other.byNode.keySet());
    }

    /** The values of which a node is a rational function, sum, product and root, none for a generator. */
    static List<Node> parts(Node node, Set<Node> opaque) {
        if (opaque.contains(node)) {
            return List.of();
        }
        if (node instanceof Node.Sum || node instanceof Node.Product || node instanceof Node.Multiple) {
            return node.operands();
        }
        if (node instanceof Node.Power) {
            return node.operands();
        }
        if (node instanceof Node.Call call && call.function() == RealFunction.ABS) {
            return node.operands();
        }
        return List.of();
    }

    /** The generators of the given values. */
    static Generators of(Iterable<Node> values, Set<Node> opaque, WorkMeter meter) {
        Set<Node> seen = new HashSet<>();
        List<Node> stack = new ArrayList<>();
        values.forEach(stack::add);
        List<Node> free = new ArrayList<>();
        Map<Integer, Node[]> circular = new TreeMap<>();
        Map<Integer, Node[]> hyperbolic = new TreeMap<>();
        List<Node.Call> absolutes = new ArrayList<>();
        Map<Node, BigInteger> radicands = new HashMap<>();
        while (!stack.isEmpty()) {
            Node node = stack.remove(stack.size() - 1);
            if (!seen.add(node)) {
                continue;
            }
            if (seen.size() > meter.budget().nodes()) {
                throw new BudgetExceededException();
            }
            List<Node> parts = parts(node, opaque);
            stack.addAll(parts);
            if (node instanceof Node.Power power && !parts.isEmpty()) {
                BigInteger degree = power.exponent().getDenominator();
                if (!degree.equals(BigInteger.ONE)) {
                    radicands.merge(power.base(), degree, Generators::leastCommonMultiple);
                }
            } else if (node instanceof Node.Call call && !parts.isEmpty()) {
                absolutes.add(call);
            } else if (parts.isEmpty() && !(node instanceof Node.Constant)) {
                sort(node, opaque, free, circular, hyperbolic);
            }
        }
        return new Generators(ordered(free, circular, hyperbolic, absolutes, radicands, meter));
    }

    private static BigInteger leastCommonMultiple(BigInteger a, BigInteger b) {
        return a.divide(a.gcd(b)).multiply(b);
    }

    private static void sort(
            Node node,
            Set<Node> opaque,
            List<Node> free,
            Map<Integer, Node[]> circular,
            Map<Integer, Node[]> hyperbolic) {
        if (node instanceof Node.Call call && !opaque.contains(node)) {
            int argument = call.operands().get(0).id();
            switch (call.function()) {
                case SIN -> circular.computeIfAbsent(argument, a -> new Node[2])[0] = node;
                case COS -> circular.computeIfAbsent(argument, a -> new Node[2])[1] = node;
                case SINH -> hyperbolic.computeIfAbsent(argument, a -> new Node[2])[0] = node;
                case COSH -> hyperbolic.computeIfAbsent(argument, a -> new Node[2])[1] = node;
                default -> free.add(node);
            }
        } else {
            free.add(node);
        }
    }

    private static List<Generator> ordered(
            List<Node> free,
            Map<Integer, Node[]> circular,
            Map<Integer, Node[]> hyperbolic,
            List<Node.Call> absolutes,
            Map<Node, BigInteger> radicands,
            WorkMeter meter) {
        List<Generator> all = new ArrayList<>();
        free.sort(Comparator.comparingInt(Generators::rank).thenComparingInt(Generators::position));
        free.forEach(node -> all.add(new Generator.Free(node)));
        addPairs(circular, false, all);
        addPairs(hyperbolic, true, all);
        // what a root is taken of has a smaller number than the root, so that relations refer to earlier generators
        Map<Integer, Generator> algebraic = new TreeMap<>();
        for (Node.Call absolute : absolutes) {
            Node argument = absolute.operands().get(0);
            algebraic.put(2 * argument.id(), new Generator.Absolute(absolute, argument));
        }
        for (Map.Entry<Node, BigInteger> radicand : radicands.entrySet()) {
            if (radicand.getValue().bitLength() > 6) {
                throw new BudgetExceededException();
            }
            algebraic.put(
                    2 * radicand.getKey().id() + 1,
                    new Generator.Root(radicand.getKey(), radicand.getValue().intValueExact()));
        }
        all.addAll(algebraic.values());
        if (all.size() > meter.budget().generators()) {
            throw new BudgetExceededException();
        }
        return all;
    }

    private static void addPairs(Map<Integer, Node[]> pairs, boolean hyperbolic, List<Generator> all) {
        for (Node[] pair : pairs.values()) {
            if (pair[0] == null || pair[1] == null) {
                all.add(new Generator.Free(pair[0] == null ? pair[1] : pair[0]));
            } else {
                all.add(new Generator.Free(pair[0]));
                all.add(new Generator.Paired(pair[1], all.size() - 1, hyperbolic));
            }
        }
    }

    private static int rank(Node node) {
        if (node instanceof Node.Leaf leaf) {
            return switch (leaf.symbol().kind()) {
                case COORDINATE -> 0;
                case PARAMETER -> 1;
                case CALLER_FUNCTION -> 2;
                case VELOCITY, COORDINATE_VELOCITY -> 3;
                case MOMENTUM -> 4;
                case VECTOR -> 5;
                case SEPARATION -> 6;
            };
        }
        return node instanceof Node.Pi ? 7 : 8;
    }

    private static int position(Node node) {
        return node instanceof Node.Leaf leaf && leaf.symbol().kind() != Symbol.Kind.CALLER_FUNCTION
                ? leaf.symbol().index()
                : node.id();
    }

    /** Whether a set of generators goes beyond another one by nothing but the partners of sines and cosines in it. */
    boolean coversButForPartners(Generators other, ExpressionGraph graph) {
        for (Generator generator : other.all) {
            Node node = generator instanceof Generator.Free f
                    ? f.node()
                    : generator instanceof Generator.Paired p ? p.node() : null;
            if (node == null) {
                if (!all.contains(generator)) {
                    return false;
                }
            } else if (!byNode.containsKey(node) && !hasPartnerOf(node, graph)) {
                return false;
            }
        }
        return true;
    }

    private boolean hasPartnerOf(Node node, ExpressionGraph graph) {
        if (!(node instanceof Node.Call call)) {
            return false;
        }
        RealFunction partner = switch (call.function()) {
            case SIN -> RealFunction.COS;
            case COS -> RealFunction.SIN;
            case SINH -> RealFunction.COSH;
            case COSH -> RealFunction.SINH;
            default -> null;
        };
        return partner != null
                && byNode.containsKey(graph.call(partner, call.operands().get(0)));
    }
}
