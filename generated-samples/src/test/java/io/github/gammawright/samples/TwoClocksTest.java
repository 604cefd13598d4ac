package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Clocks on circular orbits go by dτ/dt = √(1 − 3M/r) (Misner, Thorne &amp; Wheeler 1973, sec. 25.5; from memory). */
class TwoClocksTest {

    @Test
    void clocksOnCircularOrbitsGoSlow() {
        double[] times = {0, 10, 500, 1234.5};
        for (double radius : new double[] {TwoClocks.HERON, TwoClocks.PLOVER}) {
            double[] properTimes = new TwoClocks().properTimes(radius, times);
            assertThat(properTimes[0]).isZero();
            for (int i = 1; i < times.length; i++) {
                assertThat(properTimes[i] / times[i]).isCloseTo(Math.sqrt(1 - 3 / radius), within(1e-11));
            }
        }
    }
}
