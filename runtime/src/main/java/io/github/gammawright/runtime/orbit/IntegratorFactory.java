package io.github.gammawright.runtime.orbit;

import org.hipparchus.ode.ODEIntegrator;
import org.hipparchus.ode.nonstiff.AdaptiveStepsizeIntegrator;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;

/** Makes integrators, a fresh one for each stretch of a run. */
@FunctionalInterface
public interface IntegratorFactory {

    /**
     * Makes one.
     *
     * @param minimalStep the smallest step that makes sense
     * @param maximalStep the largest step allowed
     */
    ODEIntegrator create(double minimalStep, double maximalStep);

    /**
     * The default: order 8 with error estimates of orders 5 and 3, adaptive (Dormand &amp; Prince; Hairer, Nørsett &amp; Wanner
     * 1993, Solving Ordinary Differential Equations I, sec. II.5; from memory).
     *
     * @param kind what the states hold, which sets the tolerances
     */
    static IntegratorFactory standard(StateKind kind) {
        return tolerances(kind.absoluteTolerance(), kind.relativeTolerance());
    }

    /** The default integrator with other tolerances. */
    static IntegratorFactory tolerances(double absolute, double relative) {
        return (minimalStep, maximalStep) ->
                new DormandPrince853Integrator(minimalStep, maximalStep, absolute, relative);
    }

    /** Sets the first step, where an integrator has one to set. */
    static void firstStep(ODEIntegrator integrator, double step) {
        if (integrator instanceof AdaptiveStepsizeIntegrator adaptive) {
            adaptive.setInitialStepSize(step);
        }
    }
}
