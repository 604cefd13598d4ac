package io.github.gammawright.definition;

import static io.github.gammawright.definition.Parsing.mistake;
import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourceText;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Each mistake in an expression, with its whole message. */
class ExpressionMistakesTest {

    private static void assertMistake(String expression, int column, String message, String remedy) {
        assertThat(mistake(expression))
                .isEqualTo("x:1:" + column + ": " + message + "\n" + expression + "\n" + " ".repeat(column - 1) + "^"
                        + (remedy.isEmpty() ? "" : "\n" + remedy));
    }

    @Test
    void implicitMultiplication() {
        assertMistake("2x", 2, "no operator between '2' and 'x'", "A product needs its sign: write 2*x.");
        assertMistake("2(x)", 2, "no operator between '2' and '('", "A product needs its sign: write 2*(.");
        assertMistake("(a)(b)", 4, "no operator between ')' and '('", "A product needs its sign: write )*(.");
        assertMistake("a b", 3, "no operator between 'a' and 'b'", "A product needs its sign: write a*b.");
        assertMistake("2e", 2, "no operator between '2' and 'e'", "A product needs its sign: write 2*e.");
    }

    @Test
    void parentheses() {
        assertMistake("(a+(b*c)", 1, "the parenthesis that opens here is not closed", "Add a ')'.");
        assertMistake("sin(a", 4, "the parenthesis that opens here is not closed", "Add a ')'.");
        assertMistake("a+b)", 4, "this parenthesis closes nothing", "Remove it, or add a '(' before.");
        assertMistake("a+)", 3, "this parenthesis closes nothing", "Remove it, or add a '(' before.");
        assertMistake("[a]", 1, "'[' has no meaning in an expression", "Group with round parentheses ( ).");
    }

    @Test
    void missingOperands() {
        assertMistake("a +", 4, "an operand is missing after '+'", "Add it, or remove the '+'.");
        assertMistake("* a", 1, "an operand is missing before '*'", "Add it, or remove the '*'.");
        assertMistake("a ** b", 4, "an operand is missing after '*'", "A power is written with ^.");
        assertMistake("(a + )", 6, "an operand is missing after '+'", "Add it, or remove the '+'.");
        assertMistake("()", 2, "an operand is missing after '('", "Add it, or remove the '('.");
        assertMistake("", 1, "an expression is missing here", "Write one, or remove the key.");
        assertMistake("   ", 1, "an expression is missing here", "Write one, or remove the key.");
    }

    @Test
    void functions() {
        assertMistake(
                "sin + 1", 1, "the function 'sin' stands without its argument", "Write sin(…), with parentheses.");
        assertMistake(
                "sin^2(x)",
                1,
                "the function 'sin' stands without its argument",
                "The exponent stands behind the argument: sin(…)^2.");
        assertMistake("sin(a, b)", 1, "'sin' takes one argument, not 2", "");
        assertMistake("1 + atan2(a)", 5, "'atan2' takes two arguments: atan2(y, x), not 1", "");
        assertMistake("sin()", 1, "'sin' takes one argument, not none", "");
        assertMistake("ln(x)", 1, "there is no function 'ln'", "Write log(x).");
        assertMistake("arctan(x)", 1, "there is no function 'arctan'", "Write atan(x).");
        assertMistake("sinn(x)", 1, "there is no function 'sinn'", "Did you mean 'sin'?");
        assertMistake("Sin(x)", 1, "there is no function 'Sin'", "Did you mean 'sin'?");
        assertMistake(
                "f(x)",
                1,
                "there is no function 'f'",
                "Known are sin, cos, tan, asin, acos, atan, atan2, sinh, cosh, tanh, asinh, acosh, atanh, exp, log, sqrt,"
                        + " abs.");
        assertMistake(
                "pi(x)",
                1,
                "'pi' is not a function, but is followed by a parenthesis",
                "If a product is meant, write pi*(…).");
    }

    @Test
    void declaredNamesThatAreApplied() {
        Map<String, NameKind> kinds = Map.of("nu", NameKind.FUNCTION, "r", NameKind.COORDINATE);
        assertThat(mistakeKnowing(kinds, "1 + nu(r)")).isEqualTo("""
                        x:1:5: 'nu' has its arguments from [functions] and takes none here
                        1 + nu(r)
                            ^
                        Write nu alone.""");
        assertThat(mistakeKnowing(kinds, "r (1 + r)")).isEqualTo("""
                        x:1:1: 'r' is not a function, but is followed by a parenthesis
                        r (1 + r)
                        ^
                        If a product is meant, write r*(…).""");
    }

    private static String mistakeKnowing(Map<String, NameKind> kinds, String expression) {
        SourceText source = new SourceText("x", expression);
        Diagnostics diagnostics = new Diagnostics(source);
        new ExpressionParser(Limits.DEFAULT, diagnostics, name -> Optional.ofNullable(kinds.get(name)))
                .parse(LocatedText.whole(source));
        return diagnostics.list().get(0).render();
    }

    @Test
    void characters() {
        assertMistake("a − b", 3, "'−' (U+2212) has no meaning in an expression", "Write the ASCII sign -.");
        assertMistake("a²", 2, "'²' (U+00B2) has no meaning in an expression", "Write ^2.");
        assertMistake("r₁", 2, "'₁' (U+2081) has no meaning in an expression", "In a name write 1 or _1.");
        assertMistake(
                "r'", 2, "''' has no meaning in an expression", "A name has no primes: write for example r_prime.");
        assertMistake("a·b", 2, "'·' (U+00B7) has no meaning in an expression", "Write *.");
        assertMistake("√a", 1, "'√' (U+221A) has no meaning in an expression", "Write sqrt(…).");
        assertThat(mistake("a\u202eb"))
                .startsWith("x:1:2: '\\u202e' (U+202E) has no meaning in an expression\na\\u202eb\n ^");
        assertThat(mistake("a$")).contains("Known are names, numbers");
    }

    @Test
    void numbers() {
        assertMistake("1.2.3", 1, "'1.2.3' is not a number", "Numbers look like 2, 0.5 or 1.5e-3.");
        assertMistake("1_000", 1, "'1_000' is not a number", "Numbers look like 2, 0.5 or 1.5e-3.");
        assertMistake(
                "1e1001",
                1,
                "the number has too many digits or too large an exponent",
                "At most 1000 digits, and exponents between -1000 and 1000, are read.");
        assertMistake(
                "1,5",
                2,
                "a comma outside the arguments of a function",
                "Decimals have a point: 1.5. Only atan2(y, x) has two arguments.");
    }

    @Test
    void constants() {
        assertMistake("x/(2-2)", 2, "division by zero", "");
        assertMistake("(1-1)^-2", 6, "division by zero", "");
        assertMistake(
                "x^2000",
                3,
                "an exponent beyond 1000 in size",
                "Check the exponent; for growth like that write exp(…).");
    }

    @Test
    void comparisons() {
        assertMistake(
                "a < b",
                3,
                "'<' is a comparison, not part of an expression",
                "Comparisons belong in [domain] conditions.");
        assertThat(conditionMistake("r"))
                .isEqualTo("x:1:1: a condition needs a comparison\nr\n^\nWrite for example r > 2*M or 0 < theta < pi.");
        assertThat(conditionMistake("0 < r > 1"))
                .isEqualTo("x:1:7: the chain turns from '<' to '>'\n0 < r > 1\n      ^\n"
                        + "Let all comparisons of a chain point one way, or write two conditions.");
        assertThat(conditionMistake("r = 1")).startsWith("x:1:3: '=' has no meaning in an expression");
        assertThat(conditionMistake("r ≤ 1")).endsWith("Write <=.");
        assertThat(conditionMistake("r <")).startsWith("x:1:4: an operand is missing after '<'");
    }

    @Test
    void chainedConditionsAreRead() {
        SourceText source = new SourceText("x", " 0 < theta <= pi ");
        Diagnostics diagnostics = new Diagnostics(source);
        MetricDefinition.Condition condition = new ExpressionParser(diagnostics)
                .parseCondition(LocatedText.whole(source))
                .orElseThrow();
        assertThat(condition.text()).isEqualTo("0 < theta <= pi");
        assertThat(condition.operands()).hasSize(3);
        assertThat(condition.comparisons())
                .containsExactly(MetricDefinition.Comparison.LESS, MetricDefinition.Comparison.LESS_OR_EQUAL);
    }

    private static String conditionMistake(String condition) {
        SourceText source = new SourceText("x", condition);
        Diagnostics diagnostics = new Diagnostics(source);
        assertThat(new ExpressionParser(diagnostics).parseCondition(LocatedText.whole(source)))
                .isEmpty();
        assertThat(diagnostics.list().get(0).code()).isNotEqualTo(DiagnosticCode.TOO_MANY_MISTAKES);
        return diagnostics.list().get(0).render();
    }
}
