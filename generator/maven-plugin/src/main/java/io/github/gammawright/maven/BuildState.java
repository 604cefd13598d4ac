package io.github.gammawright.maven;

import java.io.IOException;
import java.net.URLDecoder;
import java.net.URLEncoder;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What the last run knew: from what it made which files. It is kept in the build folder; without it, everything is made
 * again.
 *
 * @param outputFolder where the files are, relative to the state's own folder, so that a moved project keeps its state
 * @param inputs for each definition, by file name, the fingerprint of all that its classes depend on; none after a run
 *     that did not end well
 * @param outputs for each file that was ever made and not yet removed, by its path in the output folder, the fingerprint
 *     of its content and the definition it belongs to
 */
record BuildState(String outputFolder, SortedMap<String, String> inputs, SortedMap<String, Output> outputs) {

    private static final String FORMAT = "gammawright build state 1";
    private static final String SEPARATOR = "\t";

    BuildState {
        inputs = Collections.unmodifiableSortedMap(new TreeMap<>(inputs));
        outputs = Collections.unmodifiableSortedMap(new TreeMap<>(outputs));
    }

    /** A file that was made. */
    record Output(String fingerprint, String definition) {}

    /** Nothing is known. */
    static BuildState empty(String outputFolder) {
        return new BuildState(outputFolder, new TreeMap<>(), new TreeMap<>());
    }

    /** The same without what it was made from: the files remain ours, but none is up to date. */
    BuildState withoutInputs() {
        return new BuildState(outputFolder, new TreeMap<>(), outputs);
    }

    /** The state in the file; an empty one if there is none for that output folder, or it can't be understood. */
    static BuildState read(Path file, String outputFolder) throws IOException {
        List<String> lines;
        try {
            lines = Files.readAllLines(file, StandardCharsets.UTF_8);
        } catch (NoSuchFileException | CharacterCodingException e) {
            return empty(outputFolder);
        }
        boolean whole = lines.size() >= 3
                && lines.get(0).equals(FORMAT)
                && lines.get(1).equals(encode(outputFolder))
                && lines.get(lines.size() - 1).equals("end");
        return whole ? parse(outputFolder, lines.subList(2, lines.size() - 1)) : empty(outputFolder);
    }

    private static BuildState parse(String outputFolder, List<String> lines) {
        SortedMap<String, String> inputs = new TreeMap<>();
        SortedMap<String, Output> outputs = new TreeMap<>();
        for (String line : lines) {
            String[] parts = line.split(SEPARATOR, -1);
            if (parts.length == 3 && parts[0].equals("input")) {
                inputs.put(decode(parts[2]), parts[1]);
            } else if (parts.length == 4 && parts[0].equals("output")) {
                outputs.put(decode(parts[3]), new Output(parts[1], decode(parts[2])));
            } else {
                return empty(outputFolder);
            }
        }
        return new BuildState(outputFolder, inputs, outputs);
    }

    /** Keeps the state; whoever reads the file meanwhile sees the old one or the new one. */
    void write(Path file) throws IOException {
        StringBuilder text = new StringBuilder();
        text.append(FORMAT).append('\n').append(encode(outputFolder)).append('\n');
        for (Map.Entry<String, String> input : inputs.entrySet()) {
            text.append(String.join(SEPARATOR, "input", input.getValue(), encode(input.getKey())))
                    .append('\n');
        }
        for (Map.Entry<String, Output> output : outputs.entrySet()) {
            Output made = output.getValue();
            text.append(String.join(
                            SEPARATOR,
                            "output",
                            made.fingerprint(),
                            encode(made.definition()),
                            encode(output.getKey())))
                    .append('\n');
        }
        text.append("end\n");
        Path folder = Files.createDirectories(file.toAbsolutePath().getParent());
        Path temporary = Files.createTempFile(folder, "state", ".tmp");
        try {
            Files.writeString(temporary, text, StandardCharsets.UTF_8);
            Files.move(temporary, file, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(temporary);
        }
    }

    // The name of a file may hold anything, line feeds included.
    private static String encode(String name) {
        return URLEncoder.encode(name, StandardCharsets.UTF_8);
    }

    private static String decode(String name) {
        return URLDecoder.decode(name, StandardCharsets.UTF_8);
    }
}
