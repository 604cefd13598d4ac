package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.geometry.Quantity;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Closed forms as textbooks have them: Misner, Thorne &amp; Wheeler (1973), chapters 31 and 33 (from memory). */
class FormulaViewTest {

    private static List<String> show(String name, Quantity quantity, FormulaPrinter.Form form) {
        MetricDefinition definition =
                DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
        return FormulaView.lines(definition, quantity, form);
    }

    @Test
    void allOfSchwarzschild() {
        assertThat(show("schwarzschild", Quantity.CHRISTOFFEL, FormulaPrinter.Form.TEXT))
                .containsExactly(
                        "Γ^t_tr = M/(r*(r - 2*M))",
                        "Γ^r_tt = M*(r - 2*M)/r^3",
                        "Γ^r_rr = -M/(r*(r - 2*M))",
                        "Γ^r_{theta theta} = -r + 2*M",
                        "Γ^r_{phi phi} = -(r - 2*M)*sin(theta)^2",
                        "Γ^theta_{r theta} = 1/r",
                        "Γ^theta_{phi phi} = -sin(theta)*cos(theta)",
                        "Γ^phi_{r phi} = 1/r",
                        "Γ^phi_{theta phi} = cos(theta)/sin(theta)");
    }

    @Test
    void kerrKeepsItsAbbreviations() {
        assertThat(show("kerr", Quantity.CHRISTOFFEL, FormulaPrinter.Form.TEXT))
                .hasSize(22)
                .startsWith("Sigma = r^2 + a^2*cos(theta)^2", "Delta = r^2 - 2*M*r + a^2")
                .contains("Γ^t_tr = M*(r^2 + a^2)*(r^2 - a^2*cos(theta)^2)/(Sigma^2*Delta)");
        assertThat(show("kerr", Quantity.VOLUME_ELEMENT, FormulaPrinter.Form.TEXT))
                .last()
                .isEqualTo("√|g| = Sigma*sin(theta)");
    }

    @Test
    void latexUsesItsCommands() {
        assertThat(show("sphere", Quantity.CHRISTOFFEL, FormulaPrinter.Form.LATEX))
                .containsExactly(
                        "\\Gamma^{\\theta}_{\\phi \\phi} = -\\sin \\theta \\cos \\theta",
                        "\\Gamma^{\\phi}_{\\theta \\phi} = \\frac{\\cos \\theta}{\\sin \\theta}");
    }

    @Test
    void flatSpaceSaysThatNothingIsLeft() {
        assertThat(show("minkowski", Quantity.CHRISTOFFEL, FormulaPrinter.Form.TEXT))
                .containsExactly("every component is zero");
    }

    @Test
    void aDegenerateMetricIsTheDefinitionsMistake() {
        MetricDefinition fold = DefinitionReader.read(new SourceText(
                "fold.metric.toml",
                "name = \"fold\"\ncoordinates = [\"x\", \"y\"]\nline-element = \"(dx + x*dy)^2\"\n"));
        DefinitionException mistake = catchThrowableOfType(
                DefinitionException.class,
                () -> FormulaView.lines(fold, Quantity.CHRISTOFFEL, FormulaPrinter.Form.TEXT));
        assertThat(mistake.diagnostics()).hasSize(1);
        assertThat(mistake.diagnostics().get(0).code()).isEqualTo(DiagnosticCode.METRIC_DEGENERATE);
        assertThat(mistake.diagnostics().get(0).position().line()).isEqualTo(3);
        assertThat(mistake.diagnostics().get(0).position().column()).isEqualTo(18);
    }
}
