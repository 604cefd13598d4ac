package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.generation.BuildSettings.Precedence;
import io.github.gammawright.generation.GenerationOptions.Effort;
import io.github.gammawright.generation.GenerationOptions.Preference;
import io.github.gammawright.generation.GenerationOptions.Trigonometry;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.CheckSettings;
import io.github.gammawright.verification.KernelCheck;
import io.github.gammawright.verification.KernelReport;
import io.github.gammawright.verification.KernelUnderTest;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class GenerationOptionsTest {

    private static GeneratedClass generate(
            MetricDefinition definition, Trigonometry trigonometry, boolean fma, Quantity... quantities) {
        return new KernelGenerator()
                .generate(
                        definition,
                        new KernelSpecification(
                                "kernels",
                                "Ember",
                                List.of(quantities),
                                Layout.FULL,
                                new GenerationOptions(Effort.QUICK, trigonometry, fma, Preference.SPEED)));
    }

    private static MetricDefinition builtIn(String name) {
        return DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
    }

    @ParameterizedTest
    @CsvSource({"MATH, false", "MATH, true", "SHARED, false", "SHARED, true"})
    void kernelsAreRightWithEveryOption(Trigonometry trigonometry, boolean fma) {
        MetricDefinition definition = builtIn("schwarzschild");
        GeneratedClass generated =
                generate(definition, trigonometry, fma, Quantity.CHRISTOFFEL, Quantity.GEODESIC_ACCELERATION);
        boolean shared = trigonometry == Trigonometry.SHARED;
        assertThat(generated.source().contains("Math.fma(")).isEqualTo(fma);
        assertThat(generated.source().contains(" Math.sin(")).isEqualTo(!shared);
        assertThat(generated.source().contains("sin(theta)")).isTrue();
        assertThat(generated.source().contains("sincos 1")).isEqualTo(shared);
        assertThat(generated.cost().emitted().functions().keySet())
                .isEqualTo(shared ? java.util.Set.of("sincos") : java.util.Set.of("sin", "cos"));
        KernelReport report = new KernelCheck(definition, CheckSettings.DEFAULT.withPoints(50))
                .check(new KernelUnderTest(
                        generated.specification().qualifiedName(),
                        generated.source(),
                        generated.specification().quantities(),
                        Layout.FULL));
        assertThat(report.verdict()).isEqualTo(KernelReport.Verdict.PASSED);
    }

    @Test
    void tablesOfADefinitionMayAskForThem() {
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
        GenerationOptions options = BuildPlan.of(List.of(definition), settings)
                .parts()
                .get(0)
                .kernels()
                .get(0)
                .options();
        assertThat(options.trigonometry()).isEqualTo(Trigonometry.SHARED);
        assertThat(options.fma()).isTrue();
        assertThat(GenerationOptions.DEFAULT.fma()).isFalse();
        assertThat(GenerationOptions.DEFAULT.trigonometry()).isEqualTo(Trigonometry.MATH);
    }

    @Test
    void integerPowersAreProducts() {
        MetricDefinition definition = DefinitionReader.read(new SourceText("powers.metric.toml", """
                name = "powers"
                coordinates = ["x", "y", "z"]
                line-element = "x^2*dx^2 + (x^17 + y^-3 + (x + y)^12)*dy^2 + (x^(5/2) + (x*y)^(2/7) + y^n)*dz^2"
                [parameters]
                n = 3
                [domain]
                conditions = ["x > 0", "y > 0"]
                [domain.sample]
                x = [1, 2]
                y = [1, 2]
                """));
        GeneratedClass generated =
                generate(definition, Trigonometry.MATH, false, Quantity.METRIC, Quantity.CHRISTOFFEL);
        Matcher call = Pattern.compile("Math\\.pow\\([^,;]*, ([^)]*)\\)").matcher(generated.source());
        int calls = 0;
        while (call.find()) {
            String exponent = call.group(1);
            assertThat(exponent).doesNotMatch("-?[0-9]+(\\.0)?").matches(".*[.n].*|t[0-9]+");
            calls++;
        }
        assertThat(calls).isPositive();
        assertThat(generated.source()).contains("Math.sqrt(");
    }

    /** Σ sin θ; Boyer &amp; Lindquist (1967), as every textbook gives it. */
    @Test
    void volumeElementOfKerrHasNoRoot() {
        MetricDefinition definition = builtIn("kerr");
        GeneratedClass generated = generate(definition, Trigonometry.MATH, false, Quantity.VOLUME_ELEMENT);
        assertThat(generated.cost().emitted().functions().keySet()).containsExactly("cos", "sin");
        assertThat(generated.cost().emitted().operations()).isLessThanOrEqualTo(5);
        assertThat(FormulaView.lines(definition, Quantity.VOLUME_ELEMENT, FormulaPrinter.Form.TEXT))
                .anyMatch(line -> line.contains("sin(theta)"))
                .noneMatch(line -> line.contains("abs(") || line.contains("sqrt("));
    }

    @Test
    void theCommandThatMakesAClassAgainNamesTheUsersFile() {
        String text = """
                name = "ember"
                coordinates = ["x", "y"]
                line-element = "dx^2 + x^2*dy^2"
                """;
        assertThat(source(new SourceText("/home/ada/metrics/embers.metric.toml", text)))
                .contains("gammawright generate embers.metric.toml --out DIR");
        assertThat(source(new SourceText("my embers.metric.toml", text)))
                .contains("gammawright generate 'my embers.metric.toml' --out DIR");
        assertThat(generate(builtIn("schwarzschild"), Trigonometry.SHARED, true, Quantity.METRIC)
                        .source())
                .contains("gammawright generate schwarzschild --out DIR")
                .contains("--trigonometry shared --fma");
    }

    private static String source(SourceText text) {
        return generate(DefinitionReader.read(text), Trigonometry.MATH, false, Quantity.METRIC)
                .source()
                .replace("\n * ", " ");
    }
}
