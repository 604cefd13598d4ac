package io.github.gammawright.definition;

import static io.github.gammawright.definition.Parsing.mistake;
import static io.github.gammawright.definition.Parsing.parse;
import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.SourceText;
import java.util.Optional;
import org.hipparchus.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ExpressionParserTest {

    /**
     * Precedence as in written mathematics: powers before products before sums, a sign weaker than a power, equal
     * strength from the left, towers of powers from the top (ISO 80000-2:2019, clause on operations, from memory; for
     * the tower common practice, no source). Each line: as written, and with every grouping in parentheses.
     */
    @ParameterizedTest
    @CsvSource({
        "a+b*c^d, a+(b*(c^d))",
        "a*b+c, (a*b)+c",
        "-a^2, -(a^2)",
        "-a*b, (-a)*b",
        "a-b-c, (a-b)-c",
        "a/b/c, (a/b)/c",
        "a/b*c, (a/b)*c",
        "a-b+c, (a-b)+c",
        "a^b^c, a^(b^c)",
        "2^-3, 2^(-3)",
        "2^-3^2, 2^(-(3^2))",
        "a*-b, a*(-b)",
        "--a, -(-a)",
        "+a, a",
        "a - +b, a-b",
        "a^2*b, (a^2)*b",
        "sin(a)^2, (sin(a))^2",
        "-sin(a)^2, -((sin(a))^2)",
    })
    void groupsAsWritten(String written, String grouped) {
        assertThat(Expressions.sameTree(parse(written), parse(grouped))).isTrue();
        assertThat(Expressions.sameTree(parse(written), parse("1*(" + grouped + ")")))
                .isFalse();
    }

    @Test
    void groupingMattersToTheTree() {
        assertThat(Expressions.sameTree(parse("a^b^c"), parse("(a^b)^c"))).isFalse();
        assertThat(Expressions.sameTree(parse("-a^2"), parse("(-a)^2"))).isFalse();
        assertThat(Expressions.sameTree(parse("a-b-c"), parse("a-(b-c)"))).isFalse();
    }

    @ParameterizedTest
    @CsvSource({
        "1.0E-20, 1, 100000000000000000000",
        "1e3, 1000, 1",
        ".5, 1, 2",
        "2., 2, 1",
        "0.1, 1, 10",
        "1.50, 3, 2",
        "007, 7, 1",
        "3E+2, 300, 1",
        "0e999, 0, 1",
    })
    void numbersAreExact(String literal, String numerator, String denominator) {
        Expression.Number number = (Expression.Number) parse(literal);
        assertThat(number.value())
                .isEqualTo(new BigFraction(new java.math.BigInteger(numerator), new java.math.BigInteger(denominator)));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "E", "e", "i", "I", "N", "D", "Q", "class", "double", "r_1", "_x", "Σ", "θ2", "ß", "ünder", "𝛼", "х"
            })
    void noOtherNameIsSpecial(String name) {
        assertThat(parse(name)).isEqualTo(new Expression.Name(name, new SourcePosition(1, 1, (int)
                name.codePoints().count())));
        assertThat(ExpressionPrinter.print(parse("1e3*" + name + " + " + name + "^2")))
                .isEqualTo("1000*" + name + " + " + name + "^2");
    }

    @Test
    void namesAreComparedAfterNormalisation() {
        String composed = "\u00e9";
        String decomposed = "e\u0301";
        assertThat(((Expression.Name) parse(decomposed)).name()).isEqualTo(composed);
        assertThat(parse(decomposed).position().length()).isEqualTo(2);
    }

    @Test
    void onlyPiIsAConstant() {
        assertThat(parse("pi")).isInstanceOf(Expression.Pi.class);
        assertThat(parse("Pi")).isInstanceOf(Expression.Name.class);
        assertThat(parse("e")).isInstanceOf(Expression.Name.class);
    }

    @Test
    void everyFunctionIsKnown() {
        for (ElementaryFunction function : ElementaryFunction.values()) {
            String call = function.symbol() + (function.arity() == 2 ? "(x, y)" : "(x)");
            assertThat(parse(call))
                    .isInstanceOfSatisfying(
                            Expression.Call.class, c -> assertThat(c.function()).isEqualTo(function));
            assertThat(ExpressionPrinter.print(parse(call))).isEqualTo(call);
        }
    }

    @Test
    void positionsAreThoseOfOperatorsAndNames() {
        Expression.Binary sum = (Expression.Binary) parse("ab *\n sin( x )+1.5");
        assertThat(sum.position()).isEqualTo(new SourcePosition(2, 10, 1));
        Expression.Binary product = (Expression.Binary) sum.left();
        assertThat(product.position()).isEqualTo(new SourcePosition(1, 4, 1));
        assertThat(product.left().position()).isEqualTo(new SourcePosition(1, 1, 2));
        Expression.Call call = (Expression.Call) product.right();
        assertThat(call.position()).isEqualTo(new SourcePosition(2, 2, 3));
        assertThat(call.arguments().get(0).position()).isEqualTo(new SourcePosition(2, 7, 1));
        assertThat(sum.right().position()).isEqualTo(new SourcePosition(2, 11, 3));
    }

    @Test
    void columnsCountCodePoints() {
        assertThat(mistake("𝛼+𝛽 𝛾")).isEqualTo("""
                        x:1:5: no operator between '𝛽' and '𝛾'
                        𝛼+𝛽 𝛾
                            ^
                        A product needs its sign: write 𝛽*𝛾.""");
    }

    @Test
    void deepNestingIsAMessageAtTheParenthesisThatIsTooMuch() {
        assertThat(mistake("(".repeat(1_000_000))).startsWith("x:1:251: the expression is nested more than 250 deep");
        assertThat(mistake("-".repeat(1_000_000) + "x")).startsWith("x:1:251: ");
        assertThat(mistake("x^".repeat(1_000_000) + "x")).startsWith("x:1:502: ");
        assertThat(mistake("sin(".repeat(1_000_000) + "x")).startsWith("x:1:1004: ");
    }

    @Test
    void theDeepestAllowedNestingFitsIntoASmallStack() throws InterruptedException {
        String worst = "a+b*-c^(".repeat(83) + "x" + ")".repeat(83);
        Throwable[] thrown = new Throwable[1];
        Thread thread = new Thread(null, () -> ExpressionPrinter.print(parse(worst)), "small", 512 * 1024);
        thread.setUncaughtExceptionHandler((t, e) -> thrown[0] = e);
        thread.start();
        thread.join();
        assertThat(thrown[0]).isNull();
    }

    @Test
    void longChainsBecomeLowTrees() {
        String sum = "x" + " - x".repeat(99_999);
        Expression tree = parse(sum);
        assertThat(Expressions.height(tree, name -> 1)).isLessThan(40);
        int[] count = new int[1];
        Expressions.forEachName(tree, name -> count[0]++);
        assertThat(count[0]).isEqualTo(100_000);
    }

    /** Checked by counting: the value of the tree with every name 1 is that of the text. */
    @ParameterizedTest
    @ValueSource(ints = {1, 31, 32, 33, 34, 65, 1000, 4097})
    void longChainsKeepTheirValue(int operators) {
        StringBuilder sum = new StringBuilder("1");
        StringBuilder product = new StringBuilder("1");
        BigFraction sumValue = BigFraction.ONE;
        BigFraction productValue = BigFraction.ONE;
        for (int i = 0; i < operators; i++) {
            BigFraction operand = new BigFraction(i % 5 + 1);
            boolean direct = i % 3 == 0;
            sum.append(direct ? '+' : '-').append(i % 5 + 1);
            product.append(direct ? '*' : '/').append(i % 5 + 1);
            sumValue = direct ? sumValue.add(operand) : sumValue.subtract(operand);
            productValue = direct ? productValue.multiply(operand) : productValue.divide(operand);
        }
        assertThat(constant(sum.toString())).isEqualTo(sumValue);
        assertThat(constant(product.toString())).isEqualTo(productValue);
    }

    private static BigFraction constant(String text) {
        SourceText source = new SourceText("x", text);
        Diagnostics diagnostics = new Diagnostics(source);
        Limits roomy = new Limits(1 << 20, 250, 1000, 200_000, 1000, 1_000_000, 1000, 1000);
        Expression tree = new ExpressionParser(roomy, diagnostics, name -> Optional.empty())
                .parse(LocatedText.whole(source))
                .orElseThrow();
        return new ConstantCheck(roomy, diagnostics).check(tree).orElseThrow().constant();
    }

    @Test
    void tooManyNodesAreAMessage() {
        assertThat(mistake("x" + "+x".repeat(150_000)))
                .contains("the expressions of this definition have more than 200000 numbers, names and operations");
    }

    @Test
    void hugeConstantsAreRefusedWithoutBeingEvaluated() {
        assertThat(mistake("x^1000000000")).startsWith("x:1:3: an exponent beyond 1000 in size");
        assertThat(mistake("x^(-1e900)")).startsWith("x:1:4: an exponent beyond 1000 in size");
        assertThat(mistake("9^9^9^9")).startsWith("x:1:5: an exponent beyond 1000 in size");
        assertThat(mistake("((x^1000)^1000)^1000")).startsWith("x:1:11: an exponent beyond 10000 in size");
        assertThat(mistake("((2^1000)^1000)^1000"))
                .startsWith("x:1:10: the exact value of this constant has more than 8192 binary digits");
        assertThat(mistake("1e1000000000")).startsWith("x:1:1: the number has too many digits");
        assertThat(mistake("1" + "0".repeat(2000))).startsWith("x:1:1: the number has too many digits");
        assertThat(mistake("1e" + "9".repeat(2000))).startsWith("x:1:1: the number has too many digits");
        assertThat(mistake("1e" + "0".repeat(2000) + "1")).isEqualTo("parsed as 10");
        assertThat(mistake("2^1000 + x^999")).startsWith("parsed as");
    }

    @Test
    void spacesDoNotMatter() {
        assertThat(Expressions.sameTree(parse(" a\t*\n( b+c ) \u00a0"), parse("a*(b+c)")))
                .isTrue();
    }
}
