package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.samples.ThistledownOrbit.Periapsis;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.junit.jupiter.api.Test;

/**
 * The orbit against its first integrals, without any connection: from g^ij p_i p_j = −1 with the constant energy E and
 * angular momentum L follow r' and φ' by proper time, and period and turn of the periapsis as integrals over r (method:
 * Landau &amp; Lifshitz 1975, The Classical Theory of Fields, § 101; from memory).
 */
class ThistledownOrbitTest {

    private static final double M = 1;
    private static final double B = 3;
    private static final double J = 0.5;
    private static final int NODES = 400;

    private final ThistledownOrbit orbit = new ThistledownOrbit();
    private final double energy = -orbit.momentum(orbit.start())[0];
    private final double angularMomentum = orbit.momentum(orbit.start())[3];

    @Test
    void periodAndTurnOfThePeriapsisFollowFromTheFirstIntegrals() {
        double outer = orbit.start()[1];
        double inner = new BracketingNthOrderBrentSolver(1e-15, 1e-14, 1e-16, 5)
                .solve(1000, this::radialVelocitySquared, 0.5, 0.9 * outer);
        double period = 2 * integral(r -> 1, inner, outer);
        double angle = 2 * integral(this::angularVelocity, inner, outer);

        List<Periapsis> found = orbit.follow(5000);

        assertThat(found).hasSize(6);
        for (int i = 0; i < found.size(); i++) {
            assertThat(found.get(i).radius()).isCloseTo(inner, within(1e-7));
            assertThat(found.get(i).properTime()).isCloseTo((i + 0.5) * period, within(1e-5));
            assertThat(found.get(i).azimuth()).isCloseTo((i + 0.5) * angle, within(1e-6));
            assertThat(found.get(i).energy()).isCloseTo(energy, within(1e-10));
        }
    }

    @Test
    void theTableHasALineForEachOrbit() {
        PrintStream standardOutput = System.out;
        ByteArrayOutputStream captured = new ByteArrayOutputStream();
        System.setOut(new PrintStream(captured, true, StandardCharsets.UTF_8));
        try {
            ThistledownOrbit.main(new String[0]);
        } finally {
            System.setOut(standardOutput);
        }
        assertThat(captured.toString(StandardCharsets.UTF_8).lines())
                .hasSize(9)
                .anyMatch(line -> line.matches(" +2 +1238\\.002 +1317\\.377 +8\\.9533 +33\\.2540 .*"));
    }

    private double radialVelocitySquared(double r) {
        double boost = energy - dragging(r) * angularMomentum;
        double potential = Math.exp(2 * potential(r));
        return boost * boost - potential - potential * potential * angularMomentum * angularMomentum / (r * r);
    }

    private double angularVelocity(double r) {
        double potential = Math.exp(2 * potential(r));
        return dragging(r) / potential * (energy - dragging(r) * angularMomentum)
                + potential * angularMomentum / (r * r);
    }

    private static double potential(double r) {
        return -M / Math.sqrt(r * r + B * B);
    }

    private static double dragging(double r) {
        return 2 * J / Math.pow(r * r + B * B, 1.5);
    }

    /** ∫ f dr/r' between the turning points, with r = middle − half cos x, which takes out both singular ends. */
    private double integral(DoubleUnaryOperator f, double inner, double outer) {
        double middle = (inner + outer) / 2;
        double half = (outer - inner) / 2;
        double sum = 0;
        for (int i = 0; i < NODES; i++) {
            double x = Math.PI * (i + 0.5) / NODES;
            double r = middle - half * Math.cos(x);
            sum += f.applyAsDouble(r) * half * Math.sin(x) / Math.sqrt(radialVelocitySquared(r));
        }
        return sum * Math.PI / NODES;
    }
}
