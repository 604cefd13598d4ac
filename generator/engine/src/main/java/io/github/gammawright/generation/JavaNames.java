package io.github.gammawright.generation;

import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.Set;
import javax.lang.model.SourceVersion;

/** Names for packages and classes as a compiler, a file system and a reader want them. */
final class JavaNames {

    /** Not keywords, but no class may be called so: Java Language Specification 17, section 3.9. */
    private static final Set<String> NO_CLASS = Set.of("permits", "record", "sealed", "var", "yield");

    /** File systems allow 255 bytes; a nested class and {@code .class} need some of them. */
    private static final int LONGEST = 200;

    private JavaNames() {}

    /** What is wrong with a class name, if anything. */
    static Optional<String> complaintAboutClass(String name) {
        if (!SourceVersion.isIdentifier(name) || isReserved(name)) {
            return Optional.of("'" + name + "' is not the name of a Java class");
        }
        return complaintAboutPart(name);
    }

    /** What is wrong with a package name, if anything; empty means the unnamed package. */
    static Optional<String> complaintAboutPackage(String name) {
        if (name.isEmpty()) {
            return Optional.empty();
        }
        for (String part : name.split("\\.", -1)) {
            if (!SourceVersion.isIdentifier(part) || SourceVersion.isKeyword(part, SourceVersion.RELEASE_17)) {
                return Optional.of("'" + name + "' is not the name of a Java package");
            }
            Optional<String> complaint = complaintAboutPart(part);
            if (complaint.isPresent()) {
                return complaint;
            }
        }
        return name.equals("java") || name.startsWith("java.")
                ? Optional.of("'" + name + "' belongs to Java itself; choose another package")
                : Optional.empty();
    }

    private static boolean isReserved(String name) {
        return SourceVersion.isKeyword(name, SourceVersion.RELEASE_17) || NO_CLASS.contains(name);
    }

    private static Optional<String> complaintAboutPart(String name) {
        // Invisible, and dropped by compilers: two names that look alike, or one that is no file's.
        if (name.codePoints().anyMatch(Character::isIdentifierIgnorable)) {
            return Optional.of("a Java name holds an invisible character");
        }
        return name.getBytes(StandardCharsets.UTF_8).length > LONGEST
                ? Optional.of("'" + name.substring(0, 40) + "…' is too long for the name of a file")
                : Optional.empty();
    }
}
