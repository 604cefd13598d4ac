package io.github.gammawright.commandline;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;

class GammawrightTest {

    private final StringWriter output = new StringWriter();
    private final StringWriter errors = new StringWriter();

    @Test
    void helpIsNoError() {
        assertThat(execute("--help")).isZero();
        assertThat(output.toString()).startsWith("Usage: gammawright");
        assertThat(errors.toString()).isEmpty();
    }

    @Test
    void aMissingCommandIsAnErrorOfInput() {
        assertThat(execute()).isEqualTo(2);
        assertThat(output.toString()).isEmpty();
        assertThat(errors.toString()).startsWith("a command is missing").contains("Usage: gammawright");
    }

    @Test
    void anUnknownOptionIsAnErrorOfInput() {
        assertThat(execute("--speed-of-light")).isEqualTo(2);
        assertThat(errors.toString()).contains("--speed-of-light");
    }

    private int execute(String... arguments) {
        CommandLine commandLine = Gammawright.commandLine();
        commandLine.setOut(new PrintWriter(output, true));
        commandLine.setErr(new PrintWriter(errors, true));
        return commandLine.execute(arguments);
    }
}
