package io.github.gammawright.maven;

import io.github.gammawright.generation.SourceWriter;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * Brings a folder of generated classes up to date with a folder of definitions. Whether something is up to date is
 * decided by contents alone, never by time stamps.
 */
final class KernelBuild {

    private final Path definitionFolder;
    private final Path outputFolder;
    private final Path stateFile;
    private final String settingsFingerprint;
    private final ClassSource source;

    /**
     * Prepares a build.
     *
     * @param stateFile where the build keeps what it knows from one run to the next
     * @param settingsFingerprint of everything but the definitions that the classes depend on: generator and settings
     * @param source makes the classes
     */
    KernelBuild(
            Path definitionFolder, Path outputFolder, Path stateFile, String settingsFingerprint, ClassSource source) {
        this.definitionFolder = definitionFolder;
        this.outputFolder = outputFolder;
        this.stateFile = stateFile;
        this.settingsFingerprint = settingsFingerprint;
        this.source = source;
    }

    /** Makes the classes of definitions; the generator behind an interface, since an unchanged build never loads it. */
    interface ClassSource {

        /**
         * Makes classes.
         *
         * @param definitions all definitions, by file name
         * @param outdated those whose classes are wanted
         * @return for each outdated definition its classes: texts by path below the source root
         * @throws io.github.gammawright.diagnostic.DefinitionException with every mistake in any of the definitions
         */
        Map<String, Map<String, String>> make(SortedMap<String, Path> definitions, Set<String> outdated);
    }

    /**
     * What a run did.
     *
     * @param written files whose content changed
     * @param removed files whose definition is gone, or no longer makes them
     * @param definitions how many definitions there are
     * @param classes how many classes there now are
     */
    record Outcome(List<Path> written, List<Path> removed, int definitions, int classes) {

        Outcome {
            written = List.copyOf(written);
            removed = List.copyOf(removed);
        }

        boolean changedNothing() {
            return written.isEmpty() && removed.isEmpty();
        }
    }

    /** Runs the build, alone in its folder. */
    Outcome run() throws IOException {
        SortedMap<String, Path> definitions = DefinitionFiles.in(definitionFolder);
        if (definitions.isEmpty() && !Files.exists(stateFile)) {
            return new Outcome(List.of(), List.of(), 0, 0);
        }
        try (FolderLock lock = FolderLock.on(stateFile)) {
            return lock.whileHeld(() -> update(definitions));
        }
    }

    private Outcome update(SortedMap<String, Path> definitions) throws IOException {
        String relativeOutput = stateFile
                .toAbsolutePath()
                .getParent()
                .relativize(outputFolder.toAbsolutePath())
                .toString();
        BuildState last = BuildState.read(stateFile, relativeOutput);
        SortedMap<String, String> inputs = fingerprints(definitions);
        Set<String> outdated = outdated(inputs, last);
        if (outdated.isEmpty() && last.inputs().equals(inputs)) {
            return new Outcome(
                    List.of(), List.of(), definitions.size(), last.outputs().size());
        }

        Map<String, Map<String, String>> made;
        try {
            made = source.make(definitions, outdated);
        } catch (RuntimeException | Error e) {
            last.withoutInputs().write(stateFile);
            throw e;
        }
        SortedMap<String, BuildState.Output> outputs = keptOutputs(inputs.keySet(), outdated, last);
        Map<String, byte[]> texts = new LinkedHashMap<>();
        for (Map.Entry<String, Map<String, String>> of : made.entrySet()) {
            for (Map.Entry<String, String> text : of.getValue().entrySet()) {
                byte[] bytes = text.getValue().getBytes(StandardCharsets.UTF_8);
                texts.put(text.getKey(), bytes);
                outputs.put(text.getKey(), new BuildState.Output(Fingerprint.of(bytes), of.getKey()));
            }
        }
        // From here on everything that may be on the disk is known to be ours, and nothing counts as up to date.
        SortedMap<String, BuildState.Output> all = new TreeMap<>(last.outputs());
        all.putAll(outputs);
        new BuildState(relativeOutput, new TreeMap<>(), all).write(stateFile);

        List<Path> written = new SourceWriter(outputFolder).writeTexts(texts);
        List<Path> removed = removeOrphans(last.outputs().keySet(), outputs.keySet());
        new BuildState(relativeOutput, inputs, outputs).write(stateFile);
        return new Outcome(written, removed, definitions.size(), outputs.size());
    }

    private SortedMap<String, String> fingerprints(SortedMap<String, Path> definitions) throws IOException {
        SortedMap<String, String> fingerprints = new TreeMap<>();
        for (Map.Entry<String, Path> definition : definitions.entrySet()) {
            Path file = definition.getValue();
            // What is no file is for the reader to complain about.
            byte[] content = Files.isRegularFile(file) ? Files.readAllBytes(file) : new byte[0];
            fingerprints.put(
                    definition.getKey(),
                    new Fingerprint().add(settingsFingerprint).add(content).hex());
        }
        return fingerprints;
    }

    private Set<String> outdated(SortedMap<String, String> inputs, BuildState last) throws IOException {
        Set<String> outdated = new TreeSet<>();
        for (Map.Entry<String, String> input : inputs.entrySet()) {
            if (!input.getValue().equals(last.inputs().get(input.getKey()))) {
                outdated.add(input.getKey());
            }
        }
        for (Map.Entry<String, BuildState.Output> output : last.outputs().entrySet()) {
            String definition = output.getValue().definition();
            if (inputs.containsKey(definition) && !outdated.contains(definition) && isSpoilt(output)) {
                outdated.add(definition);
            }
        }
        return outdated;
    }

    private boolean isSpoilt(Map.Entry<String, BuildState.Output> output) throws IOException {
        Path file = outputFolder.resolve(output.getKey());
        return !Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS)
                || !Fingerprint.of(Files.readAllBytes(file))
                        .equals(output.getValue().fingerprint());
    }

    private static SortedMap<String, BuildState.Output> keptOutputs(
            Set<String> definitions, Set<String> outdated, BuildState last) {
        SortedMap<String, BuildState.Output> kept = new TreeMap<>(last.outputs());
        kept.values()
                .removeIf(
                        output -> !definitions.contains(output.definition()) || outdated.contains(output.definition()));
        return kept;
    }

    private List<Path> removeOrphans(Set<String> before, Set<String> now) throws IOException {
        List<Path> removed = new ArrayList<>();
        for (String path : before) {
            if (!now.contains(path)) {
                Path file = new SourceWriter(outputFolder).target(path);
                if (Files.deleteIfExists(file)) {
                    removed.add(file);
                    removeEmptyFolders(file.getParent());
                }
            }
        }
        return removed;
    }

    private void removeEmptyFolders(Path folder) throws IOException {
        Path empty = folder;
        while (!empty.equals(outputFolder) && empty.startsWith(outputFolder) && isEmpty(empty)) {
            Files.delete(empty);
            empty = empty.getParent();
        }
    }

    private static boolean isEmpty(Path folder) throws IOException {
        try (var entries = Files.list(folder)) {
            return entries.findAny().isEmpty();
        }
    }
}
