package io.github.gammawright.commandline;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class ShowCommandTest {

    @Test
    void showsWhatGenerateWouldWrite() {
        Program run = Program.run("show", "sphere", "--form", "java", "--quantity", "metric");

        assertThat(run.errors()).isEmpty();
        assertThat(run.output()).contains("package kernels;", "public final class SphereMetric");
        assertThat(run.status()).isZero();
    }

    @Test
    void showsTheCostOfEachStage() {
        Program run = Program.run("show", "sphere", "--cost", "--quantity", "christoffel,metric");

        assertThat(run.output().lines().filter(line -> line.matches("Sphere\\w+ +cost +operations +\\+ − +× +/.*")))
                .hasSize(2);
        assertThat(run.output().lines().filter(line -> line.startsWith("resubstitution")))
                .hasSize(2);
        assertThat(run.status()).isZero();
    }
}
