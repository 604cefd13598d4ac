package io.github.gammawright.runtime.swarm;

import io.github.gammawright.runtime.CurveEquation;
import java.util.Objects;

/**
 * The method of order 5 with an error estimate of order 4 and interpolation of order 4 (Dormand &amp; Prince 1980; Shampine
 * 1986; Hairer, Nørsett &amp; Wanner 1993, Solving Ordinary Differential Equations I, sec. II.5 and II.6; from memory), for
 * many short curves: it allocates nothing after its construction. Not for several threads at once.
 */
public final class DormandPrince {

    private static final double SAFETY = 0.9;
    private static final double SHRINK = 0.2;
    private static final double GROW = 8;

    private final CurveEquation equation;
    private final int n;
    private final double absolute;
    private final double relative;
    private final double[] k1;
    private final double[] k2;
    private final double[] k3;
    private final double[] k4;
    private final double[] k5;
    private final double[] k6;
    private final double[] k7;
    private final double[] y;
    private final double[] next;
    private final double[] stage;
    private double parameter;
    private double step;
    private double taken;
    private double factor;

    /**
     * Prepares steps.
     *
     * @param equation the system
     * @param absolute the error that a step may have in an entry of any size
     * @param relative the error beside that, over the size of the entry
     */
    public DormandPrince(CurveEquation equation, double absolute, double relative) {
        this.equation = Objects.requireNonNull(equation, "equation");
        if (!(absolute >= 0 && relative >= 0 && absolute + relative > 0)) {
            throw new IllegalArgumentException("tolerances can't be " + absolute + " and " + relative);
        }
        this.absolute = absolute;
        this.relative = relative;
        n = equation.getDimension();
        k1 = new double[n];
        k2 = new double[n];
        k3 = new double[n];
        k4 = new double[n];
        k5 = new double[n];
        k6 = new double[n];
        k7 = new double[n];
        y = new double[n];
        next = new double[n];
        stage = new double[n];
    }

    /**
     * Sets where to start.
     *
     * @param start the parameter
     * @param state only read
     * @param firstStep how long the first step is tried, not 0; negative to go back
     */
    public void start(double start, double[] state, double firstStep) {
        System.arraycopy(state, 0, y, 0, n);
        parameter = start;
        step = firstStep;
        equation.derivatives(parameter, y, k1);
    }

    /**
     * Tries a step of the length at hand. It is not taken yet: see {@link #accept} and {@link #reject}.
     *
     * @return the estimated error over the tolerance, at most 1 where the step is good; NaN or infinite where something is
     *     not finite
     */
    public double attempt() {
        double h = step;
        for (int i = 0; i < n; i++) {
            stage[i] = y[i] + h * (1.0 / 5 * k1[i]);
        }
        equation.derivatives(parameter + h / 5, stage, k2);
        for (int i = 0; i < n; i++) {
            stage[i] = y[i] + h * (3.0 / 40 * k1[i] + 9.0 / 40 * k2[i]);
        }
        equation.derivatives(parameter + 3 * h / 10, stage, k3);
        for (int i = 0; i < n; i++) {
            stage[i] = y[i] + h * (44.0 / 45 * k1[i] - 56.0 / 15 * k2[i] + 32.0 / 9 * k3[i]);
        }
        equation.derivatives(parameter + 4 * h / 5, stage, k4);
        for (int i = 0; i < n; i++) {
            stage[i] = y[i]
                    + h
                            * (19372.0 / 6561 * k1[i]
                                    - 25360.0 / 2187 * k2[i]
                                    + 64448.0 / 6561 * k3[i]
                                    - 212.0 / 729 * k4[i]);
        }
        equation.derivatives(parameter + 8 * h / 9, stage, k5);
        for (int i = 0; i < n; i++) {
            stage[i] = y[i]
                    + h
                            * (9017.0 / 3168 * k1[i]
                                    - 355.0 / 33 * k2[i]
                                    + 46732.0 / 5247 * k3[i]
                                    + 49.0 / 176 * k4[i]
                                    - 5103.0 / 18656 * k5[i]);
        }
        equation.derivatives(parameter + h, stage, k6);
        for (int i = 0; i < n; i++) {
            next[i] = y[i]
                    + h
                            * (35.0 / 384 * k1[i]
                                    + 500.0 / 1113 * k3[i]
                                    + 125.0 / 192 * k4[i]
                                    - 2187.0 / 6784 * k5[i]
                                    + 11.0 / 84 * k6[i]);
        }
        equation.derivatives(parameter + h, next, k7);
        double sum = 0;
        for (int i = 0; i < n; i++) {
            double error = h
                    * (71.0 / 57600 * k1[i]
                            - 71.0 / 16695 * k3[i]
                            + 71.0 / 1920 * k4[i]
                            - 17253.0 / 339200 * k5[i]
                            + 22.0 / 525 * k6[i]
                            - 1.0 / 40 * k7[i]);
            double scaled = error / (absolute + relative * Math.max(Math.abs(y[i]), Math.abs(next[i])));
            sum += scaled * scaled;
        }
        double error = Math.sqrt(sum / n);
        factor = error == 0 ? GROW : SAFETY * Math.pow(error, -0.2);
        return error;
    }

    /** Takes the step that was tried, and sets the length of the next one by its error. */
    public void accept() {
        System.arraycopy(next, 0, y, 0, n);
        System.arraycopy(k7, 0, k1, 0, n);
        parameter += step;
        taken = step;
        step *= Math.max(SHRINK, Math.min(GROW, factor));
    }

    /** Drops the step that was tried, and sets a shorter length by its error. */
    public void reject() {
        // NaN must shrink too.
        step *= factor > SHRINK ? Math.min(factor, SAFETY) : SHRINK;
    }

    /** Drops the step that was tried, and sets its length times a factor. */
    public void reject(double shrink) {
        step *= shrink;
    }

    /** The length at hand for the next step. */
    public double step() {
        return step;
    }

    /** Sets the length of the next step. */
    public void step(double length) {
        step = length;
    }

    /** The parameter now. */
    public double parameter() {
        return parameter;
    }

    /** The state now; belongs to this object, only to be read. */
    public double[] state() {
        return y;
    }

    /** The state at the end of the step that was tried; belongs to this object, only to be read. */
    public double[] attempted() {
        return next;
    }

    /** The length of the last step that was taken. */
    public double taken() {
        return taken;
    }

    /**
     * Interpolates within the step that was tried and not yet accepted.
     *
     * @param part 0 at its start, 1 at its end
     * @param target receives the state
     */
    public void interpolate(double part, double[] target) {
        double rest = 1 - part;
        for (int i = 0; i < n; i++) {
            double difference = next[i] - y[i];
            double first = step * k1[i] - difference;
            double second = difference - step * k7[i] - first;
            double third = step
                    * (-12715105075.0 / 11282082432.0 * k1[i]
                            + 87487479700.0 / 32700410799.0 * k3[i]
                            - 10690763975.0 / 1880347072.0 * k4[i]
                            + 701980252875.0 / 199316789632.0 * k5[i]
                            - 1453857185.0 / 822651844.0 * k6[i]
                            + 69997945.0 / 29380423.0 * k7[i]);
            target[i] = y[i] + part * (difference + rest * (first + part * (second + rest * third)));
        }
    }
}
