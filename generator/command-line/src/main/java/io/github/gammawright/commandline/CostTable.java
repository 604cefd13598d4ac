package io.github.gammawright.commandline;

import io.github.gammawright.generation.CostReport;
import io.github.gammawright.generation.GeneratedClass;
import io.github.gammawright.graph.OperationCount;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.SortedSet;
import java.util.TreeSet;

/** Modelled cost, in additions, and operation counts of a kernel, one line for each stage of its making. */
final class CostTable {

    private CostTable() {}

    /** The table, with a heading, lines ended by a line feed. */
    static String of(GeneratedClass made) {
        SortedSet<String> functions = new TreeSet<>();
        for (CostReport.Stage stage : made.cost().stages()) {
            functions.addAll(stage.count().functions().keySet());
        }
        List<String> heading =
                new ArrayList<>(List.of(made.specification().className(), "cost", "operations", "+ −", "×", "/"));
        heading.addAll(functions);
        TextTable table = new TextTable().row(heading);
        for (CostReport.Stage stage : made.cost().stages()) {
            table.row(row(stage, functions));
        }
        return table.withNumbersFrom(1);
    }

    private static List<String> row(CostReport.Stage stage, SortedSet<String> functions) {
        OperationCount count = stage.count();
        List<String> cells = new ArrayList<>(List.of(
                stage.name(),
                String.format(Locale.ROOT, "%.0f", stage.cost()),
                Integer.toString(count.operations()),
                Integer.toString(count.additions()),
                Integer.toString(count.multiplications()),
                Integer.toString(count.divisions())));
        for (String function : functions) {
            cells.add(Integer.toString(count.functions().getOrDefault(function, 0)));
        }
        return cells;
    }
}
