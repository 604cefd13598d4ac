package io.github.gammawright.maven;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import java.util.List;
import org.apache.maven.plugin.MojoFailureException;
import org.apache.maven.plugin.logging.Log;

/** Reports mistakes in definitions as a compiler would: each one in the log, and the build has failed. */
final class DefinitionErrors {

    private DefinitionErrors() {}

    /** Logs every mistake; the failure repeats the first. */
    static MojoFailureException report(DefinitionException wrong, Log log) {
        List<Diagnostic> mistakes = wrong.diagnostics();
        for (Diagnostic mistake : mistakes) {
            log.error(mistake.render());
        }
        String first = mistakes.get(0).render();
        return new MojoFailureException(
                mistakes.size() == 1
                        ? "1 mistake in the metric definitions:\n" + first
                        : mistakes.size() + " mistakes in the metric definitions, the first of them:\n" + first);
    }
}
