package io.github.gammawright.diagnostic;

/** The line that a message is about, with a caret below the place; of a long line only what is round that place. */
final class Excerpt {

    private static final int LONGEST_LINE = 200;
    private static final int AROUND = 75;
    private static final String CUT = "…";

    private Excerpt() {}

    /**
     * Two lines, separated by a line feed.
     *
     * @param line without its line terminator
     * @param column one-based, in code points; may lie just behind the line
     */
    static String of(String line, int column) {
        int[] characters = line.codePoints().toArray();
        int caret = Math.min(Math.max(column - 1, 0), characters.length);
        int from = 0;
        int to = characters.length;
        if (characters.length > LONGEST_LINE) {
            from = Math.max(0, Math.min(caret - AROUND, characters.length - 2 * AROUND));
            to = Math.min(characters.length, from + 2 * AROUND);
        }
        StringBuilder shown = new StringBuilder();
        StringBuilder below = new StringBuilder();
        if (from > 0) {
            shown.append(CUT);
            below.append(' ');
        }
        for (int i = from; i < to; i++) {
            String visible = characters[i] == '\t' ? "\t" : VisibleText.of(characters[i]);
            shown.append(visible);
            if (i < caret) {
                below.append(blank(visible));
            }
        }
        if (to < characters.length) {
            shown.append(CUT);
        }
        return shown + "\n" + below + "^";
    }

    /** As wide as the character on a terminal; a tab stays a tab, so that its width does not matter. */
    private static String blank(String visible) {
        if (visible.equals("\t")) {
            return visible;
        }
        return " ".repeat(visible.codePoints().map(Excerpt::width).sum());
    }

    /** Columns on a terminal: Unicode Standard Annex 11, East Asian Width, its wide blocks. */
    private static int width(int c) {
        int type = Character.getType(c);
        if (type == Character.NON_SPACING_MARK || type == Character.ENCLOSING_MARK) {
            return 0;
        }
        boolean wide = between(c, 0x1100, 0x115f)
                || between(c, 0x2e80, 0x303e)
                || between(c, 0x3041, 0xa4cf)
                || between(c, 0xac00, 0xd7a3)
                || between(c, 0xf900, 0xfaff)
                || between(c, 0xfe30, 0xfe6f)
                || between(c, 0xff00, 0xff60)
                || between(c, 0xffe0, 0xffe6)
                || between(c, 0x1f300, 0x1f64f)
                || between(c, 0x1f900, 0x1f9ff)
                || between(c, 0x20000, 0x3fffd);
        return wide ? 2 : 1;
    }

    private static boolean between(int c, int first, int last) {
        return first <= c && c <= last;
    }
}
