package io.github.gammawright.maven;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.SortedMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Two modules built at once by one Maven, whose class loader of the plugin they share. */
class TwoModulesIT {

    private static final String SOURCES = "/target/generated-sources/gammawright";

    @TempDir
    private Path temporary;

    @Test
    void modulesInParallelGetTheSameBytes() throws IOException, InterruptedException {
        Consumer consumer = Consumer.copy("two-modules", temporary.resolve("two"), LocalRepository.make());

        Consumer.Build build = consumer.maven("-T", "2", "compile");

        assertThat(build.log()).doesNotContain("not marked @threadSafe");
        assertThat(build.status()).isZero();
        SortedMap<String, String> north = consumer.contents("north" + SOURCES);
        assertThat(north)
                .containsOnlyKeys(
                        "kernels/ChartTableChristoffel.java",
                        "kernels/ChartTableGeodesicAcceleration.java",
                        "kernels/ChartTableInverseMetric.java",
                        "kernels/ChartTableMetric.java",
                        "kernels/SignalDomeChristoffel.java",
                        "kernels/SignalDomeGeodesicAcceleration.java",
                        "kernels/SignalDomeInverseMetric.java",
                        "kernels/SignalDomeMetric.java");
        assertThat(consumer.contents("south" + SOURCES)).isEqualTo(north);

        // The same again from nothing, one after the other
        Consumer.Build again = consumer.maven("compile", "-Dgammawright.skip=false", "-f", "north");
        assertThat(again.log()).contains("Nothing to generate: 8 classes of 2 definitions up to date");
        Consumer fresh = Consumer.copy("two-modules", temporary.resolve("elsewhere/two"), LocalRepository.make());
        assertThat(fresh.maven("generate-sources").status()).isZero();
        assertThat(fresh.contents("north" + SOURCES)).isEqualTo(north);
    }
}
