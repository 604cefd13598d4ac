package io.github.gammawright.graph;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;

/**
 * Copies values from one graph to another, with the names of those that the author named. A graph keeps one form for
 * each value, so that a second form of it needs a second graph.
 */
public final class Transfer {

    private final ExpressionGraph source;
    private final ExpressionGraph target;
    private final Map<Node, Node> copies = new HashMap<>();
    private Predicate<Node> fixed = node -> false;

    /** A way from the source to the target. */
    public Transfer(ExpressionGraph source, ExpressionGraph target) {
        this.source = source;
        this.target = target;
    }

    /**
     * A way inside one graph on which values take the place of symbols. What does not depend on these stays as it is.
     *
     * @param values what takes the place of each symbol
     */
    public static Transfer substituting(ExpressionGraph graph, Map<Symbol, Node> values) {
        Transfer transfer = new Transfer(graph, graph);
        values.forEach((symbol, value) -> transfer.copies.put(graph.symbol(symbol), value));
        transfer.fixed = node -> values.keySet().stream().noneMatch(symbol -> graph.dependsOn(node, symbol));
        return transfer;
    }

    /** An empty graph over the same domain that has the named values of the source, and a way to it. */
    public static Transfer toFreshGraph(ExpressionGraph source) {
        Transfer transfer = new Transfer(source, new ExpressionGraph(source.samplePoints()));
        source.names().keySet().stream()
                .sorted(java.util.Comparator.comparingInt(Node::id))
                .forEach(transfer::copy);
        return transfer;
    }

    /** Where the copies go. */
    public ExpressionGraph target() {
        return target;
    }

    /** The same value in the target; it is of another form where the target already has it in another one. */
    public Node copy(Node node) {
        Node known = copies.get(node);
        if (known != null) {
            return known;
        }
        // by a stack of its own, since a graph may be deeper than the thread's
        List<Node> stack = new ArrayList<>(List.of(node));
        while (!stack.isEmpty()) {
            Node top = stack.get(stack.size() - 1);
            if (fixed.test(top)) {
                copies.put(top, top);
                stack.remove(stack.size() - 1);
                continue;
            }
            boolean ready = true;
            for (Node operand : top.operands()) {
                if (!copies.containsKey(operand)) {
                    stack.add(operand);
                    ready = false;
                }
            }
            if (ready) {
                stack.remove(stack.size() - 1);
                if (!copies.containsKey(top)) {
                    Node copy = make(top);
                    copies.put(top, copy);
                    if (source.isKept(top)) {
                        target.keep(copy);
                    }
                    source.nameOf(top).ifPresent(name -> target.name(copy, name));
                }
            }
        }
        return copies.get(node);
    }

    private Node make(Node node) {
        List<Node> operands = new ArrayList<>();
        for (Node operand : node.operands()) {
            operands.add(copies.get(operand));
        }
        if (node instanceof Node.Constant constant) {
            return target.constant(constant.value());
        }
        if (node instanceof Node.Pi) {
            return target.pi();
        }
        if (node instanceof Node.Leaf leaf) {
            Symbol symbol = leaf.symbol();
            if (symbol.kind() == Symbol.Kind.CALLER_FUNCTION) {
                target.callerFunction(symbol.name(), symbol.index(), source.callerFunctionArguments(symbol.index()));
            }
            return target.symbol(symbol);
        }
        if (node instanceof Node.Multiple multiple) {
            return target.multiple(multiple.coefficient(), operands.get(0));
        }
        if (node instanceof Node.Sum sum) {
            List<Node> terms = new ArrayList<>();
            for (int i = 0; i < operands.size(); i++) {
                terms.add(target.multiple(sum.coefficients().get(i), operands.get(i)));
            }
            terms.add(target.constant(sum.constant()));
            return target.sum(terms);
        }
        if (node instanceof Node.Product) {
            return target.product(operands);
        }
        if (node instanceof Node.Power power) {
            return target.power(operands.get(0), power.exponent());
        }
        if (node instanceof Node.ParameterPower) {
            return target.power(operands.get(0), operands.get(1));
        }
        return target.call(((Node.Call) node).function(), operands.toArray(Node[]::new));
    }
}
