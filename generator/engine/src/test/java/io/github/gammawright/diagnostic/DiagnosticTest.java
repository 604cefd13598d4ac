package io.github.gammawright.diagnostic;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;

class DiagnosticTest {

    private static String render(String line, int column) {
        return Diagnostic.of(
                        DiagnosticCode.DIVISION_BY_ZERO,
                        new SourceText("star.metric.toml", line),
                        new SourcePosition(1, column, 1))
                .render();
    }

    @Test
    void showsTheLineWithACaret() {
        SourceText source = new SourceText("star.metric.toml", "name = \"x\"\r\nmm = 2*qq\n");
        assertThat(Diagnostic.of(DiagnosticCode.NAME_UNKNOWN, source, new SourcePosition(2, 8, 2), "qq")
                        .render())
                .isEqualTo("""
                        star.metric.toml:2:8: unknown name 'qq'
                        mm = 2*qq
                               ^
                        Declare it as a coordinate, or in [parameters], [abbreviations] or [functions].""");
    }

    @Test
    void tabsKeepTheirWidthWhateverItIs() {
        assertThat(render("\ta\tb/0", 5)).isEqualTo("star.metric.toml:1:5: division by zero\n\ta\tb/0\n\t \t ^");
    }

    @Test
    void wideAndCombinedCharactersAreCountedAsTheyAreShown() {
        // Two columns each for the CJK characters, none for the combining accent, one for a letter beyond the BMP.
        assertThat(render("長さe\u0301𝛼/0", 6)).endsWith("\n長さe\u0301𝛼/0\n      ^");
    }

    @Test
    void controlCharactersAreMadeVisible() {
        assertThat(render("a\u001b[31m\u007f\u009b\u202e/0", 2))
                .isEqualTo("star.metric.toml:1:2: division by zero\na␛[31m␡\\u009b\\u202e/0\n ^");
        assertThat(Diagnostic.of(
                                DiagnosticCode.NAME_UNKNOWN,
                                new SourceText("e\u001bvil\n.toml", "x"),
                                SourcePosition.START,
                                "a\u001b\nb")
                        .heading())
                .isEqualTo("e␛vil␊.toml:1:1: unknown name 'a␛␊b'");
    }

    @Test
    void ofALongLineAnExcerptIsShown() {
        String line = "a".repeat(300) + "X" + "b".repeat(300);
        String[] lines = render(line, 301).split("\n");
        assertThat(lines[1]).isEqualTo("…" + "a".repeat(75) + "X" + "b".repeat(74) + "…");
        assertThat(lines[2]).isEqualTo(" ".repeat(76) + "^");
        assertThat(render(line, 1).split("\n")[1]).isEqualTo("a".repeat(150) + "…");
        assertThat(render(line, 602)).endsWith("\n…" + "b".repeat(150) + "\n" + " ".repeat(151) + "^");
        assertThat(render("c".repeat(200), 1)).contains("c".repeat(200));
    }

    @Test
    void longArgumentsAreCut() {
        String message = DiagnosticCode.NAME_UNKNOWN.message("n".repeat(1000));
        assertThat(message).isEqualTo("unknown name '" + "n".repeat(80) + "…'");
    }

    @Test
    void argumentsAreNotTemplates() {
        assertThat(DiagnosticCode.VALUE_UNKNOWN.message("{1}", "{0}")).isEqualTo("unknown {1} '{0}'");
    }

    @Test
    void aMissingFileHasNoLineToShow() {
        assertThat(Diagnostic.of(DiagnosticCode.FILE_MISSING, new SourceText("no.toml", ""), SourcePosition.START)
                        .render())
                .isEqualTo(
                        "no.toml:1:1: there is no such file\nCheck the path, or give the name of a built-in definition.");
    }

    @Test
    void theCollectorSortsAndDropsDuplicates() {
        Diagnostics diagnostics = new Diagnostics(new SourceText("x", "ab\ncd"));
        diagnostics.report(DiagnosticCode.DIVISION_BY_ZERO, new SourcePosition(2, 1, 1));
        diagnostics.report(DiagnosticCode.NAME_UNKNOWN, new SourcePosition(1, 2, 1), "b");
        diagnostics.report(DiagnosticCode.DIVISION_BY_ZERO, new SourcePosition(2, 1, 1));
        diagnostics.report(DiagnosticCode.NAME_UNKNOWN, new SourcePosition(1, 1, 1), "a");
        assertThat(diagnostics.list())
                .extracting(Diagnostic::heading)
                .containsExactly("x:1:1: unknown name 'a'", "x:1:2: unknown name 'b'", "x:2:1: division by zero");
        assertThatThrownBy(diagnostics::throwIfAny)
                .isInstanceOfSatisfying(
                        DefinitionException.class,
                        e -> assertThat(e.diagnostics()).isEqualTo(diagnostics.list()))
                .hasMessageStartingWith("x:1:1: unknown name 'a'\nab\n^\nDeclare");
    }

    @Test
    void ofVeryManyOnlyTheFirstAreShown() {
        Diagnostics diagnostics = new Diagnostics(new SourceText("x", "a"));
        for (int column = 5000; column > 0; column--) {
            diagnostics.report(DiagnosticCode.DIVISION_BY_ZERO, new SourcePosition(1, column, 1));
        }
        List<Diagnostic> list = diagnostics.list();
        assertThat(list).hasSize(Diagnostics.SHOWN + 1);
        assertThat(list.get(Diagnostics.SHOWN).render())
                .endsWith(": 4950 more mistakes are not shown\nMend the first 50 and run again.");
        assertThat(diagnostics.isFull()).isTrue();
    }

    @Test
    void anExceptionSaysSomething() {
        assertThatThrownBy(() -> new DefinitionException(List.of())).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void nearestWords() {
        List<String> known = List.of("r", "theta", "Sigma", "line-element", "metric");
        assertThat(Spelling.nearest("tehta", known)).contains("theta");
        assertThat(Spelling.nearest("lineelement", known)).contains("line-element");
        assertThat(Spelling.nearest("sigma", known)).contains("Sigma");
        assertThat(Spelling.nearest("R", known)).contains("r");
        assertThat(Spelling.nearest("q", known)).isEmpty();
        assertThat(Spelling.nearest("quadrupole", known)).isEmpty();
        assertThat(Spelling.nearest("m".repeat(1000), known)).isEmpty();
    }
}
