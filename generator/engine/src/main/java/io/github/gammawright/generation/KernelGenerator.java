package io.github.gammawright.generation;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.emission.KernelEmitter;
import io.github.gammawright.emission.KernelModel;
import io.github.gammawright.geometry.DomainPoints;
import io.github.gammawright.geometry.DomainProgram;
import io.github.gammawright.geometry.FramePlan;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.MetricGraphBuilder;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Route;
import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.optimiser.CostModel;
import io.github.gammawright.optimiser.FusedOperations;
import io.github.gammawright.optimiser.Optimiser;
import io.github.gammawright.optimiser.Schedule;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The way from a definition to a kernel class. */
public final class KernelGenerator {

    private static final int GUARD_POINTS = 192;

    /** What part of the budget goes into the Christoffel symbols before they are contracted. */
    private static final double SHARE_OF_SYMBOLS = 0.5;

    /**
     * Makes a class.
     *
     * @throws io.github.gammawright.diagnostic.DefinitionException for mistakes of the definition that show only when
     *     its metric is built, such as a determinant that vanishes identically
     */
    public GeneratedClass generate(MetricDefinition definition, KernelSpecification specification) {
        return MetricMistakes.reported(definition, () -> make(definition, specification));
    }

    private static GeneratedClass make(MetricDefinition definition, KernelSpecification specification) {
        Applicability.require(definition, specification.quantities());
        Optional<FramePlan> framePlan = Applicability.framePlan(definition, specification.quantities());
        SamplePoints points = DomainPoints.guard(definition, GUARD_POINTS);
        GenerationOptions options = specification.options();
        List<Candidate> candidates = candidates(definition, specification, framePlan);
        if (specification.quantities().equals(List.of(Quantity.GEODESIC_ACCELERATION))) {
            candidates.add(contracted(definition, specification, candidates.get(0), points));
        }
        Optimiser optimiser = optimiser(points, options, 1);
        Optimiser.Outcome outcome =
                optimiser.optimise(candidates.stream().map(Candidate::program).toList());
        Candidate origin = candidates.get(outcome.start());
        boolean shared = options.trigonometry() == GenerationOptions.Trigonometry.SHARED;
        StraightLineProgram program = outcome.program().program();
        List<CostReport.Stage> stages = new ArrayList<>();
        stages.add(
                stage("graph (" + origin.description() + ")", origin.program().program()));
        stages.add(stage("resubstitution", program));
        if (options.fma()) {
            program = FusedOperations.of(program, points);
            stages.add(stage("fused operations", program));
        }
        program = Schedule.of(program);
        stages.add(stage("schedule", program));
        if (shared) {
            stages.add(new CostReport.Stage(
                    "shared trigonometry",
                    program.countWithSharedTrigonometry(),
                    CostModel.standard().withSharedTrigonometry(program) / (double) CostModel.ADDITION));
        }
        KernelModel model = KernelModels.of(
                        definition, specification, origin.zero(), program, DomainProgram.of(definition))
                .withSharedTrigonometry(shared);
        return new GeneratedClass(
                specification, KernelEmitter.emit(model), KernelEmitter.functions(model), new CostReport(stages));
    }

    private static CostReport.Stage stage(String name, StraightLineProgram program) {
        double additions = CostModel.standard().of(program) / (double) CostModel.ADDITION;
        return new CostReport.Stage(name, program.count(), additions);
    }

    private static List<Candidate> candidates(
            MetricDefinition definition, KernelSpecification specification, Optional<FramePlan> framePlan) {
        List<Candidate> candidates = new ArrayList<>();
        for (Route route : Route.candidates(MetricGraphBuilder.build(definition), specification.quantities())) {
            candidates.addAll(Candidate.of(definition, specification, route, framePlan, candidates.isEmpty()));
        }
        return candidates;
    }

    /** The acceleration from Christoffel symbols on which a part of the budget was spent first. */
    private static Candidate contracted(
            MetricDefinition definition, KernelSpecification specification, Candidate model, SamplePoints points) {
        KernelSpecification ofSymbols = new KernelSpecification(
                specification.packageName(),
                specification.className(),
                List.of(Quantity.CHRISTOFFEL),
                Layout.FULL,
                specification.options());
        List<Candidate> symbols = candidates(definition, ofSymbols, Optional.empty());
        Optimiser.Outcome outcome = optimiser(points, specification.options(), SHARE_OF_SYMBOLS)
                .optimise(symbols.stream().map(Candidate::program).toList());
        LoweredProgram program = ContractedSymbols.of(
                outcome.program(),
                symbols.get(outcome.start()).zero().get(0),
                model.program(),
                definition.coordinates().size());
        return new Candidate("optimised Christoffel symbols, contracted", model.zero(), program);
    }

    private static Optimiser optimiser(SamplePoints points, GenerationOptions options, double share) {
        return new Optimiser(
                points,
                Math.round(share * budget(options.effort())),
                options.prefer() == GenerationOptions.Preference.ACCURACY ? 1.25 : 4);
    }

    private static long budget(GenerationOptions.Effort effort) {
        return switch (effort) {
            case QUICK -> 3_000_000;
            case NORMAL -> 16_000_000;
            case THOROUGH -> 300_000_000;
        };
    }
}
