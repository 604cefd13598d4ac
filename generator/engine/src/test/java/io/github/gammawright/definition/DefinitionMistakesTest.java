package io.github.gammawright.definition;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.SourceText;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Wrong definitions, each with all of its messages, in {@code golden/mistakes}. After a change of the wording, the
 * property {@code gammawright.golden.refresh} set to {@code true} writes the expectations anew; they are to be read then.
 */
class DefinitionMistakesTest {

    static final Path CASES = Path.of("src/test/resources/io/github/gammawright/definition/golden/mistakes");
    private static final String SUFFIX = ".metric.toml";

    static Stream<String> cases() throws IOException {
        try (Stream<Path> files = Files.list(CASES)) {
            List<String> names = files.map(file -> file.getFileName().toString())
                    .filter(name -> name.endsWith(SUFFIX))
                    .map(name -> name.substring(0, name.length() - SUFFIX.length()))
                    .sorted()
                    .toList();
            assertThat(names).hasSizeGreaterThan(70);
            return names.stream();
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void eachMistakeIsReportedAtItsPlace(String name) throws IOException {
        String messages = String.join(
                        "\n", mistakes(name).stream().map(Diagnostic::render).toList()) + "\n";
        Path expected = CASES.resolve(name + ".expected");
        if (Boolean.getBoolean("gammawright.golden.refresh")) {
            Files.writeString(expected, messages);
        }
        assertThat(messages).isEqualTo(Files.readString(expected));
    }

    /** What is reported of a case. */
    static List<Diagnostic> mistakes(String name) {
        try {
            String text = Files.readString(CASES.resolve(name + SUFFIX), StandardCharsets.UTF_8);
            DefinitionReader.read(new SourceText(name + SUFFIX, text));
            return List.of();
        } catch (DefinitionException e) {
            return e.diagnostics();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
