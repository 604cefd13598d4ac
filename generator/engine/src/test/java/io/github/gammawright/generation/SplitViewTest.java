package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The 3+1 split as textbooks print it: Martel &amp; Poisson (2001), Cook (2000), Alcubierre (2008), all from memory. */
class SplitViewTest {

    private static final FormulaPrinter.Form TEXT = FormulaPrinter.Form.TEXT;

    private static List<String> show(String name, Quantity quantity, FormulaPrinter.Form form) {
        return FormulaView.lines(builtIn(name), quantity, form);
    }

    private static MetricDefinition builtIn(String name) {
        return DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
    }

    @Test
    void rainCoordinatesHaveFlatSlicesAndAnInflowOfSpace() {
        assertThat(show("painleve-gullstrand", Quantity.LAPSE, TEXT)).containsExactly("α = 1");
        assertThat(show("painleve-gullstrand", Quantity.SHIFT, TEXT)).containsExactly("β^r = sqrt(2)*sqrt(M/r)");
        assertThat(show("painleve-gullstrand", Quantity.EXTRINSIC_CURVATURE, TEXT))
                .containsExactly(
                        "K_rr = -sqrt(2)*sqrt(M/r)/(2*r)",
                        "K_{theta theta} = sqrt(2)*r*sqrt(M/r)",
                        "K_{phi phi} = sqrt(2)*r*sqrt(M/r)*sin(theta)^2");
        assertThat(show("painleve-gullstrand", Quantity.MEAN_CURVATURE, FormulaPrinter.Form.LATEX))
                .containsExactly("K = \\frac{3 \\sqrt{2} \\sqrt{\\frac{M}{r}}}{2 r}");
    }

    @Test
    void kerrKeepsItsAbbreviations() {
        assertThat(show("kerr", Quantity.SHIFT_DERIVATIVE, TEXT))
                .hasSize(4)
                .contains("∂_theta β^phi = -4*M*a^3*r*Delta*sin(theta)*cos(theta)"
                        + "/(Sigma*Delta + 2*M*r*(Delta + 2*M*r))^2");
        assertThat(show("kerr", Quantity.INVERSE_SPATIAL_METRIC, TEXT)).contains("γ^rr = Delta/Sigma");
    }

    @Test
    void rootsHoldClosedForms() {
        assertThat(show("kerr", Quantity.LAPSE, TEXT))
                .last()
                .isEqualTo("α = sqrt(Sigma*Delta/(Sigma*Delta + 2*M*r*(Delta + 2*M*r)))");
        assertThat(show("kerr", Quantity.STRESS_SOURCE, TEXT))
                .hasSize(12)
                .contains("½ √|g| ∂_r g_{theta theta} = r*Sigma*sin(theta)");
        assertThat(show("kerr-schild", Quantity.LAPSE, TEXT)).last().isEqualTo("α = sqrt(1/(1 + 2*H))");
        assertThat(show("kerr-schild", Quantity.SHIFT, TEXT)).last().isEqualTo("β^z = 2*H*lz/(1 + 2*H)");
    }

    /** The static frame and its connection: Misner, Thorne &amp; Wheeler (1973), from memory. */
    @Test
    void framesAreNumberedAndAntisymmetricCoefficientsPrintedOnce() {
        assertThat(show("schwarzschild", Quantity.ROTATION_COEFFICIENTS, TEXT))
                .hasSize(4)
                .contains("γ_(3)(2)(3) = cos(theta)/(r*sin(theta))");
        assertThat(show("sphere", Quantity.ORTHONORMAL_FRAME, FormulaPrinter.Form.LATEX))
                .contains("e_{(0)}^{\\theta} = \\frac{1}{R}");
    }

    @Test
    void theCallersFunctionsStay() {
        assertThat(show("static-star", Quantity.LAPSE_DERIVATIVE, FormulaPrinter.Form.LATEX))
                .containsExactly("\\partial_{r} \\alpha = \\nu^{(1)} \\mathrm{e}^{\\nu}");
    }

    @Test
    void aReversedSignatureIsRefusedWithTheRemedy() {
        MetricDefinition reversed = DefinitionReader.read(new SourceText("light-box.metric.toml", """
                name = "light-box"
                coordinates = ["t", "x"]
                line-element = "(1 + x^2)*dt^2 - dx^2"
                """));
        KernelSpecification lapse = new KernelSpecification(
                "kernels", "LightBoxLapse", List.of(Quantity.LAPSE), Layout.FULL, GenerationOptions.DEFAULT);
        DefinitionException refusal =
                catchThrowableOfType(DefinitionException.class, () -> new KernelGenerator().generate(reversed, lapse));
        assertThat(refusal.diagnostics()).singleElement().matches(d -> d.code() == DiagnosticCode.METRIC_NOT_SPLIT);
        assertThat(refusal)
                .hasMessageContaining("light-box.metric.toml:3:")
                .hasMessageContaining("Change the sign of the whole metric");
    }
}
