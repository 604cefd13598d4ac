package io.github.gammawright.generation;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.CheckSettings;
import io.github.gammawright.verification.KernelCheck;
import io.github.gammawright.verification.KernelReport;

/** Makes kernels of one definition and compares each with the reference; nothing is written. Not thread-safe. */
public final class CheckRun {

    private final MetricDefinition definition;
    private final KernelCheck check;

    /** A run over kernels of that definition, all at the same points. */
    public CheckRun(MetricDefinition definition, CheckSettings settings) {
        this.definition = definition;
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
}
