package io.github.gammawright.commandline;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.diagnostic.Spelling;
import io.github.gammawright.generation.Mistakes;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Finds what is meant by a DEFINITION on the command line: a file, or else a built-in definition. */
final class DefinitionArguments {

    private final Catalogue catalogue = Catalogue.standard();
    private final Mistakes mistakes = new Mistakes();

    /**
     * Reads all definitions.
     *
     * @throws io.github.gammawright.diagnostic.DefinitionException with everything that is wrong with any of them
     */
    static List<MetricDefinition> read(List<String> arguments) {
        DefinitionArguments resolver = new DefinitionArguments();
        List<MetricDefinition> definitions = new ArrayList<>();
        for (String argument : arguments) {
            resolver.mistakes.attempt(() -> resolver.read(argument)).ifPresent(definitions::add);
        }
        resolver.mistakes.throwIfAny();
        return definitions;
    }

    private MetricDefinition read(String argument) {
        Optional<Path> path = path(argument);
        boolean isFile = path.isPresent() && Files.isRegularFile(path.get());
        Optional<SourceText> builtIn = isFile ? Optional.empty() : catalogue.find(argument);
        if (builtIn.isPresent()) {
            return DefinitionReader.read(builtIn.get());
        }
        if (isFile || (path.isPresent() && looksLikePath(argument, path.get()))) {
            return DefinitionReader.read(path.get());
        }
        throw new DefinitionException(unknown(argument));
    }

    private static Optional<Path> path(String argument) {
        try {
            return Optional.of(Path.of(argument));
        } catch (InvalidPathException e) {
            return Optional.empty();
        }
    }

    private static boolean looksLikePath(String argument, Path path) {
        return path.getNameCount() > 1
                || argument.indexOf('/') >= 0
                || argument.endsWith(".toml")
                || Files.exists(path);
    }

    private Diagnostic unknown(String argument) {
        String remedy = Spelling.nearest(argument, catalogue.names())
                .map(nearest -> "Did you mean '" + nearest + "'?")
                .orElse("Check the path; 'gammawright list' shows what is built in.");
        return new Diagnostic(
                DiagnosticCode.FILE_MISSING,
                new SourceText(argument, ""),
                SourcePosition.START,
                "this is neither a file nor a built-in definition",
                remedy);
    }
}
