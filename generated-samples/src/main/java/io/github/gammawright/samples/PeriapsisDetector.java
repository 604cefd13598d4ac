package io.github.gammawright.samples;

import java.util.function.Consumer;
import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.solvers.BracketedUnivariateSolver;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.events.Action;
import org.hipparchus.ode.events.AdaptableInterval;
import org.hipparchus.ode.events.ODEEventDetector;
import org.hipparchus.ode.events.ODEEventHandler;

/** Watches for the moments at which dr/dτ, entry 5 of the state, goes from negative to positive. */
final class PeriapsisDetector implements ODEEventDetector {

    private static final int RADIAL_VELOCITY = 5;

    private final Consumer<ODEStateAndDerivative> visitor;

    PeriapsisDetector(Consumer<ODEStateAndDerivative> visitor) {
        this.visitor = visitor;
    }

    @Override
    public double g(ODEStateAndDerivative state) {
        return state.getPrimaryState()[RADIAL_VELOCITY];
    }

    @Override
    public AdaptableInterval getMaxCheckInterval() {
        return (state, forward) -> 10;
    }

    @Override
    public int getMaxIterationCount() {
        return 100;
    }

    @Override
    public BracketedUnivariateSolver<UnivariateFunction> getSolver() {
        return new BracketingNthOrderBrentSolver(0, 1e-9, 0, 5);
    }

    @Override
    public ODEEventHandler getHandler() {
        return (state, detector, increasing) -> {
            if (increasing) {
                visitor.accept(state);
            }
            return Action.CONTINUE;
        };
    }
}
