package io.github.gammawright.commandline;

import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The program: a command that does nothing by itself, and has the others below it. */
@Command(
        name = "gammawright",
        description = "Generates compiled geometry kernels in plain Java from the definition of a metric.",
        mixinStandardHelpOptions = true,
        versionProvider = Gammawright.Version.class,
        synopsisSubcommandLabel = "COMMAND")
public final class Gammawright implements Runnable {

    /** It could not be done: disk, memory, budget, interruption, or our own fault. */
    static final int COULD_NOT_BE_DONE = 3;

    @Spec
    private CommandSpec command;

    /** Runs the program and ends the JVM with its exit status. */
    public static void main(String[] arguments) {
        System.exit(commandLine().execute(arguments));
    }

    static CommandLine commandLine() {
        CommandLine commandLine = new CommandLine(new Gammawright());
        commandLine.getCommandSpec().exitCodeOnExecutionException(COULD_NOT_BE_DONE);
        return commandLine;
    }

    @Override
    public void run() {
        throw new ParameterException(command.commandLine(), "a command is missing");
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
