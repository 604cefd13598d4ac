package io.github.gammawright.maven;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import java.io.File;
import org.codehaus.plexus.build.BuildContext;
import org.codehaus.plexus.build.DefaultBuildContext;

/** Shows mistakes in the editor that runs the build, if one does. */
final class EditorMarkers {

    private EditorMarkers() {}

    /** Marks every mistake in its file. */
    static void show(DefinitionException wrong, BuildContext context) {
        if (context instanceof DefaultBuildContext) {
            // No editor: it would only log what is logged anyway.
            return;
        }
        for (Diagnostic mistake : wrong.diagnostics()) {
            File file = new File(mistake.source().name());
            context.removeMessages(file);
        }
        for (Diagnostic mistake : wrong.diagnostics()) {
            context.addMessage(
                    new File(mistake.source().name()),
                    mistake.position().line(),
                    mistake.position().column(),
                    mistake.message(),
                    BuildContext.SEVERITY_ERROR,
                    null);
        }
    }
}
