package io.github.gammawright.definition;

import java.util.Locale;
import java.util.Set;
import java.util.regex.Pattern;
import javax.lang.model.SourceVersion;

/** The Java names that come from a definition. */
public final class ClassNames {

    /** The longest name of a definition. */
    public static final int LONGEST = 64;

    private static final Pattern DEFINITION_NAME = Pattern.compile("[a-z][a-z0-9]*(-[a-z0-9]+)*");

    /** Java 17 lets these be names, but not of classes (JLS 17, section 3.9). */
    private static final Set<String> NOT_FOR_CLASSES = Set.of("var", "yield", "record", "sealed", "permits");

    /** A class of one of these names would take the place of the one that generated code means. */
    private static final Set<String> USED_BY_KERNELS = Set.of(
            "Arrays",
            "Double",
            "IllegalArgumentException",
            "Integer",
            "Math",
            "Object",
            "Override",
            "Serializable",
            "StrictMath",
            "String",
            "SuppressWarnings");

    private ClassNames() {}

    /** Whether a definition may have the name: lower-case words of ASCII letters and digits joined by hyphens. */
    public static boolean isDefinitionName(String name) {
        return name.length() <= LONGEST && DEFINITION_NAME.matcher(name).matches();
    }

    /**
     * What the classes of a definition begin with: {@code lantern-star} gives {@code LanternStar}, {@code star-2d}
     * gives {@code Star2d}. A legal Java identifier, since a definition's name begins with a letter.
     *
     * @throws IllegalArgumentException if no definition can have the name
     */
    public static String prefix(String definitionName) {
        if (!isDefinitionName(definitionName)) {
            throw new IllegalArgumentException("not the name of a definition: " + definitionName);
        }
        StringBuilder prefix = new StringBuilder();
        for (String word : definitionName.split("-")) {
            prefix.append(word.substring(0, 1).toUpperCase(Locale.ROOT)).append(word.substring(1));
        }
        return prefix.toString();
    }

    /** Whether a kernel class may have the name: a Java identifier that hides none that the kernel uses. */
    public static boolean isClassName(String name) {
        return SourceVersion.isIdentifier(name)
                && !SourceVersion.isKeyword(name, SourceVersion.RELEASE_17)
                && !NOT_FOR_CLASSES.contains(name)
                && !USED_BY_KERNELS.contains(name)
                && isVisible(name);
    }

    /** Whether kernels may be in the package of that name. */
    public static boolean isPackageName(String name) {
        return SourceVersion.isName(name, SourceVersion.RELEASE_17) && isVisible(name);
    }

    /** Java ignores some characters in identifiers; two names that look the same must be the same. */
    private static boolean isVisible(String name) {
        return name.codePoints().noneMatch(Character::isIdentifierIgnorable);
    }
}
