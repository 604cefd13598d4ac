package io.github.gammawright.runtime.output;

import io.github.gammawright.runtime.orbit.TrajectorySink;
import java.io.BufferedWriter;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * Writes a trajectory as comma-separated values (RFC 4180, UTF-8), a head line and a line for each state; each number is
 * the shortest that gives the same double again.
 *
 * <p>The file appears under its name when the writer is closed; without {@link #close} nothing is left but a file that ends
 * in {@code .part}.
 */
public final class CsvWriter implements TrajectorySink, AutoCloseable {

    private final PartFile file;
    private final BufferedWriter writer;
    private final int columns;
    private final StringBuilder line = new StringBuilder();
    private boolean closed;

    /**
     * Opens a file.
     *
     * @param path where it shall be; one that is there is replaced
     * @param columns the names of the parameter and of the entries of the state, with their units
     * @throws IOException if it can't be written
     */
    public CsvWriter(Path path, List<String> columns) throws IOException {
        if (columns.isEmpty()) {
            throw new IllegalArgumentException("there must be a column for the parameter");
        }
        this.columns = columns.size();
        this.file = new PartFile(path);
        this.writer = Files.newBufferedWriter(file.path(), StandardCharsets.UTF_8);
        for (int i = 0; i < this.columns; i++) {
            line.append(i == 0 ? "" : ",").append(quoted(columns.get(i)));
        }
        endLine();
    }

    private static String quoted(String name) {
        boolean plain = name.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
        return plain ? name : '"' + name.replace("\"", "\"\"") + '"';
    }

    /**
     * Writes a line.
     *
     * @throws IllegalArgumentException if there are not as many entries as columns but one
     * @throws UncheckedIOException if it can't be written
     */
    @Override
    public void accept(double parameter, double[] state) {
        if (state.length != columns - 1) {
            throw new IllegalArgumentException(
                    "the file has " + (columns - 1) + " columns beside the parameter, and the state " + state.length);
        }
        line.append(parameter);
        for (double value : state) {
            line.append(',').append(value);
        }
        try {
            endLine();
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    private void endLine() throws IOException {
        writer.append(line).append("\r\n");
        line.setLength(0);
    }

    /** Completes the file and gives it its name. */
    @Override
    public void close() throws IOException {
        if (closed) {
            return;
        }
        closed = true;
        writer.close();
        file.publish();
    }

    /** Gives the file up; nothing is left of it. */
    public void discard() throws IOException {
        closed = true;
        writer.close();
        file.discard();
    }
}
