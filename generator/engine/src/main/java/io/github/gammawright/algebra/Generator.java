package io.github.gammawright.algebra;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Transfer;
import org.hipparchus.fraction.BigFraction;

/** A value that normal forms treat as a variable, perhaps one that satisfies a polynomial relation with earlier ones. */
sealed interface Generator {

    /** A power of the generator in the target of a transfer. */
    Node build(Transfer transfer, long exponent);

    /** A value that satisfies no relation that is known. */
    record Free(Node node) implements Generator {
        @Override
        public Node build(Transfer transfer, long exponent) {
            return power(transfer, node, new BigFraction(exponent));
        }
    }

    /**
     * The second of a pair with c² = 1 − s² or, for hyperbolic functions, c² = 1 + s².
     *
     * @param node c
     * @param partner the number of the generator s
     */
    record Paired(Node node, int partner, boolean hyperbolic) implements Generator {
        @Override
        public Node build(Transfer transfer, long exponent) {
            return power(transfer, node, new BigFraction(exponent));
        }
    }

    /** The positive root of the given degree of a radicand. */
    record Root(Node radicand, int degree) implements Generator {
        @Override
        public Node build(Transfer transfer, long exponent) {
            return power(transfer, radicand, new BigFraction(exponent, degree));
        }
    }

    /** |argument|, whose square is the argument's. */
    record Absolute(Node node, Node argument) implements Generator {
        @Override
        public Node build(Transfer transfer, long exponent) {
            return power(transfer, node, new BigFraction(exponent));
        }
    }

    private static Node power(Transfer transfer, Node node, BigFraction exponent) {
        ExpressionGraph graph = transfer.target();
        return graph.power(transfer.copy(node), exponent);
    }
}
