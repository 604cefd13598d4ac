package io.github.gammawright.definition;

import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DiagnosticCode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The form {@code metric}: rows of g_ij, in full or only up to the diagonal. */
final class MatrixSection {

    private final KeyedTable top;
    private final TomlValue.Entry form;
    private final List<String> coordinates;
    private final Reading reading;

    private MatrixSection(KeyedTable top, TomlValue.Entry form, List<String> coordinates, Reading reading) {
        this.top = top;
        this.form = form;
        this.coordinates = coordinates;
        this.reading = reading;
    }

    /** The lower triangle; nothing if anything was wrong with it, which is then reported. */
    static Optional<MetricForm> read(KeyedTable top, TomlValue.Entry form, List<String> coordinates, Reading reading) {
        return new MatrixSection(top, form, coordinates, reading).read();
    }

    private Optional<MetricForm> read() {
        Optional<TomlValue.Sequence> outer = top.sequence(form.key(), "an array of rows");
        if (outer.isEmpty()) {
            return Optional.empty();
        }
        List<TomlValue.Sequence> rows = new ArrayList<>();
        for (TomlValue row : outer.get().elements()) {
            top.sequence(row, "a row of " + form.key(), "an array of expressions")
                    .ifPresent(rows::add);
        }
        boolean allRows = rows.size() == outer.get().elements().size();
        if (!allRows || !hasRightShape(rows)) {
            return Optional.empty();
        }
        return entries(rows).flatMap(this::lowerTriangle);
    }

    private boolean hasRightShape(List<TomlValue.Sequence> rows) {
        int n = coordinates.size();
        if (rows.size() != n) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.LENGTH_WRONG,
                            form.position(),
                            form.key(),
                            count(n, "row") + ", one for each coordinate",
                            rows.size());
            return false;
        }
        // The first row tells which of the two shapes is meant, in one dimension they are the same.
        boolean full = !rows.isEmpty() && rows.get(0).elements().size() > 1;
        boolean right = true;
        for (int i = 0; i < n; i++) {
            int needed = full ? n : i + 1;
            int found = rows.get(i).elements().size();
            if (found != needed) {
                right = false;
                reading.diagnostics()
                        .report(
                                DiagnosticCode.MATRIX_SHAPE,
                                rows.get(i).position(),
                                i + 1,
                                count(found, "entry"),
                                needed);
            }
        }
        return right;
    }

    private static String count(int n, String noun) {
        String plural = noun.endsWith("y") ? noun.substring(0, noun.length() - 1) + "ies" : noun + "s";
        return n + " " + (n == 1 ? noun : plural);
    }

    private Optional<List<List<Expression>>> entries(List<TomlValue.Sequence> rows) {
        Scope scope = Scope.everything("in a component g_ij");
        boolean sound = true;
        List<List<Expression>> entries = new ArrayList<>();
        for (TomlValue.Sequence row : rows) {
            List<Expression> expressions = new ArrayList<>();
            for (TomlValue element : row.elements()) {
                reading.expression(element, form.key(), scope).ifPresent(expressions::add);
            }
            sound &= expressions.size() == row.elements().size();
            entries.add(expressions);
        }
        return sound ? Optional.of(entries) : Optional.empty();
    }

    private Optional<MetricForm> lowerTriangle(List<List<Expression>> entries) {
        int n = entries.size();
        List<List<Expression>> lower = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            lower.add(entries.get(i).subList(0, i + 1));
            for (int j = i + 1; j < entries.get(i).size(); j++) {
                reading.upperTriangle()
                        .add(new SymmetryCheck.Pair(
                                entries.get(j).get(i), entries.get(i).get(j), coordinates.get(j), coordinates.get(i)));
            }
        }
        boolean regular = true;
        for (int k = 0; k < n; k++) {
            if (isZeroRow(lower, k)) {
                regular = false;
                reading.diagnostics()
                        .report(
                                DiagnosticCode.METRIC_DEGENERATE,
                                Expressions.start(lower.get(k).get(0)),
                                "the row of '" + coordinates.get(k) + "'");
            }
        }
        return regular ? Optional.of(new MetricForm.Matrix(lower)) : Optional.empty();
    }

    private boolean isZeroRow(List<List<Expression>> lower, int k) {
        for (int i = 0; i < lower.size(); i++) {
            Expression entry = lower.get(Math.max(i, k)).get(Math.min(i, k));
            if (!reading.constants().isZero(entry)) {
                return false;
            }
        }
        return true;
    }
}
