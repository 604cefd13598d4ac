package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.Diagnostic;

/** Ends the parsing of one expression; never leaves the parser. */
final class SyntaxMistake extends RuntimeException {

    private final transient Diagnostic diagnostic;

    SyntaxMistake(Diagnostic diagnostic) {
        super(diagnostic.message(), null, false, false);
        this.diagnostic = diagnostic;
    }

    Diagnostic diagnostic() {
        return diagnostic;
    }
}
