package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assumptions.assumeThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SourceWriterTest {

    private static final String PATH = "kernels/lantern/Star.java";
    private static final int ROUNDS = 40;

    @TempDir
    private Path temporary;

    @Test
    void writesUtf8BelowTheRoot() throws IOException {
        Path root = temporary.resolve("not/there/yet");

        assertThat(new SourceWriter(root).writeTexts(texts(PATH, "class Star {} // Γ")))
                .containsExactly(root.resolve(PATH));
        assertThat(Files.readAllBytes(root.resolve(PATH)))
                .isEqualTo("class Star {} // Γ".getBytes(StandardCharsets.UTF_8));
        assertThat(everything(root)).containsExactly(PATH);
    }

    @Test
    void leavesEqualFilesAlone() throws IOException {
        SourceWriter writer = new SourceWriter(temporary);
        writer.writeTexts(texts(PATH, "same"));
        FileTime longAgo = FileTime.fromMillis(1_000_000);
        Files.setLastModifiedTime(temporary.resolve(PATH), longAgo);

        assertThat(writer.writeTexts(texts(PATH, "same"))).isEmpty();
        assertThat(Files.getLastModifiedTime(temporary.resolve(PATH))).isEqualTo(longAgo);
        assertThat(writer.writeTexts(texts(PATH, "diff"))).hasSize(1);
        assertThat(temporary.resolve(PATH)).hasContent("diff");
    }

    @ParameterizedTest
    @ValueSource(strings = {"../Star.java", "a/../../Star.java", "/etc/Star.java", "", ".", "a/.."})
    void writesNothingOutsideTheRoot(String path) throws IOException {
        Path root = Files.createDirectories(temporary.resolve("root"));

        assertThatExceptionOfType(OutputException.class)
                .isThrownBy(() -> new SourceWriter(root).writeTexts(texts(path, "x")))
                .withMessageContaining("outside");
        assertThat(everything(temporary)).isEmpty();
    }

    @Test
    void followsNoLinkOutOfTheRoot() throws IOException {
        Path root = Files.createDirectories(temporary.resolve("root"));
        Path elsewhere = Files.createDirectories(temporary.resolve("elsewhere"));
        Files.createSymbolicLink(root.resolve("kernels"), elsewhere);

        assertThatExceptionOfType(OutputException.class)
                .isThrownBy(() -> new SourceWriter(root).writeTexts(texts(PATH, "x")))
                .withMessageContaining("leads outside");
        assertThat(elsewhere).isEmptyDirectory();
    }

    @Test
    void replacesALinkInsteadOfWritingThroughIt() throws IOException {
        Path root = Files.createDirectories(temporary.resolve("root"));
        Path precious = Files.writeString(temporary.resolve("precious"), "precious");
        Files.createSymbolicLink(root.resolve("Star.java"), precious);

        new SourceWriter(root).writeTexts(texts("Star.java", "class Star {}"));

        assertThat(precious).hasContent("precious");
        assertThat(Files.isSymbolicLink(root.resolve("Star.java"))).isFalse();
        assertThat(root.resolve("Star.java")).hasContent("class Star {}");
    }

    @Test
    void writesNothingIfOneOfSeveralCannotBeWritten() throws IOException {
        Files.createDirectories(temporary.resolve("b/Folder.java"));
        Map<String, byte[]> texts = new LinkedHashMap<>(texts("a/First.java", "first"));
        texts.putAll(texts("b/Folder.java", "second"));

        assertThatExceptionOfType(OutputException.class)
                .isThrownBy(() -> new SourceWriter(temporary).writeTexts(texts))
                .withMessageContaining("there is a folder of that name");
        assertThat(everything(temporary)).isEmpty();
    }

    @Test
    void saysThatAFileIsInTheWay() throws IOException {
        Path file = Files.writeString(temporary.resolve("out"), "a file");

        assertThatExceptionOfType(OutputException.class)
                .isThrownBy(() -> new SourceWriter(file).writeTexts(texts(PATH, "x")))
                .withMessageContaining("cannot write " + file)
                .withMessageContaining("is a file, not a folder");
        assertThat(file).hasContent("a file");
    }

    @Test
    void saysThatAFolderIsReadOnly() throws IOException {
        Path folder = Files.createDirectories(temporary.resolve("locked"));
        assumeThat(folder.toFile().setWritable(false) && !Files.isWritable(folder))
                .as("a user who may not write everywhere")
                .isTrue();
        try {
            assertThatExceptionOfType(OutputException.class)
                    .isThrownBy(() -> new SourceWriter(folder).writeTexts(texts(PATH, "x")))
                    .withMessageContaining("permission denied");
        } finally {
            assertThat(folder.toFile().setWritable(true)).isTrue();
        }
    }

    @Test
    void removesWhatAKilledRunLeft() throws IOException {
        Path folder = Files.createDirectories(temporary.resolve("kernels/lantern"));
        Path left = Files.writeString(folder.resolve(".gammawright-999999999999-5.tmp"), "half a cla");
        Path running = Files.writeString(
                folder.resolve(".gammawright-" + ProcessHandle.current().pid() + "-6.tmp"), "another run's");
        Path notOurs = Files.writeString(folder.resolve(".gammawright-notes.tmp"), "someone's");

        new SourceWriter(temporary).writeTexts(texts(PATH, "class Star {}"));

        assertThat(left).doesNotExist();
        assertThat(running).exists();
        assertThat(notOurs).exists();
    }

    @Test
    void tidiesUpWhenTheProgramIsInterrupted() throws IOException {
        List<Runnable> actions = new ArrayList<>();
        ExitActions exit = action -> {
            actions.add(action);
            return () -> actions.remove(action);
        };
        try (TemporaryFiles files = new TemporaryFiles(exit)) {
            files.stage(temporary.resolve("Star.java"), new byte[] {1});
            assertThat(everything(temporary)).hasSize(1);
            actions.forEach(Runnable::run);
            assertThat(everything(temporary)).isEmpty();
        }
        assertThat(actions).isEmpty();
    }

    /** A reader may come at any moment: it must find one of the whole texts. Each round begins without a folder. */
    @Test
    void severalWritersAtOnceLeaveOneWholeText() throws Exception {
        List<String> texts =
                Stream.of("a", "b", "c", "d").map(s -> s.repeat(100_000)).toList();
        ExecutorService pool = Executors.newFixedThreadPool(texts.size());
        try {
            List<Future<?>> writers = new ArrayList<>();
            for (String text : texts) {
                writers.add(pool.submit(() -> {
                    for (int i = 0; i < ROUNDS; i++) {
                        Path root = temporary.resolve("round" + i);
                        new SourceWriter(root).writeTexts(texts(PATH, text));
                        assertThat(texts).contains(Files.readString(root.resolve(PATH)));
                    }
                    return null;
                }));
            }
            for (Future<?> writer : writers) {
                writer.get();
            }
        } finally {
            pool.shutdownNow();
        }
        assertThat(everything(temporary))
                .hasSize(ROUNDS)
                .allMatch(file -> file.matches("round\\d+/" + Pattern.quote(PATH)));
    }

    private static Map<String, byte[]> texts(String path, String text) {
        return Map.of(path, text.getBytes(StandardCharsets.UTF_8));
    }

    private static List<String> everything(Path folder) throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            return files.filter(file -> !Files.isDirectory(file))
                    .map(file -> folder.relativize(file).toString().replace('\\', '/'))
                    .sorted()
                    .toList();
        }
    }
}
