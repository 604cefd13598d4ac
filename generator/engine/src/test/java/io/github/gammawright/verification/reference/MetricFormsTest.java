package io.github.gammawright.verification.reference;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.TestDefinition;
import io.github.gammawright.verification.TestMetrics;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The forms in which a definition may give its metric, and what its expressions may hold. */
class MetricFormsTest {

    private static final double[] POINT = {0.5, 6.25, 1.25, -2};

    private static List<Real> christoffel(MetricDefinition definition) {
        return new ReferenceEvaluator(definition)
                .at(new double[] {1.125}, POINT)
                .values(ReferenceQuantity.CHRISTOFFEL);
    }

    private static TestDefinition schwarzschild() {
        return TestDefinition.of("schwarzschild", "t", "r", "theta", "phi")
                .parameter("M", "1")
                .abbreviation("f", "1 - 2*M/r");
    }

    @Test
    void allFormsOfOneMetricAgree() {
        List<Real> expected = christoffel(TestMetrics.schwarzschild());
        List<MetricDefinition> forms = List.of(
                schwarzschild().matrix("-f", "0; 1/f", "0; 0; r^2", "0; 0; 0; r^2*sin(theta)^2"),
                schwarzschild()
                        .threePlusOne(
                                "sqrt(f)", List.of("0", "0", "0"), "dr^2/f + r^2*(dtheta^2 + sin(theta)^2*dphi^2)"),
                schwarzschild()
                        .coframe(List.of(-1, 1, 1, 1), "sqrt(f)*dt", "dr/sqrt(f)", "r*dtheta", "r*sin(theta)*dphi"));
        for (MetricDefinition form : forms) {
            List<Real> actual = christoffel(form);
            assertThat(actual).hasSize(64);
            for (int i = 0; i < 64; i++) {
                Reals.assertClose(actual.get(i), expected.get(i), 50, 1, "component " + i);
            }
        }
    }

    @Test
    void crossTermsAreHalved() {
        MetricDefinition definition = TestDefinition.of("plane", "x", "y").lineElement("dx^2 + 3*dx*dy + 4*dy*dy");
        List<Real> metric = new ReferenceEvaluator(definition)
                .at(new double[0], new double[2])
                .values(ReferenceQuantity.METRIC);
        assertThat(metric.stream().map(Real::toDouble)).containsExactly(1.0, 1.5, 1.5, 4.0);
    }

    @Test
    void productsOfOneFormsAndDifferentialsInAbbreviations() {
        MetricDefinition definition = TestDefinition.of("plane", "x", "y")
                .abbreviation("w", "dx + x*dy")
                .lineElement("w^2 + (dx - dy)*(dx + dy) - -dy^2/2");
        List<Real> metric = new ReferenceEvaluator(definition)
                .at(new double[0], new double[] {3, 0})
                .values(ReferenceQuantity.METRIC);
        // (dx + 3 dy)² + dx² − dy² + dy²/2
        assertThat(metric.stream().map(Real::toDouble)).containsExactly(2.0, 3.0, 3.0, 8.5);
    }

    @Test
    void shiftBendsTheTimeComponents() {
        MetricDefinition definition = TestDefinition.of("moving", "t", "x").threePlusOne("2", List.of("x"), "9*dx^2");
        List<Real> metric = new ReferenceEvaluator(definition)
                .at(new double[0], new double[] {0, 0.5})
                .values(ReferenceQuantity.METRIC);
        // −4 dt² + 9 (dx + x dt)² at x = 1/2
        assertThat(metric.stream().map(Real::toDouble)).containsExactly(-1.75, 4.5, 4.5, 9.0);
    }

    @Test
    void exponentsOfEveryKind() {
        MetricDefinition definition = TestDefinition.of("powers", "x", "y")
                .parameter("n", "3")
                .matrix("x^n + 1/x^(2*1/1)", "0; 2^y + (x^2)^(3/2) + x^-2^1");
        List<Real> metric = new ReferenceEvaluator(definition)
                .at(new double[] {3}, new double[] {-2, 4})
                .values(ReferenceQuantity.METRIC);
        assertThat(metric.get(0).toDouble()).isEqualTo(-8 + 0.25);
        assertThat(metric.get(3).toDouble()).isEqualTo(16 + 8 + 0.25);
    }

    @Test
    void longSumsDoNotOverflowTheStack() {
        String sum = "dx^2" + " + dx^2 - dx^2".repeat(20_000);
        MetricDefinition definition = TestDefinition.of("long", "x").lineElement(sum);
        List<Real> metric = new ReferenceEvaluator(definition)
                .at(new double[0], new double[1])
                .values(ReferenceQuantity.METRIC);
        assertThat(metric.get(0).toDouble()).isEqualTo(1);
    }

    @Test
    void defaultsAreRoundedOnce() {
        MetricDefinition definition = TestDefinition.of("defaults", "x")
                .parameter("a", "1/10 + 2/10")
                .parameterWithoutDefault("b")
                .parameter("c", "-sqrt(2)*pi")
                .lineElement("a*dx^2");
        var defaults = new ReferenceEvaluator(definition).defaultParameters();
        assertThat(defaults.get(0)).hasValue(0.3);
        assertThat(defaults.get(1)).isEmpty();
        assertThat(defaults.get(2)).hasValue(-4.442882938158366);
    }

    @Test
    void conditionsAreComparedExactly() {
        ReferenceEvaluator kerr = new ReferenceEvaluator(TestMetrics.kerr());
        double[] parameters = {1, 0.6};
        // The horizon is at exactly 1.8 in decimals; 0.6 as a double is a little less, so it is a little farther out.
        assertThat(kerr.inDomain(parameters, new double[] {0, Math.nextUp(1.8), 1, 0}))
                .isTrue();
        assertThat(kerr.inDomain(parameters, new double[] {0, Math.nextDown(1.8), 1, 0}))
                .isFalse();
        assertThat(kerr.inDomain(parameters, new double[] {0, 3, 0, 0})).isFalse();
        assertThat(kerr.inDomain(parameters, new double[] {0, 3, Math.PI, 0})).isTrue();
        assertThat(kerr.inDomain(parameters, new double[] {0, 3, Math.nextUp(Math.PI), 0}))
                .isFalse();
        assertThat(kerr.inDomain(new double[] {1, 1.5}, new double[] {0, 3, 1, 0}))
                .isFalse();
    }
}
