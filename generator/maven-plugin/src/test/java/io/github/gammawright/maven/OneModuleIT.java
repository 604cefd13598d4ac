package io.github.gammawright.maven;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.MethodOrderer;
import org.junit.jupiter.api.Order;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.TestMethodOrder;
import org.junit.jupiter.api.io.TempDir;

/** The life of one project, build after build; each test goes on from where the one before left it. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
@TestMethodOrder(MethodOrderer.OrderAnnotation.class)
class OneModuleIT {

    private static final String SOURCES = "target/generated-sources/gammawright";
    private static final String DOME = "src/main/gammawright/signal-dome.metric.toml";
    private static final String DOME_CLASS = "consumer/kernels/SignalDomeChristoffel";
    private static final String TABLE_CLASS = "consumer/kernels/ChartTableChristoffel";

    @TempDir
    private static Path temporary;

    private Consumer consumer;

    @BeforeAll
    void copyProject() throws IOException {
        // Home directories have spaces and letters beyond ASCII; this JVM may be unable to name the latter.
        boolean beyondAscii = Charset.forName(System.getProperty("sun.jnu.encoding"))
                .newEncoder()
                .canEncode('Γ');
        Path folder = temporary.resolve(beyondAscii ? "dome works Γ" : "dome works");
        consumer = Consumer.copy("one-module", folder, LocalRepository.make());
    }

    @Test
    @Order(1)
    void theFirstBuildMakesEveryClass() throws IOException, InterruptedException {
        Consumer.Build build = consumer.maven("compile");

        assertThat(build.log()).contains("Generated 2 classes, removed 0; there are now 2 classes of 2 definitions");
        assertThat(build.status()).isZero();
        assertThat(consumer.contents(SOURCES)).containsOnlyKeys(DOME_CLASS + ".java", TABLE_CLASS + ".java");
        assertThat(consumer.contents(SOURCES).values()).noneMatch(source -> source.contains(temporary.toString()));
    }

    @Test
    @Order(2)
    void theClassesNeedNothingButJavaBase() throws IOException, InterruptedException {
        Consumer.Build run = consumer.java("consumer.Main");

        assertThat(run.status()).isZero();
        String[] lines = run.log().split("\\R");
        assertThat(Double.parseDouble(lines[0])).isEqualTo(-Math.sin(1.0) * Math.cos(1.0));
        assertThat(Double.parseDouble(lines[1])).isEqualTo(-3.0);
    }

    @Test
    @Order(3)
    void aBuildWithoutChangesTouchesNothing() throws IOException, InterruptedException {
        // Maven's own plugins write their notes into target/maven-status in every build.
        List<String> folders = List.of("target/generated-sources", "target/classes", "target/gammawright");
        List<SortedMap<String, String>> contents = new ArrayList<>();
        List<SortedMap<String, FileTime>> times = new ArrayList<>();
        for (String folder : folders) {
            contents.add(consumer.contents(folder));
            times.add(consumer.times(folder));
        }

        Consumer.Build build = consumer.maven("compile");

        assertThat(build.log()).contains("Nothing to generate: 2 classes of 2 definitions up to date");
        assertThat(build.log()).contains("Nothing to compile");
        assertThat(build.status()).isZero();
        for (int i = 0; i < folders.size(); i++) {
            assertThat(contents.get(i)).isNotEmpty().isEqualTo(consumer.contents(folders.get(i)));
            assertThat(consumer.times(folders.get(i))).isEqualTo(times.get(i));
        }
    }

    @Test
    @Order(4)
    void aChangedDefinitionMakesItsOwnClassAnew() throws IOException, InterruptedException {
        SortedMap<String, String> contents = consumer.contents(SOURCES);
        SortedMap<String, FileTime> times = consumer.times(SOURCES);
        edit(DOME, "R^2*(dtheta^2", "4*R^2*(dtheta^2");

        Consumer.Build build = consumer.maven("compile");

        assertThat(build.log()).contains("Generated 1 class, removed 0; there are now 2 classes of 2 definitions");
        assertThat(build.status()).isZero();
        assertThat(consumer.contents(SOURCES).get(DOME_CLASS + ".java"))
                .isNotEqualTo(contents.get(DOME_CLASS + ".java"));
        assertThat(consumer.times(SOURCES).get(TABLE_CLASS + ".java")).isEqualTo(times.get(TABLE_CLASS + ".java"));
    }

    @Test
    @Order(5)
    void aWrongDefinitionFailsTheBuildWhereItIsWrong() throws IOException, InterruptedException {
        SortedMap<String, String> contents = consumer.contents(SOURCES);
        edit(DOME, "sin(theta)", "sin(tetha)");

        Consumer.Build build = consumer.maven("compile");

        assertThat(build.status()).isNotZero();
        assertThat(build.log())
                .contains("[ERROR] " + consumer.path(DOME).toRealPath() + ":4:")
                .contains("unknown name 'tetha'")
                .contains("1 mistake in the metric definitions")
                .doesNotContain("\tat io.github.gammawright");
        assertThat(consumer.contents(SOURCES)).isEqualTo(contents);
    }

    @Test
    @Order(6)
    void aDeletedDefinitionTakesItsClassWithIt() throws IOException, InterruptedException {
        Files.delete(consumer.path(DOME));
        Files.delete(consumer.path("src/main/java/consumer/Main.java"));
        Path strangers =
                Files.writeString(consumer.path(SOURCES + "/consumer/kernels/Own.java"), "package consumer.kernels;");

        Consumer.Build build = consumer.maven("compile");

        assertThat(build.log()).contains("removed 1; there are now 1 class of 1 definition");
        assertThat(build.status()).isZero();
        assertThat(consumer.contents(SOURCES)).containsOnlyKeys(TABLE_CLASS + ".java", "consumer/kernels/Own.java");
        assertThat(strangers).exists();
        assertThat(consumer.path("target/classes/" + TABLE_CLASS + ".class")).exists();
        assertThat(consumer.path("target/classes/" + DOME_CLASS + ".class")).doesNotExist();
    }

    @Test
    @Order(7)
    void aWrongSettingIsNamedWithTheNearestRightOne() throws IOException, InterruptedException {
        Consumer.Build build = consumer.maven("generate-sources", "-Dgammawright.layout=fulll");

        assertThat(build.status()).isNotZero();
        assertThat(build.log()).contains("<layout>: unknown layout 'fulll'; did you mean 'full'?");
    }

    private void edit(String file, String from, String to) throws IOException {
        String text = Files.readString(consumer.path(file));
        assertThat(text).contains(from);
        Files.writeString(consumer.path(file), text.replace(from, to));
    }
}
