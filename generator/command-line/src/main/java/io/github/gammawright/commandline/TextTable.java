package io.github.gammawright.commandline;

import java.util.ArrayList;
import java.util.List;

/** Rows of text, each column as wide as its widest cell. */
final class TextTable {

    private static final String GAP = "  ";

    private final List<List<String>> rows = new ArrayList<>();

    TextTable row(List<String> cells) {
        rows.add(List.copyOf(cells));
        return this;
    }

    /** Left-aligned columns. */
    String leftAligned() {
        return render(Integer.MAX_VALUE);
    }

    /** The given number of left-aligned columns, then right-aligned ones, as numbers want. */
    String withNumbersFrom(int column) {
        return render(column);
    }

    private String render(int firstRight) {
        List<Integer> widths = widths();
        StringBuilder text = new StringBuilder();
        for (List<String> row : rows) {
            StringBuilder line = new StringBuilder();
            for (int i = 0; i < row.size(); i++) {
                String cell = row.get(i);
                String padding = " ".repeat(widths.get(i) - width(cell));
                line.append(i == 0 ? "" : GAP).append(i >= firstRight ? padding + cell : cell + padding);
            }
            text.append(line.toString().stripTrailing()).append('\n');
        }
        return text.toString();
    }

    private List<Integer> widths() {
        List<Integer> widths = new ArrayList<>();
        for (List<String> row : rows) {
            for (int i = 0; i < row.size(); i++) {
                if (i == widths.size()) {
                    widths.add(0);
                }
                widths.set(i, Math.max(widths.get(i), width(row.get(i))));
            }
        }
        return widths;
    }

    private static int width(String cell) {
        return cell.codePointCount(0, cell.length());
    }
}
