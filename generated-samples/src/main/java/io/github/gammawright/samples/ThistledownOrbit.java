package io.github.gammawright.samples;

import io.github.gammawright.runtime.Causality;
import io.github.gammawright.runtime.GeodesicEquation;
import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.Normalization;
import io.github.gammawright.runtime.Root;
import io.github.gammawright.runtime.Signature;
import io.github.gammawright.samples.kernels.AmberStarGeodesicAcceleration;
import io.github.gammawright.samples.kernels.AmberStarMetric;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;

/**
 * The probe Thistledown, an invention, circles the amber star, another. It is let go at r = 40 in the star's equatorial
 * plane, and each time that it comes closest, where and when is noted. Lengths and times are in units of the star's mass
 * (G = c = 1).
 */
public final class ThistledownOrbit {

    private static final int DIMENSION = 4;
    private static final double START_RADIUS = 40;
    private static final double START_ANGULAR_VELOCITY = 0.0025;
    private static final double TOLERANCE = 1e-12;

    private final MetricTensor metric = new MetricTensor(DIMENSION, new AmberStarMetric()::evaluate);
    private final GeodesicEquation equation =
            new GeodesicEquation(DIMENSION, new AmberStarGeodesicAcceleration()::evaluate);

    /**
     * A closest approach.
     *
     * @param properTime on the probe's clock since the start
     * @param time the coordinate t
     * @param radius the coordinate r
     * @param azimuth the coordinate φ in radians, which keeps counting from orbit to orbit
     * @param energy −g_ti u^i, the same all the way but for errors
     */
    public record Periapsis(double properTime, double time, double radius, double azimuth, double energy) {}

    /** The state at the start: t, r, θ, φ, then their derivatives by the probe's proper time. */
    public double[] start() {
        double[] point = {0, START_RADIUS, Math.PI / 2, 0};
        double[] velocity = {0, 0, 0, START_ANGULAR_VELOCITY};
        new Normalization(metric, Signature.MOSTLY_PLUS)
                .solveTimeComponent(point, velocity, Causality.TIMELIKE, Root.LARGER);
        return equation.state(point, velocity);
    }

    /** The geodesic equation that the probe follows. */
    GeodesicEquation equation() {
        return equation;
    }

    /** The covariant components of the velocity in a state: −energy, radial momentum, 0 and angular momentum. */
    public double[] momentum(double[] state) {
        double[] momentum = new double[DIMENSION];
        metric.lower(Arrays.copyOf(state, DIMENSION), Arrays.copyOfRange(state, DIMENSION, 2 * DIMENSION), momentum);
        return momentum;
    }

    /**
     * Follows the probe.
     *
     * @param properTime how long, on its own clock
     * @return the closest approaches on the way, in order
     */
    public List<Periapsis> follow(double properTime) {
        List<Periapsis> found = new ArrayList<>();
        DormandPrince853Integrator integrator = new DormandPrince853Integrator(1e-6, 100, TOLERANCE, TOLERANCE);
        integrator.addEventDetector(new PeriapsisDetector(state -> found.add(periapsis(state))));
        integrator.integrate(equation, new ODEState(0, start()), properTime);
        return found;
    }

    private Periapsis periapsis(ODEStateAndDerivative state) {
        double[] y = state.getPrimaryState();
        return new Periapsis(state.getTime(), y[0], y[1], y[3], -momentum(y)[0]);
    }

    /** Prints the orbits of a run as a table. */
    public static void main(String[] arguments) {
        ThistledownOrbit orbit = new ThistledownOrbit();
        double energy = -orbit.momentum(orbit.start())[0];
        System.out.println("Thistledown round the amber star, closest approaches");
        System.out.println();
        System.out.println("orbit  proper time   coordinate time   radius   turned by (degrees)   energy off by");
        double azimuth = Double.NaN;
        int number = 0;
        for (Periapsis periapsis : orbit.follow(5000)) {
            number++;
            double advance = Math.toDegrees(periapsis.azimuth() - azimuth) - 360;
            System.out.printf(
                    Locale.ROOT,
                    "%5d  %11.3f  %16.3f  %7.4f  %20s  %14.1e%n",
                    number,
                    periapsis.properTime(),
                    periapsis.time(),
                    periapsis.radius(),
                    number == 1 ? "" : String.format(Locale.ROOT, "%.4f", advance),
                    periapsis.energy() - energy);
            azimuth = periapsis.azimuth();
        }
    }
}
