package io.github.gammawright.commandline;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.geometry.Quantity;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CheckCommandTest {

    @TempDir
    private Path temporary;

    @Test
    void checksEveryQuantity() {
        Program run = Program.run("check", "polar-plane", "--points", "8", "--effort", "quick");

        assertThat(run.errors()).isEmpty();
        for (Quantity quantity : Quantity.values()) {
            if (!quantity.isOfSplit()) {
                assertThat(run.output()).contains("kernels.PolarPlane" + quantity.classSuffix() + ": passed");
            }
        }
        assertThat(run.output())
                .contains("polar-plane: the metric has no lapse, shift, ")
                .doesNotContain("PolarPlaneLapse");
        assertThat(run.status()).isZero();
    }

    @Test
    void checksTheClassesOfTablesToo() throws IOException {
        Path file = Files.writeString(temporary.resolve("dome.metric.toml"), """
                name = "dome"
                coordinates = ["theta", "phi"]
                line-element = "dtheta^2 + theta^2*dphi^2"
                [[kernel]]
                class = "DomeOrbit"
                quantities = ["metric", "christoffel"]
                layout = "non-zero"
                """);

        Program run = Program.run("check", file.toString(), "--points", "8", "--effort", "quick");

        assertThat(run.output()).contains("kernels.DomeOrbit: passed").contains("kernels.DomeMetric: passed");
        assertThat(run.status()).isZero();
    }

    @Test
    void reportsAsJson() {
        Program run =
                Program.run("check", "polar-plane", "--points", "8", "--seed", "7", "--effort", "quick", "--json");

        assertThat(run.output().strip()).startsWith("{").endsWith("}");
        assertThat(run.output())
                .contains("\"passed\": true", "\"seed\": 7", "\"class\": \"kernels.PolarPlaneChristoffel\"");
        assertThat(run.errors()).isEmpty();
    }

    @Test
    void servesTheCallersFunctionsBySamples() throws IOException {
        Path file = Files.writeString(temporary.resolve("lens.metric.toml"), """
                name = "lens"
                coordinates = ["x", "y"]
                line-element = "n^2*(dx^2 + dy^2)"
                functions.n = { of = ["x"], sample = "1 + exp(x)/4" }
                """);

        Program run = Program.run("check", file.toString(), "--points", "6", "--effort", "quick");

        assertThat(run.errors()).isEmpty();
        assertThat(run.output())
                .contains("kernels.LensChristoffel: passed", "kernels.LensHamiltonianFlow: passed", "lens: passed")
                .doesNotContain("not checked");
        assertThat(run.status()).isZero();
    }

    @Test
    void triesIdentitiesAndProvesClaims() {
        Program run = Program.run("check", "sphere", "--points", "6", "--effort", "quick");

        assertThat(run.output())
                .contains("sphere: passed\n")
                .containsPattern("Euler–Lagrange +a\\^k \\+ Γ\\^k_ij u\\^i u\\^j +\\d+ +\\S+ +passed")
                .containsPattern("conservation of u_phi .* passed")
                .containsPattern("signature = \"\\+\\+\" +\\d+ +tested")
                .contains("the metric does not depend on phi");
        assertThat(run.status()).isZero();
    }

    @Test
    void aFalseClaimFallsShortWithACounterExample() throws IOException {
        Path file = Files.writeString(temporary.resolve("bowl.metric.toml"), """
                name = "bowl"
                coordinates = ["x", "y"]
                line-element = "(1 + x^2)*dx^2 + dy^2"
                [claims]
                independent-of = ["x"]
                vacuum = true
                [[kernel]]
                quantities = ["metric"]
                """);

        Program run = Program.run("check", file.toString(), "--points", "6", "--effort", "quick");

        assertThat(run.output())
                .contains("kernels.BowlMetric: passed", "bowl: failed\n")
                .containsPattern("vacuum = true +\\d+ +proved")
                .containsPattern("independent-of x +\\d+ +refuted")
                .containsPattern("counter-example to independent-of x: ∂_x g\\[0, 0\\] = \\S+ at \\[");
        assertThat(run.status()).isEqualTo(1);

        Program json = Program.run("check", file.toString(), "--points", "6", "--effort", "quick", "--json");
        assertThat(json.output())
                .startsWith("{\"passed\": false,")
                .contains("\"claim\": \"independent-of x\", \"verdict\": \"refuted\"");
        assertThat(json.status()).isEqualTo(1);
    }

    @Test
    void whatCannotBeComparedFallsShort() throws IOException {
        Path file = Files.writeString(temporary.resolve("lens.metric.toml"), """
                name = "lens"
                coordinates = ["x", "y"]
                line-element = "n^2*(dx^2 + dy^2)"
                functions.n.of = ["x"]
                """);

        Program run = Program.run("check", file.toString(), "--points", "8", "--effort", "quick");

        assertThat(run.output()).contains("kernels.LensMetric: not checked");
        assertThat(run.status()).isEqualTo(1);
    }

    @Test
    void needsAPoint() {
        Program run = Program.run("check", "polar-plane", "--points", "0");

        assertThat(run.errorLines()).containsExactly("gammawright: --points needs at least 1, not 0");
        assertThat(run.status()).isEqualTo(2);
    }
}
