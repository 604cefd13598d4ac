package io.github.gammawright.maven;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeSet;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** With a generator that makes a class for each word of a definition, so that what is made is easy to say. */
class KernelBuildTest {

    @TempDir
    private Path temporary;

    private Path definitions;
    private Path output;
    private Path state;
    private final List<Set<String>> asked = new ArrayList<>();
    private String settings = "settings";

    @BeforeEach
    void makeFolders() throws IOException {
        definitions = Files.createDirectories(temporary.resolve("src"));
        output = temporary.resolve("target/generated");
        state = temporary.resolve("target/gammawright/generate-default.state");
    }

    @Test
    void makesEverythingOnceAndThenNothing() throws IOException {
        define("a", "One Two");
        define("b", "Three");

        KernelBuild.Outcome first = build();
        FileTime longAgo = FileTime.fromMillis(1_000_000);
        Files.setLastModifiedTime(output.resolve("k/One.java"), longAgo);
        KernelBuild.Outcome second = build();

        assertThat(first.written()).hasSize(3);
        assertThat(first.classes()).isEqualTo(3);
        assertThat(second.changedNothing()).isTrue();
        assertThat(second.classes()).isEqualTo(3);
        assertThat(asked).containsExactly(Set.of("a.metric.toml", "b.metric.toml"));
        assertThat(Files.getLastModifiedTime(output.resolve("k/One.java"))).isEqualTo(longAgo);
    }

    @Test
    void aFileWithNewTimeAndOldContentIsNoChange() throws IOException {
        define("a", "One");
        build();
        define("a", "One");
        Files.setLastModifiedTime(
                definitions.resolve("a.metric.toml"), FileTime.fromMillis(System.currentTimeMillis() + 60_000));

        assertThat(build().changedNothing()).isTrue();
        assertThat(asked).hasSize(1);
    }

    @Test
    void onlyTheChangedDefinitionIsMadeAgain() throws IOException {
        define("a", "One Two");
        define("b", "Three");
        build();
        define("a", "One Four");

        KernelBuild.Outcome outcome = build();

        assertThat(asked.get(1)).containsExactly("a.metric.toml");
        assertThat(outcome.written()).containsExactly(output.resolve("k/Four.java"));
        assertThat(outcome.removed()).containsExactly(output.resolve("k/Two.java"));
        assertThat(classes()).containsExactly("k/Four.java", "k/One.java", "k/Three.java");
    }

    @Test
    void theClassesOfALostDefinitionGoAndNothingElseDoes() throws IOException {
        define("a", "One");
        define("b", "Two");
        build();
        Path foreign = Files.writeString(output.resolve("k/Foreign.java"), "not ours");
        Files.delete(definitions.resolve("a.metric.toml"));

        assertThat(build().removed()).containsExactly(output.resolve("k/One.java"));
        assertThat(classes()).containsExactly("k/Foreign.java", "k/Two.java");

        Files.delete(foreign);
        Files.delete(definitions.resolve("b.metric.toml"));
        assertThat(build().removed()).containsExactly(output.resolve("k/Two.java"));
        assertThat(output).isEmptyDirectory();
    }

    @Test
    void aRenamedDefinitionKeepsItsClasses() throws IOException {
        define("a", "One");
        build();
        Files.move(definitions.resolve("a.metric.toml"), definitions.resolve("b.metric.toml"));

        assertThat(build().changedNothing()).isTrue();
        assertThat(classes()).containsExactly("k/One.java");
    }

    @Test
    void missingOrTouchedClassesAreMadeAgain() throws IOException {
        define("a", "One Two");
        define("b", "Three");
        build();
        Files.delete(output.resolve("k/One.java"));

        assertThat(build().written()).containsExactly(output.resolve("k/One.java"));
        assertThat(asked.get(1)).containsExactly("a.metric.toml");

        Files.writeString(output.resolve("k/Three.java"), "edited by hand");
        assertThat(build().written()).containsExactly(output.resolve("k/Three.java"));
        assertThat(output.resolve("k/Three.java")).hasContent("class Three");
    }

    @Test
    void otherSettingsOrAnotherGeneratorMakeEverythingAgain() throws IOException {
        define("a", "One");
        build();
        settings = "others";

        KernelBuild.Outcome outcome = build();

        assertThat(asked).hasSize(2);
        assertThat(outcome.changedNothing()).as("the same text came out").isTrue();
    }

    @Test
    void afterAFailureEverythingIsMadeAgainAndOrphansAreStillKnown() throws IOException {
        define("a", "One");
        define("b", "Two");
        build();
        define("a", "WRONG");
        assertThatExceptionOfType(IllegalStateException.class).isThrownBy(this::build);
        assertThat(classes()).containsExactly("k/One.java", "k/Two.java");

        define("a", "Three");
        KernelBuild.Outcome outcome = build();

        assertThat(asked.get(2)).containsExactly("a.metric.toml", "b.metric.toml");
        assertThat(outcome.removed()).containsExactly(output.resolve("k/One.java"));
        assertThat(classes()).containsExactly("k/Three.java", "k/Two.java");
    }

    @Test
    void aFailedWriteIsNotTakenForDone() throws IOException {
        define("a", "One");
        Files.createDirectories(output.resolve("k/One.java"));
        assertThatExceptionOfType(IOException.class).isThrownBy(this::build);

        Files.delete(output.resolve("k/One.java"));
        assertThat(build().written()).hasSize(1);
        assertThat(build().changedNothing()).isTrue();
    }

    @Test
    void aStateThatIsNoneIsIgnored() throws IOException {
        define("a", "One");
        build();
        String whole = Files.readString(state);
        for (String broken :
                List.of("", "rubbish", whole.substring(0, whole.length() - 5), whole.replace("input", "imput"))) {
            Files.writeString(state, broken);
            asked.clear();
            assertThat(build().changedNothing()).isTrue();
            assertThat(asked).as(broken).hasSize(1);
        }
        Files.write(state, new byte[] {(byte) 0xff, (byte) 0xfe, 0});
        assertThat(build().changedNothing()).isTrue();
    }

    @Test
    void aMovedProjectIsStillUpToDate() throws IOException {
        define("a", "One");
        build();
        Path moved = temporary.resolve("elsewhere");
        Files.createDirectories(moved);
        Files.move(definitions, moved.resolve("src"));
        Files.move(temporary.resolve("target"), moved.resolve("target"));
        definitions = moved.resolve("src");
        output = moved.resolve("target/generated");
        state = moved.resolve("target/gammawright/generate-default.state");

        build();

        assertThat(asked).hasSize(1);
    }

    @Test
    void withoutDefinitionsNothingIsLeftBehind() throws IOException {
        assertThat(build().definitions()).isZero();
        Files.delete(definitions);
        assertThat(build().definitions()).isZero();
        assertThat(temporary).isEmptyDirectory();
    }

    @Test
    void buildsAtOnceInOneFolderWaitForEachOther() throws Exception {
        for (int i = 0; i < 10; i++) {
            define("d" + i, "Class" + i);
        }
        ExecutorService pool = Executors.newFixedThreadPool(4);
        try {
            List<Future<KernelBuild.Outcome>> builds =
                    pool.invokeAll(java.util.Collections.nCopies(8, (Callable<KernelBuild.Outcome>) this::build));
            int written = 0;
            for (Future<KernelBuild.Outcome> build : builds) {
                written += build.get().written().size();
            }
            assertThat(written).isEqualTo(10);
        } finally {
            pool.shutdownNow();
        }
        assertThat(asked).hasSize(1);
        assertThat(classes()).hasSize(10);
    }

    private KernelBuild.Outcome build() throws IOException {
        return new KernelBuild(definitions, output, state, settings, this::make).run();
    }

    private Map<String, Map<String, String>> make(SortedMap<String, Path> all, Set<String> outdated) {
        asked.add(new TreeSet<>(outdated));
        Map<String, Map<String, String>> made = new LinkedHashMap<>();
        for (String name : outdated) {
            Map<String, String> texts = new LinkedHashMap<>();
            for (String word : read(all.get(name)).split(" ")) {
                if (word.equals("WRONG")) {
                    throw new IllegalStateException("a mistake");
                }
                texts.put("k/" + word + ".java", "class " + word);
            }
            made.put(name, texts);
        }
        return made;
    }

    private static String read(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    private void define(String name, String words) throws IOException {
        Files.writeString(definitions.resolve(name + ".metric.toml"), words);
    }

    private List<String> classes() throws IOException {
        try (Stream<Path> files = Files.walk(output)) {
            return files.filter(Files::isRegularFile)
                    .map(file -> output.relativize(file).toString().replace('\\', '/'))
                    .sorted()
                    .toList();
        }
    }
}
