package io.github.gammawright.runtime.orbit;

import io.github.gammawright.runtime.CurveEquation;
import io.github.gammawright.runtime.Domain;
import org.hipparchus.ode.OrdinaryDifferentialEquation;

/** An equation that refuses points outside the domain and derivatives that are not finite, before they do harm. */
final class GuardedEquation implements OrdinaryDifferentialEquation {

    /** Thrown through the integrator and caught by the run; it has no trace, being no error. */
    static final class LeftDomain extends RuntimeException {

        private static final long serialVersionUID = 1L;

        LeftDomain() {
            super("left the domain", null, false, false);
        }
    }

    private final CurveEquation equation;
    private final Domain domain;
    private final double[] point;
    private int evaluations;

    GuardedEquation(CurveEquation equation, Domain domain) {
        this.equation = equation;
        this.domain = domain;
        this.point = new double[equation.pointDimension()];
    }

    @Override
    public int getDimension() {
        return equation.getDimension();
    }

    @Override
    public double[] computeDerivatives(double parameter, double[] state) {
        evaluations++;
        if (!accepts(parameter, state)) {
            throw new LeftDomain();
        }
        double[] derivatives = new double[state.length];
        equation.derivatives(parameter, state, derivatives);
        if (!finite(derivatives)) {
            throw new LeftDomain();
        }
        return derivatives;
    }

    boolean accepts(double parameter, double[] state) {
        if (!finite(state)) {
            return false;
        }
        equation.point(parameter, state, point);
        return domain.contains(point);
    }

    /**
     * Whether the tangent leaves the domain within a millionth of the way, as it does where the parameter comes to a stand
     * before a horizon.
     */
    boolean borderAhead(double parameter, double[] state, double to, double smallest) {
        double[] rate = new double[state.length];
        equation.derivatives(parameter, state, rate);
        double[] next = new double[state.length];
        double farthest = 1e-6 * Math.max(Math.abs(parameter), Math.abs(to - parameter));
        for (double step = smallest; step < farthest; step *= 2) {
            double signed = to >= parameter ? step : -step;
            for (int i = 0; i < next.length; i++) {
                next[i] = state[i] + signed * rate[i];
            }
            if (!accepts(parameter + signed, next)) {
                return true;
            }
        }
        return false;
    }

    int evaluations() {
        return evaluations;
    }

    private static boolean finite(double[] values) {
        // The sum of products is NaN as soon as one value is not finite.
        double sum = 0;
        for (double value : values) {
            sum += 0 * value;
        }
        return sum == 0;
    }
}
