package io.github.gammawright.commandline;

import io.github.gammawright.generation.ExitActions;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * A run of the program in this process.
 *
 * @param status its exit status
 * @param output what it wrote to standard output
 * @param errors what it wrote to standard error
 */
record Program(int status, String output, String errors) {

    static Program run(String... arguments) {
        return run(false, arguments);
    }

    /** The same as if a person watched. */
    static Program runAtTerminal(String... arguments) {
        return run(true, arguments);
    }

    List<String> errorLines() {
        return errors.lines().toList();
    }

    private static Program run(boolean interactive, String... arguments) {
        ByteArrayOutputStream output = new ByteArrayOutputStream();
        ByteArrayOutputStream errors = new ByteArrayOutputStream();
        Terminal terminal = new Terminal(stream(output), stream(errors), StandardCharsets.UTF_8, interactive);
        int status = Gammawright.run(arguments, terminal, ExitActions.ofJvm());
        return new Program(status, output.toString(StandardCharsets.UTF_8), errors.toString(StandardCharsets.UTF_8));
    }

    private static PrintStream stream(ByteArrayOutputStream bytes) {
        return new PrintStream(bytes, true, StandardCharsets.UTF_8);
    }
}
