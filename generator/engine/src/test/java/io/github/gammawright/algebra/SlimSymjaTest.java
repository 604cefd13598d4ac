package io.github.gammawright.algebra;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.matheclipse.core.basic.Config;
import org.matheclipse.core.eval.ExprEvaluator;
import org.matheclipse.core.expression.F;
import org.matheclipse.core.interfaces.IExpr;
import org.matheclipse.core.interfaces.ISymbol;

/** Symja works without the libraries that the build leaves out of it, and says nothing when it starts. */
class SlimSymjaTest {

    /** The program that a fresh JVM runs; its last line says what came out. */
    static final class Probe {

        private Probe() {}

        public static void main(String[] arguments) {
            Config.JAS_NO_THREADS = true;
            ExprEvaluator evaluator = new ExprEvaluator(true, (short) 0);
            ISymbol r = F.Dummy("v0");
            ISymbol m = F.Dummy("v1");

            // d/dr (1 - 2m/r) = 2m/r², compared by subtraction since equals on fractions is asymmetric
            IExpr lapse = F.Plus(F.C1, F.Times(F.CN2, m, F.Power(r, F.CN1)));
            IExpr derivative = evaluator.eval(F.D(lapse, r));
            IExpr difference = F.Subtract(derivative, F.Times(F.C2, m, F.Power(r, F.CN2)));
            System.out.println("D " + evaluator.eval(F.Together(difference)).isZero());

            // 1/(r - m) + 1/(r + m) = 2r/(r² - m²)
            IExpr sum = F.Plus(F.Power(F.Subtract(r, m), F.CN1), F.Power(F.Plus(r, m), F.CN1));
            IExpr fraction = F.Times(F.C2, r, F.Power(F.Subtract(F.Sqr(r), F.Sqr(m)), F.CN1));
            System.out.println("Together "
                    + evaluator.eval(F.Together(F.Subtract(sum, fraction))).isZero());
        }
    }

    @Test
    void startsInSilenceAndDifferentiates() throws IOException, InterruptedException {
        Process process = new ProcessBuilder(List.of(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-Xmx256m",
                        "-cp",
                        System.getProperty("java.class.path"),
                        Probe.class.getName()))
                .redirectErrorStream(true)
                .start();
        ByteArrayOutputStream output = new ByteArrayOutputStream();
        process.getInputStream().transferTo(output);

        // Symja's worker threads would keep the JVM alive for a minute after the work.
        assertThat(process.waitFor(20, TimeUnit.SECONDS)).isTrue();
        assertThat(output.toString(StandardCharsets.UTF_8).lines()).containsExactly("D true", "Together true");
        assertThat(process.exitValue()).isZero();
    }
}
