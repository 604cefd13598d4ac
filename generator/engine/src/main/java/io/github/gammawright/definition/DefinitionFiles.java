package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.SourceIndex;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.SourceText;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Locale;

/** Gets the text out of a file that may be anything. */
final class DefinitionFiles {

    private static final String BYTE_ORDER_MARK = "\ufeff";
    private static final int SHOWN_OF_LARGE_FILE = 4_096;

    private DefinitionFiles() {}

    /**
     * The file's text without byte order mark. Line terminators stay as they are.
     *
     * @throws DefinitionException if there is no such file, or it can't be read, is too large or is not UTF-8
     */
    static SourceText read(Path file, Limits limits) {
        String name = file.toString();
        byte[] bytes;
        try (InputStream stream = open(file)) {
            // One byte more than allowed tells a large file from one that just fits, whatever its size is said to be.
            bytes = stream.readNBytes(limits.fileBytes() + 1);
        } catch (NoSuchFileException e) {
            throw failure(DiagnosticCode.FILE_MISSING, name);
        } catch (AccessDeniedException e) {
            throw failure(DiagnosticCode.FILE_UNREADABLE, name, "access is denied");
        } catch (IOException e) {
            throw failure(DiagnosticCode.FILE_UNREADABLE, name, String.valueOf(e.getMessage()));
        }
        if (bytes.length > limits.fileBytes()) {
            String beginning =
                    new String(bytes, 0, Math.min(SHOWN_OF_LARGE_FILE, bytes.length), StandardCharsets.UTF_8);
            throw new DefinitionException(Diagnostic.of(
                    DiagnosticCode.FILE_TOO_LARGE,
                    new SourceText(name, beginning),
                    SourcePosition.START,
                    limits.fileBytes()));
        }
        String text = decode(name, bytes);
        return new SourceText(name, text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text);
    }

    private static InputStream open(Path file) throws IOException {
        if (Files.isDirectory(file)) {
            throw failure(DiagnosticCode.FILE_IS_DIRECTORY, file.toString());
        }
        return Files.newInputStream(file);
    }

    private static String decode(String name, byte[] bytes) {
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        CharBuffer characters = CharBuffer.allocate(bytes.length + 1);
        ByteBuffer input = ByteBuffer.wrap(bytes);
        CoderResult result = decoder.decode(input, characters, true);
        if (result.isError()) {
            characters.flip();
            String good = characters.toString();
            int bad = input.position();
            // The rest is only shown: its own wrong bytes become replacement characters.
            String rest =
                    new String(bytes, bad, Math.min(bytes.length - bad, SHOWN_OF_LARGE_FILE), StandardCharsets.UTF_8);
            SourceText source = new SourceText(name, good + rest);
            SourcePosition position = new SourceIndex(source).position(good.codePointCount(0, good.length()), 1);
            throw new DefinitionException(Diagnostic.of(
                    DiagnosticCode.FILE_NOT_UTF8,
                    source,
                    position,
                    String.format(Locale.ROOT, "0x%02X", bytes[bad] & 0xff)));
        }
        characters.flip();
        return characters.toString();
    }

    private static DefinitionException failure(DiagnosticCode code, String name, Object... arguments) {
        return new DefinitionException(Diagnostic.of(code, new SourceText(name, ""), SourcePosition.START, arguments));
    }
}
