package io.github.gammawright.definition;

import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The table {@code [parameters]}. */
final class ParameterSection {

    private static final String PLACE = "in the default of a parameter";

    private final Reading reading;
    private final List<Named> declared = new ArrayList<>();

    private ParameterSection(Reading reading) {
        this.reading = reading;
    }

    /** Declares the names; the defaults are read later, when all names are known. */
    static ParameterSection declare(KeyedTable top, Reading reading) {
        ParameterSection section = new ParameterSection(reading);
        top.table(DefinitionKeys.PARAMETERS).ifPresent(table -> {
            for (TomlValue.Entry entry : table.entries()) {
                reading.declarations()
                        .declare(entry.key(), NameKind.PARAMETER, entry.position())
                        .ifPresent(name -> section.declared.add(new Named(name, entry)));
            }
        });
        return section;
    }

    List<MetricDefinition.Parameter> read() {
        return declared.stream().map(this::parameter).toList();
    }

    private MetricDefinition.Parameter parameter(Named named) {
        SourcePosition position = named.entry().position();
        if (!(named.entry().value() instanceof TomlValue.Table inner)) {
            return new MetricDefinition.Parameter(
                    named.name(), constant(named.entry().value(), named.name()), "", "", position);
        }
        KeyedTable table = new KeyedTable(inner, "in the parameter '" + named.name() + "'", reading.diagnostics());
        table.allow(DefinitionKeys.IN_PARAMETER);
        return new MetricDefinition.Parameter(
                named.name(),
                table.entry(DefinitionKeys.DEFAULT).flatMap(entry -> constant(entry.value(), DefinitionKeys.DEFAULT)),
                table.plainText(DefinitionKeys.DESCRIPTION),
                table.plainText(DefinitionKeys.UNIT),
                position);
    }

    private Optional<Expression> constant(TomlValue value, String key) {
        return reading.expression(value, key, Scope.nothing(PLACE))
                .filter(expression -> reading.finiteValue(expression).isPresent());
    }

    private record Named(String name, TomlValue.Entry entry) {}
}
