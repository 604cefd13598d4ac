package io.github.gammawright.maven;

/**
 * Java source without letters beyond ASCII (Java Language Specification, section 3.3), for projects whose compiler does
 * not read UTF-8.
 */
final class UnicodeEscapes {

    private UnicodeEscapes() {}

    /** The same source with every other character escaped. */
    static String escape(String source) {
        StringBuilder escaped = new StringBuilder(source.length());
        for (int i = 0; i < source.length(); i++) {
            char c = source.charAt(i);
            if (c < 0x80) {
                escaped.append(c);
            } else {
                escaped.append(String.format("\\u%04x", (int) c));
            }
        }
        return escaped.toString();
    }
}
