package io.github.gammawright.verification;

import io.github.gammawright.definition.ElementaryFunction;
import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.Expression.Operator;
import io.github.gammawright.diagnostic.SourcePosition;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.hipparchus.fraction.BigFraction;

/** Makes syntax trees for tests from correct text, without the production parser and with no positions. */
public final class ExpressionText {

    private static final Pattern TOKEN = Pattern.compile("\\s*([0-9.]+|[\\p{L}_][\\p{L}\\p{N}_]*|[-+*/^(),])\\s*");

    private final List<String> tokens = new ArrayList<>();
    private int next;

    private ExpressionText(String text) {
        Matcher matcher = TOKEN.matcher(text);
        int end = 0;
        while (matcher.lookingAt()) {
            tokens.add(matcher.group(1));
            end = matcher.end();
            matcher.region(end, text.length());
        }
        if (end != text.length()) {
            throw new IllegalArgumentException(text.substring(end));
        }
        tokens.add("");
    }

    /** The tree of an expression. */
    public static Expression parse(String text) {
        ExpressionText parser = new ExpressionText(text);
        Expression expression = parser.sum();
        if (!parser.accept("")) {
            throw new IllegalArgumentException("cannot read " + text + " at " + parser.tokens.get(parser.next));
        }
        return expression;
    }

    private boolean accept(String token) {
        if (tokens.get(next).equals(token)) {
            next++;
            return true;
        }
        return false;
    }

    private Expression sum() {
        Expression left = product();
        while (true) {
            if (accept("+")) {
                left = binary(Operator.ADD, left, product());
            } else if (accept("-")) {
                left = binary(Operator.SUBTRACT, left, product());
            } else {
                return left;
            }
        }
    }

    private Expression product() {
        Expression left = signed();
        while (true) {
            if (accept("*")) {
                left = binary(Operator.MULTIPLY, left, signed());
            } else if (accept("/")) {
                left = binary(Operator.DIVIDE, left, signed());
            } else {
                return left;
            }
        }
    }

    private Expression signed() {
        return accept("-") ? new Expression.Negation(signed(), SourcePosition.START) : power();
    }

    private Expression power() {
        Expression base = primary();
        return accept("^") ? binary(Operator.POWER, base, signed()) : base;
    }

    private Expression primary() {
        if (accept("(")) {
            Expression inner = sum();
            accept(")");
            return inner;
        }
        String token = tokens.get(next++);
        if (Character.isDigit(token.charAt(0))) {
            BigDecimal value = new BigDecimal(token);
            BigFraction fraction =
                    new BigFraction(value.unscaledValue()).divide(new BigFraction(BigInteger.TEN.pow(value.scale())));
            return new Expression.Number(fraction, SourcePosition.START);
        }
        if (accept("(")) {
            List<Expression> arguments = new ArrayList<>();
            do {
                arguments.add(sum());
            } while (accept(","));
            accept(")");
            ElementaryFunction function = ElementaryFunction.named(token).orElseThrow();
            return new Expression.Call(function, arguments, SourcePosition.START);
        }
        return token.equals("pi")
                ? new Expression.Pi(SourcePosition.START)
                : new Expression.Name(token, SourcePosition.START);
    }

    private static Expression binary(Operator operator, Expression left, Expression right) {
        return new Expression.Binary(operator, left, right, SourcePosition.START);
    }
}
