package io.github.gammawright.runtime.orbit;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.ode.sampling.ODEStateInterpolator;
import org.hipparchus.ode.sampling.ODEStepHandler;

/**
 * All steps of one run, as the integrator's interpolation polynomials. Memory grows with the number of steps: for long runs
 * hand the states on instead.
 */
public final class DenseOutput {

    private final List<ODEStateInterpolator> pieces = new ArrayList<>();

    /** What takes the steps of the next stretch. */
    ODEStepHandler stretch() {
        return pieces::add;
    }

    /** How many steps there are. */
    public int steps() {
        return pieces.size();
    }

    /** The parameter at the start. */
    public double from() {
        return pieces.get(0).getPreviousState().getTime();
    }

    /** The parameter at the end. */
    public double to() {
        return pieces.get(pieces.size() - 1).getCurrentState().getTime();
    }

    /**
     * The state at a parameter between start and end.
     *
     * @return a new array
     * @throws IllegalArgumentException if the parameter is not on the way, or there was no step
     */
    public double[] stateAt(double parameter) {
        if (pieces.isEmpty()) {
            throw new IllegalArgumentException("the run made no step");
        }
        boolean forward = to() >= from();
        if (!(forward ? from() <= parameter && parameter <= to() : to() <= parameter && parameter <= from())) {
            throw new IllegalArgumentException(
                    "the run goes from " + from() + " to " + to() + ", and " + parameter + " is not between");
        }
        int low = 0;
        int high = pieces.size() - 1;
        while (low < high) {
            int middle = (low + high) >>> 1;
            double end = pieces.get(middle).getCurrentState().getTime();
            if (forward ? end < parameter : end > parameter) {
                low = middle + 1;
            } else {
                high = middle;
            }
        }
        return pieces.get(low).getInterpolatedState(parameter).getPrimaryState();
    }
}
