package io.github.gammawright.definition;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.DiagnosticCode;
import java.io.IOException;
import java.util.EnumSet;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** Every code of the catalogue is met in a test. */
class CataloguedMistakesTest {

    /** Files that can't be read: {@link DefinitionFilesTest}. */
    private static final Set<DiagnosticCode> OF_FILES = EnumSet.of(
            DiagnosticCode.FILE_MISSING,
            DiagnosticCode.FILE_IS_DIRECTORY,
            DiagnosticCode.FILE_UNREADABLE,
            DiagnosticCode.FILE_EMPTY,
            DiagnosticCode.FILE_TOO_LARGE,
            DiagnosticCode.FILE_NOT_UTF8);

    /** In single expressions: {@link ExpressionMistakesTest} and {@link ExpressionParserTest}. */
    private static final Set<DiagnosticCode> OF_EXPRESSIONS = EnumSet.of(
            DiagnosticCode.CHARACTER_UNEXPECTED,
            DiagnosticCode.NUMBER_MALFORMED,
            DiagnosticCode.NUMBER_TOO_LONG,
            DiagnosticCode.PARENTHESIS_NOT_OPENED,
            DiagnosticCode.COMMA_MISPLACED,
            DiagnosticCode.COMPARISON_MISPLACED,
            DiagnosticCode.FUNCTION_UNKNOWN,
            DiagnosticCode.NAME_APPLIED,
            DiagnosticCode.ARITY_WRONG,
            DiagnosticCode.NESTING_TOO_DEEP,
            DiagnosticCode.EXPRESSIONS_TOO_LARGE,
            DiagnosticCode.EXPONENT_TOO_LARGE,
            DiagnosticCode.CONSTANT_TOO_LARGE);

    /** With small limits: {@link LimitsTest}. */
    private static final Set<DiagnosticCode> OF_LIMITS = EnumSet.of(DiagnosticCode.ABBREVIATIONS_TOO_DEEP);

    /** Of later stages, tested with them. */
    private static final Set<DiagnosticCode> OF_LATER_STAGES = EnumSet.of(
            DiagnosticCode.QUANTITY_TWICE,
            DiagnosticCode.CLASS_DUPLICATE,
            DiagnosticCode.CLASS_DIFFERS_IN_CASE,
            DiagnosticCode.METRIC_NOT_SPLIT,
            DiagnosticCode.METRIC_WITHOUT_FRAME);

    @Test
    void everyCodeIsMetInATest() throws IOException {
        Set<DiagnosticCode> met = EnumSet.noneOf(DiagnosticCode.class);
        DefinitionMistakesTest.cases()
                .flatMap(name -> DefinitionMistakesTest.mistakes(name).stream())
                .map(Diagnostic::code)
                .forEach(met::add);
        met.addAll(OF_FILES);
        met.addAll(OF_EXPRESSIONS);
        met.addAll(OF_LIMITS);
        met.addAll(OF_LATER_STAGES);
        Set<DiagnosticCode> missing = new TreeSet<>(EnumSet.complementOf(EnumSet.copyOf(met)));
        assertThat(missing).filteredOn(this::isOfThisStage).isEmpty();
    }

    /** Codes that later stages add stand behind those of definitions, and are tested there. */
    private boolean isOfThisStage(DiagnosticCode code) {
        return code.compareTo(DiagnosticCode.JAVA_NAME_INVALID) <= 0 || code == DiagnosticCode.TOO_MANY_MISTAKES;
    }
}
