package io.github.gammawright.maven;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Stream;

/** The definitions of a folder. */
final class DefinitionFiles {

    private static final String SUFFIX = ".metric.toml";

    private DefinitionFiles() {}

    /** Paths by file name, in an order that is the same on every machine; none if there is no such folder. */
    static SortedMap<String, Path> in(Path folder) throws IOException {
        SortedMap<String, Path> found = new TreeMap<>();
        if (Files.isDirectory(folder)) {
            try (Stream<Path> files = Files.list(folder)) {
                files.filter(file -> file.getFileName().toString().endsWith(SUFFIX))
                        .forEach(file -> found.put(file.getFileName().toString(), file));
            }
        }
        return found;
    }
}
