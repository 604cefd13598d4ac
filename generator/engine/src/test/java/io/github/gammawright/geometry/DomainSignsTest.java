package io.github.gammawright.geometry;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.SamplePoints;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class DomainSignsTest {

    private static final String CONDITIONS =
            "conditions = [\"a >= 1\", \"r > 3/2\", \"0 < theta < pi\", \"-pi/2 < psi < pi/2\", \"z < -1\"]";

    private static boolean isNotNegative(String abbreviation) {
        MetricDefinition definition =
                DefinitionReader.read(new SourceText("signs.metric.toml", """
                name = "signs"
                coordinates = ["r", "theta", "psi", "z"]
                line-element = "W^2*dr^2 + dtheta^2 + dpsi^2 + dz^2"
                [parameters]
                a = 2
                b = 1
                [abbreviations]
                W = "%s"
                [domain]
                %s
                """.formatted(abbreviation, CONDITIONS)));
        Node value = new DefinitionScope(definition, SamplePoints.arbitrary(3))
                .graph()
                .names()
                .keySet()
                .iterator()
                .next();
        return new DomainSigns(definition).isNotNegative(value);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "r^2 + b^2*cos(theta)^2",
                "sin(theta)*r",
                "cos(psi)",
                "r - 1",
                "a*r - 1",
                "-z",
                "z*(1 - r)",
                "exp(b) + b^2",
                "cosh(z) - 1/2",
                "r^(1/3)*a^-3",
                "sqrt(a + b)",
                "abs(b)*a"
            })
    void certainSigns(String value) {
        assertThat(isNotNegative(value)).isTrue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "r - 2",
                "b*r",
                "cos(theta)",
                "sin(psi)",
                "sin(2*theta)",
                "z*a",
                "r^2 - 2*a*r + b^2",
                "log(r)*b",
                "z^3",
                "1 - cosh(b)",
                "a - r"
            })
    void whatMayBeNegativeHasNone(String value) {
        assertThat(isNotNegative(value)).isFalse();
    }
}
