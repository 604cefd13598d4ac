package io.github.gammawright.verification;

import java.util.List;

/**
 * What a check found of a definition as a whole.
 *
 * @param definition its name
 * @param identities between its classes, those of which all quantities were checked
 * @param claims of its author, in the order in which definitions list them
 * @param cyclic the coordinates of which the metric was found to be free, claimed or not
 */
public record DefinitionReport(
        String definition, List<IdentityReport> identities, List<ClaimReport> claims, List<String> cyclic) {

    public DefinitionReport {
        identities = List.copyOf(identities);
        claims = List.copyOf(claims);
        cyclic = List.copyOf(cyclic);
    }

    /** Whether all identities hold, and no claim is refuted. */
    public boolean passed() {
        return identities.stream().noneMatch(identity -> identity.violations() > 0)
                && claims.stream().noneMatch(ClaimReport::refuted);
    }
}
