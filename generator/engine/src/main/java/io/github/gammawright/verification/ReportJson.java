package io.github.gammawright.verification;

import java.util.List;
import java.util.Optional;

/**
 * Prints reports as JSON (RFC 8259): an object whose member {@code kernels} holds an object for each class and whose member
 * {@code definitions} holds one for each definition. Numbers that JSON does not have, NaN and the infinities, are null.
 */
public final class ReportJson {

    private ReportJson() {}

    /** The text, ended by a line feed. */
    public static String of(List<KernelReport> reports, List<DefinitionReport> definitions) {
        JsonWriter json = new JsonWriter();
        json.beginObject();
        json.key("passed")
                .value(reports.stream().allMatch(report -> report.verdict() == KernelReport.Verdict.PASSED)
                        && definitions.stream().allMatch(DefinitionReport::passed));
        json.key("kernels").beginArray();
        reports.forEach(report -> kernel(json, report));
        json.endArray();
        json.key("definitions").beginArray();
        definitions.forEach(new DefinitionJson(json)::add);
        json.endArray();
        json.endObject();
        return json + "\n";
    }

    private static void kernel(JsonWriter json, KernelReport report) {
        json.beginObject();
        json.key("class").value(report.className());
        json.key("definition").value(report.definition());
        json.key("verdict").value(report.verdict().text());
        json.key("points").value(report.points());
        json.key("edgePoints").value(report.edgePoints());
        json.key("seed").value(report.settings().seed());
        json.key("digits").value(report.settings().digits());
        json.key("relativeBound").value(report.settings().relativeBound());
        json.key("limitMultiple").value(report.settings().limitMultiple());
        json.key("notChecked").value(report.notChecked().orElse(null));
        texts(json, "defects", report.defects());
        texts(json, "notes", report.notes());
        texts(json, "warnings", report.warnings());
        json.key("largestMethod");
        if (report.largestMethod().isPresent()) {
            json.beginObject();
            json.key("name").value(report.largestMethod().get().method());
            json.key("bytecodes").value(report.largestMethod().get().bytecodes());
            json.endObject();
        } else {
            json.value((String) null);
        }
        json.key("quantities").beginArray();
        report.quantities().forEach(quantity -> quantity(json, quantity));
        json.endArray();
        json.endObject();
    }

    private static void quantity(JsonWriter json, QuantityReport quantity) {
        json.beginObject();
        json.key("quantity").value(quantity.quantity());
        json.key("passed").value(quantity.passed());
        json.key("compared").value(quantity.compared());
        json.key("undefined").value(quantity.undefined());
        json.key("medianUlps").value(quantity.medianUlps());
        json.key("medianLimits").value(quantity.medianLimits());
        json.key("worstZero").value(quantity.worstZero());
        json.key("violations").value(quantity.violations());
        deviation(json, "worstByUlps", quantity.worstUlps());
        deviation(json, "worstByLimits", quantity.worstLimits());
        deviation(json, "worstViolation", quantity.worstViolation());
        json.endObject();
    }

    private static void deviation(JsonWriter json, String key, Optional<Deviation> deviation) {
        json.key(key);
        if (deviation.isEmpty()) {
            json.value((String) null);
            return;
        }
        Deviation worst = deviation.get();
        json.beginObject();
        json.key("indices").beginArray();
        worst.indices().forEach(json::value);
        json.endArray();
        numbers(json.key("parameters"), worst.parameters());
        numbers(json.key("point"), worst.point());
        json.key("inputs").beginArray();
        worst.inputs().forEach(input -> numbers(json, input));
        json.endArray();
        json.key("expected").value(worst.expected());
        json.key("actual").value(worst.actual());
        json.key("ulps").value(worst.ulps());
        json.key("limits").value(worst.limits());
        json.endObject();
    }

    private static void numbers(JsonWriter json, List<Double> values) {
        json.beginArray();
        values.forEach(json::value);
        json.endArray();
    }

    private static void texts(JsonWriter json, String key, List<String> values) {
        json.key(key).beginArray();
        values.forEach(json::value);
        json.endArray();
    }
}
