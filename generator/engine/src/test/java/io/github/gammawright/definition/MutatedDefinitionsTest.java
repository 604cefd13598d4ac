package io.github.gammawright.definition;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.diagnostic.Diagnostic;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Whatever is done to a definition: it is read, or refused with messages that have their place. */
class MutatedDefinitionsTest {

    private static final List<String> PIECES = List.of(
            "\"",
            "'",
            "\"\"\"",
            "'''",
            "[",
            "]",
            "{",
            "}",
            "=",
            ",",
            "\n",
            "\r\n",
            "\r",
            "#",
            ".",
            "\\",
            "\\u00e",
            "\\U00110000",
            "\0",
            "\u001b",
            "\ud800",
            "𝛼",
            "Σ",
            "e\u0301",
            "\u202e",
            "(",
            ")",
            "^",
            "*",
            "-",
            "2x",
            "dt",
            "dr^3",
            "sin",
            "nan",
            "1e400",
            "9^9^9^9",
            "^1000000000",
            "[[kernel]]",
            "[parameters]",
            "metric = ",
            "t = 1979-05-27",
            " ",
            "\t",
            "0",
            "+ dt",
            "*/",
            "{@",
            "<",
            "../");

    @Property
    void neverFails(@ForAll("mutants") String text) {
        refusedOrRead(text);
    }

    @Property
    void neverFailsOnPieces(@ForAll("pieces") String text) {
        refusedOrRead("name = \"x\"\ncoordinates = [\"t\"]\nline-element = " + text);
    }

    private static void refusedOrRead(String text) {
        List<Diagnostic> mistakes = DefinitionMistakes.of(text);
        assertThat(mistakes).allSatisfy(mistake -> {
            assertThatCode(mistake::render).doesNotThrowAnyException();
            assertThat(mistake.render()).doesNotContain("\u001b", "\u0000", "\u202e");
            long lines = text.chars().filter(c -> c == '\n').count() + 1;
            assertThat(mistake.position().line()).isBetween(1, (int) lines);
            assertThat(mistake.message()).isNotBlank().doesNotContain("\n");
        });
    }

    @Provide
    Arbitrary<String> mutants() {
        Arbitrary<String> originals = Arbitraries.of(Catalogue.standard().names())
                .map(name -> Catalogue.standard().find(name).orElseThrow().text());
        return Combinators.combine(originals, edit().list().ofMinSize(1).ofMaxSize(4))
                .as((original, edits) -> {
                    StringBuilder text = new StringBuilder(original);
                    edits.forEach(edit -> edit.apply(text));
                    return text.toString();
                });
    }

    @Provide
    Arbitrary<String> pieces() {
        return Arbitraries.of(PIECES).list().ofMaxSize(30).map(pieces -> String.join("", pieces));
    }

    private static Arbitrary<Edit> edit() {
        return Combinators.combine(
                        Arbitraries.doubles().between(0, 1),
                        Arbitraries.integers().between(0, 20),
                        Arbitraries.oneOf(Arbitraries.of(PIECES), Arbitraries.just("")))
                .as(Edit::new);
    }

    /** Replaces some characters, somewhere, by a piece. */
    private record Edit(double where, int length, String piece) {
        void apply(StringBuilder text) {
            int from = (int) (where * text.length());
            text.replace(from, Math.min(text.length(), from + length), piece);
        }
    }
}
