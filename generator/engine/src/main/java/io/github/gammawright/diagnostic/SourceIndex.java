package io.github.gammawright.diagnostic;

import java.util.Arrays;

/**
 * Finds lines and columns in a text quickly: offsets count code points from 0, lines and columns from 1. A line ends
 * with a line feed.
 */
public final class SourceIndex {

    private final int[] characters;
    private final int[] lineStarts;

    /** Reads the text once. */
    public SourceIndex(SourceText source) {
        characters = source.text().codePoints().toArray();
        int lines = 1;
        for (int c : characters) {
            if (c == '\n') {
                lines++;
            }
        }
        lineStarts = new int[lines];
        int line = 1;
        for (int i = 0; i < characters.length; i++) {
            if (characters[i] == '\n') {
                lineStarts[line++] = i + 1;
            }
        }
    }

    /** How many code points the text has. */
    public int length() {
        return characters.length;
    }

    /** The code point there, or −1 outside the text. */
    public int at(int offset) {
        return offset < 0 || offset >= characters.length ? -1 : characters[offset];
    }

    /** The text from one offset up to, and without, another. */
    public String text(int from, int to) {
        return new String(characters, from, to - from);
    }

    /** The offset of a line and column; a place outside the text gives the nearest one in it or its end. */
    public int offset(int line, int column) {
        if (line > lineStarts.length) {
            return characters.length;
        }
        return Math.min(lineStarts[Math.max(line, 1) - 1] + Math.max(column, 1) - 1, characters.length);
    }

    /** The line and column of an offset. */
    public SourcePosition position(int offset, int length) {
        int found = Arrays.binarySearch(lineStarts, offset);
        int line = found >= 0 ? found : -found - 2;
        return new SourcePosition(line + 1, offset - lineStarts[line] + 1, length);
    }
}
