package io.github.gammawright.definition.toml;

import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourceIndex;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.tomlj.Toml;
import org.tomlj.TomlArray;
import org.tomlj.TomlParseResult;
import org.tomlj.TomlPosition;
import org.tomlj.TomlTable;

/** Reads TOML into values that know where they stand; the library's own values know that of keys only. */
public final class TomlDocument {

    private static final Comparator<TomlValue.Entry> FILE_ORDER = Comparator.comparing(TomlValue.Entry::position);

    private final SourceIndex index;
    private final TomlPlaces places;

    private TomlDocument(SourceIndex index) {
        this.index = index;
        this.places = new TomlPlaces(index);
    }

    /**
     * Reads the collector's text.
     *
     * @param diagnostics is told what is wrong
     * @return the table of the whole file; empty when so much is wrong that nothing can be said about the rest
     */
    public static Optional<TomlValue.Table> read(Diagnostics diagnostics) {
        SourceIndex index = new SourceIndex(diagnostics.source());
        if (!new TomlScanner(index, diagnostics).scan()) {
            return Optional.empty();
        }
        TomlParseResult result;
        try {
            result = Toml.parse(diagnostics.source().text());
        } catch (RuntimeException fault) {
            // A fault of the library must not look like one of ours: the user can still mend the file.
            diagnostics.reportWithRemedy(
                    DiagnosticCode.TOML_SYNTAX,
                    SourcePosition.START,
                    "Compare the file with the TOML 1.0 specification.",
                    "the file cannot be read");
            return Optional.empty();
        }
        if (!new TomlMistakes(index, diagnostics).report(result.errors())) {
            return Optional.empty();
        }
        return Optional.of(new TomlDocument(index).table(result, SourcePosition.START));
    }

    private TomlValue.Table table(TomlTable table, SourcePosition position) {
        List<TomlValue.Entry> entries = new ArrayList<>();
        for (String key : table.keySet()) {
            List<String> path = List.of(key);
            int offset = offset(table.inputPositionOf(path));
            SourcePosition keyPosition = places.keyPosition(offset, key);
            entries.add(new TomlValue.Entry(
                    key, keyPosition, value(table.get(path), places.valueOffset(offset), keyPosition)));
        }
        entries.sort(FILE_ORDER);
        return new TomlValue.Table(entries, position);
    }

    /**
     * Converts a value.
     *
     * @param offset where its text begins, if it has one of its own; a table made by a header has none
     * @param keyPosition stands in where it has none
     */
    private TomlValue value(Object value, int offset, SourcePosition keyPosition) {
        SourcePosition position = index.position(offset, 1);
        if (value instanceof String text) {
            return new TomlValue.Text(located(text, offset), position);
        }
        if (value instanceof Long || value instanceof Double) {
            return number(value, offset);
        }
        if (value instanceof Boolean truth) {
            return new TomlValue.Truth(truth, position);
        }
        if (value instanceof TomlTable table) {
            return table(table, keyPosition);
        }
        if (value instanceof TomlArray array) {
            List<TomlValue> elements = new ArrayList<>();
            for (int i = 0; i < array.size(); i++) {
                int element = places.skipBlanks(offset(array.inputPositionOf(i)));
                elements.add(value(array.get(i), element, index.position(element, 1)));
            }
            return new TomlValue.Sequence(elements, keyPosition);
        }
        return new TomlValue.Moment(position);
    }

    private LocatedText located(String text, int offset) {
        int first = index.at(offset);
        if (first == '"' || first == '\'') {
            LocatedText located = TomlStrings.read(index, offset);
            if (located.toString().equals(text)) {
                return located;
            }
        }
        // Better all characters at one place than a text that differs from what the parser read.
        int[] characters = text.codePoints().toArray();
        int[] offsets = new int[characters.length + 1];
        java.util.Arrays.fill(offsets, offset);
        return new LocatedText(index, characters, offsets);
    }

    private TomlValue number(Object value, int offset) {
        int end = offset;
        while (isNumeric(index.at(end))) {
            end++;
        }
        String literal = index.text(offset, end).replace("_", "");
        boolean otherBase = literal.startsWith("0x") || literal.startsWith("0o") || literal.startsWith("0b");
        boolean recovered = !literal.isEmpty() && !otherBase;
        return new TomlValue.Number(
                recovered ? literal : String.valueOf(value), index.position(offset, Math.max(1, end - offset)));
    }

    private static boolean isNumeric(int c) {
        return c == '+' || c == '-' || c == '.' || c == '_' || (c > 0 && c < 0x80 && Character.isLetterOrDigit(c));
    }

    private int offset(TomlPosition position) {
        return position == null ? 0 : index.offset(position.line(), position.column());
    }
}
