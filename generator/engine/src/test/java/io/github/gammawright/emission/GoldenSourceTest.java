package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.geometry.Layout;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
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

    @ParameterizedTest(name = "{0}")
    @MethodSource("models")
    void sourceIsTheSameEachTime(String name, KernelModel model) {
        assertThat(KernelEmitter.emit(model))
                .isEqualTo(KernelEmitter.emit(model))
                .doesNotContain("\r");
    }
}
