package io.github.gammawright.generation;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.emission.KernelEmitter;
import io.github.gammawright.emission.KernelModel;
import io.github.gammawright.geometry.DomainPoints;
import io.github.gammawright.geometry.DomainProgram;
import io.github.gammawright.geometry.FramePlan;
import io.github.gammawright.geometry.MetricGraphBuilder;
import io.github.gammawright.geometry.Route;
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
        List<Candidate> candidates = new ArrayList<>();
        for (Route route : Route.candidates(MetricGraphBuilder.build(definition), specification.quantities())) {
            candidates.addAll(Candidate.of(definition, specification, route, framePlan, candidates.isEmpty()));
        }
        Optimiser optimiser = new Optimiser(
                DomainPoints.guard(definition, GUARD_POINTS),
                budget(specification.options().effort()),
                specification.options().prefer() == GenerationOptions.Preference.ACCURACY ? 1.25 : 4);
        Optimiser.Outcome outcome =
                optimiser.optimise(candidates.stream().map(Candidate::program).toList());
        Candidate origin = candidates.get(outcome.start());
        GenerationOptions options = specification.options();
        boolean shared = options.trigonometry() == GenerationOptions.Trigonometry.SHARED;
        StraightLineProgram program = outcome.program().program();
        List<CostReport.Stage> stages = new ArrayList<>();
        stages.add(
                stage("graph (" + origin.description() + ")", origin.program().program()));
        stages.add(stage("resubstitution", program));
        if (options.fma()) {
            program = FusedOperations.of(program, DomainPoints.guard(definition, GUARD_POINTS));
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

    private static long budget(GenerationOptions.Effort effort) {
        return switch (effort) {
            case QUICK -> 1_000_000;
            case NORMAL -> 5_000_000;
            case THOROUGH -> 100_000_000;
        };
    }
}
