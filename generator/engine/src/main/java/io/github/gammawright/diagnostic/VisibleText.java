package io.github.gammawright.diagnostic;

/**
 * Makes text from a stranger's file safe to print: what a terminal would act upon, or not show at all, is replaced by
 * something visible.
 */
public final class VisibleText {

    private static final int CONTROL_PICTURES = 0x2400;
    private static final int DELETE = 0x7f;
    private static final int DELETE_PICTURE = 0x2421;
    private static final int LONGEST_ARGUMENT = 80;

    private VisibleText() {}

    /** The text with each unprintable character replaced. */
    public static String of(String text) {
        StringBuilder out = new StringBuilder(text.length());
        text.codePoints().forEach(c -> out.append(of(c)));
        return out.toString();
    }

    /** The same, cut to a length that fits into a message. */
    static String shortened(String text) {
        if (text.codePointCount(0, text.length()) <= LONGEST_ARGUMENT) {
            return of(text);
        }
        return of(text.substring(0, text.offsetByCodePoints(0, LONGEST_ARGUMENT))) + "…";
    }

    /** One character: itself, a control picture such as {@code ␛}, or an escape such as {@code \u202e}. */
    static String of(int codePoint) {
        if (codePoint < ' ') {
            return Character.toString(CONTROL_PICTURES + codePoint);
        }
        if (codePoint == DELETE) {
            return Character.toString(DELETE_PICTURE);
        }
        return switch (Character.getType(codePoint)) {
            // Format characters can reverse the order of what follows; separators break the line.
            case Character.CONTROL,
                    Character.FORMAT,
                    Character.SURROGATE,
                    Character.PRIVATE_USE,
                    Character.UNASSIGNED,
                    Character.LINE_SEPARATOR,
                    Character.PARAGRAPH_SEPARATOR -> escape(codePoint);
            default -> Character.toString(codePoint);
        };
    }

    private static String escape(int codePoint) {
        String digits = Integer.toHexString(codePoint);
        return digits.length() <= 4
                ? "\\u" + "0".repeat(4 - digits.length()) + digits
                : "\\U" + "0".repeat(8 - digits.length()) + digits;
    }
}
