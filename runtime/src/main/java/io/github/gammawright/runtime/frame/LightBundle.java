package io.github.gammawright.runtime.frame;

import io.github.gammawright.runtime.DeviationEquation;
import io.github.gammawright.runtime.MetricTensor;
import java.util.Objects;

/**
 * The cross-section of a light bundle that two separations span (Sachs 1961; Schneider, Ehlers &amp; Falco 1992,
 * Gravitational Lenses, ch. 3; from memory). The bundle starts at a vertex, where ξ_1 = ξ_2 = 0 and Dξ_a/dλ are
 * orthonormal on the observer's screen.
 *
 * <p>Give each thread its own, with a metric tensor of its own.
 */
public final class LightBundle {

    private final MetricTensor metric;
    private final DeviationEquation equation;
    private final double[] point;
    private final double[] first;
    private final double[] second;

    /**
     * Takes the metric and the equation.
     *
     * @param metric the metric
     * @param equation an equation with at least two separations
     */
    public LightBundle(MetricTensor metric, DeviationEquation equation) {
        this.metric = Objects.requireNonNull(metric, "metric");
        this.equation = Objects.requireNonNull(equation, "equation");
        this.point = new double[metric.dimension()];
        this.first = new double[metric.dimension()];
        this.second = new double[metric.dimension()];
    }

    /**
     * The state of a bundle at its vertex.
     *
     * @param point where the light is seen or sent
     * @param light the velocity k^i of the light there
     * @param screen1 a unit vector orthogonal to k and to the observer's velocity
     * @param screen2 another, orthogonal to the first
     */
    public double[] vertex(double[] point, double[] light, double[] screen1, double[] screen2) {
        double[] zero = new double[point.length];
        return equation.state(point, light, zero, screen1, zero, screen2);
    }

    /**
     * The area of the cross-section over the solid angle at the vertex, always positive: the square root of the Gram
     * determinant of ξ_1 and ξ_2. It is the same on each observer's screen, since parts along k don't count.
     *
     * @param parameter the curve's parameter
     * @param state of the deviation equation; only read
     */
    public double areaPerSolidAngle(double parameter, double[] state) {
        equation.point(parameter, state, point);
        equation.separation(state, 0, first);
        equation.separation(state, 1, second);
        double a = metric.square(point, first);
        double b = metric.product(point, first, second);
        double c = metric.square(point, second);
        return Math.sqrt(Math.max(0, a * c - b * b));
    }

    /**
     * The angular-diameter distance from the vertex, √(area over solid angle), where the light has unit energy in the
     * frame of the observer at the vertex.
     *
     * @param parameter the curve's parameter
     * @param state of the deviation equation; only read
     */
    public double distance(double parameter, double[] state) {
        return Math.sqrt(areaPerSolidAngle(parameter, state));
    }

    /**
     * How much brighter a small source looks than without a lens: the square of the ratio of the distances.
     *
     * @param parameter the curve's parameter
     * @param state of the deviation equation; only read
     * @param unlensedDistance the angular-diameter distance that the source would have without the lens
     * @return infinite on a caustic
     */
    public double magnification(double parameter, double[] state, double unlensedDistance) {
        return unlensedDistance * unlensedDistance / areaPerSolidAngle(parameter, state);
    }
}
