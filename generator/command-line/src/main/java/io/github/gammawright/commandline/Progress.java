package io.github.gammawright.commandline;

import java.io.PrintStream;

/** Tells a person at a terminal how far the work is, on one line that goes away again. Tells nobody else anything. */
final class Progress implements AutoCloseable {

    private static final String CLEAR_LINE = "\r\u001b[K";

    private final PrintStream err;
    private final boolean shown;
    private final int total;
    private int started;

    Progress(Terminal terminal, int total) {
        this.err = terminal.err();
        this.shown = terminal.interactive();
        this.total = total;
    }

    /** The next piece of work begins. */
    void next(String what) {
        started++;
        if (shown) {
            err.print(CLEAR_LINE + started + "/" + total + " " + what);
            err.flush();
        }
    }

    /** Makes room for output. */
    void clear() {
        if (shown) {
            err.print(CLEAR_LINE);
            err.flush();
        }
    }

    @Override
    public void close() {
        clear();
    }
}
