package io.github.gammawright.runtime.swarm;

import java.io.Console;
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
        return terminal() ? new ProgressBar(System.err, label) : (done, total) -> {};
    }

    /** From JDK 22 on there is a console in any case, which says itself whether it is a terminal. */
    @SuppressWarnings("SystemConsoleNull")
    private static boolean terminal() {
        Console console = System.console();
        if (console == null) {
            return false;
        }
        try {
            return (Boolean) Console.class.getMethod("isTerminal").invoke(console);
        } catch (ReflectiveOperationException olderJdk) {
            return true;
        }
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
