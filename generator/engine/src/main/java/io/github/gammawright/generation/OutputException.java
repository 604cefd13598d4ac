package io.github.gammawright.generation;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.nio.file.ReadOnlyFileSystemException;

/** Classes could not be written. The message says what happened and how to mend it; no class is half-written. */
public final class OutputException extends IOException {

    OutputException(String message) {
        super(message);
    }

    OutputException(String message, Throwable cause) {
        super(message, cause);
    }

    /** What the file system said about a path, in one sentence. */
    static OutputException of(Path path, Exception cause) {
        return new OutputException("cannot write " + path + ": " + reason(path, cause), cause);
    }

    private static String reason(Path path, Exception cause) {
        if (cause instanceof AccessDeniedException) {
            return "permission denied; choose a folder that you may write to";
        }
        if (cause instanceof ReadOnlyFileSystemException) {
            return "the file system is read-only; choose another folder";
        }
        if (cause instanceof FileAlreadyExistsException exists) {
            return samePath(path, exists) ? "it is there already" : exists.getFile() + " is a file, not a folder";
        }
        if (cause instanceof NotDirectoryException || isNotDirectory(cause)) {
            return "one of the folders in this path is a file";
        }
        if (cause instanceof FileSystemException system && system.getReason() != null) {
            return lowerFirst(system.getReason());
        }
        return cause.getMessage() == null ? cause.getClass().getSimpleName() : lowerFirst(cause.getMessage());
    }

    private static boolean samePath(Path path, FileAlreadyExistsException cause) {
        return path.toString().equals(cause.getFile());
    }

    private static boolean isNotDirectory(Exception cause) {
        return cause instanceof FileSystemException system && "Not a directory".equals(system.getReason());
    }

    private static String lowerFirst(String text) {
        return text.isEmpty() ? text : Character.toLowerCase(text.charAt(0)) + text.substring(1);
    }
}
