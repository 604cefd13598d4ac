package io.github.gammawright.definition;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.MetricDefinition.Comparison;
import io.github.gammawright.definition.MetricDefinition.Range;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.SourceText;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class DefinitionReaderTest {

    private static final String WHOLE = """
            # A well in a rope bridge.
            name        = "rope-bridge"
            title       = "Rope bridge over a well"
            reference   = "own example"
            coordinates = ["t", "s", "Φ"]
            line-element = '''
              -exp(2*nu)*dt^2 + 2*w*dt*dΦ
              + ds^2/h + s^2*dΦ^2'''

            [parameters]
            Z = 1
            A = { default = "3/5", description = "depth", unit = "length" }
            "Ω" = 0.1
            free = { description = "no default" }
            B = -1.0E-20

            [abbreviations]
            h = "1 - m/s"
            w = "Ω*s^2"
            "m" = "2*Z*A"
            k = 2

            [functions]
            nu = { of = ["s", "t"], sample = "log(1 + Z/s)" }
            mu = { of = ["t"] }

            [domain]
            conditions = ["Z > 0", "0 < s <= 10*pi", "s >= m"]
            sample.s = [3, "4*pi"]
            sample.Z = [1.0, 1.0]

            [claims]
            vacuum = false
            signature = "-++"
            independent-of = ["Φ"]
            conformally-flat = true
            einstein-constant = "2*Z*m"
            killing = [[0, 0, 1], ["s", "t", 0]]

            [[kernel]]
            class = "RopeBridgeOrbit"
            quantities = ["metric", "christoffel"]
            layout = "packed"
            package = "com.example.rope"
            effort = "quick"
            trigonometry = "shared"
            fma = true
            prefer = "accuracy"

            [[kernel]]
            quantities = ["ricci"]
            """;

    private static MetricDefinition read(String text) {
        return DefinitionReader.read(new SourceText("rope.metric.toml", text));
    }

    private static String print(Expression expression) {
        return ExpressionPrinter.print(expression);
    }

    @Test
    void readsHeadAndForm() {
        MetricDefinition definition = read(WHOLE);
        assertThat(definition.name()).isEqualTo("rope-bridge");
        assertThat(definition.title()).isEqualTo("Rope bridge over a well");
        assertThat(definition.reference()).isEqualTo("own example");
        assertThat(definition.coordinates()).containsExactly("t", "s", "Φ");
        assertThat(definition.dimension()).isEqualTo(3);
        MetricForm.LineElement form = (MetricForm.LineElement) definition.form();
        assertThat(print(form.expression())).isEqualTo("-exp(2*nu)*dt^2 + 2*w*dt*dΦ + ds^2/h + s^2*dΦ^2");
        // The last sum's sign, on the second line of the literal string.
        assertThat(form.expression().position()).isEqualTo(new SourcePosition(8, 12, 1));
    }

    @Test
    void readsParametersInTheOrderOfTheFile() {
        MetricDefinition definition = read(WHOLE);
        assertThat(definition.parameters())
                .extracting(MetricDefinition.Parameter::name)
                .containsExactly("Z", "A", "Ω", "free", "B");
        MetricDefinition.Parameter depth = definition.parameters().get(1);
        assertThat(depth.description()).isEqualTo("depth");
        assertThat(depth.unit()).isEqualTo("length");
        assertThat(depth.position()).isEqualTo(new SourcePosition(12, 1, 1));
        assertThat(ParameterDefaults.of(definition))
                .containsExactly(
                        OptionalDouble.of(1),
                        OptionalDouble.of(0.6),
                        OptionalDouble.of(0.1),
                        OptionalDouble.empty(),
                        OptionalDouble.of(-1e-20));
    }

    @Test
    void decimalsOfTomlAreExact() {
        Expression tenth = read(WHOLE).parameters().get(2).defaultExpression().orElseThrow();
        assertThat(((Expression.Number) tenth).value()).isEqualTo(new BigFraction(1, 10));
        MetricDefinition bases = read("""
                name = "x"
                coordinates = ["x"]
                line-element = "dx^2"
                [parameters]
                a = 0xff
                b = 1_000.000_1
                c = +5e-1
                d = 0o17
                """);
        assertThat(bases.parameters())
                .extracting(p -> print(p.defaultExpression().orElseThrow()))
                .containsExactly("255", "1000.0001", "0.5", "15");
    }

    @Test
    void sortsAbbreviationsAsLittleAsNeeded() {
        assertThat(read(WHOLE).abbreviations())
                .extracting(MetricDefinition.Abbreviation::name)
                .containsExactly("m", "h", "w", "k");
    }

    @Test
    void readsFunctions() {
        List<MetricDefinition.CallerFunction> functions = read(WHOLE).functions();
        assertThat(functions).extracting(MetricDefinition.CallerFunction::name).containsExactly("nu", "mu");
        assertThat(functions.get(0).of()).containsExactly("s", "t");
        assertThat(print(functions.get(0).sample().orElseThrow())).isEqualTo("log(1 + Z/s)");
        assertThat(functions.get(1).sample()).isEmpty();
    }

    @Test
    void readsTheDomain() {
        MetricDefinition.Domain domain = read(WHOLE).domain();
        assertThat(domain.conditions())
                .extracting(MetricDefinition.Condition::text)
                .containsExactly("Z > 0", "0 < s <= 10*pi", "s >= m");
        assertThat(domain.conditions().get(1).comparisons()).containsExactly(Comparison.LESS, Comparison.LESS_OR_EQUAL);
        assertThat(domain.sample())
                .containsExactly(
                        java.util.Map.entry("s", new Range(3, 4 * Math.PI)), java.util.Map.entry("Z", new Range(1, 1)));
    }

    @Test
    void readsClaims() {
        MetricDefinition.Claims claims = read(WHOLE).claims();
        assertThat(claims.vacuum()).contains(false);
        assertThat(claims.signature()).contains("-++");
        assertThat(claims.independentOf()).contains(List.of("Φ"));
        assertThat(claims.conformallyFlat()).contains(true);
        assertThat(print(claims.einsteinConstant().orElseThrow())).isEqualTo("2*Z*m");
        assertThat(claims.killing().stream()
                        .map(field ->
                                field.stream().map(DefinitionReaderTest::print).toList()))
                .containsExactly(List.of("0", "0", "1"), List.of("s", "t", "0"));
    }

    @Test
    void readsKernels() {
        List<MetricDefinition.KernelEntry> kernels = read(WHOLE).kernels();
        assertThat(kernels).hasSize(2);
        MetricDefinition.KernelEntry first = kernels.get(0);
        assertThat(first.className()).contains("RopeBridgeOrbit");
        assertThat(first.quantities()).containsExactly("metric", "christoffel");
        assertThat(first.layout()).contains("packed");
        assertThat(first.packageName()).contains("com.example.rope");
        assertThat(first.effort()).contains("quick");
        assertThat(first.trigonometry()).contains("shared");
        assertThat(first.fma()).contains(true);
        assertThat(first.prefer()).contains("accuracy");
        assertThat(kernels.get(1).className()).isEmpty();
        assertThat(kernels.get(1).position().line()).isEqualTo(50);
    }

    @Test
    void whatIsNotThereIsEmpty() {
        MetricDefinition bare = read("name = \"x\"\ncoordinates = [\"x\"]\nline-element = \"dx^2\"\n");
        assertThat(bare.title()).isEmpty();
        assertThat(bare.parameters()).isEmpty();
        assertThat(bare.claims()).isEqualTo(MetricDefinition.Claims.none());
        assertThat(bare.domain().conditions()).isEmpty();
        assertThat(bare.kernels()).isEmpty();
    }

    @Test
    void aMatrixMayBeFullOrALowerTriangle() {
        String head = "name = \"x\"\ncoordinates = [\"x\", \"y\"]\n";
        MetricForm full =
                read(head + "metric = [[1, \"x*y\"], [\"y*x\", 2.5]]\n").form();
        MetricForm lower = read(head + "metric = [[\"1\"], [\"y*x\", 2.5]]\n").form();
        for (MetricForm form : List.of(full, lower)) {
            assertThat(((MetricForm.Matrix) form)
                            .rows().stream()
                                    .map(row -> row.stream()
                                            .map(DefinitionReaderTest::print)
                                            .toList()))
                    .containsExactly(List.of("1"), List.of("y*x", "2.5"));
        }
    }

    @Test
    void halvesOfAMatrixMayBeWrittenDifferently() {
        String text = """
                name = "x"
                coordinates = ["x", "y"]
                metric = [["1", "%s"], ["%s", "4"]]
                [parameters]
                a = 2.0
                [domain]
                conditions = ["x > 1"]
                [domain.sample]
                x = [0, 3]
                """;
        assertThat(read(text.formatted("sin(x)^2", "1 - cos(x)^2")).form()).isNotNull();
        assertThat(read(text.formatted("a*(x + y)", "y*a + x*a")).form()).isNotNull();
        assertThat(read(text.formatted("sqrt(x^2)", "x")).form()).isNotNull();
        assertThat(read(text.formatted("sqrt(x - 1)", "sqrt(x - 1)^3/(x - 1)")).form())
                .isNotNull();
        assertThat(read(text.formatted("(x - y)^7", "(x - y)*(x - y)^6")).form())
                .isNotNull();
        // Never defined where the conditions hold: nothing speaks against it.
        assertThat(read(text.formatted("log(-x)", "log(-x) + 1")).form()).isNotNull();
        // Equal at the parameter's default alone.
        assertThat(DefinitionMistakes.of(text.formatted("a*x", "2*x"))).hasSize(1);
        assertThat(DefinitionMistakes.of(text.formatted("1", "1 + 1e-13*y"))).hasSize(1);
    }

    @Test
    void aShiftThatIsNotGivenIsZero() {
        MetricForm.ThreePlusOne form = (MetricForm.ThreePlusOne) read("""
                        name = "x"
                        coordinates = ["t", "x", "y"]
                        [three-plus-one]
                        lapse = 1
                        spatial-line-element = "dx^2 + dy^2"
                        """).form();
        assertThat(form.shift()).extracting(DefinitionReaderTest::print).containsExactly("0", "0");
        assertThat(print(form.lapse())).isEqualTo("1");
    }

    @Test
    void readsACoframe() {
        MetricForm.Coframe form = (MetricForm.Coframe) read("""
                        name = "x"
                        coordinates = ["t", "x"]
                        coframe = ["dt - x*(dx + 2*dt)", "-dx/t"]
                        signature = "-+"
                        """).form();
        assertThat(form.signs()).containsExactly(-1, 1);
        assertThat(form.oneForms())
                .extracting(DefinitionReaderTest::print)
                .containsExactly("dt - x*(dx + 2*dt)", "-dx/t");
    }

    /** Every way to write a quadratic form is one. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "dx^2 + dy^2",
                "(dx + x*dy)^2 - dy*dx/3",
                "dx*(dx + 2*dy) + (dy^2)^1*(dx*dy)^0",
                "-(dx^2 + dy^2)/(x^2 + y^2)^2",
                "2*(x + 1)*(dx + dy)*(dx - dy)",
                "dx*dy",
                "dx^(1 + 1) + dy^n",
            })
    void acceptsAnyQuadraticForm(String lineElement) {
        assertThat(read("name = \"x\"\ncoordinates = [\"x\", \"y\"]\nline-element = \"" + lineElement
                                + "\"\n[abbreviations]\nn = 2\n")
                        .form())
                .isInstanceOf(MetricForm.LineElement.class);
    }

    @Test
    void hostileNamesAreOrdinary() {
        MetricDefinition definition = read("""
                name = "hostile-names"
                coordinates = ["E", "I", "N", "D"]
                line-element = "-Pi*dE^2 + class*dI^2 + dN^2*double + e^2*dD^2*Degree + i*dE*dN"
                [parameters]
                double = 1.0
                class = 2
                Pi = 3
                e = 4
                i = 5
                [abbreviations]
                Degree = "E*I*N*D"
                """);
        assertThat(definition.parameters()).hasSize(5);
    }

    @Test
    void keysMayBeDottedOrQuoted() {
        MetricDefinition definition = read("""
                name = "dotted"
                "coordinates" = ["x"]
                'line-element' = "M*dx^2"
                parameters.M.default = "2*q"
                parameters.M.unit = "length"
                domain.sample."x" = [1, 2]
                """.replace("2*q", "2"));
        assertThat(definition.parameters().get(0).unit()).isEqualTo("length");
        assertThat(definition.parameters().get(0).position()).isEqualTo(new SourcePosition(4, 12, 1));
        assertThat(definition.domain().sample()).containsKey("x");
    }
}
