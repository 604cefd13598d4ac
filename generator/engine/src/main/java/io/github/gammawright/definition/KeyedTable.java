package io.github.gammawright.definition;

import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.Spelling;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A table of a definition, of which values of a certain type are asked for; what is wrong is reported. */
final class KeyedTable {

    private final TomlValue.Table table;
    private final String place;
    private final Diagnostics diagnostics;

    /** The table, with the place it has in messages: "in [domain]". */
    KeyedTable(TomlValue.Table table, String place, Diagnostics diagnostics) {
        this.table = table;
        this.place = place;
        this.diagnostics = diagnostics;
    }

    SourcePosition position() {
        return table.position();
    }

    List<TomlValue.Entry> entries() {
        return table.entries();
    }

    boolean has(String key) {
        return entry(key).isPresent();
    }

    Optional<TomlValue.Entry> entry(String key) {
        return table.entries().stream().filter(e -> e.key().equals(key)).findFirst();
    }

    /** Reports every key that is none of these, with the nearest of them. */
    void allow(List<String> keys) {
        for (TomlValue.Entry entry : table.entries()) {
            if (!keys.contains(entry.key())) {
                unknown(entry, keys);
            }
        }
    }

    private void unknown(TomlValue.Entry entry, List<String> keys) {
        String key = entry.key();
        Optional<String> remedy = DefinitionKeys.home(key)
                .map(home -> "'" + key + "' belongs " + home + ".")
                .or(() -> Spelling.nearest(key, keys).map(nearest -> "Did you mean '" + nearest + "'?"));
        if (remedy.isPresent()) {
            diagnostics.reportWithRemedy(DiagnosticCode.KEY_UNKNOWN, entry.position(), remedy.get(), key, place);
        } else {
            diagnostics.report(DiagnosticCode.KEY_UNKNOWN, entry.position(), key, place, keys);
        }
    }

    /** Reports that a key must be there; the example shows how it may look. */
    void missing(String key, SourcePosition where, String example) {
        diagnostics.report(DiagnosticCode.KEY_MISSING, where, key, place, example);
    }

    Optional<LocatedText> text(String key) {
        return entry(key).flatMap(e -> text(e.value(), key));
    }

    /** The string of that key; empty when there is none. */
    String plainText(String key) {
        return text(key).map(LocatedText::toString).orElse("");
    }

    Optional<LocatedText> text(TomlValue value, String key) {
        if (value instanceof TomlValue.Text text) {
            return Optional.of(text.text());
        }
        wrongType(key, "a string in quotes", value);
        return Optional.empty();
    }

    Optional<Boolean> truth(String key) {
        Optional<TomlValue.Entry> entry = entry(key);
        if (entry.isPresent() && entry.get().value() instanceof TomlValue.Truth truth) {
            return Optional.of(truth.value());
        }
        entry.ifPresent(e -> wrongType(key, "true or false", e.value()));
        return Optional.empty();
    }

    Optional<TomlValue.Sequence> sequence(String key, String meaning) {
        return entry(key).flatMap(e -> sequence(e.value(), key, meaning));
    }

    Optional<TomlValue.Sequence> sequence(TomlValue value, String key, String meaning) {
        if (value instanceof TomlValue.Sequence sequence) {
            return Optional.of(sequence);
        }
        wrongType(key, meaning, value);
        return Optional.empty();
    }

    /** The strings in the array of that key; those that are none are reported and left out. */
    Optional<List<TomlValue.Text>> texts(String key) {
        return sequence(key, "an array of strings").map(sequence -> {
            List<TomlValue.Text> texts = new ArrayList<>();
            for (TomlValue element : sequence.elements()) {
                if (element instanceof TomlValue.Text text) {
                    texts.add(text);
                } else {
                    wrongType(key, "an array of strings", element);
                }
            }
            return texts;
        });
    }

    /** The table of that key. */
    Optional<KeyedTable> table(String key) {
        Optional<TomlValue.Entry> entry = entry(key);
        if (entry.isPresent() && entry.get().value() instanceof TomlValue.Table inner) {
            return Optional.of(new KeyedTable(inner, "in [" + key + "]", diagnostics));
        }
        entry.ifPresent(e -> wrongType(key, "a table: [" + key + "]", e.value()));
        return Optional.empty();
    }

    void wrongType(String key, String expected, TomlValue found) {
        diagnostics.report(DiagnosticCode.TYPE_WRONG, found.position(), key, expected, found.kind());
    }
}
