package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.generation.BuildSettings.Precedence;
import io.github.gammawright.geometry.Quantity;
import java.util.List;
import org.junit.jupiter.api.Test;

class UnsupportedOptionsTest {

    @Test
    void whatEmissionCannotDoIsRefusedAndNotIgnored() {
        MetricDefinition definition = DefinitionReader.read(new SourceText("ember.metric.toml", """
                name = "ember"
                coordinates = ["x", "y"]
                line-element = "dx^2 + sin(x)^2*dy^2"
                [[kernel]]
                quantities = ["metric"]
                trigonometry = "shared"
                fma = true
                """));
        BuildSettings settings = BuildSettings.of(Precedence.SETTINGS, List.of(Quantity.CHRISTOFFEL));
        DefinitionException refusal =
                catchThrowableOfType(DefinitionException.class, () -> BuildPlan.of(List.of(definition), settings));
        assertThat(refusal.diagnostics())
                .extracting(Diagnostic::code)
                .containsExactly(DiagnosticCode.OPTION_UNSUPPORTED, DiagnosticCode.OPTION_UNSUPPORTED);
        assertThat(refusal.diagnostics())
                .extracting(Diagnostic::render)
                .allMatch(message -> message.contains("Leave the option out."))
                .anyMatch(message -> message.contains("trigonometry 'shared'"))
                .anyMatch(message -> message.contains("fma"));
    }
}
