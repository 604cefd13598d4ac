package io.github.gammawright.emission;

import java.util.Locale;

/** Makes text from a definition harmless inside comments, and wraps paragraphs. */
final class JavadocText {

    private static final int WIDTH = 112;

    private JavadocText() {}

    /**
     * The text for use in a documentation comment: markup, tags, the end of the comment and Unicode escapes (which Java
     * reads even in comments, The Java Language Specification, Java SE 17, section 3.3) are spelled as entities.
     */
    static String escape(String text) {
        StringBuilder escaped = new StringBuilder();
        text.codePoints().forEach(c -> {
            if (c == '\n') {
                escaped.append('\n');
            } else if (c < ' ' || (c >= 0x7F && c < 0xA0) || c == 0x2028 || c == 0x2029) {
                escaped.append(' ');
            } else if ("<>&@{}\\*/".indexOf(c) >= 0 && isDangerous(c, escaped)) {
                escaped.append("&#").append(c).append(';');
            } else if (isInvisible(c)) {
                escaped.append("&#x")
                        .append(Integer.toHexString(c).toUpperCase(Locale.ROOT))
                        .append(';');
            } else if (c >= 0xD800 && c < 0xE000) {
                escaped.append('?');
            } else {
                escaped.appendCodePoint(c);
            }
        });
        return escaped.toString();
    }

    /** A slash is harmless unless it ends a comment; the asterisk before it may come from another text. */
    private static boolean isDangerous(int c, StringBuilder before) {
        if (c == '*') {
            return false;
        }
        return c != '/' || before.isEmpty() || before.charAt(before.length() - 1) == '*';
    }

    /** What text files should not hold: controls, halves of characters, what changes direction or shows nothing. */
    static boolean isUnprintable(int c) {
        boolean control = c < ' ' || (c >= 0x7F && c < 0xA0) || c == 0x2028 || c == 0x2029;
        return control || isInvisible(c) || (c >= 0xD800 && c < 0xE000);
    }

    /** Characters that change the direction of text, or show nothing. */
    private static boolean isInvisible(int c) {
        return c == 0xAD
                || c == 0x61C
                || c == 0xFEFF
                || (c >= 0x200B && c <= 0x200F)
                || (c >= 0x202A && c <= 0x202E)
                || (c >= 0x2060 && c <= 0x206F)
                || c >= 0xE0000;
    }

    /** One line for a comment that ends with its line. */
    static String line(String text) {
        return escape(text.replace('\n', ' ')).replace("&#92;", "?");
    }

    /** A paragraph of text that is escaped already, in lines of moderate length. */
    static String wrap(String paragraph) {
        StringBuilder wrapped = new StringBuilder();
        int column = 0;
        for (String word : paragraph.strip().split("\\s+")) {
            if (column > 0 && column + 1 + word.length() > WIDTH) {
                wrapped.append('\n');
                column = 0;
            } else if (column > 0) {
                wrapped.append(' ');
                column++;
            }
            wrapped.append(word);
            column += word.length();
        }
        return wrapped.toString();
    }
}
