package io.github.gammawright.graph;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.hipparchus.fraction.BigFraction;

/** Random values in a graph, for property-based tests. */
public final class RandomNodes {

    private static final List<RealFunction> SMOOTH = List.of(
            RealFunction.SIN,
            RealFunction.COS,
            RealFunction.EXP,
            RealFunction.TANH,
            RealFunction.ATAN,
            RealFunction.ASINH,
            RealFunction.COSH);

    private final ExpressionGraph graph;
    private final Random random;
    private final List<Node> pool = new ArrayList<>();

    /** Values made of the given ones. */
    public RandomNodes(ExpressionGraph graph, long seed, List<Node> leaves) {
        this.graph = graph;
        this.random = new Random(seed);
        this.pool.addAll(leaves);
    }

    /** A new value after so many random operations. */
    public Node next(int operations) {
        for (int i = 0; i < operations; i++) {
            Node node = operation();
            if (!(node instanceof Node.Constant)) {
                pool.add(node);
            }
        }
        return pool.get(pool.size() - 1);
    }

    private Node any() {
        return pool.get(random.nextInt(pool.size()));
    }

    private Node operation() {
        return switch (random.nextInt(8)) {
            case 0, 1 -> graph.add(any(), any());
            case 2 -> graph.subtract(any(), graph.multiple(new BigFraction(1 + random.nextInt(5), 3), any()));
            case 3, 4 -> graph.multiply(any(), any());
            // the denominator is at least one
            case 5 -> graph.divide(any(), graph.add(graph.one(), graph.power(any(), 2)));
            case 6 -> graph.call(SMOOTH.get(random.nextInt(SMOOTH.size())), bounded());
            default -> graph.sqrt(graph.add(graph.constant(1 + random.nextInt(3)), graph.power(any(), 2)));
        };
    }

    private Node bounded() {
        return graph.call(RealFunction.ATAN, any());
    }
}
