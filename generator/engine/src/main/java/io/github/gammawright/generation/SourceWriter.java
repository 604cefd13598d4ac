package io.github.gammawright.generation;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Writes generated classes below one folder. A class appears whole or not at all, whatever interrupts the run: every
 * text first goes to a temporary file in its target folder, and only when all of them are on the disk do they take
 * their places. A file that holds the text already is not touched, so that a build sees no change. Nothing is ever
 * written outside the folder.
 */
public final class SourceWriter {

    private final Path root;
    private final ExitActions exit;

    /**
     * A writer of classes below a folder.
     *
     * @param root the source root; it is made when the first class is written
     */
    public SourceWriter(Path root) {
        this(root, ExitActions.ofJvm());
    }

    /**
     * A writer of classes below a folder, in a program with its own way to end.
     *
     * @param root the source root; it is made when the first class is written
     * @param exit what removes temporary files if the program is interrupted
     */
    public SourceWriter(Path root, ExitActions exit) {
        this.root = root.toString().isEmpty() ? Path.of(".") : root;
        this.exit = exit;
    }

    /**
     * Writes the classes, all or none of them as far as the file system allows.
     *
     * @return the files that changed, in the order of the classes
     * @throws OutputException if a class cannot be written; its message is complete and names the remedy
     */
    public List<Path> write(Collection<GeneratedClass> classes) throws OutputException {
        Map<String, byte[]> texts = new LinkedHashMap<>();
        for (GeneratedClass generated : classes) {
            byte[] text = generated.source().getBytes(StandardCharsets.UTF_8);
            if (texts.put(generated.path(), text) != null) {
                throw new IllegalArgumentException("two classes for " + generated.path());
            }
        }
        return writeTexts(texts);
    }

    /**
     * Writes texts, all or none of them as far as the file system allows.
     *
     * @param texts contents by path below the root, with {@code /} between its parts
     * @return the files that changed, in order
     * @throws OutputException if one cannot be written
     */
    public List<Path> writeTexts(Map<String, byte[]> texts) throws OutputException {
        List<Path> changed = new ArrayList<>();
        try (TemporaryFiles temporary = new TemporaryFiles(exit)) {
            for (Map.Entry<String, byte[]> entry : texts.entrySet()) {
                Path target = target(entry.getKey());
                if (!holds(target, entry.getValue())) {
                    stage(temporary, target, entry.getValue());
                    changed.add(target);
                }
            }
            temporary.moveAll();
        }
        return changed;
    }

    /**
     * Where a path below the root leads.
     *
     * @throws OutputException if that is outside the root
     */
    public Path target(String path) throws OutputException {
        Path base = root.toAbsolutePath().normalize();
        Path target = base.resolve(path).normalize();
        if (!target.startsWith(base) || target.equals(base)) {
            throw new OutputException("refused to write " + path + ": it would be outside " + root);
        }
        return root.resolve(base.relativize(target));
    }

    private void stage(TemporaryFiles temporary, Path target, byte[] text) throws OutputException {
        Path folder = target.getParent();
        try {
            makeFolder(folder);
            if (Files.isDirectory(target, LinkOption.NOFOLLOW_LINKS)) {
                throw new OutputException("cannot write " + target + ": there is a folder of that name");
            }
            temporary.stage(target, text);
        } catch (OutputException e) {
            throw e;
        } catch (IOException e) {
            throw OutputException.of(target, e);
        }
    }

    /** Makes a folder step by step, and goes through no link that leads outside the root. */
    private void makeFolder(Path folder) throws IOException {
        Files.createDirectories(root);
        Path real = root.toRealPath();
        Path step = root;
        for (Path name : root.relativize(folder)) {
            step = step.resolve(name);
            if (!Files.isDirectory(step)) {
                // unlike createDirectory content with a folder that another build has made meanwhile
                Files.createDirectories(step);
            }
            if (!step.toRealPath().startsWith(real)) {
                throw new OutputException("refused to write into " + step + ": this link leads outside " + root);
            }
        }
    }

    private static boolean holds(Path file, byte[] text) throws OutputException {
        try {
            // A link in the place of a class is replaced by the class: its target may be anywhere.
            return Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS)
                    && Files.size(file) == text.length
                    && Arrays.equals(Files.readAllBytes(file), text);
        } catch (IOException e) {
            throw new OutputException("cannot read " + file + ", which is to be replaced: " + e.getMessage(), e);
        }
    }
}
