package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.SourceIndex;
import io.github.gammawright.diagnostic.SourcePosition;
import java.nio.charset.StandardCharsets;

/** Refuses what is not a definition at all before anything tries to make sense of it. */
final class TextCheck {

    private TextCheck() {}

    /** Reports an empty text, a binary one and one that is too large. */
    static void check(Diagnostics diagnostics, Limits limits) {
        String text = diagnostics.source().text();
        if (text.length() > limits.fileBytes() || text.getBytes(StandardCharsets.UTF_8).length > limits.fileBytes()) {
            diagnostics.report(DiagnosticCode.FILE_TOO_LARGE, SourcePosition.START, limits.fileBytes());
        } else if (text.isBlank()) {
            diagnostics.report(DiagnosticCode.FILE_EMPTY, SourcePosition.START);
        } else {
            int binary = firstControlCharacter(text);
            if (binary >= 0) {
                SourcePosition position =
                        new SourceIndex(diagnostics.source()).position(text.codePointCount(0, binary), 1);
                diagnostics.report(DiagnosticCode.FILE_BINARY, position, Lookalikes.describe(text.charAt(binary)));
            }
        }
    }

    /** Of the control characters TOML knows only tab and line terminators; halves of characters are none. */
    private static int firstControlCharacter(String text) {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            boolean allowed =
                    c == '\t' || c == '\n' || (c == '\r' && i + 1 < text.length() && text.charAt(i + 1) == '\n');
            boolean pair = Character.isHighSurrogate(c)
                    && i + 1 < text.length()
                    && Character.isLowSurrogate(text.charAt(i + 1));
            if (pair) {
                i++;
            } else if (!allowed && (c < ' ' || c == 0x7f || Character.isSurrogate(c))) {
                return i;
            }
        }
        return -1;
    }
}
