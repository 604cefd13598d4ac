package io.github.gammawright.runtime.output;

import java.io.IOException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.UUID;

/** A file that is written beside its place and moved there when it is whole. */
final class PartFile {

    private final Path target;
    private final Path part;

    PartFile(Path target) throws IOException {
        this.target = target.toAbsolutePath();
        Path folder = this.target.getParent();
        Files.createDirectories(folder);
        // Not createTempFile: what it makes nobody else may read.
        this.part = folder.resolve(target.getFileName() + "." + UUID.randomUUID() + ".part");
        Files.createFile(part);
    }

    Path path() {
        return part;
    }

    void publish() throws IOException {
        try {
            Files.move(part, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException notAtomic) {
            Files.move(part, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    void discard() throws IOException {
        Files.deleteIfExists(part);
    }
}
