package io.github.gammawright.definition.toml;

import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.List;

/** A value of a TOML file that knows where it stands. */
public sealed interface TomlValue {

    /** Where the value begins; of a table with a header, the header. */
    SourcePosition position();

    /** What the value is, with its article, as messages call it. */
    String kind();

    /** A string of any of the four kinds, each character with its place in the file. */
    record Text(LocatedText text, SourcePosition position) implements TomlValue {
        @Override
        public String kind() {
            return "a string";
        }
    }

    /**
     * An integer or a float.
     *
     * @param literal as it is written, or, of an integer in base 2, 8 or 16, in base 10; without underscores; may be
     *     {@code nan} or {@code inf} with a sign
     */
    record Number(String literal, SourcePosition position) implements TomlValue {
        @Override
        public String kind() {
            return "a number";
        }
    }

    /** True or false. */
    record Truth(boolean value, SourcePosition position) implements TomlValue {
        @Override
        public String kind() {
            return "a truth value";
        }
    }

    /** A date or time, which no key of ours takes. */
    record Moment(SourcePosition position) implements TomlValue {
        @Override
        public String kind() {
            return "a date or time";
        }
    }

    /** An array, or the tables of a repeated header such as {@code [[kernel]]}. */
    record Sequence(List<TomlValue> elements, SourcePosition position) implements TomlValue {

        public Sequence {
            elements = List.copyOf(elements);
        }

        @Override
        public String kind() {
            return "an array";
        }
    }

    /** A table of any kind, its entries in the order of the file. */
    record Table(List<Entry> entries, SourcePosition position) implements TomlValue {

        public Table {
            entries = List.copyOf(entries);
        }

        @Override
        public String kind() {
            return "a table";
        }
    }

    /** A key with its value; the position is that of the key, of a dotted one its last part. */
    record Entry(String key, SourcePosition position, TomlValue value) {}
}
