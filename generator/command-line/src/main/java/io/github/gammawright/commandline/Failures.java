package io.github.gammawright.commandline;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Spelling;
import io.github.gammawright.diagnostic.VisibleText;
import java.io.IOException;
import java.io.PrintStream;
import java.util.Collection;
import java.util.Locale;
import java.util.function.BooleanSupplier;
import java.util.stream.Collectors;
import picocli.CommandLine;
import picocli.CommandLine.ExecutionException;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.IParameterExceptionHandler;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;

/** The one place where failures become messages and an exit status. Traces are for those who ask by {@code --verbose}. */
final class Failures implements IParameterExceptionHandler, IExecutionExceptionHandler {

    private final PrintStream err;
    private final BooleanSupplier verbose;

    Failures(Terminal terminal, BooleanSupplier verbose) {
        this.err = terminal.err();
        this.verbose = verbose;
    }

    @Override
    public int handleParseException(ParameterException failure, String[] arguments) {
        String command = failure.getCommandLine().getCommandSpec().qualifiedName();
        err.println(oneLine("gammawright: " + message(failure)) + "; see '" + command + " --help'");
        traceIfAsked(failure);
        return ExitStatus.WRONG_INPUT;
    }

    @Override
    public int handleExecutionException(Exception failure, CommandLine command, ParseResult parsed) {
        // An error of the JVM, such as a full heap, comes wrapped.
        Throwable cause =
                failure instanceof ExecutionException && failure.getCause() != null ? failure.getCause() : failure;
        int status = report(cause);
        traceIfAsked(cause);
        return status;
    }

    private int report(Throwable failure) {
        if (failure instanceof DefinitionException wrong) {
            wrong.diagnostics().forEach(diagnostic -> err.println(diagnostic.render()));
            return ExitStatus.WRONG_INPUT;
        }
        if (failure instanceof WrongInputException wrong) {
            wrong.messages().forEach(message -> err.println(oneLine("gammawright: " + message)));
            return ExitStatus.WRONG_INPUT;
        }
        if (failure instanceof IOException) {
            err.println(oneLine("gammawright: " + failure.getMessage()));
        } else if (failure instanceof OutOfMemoryError) {
            err.println("gammawright: out of memory; allow more of it, for example with"
                    + " GAMMAWRIGHT_JAVA_OPTIONS=-Xmx2g, or ask for fewer quantities");
        } else if (failure instanceof StackOverflowError) {
            err.println("gammawright: an expression is nested too deeply for the stack; give parts of it names in"
                    + " [abbreviations], or allow more with GAMMAWRIGHT_JAVA_OPTIONS=-Xss64m");
        } else {
            err.println(oneLine("gammawright: a fault of the program, not of the input: " + failure)
                    + (verbose.getAsBoolean() ? "" : "; --verbose shows where"));
        }
        return ExitStatus.COULD_NOT;
    }

    private static String message(ParameterException failure) {
        if (failure instanceof MissingParameterException missing) {
            return missing(missing);
        }
        if (failure instanceof UnmatchedArgumentException unmatched) {
            return unknown(unmatched);
        }
        String text = failure.getMessage();
        return text.substring(0, 1).toLowerCase(Locale.ROOT) + text.substring(1);
    }

    private static String missing(MissingParameterException failure) {
        String names = failure.getMissing().stream().map(Failures::name).collect(Collectors.joining(", "));
        // The library has one exception for both, and tells them apart by its wording alone.
        boolean valueIsMissing = failure.getMessage().startsWith("Missing required parameter for option");
        return valueIsMissing ? "missing a value for " + names : "missing: " + names;
    }

    private static String name(ArgSpec argument) {
        return argument instanceof OptionSpec option ? option.longestName() : argument.paramLabel();
    }

    private static String unknown(UnmatchedArgumentException failure) {
        String argument = VisibleText.of(failure.getUnmatched().get(0));
        CommandLine command = failure.getCommandLine();
        if (!failure.isUnknownOption() && command.getSubcommands().isEmpty()) {
            return "unexpected argument '" + argument + "'";
        }
        String kind = failure.isUnknownOption() ? "option" : "command";
        Collection<String> known = failure.isUnknownOption()
                ? command.getCommandSpec().optionsMap().keySet()
                : command.getSubcommands().keySet();
        String what = "unknown " + kind + " '" + argument + "'";
        return Spelling.nearest(argument, known)
                .map(nearest -> what + "; did you mean '" + nearest + "'?")
                .orElse(what);
    }

    private void traceIfAsked(Throwable failure) {
        if (verbose.getAsBoolean()) {
            failure.printStackTrace(err);
        }
    }

    private static String oneLine(String text) {
        return text.lines()
                .map(String::strip)
                .filter(line -> !line.isEmpty())
                .reduce((a, b) -> a + " " + b)
                .orElse("");
    }
}
