package io.github.gammawright.runtime.output;

import io.github.gammawright.runtime.orbit.TrajectorySink;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/**
 * Writes rows of doubles as a NumPy array, format version 1.0, little-endian, rows one after the other (NumPy Enhancement
 * Proposal 1, 2007; numpy.lib.format; from memory). The number of rows need not be known beforehand: it is put into the
 * header at the end.
 *
 * <p>As a sink it writes the parameter, then the state. The file appears under its name when the writer is closed.
 */
public final class NpyWriter implements TrajectorySink, AutoCloseable {

    private static final int HEADER = 128;
    private static final byte[] MAGIC = {(byte) 0x93, 'N', 'U', 'M', 'P', 'Y', 1, 0};

    private final PartFile file;
    private final FileChannel channel;
    private final int columns;
    private final ByteBuffer buffer = ByteBuffer.allocate(1 << 16).order(ByteOrder.LITTLE_ENDIAN);
    private long rows;
    private boolean closed;

    /**
     * Opens a file.
     *
     * @param path where it shall be; one that is there is replaced
     * @param columns how many doubles a row has; 1 or more
     * @throws IOException if it can't be written
     */
    public NpyWriter(Path path, int columns) throws IOException {
        if (columns < 1) {
            throw new IllegalArgumentException("a row can't have " + columns + " entries");
        }
        this.columns = columns;
        this.file = new PartFile(path);
        this.channel = FileChannel.open(file.path(), StandardOpenOption.WRITE);
        channel.position(HEADER);
    }

    @Override
    public void accept(double parameter, double[] state) {
        if (state.length != columns - 1) {
            throw new IllegalArgumentException(
                    "a row has " + columns + " entries, and parameter and state have " + (1 + state.length));
        }
        try {
            put(parameter);
            putAll(state);
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
        rows++;
    }

    /**
     * Writes a row without a parameter.
     *
     * @throws IOException if it can't be written
     */
    public void row(double... values) throws IOException {
        if (values.length != columns) {
            throw new IllegalArgumentException("a row has " + columns + " entries, not " + values.length);
        }
        putAll(values);
        rows++;
    }

    private void putAll(double[] values) throws IOException {
        for (double value : values) {
            put(value);
        }
    }

    private void put(double value) throws IOException {
        if (buffer.remaining() < Double.BYTES) {
            flush();
        }
        buffer.putDouble(value);
    }

    private void flush() throws IOException {
        buffer.flip();
        while (buffer.hasRemaining()) {
            channel.write(buffer);
        }
        buffer.clear();
    }

    private ByteBuffer header() {
        String shape = "{'descr': '<f8', 'fortran_order': False, 'shape': (" + rows + ", " + columns + "), }";
        ByteBuffer header = ByteBuffer.allocate(HEADER).order(ByteOrder.LITTLE_ENDIAN);
        header.put(MAGIC);
        header.putShort((short) (HEADER - MAGIC.length - Short.BYTES));
        header.put(shape.getBytes(StandardCharsets.US_ASCII));
        while (header.remaining() > 1) {
            header.put((byte) ' ');
        }
        header.put((byte) '\n');
        header.flip();
        return header;
    }

    /** Completes the file and gives it its name. */
    @Override
    public void close() throws IOException {
        if (closed) {
            return;
        }
        closed = true;
        flush();
        ByteBuffer header = header();
        long position = 0;
        while (header.hasRemaining()) {
            position += channel.write(header, position);
        }
        channel.close();
        file.publish();
    }

    /** Gives the file up; nothing is left of it. */
    public void discard() throws IOException {
        closed = true;
        channel.close();
        file.discard();
    }
}
