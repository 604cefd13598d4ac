package io.github.gammawright.verification;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.KernelInstance.Defect;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * Checks kernels of one definition: compiles each in memory, runs it at points of the domain and compares every component
 * with the reference.
 *
 * <pre>{@code
 * KernelCheck check = new KernelCheck(definition, CheckSettings.DEFAULT);
 * KernelReport report = check.check(new KernelUnderTest("kernels.KerrMetric", source, quantities, Layout.FULL));
 * report.verdict();   // PASSED, FAILED or NOT_CHECKED
 * }</pre>
 *
 * <p>The points depend on the definition and the settings alone. Not thread-safe.
 */
public final class KernelCheck {

    private final MetricDefinition definition;
    private final CheckSettings settings;
    private final ReferenceEvaluator evaluator;
    private final IdentityCheck identities;
    private DomainSample sample;

    /** A check of kernels of that definition. */
    public KernelCheck(MetricDefinition definition, CheckSettings settings) {
        this.definition = definition;
        this.settings = settings;
        this.evaluator = new ReferenceEvaluator(definition, settings.digits());
        this.identities = new IdentityCheck(evaluator, settings);
    }

    /**
     * Checks one class.
     *
     * @throws CompilationFailure when there is no compiler, or the class does not compile
     */
    public KernelReport check(KernelUnderTest kernel) {
        ReportBuilder report = new ReportBuilder(kernel.qualifiedName(), definition.name(), settings);
        CompiledClasses classes = InMemoryCompiler.ofThisJdk().compile(kernel.qualifiedName(), kernel.source());
        report.compiled(classes);
        Optional<String> obstacle = obstacle(kernel);
        if (obstacle.isPresent()) {
            return report.notChecked(obstacle.get());
        }
        sample().shortage().ifPresent(report::note);
        report.points(sample().points());
        try {
            run(kernel, classes.load(), report);
        } catch (Defect defect) {
            report.defect(defect.getMessage());
        }
        return report.build();
    }

    /**
     * Tries the identities between the classes of single quantities that have been checked so far.
     *
     * @param cyclic the coordinates, by number, of which the metric is free
     */
    public List<IdentityReport> identities(List<Integer> cyclic) {
        return identities.reports(sample().points(), cyclic);
    }

    private DomainSample sample() {
        if (sample == null) {
            sample = new DomainSampler(evaluator, settings.seed()).draw(settings.points(), settings.edgePoints());
        }
        return sample;
    }

    /** Why nothing can be compared. */
    private Optional<String> obstacle(KernelUnderTest kernel) {
        for (MetricDefinition.CallerFunction function : definition.functions()) {
            if (function.sample().isEmpty()) {
                return Optional.of("the function " + function.name() + " has no sample to stand for it");
            }
        }
        for (Quantity quantity : kernel.quantities()) {
            if (ReferenceQuantity.named(quantity.symbol()).isEmpty()) {
                return Optional.of("the reference does not compute " + quantity.symbol());
            }
        }
        return sample().points().isEmpty() ? sample().shortage() : Optional.empty();
    }

    private void run(KernelUnderTest kernel, Class<?> type, ReportBuilder report) throws Defect {
        InputArrays inputs = new InputArrays(kernel.quantities(), definition.dimension(), settings.seed());
        boolean single = kernel.quantities().size() == 1;
        KernelInstance instance = new KernelInstance(
                type, single, 1 + inputs.count() + kernel.quantities().size());
        List<QuantityComparison> comparisons = new ArrayList<>();
        for (Quantity quantity : kernel.quantities()) {
            comparisons.add(
                    QuantityComparison.of(quantity, kernel.layout(), definition.dimension(), instance, settings));
        }
        ReferenceTrio trio = new ReferenceTrio(evaluator);
        for (int p = 0; p < sample().points().size(); p++) {
            SamplePoint point = sample().points().get(p);
            double[] parameters = point.parameters();
            Object object = instance.construct(
                    parameters,
                    !definition.functions().isEmpty(),
                    wanted -> CallerFunctionProxy.of(wanted, evaluator, parameters, kernel.functions()));
            if (!point.isAtEdge() && !instance.inDomain(object, point.coordinates())) {
                throw new Defect("inDomain is false at " + point.coordinateList() + ", which meets all conditions");
            }
            double[][] vectors = inputs.at(p);
            evaluate(instance, object, point, vectors, comparisons);
            trio.moveTo(point);
            for (QuantityComparison comparison : comparisons) {
                comparison.compare(trio, point, inputs, vectors);
            }
        }
        if (CheckedKernel.fits(kernel)) {
            identities.add(new CheckedKernel(kernel, instance, evaluator));
        }
        comparisons.forEach(comparison -> report.quantity(comparison.report()));
    }

    private static void evaluate(
            KernelInstance instance,
            Object object,
            SamplePoint point,
            double[][] vectors,
            List<QuantityComparison> comparisons)
            throws Defect {
        double[][] arrays = new double[1 + vectors.length + comparisons.size()][];
        arrays[0] = point.coordinates();
        for (int i = 0; i < vectors.length; i++) {
            arrays[1 + i] = vectors[i].clone();
        }
        for (int i = 0; i < comparisons.size(); i++) {
            arrays[1 + vectors.length + i] = comparisons.get(i).freshResult();
        }
        instance.evaluate(object, arrays);
        boolean unchanged = Arrays.equals(arrays[0], point.coordinates());
        for (int i = 0; i < vectors.length; i++) {
            unchanged &= Arrays.equals(arrays[1 + i], vectors[i]);
        }
        if (!unchanged) {
            throw new Defect("evaluate changes its inputs");
        }
    }
}
