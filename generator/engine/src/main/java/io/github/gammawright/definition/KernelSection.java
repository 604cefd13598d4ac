package io.github.gammawright.definition;

import io.github.gammawright.definition.MetricDefinition.KernelEntry;
import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.LocatedText;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The tables {@code [[kernel]]}. What their words mean, and whether they are known, is for a later stage to say. */
final class KernelSection {

    private final Reading reading;

    private KernelSection(Reading reading) {
        this.reading = reading;
    }

    static List<KernelEntry> read(KeyedTable top, Reading reading) {
        KernelSection section = new KernelSection(reading);
        List<KernelEntry> kernels = new ArrayList<>();
        top.sequence(DefinitionKeys.KERNEL, "repeated tables: [[kernel]]").ifPresent(tables -> {
            for (TomlValue element : tables.elements()) {
                if (element instanceof TomlValue.Table table) {
                    kernels.add(section.kernel(new KeyedTable(table, "in [[kernel]]", reading.diagnostics())));
                } else {
                    top.wrongType(DefinitionKeys.KERNEL, "repeated tables: [[kernel]]", element);
                }
            }
        });
        return kernels;
    }

    private KernelEntry kernel(KeyedTable table) {
        table.allow(DefinitionKeys.IN_KERNEL);
        return new KernelEntry(
                className(table),
                quantities(table),
                word(table, DefinitionKeys.LAYOUT),
                packageName(table),
                word(table, DefinitionKeys.EFFORT),
                word(table, DefinitionKeys.TRIGONOMETRY),
                table.truth(DefinitionKeys.FMA),
                word(table, DefinitionKeys.PREFER),
                table.position());
    }

    private Optional<String> className(KeyedTable table) {
        return table.text(DefinitionKeys.CLASS).map(text -> {
            String name = text.toString();
            if (!ClassNames.isClassName(name)) {
                reading.diagnostics()
                        .reportWithRemedy(
                                DiagnosticCode.JAVA_NAME_INVALID,
                                text.position(0, text.length()),
                                "Use letters and digits, such as LanternStarOrbit, and no word or basic class of the"
                                        + " language.",
                                name,
                                "class");
            }
            return name;
        });
    }

    private Optional<String> packageName(KeyedTable table) {
        return table.text(DefinitionKeys.PACKAGE).map(text -> {
            String name = text.toString();
            if (!ClassNames.isPackageName(name)) {
                reading.diagnostics()
                        .reportWithRemedy(
                                DiagnosticCode.JAVA_NAME_INVALID,
                                text.position(0, text.length()),
                                "Use words joined by '.', such as com.example.kernels.",
                                name,
                                "package");
            }
            return name;
        });
    }

    private List<String> quantities(KeyedTable table) {
        if (!table.has(DefinitionKeys.QUANTITIES)) {
            table.missing(DefinitionKeys.QUANTITIES, table.position(), "quantities = [\"christoffel\"]");
            return List.of();
        }
        List<String> quantities = table.texts(DefinitionKeys.QUANTITIES).orElse(List.of()).stream()
                .map(text -> text.text().toString())
                .toList();
        boolean isEmptyArray =
                table.entry(DefinitionKeys.QUANTITIES).orElseThrow().value() instanceof TomlValue.Sequence sequence
                        && sequence.elements().isEmpty();
        if (isEmptyArray) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.LENGTH_WRONG,
                            table.entry(DefinitionKeys.QUANTITIES).orElseThrow().position(),
                            DefinitionKeys.QUANTITIES,
                            "one quantity or more",
                            "none");
        }
        return quantities;
    }

    private static Optional<String> word(KeyedTable table, String key) {
        return table.text(key).map(LocatedText::toString);
    }
}
