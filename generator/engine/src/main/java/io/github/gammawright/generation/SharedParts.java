package io.github.gammawright.generation;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/** Which parts of some formulas get lines of their own: the author's abbreviations, and parts of what is too long. */
final class SharedParts {

    /** How many parts a formula may have in one line. */
    static final long LONGEST = 4_000;

    /** Parts shorter than this are repeated sooner than named. */
    private static final long SHORTEST = 6;

    private final List<Node> parts = new ArrayList<>();
    private final Map<Node, String> names = new HashMap<>();

    private SharedParts() {}

    /** The size of the formula of a value, in which named values count one; saturates. */
    static long size(ExpressionGraph graph, Node node) {
        return sizes(graph, List.of(node), Set.of()).get(node);
    }

    static SharedParts of(ExpressionGraph graph, Collection<Node> values) {
        SharedParts shared = new SharedParts();
        Set<Node> reachable = reachable(values);
        Set<Node> lines = new HashSet<>();
        for (Node node : reachable) {
            if (graph.nameOf(node).isPresent()) {
                lines.add(node);
            }
        }
        Map<Node, Long> sizes = sizes(graph, values, Set.of());
        long longest = 0;
        for (Node node : lines) {
            longest = Math.max(longest, sizes.get(node));
        }
        for (Node value : values) {
            longest = Math.max(longest, sizes.get(value));
        }
        if (longest > LONGEST) {
            lines.addAll(repeated(reachable, sizes));
        }
        Set<String> taken = new HashSet<>(graph.names().values());
        for (Node node : reachable) {
            if (node instanceof Node.Leaf leaf) {
                taken.add(leaf.symbol().name());
            }
        }
        int number = 1;
        for (Node node : reachable) {
            if (lines.contains(node)) {
                shared.parts.add(node);
                if (graph.nameOf(node).isEmpty()) {
                    while (taken.contains("w" + number)) {
                        number++;
                    }
                    shared.names.put(node, "w" + number++);
                }
            }
        }
        return shared;
    }

    /** Values that are used more than once and are long enough to be worth a name. */
    private static Set<Node> repeated(Set<Node> reachable, Map<Node, Long> sizes) {
        Map<Node, Integer> uses = new HashMap<>();
        for (Node node : reachable) {
            for (Node operand : node.operands()) {
                uses.merge(operand, 1, Integer::sum);
            }
        }
        Set<Node> repeated = new HashSet<>();
        for (Node node : reachable) {
            boolean plain = node instanceof Node.Constant || node instanceof Node.Multiple || node instanceof Node.Leaf;
            if (!plain && uses.getOrDefault(node, 0) > 1 && sizes.get(node) >= SHORTEST) {
                repeated.add(node);
            }
        }
        return repeated;
    }

    /** The parts by rising number, so that each comes after those that it uses. */
    List<Node> inOrder() {
        return parts;
    }

    /** The name of a part that the author did not name. */
    String nameOf(Node part) {
        return names.get(part);
    }

    private static Set<Node> reachable(Collection<Node> values) {
        TreeSet<Node> reachable = new TreeSet<>(Comparator.comparingInt(Node::id));
        List<Node> stack = new ArrayList<>(values);
        while (!stack.isEmpty()) {
            Node node = stack.remove(stack.size() - 1);
            if (reachable.add(node)) {
                stack.addAll(node.operands());
            }
        }
        return reachable;
    }

    private static Map<Node, Long> sizes(ExpressionGraph graph, Collection<Node> values, Set<Node> whole) {
        Map<Node, Long> sizes = new HashMap<>();
        for (Node node : reachable(values)) {
            long size = 1;
            for (Node operand : node.operands()) {
                boolean named = graph.nameOf(operand).isPresent() || whole.contains(operand);
                size = Math.min(Integer.MAX_VALUE, size + (named ? 1 : sizes.get(operand)));
            }
            sizes.put(node, size);
        }
        return sizes;
    }
}
