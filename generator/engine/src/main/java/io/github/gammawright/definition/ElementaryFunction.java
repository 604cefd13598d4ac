package io.github.gammawright.definition;

import java.util.Locale;
import java.util.Optional;

/** The functions that a definition may apply, by the names under which it does. */
public enum ElementaryFunction {
    SIN,
    COS,
    TAN,
    ASIN,
    ACOS,
    ATAN,
    /** The angle of the point (x, y), as {@code atan2(y, x)}. */
    ATAN2,
    SINH,
    COSH,
    TANH,
    ASINH,
    ACOSH,
    ATANH,
    EXP,
    /** The natural logarithm. */
    LOG,
    SQRT,
    ABS;

    /** The name in definitions. */
    public String symbol() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** How many arguments the function takes. */
    public int arity() {
        return this == ATAN2 ? 2 : 1;
    }

    /** The function of the given name, if there is one. */
    public static Optional<ElementaryFunction> named(String symbol) {
        for (ElementaryFunction function : values()) {
            if (function.symbol().equals(symbol)) {
                return Optional.of(function);
            }
        }
        return Optional.empty();
    }
}
