package io.github.gammawright.runtime.orbit;

import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.solvers.BracketedUnivariateSolver;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.events.Action;
import org.hipparchus.ode.events.AdaptableInterval;
import org.hipparchus.ode.events.ODEEventDetector;
import org.hipparchus.ode.events.ODEEventHandler;

/** Shows an event to Hipparchus. */
final class EventAdapter implements ODEEventDetector {

    private static final int MAX_ITERATIONS = 200;

    private final Event event;
    private final double tolerance;
    private boolean stopped;
    private boolean forward = true;

    EventAdapter(Event event, double tolerance) {
        this.event = event;
        this.tolerance = tolerance;
    }

    boolean stopped() {
        return stopped;
    }

    Event event() {
        return event;
    }

    @Override
    public void init(ODEStateAndDerivative start, double end) {
        forward = end >= start.getTime();
    }

    @Override
    public double g(ODEStateAndDerivative state) {
        return event.value(state.getTime(), state.getPrimaryState(), event.needsRate() ? rate(state) : null);
    }

    /** The change of the state as the run goes on. */
    private double[] rate(ODEStateAndDerivative state) {
        double[] rate = state.getPrimaryDerivative();
        if (!forward) {
            for (int i = 0; i < rate.length; i++) {
                rate[i] = -rate[i];
            }
        }
        return rate;
    }

    @Override
    public AdaptableInterval getMaxCheckInterval() {
        // Each step is looked at once, at its end: steps resolve the motion.
        return (state, forward) -> Double.POSITIVE_INFINITY;
    }

    @Override
    public int getMaxIterationCount() {
        return MAX_ITERATIONS;
    }

    @Override
    public BracketedUnivariateSolver<UnivariateFunction> getSolver() {
        return new BracketingNthOrderBrentSolver(0, tolerance, 0, 5);
    }

    @Override
    public ODEEventHandler getHandler() {
        return (state, detector, increasing) -> {
            // Hipparchus says how the function goes by growing parameter, whichever way the run goes.
            if (!event.direction().accepts(increasing == forward)) {
                return Action.CONTINUE;
            }
            if (event.occurred(state.getTime(), state.getPrimaryState())) {
                stopped = true;
                return Action.STOP;
            }
            return Action.CONTINUE;
        };
    }
}
