package io.github.gammawright.definition;

import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The first lines of a definition: what it is called and which coordinates it has; none if they are wrong. */
record HeadSection(String name, String title, String reference, List<String> coordinates) {

    private static final int MOST_COORDINATES = 16;

    static HeadSection read(KeyedTable top, Reading reading) {
        return new HeadSection(
                name(top, reading),
                top.plainText(DefinitionKeys.TITLE),
                top.plainText(DefinitionKeys.REFERENCE),
                coordinates(top, reading));
    }

    private static String name(KeyedTable top, Reading reading) {
        if (!top.has(DefinitionKeys.NAME)) {
            top.missing(DefinitionKeys.NAME, SourcePosition.START, "name = \"lantern-star\"");
            return "";
        }
        Optional<LocatedText> text = top.text(DefinitionKeys.NAME);
        if (text.isEmpty()) {
            return "";
        }
        String name = text.get().toString();
        if (!ClassNames.isDefinitionName(name)) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.DEFINITION_NAME_INVALID,
                            text.get().position(0, text.get().length()),
                            name,
                            ClassNames.LONGEST);
        }
        return name;
    }

    private static List<String> coordinates(KeyedTable top, Reading reading) {
        Optional<TomlValue.Entry> entry = top.entry(DefinitionKeys.COORDINATES);
        if (entry.isEmpty()) {
            top.missing(DefinitionKeys.COORDINATES, SourcePosition.START, "coordinates = [\"t\", \"x\", \"y\", \"z\"]");
            reading.unsound();
            return List.of();
        }
        List<TomlValue.Text> texts = top.texts(DefinitionKeys.COORDINATES).orElse(List.of());
        boolean isArray = entry.get().value() instanceof TomlValue.Sequence;
        int count = entry.get().value() instanceof TomlValue.Sequence sequence
                ? sequence.elements().size()
                : 0;
        if (isArray && (count == 0 || count > MOST_COORDINATES)) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.COORDINATES_WRONG,
                            entry.get().position(),
                            "1 to " + MOST_COORDINATES,
                            count);
        }
        List<String> names = new ArrayList<>();
        for (TomlValue.Text text : texts) {
            LocatedText located = text.text();
            reading.declarations()
                    .declare(located.toString(), NameKind.COORDINATE, located.position(0, located.length()))
                    .ifPresent(names::add);
        }
        if (names.isEmpty() || names.size() != count || count > MOST_COORDINATES) {
            // Whatever depends on the number of coordinates would be compared with a wrong one.
            reading.unsound();
            return List.of();
        }
        return names;
    }
}
