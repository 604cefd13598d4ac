package io.github.gammawright.definition;

import io.github.gammawright.definition.MetricDefinition.Comparison;
import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.hipparchus.fraction.BigFraction;

/**
 * Parses the expressions of one definition, by operator precedence (Pratt 1973).
 *
 * <p>From weakest to tightest: {@code + -}, {@code * /}, unary minus, {@code ^}. All group to the left but {@code ^},
 * which groups to the right: {@code -a^2^3} is {@code -(a^(2^3))}. Numbers are exact: {@code 0.1} is a tenth. There is
 * no implicit multiplication. {@code pi} and the {@link ElementaryFunction functions} have a meaning; every other name
 * is taken as it is.
 *
 * <p>Numbers of operations and nesting are limited. Long sums and products become trees of logarithmic height, so that
 * whoever visits a tree may do so by recursion.
 */
public final class ExpressionParser {

    private static final int SUM = 10;
    private static final int PRODUCT = 20;
    private static final int SIGN = 30;
    private static final int POWER = 40;

    private final Limits limits;
    private final Diagnostics diagnostics;
    private final Function<String, Optional<NameKind>> kinds;
    private int nodes;

    private LocatedText text;
    private Lexer lexer;
    private Token previous;
    private Token current;
    private int nesting;

    /**
     * A parser for the expressions of one definition.
     *
     * @param diagnostics is told of mistakes
     * @param kinds what names were declared as, for better messages; parsing does not depend on it
     */
    public ExpressionParser(Limits limits, Diagnostics diagnostics, Function<String, Optional<NameKind>> kinds) {
        this.limits = limits;
        this.diagnostics = diagnostics;
        this.kinds = kinds;
    }

    /** A parser with the usual limits that knows of no names. */
    public ExpressionParser(Diagnostics diagnostics) {
        this(Limits.DEFAULT, diagnostics, name -> Optional.empty());
    }

    /** Parses an expression; if it is wrong, reports its first mistake and gives nothing. */
    public Optional<Expression> parse(LocatedText expression) {
        if (isExhausted()) {
            return Optional.empty();
        }
        try {
            begin(expression);
            Part whole = operand(SUM);
            expectEnd();
            return checked(List.of(whole.expression())).map(e -> e.get(0));
        } catch (SyntaxMistake mistake) {
            diagnostics.add(mistake.diagnostic());
            return Optional.empty();
        }
    }

    /** Parses a comparison chain such as {@code 0 < theta < pi}; if it is wrong, reports so and gives nothing. */
    public Optional<MetricDefinition.Condition> parseCondition(LocatedText condition) {
        if (isExhausted()) {
            return Optional.empty();
        }
        try {
            begin(condition);
            List<Expression> operands = new ArrayList<>();
            List<Comparison> comparisons = new ArrayList<>();
            operands.add(operand(SUM).expression());
            while (current.is(Token.Kind.COMPARISON)) {
                comparisons.add(comparison(comparisons));
                operands.add(operand(SUM).expression());
            }
            expectEnd();
            SourcePosition position = text.position(0, text.length());
            if (comparisons.isEmpty()) {
                throw mistake(DiagnosticCode.COMPARISON_MISSING, position);
            }
            String written = text.toString().strip();
            return checked(operands).map(o -> new MetricDefinition.Condition(o, comparisons, written, position));
        } catch (SyntaxMistake mistake) {
            diagnostics.add(mistake.diagnostic());
            return Optional.empty();
        }
    }

    /** Once the definition is too large, that has been said, and nothing more is read. */
    private boolean isExhausted() {
        return nodes > limits.nodes();
    }

    private void begin(LocatedText expression) {
        text = expression;
        lexer = new Lexer(diagnostics.source(), expression);
        nesting = 0;
        current = lexer.next();
        previous = new Token(Token.Kind.END, "", 0, 0);
        if (current.is(Token.Kind.END)) {
            throw mistake(DiagnosticCode.EXPRESSION_EMPTY, text.position(0, text.length()));
        }
    }

    /** Constants are only looked at once the whole is known to be well formed. */
    private Optional<List<Expression>> checked(List<Expression> expressions) {
        ConstantCheck check = new ConstantCheck(limits, diagnostics);
        boolean sound = true;
        for (Expression expression : expressions) {
            sound &= check.check(expression).isPresent();
        }
        return sound ? Optional.of(expressions) : Optional.empty();
    }

    private void advance() {
        previous = current;
        current = lexer.next();
    }

    private Comparison comparison(List<Comparison> before) {
        Comparison found = null;
        for (Comparison comparison : Comparison.values()) {
            if (comparison.symbol().equals(current.text())) {
                found = comparison;
            }
        }
        if (!before.isEmpty()
                && before.get(0).symbol().charAt(0) != current.text().charAt(0)) {
            throw mistake(
                    DiagnosticCode.COMPARISONS_MIXED,
                    position(current),
                    before.get(before.size() - 1).symbol(),
                    current.text());
        }
        advance();
        return found;
    }

    /** What is left after an operand, where an expression should end. */
    private void expectEnd() {
        switch (current.kind()) {
            case END -> {}
            case CLOSE -> throw mistake(DiagnosticCode.PARENTHESIS_NOT_OPENED, position(current));
            case COMMA -> throw mistake(DiagnosticCode.COMMA_MISPLACED, position(current));
            default -> throw mistake(DiagnosticCode.COMPARISON_MISPLACED, position(current), current.text());
        }
    }

    /** An operand of an operator, with all operators in it that bind at least as tightly as the given strength. */
    private Part operand(int strength) {
        ChainBuilder chain = new ChainBuilder(this::binary);
        Part left = prefix();
        while (true) {
            if (current.beginsOperand()) {
                throw mistake(
                        DiagnosticCode.MULTIPLICATION_IMPLICIT, position(current), previous.text(), current.text());
            }
            int binding = binding(current);
            if (binding < strength) {
                return chain.close(left);
            }
            Token operator = current;
            advance();
            if (binding == POWER) {
                // Only a single operand can stand before: everything weaker has ended in a recursion of its own.
                enter(operator);
                Part exponent = operand(POWER);
                leave();
                left = binary(Expression.Operator.POWER, left, exponent, position(operator));
            } else {
                chain.add(left, binding, operator(operator), position(operator));
                left = operand(binding + 1);
            }
        }
    }

    private static int binding(Token token) {
        if (!token.is(Token.Kind.OPERATOR)) {
            return 0;
        }
        return switch (token.text()) {
            case "+", "-" -> SUM;
            case "*", "/" -> PRODUCT;
            default -> POWER;
        };
    }

    private static Expression.Operator operator(Token token) {
        return switch (token.text()) {
            case "+" -> Expression.Operator.ADD;
            case "-" -> Expression.Operator.SUBTRACT;
            case "*" -> Expression.Operator.MULTIPLY;
            default -> Expression.Operator.DIVIDE;
        };
    }

    private Part prefix() {
        Token token = current;
        switch (token.kind()) {
            case NUMBER -> {
                advance();
                return leaf(new Expression.Number(number(token), position(token)));
            }
            case NAME -> {
                advance();
                return name(token);
            }
            case OPEN -> {
                advance();
                enter(token);
                Part inside = operand(SUM);
                leave();
                expectClosing(token);
                return inside;
            }
            case OPERATOR -> {
                boolean minus = token.text().equals("-");
                if (!minus && !token.text().equals("+")) {
                    throw operandMissing(token);
                }
                advance();
                enter(token);
                Part signed = operand(SIGN);
                leave();
                return minus
                        ? node(new Expression.Negation(signed.expression(), position(token)), signed.height(), token)
                        : signed;
            }
            default -> throw operandMissing(token);
        }
    }

    private BigFraction number(Token token) {
        return NumberLiteral.value(token.text(), limits.digits())
                .orElseThrow(() -> mistake(DiagnosticCode.NUMBER_TOO_LONG, position(token), limits.digits()));
    }

    private Part name(Token token) {
        String name = token.text();
        Optional<ElementaryFunction> function = ElementaryFunction.named(name);
        if (current.is(Token.Kind.OPEN)) {
            return call(token, function.orElseThrow(() -> misapplied(token)));
        }
        if (function.isPresent()) {
            String remedy = current.text().equals("^")
                    ? "The exponent stands behind the argument: " + name + "(…)^2."
                    : DiagnosticCode.FUNCTION_WITHOUT_ARGUMENTS.remedy(name);
            throw mistakeWithRemedy(DiagnosticCode.FUNCTION_WITHOUT_ARGUMENTS, position(token), remedy, name);
        }
        return leaf(
                name.equals(Names.PI)
                        ? new Expression.Pi(position(token))
                        : new Expression.Name(name, position(token)));
    }

    private SyntaxMistake misapplied(Token token) {
        String name = token.text();
        Optional<NameKind> kind = kinds.apply(name);
        if (kind.isPresent() && kind.get() == NameKind.FUNCTION) {
            return mistake(DiagnosticCode.CALLER_FUNCTION_APPLIED, position(token), name);
        }
        if (kind.isPresent() || name.equals(Names.PI)) {
            return mistake(DiagnosticCode.NAME_APPLIED, position(token), name);
        }
        List<String> known = new ArrayList<>();
        for (ElementaryFunction function : ElementaryFunction.values()) {
            known.add(function.symbol());
        }
        return FunctionNames.replacement(name, known)
                .map(remedy -> mistakeWithRemedy(DiagnosticCode.FUNCTION_UNKNOWN, position(token), remedy, name))
                .orElseGet(() -> mistake(DiagnosticCode.FUNCTION_UNKNOWN, position(token), name, known));
    }

    private Part call(Token token, ElementaryFunction function) {
        Token opening = current;
        advance();
        List<Expression> arguments = new ArrayList<>();
        int height = 0;
        if (!current.is(Token.Kind.CLOSE)) {
            boolean more = true;
            while (more) {
                enter(opening);
                Part argument = operand(SUM);
                leave();
                arguments.add(argument.expression());
                height = Math.max(height, argument.height());
                more = current.is(Token.Kind.COMMA);
                if (more) {
                    advance();
                }
            }
        }
        expectClosing(opening);
        if (arguments.size() != function.arity()) {
            String needed = function.arity() == 1 ? "one argument" : "two arguments: " + function.symbol() + "(y, x)";
            throw mistake(
                    DiagnosticCode.ARITY_WRONG,
                    position(token),
                    function.symbol(),
                    needed,
                    arguments.isEmpty() ? "none" : arguments.size());
        }
        return node(new Expression.Call(function, arguments, position(token)), height, token);
    }

    private void expectClosing(Token opening) {
        if (current.is(Token.Kind.END)) {
            throw mistake(DiagnosticCode.PARENTHESIS_NOT_CLOSED, position(opening));
        }
        if (!current.is(Token.Kind.CLOSE)) {
            expectEnd();
        }
        advance();
    }

    private SyntaxMistake operandMissing(Token token) {
        if (token.is(Token.Kind.CLOSE) && nesting == 0) {
            return mistake(DiagnosticCode.PARENTHESIS_NOT_OPENED, position(token));
        }
        boolean first = previous.is(Token.Kind.END);
        String where = first ? "before '" + token.text() + "'" : "after '" + previous.text() + "'";
        String remedy = token.text().equals("*") && previous.text().equals("*")
                ? "A power is written with ^."
                : "Add it, or remove the '" + (first ? token.text() : previous.text()) + "'.";
        return mistakeWithRemedy(DiagnosticCode.OPERAND_MISSING, position(token), remedy, where);
    }

    private void enter(Token token) {
        nesting++;
        if (nesting > limits.nesting()) {
            throw mistake(DiagnosticCode.NESTING_TOO_DEEP, position(token), limits.nesting());
        }
    }

    private void leave() {
        nesting--;
    }

    private Part leaf(Expression expression) {
        return count(new Part(expression, 1), expression.position());
    }

    private Part node(Expression expression, int heightBelow, Token token) {
        return count(new Part(expression, heightBelow + 1), position(token));
    }

    private Part binary(Expression.Operator operator, Part left, Part right, SourcePosition position) {
        return count(
                new Part(
                        new Expression.Binary(operator, left.expression(), right.expression(), position),
                        Math.max(left.height(), right.height()) + 1),
                position);
    }

    private Part count(Part part, SourcePosition position) {
        nodes++;
        if (nodes > limits.nodes()) {
            throw mistake(DiagnosticCode.EXPRESSIONS_TOO_LARGE, position, limits.nodes());
        }
        if (part.height() > limits.height()) {
            throw mistake(DiagnosticCode.NESTING_TOO_DEEP, position, limits.height());
        }
        return part;
    }

    private SourcePosition position(Token token) {
        return text.position(token.from(), token.to());
    }

    private SyntaxMistake mistake(DiagnosticCode code, SourcePosition position, Object... arguments) {
        return new SyntaxMistake(Diagnostic.of(code, diagnostics.source(), position, arguments));
    }

    private SyntaxMistake mistakeWithRemedy(
            DiagnosticCode code, SourcePosition position, String remedy, Object... arguments) {
        return new SyntaxMistake(new Diagnostic(code, diagnostics.source(), position, code.message(arguments), remedy));
    }

    /** A finished subtree and how high it is. */
    record Part(Expression expression, int height) {}
}
