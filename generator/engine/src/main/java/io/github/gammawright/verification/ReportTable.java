package io.github.gammawright.verification;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;

/** Prints reports as a table for a terminal, lines ended by a line feed. */
public final class ReportTable {

    private static final List<String> HEADINGS =
            List.of("quantity", "compared", "median ulp", "worst ulp", "median limit", "worst limit", "verdict");

    private ReportTable() {}

    /** The reports one after the other. */
    public static String of(List<KernelReport> reports) {
        return reports.stream().map(ReportTable::of).collect(Collectors.joining("\n"));
    }

    private static String of(KernelReport report) {
        StringBuilder text = new StringBuilder();
        text.append(report.className()).append(": ").append(report.verdict().text());
        if (report.points() > 0) {
            text.append(", ").append(report.points()).append(" points");
            if (report.edgePoints() > 0) {
                text.append(" (").append(report.edgePoints()).append(" at edges)");
            }
        }
        report.largestMethod()
                .ifPresent(size -> text.append(", largest method ")
                        .append(size.method())
                        .append(' ')
                        .append(size.bytecodes())
                        .append(" bytecodes"));
        text.append('\n');
        if (!report.quantities().isEmpty()) {
            table(report.quantities(), text);
        }
        for (QuantityReport quantity : report.quantities()) {
            details(quantity, text);
        }
        report.notChecked().ifPresent(reason -> line(text, "not checked: " + reason));
        report.defects().forEach(defect -> line(text, "defect: " + defect));
        report.notes().forEach(note -> line(text, "note: " + note));
        report.warnings().forEach(warning -> line(text, "compiler warning, " + warning));
        return text.toString();
    }

    private static void table(List<QuantityReport> quantities, StringBuilder text) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(HEADINGS);
        for (QuantityReport quantity : quantities) {
            rows.add(List.of(
                    quantity.quantity(),
                    Long.toString(quantity.compared()),
                    number(quantity.medianUlps()),
                    number(quantity.worstUlps().map(Deviation::ulps).orElse(Double.NaN)),
                    number(quantity.medianLimits()),
                    number(quantity.worstLimits().map(Deviation::limits).orElse(Double.NaN)),
                    quantity.passed() ? "passed" : "failed"));
        }
        for (List<String> row : rows) {
            StringBuilder line = new StringBuilder("  ");
            for (int column = 0; column < row.size(); column++) {
                int width = width(rows, column);
                String cell = row.get(column);
                boolean left = column == 0 || column == row.size() - 1;
                String padding = " ".repeat(width - cell.length());
                line.append(left ? cell + padding : padding + cell).append("  ");
            }
            text.append(line.toString().stripTrailing()).append('\n');
        }
    }

    private static int width(List<List<String>> rows, int column) {
        return rows.stream().mapToInt(row -> row.get(column).length()).max().orElse(0);
    }

    private static void details(QuantityReport quantity, StringBuilder text) {
        quantity.worstUlps().ifPresent(worst -> line(text, "worst by ulp: " + error(quantity, worst)));
        quantity.worstLimits()
                .filter(worst -> !quantity.worstUlps().equals(quantity.worstLimits()))
                .ifPresent(worst -> line(text, "worst by limit: " + error(quantity, worst)));
        if (quantity.undefined() > 0) {
            line(text, quantity.undefined() + " values of " + quantity.quantity() + " are undefined and not compared");
        }
        if (quantity.compared() == 0) {
            line(text, "no value of " + quantity.quantity() + " could be compared");
        }
        Optional<Deviation> violation = quantity.worstViolation();
        violation.ifPresent(worst -> line(
                text,
                quantity.violations() + " values out of bounds, worst " + where(quantity, worst) + ": " + worst.actual()
                        + " instead of " + worst.expected()));
    }

    private static String error(QuantityReport quantity, Deviation deviation) {
        return number(deviation.ulps()) + " ulp, " + number(deviation.limits()) + " conditioning limits, "
                + where(quantity, deviation);
    }

    private static String where(QuantityReport quantity, Deviation deviation) {
        StringBuilder where = new StringBuilder(quantity.quantity());
        if (!deviation.indices().isEmpty()) {
            where.append(deviation.indices());
        }
        where.append(" at ").append(deviation.point());
        if (!deviation.parameters().isEmpty()) {
            where.append(" with parameters ").append(deviation.parameters());
        }
        deviation.inputs().forEach(input -> where.append(" and ").append(input));
        return where.toString();
    }

    private static void line(StringBuilder text, String content) {
        text.append("  ").append(content).append('\n');
    }

    /** Two significant digits are all that such a number says. */
    private static String number(double value) {
        if (Double.isNaN(value)) {
            return "-";
        }
        if (Double.isInfinite(value)) {
            return "infinite";
        }
        return value != 0 && (value < 0.01 || value >= 1e5)
                ? String.format(Locale.ROOT, "%.1e", value)
                : String.format(Locale.ROOT, value < 10 ? "%.2f" : "%.0f", value);
    }
}
