package io.github.gammawright.verification;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferencePoint.Conditioned;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/** What is but rounding in one precision is told from a small value, however small the rounding happens to be. */
class ReferenceTrioTest {

    private static final double[] NO_PARAMETERS = {};

    /** Two products of rounding errors, one of which is exactly 0 here by chance: the sum is 1e-160. */
    @Test
    void aZeroWithHardlyAnyRoundingIsZero() {
        MetricDefinition definition = DefinitionReader.read(
                Path.of("src/test/resources/definitions/held-out-style/boosted-coframe.metric.toml"));
        Conditioned values = conditioned(
                definition, -0.022618597792241513, -0.3829633670824397, 0.30605470949608593, 0.524809109353864);

        assertThat(values.values().get((4 + 0) * 4 + 1).isZero()).isTrue();
        assertThat(values.values().get((4 + 1) * 4 + 2).isZero()).isFalse();
    }

    /** g_yy is as small as that in truth: Γ^x_xx = 1e-60/(1 + 1e-60 x)/2. */
    @Test
    void aSmallValueIsKept() {
        Conditioned values = conditioned(DefinitionReader.read(new SourceText("small.metric.toml", """
                        name = "small"
                        coordinates = ["x", "y"]
                        line-element = "(1 + 1e-60*x)*dx^2 + dy^2"
                        """)), 0.5, 0.25);

        assertThat(values.values().get(0).toDouble()).isEqualTo(5e-61);
    }

    /** All digits of the first precision cancel: (1 + 1e-75 x) − 1, differentiated. */
    @Test
    void aValueThatOnlyTheFinestPrecisionSeesIsKept() {
        Conditioned values = conditioned(DefinitionReader.read(new SourceText("hidden.metric.toml", """
                        name = "hidden"
                        coordinates = ["x", "y"]
                        line-element = "(2 + (exp(x) + 1e-75*x - exp(x)))*dx^2 + dy^2"
                        """)), 0.5, 0.25);

        assertThat(values.values().get(0).toDouble()).isBetween(2.4e-76, 2.6e-76);
    }

    private static Conditioned conditioned(MetricDefinition definition, double... point) {
        ReferenceTrio trio = new ReferenceTrio(new ReferenceEvaluator(definition));
        SamplePoint at = new SamplePoint(NO_PARAMETERS, point, false);
        trio.moveTo(at);
        return trio.conditioned(ReferenceQuantity.CHRISTOFFEL, at, new double[0][]);
    }
}
