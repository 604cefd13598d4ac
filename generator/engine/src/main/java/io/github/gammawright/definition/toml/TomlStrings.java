package io.github.gammawright.definition.toml;

import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourceIndex;
import java.util.Arrays;

/**
 * Reads TOML's four kinds of string again, after the parser found them valid, to learn where each of their characters
 * stands in the file: TOML v1.0.0, section String.
 */
final class TomlStrings {

    private final SourceIndex index;
    private int[] characters = new int[64];
    private int[] offsets = new int[64];
    private int length;
    private int offset;

    private TomlStrings(SourceIndex index, int offset) {
        this.index = index;
        this.offset = offset;
    }

    /** The string whose opening quote stands at the offset. */
    static LocatedText read(SourceIndex index, int offset) {
        return new TomlStrings(index, offset).read();
    }

    private LocatedText read() {
        int quote = index.at(offset);
        boolean basic = quote == '"';
        boolean multiLine = index.at(offset + 1) == quote && index.at(offset + 2) == quote;
        offset += multiLine ? 3 : 1;
        if (multiLine) {
            skipFirstLineBreak();
        }
        while (offset < index.length() && !atEnd(quote, multiLine)) {
            int c = index.at(offset);
            if (basic && c == '\\') {
                escape();
            } else if (multiLine && c == '\r' && index.at(offset + 1) == '\n') {
                // A line break is one character, as the library reads it.
                offset++;
            } else {
                append(c, offset);
                offset++;
            }
        }
        int[] withEnd = Arrays.copyOf(offsets, length + 1);
        withEnd[length] = offset;
        return new LocatedText(index, Arrays.copyOf(characters, length), withEnd);
    }

    private void skipFirstLineBreak() {
        if (index.at(offset) == '\r' && index.at(offset + 1) == '\n') {
            offset += 2;
        } else if (index.at(offset) == '\n') {
            offset++;
        }
    }

    /** Up to two quotes may stand directly before the three that close a multi-line string. */
    private boolean atEnd(int quote, boolean multiLine) {
        if (index.at(offset) != quote) {
            return false;
        }
        return !multiLine
                || (index.at(offset + 1) == quote && index.at(offset + 2) == quote && index.at(offset + 3) != quote);
    }

    private void escape() {
        int start = offset;
        int letter = index.at(offset + 1);
        offset += 2;
        switch (letter) {
            case 'b' -> append('\b', start);
            case 't' -> append('\t', start);
            case 'n' -> append('\n', start);
            case 'f' -> append('\f', start);
            case 'r' -> append('\r', start);
            case 'u' -> appendHexadecimal(start, 4);
            case 'U' -> appendHexadecimal(start, 8);
            case ' ', '\t', '\r', '\n' -> skipWhiteSpace();
            default -> append(letter, start);
        }
    }

    /** A backslash at the end of a line: white space and line breaks up to the next character are not part. */
    private void skipWhiteSpace() {
        while (index.at(offset) == ' '
                || index.at(offset) == '\t'
                || index.at(offset) == '\r'
                || index.at(offset) == '\n') {
            offset++;
        }
    }

    private void appendHexadecimal(int start, int digits) {
        int c = 0;
        for (int i = 0; i < digits; i++) {
            c = 16 * c + Math.max(0, Character.digit(index.at(offset), 16));
            offset++;
        }
        append(c, start);
    }

    private void append(int c, int from) {
        if (length + 1 >= characters.length) {
            characters = Arrays.copyOf(characters, 2 * characters.length);
            offsets = Arrays.copyOf(offsets, 2 * offsets.length);
        }
        characters[length] = c;
        offsets[length] = from;
        length++;
    }
}
