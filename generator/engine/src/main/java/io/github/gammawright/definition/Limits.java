package io.github.gammawright.definition;

/**
 * How large a definition may be. The defaults are far above what any metric needs; they keep a stranger's file from
 * exhausting stack, memory or patience.
 *
 * @param fileBytes size of the file
 * @param nesting how deep parentheses, function calls, signs and exponents may be nested in an expression
 * @param height how high a syntax tree may be, and, with the abbreviations put in, four times that: visitors may recurse
 * @param nodes numbers, names and operations in all expressions of a definition together
 * @param exponent size of a constant exponent; ten times that for powers of powers
 * @param constantBits binary digits of the numerator and denominator of a constant
 * @param digits digits of a number as it is written, and size of its decimal exponent
 * @param constantCalls function calls in the constant expressions of a definition, which are evaluated in many digits
 */
public record Limits(
        int fileBytes,
        int nesting,
        int height,
        int nodes,
        int exponent,
        int constantBits,
        int digits,
        int constantCalls) {

    /** What holds where nothing else is said. */
    public static final Limits DEFAULT = new Limits(1 << 20, 250, 1_000, 200_000, 1_000, 8_192, 1_000, 500);
}
