package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.SourceText;
import java.util.List;

/** Reads definitions for what is wrong with them. */
final class DefinitionMistakes {

    private DefinitionMistakes() {}

    static List<Diagnostic> of(String text) {
        return of(text, Limits.DEFAULT);
    }

    static List<Diagnostic> of(String text, Limits limits) {
        try {
            DefinitionReader.read(new SourceText("x", text), limits);
            return List.of();
        } catch (DefinitionException e) {
            return e.diagnostics();
        }
    }
}
