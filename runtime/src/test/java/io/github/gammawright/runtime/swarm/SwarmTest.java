package io.github.gammawright.runtime.swarm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.sun.management.ThreadMXBean;
import io.github.gammawright.runtime.HamiltonianEquation;
import io.github.gammawright.runtime.KerrByHand;
import io.github.gammawright.runtime.orbit.Direction;
import io.github.gammawright.runtime.orbit.Ending;
import io.github.gammawright.runtime.orbit.Event;
import io.github.gammawright.runtime.orbit.Outcome;
import io.github.gammawright.runtime.orbit.Run;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.lang.management.ManagementFactory;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class SwarmTest {

    private static final double SPIN = 0.9;
    private static final double HORIZON = 1 + Math.sqrt(1 - SPIN * SPIN);
    private static final int SKY = 0;
    private static final int HOLE = 1;

    private final KerrByHand kerr = new KerrByHand(SPIN);

    private RayTracer tracer() {
        return new RayTracer(new HamiltonianEquation(4, kerr::flow), 1e-10, 1e-10)
                .within(kerr::inDomain)
                .until("sky", (parameter, y) -> y[1] - 60, Direction.INCREASING)
                .until("hole", (parameter, y) -> y[1] - 1.01 * HORIZON, Direction.DECREASING);
    }

    /** Light in the equatorial plane, from r = 50 inwards, with impact parameter b and energy 1. */
    private static void light(double b, double[] state) {
        double r = 50;
        double delta = r * r - 2 * r + SPIN * SPIN;
        double q = r * r + SPIN * SPIN - SPIN * b;
        double radial = q * q - delta * (b - SPIN) * (b - SPIN);
        java.util.Arrays.fill(state, 0);
        state[1] = r;
        state[2] = Math.PI / 2;
        state[4] = -1;
        state[5] = -Math.sqrt(radial) / delta;
        state[7] = b;
    }

    private final class Task implements RayTask {

        private final RayTracer tracer = tracer();

        @Override
        public void prepare(int index, double[] initial) {
            light(-12 + 24.0 * index / 1000, initial);
            if (index % 400 == 399) {
                initial[1] = Double.NaN;
            }
        }

        @Override
        public void follow(int index, double[] state, double[] result) {
            tracer.trace(0, state, 1000, 0.1);
            result[0] = tracer.surface();
            result[1] = state[3];
        }
    }

    /**
     * Light is caught between the impact parameters of the two photon orbits, −6.832319230446667 and 2.844421403476169 for
     * a = 0.9 (Bardeen, Press &amp; Teukolsky 1972; Bardeen 1973; from memory).
     */
    @Test
    void lightIsCaughtBetweenTheTwoPhotonOrbits() {
        RayTracer tracer = tracer();
        double[] state = new double[8];
        int[] expected = {SKY, HOLE, HOLE, SKY};
        double[] impact = {-6.8323193, -6.8323191, 2.8444213, 2.8444215};
        for (int i = 0; i < 4; i++) {
            light(impact[i], state);
            assertThat(tracer.trace(0, state, 1000, 0.1)).isEqualTo(Outcome.EVENT);
            assertThat(tracer.surface()).isEqualTo(expected[i]);
        }
        assertThat(tracer.surfaceName()).isEqualTo("sky");
    }

    @Test
    void theTracerAgreesWithARun() {
        RayTracer tracer = tracer();
        for (double b : new double[] {-11, -8, 4, 7}) {
            double[] state = new double[8];
            light(b, state);
            Event sky = Event.surface("sky", 1, 60, Direction.INCREASING).stop();
            Ending exact =
                    new Run(new HamiltonianEquation(4, kerr::flow)).watch(sky).follow(0, state, 1000);
            assertThat(tracer.trace(0, state, 1000, 0.1)).isEqualTo(Outcome.EVENT);
            assertThat(tracer.parameter()).isCloseTo(exact.parameter(), within(1e-6));
            assertThat(state[1]).isCloseTo(60, within(1e-9));
            assertThat(state[3]).isCloseTo(exact.state()[3], within(1e-7));
            // And back to where it came from.
            double[] back = state.clone();
            assertThat(tracer.trace(exact.parameter(), back, 0, 1)).isEqualTo(Outcome.COMPLETED);
            assertThat(back[1]).isCloseTo(50, within(1e-6));
        }
    }

    @Test
    void everyCurveEndsInANamedOutcome() {
        double[] state = new double[8];
        RayTracer bare = new RayTracer(new HamiltonianEquation(4, kerr::flow), 1e-10, 1e-10).within(kerr::inDomain);
        light(0, state);
        assertThat(bare.trace(0, state, 1000, 0.1)).isEqualTo(Outcome.LEFT_DOMAIN);
        assertThat(state[1]).isBetween(HORIZON, HORIZON + 1e-4);
        assertThat(bare.surface()).isEqualTo(-1);
        assertThat(bare.surfaceName()).isEmpty();
        light(0, state);
        assertThat(bare.maxSteps(5).trace(0, state, 1000, 0.1)).isEqualTo(Outcome.TOO_MANY_EVALUATIONS);
        assertThat(bare.trace(0, state, 0, 0.1)).isEqualTo(Outcome.COMPLETED);
        assertThatThrownBy(() -> bare.trace(0, new double[8], 1, 0.1)).hasMessageContaining("outside the domain");
        // A disc with a hole in it: only the filter lets the ray end.
        RayTracer disc = tracer().until(
                        "disc", (parameter, y) -> y[2] - Math.PI / 2, Direction.BOTH, y -> y[1] > 6 && y[1] < 20);
        light(9, state);
        state[2] = 1.2;
        assertThat(disc.trace(0, state, 1000, 0.1)).isEqualTo(Outcome.EVENT);
        assertThat(disc.surfaceName()).isIn("disc", "sky");
    }

    @Test
    void resultsDoNotDependOnTheNumberOfThreads() {
        SwarmResult one = new Swarm(8, 2, Task::new).threads(1).chunk(1000).follow(1000);
        List<Integer> counts = new ArrayList<>();
        SwarmResult four = new Swarm(8, 2, Task::new)
                .threads(4)
                .chunk(7)
                .tell((done, total) -> counts.add(done))
                .follow(1000);
        assertThat(one.complete()).isTrue();
        assertThat(four.complete()).isTrue();
        assertThat(counts).isSorted().endsWith(1000).hasSize(143);
        int compared = 0;
        for (int i = 0; i < 1000; i++) {
            assertThat(four.done(i)).isEqualTo(one.done(i));
            if (one.done(i)) {
                assertThat(four.value(i, 0)).isEqualTo(one.value(i, 0));
                assertThat(four.value(i, 1)).isEqualTo(one.value(i, 1));
                compared++;
            }
        }
        assertThat(compared).isEqualTo(998);
    }

    @Test
    void aFailureIsReportedWithItsInitialData() {
        SwarmResult result = new Swarm(8, 2, Task::new).follow(1000);
        assertThat(result.failures()).extracting(RayFailure::index).containsExactly(399, 799);
        RayFailure failure = result.failures().get(0);
        assertThat(failure.initial()[7]).isCloseTo(-12 + 24 * 0.399, within(1e-12));
        assertThat(failure.toString()).startsWith("ray 399 from [0.0, NaN").contains("outside the domain");
        assertThat(result.done(399)).isFalse();
        assertThat(result.done(398)).isTrue();
        assertThatThrownBy(() -> result.value(399, 0)).isInstanceOf(IllegalStateException.class);
        assertThat(result.count()).isEqualTo(1000);
        assertThat(result.width()).isEqualTo(2);
    }

    @Test
    void aSwarmCanBeCancelled() {
        Swarm swarm = new Swarm(8, 2, Task::new).threads(2).chunk(5);
        SwarmResult result = swarm.tell((done, total) -> {
                    if (done >= 50) {
                        swarm.cancel();
                    }
                })
                .follow(1000);
        assertThat(result.complete()).isFalse();
        int done = 0;
        for (int i = 0; i < 1000; i++) {
            done += result.done(i) ? 1 : 0;
        }
        assertThat(done).isBetween(50, 80);
    }

    @Test
    void tracingAllocatesNothing() {
        RayTracer tracer = tracer();
        double[] state = new double[8];
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        for (int i = 0; i < 10; i++) {
            light(7, state);
            tracer.trace(0, state, 1000, 0.1);
        }
        long before = threads.getCurrentThreadAllocatedBytes();
        long steps = 0;
        for (int i = 0; i < 500; i++) {
            light(7 + i * 0.001, state);
            tracer.trace(0, state, 1000, 0.1);
            steps += tracer.steps();
        }
        assertThat((threads.getCurrentThreadAllocatedBytes() - before) / steps).isZero();
    }

    /** The error falls as the fourth to fifth power of the step, also between the steps. */
    @Test
    void stepsAndInterpolationHaveTheirOrders() {
        HamiltonianEquation oscillator = new HamiltonianEquation(1, (x, p, result) -> {
            result[0] = p[0];
            result[1] = -x[0];
        });
        double[] ends = new double[2];
        double[] between = new double[2];
        double[] found = new double[2];
        for (int k = 0; k < 2; k++) {
            double h = k == 0 ? 0.4 : 0.2;
            DormandPrince method = new DormandPrince(oscillator, 1, 1);
            method.start(0, new double[] {1, 0}, h);
            method.attempt();
            method.interpolate(0.6, found);
            between[k] = Math.hypot(found[0] - Math.cos(0.6 * h), found[1] + Math.sin(0.6 * h));
            method.accept();
            ends[k] = Math.hypot(method.state()[0] - Math.cos(h), method.state()[1] + Math.sin(h));
            assertThat(method.parameter()).isEqualTo(h);
            assertThat(method.taken()).isEqualTo(h);
        }
        // One step of a method of order p errs by h to the p + 1.
        assertThat(Math.log(ends[0] / ends[1]) / Math.log(2)).isCloseTo(6, within(0.4));
        assertThat(Math.log(between[0] / between[1]) / Math.log(2)).isCloseTo(5, within(0.4));
        assertThatThrownBy(() -> new DormandPrince(oscillator, 0, 0)).hasMessageContaining("tolerances");
    }

    @Test
    void theBarFills() {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        ProgressBar bar = new ProgressBar(new PrintStream(bytes, true, StandardCharsets.UTF_8), "rays");
        bar.progress(0, 10);
        bar.progress(5, 10);
        bar.progress(5, 10);
        bar.progress(10, 10);
        String text = bytes.toString(StandardCharsets.UTF_8);
        assertThat(text.split("\r")).hasSize(4);
        assertThat(text).contains("rays [" + "=".repeat(20) + " ".repeat(20) + "]  50.0 %");
        assertThat(text).endsWith("100.0 %" + System.lineSeparator());
        ProgressBar.onTerminal("nothing here").progress(1, 2);
    }

    @Test
    void wrongSettingsAreRefused() {
        assertThatThrownBy(() -> new Swarm(8, 2, Task::new).threads(0)).hasMessageContaining("0 threads");
        assertThatThrownBy(() -> new Swarm(8, 2, Task::new).chunk(0)).hasMessageContaining("0 rays");
        assertThatThrownBy(() -> new Swarm(8, 2, Task::new).follow(Integer.MAX_VALUE))
                .hasMessageContaining("fit");
        assertThat(new Swarm(8, 2, Task::new).follow(0).complete()).isTrue();
    }
}
