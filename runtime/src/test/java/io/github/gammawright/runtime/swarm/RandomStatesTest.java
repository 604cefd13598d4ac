package io.github.gammawright.runtime.swarm;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.runtime.HamiltonianEquation;
import io.github.gammawright.runtime.KerrByHand;
import io.github.gammawright.runtime.orbit.Ending;
import io.github.gammawright.runtime.orbit.IntegratorFactory;
import io.github.gammawright.runtime.orbit.Outcome;
import io.github.gammawright.runtime.orbit.Run;
import java.util.EnumMap;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Whatever a curve starts with, it ends in a named outcome with a finite state inside the domain. */
class RandomStatesTest {

    private static final double SPIN = 0.9;

    private final KerrByHand kerr = new KerrByHand(SPIN);
    private final Random random = new Random(11);

    private double[] state() {
        double horizon = 1 + Math.sqrt(1 - SPIN * SPIN);
        double[] state = new double[8];
        state[1] = horizon + Math.pow(10, -3 + 5 * random.nextDouble());
        state[2] = 0.01 + 3.12 * random.nextDouble();
        for (int i = 4; i < 8; i++) {
            state[i] = random.nextGaussian() * Math.pow(10, -2 + 4 * random.nextDouble());
        }
        return state;
    }

    @Test
    void tenThousandTracedCurvesEndWell() {
        RayTracer tracer = new RayTracer(new HamiltonianEquation(4, kerr::flow), 1e-8, 1e-8)
                .within(kerr::inDomain)
                .maxSteps(3000);
        Map<Outcome, Integer> counts = new EnumMap<>(Outcome.class);
        for (int i = 0; i < 10_000; i++) {
            double[] state = state();
            counts.merge(tracer.trace(0, state, 100, 0.1), 1, Integer::sum);
            assertWell(state);
        }
        assertThat(counts.get(Outcome.COMPLETED)).isGreaterThan(1000);
        assertThat(counts.get(Outcome.LEFT_DOMAIN)).isGreaterThan(1000);
    }

    @Test
    void runsEndWell() {
        for (int i = 0; i < 300; i++) {
            Ending ending = new Run(new HamiltonianEquation(4, kerr::flow))
                    .integrator(IntegratorFactory.tolerances(1e-8, 1e-8))
                    .within(kerr::inDomain)
                    .maxEvaluations(20_000)
                    .follow(0, state(), 100);
            assertWell(ending.state());
            assertThat(ending.outcome()).isNotEqualTo(Outcome.EVENT);
        }
    }

    private void assertWell(double[] state) {
        for (double value : state) {
            assertThat(value).isFinite();
        }
        assertThat(kerr.inDomain(state)).isTrue();
    }
}
