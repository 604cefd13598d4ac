package io.github.gammawright.graph;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.time.Duration;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;

/** 2 is no square in the prime field, and no other point of it helps. */
class RootsOfNumbersTest {

    private final ExpressionGraph graph = new ExpressionGraph();
    private final Node a = graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, "a", 0));

    @Test
    void rootsOfNumbersThatAreNoSquaresAreBuiltAtOnce() {
        long[] before = graph.fingerprint(a);
        Node root = graph.sqrt(graph.constant(2));
        assertThat(graph.power(root, 2)).isSameAs(graph.constant(2));
        // the points were not drawn anew
        assertThat(graph.fingerprint(a)).isEqualTo(before);
    }

    @Test
    void powersOfNumbersByParametersEnd() {
        Node power = assertTimeoutPreemptively(Duration.ofSeconds(20), () -> graph.power(graph.constant(2), a));
        assertThat(graph.divide(power, power)).isSameAs(graph.one());
        assertThat(graph.power(graph.constant(2), graph.add(a, graph.one())))
                .isSameAs(graph.multiple(BigFraction.TWO, power));
    }
}
