package io.github.gammawright.maven;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;

/**
 * A local repository for builds inside the build. It shows all that the outer build has fetched, by links, and holds
 * this project's own artifacts as they were just packaged, which the outer repository must not be given.
 */
final class LocalRepository {

    private static final Path OWN = Path.of("io", "github", "gammawright");

    private final Path outer;
    private final Path folder;
    private final String version;

    private LocalRepository(Path outer, Path folder, String version) {
        this.outer = outer;
        this.folder = folder;
        this.version = version;
    }

    /** Makes the repository in the build folder, in the place of an earlier one. */
    static Path make() throws IOException {
        Path folder = Path.of(System.getProperty("it.target"), "it-repository");
        LocalRepository repository = new LocalRepository(
                Path.of(System.getProperty("it.localRepository")), folder, System.getProperty("project.version"));
        removeEarlier(folder);
        repository.linkAllBut(Path.of(""), OWN);
        repository.installOwn(Path.of(System.getProperty("it.root")));
        return folder;
    }

    /** Links everything in a folder except the way to our own artifacts, which are never taken from outside. */
    private void linkAllBut(Path below, Path spared) throws IOException {
        Files.createDirectories(folder.resolve(below));
        Path from = outer.resolve(below);
        if (Files.isDirectory(from)) {
            try (Stream<Path> entries = Files.list(from)) {
                for (Path entry : entries.toList()) {
                    if (!entry.getFileName().equals(spared.getName(0))) {
                        Files.createSymbolicLink(
                                folder.resolve(below).resolve(entry.getFileName()),
                                entry.toAbsolutePath().toRealPath());
                    }
                }
            }
        }
        if (spared.getNameCount() > 1) {
            linkAllBut(below.resolve(spared.getName(0)), spared.subpath(1, spared.getNameCount()));
        }
    }

    private void installOwn(Path root) throws IOException {
        install("gammawright-parent", root, List.of());
        install("gammawright-generator", root.resolve("generator"), List.of());
        for (String module : List.of("engine", "maven-plugin")) {
            String artifact = "gammawright-" + module;
            Path home = root.resolve("generator").resolve(module);
            install(artifact, home, List.of(home.resolve("target").resolve(artifact + "-" + version + ".jar")));
        }
    }

    private void install(String artifact, Path module, List<Path> jars) throws IOException {
        Path place =
                Files.createDirectories(folder.resolve(OWN).resolve(artifact).resolve(version));
        Files.copy(
                module.resolve("pom.xml"),
                place.resolve(artifact + "-" + version + ".pom"),
                StandardCopyOption.REPLACE_EXISTING);
        for (Path jar : jars) {
            Files.copy(jar, place.resolve(jar.getFileName()), StandardCopyOption.REPLACE_EXISTING);
        }
    }

    /** Removes links, never what they lead to. */
    private static void removeEarlier(Path folder) throws IOException {
        if (!Files.isDirectory(folder, LinkOption.NOFOLLOW_LINKS)) {
            return;
        }
        try (Stream<Path> files = Files.walk(folder)) {
            for (Path file : files.sorted(Comparator.reverseOrder()).toList()) {
                Files.delete(file);
            }
        }
    }
}
