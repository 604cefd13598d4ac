package io.github.gammawright.maven;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/** Keeps a second build, in this process or another, out of a folder while one is at work there. */
final class FolderLock implements AutoCloseable {

    private static final long WAIT_MILLIS = 20;

    private final FileChannel channel;
    private final FileLock lock;

    private FolderLock(FileChannel channel, FileLock lock) {
        this.channel = channel;
        this.lock = lock;
    }

    /** Something done under the lock. */
    interface Work<T> {
        T run() throws IOException;
    }

    /** Waits until the lock beside the file is free, and takes it. */
    static FolderLock on(Path file) throws IOException {
        Path lockFile = file.resolveSibling(file.getFileName() + ".lock");
        Files.createDirectories(lockFile.toAbsolutePath().getParent());
        FileChannel channel = FileChannel.open(lockFile, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
        try {
            return new FolderLock(channel, acquire(channel));
        } catch (IOException | RuntimeException e) {
            channel.close();
            throw e;
        }
    }

    /** Does the work; a lock that is not held does nothing. */
    <T> T whileHeld(Work<T> work) throws IOException {
        if (!lock.isValid()) {
            throw new IOException("the lock was lost");
        }
        return work.run();
    }

    @Override
    public void close() throws IOException {
        channel.close();
    }

    private static FileLock acquire(FileChannel channel) throws IOException {
        while (true) {
            try {
                return channel.lock();
            } catch (OverlappingFileLockException e) {
                // Held by another thread of this process, for which the operating system does not wait.
                pause();
            }
        }
    }

    private static void pause() throws IOException {
        try {
            Thread.sleep(WAIT_MILLIS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IOException("interrupted while another build was at work in the same folder", e);
        }
    }
}
