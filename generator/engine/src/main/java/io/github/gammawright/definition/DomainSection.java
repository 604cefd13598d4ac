package io.github.gammawright.definition;

import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Spelling;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The table {@code [domain]}. */
final class DomainSection {

    private final Reading reading;

    private DomainSection(Reading reading) {
        this.reading = reading;
    }

    static MetricDefinition.Domain read(KeyedTable top, Reading reading) {
        return top.table(DefinitionKeys.DOMAIN)
                .map(new DomainSection(reading)::domain)
                .orElseGet(() -> new MetricDefinition.Domain(List.of(), Map.of()));
    }

    private MetricDefinition.Domain domain(KeyedTable table) {
        table.allow(DefinitionKeys.IN_DOMAIN);
        List<MetricDefinition.Condition> conditions = new ArrayList<>();
        for (TomlValue.Text text : table.texts(DefinitionKeys.CONDITIONS).orElse(List.of())) {
            reading.condition(text.text()).ifPresent(conditions::add);
        }
        Map<String, MetricDefinition.Range> ranges = new LinkedHashMap<>();
        if (table.entry(DefinitionKeys.SAMPLE).isPresent()) {
            table.table(DefinitionKeys.SAMPLE).ifPresent(sample -> {
                for (TomlValue.Entry entry : sample.entries()) {
                    range(sample, entry).ifPresent(range -> ranges.put(Names.normalised(entry.key()), range));
                }
            });
        }
        return new MetricDefinition.Domain(conditions, ranges);
    }

    private Optional<MetricDefinition.Range> range(KeyedTable sample, TomlValue.Entry entry) {
        if (!hasRange(entry)) {
            return Optional.empty();
        }
        Optional<TomlValue.Sequence> pair = sample.sequence(entry.value(), entry.key(), "a pair of numbers [from, to]");
        if (pair.isEmpty()) {
            return Optional.empty();
        }
        List<TomlValue> ends = pair.get().elements();
        if (ends.size() != 2) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.LENGTH_WRONG,
                            pair.get().position(),
                            entry.key(),
                            "two numbers [from, to]",
                            ends.size());
            return Optional.empty();
        }
        Optional<Double> from = end(ends.get(0), entry.key());
        Optional<Double> to = end(ends.get(1), entry.key());
        if (from.isEmpty() || to.isEmpty()) {
            return Optional.empty();
        }
        if (from.get() > to.get()) {
            reading.diagnostics()
                    .report(DiagnosticCode.RANGE_INVALID, ends.get(0).position(), from.get(), to.get());
            return Optional.empty();
        }
        return Optional.of(new MetricDefinition.Range(from.get(), to.get()));
    }

    private boolean hasRange(TomlValue.Entry entry) {
        String name = Names.normalised(entry.key());
        Optional<NameKind> kind = reading.declarations().kind(name);
        if (kind.isEmpty()) {
            List<String> known = new ArrayList<>(reading.declarations().names(NameKind.COORDINATE));
            known.addAll(reading.declarations().names(NameKind.PARAMETER));
            Optional<String> nearest = Spelling.nearest(name, known);
            String remedy = nearest.map(n -> "Did you mean '" + n + "'?")
                    .orElse("Only coordinates and parameters have a sample range.");
            reading.diagnostics().reportWithRemedy(DiagnosticCode.NAME_UNKNOWN, entry.position(), remedy, entry.key());
            return false;
        }
        if (kind.get() != NameKind.COORDINATE && kind.get() != NameKind.PARAMETER) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.RANGE_OF_NOTHING,
                            entry.position(),
                            entry.key(),
                            kind.get().phrase());
            return false;
        }
        return true;
    }

    private Optional<Double> end(TomlValue value, String key) {
        return reading.expression(value, key, Scope.nothing("in a sample range"))
                .flatMap(reading::finiteValue);
    }
}
