package io.github.gammawright.samples;

import io.github.gammawright.runtime.GeodesicEquation;
import io.github.gammawright.runtime.orbit.TrajectorySink;
import io.github.gammawright.runtime.symplectic.GaussLegendre;
import io.github.gammawright.samples.kernels.EllipsoidOfRevolutionGeodesicAcceleration;
import io.github.gammawright.samples.kernels.EllipsoidOfRevolutionMetric;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.knowm.xchart.XYChart;

/**
 * The direct problem of geodesy: from a point on an ellipsoid a given way into a given direction. By default on WGS84; for
 * research, not for navigation.
 */
final class ShortestWay {

    /** Steps for a length of a; so short that a way a degree from a pole is followed to nanometres. */
    private static final int STEPS = 4096;

    /** Each so many steps a state is handed on. */
    private static final int STRIDE = 64;

    private final EllipsoidOfRevolutionMetric metric;
    private final EllipsoidOfRevolutionGeodesicAcceleration acceleration;
    private final double size;

    /** On the ellipsoid of WGS84. */
    ShortestWay() {
        this(6378137, 1 / 298.257223563);
    }

    /** On an ellipsoid of equatorial radius a in metres and flattening f. */
    ShortestWay(double a, double f) {
        metric = new EllipsoidOfRevolutionMetric(a, f);
        acceleration = new EllipsoidOfRevolutionGeodesicAcceleration(a, f);
        size = a;
    }

    /**
     * Follows the geodesic by collocation, whose compensated sums lose no digits however many steps there are. The parameter
     * is the length over a, so that all entries of the state are of size 1.
     *
     * @param latitude at the start, in radians
     * @param longitude at the start, in radians
     * @param azimuth at the start, in radians from north over east
     * @param length in metres
     * @param sink takes states on the way: latitude, longitude and their rates
     * @return latitude and longitude in radians at the end, and the azimuth there, all in radians
     */
    double[] follow(double latitude, double longitude, double azimuth, double length, TrajectorySink sink) {
        double[] g = metric.valuesAt(new double[] {latitude, longitude});
        GeodesicEquation equation = new GeodesicEquation(2, acceleration::evaluate);
        double[] start = equation.state(
                new double[] {latitude, longitude},
                new double[] {size * Math.cos(azimuth) / Math.sqrt(g[0]), size * Math.sin(azimuth) / Math.sqrt(g[3])});
        int steps = (int) Math.ceil(length / size * STEPS) + 1;
        GaussLegendre method = new GaussLegendre(equation, 6, length / size / steps);
        method.start(0, start);
        double[] end = start.clone();
        sink.accept(0, end);
        for (int i = 1; i <= steps; i++) {
            if (!method.advance() || !acceleration.inDomain(new double[] {method.state(0), method.state(1)})) {
                throw new IllegalArgumentException("the way leads over a pole, where longitudes end");
            }
            method.copyState(end);
            if (i % STRIDE == 0 || i == steps) {
                sink.accept(method.parameter(), end);
            }
        }
        double[] there = metric.valuesAt(new double[] {end[0], end[1]});
        double north = end[2] * Math.sqrt(there[0]);
        double east = end[3] * Math.sqrt(there[3]);
        return new double[] {end[0], end[1], Math.atan2(east, north)};
    }

    /** Draws the way of an invented balloon race, 10,000 km from 40° N into the direction 30°. */
    double[] draw(Path picture) {
        List<double[]> way = new ArrayList<>();
        double[] end =
                follow(Math.toRadians(40), 0, Math.toRadians(30), 1e7, (parameter, state) -> way.add(state.clone()));
        double[] latitude = new double[way.size()];
        double[] longitude = new double[way.size()];
        for (int i = 0; i < way.size(); i++) {
            latitude[i] = Math.toDegrees(way.get(i)[0]);
            longitude[i] = Math.toDegrees(way.get(i)[1]);
        }
        XYChart chart = Plots.plot(
                "The balloon race from Alderwick: 10,000 km on the WGS84 ellipsoid",
                "longitude λ [°]",
                "latitude φ [°]",
                900,
                600);
        Plots.line(chart, "shortest way", longitude, latitude);
        Plots.save(chart, picture);
        return end;
    }
}
