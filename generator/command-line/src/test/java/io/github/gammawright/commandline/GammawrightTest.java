package io.github.gammawright.commandline;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The command line itself; what the commands do is tested beside each of them. */
class GammawrightTest {

    @Test
    void helpIsNoError() {
        Program help = Program.run("--help");

        assertThat(help.status()).isZero();
        assertThat(help.output())
                .startsWith("Usage: gammawright")
                .contains("list", "show", "generate", "check", "Exit status:");
        assertThat(help.errors()).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(strings = {"list", "show", "generate", "check"})
    void everyCommandHasHelp(String command) {
        Program help = Program.run(command, "--help");

        assertThat(help.status()).isZero();
        assertThat(help.output()).startsWith("Usage: gammawright " + command).contains("--verbose");
        assertThat(Program.run("help", command).output()).isEqualTo(help.output());
    }

    @Test
    void aMissingCommandIsOneLine() {
        assertWrong(
                Program.run(),
                "gammawright: a command is missing: list, show, generate or check; see 'gammawright --help'");
    }

    @Test
    void anUnknownOptionOrCommandComesWithTheNearestOne() {
        assertWrong(
                Program.run("generate", "kerr", "--out", "x", "--quantty", "metric"),
                "gammawright: unknown option '--quantty'; did you mean '--quantity'?; see 'gammawright generate --help'");
        assertWrong(
                Program.run("genrate", "kerr"),
                "gammawright: unknown command 'genrate'; did you mean 'generate'?; see 'gammawright --help'");
        assertWrong(
                Program.run("list", "--speed-of-light"),
                "gammawright: unknown option '--speed-of-light'; see 'gammawright list --help'");
        assertWrong(
                Program.run("list", "kerr"), "gammawright: unexpected argument 'kerr'; see 'gammawright list --help'");
    }

    @Test
    void whatIsMissingIsNamed() {
        assertWrong(Program.run("generate", "kerr"), "gammawright: missing: --out; see 'gammawright generate --help'");
        assertWrong(Program.run("show"), "gammawright: missing: DEFINITION; see 'gammawright show --help'");
        assertWrong(
                Program.run("show", "kerr", "--quantity"),
                "gammawright: missing a value for --quantity; see 'gammawright show --help'");
    }

    @Test
    void aTraceIsForThoseWhoAsk() {
        Program run = Program.run("--verbose", "generate", "kerr");

        assertThat(run.status()).isEqualTo(2);
        assertThat(run.errorLines().get(0)).startsWith("gammawright: missing: --out");
        assertThat(run.errors()).contains("\tat ");
    }

    @Test
    void anArgumentWithAnAtSignIsNotAFileOfArguments() {
        Program run = Program.run("show", "@kerr");

        assertThat(run.errorLines())
                .containsExactly("@kerr:1:1: this is neither a file nor a built-in definition", "Did you mean 'kerr'?");
        assertThat(run.status()).isEqualTo(2);
    }

    private static void assertWrong(Program run, String line) {
        assertThat(run.errorLines()).containsExactly(line);
        assertThat(run.output()).isEmpty();
        assertThat(run.status()).isEqualTo(2);
    }
}
