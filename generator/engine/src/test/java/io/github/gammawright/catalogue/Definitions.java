package io.github.gammawright.catalogue;

import io.github.gammawright.definition.DefinitionReader;
import io.github.gammawright.definition.MetricDefinition;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** The definitions that tests of the catalogue go through. */
final class Definitions {

    private static final Path DIFFICULT = Path.of("src/test/resources/definitions/held-out-style");

    private Definitions() {}

    /** The built-in definitions, read. */
    static List<MetricDefinition> builtIn() {
        return Catalogue.standard().names().stream().map(Definitions::builtIn).toList();
    }

    /** The built-in definition of the given name, read. */
    static MetricDefinition builtIn(String name) {
        return DefinitionReader.read(Catalogue.standard().find(name).orElseThrow());
    }

    /** The difficult definitions that stand among the tests, read. */
    static List<MetricDefinition> difficult() {
        try (Stream<Path> files = Files.list(DIFFICULT)) {
            return files.sorted().map(DefinitionReader::read).toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The file that a definition was read from, without its folder. */
    static String file(MetricDefinition definition) {
        return Path.of(definition.source().name()).getFileName().toString();
    }
}
