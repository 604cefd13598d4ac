package io.github.gammawright.definition;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.diagnostic.Diagnostic;
import org.junit.jupiter.api.Test;

/** Each limit has its message, and can be raised. */
class LimitsTest {

    private static final Limits SMALL = new Limits(400, 5, 10, 40, 9, 20, 5, 2);
    private static final String HEAD = "name = \"x\"\ncoordinates = [\"x\"]\nline-element = \"dx^2\"\n";

    private static void assertRefusedOnlyIfSmall(String text, String message) {
        assertRefused(SMALL, text, message);
    }

    private static void assertRefused(Limits limits, String text, String message) {
        assertThat(DefinitionMistakes.of(HEAD + text, limits))
                .extracting(Diagnostic::heading)
                .containsExactly(message);
        assertThat(DefinitionMistakes.of(HEAD + text)).isEmpty();
    }

    @Test
    void sizeOfTheText() {
        assertRefusedOnlyIfSmall(
                "# " + "ä".repeat(200), "x:1:1: the file has more than 400 bytes, too many for a definition");
    }

    @Test
    void nesting() {
        assertRefusedOnlyIfSmall(
                "[abbreviations]\na = \"((((((x))))))\"", "x:5:11: the expression is nested more than 5 deep");
    }

    @Test
    void height() {
        assertRefusedOnlyIfSmall(
                "[abbreviations]\na = \"x+x+x+x+x+x+x+x+x+x+x\"", "x:5:25: the expression is nested more than 10 deep");
    }

    @Test
    void heightWithAbbreviations() {
        StringBuilder chain = new StringBuilder("[abbreviations]\n");
        for (int i = 0; i < 14; i++) {
            chain.append((char) ('b' + i))
                    .append("=\"-(-(-")
                    .append((char) ('a' + i))
                    .append("))\"\n");
        }
        assertRefused(
                new Limits(400, 5, 10, 400, 9, 20, 5, 2),
                chain + "a=\"x\"\n",
                "x:18:1: with the abbreviations it uses put in, 'o' is nested more than 40 deep");
    }

    @Test
    void nodes() {
        assertRefusedOnlyIfSmall(
                "[abbreviations]\na = \"x*x*x*x*x\"\nb = \"x*x*x*x*x\"\nc = \"x*x*x*x*x\"\nd = \"x*x*x*x*x\"\ne = \"x*x\"",
                "x:3:20: the expressions of this definition have more than 40 numbers, names and operations");
    }

    @Test
    void exponents() {
        assertRefusedOnlyIfSmall("[abbreviations]\na = \"x^10\"", "x:5:8: an exponent beyond 9 in size");
        assertRefusedOnlyIfSmall("[abbreviations]\na = \"((x^5)^5)^5\"", "x:5:16: an exponent beyond 90 in size");
    }

    @Test
    void constants() {
        assertRefusedOnlyIfSmall(
                "[abbreviations]\na = \"9^9\"",
                "x:5:7: the exact value of this constant has more than 20 binary digits");
        assertRefusedOnlyIfSmall(
                "[abbreviations]\na = 123456", "x:5:5: the number has too many digits or too large an exponent");
        assertRefusedOnlyIfSmall(
                "[parameters]\na = \"sin(1)+sin(1)\"\nb = \"cos(1)\"",
                "x:6:6: the constant expressions of this definition call more than 2 functions");
    }

    /** Each abbreviation doubles what it stands for: 2^200 of them, if they were put in. */
    @Test
    void abbreviationsAreNotPutIn() {
        StringBuilder text = new StringBuilder(HEAD + "[abbreviations]\na0 = \"x\"\n");
        for (int i = 1; i <= 200; i++) {
            text.append("a%d = \"a%d + sin(a%d)\"\n".formatted(i, i - 1, i - 1));
        }
        assertThat(DefinitionMistakes.of(text.toString())).isEmpty();
    }

    @Test
    void longChainsOfAbbreviationsAreSortedWithoutRecursion() {
        StringBuilder text = new StringBuilder(HEAD + "[abbreviations]\n");
        for (int i = 0; i < 1_500; i++) {
            text.append("a%d = \"a%d + 1\"\n".formatted(i, i + 1));
        }
        text.append("a1500 = \"x\"\n");
        assertThat(DefinitionMistakes.of(text.toString())).isEmpty();
    }
}
