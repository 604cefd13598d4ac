package io.github.gammawright.generation;

import io.github.gammawright.algebra.AlgebraBudget;
import io.github.gammawright.algebra.FormStyle;
import io.github.gammawright.algebra.NormalForms;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Short closed forms of values, each found once, for as long as the algebra's budget lasts. */
final class ClosedForms {

    /** Up to how many different values are brought to closed form. */
    private static final int MOST = 160;

    private final NormalForms forms;
    private final Map<Node, Optional<Node>> found = new HashMap<>();

    ClosedForms(ExpressionGraph source, AlgebraBudget budget) {
        this.forms = new NormalForms(source, FormStyle.CHEAP, budget);
    }

    /** The graph in which the forms are. */
    ExpressionGraph target() {
        return forms.target();
    }

    /** A value as it is, in the graph of the forms. */
    Node copied(Node node) {
        return forms.copied(node);
    }

    /** The closed form of a value; empty if the budget ran out on it, or if there have been too many values. */
    Optional<Node> of(Node node) {
        if (found.size() >= MOST && !found.containsKey(node)) {
            return Optional.empty();
        }
        return found.computeIfAbsent(node, forms::factored);
    }

    /** The closed forms of all values, or none at all. */
    Optional<List<Node>> ofAll(List<Node> nodes) {
        if (new HashSet<>(nodes).size() > MOST) {
            return Optional.empty();
        }
        List<Node> closed = new ArrayList<>();
        for (Node node : nodes) {
            Optional<Node> form = of(node);
            if (form.isEmpty()) {
                return Optional.empty();
            }
            closed.add(form.get());
        }
        return Optional.of(closed);
    }
}
