package io.github.gammawright.verification;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;

class DomainSamplerTest {

    private static DomainSample draw(MetricDefinition definition, int points, int edgePoints) {
        return new DomainSampler(new ReferenceEvaluator(definition), 7).draw(points, edgePoints);
    }

    private static MetricDefinition kerrWithVaryingSpin() {
        return TestDefinition.of("kerr", "t", "r", "theta", "phi")
                .parameter("M", "1")
                .parameter("a", "1/2")
                .condition("abs(a) < M")
                .condition("r > M + sqrt(M^2 - a^2)")
                .condition("0 < theta < pi")
                .range("a", -2, 2)
                .range("r", 0, 10)
                .range("theta", 0.5, 2.5)
                .lineElement("dt^2");
    }

    @Test
    void pointsMeetConditionsAndFillTheBox() {
        MetricDefinition definition = kerrWithVaryingSpin();
        DomainSample sample = draw(definition, 500, 0);
        assertThat(sample.shortage()).isEmpty();
        assertThat(sample.points()).hasSize(500);
        assertThat(sample.draws()).isGreaterThan(500);
        ReferenceEvaluator evaluator = new ReferenceEvaluator(definition);
        for (SamplePoint point : sample.points()) {
            assertThat(evaluator.inDomain(point.parameters(), point.coordinates()))
                    .isTrue();
            assertThat(point.parameters()[0]).isEqualTo(1);
            assertThat(point.parameters()[1]).isBetween(-1.0, 1.0);
            assertThat(point.coordinates()[0]).isBetween(-1.0, 1.0);
            assertThat(point.coordinates()[2]).isBetween(0.5, 2.5);
            assertThat(point.isAtEdge()).isFalse();
        }
        // A low-discrepancy sequence: each quarter of a range that no condition cuts holds about a quarter.
        for (int quarter = 0; quarter < 4; quarter++) {
            double from = 0.5 + 0.5 * quarter;
            long inside = sample.points().stream()
                    .filter(p -> p.coordinates()[2] >= from && p.coordinates()[2] < from + 0.5)
                    .count();
            assertThat(inside).isBetween(110L, 140L);
        }
    }

    @Test
    void seedDecidesThePoints() {
        ReferenceEvaluator evaluator = new ReferenceEvaluator(kerrWithVaryingSpin());
        List<List<Double>> first = coordinates(new DomainSampler(evaluator, 1).draw(20, 5));
        assertThat(coordinates(new DomainSampler(evaluator, 1).draw(20, 5))).isEqualTo(first);
        assertThat(coordinates(new DomainSampler(evaluator, 2).draw(20, 5))).isNotEqualTo(first);
    }

    private static List<List<Double>> coordinates(DomainSample sample) {
        return sample.points().stream().map(SamplePoint::coordinateList).toList();
    }

    @Test
    void edgesAreApproachedFromInside() {
        MetricDefinition kerr = TestMetrics.kerr();
        DomainSample sample = draw(kerr, 10, 200);
        ReferenceEvaluator evaluator = new ReferenceEvaluator(kerr);
        double horizon = 1 + Math.sqrt(0.75);
        double closestRadius = Double.POSITIVE_INFINITY;
        double closestAxis = Double.POSITIVE_INFINITY;
        double closestSouth = Double.POSITIVE_INFINITY;
        List<SamplePoint> edges =
                sample.points().stream().filter(SamplePoint::isAtEdge).toList();
        assertThat(edges).hasSizeGreaterThanOrEqualTo(100);
        for (SamplePoint point : edges) {
            assertThat(evaluator.inDomain(point.parameters(), point.coordinates()))
                    .isTrue();
            closestRadius = Math.min(closestRadius, point.coordinates()[1] - horizon);
            closestAxis = Math.min(closestAxis, point.coordinates()[2]);
            closestSouth = Math.min(closestSouth, Math.PI - point.coordinates()[2]);
        }
        assertThat(closestRadius).isBetween(0.0, 1e-6);
        assertThat(closestAxis).isBetween(1e-300, 1e-7);
        assertThat(closestSouth).isBetween(0.0, 1e-7);
    }

    @Test
    void withoutConditionsThereAreNoEdges() {
        DomainSample sample = draw(TestDefinition.of("plane", "x", "y").lineElement("dx^2 + dy^2"), 5, 50);
        assertThat(sample.points()).hasSize(5).noneMatch(SamplePoint::isAtEdge);
    }

    @Test
    void emptyDomainIsSaidSo() {
        MetricDefinition empty = TestDefinition.of("empty", "x", "y")
                .condition("x < 5")
                .condition("y > 2")
                .lineElement("dx^2 + dy^2");
        DomainSample sample = draw(empty, 10, 10);
        assertThat(sample.points()).isEmpty();
        assertThat(sample.draws()).isEqualTo(20_500);
        assertThat(sample.shortage().orElseThrow())
                .isEqualTo("none of 20500 points of the sample box meets the conditions; the one that fails first most"
                        + " often is \"y > 2\" (20500 times): narrow the ranges in [domain.sample]");
    }

    @Test
    void parameterWithoutDefaultAndRangeIsSaidSo() {
        MetricDefinition open =
                TestDefinition.of("open", "x").parameterWithoutDefault("b").lineElement("b*dx^2");
        assertThat(draw(open, 10, 0).shortage().orElseThrow()).startsWith("give b a default, or a range");
    }

    /** Sobol's points, shifted or not, fall once into each of 2^m equal parts of every axis. */
    @Property
    void sequenceIsEquidistributed(@ForAll long seed, @ForAll @IntRange(min = 1, max = 20) int dimension) {
        PointSequence sequence = new PointSequence(dimension, seed);
        double[][] points =
                IntStream.range(0, 16).mapToObj(i -> sequence.next()).toArray(double[][]::new);
        for (int axis = 0; axis < dimension; axis++) {
            int where = axis;
            assertThat(Arrays.stream(points).map(p -> (int) (16 * p[where])).sorted())
                    .containsExactlyElementsOf(IntStream.range(0, 16).boxed().toList());
        }
    }
}
