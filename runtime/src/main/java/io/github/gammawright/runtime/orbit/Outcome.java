package io.github.gammawright.runtime.orbit;

/** Why a run ended. */
public enum Outcome {
    /** The parameter reached the value asked for. */
    COMPLETED,
    /** An event that stops the run took place. */
    EVENT,
    /** The curve leads out of the domain: what is beyond was not evaluated, or was not finite. */
    LEFT_DOMAIN,
    /** A constant of the motion moved beyond the monitor's limit. */
    DRIFT,
    /** The step became too small to move the parameter, short of the end of the domain. */
    STEP_TOO_SMALL,
    /** As many evaluations were made as were allowed. */
    TOO_MANY_EVALUATIONS
}
