package io.github.gammawright.generation;

import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.SourceText;

/** Finds where a value stands that was read from a definition, for messages about it. */
final class SourceSearch {

    private SourceSearch() {}

    /** The first string of that value in the text, or else the start of the text. */
    static SourcePosition quoted(SourceText source, String value) {
        return quoted(source, value, SourcePosition.START);
    }

    /** The first string of that value at or behind a position, or else the position itself. */
    static SourcePosition quoted(SourceText source, String value, SourcePosition from) {
        int lines = (int) source.text().lines().count();
        for (int number = from.line(); number <= lines; number++) {
            String line = source.line(number);
            int start = number == from.line()
                    ? line.offsetByCodePoints(0, Math.min(from.column() - 1, line.codePointCount(0, line.length())))
                    : 0;
            int found = first(line.indexOf('"' + value + '"', start), line.indexOf('\'' + value + '\'', start));
            if (found >= 0) {
                return new SourcePosition(
                        number, line.codePointCount(0, found + 1) + 1, value.codePointCount(0, value.length()));
            }
        }
        return from;
    }

    private static int first(int a, int b) {
        return a < 0 || (b >= 0 && b < a) ? b : a;
    }
}
