package io.github.gammawright.commandline;

import java.io.BufferedOutputStream;
import java.io.Console;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.Locale;

/**
 * Where a run writes to.
 *
 * @param out results
 * @param err errors, and progress where a person watches
 * @param charset how both encode letters
 * @param interactive whether a person watches
 */
record Terminal(PrintStream out, PrintStream err, Charset charset, boolean interactive) {

    /** The streams of this process. */
    @SuppressWarnings("SystemConsoleNull") // The console is asked, too, where there always is one.
    static Terminal ofProcess() {
        Console console = System.console();
        boolean interactive = console != null && isTerminal(console);
        Charset charset = charset(console, interactive);
        return new Terminal(
                stream(FileDescriptor.out, charset, !interactive),
                stream(FileDescriptor.err, charset, false),
                charset,
                interactive);
    }

    /** For picocli, which wants writers. */
    PrintWriter outWriter() {
        return new PrintWriter(out, true, charset);
    }

    /** For picocli, which wants writers. */
    PrintWriter errWriter() {
        return new PrintWriter(err, true, charset);
    }

    /** Formulas need more letters than some consoles of Windows have; everything else reads UTF-8. */
    private static Charset charset(Console console, boolean interactive) {
        boolean windows =
                System.getProperty("os.name", "").toLowerCase(Locale.ROOT).startsWith("windows");
        return windows && interactive ? console.charset() : StandardCharsets.UTF_8;
    }

    private static PrintStream stream(FileDescriptor descriptor, Charset charset, boolean buffered) {
        FileOutputStream file = new FileOutputStream(descriptor);
        return buffered
                ? new PrintStream(new BufferedOutputStream(file, 1 << 16), false, charset)
                : new PrintStream(file, true, charset);
    }

    /** From JDK 22 on there is a console even when nobody watches; it says so by a method that 17 does not have. */
    private static boolean isTerminal(Console console) {
        try {
            return (boolean) Console.class.getMethod("isTerminal").invoke(console);
        } catch (NoSuchMethodException e) {
            return true;
        } catch (ReflectiveOperationException e) {
            return false;
        }
    }
}
