package io.github.gammawright.definition;

import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.Spelling;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** The table {@code [functions]}. */
final class FunctionSection {

    private final Reading reading;
    private final List<Named> declared = new ArrayList<>();

    private FunctionSection(Reading reading) {
        this.reading = reading;
    }

    /** Declares the names; what they depend on is read later, when all names are known. */
    static FunctionSection declare(KeyedTable top, Reading reading) {
        FunctionSection section = new FunctionSection(reading);
        top.table(DefinitionKeys.FUNCTIONS).ifPresent(functions -> {
            for (TomlValue.Entry entry : functions.entries()) {
                Optional<String> name =
                        reading.declarations().declare(entry.key(), NameKind.FUNCTION, entry.position());
                if (name.isPresent() && entry.value() instanceof TomlValue.Table inner) {
                    String place = "in the function '" + name.get() + "'";
                    section.declared.add(
                            new Named(name.get(), entry, new KeyedTable(inner, place, reading.diagnostics())));
                } else if (name.isPresent()) {
                    functions.wrongType(
                            name.get(), "a table such as { of = [\"r\"], sample = \"exp(-r)\" }", entry.value());
                }
            }
        });
        return section;
    }

    List<MetricDefinition.CallerFunction> read() {
        return declared.stream().map(this::function).toList();
    }

    private MetricDefinition.CallerFunction function(Named named) {
        KeyedTable table = named.table();
        table.allow(DefinitionKeys.IN_FUNCTION);
        List<String> of = arguments(named);
        Scope scope = new Scope(
                "in the sample of '" + named.name() + "'",
                name -> of.contains(name) || reading.declarations().kind(name).orElseThrow() == NameKind.PARAMETER,
                Set.of(),
                "A sample may use the coordinates listed in 'of' and the parameters.");
        Optional<Expression> sample = table.entry(DefinitionKeys.SAMPLE)
                .flatMap(entry -> reading.expression(entry.value(), DefinitionKeys.SAMPLE, scope));
        return new MetricDefinition.CallerFunction(
                named.name(), of, sample, named.entry().position());
    }

    private List<String> arguments(Named named) {
        KeyedTable table = named.table();
        if (!table.has(DefinitionKeys.OF)) {
            table.missing(DefinitionKeys.OF, named.entry().position(), "of = [\"r\"], the coordinates it depends on");
            return List.of();
        }
        Optional<List<TomlValue.Text>> texts = table.texts(DefinitionKeys.OF);
        List<String> of = new ArrayList<>();
        for (TomlValue.Text text : texts.orElse(List.of())) {
            coordinate(text.text(), of, reading).ifPresent(of::add);
        }
        if (texts.isPresent() && texts.get().isEmpty()) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.LENGTH_WRONG,
                            table.entry(DefinitionKeys.OF).orElseThrow().position(),
                            DefinitionKeys.OF,
                            "one coordinate or more",
                            "none");
        }
        return of;
    }

    /** The coordinate that a string names, if it does and is not among those before. */
    static Optional<String> coordinate(LocatedText text, List<String> before, Reading reading) {
        String name = Names.normalised(text.toString());
        List<String> coordinates = reading.declarations().names(NameKind.COORDINATE);
        if (before.contains(name)) {
            reading.diagnostics().report(DiagnosticCode.VALUE_DUPLICATE, text.position(0, text.length()), name);
            return Optional.empty();
        }
        if (coordinates.contains(name)) {
            return Optional.of(name);
        }
        String remedy = Spelling.nearest(name, coordinates)
                .map(nearest -> "Did you mean '" + nearest + "'?")
                .orElseGet(() -> DiagnosticCode.VALUE_UNKNOWN.remedy("coordinate", name, coordinates));
        reading.diagnostics()
                .reportWithRemedy(
                        DiagnosticCode.VALUE_UNKNOWN, text.position(0, text.length()), remedy, "coordinate", name);
        return Optional.empty();
    }

    private record Named(String name, TomlValue.Entry entry, KeyedTable table) {}
}
