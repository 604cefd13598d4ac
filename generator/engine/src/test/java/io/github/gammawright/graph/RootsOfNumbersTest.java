package io.github.gammawright.graph;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.time.Duration;
import java.util.stream.LongStream;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;

/** Roots of numbers, whether or not they are squares in the prime field. */
class RootsOfNumbersTest {

    private final ExpressionGraph graph = new ExpressionGraph();
    private final Node a = graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, "a", 0));

    private static long noSquare() {
        return LongStream.iterate(2, n -> n + 1)
                .filter(n -> !PrimeField.VALUES.isSquare(n))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void rootsOfSmallPrimesSatisfyTheirRelations() {
        Node root = graph.sqrt(graph.constant(2));
        // (√2 a)² + (1 − 2a²) is 1 although the first square is kept whole
        Node product = graph.multiply(root, a);
        graph.keep(product);
        Node rest = graph.subtract(graph.one(), graph.multiple(BigFraction.TWO, graph.power(a, 2)));
        assertThat(graph.add(graph.power(product, 2), rest)).isSameAs(graph.one());
        Node six = graph.sqrt(graph.constant(6));
        assertThat(graph.multiply(root, graph.sqrt(graph.constant(3)))).isSameAs(six);
    }

    @Test
    void rootsOfNumbersThatAreNoSquaresAreBuiltAtOnce() {
        long[] before = graph.fingerprint(a);
        Node number = graph.constant(noSquare());
        Node root = graph.sqrt(number);
        assertThat(graph.power(root, 2)).isSameAs(number);
        // the points were not drawn anew
        assertThat(graph.fingerprint(a)).isEqualTo(before);
    }

    @Test
    void powersOfNumbersByParametersEnd() {
        Node number = graph.constant(noSquare());
        Node power = assertTimeoutPreemptively(Duration.ofSeconds(20), () -> graph.power(number, a));
        assertThat(graph.divide(power, power)).isSameAs(graph.one());
        assertThat(graph.power(number, graph.add(a, graph.one()))).isSameAs(graph.multiply(number, power));
    }
}
