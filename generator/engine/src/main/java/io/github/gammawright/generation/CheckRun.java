package io.github.gammawright.generation;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.CheckSettings;
import io.github.gammawright.verification.DefinitionReport;
import io.github.gammawright.verification.KernelCheck;
import io.github.gammawright.verification.KernelReport;
import io.github.gammawright.verification.claims.ClaimCheck;
import java.util.List;

/** Makes kernels of one definition and compares each with the reference; nothing is written. Not thread-safe. */
public final class CheckRun {

    private final MetricDefinition definition;
    private final KernelCheck check;
    private final CheckSettings settings;

    /** A run over kernels of that definition, all at the same points. */
    public CheckRun(MetricDefinition definition, CheckSettings settings) {
        this.definition = definition;
        this.settings = settings;
        this.check = new KernelCheck(definition, settings);
    }

    /**
     * Makes and checks one kernel.
     *
     * @throws io.github.gammawright.diagnostic.DefinitionException for mistakes of the definition that show only now
     */
    public KernelReport check(KernelSpecification kernel) {
        return check.check(new KernelGenerator().generate(definition, kernel).underTest());
    }

    /**
     * Examines the definition's claims, and the identities between the kernels of single quantities that have been
     * checked.
     */
    public DefinitionReport definition() {
        return MetricMistakes.reported(definition, () -> {
            ClaimCheck claims = new ClaimCheck(definition, settings.digits(), settings.seed());
            List<Integer> cyclic = claims.cyclicCoordinates();
            return new DefinitionReport(
                    definition.name(),
                    check.identities(cyclic),
                    claims.reports(),
                    cyclic.stream().map(definition.coordinates()::get).toList());
        });
    }
}
