package io.github.gammawright.runtime.conserved;

import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.StateFunction;
import java.util.Objects;

/**
 * A constant of the motion. The ready-made ones hold memory of their own: give each thread its own.
 *
 * @param name what reports call it
 * @param function its value in a state
 */
public record ConservedQuantity(String name, StateFunction function) {

    /** Checks that both are there. */
    public ConservedQuantity {
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(function, "function");
    }

    /** The square g_ij u^i u^j of the velocity, for states that begin with point and velocity. */
    public static ConservedQuantity norm(MetricTensor metric) {
        int n = metric.dimension();
        double[] point = new double[n];
        double[] velocity = new double[n];
        return new ConservedQuantity("norm", (parameter, state) -> {
            System.arraycopy(state, 0, point, 0, n);
            System.arraycopy(state, n, velocity, 0, n);
            return metric.square(point, velocity);
        });
    }

    /**
     * The momentum g_ij u^j of a cyclic coordinate, one that the metric does not depend on, for states that begin with
     * point and velocity. That of the time is minus the energy in the signature −+++.
     *
     * @param name what reports call it
     * @param metric the metric
     * @param index the number i of the coordinate
     */
    public static ConservedQuantity cyclicMomentum(String name, MetricTensor metric, int index) {
        int n = metric.dimension();
        Objects.checkIndex(index, n);
        double[] point = new double[n];
        double[] velocity = new double[n];
        double[] momentum = new double[n];
        return new ConservedQuantity(name, (parameter, state) -> {
            System.arraycopy(state, 0, point, 0, n);
            System.arraycopy(state, n, velocity, 0, n);
            metric.lower(point, velocity, momentum);
            return momentum[index];
        });
    }

    /**
     * A function of point and momentum, such as Carter's constant, for states that begin with point and velocity.
     *
     * @param name what reports call it
     * @param metric lowers the velocity's index
     * @param function the value at a point and covariant momentum
     */
    public static ConservedQuantity ofVelocity(String name, MetricTensor metric, PhaseFunction function) {
        int n = metric.dimension();
        double[] point = new double[n];
        double[] velocity = new double[n];
        double[] momentum = new double[n];
        return new ConservedQuantity(name, (parameter, state) -> {
            System.arraycopy(state, 0, point, 0, n);
            System.arraycopy(state, n, velocity, 0, n);
            metric.lower(point, velocity, momentum);
            return function.value(point, momentum);
        });
    }

    /**
     * A function of point and momentum, for states that begin with point and momentum.
     *
     * @param name what reports call it
     * @param n how many coordinates there are
     * @param function the value at a point and covariant momentum
     */
    public static ConservedQuantity ofMomentum(String name, int n, PhaseFunction function) {
        double[] point = new double[n];
        double[] momentum = new double[n];
        return new ConservedQuantity(name, (parameter, state) -> {
            System.arraycopy(state, 0, point, 0, n);
            System.arraycopy(state, n, momentum, 0, n);
            return function.value(point, momentum);
        });
    }

    /** The momentum p_i of a cyclic coordinate, for states that begin with point and momentum. */
    public static ConservedQuantity momentum(String name, int n, int index) {
        Objects.checkIndex(index, n);
        return new ConservedQuantity(name, StateFunction.entry(n + index));
    }
}
