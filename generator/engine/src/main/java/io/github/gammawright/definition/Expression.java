package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.SourcePosition;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/**
 * An expression as its author wrote it: the parser's syntax tree. Numbers are exact rationals, names are not yet
 * resolved, and every node knows where it stands in the file.
 */
public sealed interface Expression {

    /** Where the expression stands in its file. */
    SourcePosition position();

    /** A decimal number, taken as the exact rational that it spells. */
    record Number(BigFraction value, SourcePosition position) implements Expression {}

    /** The circle's constant, the one name of a number that is special. */
    record Pi(SourcePosition position) implements Expression {}

    /** A coordinate, differential, parameter, abbreviation or function of the caller. */
    record Name(String name, SourcePosition position) implements Expression {}

    /** Unary minus; binds weaker than {@code ^}. */
    record Negation(Expression operand, SourcePosition position) implements Expression {}

    /** A binary operation; the position is that of the operator. */
    record Binary(Operator operator, Expression left, Expression right, SourcePosition position)
            implements Expression {}

    /** An elementary function applied to its arguments; the position is that of its name. */
    record Call(ElementaryFunction function, List<Expression> arguments, SourcePosition position)
            implements Expression {

        public Call {
            arguments = List.copyOf(arguments);
        }
    }

    /** The five binary operators. */
    enum Operator {
        ADD("+"),
        SUBTRACT("-"),
        MULTIPLY("*"),
        DIVIDE("/"),
        POWER("^");

        private final String symbol;

        Operator(String symbol) {
            this.symbol = symbol;
        }

        /** The operator as it is written in a definition. */
        public String symbol() {
            return symbol;
        }
    }
}
