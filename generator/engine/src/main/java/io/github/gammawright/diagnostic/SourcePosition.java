package io.github.gammawright.diagnostic;

import java.util.Comparator;

/**
 * A place in a definition: one-based line, one-based column (in Unicode code points), and how many code points from
 * there on are meant.
 */
public record SourcePosition(int line, int column, int length) implements Comparable<SourcePosition> {

    /** The place before the first character, for mistakes that concern the whole file. */
    public static final SourcePosition START = new SourcePosition(1, 1, 1);

    private static final Comparator<SourcePosition> ORDER =
            Comparator.comparingInt(SourcePosition::line).thenComparingInt(SourcePosition::column);

    @Override
    public int compareTo(SourcePosition other) {
        return ORDER.compare(this, other);
    }
}
