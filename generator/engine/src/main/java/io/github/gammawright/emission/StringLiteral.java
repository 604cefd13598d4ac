package io.github.gammawright.emission;

/** Writes text from a definition as a Java string literal that shows all that is in it. */
final class StringLiteral {

    private StringLiteral() {}

    /** The literal; what is invisible, or would end it, is spelled by escapes. */
    static String of(String text) {
        StringBuilder literal = new StringBuilder("\"");
        text.codePoints().forEach(c -> {
            if (c == '"' || c == '\\') {
                literal.append('\\').append((char) c);
            } else if (c < ' ') {
                literal.append(String.format("\\%03o", c));
            } else if (JavadocText.isUnprintable(c)) {
                for (char unit : Character.toChars(c)) {
                    literal.append(String.format("\\u%04X", (int) unit));
                }
            } else {
                literal.appendCodePoint(c);
            }
        });
        return literal.append('"').toString();
    }
}
