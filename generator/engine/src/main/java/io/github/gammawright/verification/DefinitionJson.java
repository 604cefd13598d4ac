package io.github.gammawright.verification;

/** Adds what was found of definitions to a JSON text. */
final class DefinitionJson {

    private final JsonWriter json;

    DefinitionJson(JsonWriter json) {
        this.json = json;
    }

    void add(DefinitionReport report) {
        json.beginObject();
        json.key("definition").value(report.definition());
        json.key("passed").value(report.passed());
        json.key("identities").beginArray();
        report.identities().forEach(this::add);
        json.endArray();
        json.key("claims").beginArray();
        report.claims().forEach(this::add);
        json.endArray();
        json.key("independentOf").beginArray();
        report.cyclic().forEach(json::value);
        json.endArray();
        json.endObject();
    }

    private void add(IdentityReport identity) {
        json.beginObject();
        json.key("identity").value(identity.name());
        json.key("formula").value(identity.formula());
        json.key("points").value(identity.points());
        json.key("compared").value(identity.compared());
        json.key("worstOfAllowed").value(identity.worst());
        json.key("violations").value(identity.violations());
        json.key("worstViolation");
        if (identity.worstViolation().isPresent()) {
            IdentityReport.Residual worst = identity.worstViolation().get();
            json.beginObject();
            json.key("indices").beginArray();
            worst.indices().forEach(json::value);
            json.endArray();
            numbers("parameters", worst.parameters());
            numbers("point", worst.point());
            json.key("value").value(worst.value());
            json.key("allowed").value(worst.allowed());
            json.endObject();
        } else {
            json.value((String) null);
        }
        json.endObject();
    }

    private void add(ClaimReport claim) {
        json.beginObject();
        json.key("claim").value(claim.claim());
        json.key("verdict").value(claim.verdict().text());
        json.key("points").value(claim.points());
        json.key("because").value(claim.explanation());
        json.key("witness");
        if (claim.witness().isPresent()) {
            ClaimReport.Witness witness = claim.witness().get();
            json.beginObject();
            json.key("component").value(witness.component());
            numbers("parameters", witness.parameters());
            numbers("point", witness.point());
            json.key("value").value(witness.value());
            json.endObject();
        } else {
            json.value((String) null);
        }
        json.endObject();
    }

    private void numbers(String key, Iterable<Double> values) {
        json.key(key).beginArray();
        values.forEach(json::value);
        json.endArray();
    }
}
