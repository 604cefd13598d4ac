package io.github.gammawright.definition;

import java.text.Normalizer;
import java.util.Set;

/** What may be the name of a coordinate, parameter, abbreviation or function. */
public final class Names {

    /** The longest name, in code points. */
    public static final int LONGEST = 100;

    /** The one constant with a name. */
    public static final String PI = "pi";

    private Names() {}

    /** The form in which names are compared: Unicode Standard Annex 15, form C. */
    public static String normalised(String name) {
        return Normalizer.normalize(name, Normalizer.Form.NFC);
    }

    /** Whether expressions can refer to the name, whatever it means in them. */
    public static boolean isName(String name) {
        int[] characters = name.codePoints().toArray();
        if (characters.length == 0 || characters.length > LONGEST || !isStart(characters[0])) {
            return false;
        }
        for (int c : characters) {
            if (!isPart(c)) {
                return false;
            }
        }
        return true;
    }

    /** Whether the name means the same in every definition: {@code pi} and the elementary functions. */
    public static boolean isReserved(String name) {
        return name.equals(PI) || ElementaryFunction.named(name).isPresent();
    }

    /** The name of the differential of a coordinate. */
    public static String differential(String coordinate) {
        return normalised("d" + coordinate);
    }

    /** Letters of any alphabet, and the underscore. */
    static boolean isStart(int c) {
        return c == '_' || (c >= 0 && Character.isLetter(c));
    }

    /** The same, digits of any alphabet, and marks such as accents that have no letter of their own. */
    static boolean isPart(int c) {
        return isStart(c) || (c >= 0 && (Character.isDigit(c) || isMark(c)));
    }

    private static boolean isMark(int c) {
        int type = Character.getType(c);
        return type == Character.NON_SPACING_MARK || type == Character.COMBINING_SPACING_MARK;
    }

    /** The reserved names, for suggestions. */
    static Set<String> reserved() {
        Set<String> names = new java.util.TreeSet<>();
        names.add(PI);
        for (ElementaryFunction function : ElementaryFunction.values()) {
            names.add(function.symbol());
        }
        return names;
    }
}
