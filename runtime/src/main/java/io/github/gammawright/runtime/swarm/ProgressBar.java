package io.github.gammawright.runtime.swarm;

import java.io.PrintStream;
import java.util.Locale;
import java.util.Objects;

/** A bar on a terminal; where standard output is no terminal, nothing is written. */
public final class ProgressBar implements ProgressListener {

    private static final int WIDTH = 40;

    private final PrintStream stream;
    private final String label;
    private int shown = -1;

    /** Takes the stream to write to, whatever it is. */
    public ProgressBar(PrintStream stream, String label) {
        this.stream = Objects.requireNonNull(stream, "stream");
        this.label = Objects.requireNonNull(label, "label");
    }

    /** A bar on standard error, or nothing where the program does not run on a terminal. */
    public static ProgressListener onTerminal(String label) {
        return System.console() == null ? (done, total) -> {} : new ProgressBar(System.err, label);
    }

    @Override
    public void progress(int done, int total) {
        int thousandths = total == 0 ? 1000 : (int) (1000L * done / total);
        if (thousandths == shown) {
            return;
        }
        shown = thousandths;
        int filled = WIDTH * thousandths / 1000;
        stream.printf(
                Locale.ROOT,
                "\r%s [%s%s] %5.1f %%%s",
                label,
                "=".repeat(filled),
                " ".repeat(WIDTH - filled),
                thousandths / 10.0,
                done == total ? System.lineSeparator() : "");
        stream.flush();
    }
}
