package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.geometry.Quantity;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.scilab.forge.jlatexmath.ParseException;
import org.scilab.forge.jlatexmath.TeXConstants;
import org.scilab.forge.jlatexmath.TeXFormula;

/** Every line of LaTeX is typeset by JLaTeXMath. */
class LatexValidityTest {

    private static final Path DEFINITIONS = Path.of("src/test/resources/definitions/held-out-style");

    private static final List<String> BUILT_IN = List.of(
            "kerr",
            "kerr-schild",
            "kerr-carter-frame",
            "painleve-gullstrand",
            "static-star",
            "flrw-closed",
            "eddington-finkelstein",
            "plane-wave",
            "ellipsoid-three-axis",
            "kasner");

    /** Names in many alphabets, words of Java and of LaTeX, functions of every kind. */
    private static final List<String> STRANGE = List.of(
            "greek-letters",
            "other-alphabets",
            "letters-of-algebra",
            "names-of-java",
            "every-function",
            "functions-everywhere",
            "fractional-powers",
            "one-dimension",
            "three-plus-one-dense");

    static Stream<MetricDefinition> definitions() throws IOException {
        List<SourceText> texts = new ArrayList<>();
        for (String name : BUILT_IN) {
            texts.add(Catalogue.standard().find(name).orElseThrow());
        }
        for (String name : STRANGE) {
            String file = name + ".metric.toml";
            texts.add(new SourceText(file, Files.readString(DEFINITIONS.resolve(file), StandardCharsets.UTF_8)));
        }
        return texts.stream().map(DefinitionReader::read);
    }

    @ParameterizedTest
    @MethodSource("definitions")
    void everyLineIsTypeset(MetricDefinition definition) {
        int lines = 0;
        List<Quantity> has = Applicability.quantities(definition);
        for (Quantity quantity : List.of(
                Quantity.METRIC,
                Quantity.CHRISTOFFEL,
                Quantity.GEODESIC_ACCELERATION,
                Quantity.HAMILTONIAN_FLOW,
                Quantity.STRESS_SOURCE,
                Quantity.ORTHONORMAL_FRAME,
                Quantity.LAPSE_DERIVATIVE,
                Quantity.EXTRINSIC_CURVATURE,
                Quantity.SPATIAL_VOLUME_ELEMENT)) {
            if (has.contains(quantity)) {
                for (String line : FormulaView.lines(definition, quantity, FormulaPrinter.Form.LATEX)) {
                    assertThat(width(line)).as(line).isPositive();
                    // the library closes braces that are left open
                    assertThat(line.chars().filter(c -> c == '{').count())
                            .as(line)
                            .isEqualTo(line.chars().filter(c -> c == '}').count());
                    lines++;
                }
            }
        }
        assertThat(lines).isGreaterThan(has.contains(Quantity.LAPSE) ? 8 : 5);
    }

    /** The library is a judge: it refuses what LaTeX refuses. */
    @ParameterizedTest
    @ValueSource(strings = {"\\nosuchcommand", "a_{b}_{c}}", "\\left(a", "\\right)"})
    void otherTextIsRefused(String wrong) {
        assertThatThrownBy(() -> width(wrong)).isInstanceOf(ParseException.class);
    }

    @Test
    void symmetricComponentsArePrintedOnce() {
        List<String> lines = FormulaView.lines(
                DefinitionReader.read(Catalogue.standard().find("kerr").orElseThrow()),
                Quantity.EXTRINSIC_CURVATURE,
                FormulaPrinter.Form.LATEX);
        assertThat(lines.stream().filter(line -> line.startsWith("K_{"))).hasSize(2);
        assertThat(lines).anyMatch(line -> line.startsWith("\\Sigma = "));
    }

    private static int width(String line) {
        return new TeXFormula(line)
                .createTeXIcon(TeXConstants.STYLE_DISPLAY, 12)
                .getIconWidth();
    }
}
