package io.github.gammawright.generation;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashSet;
import java.util.Set;
import java.util.concurrent.ThreadLocalRandom;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Files that wait beside their targets until all of them are complete. Their names carry the process that made them;
 * those of processes that are gone (killed before they could tidy up) are removed on the way.
 */
final class TemporaryFiles implements AutoCloseable {

    private static final Pattern NAME = Pattern.compile("\\.gammawright-(\\d+)-\\d+\\.tmp");

    private final Deque<Staged> waiting = new ArrayDeque<>();
    private final Set<Path> tidied = new HashSet<>();
    private final ExitActions.Registration tidyOnExit;

    TemporaryFiles(ExitActions exit) throws OutputException {
        try {
            tidyOnExit = exit.add(this::removeWaiting);
        } catch (IllegalStateException e) {
            throw new OutputException("interrupted before anything was written", e);
        }
    }

    /** Writes a text beside its target, down to the disk. */
    synchronized void stage(Path target, byte[] text) throws IOException {
        Path folder = target.getParent();
        if (tidied.add(folder)) {
            removeLeftOvers(folder);
        }
        Path file = folder.resolve(newName());
        waiting.add(new Staged(file, target));
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
            ByteBuffer bytes = ByteBuffer.wrap(text);
            while (bytes.hasRemaining()) {
                channel.write(bytes);
            }
            // Else a power cut after the move could leave an empty file under the final name.
            channel.force(false);
        }
    }

    /** Gives every file its final name. */
    synchronized void moveAll() throws OutputException {
        while (!waiting.isEmpty()) {
            Staged next = waiting.peek();
            try {
                move(next.file(), next.target());
            } catch (IOException e) {
                throw OutputException.of(next.target(), e);
            }
            waiting.remove();
        }
    }

    /** Removes what was not moved. */
    @Override
    public void close() {
        removeWaiting();
        tidyOnExit.withdraw();
    }

    private synchronized void removeWaiting() {
        for (Staged staged : waiting) {
            removeQuietly(staged.file());
        }
        waiting.clear();
    }

    private static void move(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static String newName() {
        long number = ThreadLocalRandom.current().nextLong(Long.MAX_VALUE);
        return ".gammawright-" + ProcessHandle.current().pid() + "-" + number + ".tmp";
    }

    private static void removeLeftOvers(Path folder) throws IOException {
        try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, ".gammawright-*.tmp")) {
            for (Path file : files) {
                Matcher name = NAME.matcher(file.getFileName().toString());
                if (name.matches() && !isRunning(name.group(1))) {
                    removeQuietly(file);
                }
            }
        }
    }

    private static boolean isRunning(String process) {
        try {
            return ProcessHandle.of(Long.parseLong(process)).isPresent();
        } catch (NumberFormatException e) {
            return false;
        }
    }

    private static void removeQuietly(Path file) {
        try {
            Files.deleteIfExists(file);
        } catch (IOException e) {
            // The next run tries again; a hidden temporary file is seen by no compiler.
            return;
        }
    }

    private record Staged(Path file, Path target) {}
}
