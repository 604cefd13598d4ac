package io.github.gammawright.diagnostic;

import java.util.Objects;

/**
 * The text of one definition, with the name under which messages refer to it.
 *
 * @param name the file as the user named it, or the name of a built-in definition
 * @param text the whole text, decoded
 */
public record SourceText(String name, String text) {

    public SourceText {
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(text, "text");
    }

    /** The line with the given one-based number, without its line terminator; empty when there is none. */
    public String line(int number) {
        int start = 0;
        for (int i = 1; i < number; i++) {
            int next = text.indexOf('\n', start);
            if (next < 0) {
                return "";
            }
            start = next + 1;
        }
        int end = text.indexOf('\n', start);
        if (end < 0) {
            end = text.length();
        }
        if (end > start && text.charAt(end - 1) == '\r') {
            end--;
        }
        return text.substring(start, end);
    }
}
