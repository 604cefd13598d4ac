package io.github.gammawright.definition;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.hipparchus.fraction.BigFraction;

class ExpressionPropertiesTest {

    private static final SourcePosition NOWHERE = SourcePosition.START;

    @Property
    void whatIsPrintedIsReadAsTheSameTree(@ForAll("trees") Expression tree) {
        String printed = ExpressionPrinter.print(tree);
        assertThat(Expressions.sameTree(Parsing.parse(printed), tree))
                .as(printed)
                .isTrue();
    }

    /** The parser may group a long sum or product as it likes; its value, taken exactly, must stay. */
    @Property
    void longChainsAreReadAgainWithTheSameValue(@ForAll("chains") String chain) {
        Expression tree = Parsing.parse(chain);
        String printed = ExpressionPrinter.print(tree);
        assertThat(value(Parsing.parse(printed))).isEqualTo(value(tree));
    }

    /** The value at x = 7/2, y = 5/3 and so on, with a sine that is the identity. */
    private static BigFraction value(Expression expression) {
        if (expression instanceof Expression.Number number) {
            return number.value();
        }
        if (expression instanceof Expression.Name name) {
            return new BigFraction(
                    3 + name.name().codePointAt(0) % 7, 2 + name.name().codePointAt(0) % 5);
        }
        if (expression instanceof Expression.Negation negation) {
            return value(negation.operand()).negate();
        }
        if (expression instanceof Expression.Call call) {
            return value(call.arguments().get(0));
        }
        Expression.Binary binary = (Expression.Binary) expression;
        BigFraction left = value(binary.left());
        BigFraction right = value(binary.right());
        return switch (binary.operator()) {
            case ADD -> left.add(right);
            case SUBTRACT -> left.subtract(right);
            case MULTIPLY -> left.multiply(right);
            case DIVIDE -> left.divide(right);
            case POWER -> left.pow(right.intValue());
        };
    }

    @Property
    void anyTextIsReadOrRefusedWithAPlace(@ForAll String text) {
        readOrRefused(text);
    }

    @Property
    void anySequenceOfTokensIsReadOrRefusedWithAPlace(@ForAll("tokens") List<String> tokens) {
        readOrRefused(String.join("", tokens));
    }

    private static void readOrRefused(String text) {
        try {
            String printed = ExpressionPrinter.print(Parsing.parse(text));
            assertThat(ExpressionPrinter.print(Parsing.parse(printed))).isEqualTo(printed);
        } catch (DefinitionException refused) {
            assertThat(refused.diagnostics()).isNotEmpty().allSatisfy(diagnostic -> {
                assertThat(diagnostic.render()).matches("(?s)x:\\d+:\\d+: .+\n.*\n.*\\^(\n.+)?");
                long lines = text.chars().filter(c -> c == '\n').count() + 1;
                assertThat(diagnostic.position().line()).isBetween(1, (int) lines);
                String line = diagnostic.source().line(diagnostic.position().line());
                assertThat(diagnostic.position().column()).isBetween(1, line.codePointCount(0, line.length()) + 2);
            });
        }
    }

    @Provide
    Arbitrary<List<String>> tokens() {
        return Arbitraries.of(
                        "x", "sin", "pi", "(", ")", "+", "-", "*", "/", "^", ",", "1", "2.5", "1e3", ".", "<", " ",
                        "\n", "sin(", "atan2(", "Σ", "²", "9", "\u202e")
                .list()
                .ofMaxSize(40);
    }

    @Provide
    Arbitrary<String> chains() {
        Arbitrary<String> operands = Arbitraries.of("x", "y^2", "3", "sin(x)", "(a - b)");
        Arbitrary<String> operators = Arbitraries.of("+", "-", "*", "/", "*", "*");
        return Combinators.combine(operands, operators)
                .as((operand, operator) -> operand + operator)
                .list()
                .ofMinSize(0)
                .ofMaxSize(300)
                .map(parts -> String.join("", parts) + "z");
    }

    @Provide
    Arbitrary<Expression> trees() {
        return tree(5);
    }

    private static Arbitrary<Expression> tree(int height) {
        Arbitrary<Expression> leaf = Arbitraries.oneOf(
                Arbitraries.of("x", "y", "theta", "Σ", "E", "dt").map(n -> new Expression.Name(n, NOWHERE)),
                Arbitraries.longs()
                        .between(0, 1_000_000_000_000_000L)
                        .flatMap(n -> Arbitraries.of(1, 10, 1000, 8)
                                .map(d -> new Expression.Number(new BigFraction(n, d), NOWHERE))),
                Arbitraries.just(new Expression.Pi(NOWHERE)));
        if (height == 0) {
            return leaf;
        }
        Arbitrary<Expression> below = Arbitraries.lazy(() -> tree(height - 1));
        // A power's constants are limited in size: its exponent stays small here.
        Arbitrary<Expression> power = Combinators.combine(
                        below, Arbitraries.integers().between(0, 9))
                .as((base, n) -> new Expression.Binary(
                        Expression.Operator.POWER,
                        base,
                        new Expression.Binary(
                                Expression.Operator.ADD,
                                new Expression.Name("n", NOWHERE),
                                new Expression.Number(new BigFraction(n), NOWHERE),
                                NOWHERE),
                        NOWHERE));
        Arbitrary<Expression> tower = Combinators.combine(below, below)
                .as((base, top) -> new Expression.Binary(
                        Expression.Operator.POWER,
                        new Expression.Name("b", NOWHERE),
                        new Expression.Binary(
                                Expression.Operator.POWER,
                                new Expression.Name("c", NOWHERE),
                                new Expression.Call(ElementaryFunction.ATAN2, List.of(base, top), NOWHERE),
                                NOWHERE),
                        NOWHERE));
        Arbitrary<Expression> binary = Combinators.combine(
                        Arbitraries.of(
                                Expression.Operator.ADD, Expression.Operator.SUBTRACT, Expression.Operator.MULTIPLY),
                        below,
                        below)
                .as((operator, left, right) -> new Expression.Binary(operator, left, right, NOWHERE));
        Arbitrary<Expression> quotient = below.map(left -> new Expression.Binary(
                Expression.Operator.DIVIDE,
                left,
                new Expression.Negation(new Expression.Name("q", NOWHERE), NOWHERE),
                NOWHERE));
        Arbitrary<Expression> call = Combinators.combine(
                        Arbitraries.of(ElementaryFunction.SIN, ElementaryFunction.SQRT), below)
                .as((function, argument) -> new Expression.Call(function, List.of(argument), NOWHERE));
        Arbitrary<Expression> negation = below.map(operand -> new Expression.Negation(operand, NOWHERE));
        return Arbitraries.oneOf(leaf, binary, binary, binary, power, tower, quotient, call, negation);
    }
}
