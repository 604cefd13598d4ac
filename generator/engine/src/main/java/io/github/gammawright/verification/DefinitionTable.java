package io.github.gammawright.verification;

import io.github.gammawright.diagnostic.VisibleText;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Prints what was found of definitions for a terminal, lines ended by a line feed. */
public final class DefinitionTable {

    private DefinitionTable() {}

    /** Identities, claims, and what was found without being claimed. */
    public static String of(DefinitionReport report) {
        StringBuilder text = new StringBuilder();
        text.append(report.definition())
                .append(report.passed() ? ": passed" : ": failed")
                .append('\n');
        identities(report.identities(), text);
        claims(report.claims(), text);
        if (!report.cyclic().isEmpty()) {
            text.append("  the metric does not depend on ")
                    .append(VisibleText.of(String.join(", ", report.cyclic())))
                    .append('\n');
        }
        return text.toString();
    }

    private static void identities(List<IdentityReport> identities, StringBuilder text) {
        if (identities.isEmpty()) {
            return;
        }
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("identity", "must vanish", "compared", "worst of allowed", "verdict"));
        for (IdentityReport identity : identities) {
            rows.add(List.of(
                    identity.name(),
                    identity.formula(),
                    Long.toString(identity.compared()),
                    String.format(Locale.ROOT, "%.1e", identity.worst()),
                    verdict(identity)));
        }
        table(rows, text);
        for (IdentityReport identity : identities) {
            identity.worstViolation()
                    .ifPresent(worst -> text.append("  ")
                            .append(identity.name())
                            .append(worst.indices().isEmpty() ? "" : " " + worst.indices())
                            .append(" leaves ")
                            .append(worst.value())
                            .append(where(worst.parameters(), worst.point()))
                            .append(", where at most ")
                            .append(worst.allowed())
                            .append(" is allowed\n"));
        }
    }

    private static String verdict(IdentityReport identity) {
        return identity.violations() > 0 ? "failed" : identity.compared() == 0 ? "not tried" : "passed";
    }

    private static void claims(List<ClaimReport> claims, StringBuilder text) {
        if (claims.isEmpty()) {
            return;
        }
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("claim", "points", "verdict", "because"));
        for (ClaimReport claim : claims) {
            rows.add(List.of(
                    VisibleText.of(claim.claim()),
                    Integer.toString(claim.points()),
                    claim.verdict().text(),
                    VisibleText.of(claim.explanation())));
        }
        table(rows, text);
        for (ClaimReport claim : claims) {
            claim.witness()
                    .filter(witness -> claim.refuted())
                    .ifPresent(witness -> text.append("  counter-example to ")
                            .append(VisibleText.of(claim.claim()))
                            .append(": ")
                            .append(VisibleText.of(witness.component()))
                            .append(" = ")
                            .append(witness.value())
                            .append(where(witness.parameters(), witness.point()))
                            .append('\n'));
        }
    }

    private static String where(List<Double> parameters, List<Double> point) {
        return " at " + point + (parameters.isEmpty() ? "" : " with parameters " + parameters);
    }

    private static void table(List<List<String>> rows, StringBuilder text) {
        for (List<String> row : rows) {
            StringBuilder line = new StringBuilder("  ");
            for (int column = 0; column < row.size(); column++) {
                int width = 0;
                for (List<String> other : rows) {
                    width = Math.max(width, length(other.get(column)));
                }
                line.append(row.get(column))
                        .append(" ".repeat(width - length(row.get(column))))
                        .append("  ");
            }
            text.append(line.toString().stripTrailing()).append('\n');
        }
    }

    private static int length(String cell) {
        return cell.codePointCount(0, cell.length());
    }
}
