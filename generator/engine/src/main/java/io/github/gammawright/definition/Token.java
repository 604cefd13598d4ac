package io.github.gammawright.definition;

/**
 * A token of an expression.
 *
 * @param text as it is written; a name normalised
 * @param from where it begins in the expression's text
 * @param to behind its last character
 */
record Token(Kind kind, String text, int from, int to) {

    enum Kind {
        NUMBER,
        NAME,
        OPERATOR,
        OPEN,
        CLOSE,
        COMMA,
        COMPARISON,
        END
    }

    boolean is(Kind other) {
        return kind == other;
    }

    /** Whether an operand can begin with it, signs aside. */
    boolean beginsOperand() {
        return kind == Kind.NUMBER || kind == Kind.NAME || kind == Kind.OPEN;
    }
}
