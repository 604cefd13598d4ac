package io.github.gammawright.graph;

import java.util.Locale;

/** The functions beyond + − × / that a graph or a program applies to real numbers. */
public enum RealFunction {
    SQRT,
    /** The cube root, defined for negative arguments too. */
    CBRT,
    SIN,
    COS,
    TAN,
    ASIN,
    ACOS,
    ATAN,
    ATAN2,
    SINH,
    COSH,
    TANH,
    ASINH,
    ACOSH,
    ATANH,
    EXP,
    LOG,
    /** Base and exponent; the base is not negative. */
    POW,
    ABS,
    /** −1, 0 or 1 by the sign of the argument. */
    SIGNUM;

    /** The name under which operation counts list the function. */
    public String symbol() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** How many arguments the function takes. */
    public int arity() {
        return this == ATAN2 || this == POW ? 2 : 1;
    }
}
