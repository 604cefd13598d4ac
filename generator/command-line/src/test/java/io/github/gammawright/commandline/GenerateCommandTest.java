package io.github.gammawright.commandline;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class GenerateCommandTest {

    private static final String TABLES = """
            name = "signal-dome"
            coordinates = ["theta", "phi"]
            line-element = "R^2*(dtheta^2 + sin(theta)^2*dphi^2)"
            parameters.R = 1.0

            [[kernel]]
            class = "Dome"
            quantities = ["metric", "volume-element"]
            package = "harbour"

            [[kernel]]
            quantities = ["christoffel"]
            layout = "packed"
            """;

    @TempDir
    private Path temporary;

    private Path out;

    @BeforeEach
    void nameOutput() {
        out = temporary.resolve("out");
    }

    @Test
    void writesTheChristoffelSymbolsByDefault() throws IOException {
        Program run = generate("sphere");

        assertThat(run.errors()).isEmpty();
        assertThat(run.status()).isZero();
        assertThat(written()).containsExactly("kernels/SphereChristoffel.java");
        assertThat(run.output())
                .startsWith(out.resolve("kernels/SphereChristoffel.java") + ": ")
                .contains("operations");
    }

    @Test
    void eachQuantityOfEachDefinitionHasAClass() throws IOException {
        Program run = generate("sphere", "polar-plane", "--quantity", "metric,volume-element", "--package", "a.b");

        assertThat(run.status()).isZero();
        assertThat(written())
                .containsExactly(
                        "a/b/PolarPlaneMetric.java",
                        "a/b/PolarPlaneVolumeElement.java",
                        "a/b/SphereMetric.java",
                        "a/b/SphereVolumeElement.java");
    }

    @Test
    void oneClassForAllQuantitiesInTheUnnamedPackage() throws IOException {
        Program run = generate("sphere", "--quantity", "metric,christoffel", "--class", "Ball", "--package", "");

        assertThat(run.errors()).isEmpty();
        assertThat(written()).containsExactly("Ball.java");
        assertThat(Files.readString(out.resolve("Ball.java"))).contains("class Ball", "METRIC_LENGTH");
    }

    @Test
    void tablesSayWhatIsMadeUnlessTheCommandLineDoes() throws IOException {
        Path file = define("dome", TABLES);

        assertThat(generate(file.toString()).errors()).isEmpty();
        assertThat(written()).containsExactly("harbour/Dome.java", "kernels/SignalDomeChristoffel.java");

        assertThat(generate(file.toString(), "--quantity", "inverse-metric").status())
                .isZero();
        assertThat(written()).contains("kernels/SignalDomeInverseMetric.java");
    }

    @Test
    void theSameAgainTouchesNothing() throws IOException {
        generate("sphere");
        Path file = out.resolve("kernels/SphereChristoffel.java");
        String text = Files.readString(file);
        FileTime longAgo = FileTime.fromMillis(1_000_000);
        Files.setLastModifiedTime(file, longAgo);

        Program run = generate("sphere");

        assertThat(run.output()).startsWith(file + " (unchanged): ");
        assertThat(Files.readString(file)).isEqualTo(text);
        assertThat(Files.getLastModifiedTime(file)).isEqualTo(longAgo);
    }

    @Test
    void everyMistakeOfEveryFileIsReportedAndNothingIsWritten() throws IOException {
        Path one = define("one", """
                name = "one"
                coordinates = ["x", "y"]
                line-element = "dx^2 + f*dy^2 + z*dy^2"
                """);
        Path two = define("two", "");

        Program run = generate("sphere", one.toString(), "no-such-metric", two.toString(), "scwarzschild");

        assertThat(run.status()).isEqualTo(2);
        assertThat(run.output()).isEmpty();
        assertThat(run.errorLines())
                .contains(
                        one + ":3:24: unknown name 'f'",
                        one + ":3:33: unknown name 'z'",
                        "no-such-metric:1:1: this is neither a file nor a built-in definition",
                        two + ":1:1: the definition is empty",
                        "scwarzschild:1:1: this is neither a file nor a built-in definition",
                        "Did you mean 'schwarzschild'?");
        assertThat(out).doesNotExist();
    }

    @Test
    void twoDefinitionsOfOneNameAreRefused() throws IOException {
        Path file = define("sphere", "name = \"sphere\"\ncoordinates = [\"x\"]\nline-element = \"dx^2\"\n");

        Program run = generate("sphere", file.toString());

        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errorLines().get(0))
                .isEqualTo(file + ":1:9: the class kernels.SphereChristoffel is already made by sphere.metric.toml");
        assertThat(out).doesNotExist();
    }

    @Test
    void aDegenerateMetricIsAMistakeOfItsDefinition() throws IOException {
        Path file = define("flat", "name = \"flat\"\ncoordinates = [\"x\", \"y\"]\nline-element = \"(dx + dy)^2\"\n");

        Program run = generate(file.toString(), "--quantity", "christoffel,inverse-metric");

        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errorLines().get(0)).startsWith(file + ":3:").endsWith("so the metric is degenerate");
        assertThat(run.errors().split("degenerate")).as("reported once").hasSize(2);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--class 2nd | '2nd' is not a name for a class",
                "--class record | 'record' is not a name for a class",
                "--package a..b | 'a..b' is not a name for a package",
                "--package ../up | '../up' is not a name for a package",
                "--package java.util | 'java.util' is a package that only Java itself may have",
                "--quantity metric,metric | the quantity 'metric' is given twice",
            })
    void wrongSettingsAreNamed(String options, String complaint) {
        Program run = generate(("sphere " + options).split(" "));

        assertThat(run.errorLines()).containsExactly("gammawright: " + complaint);
        assertThat(run.status()).isEqualTo(2);
    }

    @Test
    void oneClassNameDoesNotDoForTwoDefinitions() {
        assertThat(generate("sphere", "torus", "--class", "Both").errorLines())
                .containsExactly("gammawright: --class names one class, and there are 2 definitions;"
                        + " run once for each, or leave --class out");
    }

    @Test
    void wrongWordsComeWithTheNearestRightOne() {
        assertThat(generate("sphere", "--quantity", "metric,chrstoffel").errorLines())
                .containsExactly(
                        "gammawright: invalid value for option '--quantity' (Q): unknown quantity 'chrstoffel';"
                                + " did you mean 'christoffel'?; see 'gammawright generate --help'");
        assertThat(generate("sphere", "--layout", "dense").errors())
                .contains("unknown layout 'dense'; known are full, packed, non-zero");
    }

    @Test
    void aFileInTheWayOfTheFolderIsSaid() throws IOException {
        Files.writeString(out, "a file");

        Program run = generate("sphere");

        assertThat(run.errorLines())
                .singleElement()
                .satisfies(line -> assertThat(line)
                        .startsWith("gammawright: cannot write " + out)
                        .endsWith("is a file, not a folder"));
        assertThat(run.status()).isEqualTo(3);
    }

    @Test
    void progressIsForTerminalsAlone() {
        assertThat(generate("sphere").errors()).isEmpty();

        Program run = Program.runAtTerminal("generate", "sphere", "--out", out.toString());

        assertThat(run.errors()).contains("1/1 SphereChristoffel").endsWith("\r\u001b[K");
        assertThat(run.output()).doesNotContain("\u001b");
    }

    /** The same input gives the same text, whatever it is generated together with. */
    @Test
    void theTextDependsOnTheDefinitionAlone() throws IOException {
        generate("sphere");
        String alone = Files.readString(out.resolve("kernels/SphereChristoffel.java"));
        out = temporary.resolve("other place");
        generate("torus", "sphere");

        assertThat(Files.readString(out.resolve("kernels/SphereChristoffel.java")))
                .isEqualTo(alone);
    }

    private Program generate(String... arguments) {
        return Program.run(Stream.of(
                        List.of("generate", "--effort", "quick"), List.of(arguments), List.of("--out", out.toString()))
                .flatMap(List::stream)
                .toArray(String[]::new));
    }

    private Path define(String name, String text) throws IOException {
        return Files.writeString(temporary.resolve(name + ".metric.toml"), text);
    }

    private List<String> written() throws IOException {
        try (Stream<Path> files = Files.walk(out)) {
            return files.filter(Files::isRegularFile)
                    .map(file -> out.relativize(file).toString().replace('\\', '/'))
                    .sorted()
                    .toList();
        }
    }
}
