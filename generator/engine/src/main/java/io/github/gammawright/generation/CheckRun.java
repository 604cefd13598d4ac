package io.github.gammawright.generation;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.verification.CheckSettings;
import io.github.gammawright.verification.KernelCheck;
import io.github.gammawright.verification.KernelReport;
import io.github.gammawright.verification.KernelUnderTest;
import io.github.gammawright.verification.KernelUnderTest.RequestedFunction;
import java.util.List;

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
        GeneratedClass made = new KernelGenerator().generate(definition, kernel);
        return check.check(new KernelUnderTest(
                kernel.qualifiedName(), made.source(), kernel.quantities(), kernel.layout(), requested(made)));
    }

    private static List<RequestedFunction> requested(GeneratedClass made) {
        return made.functions().stream()
                .map(function -> new RequestedFunction(function.name(), function.method(), function.orders()))
                .toList();
    }
}
