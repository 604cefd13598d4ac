package io.github.gammawright.commandline;

import io.github.gammawright.generation.ExitActions;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.HelpCommand;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ScopeType;
import picocli.CommandLine.Spec;

/** The program: a command that does nothing by itself, and has the others below it. */
@Command(
        name = "gammawright",
        description = "Generates compiled geometry kernels in plain Java from the definition of a metric.",
        mixinStandardHelpOptions = true,
        scope = ScopeType.INHERIT,
        versionProvider = Gammawright.Version.class,
        synopsisSubcommandLabel = "COMMAND",
        optionListHeading = "%nOptions:%n",
        parameterListHeading = "%n",
        commandListHeading = "%nCommands:%n",
        footerHeading = "%n",
        exitCodeListHeading = "%nExit status:%n",
        exitCodeList = {
            "0:everything was done",
            "1:a check fell short",
            "2:the input or the command line is wrong",
            "3:it could not be done: disk, memory, budget, interruption, or a fault of the program"
        })
public final class Gammawright implements Runnable {

    @Spec
    private CommandSpec command;

    // Read by Failures, which gets it from whichever command was parsed.
    @Option(names = "--verbose", scope = ScopeType.INHERIT, description = "Show where in the program an error arose.")
    private boolean verbose;

    private Gammawright() {}

    /** Runs the program and ends the JVM with its exit status. */
    public static void main(String[] arguments) {
        Terminal terminal = Terminal.ofProcess();
        Interruption interruption = Interruption.watch(terminal);
        int status = run(arguments, terminal, interruption);
        interruption.finished();
        System.exit(status);
    }

    /** Runs the program, and returns its exit status. */
    static int run(String[] arguments, Terminal terminal, ExitActions exit) {
        int status = commandLine(terminal, exit).execute(arguments);
        terminal.out().flush();
        if (terminal.out().checkError() && status == ExitStatus.DONE) {
            terminal.err().println("gammawright: the output could not be written");
            return ExitStatus.COULD_NOT;
        }
        return status;
    }

    private static CommandLine commandLine(Terminal terminal, ExitActions exit) {
        Gammawright program = new Gammawright();
        Failures failures = new Failures(terminal, () -> program.verbose);
        return new CommandLine(program)
                .addSubcommand(new ListCommand(terminal))
                .addSubcommand(new ShowCommand(terminal))
                .addSubcommand(new GenerateCommand(terminal, exit))
                .addSubcommand(new CheckCommand(terminal))
                .addSubcommand(new HelpCommand())
                // A definition may be called anything; a name with an at sign is not a file of arguments.
                .setExpandAtFiles(false)
                .setOut(terminal.outWriter())
                .setErr(terminal.errWriter())
                .setUsageHelpAutoWidth(true)
                .setParameterExceptionHandler(failures)
                .setExecutionExceptionHandler(failures);
    }

    @Override
    public void run() {
        throw new ParameterException(command.commandLine(), "a command is missing: list, show, generate or check");
    }

    /** The version that the build wrote into the jar. */
    static final class Version implements IVersionProvider {

        @Override
        public String[] getVersion() {
            String version = Gammawright.class.getPackage().getImplementationVersion();
            return new String[] {"gammawright " + (version == null ? "(not packaged)" : version)};
        }
    }
}
