package io.github.gammawright.maven;

import io.github.gammawright.generation.GenerationOptions;
import java.io.IOException;
import java.net.URISyntaxException;
import java.net.URL;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collection;
import java.util.List;
import java.util.stream.Stream;

/**
 * Identifies the program that generates, by the bytes of the engine and of this plugin (a snapshot keeps its version
 * when it changes) and by the versions of their libraries.
 */
final class GeneratorFingerprint {

    private GeneratorFingerprint() {}

    /**
     * The fingerprint.
     *
     * @param libraries what identifies the libraries that the generator runs with
     */
    static String of(Collection<String> libraries) throws IOException {
        Fingerprint fingerprint = new Fingerprint();
        for (Class<?> type : List.of(GenerationOptions.class, GeneratorFingerprint.class)) {
            addOrigin(fingerprint, origin(type));
        }
        libraries.stream().sorted().forEach(fingerprint::add);
        return fingerprint.hex();
    }

    private static Path origin(Class<?> type) throws IOException {
        URL location = type.getProtectionDomain().getCodeSource().getLocation();
        try {
            return Path.of(location.toURI());
        } catch (URISyntaxException e) {
            throw new IOException("the plugin's own classes are at " + location + ", which cannot be read", e);
        }
    }

    /** A jar, or in a build of this project itself perhaps a folder of classes. */
    private static void addOrigin(Fingerprint fingerprint, Path origin) throws IOException {
        if (Files.isRegularFile(origin)) {
            fingerprint.add(Files.readAllBytes(origin));
            return;
        }
        List<Path> files;
        try (Stream<Path> found = Files.walk(origin)) {
            files = found.filter(Files::isRegularFile).sorted().toList();
        }
        for (Path file : files) {
            fingerprint.add(origin.relativize(file).toString()).add(Files.readAllBytes(file));
        }
    }
}
