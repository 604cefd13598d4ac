package io.github.gammawright.definition;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Numbers expressions so that two have the same number if they differ only in the order and grouping of sums and
 * products. Nothing is multiplied out and no constant is folded: different numbers do not mean different values.
 */
final class CanonicalForms {

    private final Map<String, Integer> numbers = new HashMap<>();

    /** The number of an expression; comparable with others from the same object. */
    int numberOf(Expression expression) {
        if (expression instanceof Expression.Number number) {
            return number("n" + number.value());
        }
        if (expression instanceof Expression.Name name) {
            return number("v" + name.name());
        }
        if (expression instanceof Expression.Pi) {
            return number(Names.PI);
        }
        if (expression instanceof Expression.Call call) {
            StringBuilder key = new StringBuilder(call.function().symbol());
            call.arguments().forEach(argument -> key.append(' ').append(numberOf(argument)));
            return number(key.toString());
        }
        if (expression instanceof Expression.Binary power && power.operator() == Expression.Operator.POWER) {
            return number("^ " + numberOf(power.left()) + " " + numberOf(power.right()));
        }
        List<String> operands = new ArrayList<>();
        boolean product = isProduct(expression);
        collect(expression, product, false, operands);
        Collections.sort(operands);
        return number((product ? "* " : "+ ") + String.join(" ", operands));
    }

    /** The operands of a whole chain; those that are subtracted or divided by are marked. */
    private void collect(Expression expression, boolean product, boolean inverse, List<String> operands) {
        if (expression instanceof Expression.Negation negation && !product) {
            collect(negation.operand(), false, !inverse, operands);
        } else if (expression instanceof Expression.Binary binary
                && binary.operator() != Expression.Operator.POWER
                && isProduct(binary) == product) {
            boolean turns = binary.operator() == Expression.Operator.SUBTRACT
                    || binary.operator() == Expression.Operator.DIVIDE;
            collect(binary.left(), product, inverse, operands);
            collect(binary.right(), product, inverse ^ turns, operands);
        } else {
            operands.add((inverse ? "-" : "") + numberOf(expression));
        }
    }

    private static boolean isProduct(Expression expression) {
        return expression instanceof Expression.Binary binary
                && (binary.operator() == Expression.Operator.MULTIPLY
                        || binary.operator() == Expression.Operator.DIVIDE);
    }

    private int number(String key) {
        return numbers.computeIfAbsent(key, k -> numbers.size());
    }
}
