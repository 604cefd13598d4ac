package io.github.gammawright.definition;

import io.github.gammawright.definition.MetricDefinition.Abbreviation;
import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DiagnosticCode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The table {@code [abbreviations]}. */
final class AbbreviationSection {

    private static final int HEIGHT_WITH_ABBREVIATIONS = 4;

    private final Reading reading;
    private final Map<String, TomlValue.Entry> declared = new LinkedHashMap<>();

    private AbbreviationSection(Reading reading) {
        this.reading = reading;
    }

    /** Declares the names; the expressions are read later, when all names are known. */
    static AbbreviationSection declare(KeyedTable top, Reading reading) {
        AbbreviationSection section = new AbbreviationSection(reading);
        top.table(DefinitionKeys.ABBREVIATIONS).ifPresent(table -> {
            for (TomlValue.Entry entry : table.entries()) {
                reading.declarations()
                        .declare(entry.key(), NameKind.ABBREVIATION, entry.position())
                        .ifPresent(name -> section.declared.put(name, entry));
            }
        });
        return section;
    }

    /** The abbreviations in an order in which each uses only earlier ones; otherwise in that of the file. */
    List<Abbreviation> read() {
        Scope scope = Scope.everything("in an abbreviation");
        Map<String, Abbreviation> abbreviations = new LinkedHashMap<>();
        declared.forEach((name, entry) -> {
            var expression = reading.expression(entry.value(), name, scope);
            if (expression.isPresent()) {
                abbreviations.put(name, new Abbreviation(name, expression.get(), entry.position()));
            } else {
                reading.unsound();
            }
        });
        AbbreviationOrder order = new AbbreviationOrder(abbreviations);
        order.cycles().forEach(cycle -> {
            List<String> circle = new ArrayList<>(cycle);
            circle.add(cycle.get(0));
            reading.diagnostics()
                    .report(
                            DiagnosticCode.ABBREVIATION_CYCLE,
                            abbreviations.get(cycle.get(0)).position(),
                            String.join(" -> ", circle));
            reading.unsound();
        });
        List<Abbreviation> sorted = order.sorted();
        if (order.cycles().isEmpty()) {
            learn(sorted);
        }
        return sorted;
    }

    /** What later sections ask: how high the tree is with everything put in, its constants, where its value varies. */
    private void learn(List<Abbreviation> sorted) {
        Map<String, Integer> heights = new HashMap<>();
        int highest = HEIGHT_WITH_ABBREVIATIONS * reading.limits().height();
        for (Abbreviation abbreviation : sorted) {
            Expression expression = abbreviation.expression();
            int height = Expressions.height(expression, name -> heights.getOrDefault(name, 1));
            heights.put(abbreviation.name(), height);
            if (height > highest) {
                reading.diagnostics()
                        .report(
                                DiagnosticCode.ABBREVIATIONS_TOO_DEEP,
                                abbreviation.position(),
                                abbreviation.name(),
                                highest);
                reading.unsound();
                return;
            }
            reading.constants().define(abbreviation.name(), expression);
            Expressions.forEachName(expression, name -> {
                if (variesInSpace(name.name())) {
                    reading.dependsOnCoordinates().add(abbreviation.name());
                }
            });
        }
    }

    private boolean variesInSpace(String name) {
        return reading.dependsOnCoordinates().contains(name)
                || reading.declarations()
                        .kind(name)
                        .filter(kind -> kind == NameKind.COORDINATE || kind == NameKind.FUNCTION)
                        .isPresent();
    }
}
