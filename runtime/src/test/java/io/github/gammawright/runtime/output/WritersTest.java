package io.github.gammawright.runtime.output;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WritersTest {

    @TempDir
    Path folder;

    @Test
    void csvHoldsWhatWasHandedOn() throws IOException {
        Path path = folder.resolve("new/orbit.csv");
        try (CsvWriter writer = new CsvWriter(path, List.of("lambda [M]", "r, outer", "say \"phi\""))) {
            writer.accept(0.1, new double[] {1e-300, -0.0});
            writer.accept(0.2, new double[] {1.0 / 3, 12345678.9});
            assertThat(path).doesNotExist();
            assertThatThrownBy(() -> writer.accept(0, new double[3])).hasMessageContaining("2 columns");
        }
        assertThat(Files.readString(path))
                .isEqualTo("lambda [M],\"r, outer\",\"say \"\"phi\"\"\"\r\n"
                        + "0.1,1.0E-300,-0.0\r\n0.2,0.3333333333333333,1.23456789E7\r\n");
        assertThat(names(path.getParent())).containsExactly("orbit.csv");
    }

    /** Against the format's description, byte by byte (NumPy Enhancement Proposal 1; from memory). */
    @Test
    void npyIsWhatTheFormatSays() throws IOException {
        Path path = folder.resolve("orbit.npy");
        Files.writeString(path, "old");
        Random random = new Random(3);
        double[][] rows = new double[10_001][];
        try (NpyWriter writer = new NpyWriter(path, 3)) {
            for (int i = 0; i < rows.length; i++) {
                rows[i] = random.doubles(3).toArray();
                if (i % 2 == 0) {
                    writer.row(rows[i]);
                } else {
                    writer.accept(rows[i][0], new double[] {rows[i][1], rows[i][2]});
                }
            }
            assertThat(path).hasContent("old");
            assertThatThrownBy(() -> writer.row(1)).hasMessageContaining("3 entries, not 1");
            assertThatThrownBy(() -> writer.accept(1, new double[1])).hasMessageContaining("have 2");
        }
        ByteBuffer bytes = ByteBuffer.wrap(Files.readAllBytes(path)).order(ByteOrder.LITTLE_ENDIAN);
        byte[] magic = new byte[8];
        bytes.get(magic);
        assertThat(magic).containsExactly(0x93, 'N', 'U', 'M', 'P', 'Y', 1, 0);
        int length = bytes.getShort();
        assertThat((10 + length) % 64).isZero();
        byte[] header = new byte[length];
        bytes.get(header);
        String text = new String(header, StandardCharsets.US_ASCII);
        assertThat(text).endsWith("\n");
        assertThat(text.strip()).isEqualTo("{'descr': '<f8', 'fortran_order': False, 'shape': (10001, 3), }");
        for (double[] row : rows) {
            for (double value : row) {
                assertThat(bytes.getDouble()).isEqualTo(value);
            }
        }
        assertThat(bytes.hasRemaining()).isFalse();
    }

    @Test
    void whatIsGivenUpLeavesNothing() throws IOException {
        Path csv = folder.resolve("a.csv");
        CsvWriter writer = new CsvWriter(csv, List.of("t"));
        writer.accept(1, new double[0]);
        writer.discard();
        writer.close();
        NpyWriter npy = new NpyWriter(folder.resolve("a.npy"), 1);
        npy.row(1);
        npy.discard();
        npy.close();
        assertThat(names(folder)).isEmpty();
        assertThatThrownBy(() -> new CsvWriter(csv, List.of())).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new NpyWriter(csv, 0)).isInstanceOf(IllegalArgumentException.class);
    }

    private static List<String> names(Path folder) throws IOException {
        try (var files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).toList();
        }
    }
}
