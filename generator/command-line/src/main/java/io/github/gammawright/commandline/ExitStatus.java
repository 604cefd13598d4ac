package io.github.gammawright.commandline;

/** What the exit status of the program means. */
final class ExitStatus {

    /** Everything asked for was done. */
    static final int DONE = 0;

    /** A check fell short. */
    static final int FELL_SHORT = 1;

    /** The input or the command line is wrong. */
    static final int WRONG_INPUT = 2;

    /** It could not be done: disk, memory, budget, interruption, or our own fault. */
    static final int COULD_NOT = 3;

    private ExitStatus() {}
}
