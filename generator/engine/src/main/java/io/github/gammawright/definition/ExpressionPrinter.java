package io.github.gammawright.definition;

import java.math.BigDecimal;
import java.math.BigInteger;
import org.hipparchus.fraction.BigFraction;

/**
 * Writes a syntax tree in the notation of definitions, with no more parentheses than are needed to read the same tree
 * again (and one pair round a sign behind an operator, which people expect).
 */
public final class ExpressionPrinter {

    private static final int SUM = 1;
    private static final int PRODUCT = 2;
    private static final int SIGN = 3;
    private static final int POWER = 4;
    private static final int ATOM = 5;
    private static final int LONGEST_PLAIN_NUMBER = 12;

    private final StringBuilder out = new StringBuilder();

    private ExpressionPrinter() {}

    /** The expression as a definition would hold it: {@code r^2*(1 + cos(theta)^2)}. */
    public static String print(Expression expression) {
        ExpressionPrinter printer = new ExpressionPrinter();
        printer.write(expression);
        return printer.out.toString();
    }

    private void write(Expression expression) {
        if (expression instanceof Expression.Number number) {
            out.append(number(number.value()));
        } else if (expression instanceof Expression.Pi) {
            out.append(Names.PI);
        } else if (expression instanceof Expression.Name name) {
            out.append(name.name());
        } else if (expression instanceof Expression.Negation negation) {
            out.append('-');
            writeAtLeast(POWER, negation.operand());
        } else if (expression instanceof Expression.Binary binary) {
            binary(binary);
        } else if (expression instanceof Expression.Call call) {
            call(call);
        }
    }

    private void binary(Expression.Binary binary) {
        int strength = strength(binary);
        boolean power = binary.operator() == Expression.Operator.POWER;
        writeAtLeast(power ? ATOM : strength, binary.left());
        String symbol = binary.operator().symbol();
        out.append(strength == SUM ? " " + symbol + " " : symbol);
        if (binary.right() instanceof Expression.Negation) {
            writeAtLeast(ATOM, binary.right());
        } else {
            writeAtLeast(power ? POWER : strength + 1, binary.right());
        }
    }

    private void call(Expression.Call call) {
        out.append(call.function().symbol()).append('(');
        String separator = "";
        for (Expression argument : call.arguments()) {
            out.append(separator);
            write(argument);
            separator = ", ";
        }
        out.append(')');
    }

    private void writeAtLeast(int strength, Expression expression) {
        boolean parentheses = strength(expression) < strength;
        out.append(parentheses ? "(" : "");
        write(expression);
        out.append(parentheses ? ")" : "");
    }

    private static int strength(Expression expression) {
        if (expression instanceof Expression.Binary binary) {
            return switch (binary.operator()) {
                case ADD, SUBTRACT -> SUM;
                case MULTIPLY, DIVIDE -> PRODUCT;
                case POWER -> POWER;
            };
        }
        return expression instanceof Expression.Negation ? SIGN : ATOM;
    }

    /** A decimal where that is exact, otherwise a fraction in parentheses, which the parser never makes. */
    private static String number(BigFraction value) {
        BigInteger twosAndFives = value.getDenominator();
        int digits = 0;
        BigInteger ten = BigInteger.TEN;
        while (!twosAndFives.equals(BigInteger.ONE)) {
            BigInteger common = twosAndFives.gcd(ten);
            if (common.equals(BigInteger.ONE)) {
                return "(" + value.getNumerator() + "/" + value.getDenominator() + ")";
            }
            twosAndFives = twosAndFives.divide(common);
            digits++;
        }
        BigDecimal decimal = new BigDecimal(value.getNumerator())
                .divide(new BigDecimal(value.getDenominator()), digits, java.math.RoundingMode.UNNECESSARY);
        String plain = decimal.toPlainString();
        String shortest = plain.length() <= LONGEST_PLAIN_NUMBER
                ? plain
                : decimal.stripTrailingZeros().toString().replace("E+", "E");
        return decimal.signum() < 0 ? "(" + shortest + ")" : shortest;
    }
}
