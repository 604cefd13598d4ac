package io.github.gammawright.runtime.orbit;

import java.util.Arrays;

/**
 * How a run ended.
 *
 * @param outcome why
 * @param detail the name of the event or of the quantity that drifted, else what was the matter; may be empty
 * @param parameter the parameter at the end
 * @param state the last state, finite and inside the domain
 * @param evaluations how many right-hand sides were evaluated
 */
public record Ending(Outcome outcome, String detail, double parameter, double[] state, int evaluations) {

    /** Whether the run reached the parameter asked for. */
    public boolean completed() {
        return outcome == Outcome.COMPLETED;
    }

    /** Whether the named event stopped the run. */
    public boolean stoppedBy(String event) {
        return outcome == Outcome.EVENT && detail.equals(event);
    }

    @Override
    public String toString() {
        return outcome + (detail.isEmpty() ? "" : " (" + detail + ")") + " at parameter " + parameter + " in state "
                + Arrays.toString(state);
    }
}
