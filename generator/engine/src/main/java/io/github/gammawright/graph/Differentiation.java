package io.github.gammawright.graph;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.hipparchus.fraction.BigFraction;

/** Exact derivatives of the values of a graph, forward by one symbol or backward by many. */
public final class Differentiation {

    private final ExpressionGraph graph;
    private final Map<Symbol, Map<Node, Node>> forward = new HashMap<>();

    /** Derivatives are made in the given graph. */
    public Differentiation(ExpressionGraph graph) {
        this.graph = graph;
    }

    /** ∂node/∂symbol, everything else held fixed. */
    public Node derivative(Node node, Symbol symbol) {
        if (!graph.dependsOn(node, symbol)) {
            return graph.zero();
        }
        Map<Node, Node> known = forward.computeIfAbsent(symbol, s -> new HashMap<>());
        Node derivative = known.get(node);
        if (derivative == null) {
            derivative = chain(node, operand -> derivative(operand, symbol), symbol);
            known.put(node, derivative);
        }
        return derivative;
    }

    /**
     * The derivative along a direction: Σ rate(symbol) ∂node/∂symbol, by one forward sweep.
     *
     * @param rates the directions of the symbols that change
     */
    public Node directional(Node node, Map<Symbol, Node> rates) {
        return directional(node, rates, new HashMap<>());
    }

    /** The derivative along a direction, of several nodes that share their sweep. */
    public List<Node> directional(List<Node> nodes, Map<Symbol, Node> rates) {
        Map<Node, Node> known = new HashMap<>();
        List<Node> derivatives = new ArrayList<>();
        for (Node node : nodes) {
            derivatives.add(directional(node, rates, known));
        }
        return derivatives;
    }

    private Node directional(Node node, Map<Symbol, Node> rates, Map<Node, Node> known) {
        Node derivative = known.get(node);
        if (derivative == null) {
            if (rates.keySet().stream().noneMatch(symbol -> graph.dependsOn(node, symbol))) {
                derivative = graph.zero();
            } else if (node instanceof Node.Leaf leaf) {
                List<Node> terms = new ArrayList<>();
                for (Map.Entry<Symbol, Node> rate : rates.entrySet()) {
                    if (graph.dependsOn(node, rate.getKey())) {
                        terms.add(graph.multiply(leafDerivative(leaf, rate.getKey()), rate.getValue()));
                    }
                }
                derivative = graph.sum(terms);
            } else {
                derivative = chain(node, operand -> directional(operand, rates, known), null);
            }
            known.put(node, derivative);
        }
        return derivative;
    }

    /**
     * The derivatives of one value by many symbols, by one backward sweep (Baur &amp; Strassen 1983): the cost is a small
     * multiple of that of the value, however many symbols there are.
     *
     * @return ∂node/∂symbol for each symbol, in their order
     */
    public List<Node> gradient(Node node, List<Symbol> symbols) {
        // by falling number: a node comes after all its users
        TreeMap<Integer, Node> pending = new TreeMap<>(java.util.Comparator.reverseOrder());
        Map<Node, List<Node>> contributions = new HashMap<>();
        pending.put(node.id(), node);
        contributions.put(node, new ArrayList<>(List.of(graph.one())));
        Map<Symbol, List<Node>> gathered = new HashMap<>();
        while (!pending.isEmpty()) {
            Node current = pending.pollFirstEntry().getValue();
            Node adjoint = graph.sum(contributions.remove(current));
            if (adjoint.isZero()) {
                continue;
            }
            graph.keep(adjoint);
            if (current instanceof Node.Leaf leaf) {
                for (Symbol symbol : symbols) {
                    if (graph.dependsOn(leaf, symbol)) {
                        gathered.computeIfAbsent(symbol, s -> new ArrayList<>())
                                .add(graph.multiply(adjoint, leafDerivative(leaf, symbol)));
                    }
                }
                continue;
            }
            for (int i = 0; i < current.operands().size(); i++) {
                Node operand = current.operands().get(i);
                if (symbols.stream().noneMatch(symbol -> graph.dependsOn(operand, symbol))) {
                    continue;
                }
                Node partial = partial(current, i);
                contributions.computeIfAbsent(operand, o -> new ArrayList<>()).add(graph.multiply(adjoint, partial));
                pending.put(operand.id(), operand);
            }
        }
        List<Node> gradient = new ArrayList<>();
        for (Symbol symbol : symbols) {
            gradient.add(graph.sum(gathered.getOrDefault(symbol, List.of())));
        }
        return gradient;
    }

    private Node chain(Node node, java.util.function.UnaryOperator<Node> inner, Symbol symbol) {
        if (node instanceof Node.Leaf leaf) {
            return leafDerivative(leaf, symbol);
        }
        List<Node> terms = new ArrayList<>();
        for (int i = 0; i < node.operands().size(); i++) {
            Node rate = inner.apply(node.operands().get(i));
            if (!rate.isZero()) {
                terms.add(graph.multiply(partial(node, i), rate));
            }
        }
        return graph.sum(terms);
    }

    private Node leafDerivative(Node.Leaf leaf, Symbol symbol) {
        if (leaf.symbol().equals(symbol)) {
            return graph.one();
        }
        if (leaf.symbol().kind() != Symbol.Kind.CALLER_FUNCTION) {
            return graph.zero();
        }
        Symbol function = leaf.symbol();
        int position = graph.callerFunctionArguments(function.index()).indexOf(symbol);
        if (position < 0) {
            return graph.zero();
        }
        List<Integer> orders = new ArrayList<>(function.orders());
        orders.set(position, orders.get(position) + 1);
        return graph.symbol(new Symbol(Symbol.Kind.CALLER_FUNCTION, function.name(), function.index(), orders));
    }

    /** The partial derivative of a node by one of its operands. */
    private Node partial(Node node, int i) {
        if (node instanceof Node.Multiple multiple) {
            return graph.constant(multiple.coefficient());
        }
        if (node instanceof Node.Sum sum) {
            return graph.constant(sum.coefficients().get(i));
        }
        if (node instanceof Node.Product product) {
            List<Node> others = new ArrayList<>(product.operands());
            others.remove(i);
            return graph.product(others);
        }
        if (node instanceof Node.Power power) {
            BigFraction e = power.exponent();
            return graph.multiple(e, graph.power(power.base(), e.subtract(BigFraction.ONE)));
        }
        if (node instanceof Node.ParameterPower power) {
            if (i == 1) {
                return graph.multiply(node, graph.call(RealFunction.LOG, power.base()));
            }
            return graph.product(List.of(power.exponent(), node, graph.reciprocal(power.base())));
        }
        return callPartial((Node.Call) node, i);
    }

    private Node callPartial(Node.Call call, int i) {
        Node x = call.operands().get(0);
        return switch (call.function()) {
            case SIN -> graph.call(RealFunction.COS, x);
            case COS -> graph.negate(graph.call(RealFunction.SIN, x));
            case ASIN -> graph.power(oneMinusSquare(x), BigFraction.ONE_HALF.negate());
            case ACOS -> graph.negate(graph.power(oneMinusSquare(x), BigFraction.ONE_HALF.negate()));
            case ATAN -> graph.reciprocal(graph.add(graph.one(), graph.power(x, 2)));
            case ATAN2 -> angle(x, call.operands().get(1), i);
            case SINH -> graph.call(RealFunction.COSH, x);
            case COSH -> graph.call(RealFunction.SINH, x);
            case TANH -> oneMinusSquare(call);
            case ASINH -> graph.power(graph.add(graph.power(x, 2), graph.one()), BigFraction.ONE_HALF.negate());
            case ACOSH ->
                graph.power(
                        graph.multiply(graph.subtract(x, graph.one()), graph.add(x, graph.one())),
                        BigFraction.ONE_HALF.negate());
            case ATANH -> graph.reciprocal(oneMinusSquare(x));
            case EXP -> call;
            case LOG -> graph.reciprocal(x);
            case ABS -> graph.call(RealFunction.SIGNUM, x);
            case SIGNUM -> graph.zero();
            case TAN, SQRT, CBRT, POW -> throw new IllegalStateException(call.function() + " is no node of a graph");
        };
    }

    /** 1 − x², as (1 − x)(1 + x), which keeps its digits where x is near ±1. */
    private Node oneMinusSquare(Node x) {
        return graph.multiply(graph.subtract(graph.one(), x), graph.add(graph.one(), x));
    }

    /** The derivative of atan2(y, x): by y it is x/(x² + y²), by x it is −y/(x² + y²). */
    private Node angle(Node y, Node x, int i) {
        Node square = graph.add(graph.power(x, 2), graph.power(y, 2));
        return i == 0 ? graph.divide(x, square) : graph.negate(graph.divide(y, square));
    }
}
