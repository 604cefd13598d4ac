package io.github.gammawright.commandline;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.generation.Applicability;
import io.github.gammawright.generation.BuildPlan;
import io.github.gammawright.generation.BuildSettings;
import io.github.gammawright.generation.BuildSettings.Precedence;
import io.github.gammawright.generation.CheckRun;
import io.github.gammawright.generation.KernelSpecification;
import io.github.gammawright.generation.Mistakes;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.CheckSettings;
import io.github.gammawright.verification.DefinitionReport;
import io.github.gammawright.verification.DefinitionTable;
import io.github.gammawright.verification.KernelReport;
import io.github.gammawright.verification.ReportJson;
import io.github.gammawright.verification.ReportTable;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Compares kernels with the reference, tries identities between them and examines the claims of definitions. */
@Command(
        name = "check",
        description =
                "Compares every kernel with a high-precision reference, tries the identities between them, and proves or"
                        + " refutes what the definition claims.",
        footer = {
            "Each quantity is checked in a class of its own, and so is each class of the [[kernel]] tables. The classes",
            "are compiled in memory, and nothing is written. The status is 1 if a class is out of bounds or could not be",
            "compared at all, if an identity fails, or if a claim is false."
        })
final class CheckCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Parameters(
            arity = "1..*",
            paramLabel = "DEFINITION",
            description = "A definition file, or the name of a built-in definition.")
    private List<String> arguments = List.of();

    @Option(
            names = "--points",
            paramLabel = "N",
            description =
                    "At how many points inside the domain; more are taken at its edges. ${DEFAULT-VALUE} by default.")
    private int points = 200;

    @Option(
            names = "--seed",
            paramLabel = "S",
            description = "Where the sequence of points begins; ${DEFAULT-VALUE} by default.")
    private long seed = 1;

    @Option(names = "--json", description = "Report as JSON.")
    private boolean json;

    @Mixin
    private GenerationArguments generation = new GenerationArguments();

    CheckCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        if (points < 1) {
            throw new WrongInputException("--points needs at least 1, not " + points);
        }
        Map<MetricDefinition, Set<KernelSpecification>> plan = plan(DefinitionArguments.read(arguments));
        List<KernelReport> reports = new ArrayList<>();
        List<DefinitionReport> definitions = new ArrayList<>();
        check(plan, reports, definitions);
        if (json) {
            terminal.out().print(ReportJson.of(reports, definitions));
        }
        boolean allPassed = reports.stream().allMatch(report -> report.verdict() == KernelReport.Verdict.PASSED)
                && definitions.stream().allMatch(DefinitionReport::passed);
        return allPassed ? ExitStatus.DONE : ExitStatus.FELL_SHORT;
    }

    private Map<MetricDefinition, Set<KernelSpecification>> plan(List<MetricDefinition> definitions) {
        Mistakes mistakes = new Mistakes();
        Map<MetricDefinition, Set<KernelSpecification>> plan = new LinkedHashMap<>();
        for (MetricDefinition definition : definitions) {
            Set<KernelSpecification> kernels = plan.computeIfAbsent(definition, key -> new LinkedHashSet<>());
            List<Quantity> all = mistakes.attempt(() -> quantities(definition)).orElse(List.of());
            for (List<Quantity> quantities : List.of(all, List.<Quantity>of())) {
                mistakes.attempt(() -> BuildPlan.of(List.of(definition), settings(quantities)))
                        .ifPresent(made -> made.parts().forEach(part -> kernels.addAll(part.kernels())));
            }
        }
        mistakes.throwIfAny();
        return plan;
    }

    /** All that the metric has; says what is left out. */
    private List<Quantity> quantities(MetricDefinition definition) {
        List<Quantity> has = Applicability.quantities(definition);
        List<String> others = Arrays.stream(Quantity.values())
                .filter(quantity -> !has.contains(quantity))
                .map(Quantity::symbol)
                .toList();
        if (!json && !others.isEmpty()) {
            terminal.out().println(definition.name() + ": the metric has no " + String.join(", ", others));
        }
        return has;
    }

    /** Without quantities these are the settings that leave the choice to the tables. */
    private BuildSettings settings(List<Quantity> quantities) {
        return new BuildSettings(
                Precedence.SETTINGS,
                Optional.empty(),
                Optional.empty(),
                quantities,
                List.of(),
                generation.layout(),
                generation.effort(),
                generation.trigonometry(),
                generation.fma(),
                generation.prefer());
    }

    private void check(
            Map<MetricDefinition, Set<KernelSpecification>> plan,
            List<KernelReport> reports,
            List<DefinitionReport> definitions) {
        CheckSettings settings = CheckSettings.DEFAULT.withPoints(points).withSeed(seed);
        Mistakes mistakes = new Mistakes();
        int total = plan.values().stream().mapToInt(Set::size).sum() + plan.size();
        try (Progress progress = new Progress(terminal, total)) {
            plan.forEach((definition, kernels) -> {
                CheckRun run = new CheckRun(definition, settings);
                for (KernelSpecification kernel : kernels) {
                    progress.next(kernel.className());
                    mistakes.attempt(() -> run.check(kernel)).ifPresent(report -> {
                        reports.add(report);
                        progress.clear();
                        print(ReportTable.of(List.of(report)));
                    });
                }
                progress.next("identities and claims of " + definition.name());
                mistakes.attempt(run::definition).ifPresent(report -> {
                    definitions.add(report);
                    progress.clear();
                    print(DefinitionTable.of(report));
                });
            });
        }
        mistakes.throwIfAny();
    }

    private void print(String report) {
        if (!json) {
            terminal.out().println(report);
            terminal.out().flush();
        }
    }
}
