package io.github.gammawright.maven;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Definitions that say themselves which classes they want; classes for the tests alone; checks in the build. */
class TablesIT {

    private static final String MAIN = "target/generated-sources/gammawright";
    private static final String TEST = "target/generated-test-sources/gammawright";

    @TempDir
    private Path temporary;

    @Test
    void tablesDecide() throws IOException, InterruptedException {
        Consumer consumer = Consumer.copy("tables", temporary.resolve("star"), LocalRepository.make());

        Consumer.Build build = consumer.maven("test-compile");

        assertThat(build.status()).as(build.log()).isZero();
        assertThat(consumer.contents(MAIN))
                .containsOnlyKeys("kernels/LanternStarOrbit.java", "observatory/tables/LanternStarChristoffel.java");
        assertThat(consumer.contents(TEST)).containsOnlyKeys("kernels/FlatChartMetric.java");
        assertThat(consumer.path("target/test-classes/kernels/FlatChartMetric.class"))
                .exists();
        assertThat(consumer.path("target/classes/kernels/FlatChartMetric.class"))
                .doesNotExist();
        // The project is compiled as ISO 8859-1, in which there is no θ.
        assertThat(consumer.contents(MAIN).values())
                .allMatch(source -> StandardCharsets.US_ASCII.newEncoder().canEncode(source))
                .allMatch(source -> source.contains("\\u03b8"));

        Consumer.Build checked = consumer.maven("gammawright:check@default");
        assertThat(checked.log())
                .contains("kernels.LanternStarOrbit: passed")
                .contains("observatory.tables.LanternStarChristoffel: passed");
        assertThat(checked.status()).isZero();

        // A function of which nothing is known but its name can't be compared with anything.
        Files.writeString(consumer.path("src/main/gammawright/unknown-lens.metric.toml"), """
                name = "unknown-lens"
                coordinates = ["x", "y"]
                line-element = "n^2*(dx^2 + dy^2)"
                functions.n.of = ["x"]
                [[kernel]]
                quantities = ["metric"]
                """);
        Consumer.Build unchecked = consumer.maven("gammawright:check@default");
        assertThat(unchecked.status()).isNotZero();
        assertThat(unchecked.log())
                .contains("[ERROR] kernels.UnknownLensMetric: not checked")
                .contains("1 of 3 kernels did not pass the check");
    }
}
