package io.github.gammawright.definition.toml;

import io.github.gammawright.diagnostic.SourceIndex;
import io.github.gammawright.diagnostic.SourcePosition;

/** Finds keys and values in the text of a file that is known to be valid, from where its parser says an entry begins. */
final class TomlPlaces {

    private final SourceIndex index;

    TomlPlaces(SourceIndex index) {
        this.index = index;
    }

    /** The place of a key, of a dotted one the part of that name, given where the entry or header begins. */
    SourcePosition keyPosition(int entry, String key) {
        int offset = skipHeaderBrackets(entry);
        while (true) {
            int end = skipKeyPart(offset);
            if (end <= offset) {
                return index.position(entry, 1);
            }
            String part = index.text(offset, end);
            int next = skipSpaces(end);
            boolean isLast = index.at(next) != '.';
            if (isLast || part.equals(key) || unquoted(part).equals(key)) {
                return index.position(offset, end - offset);
            }
            offset = skipSpaces(next + 1);
        }
    }

    /** Where the value of the entry begins; of a header, the header itself. */
    int valueOffset(int entry) {
        if (index.at(entry) == '[') {
            return entry;
        }
        int offset = entry;
        while (true) {
            int end = skipKeyPart(offset);
            int next = skipSpaces(end);
            if (index.at(next) == '=') {
                return skipSpaces(next + 1);
            }
            if (index.at(next) != '.' || end <= offset) {
                return entry;
            }
            offset = skipSpaces(next + 1);
        }
    }

    /** Past white space, line breaks and comments, as they may stand between the elements of an array. */
    int skipBlanks(int from) {
        int offset = from;
        while (true) {
            int c = index.at(offset);
            if (c == ' ' || c == '\t' || c == '\r' || c == '\n') {
                offset++;
            } else if (c == '#') {
                while (offset < index.length() && index.at(offset) != '\n') {
                    offset++;
                }
            } else {
                return offset;
            }
        }
    }

    private int skipHeaderBrackets(int from) {
        int offset = from;
        while (index.at(offset) == '[') {
            offset++;
        }
        return offset == from ? from : skipSpaces(offset);
    }

    private int skipKeyPart(int from) {
        int quote = index.at(from);
        int offset = from;
        if (quote == '"' || quote == '\'') {
            offset++;
            while (offset < index.length() && index.at(offset) != quote && index.at(offset) != '\n') {
                offset += quote == '"' && index.at(offset) == '\\' ? 2 : 1;
            }
            return Math.min(offset + 1, index.length());
        }
        while (isBare(index.at(offset))) {
            offset++;
        }
        return offset;
    }

    private int skipSpaces(int from) {
        int offset = from;
        while (index.at(offset) == ' ' || index.at(offset) == '\t') {
            offset++;
        }
        return offset;
    }

    private static boolean isBare(int c) {
        return c == '_' || c == '-' || (c > 0 && c < 0x80 && Character.isLetterOrDigit(c));
    }

    private String unquoted(String part) {
        boolean quoted = part.length() > 1 && (part.charAt(0) == '"' || part.charAt(0) == '\'');
        return quoted ? part.substring(1, part.length() - 1) : part;
    }
}
