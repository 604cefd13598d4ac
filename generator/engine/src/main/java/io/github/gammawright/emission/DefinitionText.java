package io.github.gammawright.emission;

import io.github.gammawright.definition.ExpressionPrinter;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricForm;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.List;

/** The metric as its author gave it, in lines of text, and a number that stands for it. */
final class DefinitionText {

    private final MetricDefinition definition;

    DefinitionText(MetricDefinition definition) {
        this.definition = definition;
    }

    /** The form, then the abbreviations it uses. */
    List<String> formulas() {
        List<String> lines = new ArrayList<>();
        MetricForm form = definition.form();
        List<String> coordinates = definition.coordinates();
        if (form instanceof MetricForm.LineElement line) {
            lines.add("ds^2 = " + ExpressionPrinter.print(line.expression()));
        } else if (form instanceof MetricForm.Matrix matrix) {
            for (int i = 0; i < matrix.rows().size(); i++) {
                for (int j = 0; j < matrix.rows().get(i).size(); j++) {
                    lines.add("g[" + coordinates.get(i) + "][" + coordinates.get(j) + "] = "
                            + ExpressionPrinter.print(matrix.rows().get(i).get(j)));
                }
            }
        } else if (form instanceof MetricForm.ThreePlusOne split) {
            lines.add("lapse = " + ExpressionPrinter.print(split.lapse()));
            for (int i = 0; i < split.shift().size(); i++) {
                lines.add("shift[" + coordinates.get(i + 1) + "] = "
                        + ExpressionPrinter.print(split.shift().get(i)));
            }
            lines.add("spatial ds^2 = " + ExpressionPrinter.print(split.spatialLineElement()));
        } else if (form instanceof MetricForm.Coframe coframe) {
            for (int i = 0; i < coframe.oneForms().size(); i++) {
                lines.add("e[" + i + "] = "
                        + ExpressionPrinter.print(coframe.oneForms().get(i)) + "   (square counts "
                        + (coframe.signs().get(i) < 0 ? "-" : "+") + "1)");
            }
        }
        for (MetricDefinition.Abbreviation abbreviation : definition.abbreviations()) {
            lines.add(abbreviation.name() + " = " + ExpressionPrinter.print(abbreviation.expression()));
        }
        for (MetricDefinition.CallerFunction function : definition.functions()) {
            lines.add(function.name() + " = " + function.name() + "(" + String.join(", ", function.of()) + ")");
        }
        return lines;
    }

    /**
     * A version of serialised objects: the first eight bytes of the SHA-256 digest of everything that the meaning of the
     * parameters depends on.
     */
    long serialVersion() {
        List<String> parts = new ArrayList<>();
        parts.add(definition.name());
        parts.addAll(definition.coordinates());
        definition.parameters().forEach(parameter -> parts.add("parameter " + parameter.name()));
        parts.addAll(formulas());
        definition.domain().conditions().forEach(condition -> parts.add(condition.text()));
        byte[] digest;
        try {
            digest = MessageDigest.getInstance("SHA-256")
                    .digest(String.join("\n", parts).getBytes(StandardCharsets.UTF_8));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
        long version = 0;
        for (int i = 0; i < Long.BYTES; i++) {
            version = (version << Byte.SIZE) | (digest[i] & 0xFF);
        }
        return version;
    }
}
