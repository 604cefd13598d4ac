package io.github.gammawright.definition;

import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.LocatedText;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** The table {@code [claims]}. */
final class ClaimsSection {

    private final KeyedTable table;
    private final List<String> coordinates;
    private final Reading reading;

    private ClaimsSection(KeyedTable table, List<String> coordinates, Reading reading) {
        this.table = table;
        this.coordinates = coordinates;
        this.reading = reading;
    }

    static MetricDefinition.Claims read(KeyedTable top, List<String> coordinates, Reading reading) {
        return top.table(DefinitionKeys.CLAIMS)
                .map(table -> new ClaimsSection(table, coordinates, reading).claims())
                .orElseGet(MetricDefinition.Claims::none);
    }

    private MetricDefinition.Claims claims() {
        table.allow(DefinitionKeys.IN_CLAIMS);
        return new MetricDefinition.Claims(
                table.truth(DefinitionKeys.VACUUM),
                table.text(DefinitionKeys.SIGNATURE)
                        .filter(text -> FormSection.isSignature(text, coordinates, reading))
                        .map(LocatedText::toString),
                independentOf(),
                table.truth(DefinitionKeys.CONFORMALLY_FLAT),
                einsteinConstant(),
                killing());
    }

    private Optional<List<String>> independentOf() {
        return table.texts(DefinitionKeys.INDEPENDENT_OF).map(texts -> {
            List<String> names = new ArrayList<>();
            for (TomlValue.Text text : texts) {
                FunctionSection.coordinate(text.text(), names, reading).ifPresent(names::add);
            }
            return names;
        });
    }

    private Optional<Expression> einsteinConstant() {
        Scope scope = new Scope(
                "in a constant",
                this::isConstant,
                Set.of(),
                "It must have the same value everywhere: use parameters and abbreviations of them only.");
        return table.entry(DefinitionKeys.EINSTEIN_CONSTANT)
                .flatMap(entry -> reading.expression(entry.value(), entry.key(), scope));
    }

    private boolean isConstant(String name) {
        NameKind kind = reading.declarations().kind(name).orElseThrow();
        return kind == NameKind.PARAMETER
                || (kind == NameKind.ABBREVIATION
                        && !reading.dependsOnCoordinates().contains(name));
    }

    private List<List<Expression>> killing() {
        Optional<TomlValue.Sequence> outer =
                table.sequence(DefinitionKeys.KILLING, "an array of vector fields, each an array of components");
        List<List<Expression>> fields = new ArrayList<>();
        for (TomlValue element : outer.map(TomlValue.Sequence::elements).orElse(List.of())) {
            table.sequence(element, "a field of killing", "an array of contravariant components")
                    .map(this::field)
                    .ifPresent(fields::add);
        }
        return fields;
    }

    private List<Expression> field(TomlValue.Sequence components) {
        if (components.elements().size() != coordinates.size() && !coordinates.isEmpty()) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.LENGTH_WRONG,
                            components.position(),
                            "a field of killing",
                            coordinates.size() + " components",
                            components.elements().size());
        }
        List<Expression> field = new ArrayList<>();
        Scope scope = Scope.everything("in a vector field");
        for (TomlValue component : components.elements()) {
            reading.expression(component, DefinitionKeys.KILLING, scope).ifPresent(field::add);
        }
        return field;
    }
}
