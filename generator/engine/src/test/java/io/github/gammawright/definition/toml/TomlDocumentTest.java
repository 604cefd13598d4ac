package io.github.gammawright.definition.toml;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.SourceText;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.api.Test;
import org.tomlj.Toml;

class TomlDocumentTest {

    private static TomlValue.Table read(String text) {
        Diagnostics diagnostics = new Diagnostics(new SourceText("x", text));
        TomlValue.Table table = TomlDocument.read(diagnostics).orElseThrow();
        diagnostics.throwIfAny();
        return table;
    }

    private static LocatedText string(String literal) {
        return ((TomlValue.Text) read("s = " + literal).entries().get(0).value()).text();
    }

    /** The examples of TOML v1.0.0 (2021), section String, from memory. */
    @Test
    void stringsOfTheSpecification() {
        assertThat(string("\"I'm a string. \\\"You can quote me\\\". Name\\tJos\\u00E9\\nLocation\\tSF.\"")
                        .toString())
                .isEqualTo("I'm a string. \"You can quote me\". Name\tJos\u00e9\nLocation\tSF.");
        assertThat(string("\"\"\"\nRoses are red\nViolets are blue\"\"\"").toString())
                .isEqualTo("Roses are red\nViolets are blue");
        String fox = "The quick brown fox jumps over the lazy dog.";
        assertThat(string("\"" + fox + "\"").toString()).isEqualTo(fox);
        assertThat(string("\"\"\"\nThe quick brown \\\n\n\n  fox jumps over \\\n    the lazy dog.\"\"\"")
                        .toString())
                .isEqualTo(fox);
        assertThat(string(
                                "\"\"\"\\\n       The quick brown \\\n       fox jumps over \\\n       the lazy dog.\\\n       \"\"\"")
                        .toString())
                .isEqualTo(fox);
        assertThat(string("\"\"\"Here are two quotation marks: \"\". Simple enough.\"\"\"")
                        .toString())
                .isEqualTo("Here are two quotation marks: \"\". Simple enough.");
        assertThat(string("\"\"\"Here are three quotation marks: \"\"\\\".\"\"\"")
                        .toString())
                .isEqualTo("Here are three quotation marks: \"\"\".");
        assertThat(string("\"\"\"\"This,\" she said, \"is just a pointless statement.\"\"\"\"")
                        .toString())
                .isEqualTo("\"This,\" she said, \"is just a pointless statement.\"");
        assertThat(string("'C:\\Users\\nodejs\\templates'").toString()).isEqualTo("C:\\Users\\nodejs\\templates");
        assertThat(string("'<\\i\\c*\\s*>'").toString()).isEqualTo("<\\i\\c*\\s*>");
        assertThat(string("'''I [dw]on't need \\d{2} apples'''").toString()).isEqualTo("I [dw]on't need \\d{2} apples");
        assertThat(string(
                                "'''\nThe first newline is\ntrimmed in raw strings.\n   All other whitespace\n   is preserved.\n'''")
                        .toString())
                .isEqualTo(
                        "The first newline is\ntrimmed in raw strings.\n   All other whitespace\n   is preserved.\n");
        assertThat(string("''''That,' she said, 'is still pointless.''''").toString())
                .isEqualTo("'That,' she said, 'is still pointless.'");
        assertThat(string("''").length()).isZero();
    }

    @Test
    void charactersKnowTheirPlace() {
        LocatedText text = string("\"a\\u00e9\\U0001D6FC𝛼b\"");
        assertThat(text.toString()).isEqualTo("aé𝛼𝛼b");
        assertThat(text.position(0, 1)).isEqualTo(new SourcePosition(1, 6, 1));
        assertThat(text.position(1, 2)).isEqualTo(new SourcePosition(1, 7, 6));
        assertThat(text.position(2, 3)).isEqualTo(new SourcePosition(1, 13, 10));
        assertThat(text.position(3, 4)).isEqualTo(new SourcePosition(1, 23, 1));
        assertThat(text.position(4, 5)).isEqualTo(new SourcePosition(1, 24, 1));
        assertThat(text.position(5, 5)).isEqualTo(new SourcePosition(1, 25, 1));
    }

    @Test
    void entriesStandInTheOrderOfTheFile() {
        TomlValue.Table table = read("z = 1\na = 2\n[q]\nb = 1\na = 2\n[m]\nx.y = 1\nx.b = 2\n");
        assertThat(table.entries()).extracting(TomlValue.Entry::key).containsExactly("z", "a", "q", "m");
        assertThat(table.entries().get(2).position()).isEqualTo(new SourcePosition(3, 2, 1));
        TomlValue.Table m = (TomlValue.Table) table.entries().get(3).value();
        TomlValue.Table x = (TomlValue.Table) m.entries().get(0).value();
        assertThat(x.entries()).extracting(TomlValue.Entry::key).containsExactly("y", "b");
        assertThat(x.entries().get(0).position()).isEqualTo(new SourcePosition(7, 3, 1));
    }

    @Test
    void elementsBehindCommentsKnowTheirPlace() {
        TomlValue.Sequence sequence = (TomlValue.Sequence) read("a = [ # one, [two\n  'x' , # three\n\n 1.50, [true]]")
                .entries()
                .get(0)
                .value();
        assertThat(sequence.elements())
                .extracting(TomlValue::position)
                .containsExactly(new SourcePosition(2, 3, 1), new SourcePosition(4, 2, 4), new SourcePosition(4, 8, 1));
        assertThat(((TomlValue.Number) sequence.elements().get(1)).literal()).isEqualTo("1.50");
    }

    @Property
    void everyStringIsReadAsTheLibraryReadsIt(@ForAll("literals") String literal) {
        var parsed = Toml.parse("s = " + literal);
        if (!parsed.hasErrors()) {
            LocatedText text = string(literal);
            assertThat(text.toString()).isEqualTo(parsed.getString("s"));
            int before = 0;
            for (int i = 0; i < text.length(); i++) {
                SourcePosition position = text.position(i, i + 1);
                int place = position.line() * 1_000 + position.column();
                assertThat(place).isGreaterThan(before);
                before = place;
            }
        }
    }

    @Provide
    Arbitrary<String> literals() {
        Arbitrary<String> bodies = Arbitraries.of(
                        "a", "\\n", "\\\\", "\\\"", "\"", "'", "\\u00e9", "\\\n  ", "\n", "\r\n", " ", "é", "𝛼", "\t",
                        "\"\"", "''")
                .list()
                .ofMaxSize(12)
                .map(parts -> String.join("", parts));
        return Arbitraries.of("\"", "'", "\"\"\"", "'''").flatMap(quote -> bodies.map(body -> quote + body + quote));
    }
}
