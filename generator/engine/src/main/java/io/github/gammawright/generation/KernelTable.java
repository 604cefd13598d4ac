package io.github.gammawright.generation;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricDefinition.KernelEntry;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.generation.BuildSettings.Precedence;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A {@code [[kernel]]} table, its names looked up and what it leaves out taken from the settings. */
final class KernelTable {

    private final MetricDefinition definition;
    private final KernelEntry table;
    private final BuildSettings settings;
    private final Diagnostics diagnostics;

    KernelTable(MetricDefinition definition, KernelEntry table, BuildSettings settings, Diagnostics diagnostics) {
        this.definition = definition;
        this.table = table;
        this.settings = settings;
        this.diagnostics = diagnostics;
    }

    /** The classes of the table; none where a name in it is unknown, which has then been reported. */
    List<Planned> plan() {
        int before = diagnostics.size();
        List<Quantity> quantities = quantities();
        Layout layout = choose(Vocabulary.layouts(), table.layout(), settings.layout(), Layout.FULL);
        GenerationOptions options = options();
        String packageName = decide(table.packageName(), settings.packageName()).orElse(BuildSettings.DEFAULT_PACKAGE);
        if (diagnostics.size() > before) {
            return List.of();
        }
        SourcePosition position = table.className().map(this::position).orElse(table.position());
        return Planned.classes(definition, packageName, table.className(), quantities, layout, options, position);
    }

    private List<Quantity> quantities() {
        List<Quantity> quantities = new ArrayList<>();
        for (String name : table.quantities()) {
            lookUp(Vocabulary.quantities(), name).ifPresent(quantity -> {
                if (quantities.contains(quantity)) {
                    diagnostics.report(DiagnosticCode.QUANTITY_TWICE, position(name), name);
                }
                quantities.add(quantity);
            });
        }
        return quantities;
    }

    private GenerationOptions options() {
        GenerationOptions standard = GenerationOptions.DEFAULT;
        return new GenerationOptions(
                choose(Vocabulary.efforts(), table.effort(), settings.effort(), standard.effort()),
                choose(
                        Vocabulary.trigonometry(),
                        table.trigonometry(),
                        settings.trigonometry(),
                        standard.trigonometry()),
                decide(table.fma(), settings.fma()).orElse(standard.fma()),
                choose(Vocabulary.preferences(), table.prefer(), settings.prefer(), standard.prefer()));
    }

    private <T> T choose(Vocabulary<T> vocabulary, Optional<String> word, Optional<T> setting, T standard) {
        // Looked up even where the setting decides: a wrong word is wrong whoever has precedence.
        Optional<T> value = word.flatMap(name -> lookUp(vocabulary, name));
        return decide(value, setting).orElse(standard);
    }

    private <T> Optional<T> decide(Optional<T> inTable, Optional<T> setting) {
        return settings.precedence() == Precedence.SETTINGS ? setting.or(() -> inTable) : inTable.or(() -> setting);
    }

    private <T> Optional<T> lookUp(Vocabulary<T> vocabulary, String word) {
        Optional<T> value = vocabulary.find(word);
        if (value.isEmpty()) {
            DiagnosticCode code = DiagnosticCode.VALUE_UNKNOWN;
            String remedy = vocabulary
                    .nearest(word)
                    .map(nearest -> "Did you mean '" + nearest + "'?")
                    .orElseGet(() -> code.remedy(vocabulary.kind(), word, vocabulary.words()));
            diagnostics.reportWithRemedy(code, position(word), remedy, vocabulary.kind(), word);
        }
        return value;
    }

    private SourcePosition position(String value) {
        return SourceSearch.quoted(definition.source(), value, table.position());
    }
}
