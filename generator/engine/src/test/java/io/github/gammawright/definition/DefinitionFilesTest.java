package io.github.gammawright.definition;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assumptions.assumeThat;

import io.github.gammawright.diagnostic.DefinitionException;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Files that are no definitions at all, and ordinary ones with extraordinary bytes. */
class DefinitionFilesTest {

    private static final String GOOD = "name = \"x\"\ncoordinates = [\"x\"]\nline-element = \"dx^2\"\n";

    @TempDir
    private Path folder;

    private Path file(byte[] bytes) throws IOException {
        return Files.write(folder.resolve("x.metric.toml"), bytes);
    }

    private static String refusal(Path file) {
        return catchThrowableOfType(DefinitionException.class, () -> DefinitionReader.read(file))
                .getMessage()
                .replace(file.toString(), "FILE");
    }

    @Test
    void aMissingFile() {
        assertThat(refusal(folder.resolve("no.metric.toml")))
                .isEqualTo(
                        "FILE:1:1: there is no such file\nCheck the path, or give the name of a built-in definition.");
    }

    @Test
    void aDirectory() {
        assertThat(refusal(folder)).isEqualTo("FILE:1:1: this is a directory\nGive the path of a definition in it.");
    }

    @Test
    void anUnreadableFile() throws IOException {
        Path file = file(GOOD.getBytes(StandardCharsets.UTF_8));
        assumeThat(file.getFileSystem().supportedFileAttributeViews()).contains("posix");
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("-wx------"));
        assumeThat(Files.isReadable(file)).isFalse();
        assertThat(refusal(file))
                .isEqualTo("FILE:1:1: the file cannot be read: access is denied\nCheck its permissions.");
    }

    @Test
    void anEmptyFile() throws IOException {
        String message = "FILE:1:1: the definition is empty\n%s\n^\nBegin with name, coordinates and line-element.";
        assertThat(refusal(file(new byte[0]))).isEqualTo(message.formatted(""));
        assertThat(refusal(file("\n \n".getBytes(StandardCharsets.UTF_8)))).isEqualTo(message.formatted(""));
        assertThat(refusal(file(new byte[] {(byte) 0xef, (byte) 0xbb, (byte) 0xbf})))
                .isEqualTo(message.formatted(""));
    }

    @Test
    void aBinaryFile() throws IOException {
        byte[] nul = (GOOD + "title = \"a\0b\"\n").getBytes(StandardCharsets.UTF_8);
        assertThat(refusal(file(nul)))
                .isEqualTo("FILE:4:11: a character that no text file holds: '␀'\ntitle = \"a␀b\"\n          ^\n"
                        + "Check that this is a definition, and save it as plain text in UTF-8.");
    }

    @Test
    void bytesThatAreNotUtf8() throws IOException {
        byte[] latin = (GOOD + "title = \"Röhre\"\n").getBytes(StandardCharsets.ISO_8859_1);
        assertThat(refusal(file(latin)))
                .isEqualTo(
                        "FILE:4:11: the byte 0xF6 is not part of any UTF-8 character\ntitle = \"R�hre\"\n          ^\n"
                                + "Save the file in UTF-8.");
        byte[] cut = Arrays.copyOf("title = \"ö".getBytes(StandardCharsets.UTF_8), 10);
        assertThat(refusal(file(cut))).startsWith("FILE:1:10: the byte 0xC3 is not part of any UTF-8 character");
    }

    @Test
    void aLineOfTenMegabytes() throws IOException {
        byte[] line = new byte[10_000_000];
        Arrays.fill(line, (byte) 'a');
        assertThat(refusal(file(line)))
                .isEqualTo("FILE:1:1: the file has more than 1048576 bytes, too many for a definition\n"
                        + "a".repeat(150) + "…\n^\nCheck that it is a definition; shorten it with abbreviations.");
    }

    @Test
    void aByteOrderMarkAndOtherLineEndsChangeNothing() throws IOException {
        String text = "\ufeff" + (GOOD + "[abbreviations]\na = '''\n x +\n qq'''\n").replace("\n", "\r\n");
        assertThat(refusal(file(text.getBytes(StandardCharsets.UTF_8))))
                .isEqualTo("FILE:7:2: unknown name 'qq'\n qq'''\n ^\n"
                        + "Declare it as a coordinate, or in [parameters], [abbreviations] or [functions].");
        MetricDefinition definition =
                DefinitionReader.read(file(text.replace("qq", "x").getBytes(StandardCharsets.UTF_8)));
        assertThat(definition.coordinates()).containsExactly("x");
        assertThat(definition.source().text()).startsWith("name");
        assertThat(definition.source().name())
                .isEqualTo(folder.resolve("x.metric.toml").toString());
    }
}
