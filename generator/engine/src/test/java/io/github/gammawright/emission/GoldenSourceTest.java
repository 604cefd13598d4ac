package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.geometry.Layout;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import javax.tools.ToolProvider;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Whole emitted classes, as files beside the tests. After a change that is meant, {@code -Dgolden.refresh=true} writes
 * them anew; look at the difference before it is committed.
 */
class GoldenSourceTest {

    private static final Path FOLDER = Path.of("src/test/resources/io/github/gammawright/emission");

    static Stream<Arguments> models() {
        return Stream.of(
                Arguments.of("SchwarzschildFull", Schwarzschild.christoffel(Layout.FULL)),
                Arguments.of("SchwarzschildNonZero", Schwarzschild.christoffel(Layout.NON_ZERO)),
                Arguments.of("BreathingSphere", BreathingSphere.model()));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("models")
    void sourceIsAsKept(String name, KernelModel model) throws IOException {
        String source = KernelEmitter.emit(model);
        Path file = FOLDER.resolve(name + ".java.txt");
        if (Boolean.getBoolean("golden.refresh")) {
            Files.createDirectories(FOLDER);
            Files.writeString(file, source);
        }
        assertThat(source).isEqualTo(Files.readString(file, StandardCharsets.UTF_8));
    }

    /** The compiler's own check of documentation comments: tags, entities, HTML, references. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("models")
    void documentationIsSound(String name, KernelModel model, @TempDir Path folder) throws IOException {
        Path file = folder.resolve(model.className() + ".java");
        Files.writeString(file, KernelEmitter.emit(model));
        ByteArrayOutputStream messages = new ByteArrayOutputStream();
        int status = ToolProvider.getSystemJavaCompiler()
                .run(
                        null,
                        messages,
                        messages,
                        "-Xdoclint:all,-missing",
                        "-Werror",
                        "-proc:none",
                        "-encoding",
                        "UTF-8",
                        "-d",
                        folder.toString(),
                        file.toString());
        assertThat(status).as(messages.toString(StandardCharsets.UTF_8)).isZero();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("models")
    void sourceIsTheSameEachTime(String name, KernelModel model) {
        assertThat(KernelEmitter.emit(model))
                .isEqualTo(KernelEmitter.emit(model))
                .doesNotContain("\r");
    }
}
