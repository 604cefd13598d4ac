package io.github.gammawright.samples;

import io.github.gammawright.runtime.Causality;
import io.github.gammawright.runtime.GeodesicEquation;
import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.Normalization;
import io.github.gammawright.runtime.Signature;
import io.github.gammawright.runtime.orbit.Direction;
import io.github.gammawright.runtime.orbit.Event;
import io.github.gammawright.runtime.orbit.Run;
import io.github.gammawright.samples.kernels.SchwarzschildGeodesicAcceleration;
import io.github.gammawright.samples.kernels.SchwarzschildMetric;
import java.nio.file.Path;
import org.knowm.xchart.XYChart;

/**
 * The ferries Heron and Plover, inventions, circle the same black hole at r = 8 M and r = 24 M, and compare their clocks
 * with the time t of an observer far away. Lengths and times are in units of the hole's mass.
 */
final class TwoClocks {

    static final double HERON = 8;
    static final double PLOVER = 24;

    private static final double TIME = 2000;
    private static final int SAMPLES = 100;

    private final MetricTensor metric = new MetricTensor(4, new SchwarzschildMetric(1)::evaluate);
    private final SchwarzschildGeodesicAcceleration kernel = new SchwarzschildGeodesicAcceleration(1);

    /**
     * A clock's proper time on a circular orbit.
     *
     * @param radius of the orbit
     * @param times the values of t, rising
     * @return the proper time at each, from 0 at t = 0
     */
    double[] properTimes(double radius, double[] times) {
        double[] result = new double[times.length];
        double[] point = {0, radius, Math.PI / 2, 0};
        double[] velocity = {1, 0, 0, Math.pow(radius, -1.5)};
        new Normalization(metric, Signature.MOSTLY_PLUS).rescale(point, velocity, Causality.TIMELIKE);
        GeodesicEquation equation = new GeodesicEquation(4, kernel::evaluate);
        double properTime = 0;
        double[] state = equation.state(point, velocity);
        for (int i = 0; i < times.length; i++) {
            if (times[i] > state[0]) {
                var ending = new Run(equation)
                        .within(kernel::inDomain)
                        .watch(Event.surface("t", 0, times[i], Direction.INCREASING)
                                .stop())
                        .follow(properTime, state, properTime + 2 * (times[i] - state[0]));
                properTime = ending.parameter();
                state = ending.state();
            }
            result[i] = properTime;
        }
        return result;
    }

    /** Writes the picture. */
    void draw(Path picture) {
        double[] times = new double[SAMPLES + 1];
        for (int i = 0; i <= SAMPLES; i++) {
            times[i] = TIME * i / SAMPLES;
        }
        XYChart chart = Plots.plot(
                "Two ferries' clocks behind that of an observer far away",
                "coordinate time t [M]",
                "t − τ [M]",
                900,
                600);
        Plots.line(chart, "Heron, r = 8 M", times, lag(times, properTimes(HERON, times)));
        Plots.line(chart, "Plover, r = 24 M", times, lag(times, properTimes(PLOVER, times)));
        Plots.save(chart, picture);
    }

    private static double[] lag(double[] times, double[] properTimes) {
        double[] result = new double[times.length];
        for (int i = 0; i < times.length; i++) {
            result[i] = times[i] - properTimes[i];
        }
        return result;
    }
}
