package io.github.gammawright.graph;

import java.util.List;

/**
 * A value that an evaluation is given: a leaf of the graph.
 *
 * @param kind where the value comes from
 * @param name the author's name of it; for the entries of a vector the coordinate they belong to
 * @param index the position among the symbols of its kind
 * @param orders for a caller's function, how often it is differentiated by each of its own arguments, in their order;
 *     empty for all other kinds
 */
public record Symbol(Kind kind, String name, int index, List<Integer> orders) {

    public Symbol {
        orders = List.copyOf(orders);
    }

    /** A symbol that is no caller's function. */
    public static Symbol of(Kind kind, String name, int index) {
        return new Symbol(kind, name, index, List.of());
    }

    /** Whether the value is fixed once the parameters are. */
    public boolean isParameter() {
        return kind == Kind.PARAMETER;
    }

    /** Where the value of a symbol comes from. */
    public enum Kind {
        PARAMETER,
        COORDINATE,
        /** A function of coordinates that the caller supplies, or a partial derivative of it. */
        CALLER_FUNCTION,
        VELOCITY,
        /** dx^k/dx^0, counted from 0 for the second coordinate. */
        COORDINATE_VELOCITY,
        MOMENTUM,
        VECTOR,
        SEPARATION
    }
}
