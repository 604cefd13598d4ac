package io.github.gammawright.generation;

import io.github.gammawright.definition.ClassNames;
import io.github.gammawright.diagnostic.VisibleText;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** Names for packages and classes that come from a command line or a configuration. */
final class JavaNames {

    /** File systems allow 255 bytes; a nested class and {@code .class} need some of them. */
    private static final int LONGEST = 200;

    private JavaNames() {}

    /** What is wrong with a class name, if anything. */
    static Optional<String> complaintAboutClass(String name) {
        if (!ClassNames.isClassName(name)) {
            return complaint(name, "is not a name for a class");
        }
        return isTooLong(name) ? complaint(name, "is too long for the name of a file") : Optional.empty();
    }

    /** What is wrong with a package name, if anything; empty means the unnamed package. */
    static Optional<String> complaintAboutPackage(String name) {
        if (name.isEmpty()) {
            return Optional.empty();
        }
        if (!ClassNames.isPackageName(name)) {
            return complaint(name, "is not a name for a package");
        }
        if (name.equals("java") || name.startsWith("java.")) {
            return complaint(name, "is a package that only Java itself may have");
        }
        for (String part : name.split("\\.")) {
            if (isTooLong(part)) {
                return complaint(part, "is too long for the name of a folder");
            }
        }
        return Optional.empty();
    }

    private static boolean isTooLong(String name) {
        return name.getBytes(StandardCharsets.UTF_8).length > LONGEST;
    }

    private static Optional<String> complaint(String name, String what) {
        return Optional.of("'" + VisibleText.of(name) + "' " + what);
    }
}
