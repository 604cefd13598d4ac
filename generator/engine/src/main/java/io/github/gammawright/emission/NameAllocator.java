package io.github.gammawright.emission;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

/**
 * Makes distinct, legal Java identifiers from names in any alphabet. Letters are kept where every Java compiler since
 * version 8 takes them, so that the outcome does not depend on the Unicode tables of the running JVM.
 */
final class NameAllocator {

    private static final Set<String> RESERVED = Set.of(
            // keywords, literals and contextual keywords: The Java Language Specification, Java SE 17, section 3.9
            ("abstract assert boolean break byte case catch char class const continue default do double else enum "
                            + "extends final finally float for goto if implements import instanceof int interface long "
                            + "native new package private protected public return short static strictfp super switch "
                            + "synchronized this throw throws transient try void volatile while true false null _ "
                            + "exports module non open opens permits provides record requires sealed to transitive "
                            + "uses var when with yield "
                            // a variable of these names would hide a package or type that the class uses (6.4.2)
                            + "java Math String Object Override SuppressWarnings Arrays Objects Serializable "
                            + "IllegalArgumentException Double Integer Functions")
                    .split(" "));

    private final Set<String> used;
    private final Map<String, Integer> counters = new HashMap<>();

    NameAllocator() {
        this.used = new HashSet<>(RESERVED);
    }

    private NameAllocator(Set<String> used) {
        this.used = new HashSet<>(used);
    }

    /** An allocator that knows all names given so far and forgets what is given later by either. */
    NameAllocator copy() {
        return new NameAllocator(used);
    }

    /** Keeps a name from being given. */
    void reserve(String name) {
        used.add(name);
    }

    boolean isFree(String name) {
        return !used.contains(name);
    }

    /** An identifier as close to the wanted name as is legal and not yet given. */
    String allocate(String wanted) {
        String identifier = identifier(wanted);
        String candidate = identifier;
        for (int i = 1; !used.add(candidate); i++) {
            candidate = i == 1 ? identifier + "_" : identifier + "_" + i;
        }
        return candidate;
    }

    /** The next free name of a numbered series: {@code t1, t2, …}. */
    String next(String prefix) {
        int number = counters.getOrDefault(prefix, 0);
        String candidate;
        do {
            number++;
            candidate = prefix + number;
        } while (!used.add(candidate));
        counters.put(prefix, number);
        return candidate;
    }

    /** A legal identifier, keyword or not; what no Java compiler takes is spelled by its code point. */
    static String identifier(String name) {
        StringBuilder identifier = new StringBuilder();
        name.codePoints().forEach(c -> {
            boolean digit = (c >= '0' && c <= '9') || c == '_';
            if (isLetter(c) || (digit && !identifier.isEmpty())) {
                identifier.appendCodePoint(c);
            } else if (digit) {
                identifier.append('_').appendCodePoint(c);
            } else {
                identifier.append(identifier.isEmpty() ? "u" : "_u");
                identifier.append(Integer.toHexString(c).toUpperCase(Locale.ROOT));
            }
        });
        return identifier.isEmpty() ? "unnamed" : identifier.toString();
    }

    /** Letters of blocks that are settled since Unicode 6.0: Latin, Greek, Cyrillic, kana and the common ideographs. */
    private static boolean isLetter(int c) {
        boolean settled = c < 0x0500 || (c >= 0x1E00 && c < 0x2000) || (c >= 0x3041 && c < 0x3100) || isIdeograph(c);
        return settled && Character.isLetter(c);
    }

    private static boolean isIdeograph(int c) {
        return c >= 0x4E00 && c < 0x9FA6;
    }
}
