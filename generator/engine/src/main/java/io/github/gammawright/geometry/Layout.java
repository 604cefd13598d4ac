package io.github.gammawright.geometry;

import java.util.Locale;
import java.util.Optional;

/** How the components of a quantity are laid out in its array. */
public enum Layout {
    /** Row-major over all indices. */
    FULL,
    /** A symmetric pair i ≥ j stored once at i(i+1)/2 + j. */
    PACKED,
    /** Only the independent components that are not identically zero, in index order. */
    NON_ZERO;

    /** The name on the command line and in definitions. */
    public String symbol() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** The layout of the given name, if there is one. */
    public static Optional<Layout> named(String symbol) {
        for (Layout layout : values()) {
            if (layout.symbol().equals(symbol)) {
                return Optional.of(layout);
            }
        }
        return Optional.empty();
    }
}
