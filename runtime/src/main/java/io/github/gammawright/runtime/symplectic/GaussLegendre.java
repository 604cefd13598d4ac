package io.github.gammawright.runtime.symplectic;

import io.github.gammawright.runtime.CurveEquation;
import java.util.Objects;

/**
 * Gauss–Legendre collocation of order 4 or 6 with fixed steps: symplectic and time-reversible, for systems of any form
 * (Hairer, Lubich &amp; Wanner 2006, Geometric Numerical Integration, sec. II.1.3, VI.4, VIII.6; from memory). Energies and
 * other constants of the motion then move to and fro and have no trend, as long as the step is small enough.
 *
 * <p>The stages are found by fixed-point iteration, started from the polynomial of the step before, until they no longer
 * change or the changes no longer shrink; the state is summed with compensation, and coefficients come in two parts, so that
 * rounding has no trend either (Hairer, McLachlan &amp; Razakarivony 2008, Achieving Brouwer's law with implicit Runge–Kutta
 * methods; from memory).
 *
 * <p>Nothing is allocated in a step. Not for several threads at once.
 */
public final class GaussLegendre {

    private static final int MAX_ITERATIONS = 60;

    private final CurveEquation equation;
    private final int order;
    private final int stages;
    private final int length;
    private final double step;

    private final double[][] a;
    private final double[][] low;
    private final double[] c;
    private final double[] weights;
    private final double divisor;
    private final double[][] extrapolation;

    private final double[] state;
    private final double[] compensation;
    private final double[][] z; // stage values minus the state
    private final double[][] k; // derivatives at the stages
    private final double[][] guess;
    private final double[] work;
    private final double[] scale;
    private double parameter;
    private double parameterCompensation;
    private boolean fresh;
    private long iterations;
    private long steps;

    /**
     * Prepares an integration.
     *
     * @param equation the system, best one in the form of Hamilton
     * @param order 4 or 6
     * @param step the step of the parameter, not 0; negative to go back
     * @throws IllegalArgumentException for another order or step
     */
    public GaussLegendre(CurveEquation equation, int order, double step) {
        this.equation = Objects.requireNonNull(equation, "equation");
        if (order != 4 && order != 6) {
            throw new IllegalArgumentException("the order is 4 or 6, not " + order);
        }
        if (!Double.isFinite(step) || step == 0) {
            throw new IllegalArgumentException("a step can't be " + step);
        }
        this.order = order;
        this.step = step;
        this.stages = order / 2;
        this.length = equation.getDimension();
        GaussTableau tableau = GaussTableau.ofOrder(order);
        c = tableau.c();
        a = tableau.a();
        low = tableau.low();
        weights = tableau.weights();
        divisor = tableau.divisor();
        extrapolation = tableau.extrapolation();
        state = new double[length];
        compensation = new double[length];
        z = new double[stages][length];
        k = new double[stages][length];
        guess = new double[stages][length];
        work = new double[length];
        scale = new double[length];
    }

    /** The order of the method. */
    public int order() {
        return order;
    }

    /** The step of the parameter. */
    public double step() {
        return step;
    }

    /**
     * Sets where to start.
     *
     * @param start the parameter
     * @param from the state; only read
     * @throws IllegalArgumentException if it is not as long as the equation's states
     */
    public void start(double start, double[] from) {
        if (from.length != length) {
            throw new IllegalArgumentException("a state has " + length + " entries, not " + from.length);
        }
        System.arraycopy(from, 0, state, 0, length);
        java.util.Arrays.fill(compensation, 0);
        parameter = start;
        parameterCompensation = 0;
        fresh = true;
        iterations = 0;
        steps = 0;
    }

    /**
     * Makes one step.
     *
     * @return whether it was made; it is not, and all stays as it was, where the stages don't converge or the derivatives
     *     are not finite: the step is too large there, or the domain ends
     */
    public boolean advance() {
        predict();
        if (!iterate()) {
            return false;
        }
        for (int i = 0; i < length; i++) {
            double sum = 0;
            for (int s = 0; s < stages; s++) {
                sum += weights[s] * k[s][i];
            }
            double increment = step * sum / divisor + compensation[i];
            double next = state[i] + increment;
            compensation[i] = (state[i] - next) + increment;
            state[i] = next;
        }
        double increment = step + parameterCompensation;
        double next = parameter + increment;
        parameterCompensation = (parameter - next) + increment;
        parameter = next;
        fresh = false;
        steps++;
        return true;
    }

    /** The stages' first values: from the polynomial through the stages of the step before. */
    private void predict() {
        if (fresh) {
            equation.derivatives(parameter, state, work);
            for (int s = 0; s < stages; s++) {
                for (int i = 0; i < length; i++) {
                    z[s][i] = step * c[s] * work[i];
                }
            }
            return;
        }
        for (int s = 0; s < stages; s++) {
            double[] row = extrapolation[s];
            double[] target = guess[s];
            for (int i = 0; i < length; i++) {
                double sum = 0;
                for (int q = 0; q < stages; q++) {
                    sum += row[q] * k[q][i];
                }
                target[i] = step * sum;
            }
        }
        for (int s = 0; s < stages; s++) {
            System.arraycopy(guess[s], 0, z[s], 0, length);
        }
    }

    private boolean iterate() {
        for (int i = 0; i < length; i++) {
            scale[i] = 1 / (1 + Math.abs(state[i]));
        }
        double before = Double.POSITIVE_INFINITY;
        for (int round = 0; round < MAX_ITERATIONS; round++) {
            for (int s = 0; s < stages; s++) {
                double[] zs = z[s];
                for (int i = 0; i < length; i++) {
                    work[i] = state[i] + zs[i];
                }
                equation.derivatives(parameter + c[s] * step, work, k[s]);
            }
            iterations++;
            double change = update();
            if (Double.isNaN(change)) {
                return false;
            }
            // Either nothing moves any more, or what moves is rounding: small, and no longer shrinking.
            if (change == 0 || (change >= before && change < 1e-10)) {
                return true;
            }
            before = change;
        }
        return false;
    }

    /** New stage values from the derivatives; the largest change, over the size of the entry or 1. */
    private double update() {
        double largest = 0;
        for (int s = 0; s < stages; s++) {
            combine(low[s], a[s]);
            double[] zs = z[s];
            for (int i = 0; i < length; i++) {
                double value = step * work[i];
                double change = Math.abs(value - zs[i]) * scale[i];
                // Written so that NaN is taken on.
                largest = change <= largest ? largest : change;
                zs[i] = value;
            }
        }
        return largest;
    }

    /** The stages' derivatives, summed with small weights first and then with large ones, into the work array. */
    private void combine(double[] small, double[] large) {
        double[] k0 = k[0];
        double[] k1 = k[1];
        double s0 = small[0];
        double s1 = small[1];
        double l0 = large[0];
        double l1 = large[1];
        if (stages == 2) {
            for (int i = 0; i < work.length; i++) {
                work[i] = s0 * k0[i] + s1 * k1[i] + l0 * k0[i] + l1 * k1[i];
            }
            return;
        }
        double[] k2 = k[2];
        double s2 = small[2];
        double l2 = large[2];
        for (int i = 0; i < work.length; i++) {
            work[i] = s0 * k0[i] + s1 * k1[i] + s2 * k2[i] + l0 * k0[i] + l1 * k1[i] + l2 * k2[i];
        }
    }

    /** The parameter now. */
    public double parameter() {
        return parameter;
    }

    /** Copies the state now into an array. */
    public void copyState(double[] target) {
        System.arraycopy(state, 0, target, 0, length);
    }

    /** Entry i of the state now. */
    public double state(int i) {
        return state[i];
    }

    /** How many rounds of fixed-point iteration there were since the start; each takes one evaluation for each stage. */
    public long iterations() {
        return iterations;
    }

    /** How many steps were made since the start. */
    public long steps() {
        return steps;
    }
}
