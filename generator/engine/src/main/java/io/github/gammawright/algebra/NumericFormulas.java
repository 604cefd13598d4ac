package io.github.gammawright.algebra;

import io.github.gammawright.definition.Expression;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.matheclipse.parser.client.ast.ASTNode;
import org.matheclipse.parser.client.eval.DoubleEvaluator;
import org.matheclipse.parser.client.eval.DoubleVariable;

/**
 * Formulas evaluated by Symja's numeric evaluator, its fastest way from a formula to a double: something to compare
 * kernels with, in speed and in value. Generation makes no use of it.
 *
 * <p>Symja sees numbers, operators, elementary functions and numbered names only, all written
 * from our own syntax tree.
 */
public final class NumericFormulas {

    private final DoubleEvaluator evaluator = new DoubleEvaluator();
    private final List<DoubleVariable> variables = new ArrayList<>();
    private final List<ASTNode> formulas = new ArrayList<>();

    /**
     * Takes formulas in some symbols.
     *
     * @throws IllegalArgumentException if a formula has a name that is none of the symbols, or a function that Symja's evaluator lacks
     */
    public NumericFormulas(List<String> symbols, List<Expression> formulas) {
        for (int i = 0; i < symbols.size(); i++) {
            DoubleVariable variable = new DoubleVariable(0);
            evaluator.defineVariable(variableName(i), variable);
            variables.add(variable);
        }
        for (Expression formula : formulas) {
            this.formulas.add(evaluator.parse(written(formula, symbols)));
        }
    }

    /**
     * Evaluates all formulas.
     *
     * @param values one for each symbol
     * @param results receives one value for each formula
     */
    public void evaluate(double[] values, double[] results) {
        for (int i = 0; i < variables.size(); i++) {
            variables.get(i).setValue(values[i]);
        }
        for (int i = 0; i < formulas.size(); i++) {
            results[i] = evaluator.evaluateNode(formulas.get(i));
        }
    }

    private static String variableName(int symbol) {
        return "v" + symbol;
    }

    private static String written(Expression expression, List<String> symbols) {
        if (expression instanceof Expression.Number number) {
            if (number.value().getDenominator().equals(BigInteger.ONE)) {
                return number.value().getNumerator().toString();
            }
            return "(" + number.value().getNumerator() + "/" + number.value().getDenominator() + ")";
        }
        if (expression instanceof Expression.Pi) {
            return "Pi";
        }
        if (expression instanceof Expression.Name name) {
            int symbol = symbols.indexOf(name.name());
            if (symbol < 0) {
                throw new IllegalArgumentException("'" + name.name() + "' is none of " + symbols);
            }
            return variableName(symbol);
        }
        if (expression instanceof Expression.Negation negation) {
            return "(-(" + written(negation.operand(), symbols) + "))";
        }
        if (expression instanceof Expression.Binary binary) {
            return "(" + written(binary.left(), symbols) + binary.operator().symbol() + written(binary.right(), symbols)
                    + ")";
        }
        Expression.Call call = (Expression.Call) expression;
        return function(call)
                + call.arguments().stream()
                        .map(argument -> written(argument, symbols))
                        .collect(Collectors.joining(",", "[", "]"));
    }

    private static String function(Expression.Call call) {
        return switch (call.function()) {
            case SIN -> "Sin";
            case COS -> "Cos";
            case TAN -> "Tan";
            case ASIN -> "ArcSin";
            case ACOS -> "ArcCos";
            case ATAN -> "ArcTan";
            case SINH -> "Sinh";
            case COSH -> "Cosh";
            case TANH -> "Tanh";
            case EXP -> "Exp";
            case LOG -> "Log";
            case SQRT -> "Sqrt";
            case ABS -> "Abs";
            default ->
                throw new IllegalArgumentException(
                        "'" + call.function().symbol() + "' is not among the functions that can be compared");
        };
    }
}
