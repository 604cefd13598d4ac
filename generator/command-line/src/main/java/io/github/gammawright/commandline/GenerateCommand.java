package io.github.gammawright.commandline;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.generation.BuildPlan;
import io.github.gammawright.generation.BuildSettings;
import io.github.gammawright.generation.BuildSettings.Precedence;
import io.github.gammawright.generation.ExitActions;
import io.github.gammawright.generation.GeneratedClass;
import io.github.gammawright.generation.KernelGenerator;
import io.github.gammawright.generation.KernelSpecification;
import io.github.gammawright.generation.Mistakes;
import io.github.gammawright.generation.OutputException;
import io.github.gammawright.generation.SourceWriter;
import io.github.gammawright.geometry.Quantity;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Writes classes. */
@Command(
        name = "generate",
        description = "Writes kernel classes.",
        footer = {
            "Without --quantity and --class, a definition with [[kernel]] tables makes the classes of these, and any",
            "other one the class of its christoffel symbols. An option that is given goes before the key of that name",
            "in a table. Nothing is written if any of the definitions is wrong."
        })
final class GenerateCommand implements Callable<Integer> {

    private final Terminal terminal;
    private final ExitActions exit;

    @Parameters(
            arity = "1..*",
            paramLabel = "DEFINITION",
            description = "A definition file, or the name of a built-in definition.")
    private List<String> arguments = List.of();

    @Option(
            names = "--out",
            required = true,
            paramLabel = "DIR",
            description = "The source root that the classes are written below; it is made if it is not there.")
    private Path out;

    @Option(names = "--package", paramLabel = "P", description = "The Java package of the classes; kernels by default.")
    private Optional<String> packageName = Optional.empty();

    @Option(
            names = "--quantity",
            paramLabel = "Q",
            split = ",",
            converter = GenerationArguments.QuantityConverter.class,
            description = "What the classes compute, such as christoffel or geodesic-acceleration; each becomes a"
                    + " class of its own.")
    private List<Quantity> quantities = List.of();

    @Option(names = "--class", paramLabel = "NAME", description = "Put all the quantities into one class of this name.")
    private Optional<String> className = Optional.empty();

    @Mixin
    private GenerationArguments generation = new GenerationArguments();

    GenerateCommand(Terminal terminal, ExitActions exit) {
        this.terminal = terminal;
        this.exit = exit;
    }

    @Override
    public Integer call() throws OutputException {
        BuildSettings settings = settings();
        BuildPlan plan = BuildPlan.of(DefinitionArguments.read(arguments), settings);
        List<GeneratedClass> classes = generate(plan);
        Set<Path> changed = new HashSet<>(new SourceWriter(out, exit).write(classes));
        for (GeneratedClass made : classes) {
            Path file = new SourceWriter(out, exit).target(made.path());
            terminal.out()
                    .println(file + (changed.contains(file) ? "" : " (unchanged)") + ": "
                            + made.cost().emitted());
        }
        return ExitStatus.DONE;
    }

    private BuildSettings settings() {
        BuildSettings settings = new BuildSettings(
                Precedence.SETTINGS,
                packageName,
                className,
                quantities,
                List.of(Quantity.CHRISTOFFEL),
                generation.layout(),
                generation.effort(),
                generation.trigonometry(),
                generation.fma(),
                generation.prefer());
        List<String> complaints = new ArrayList<>(settings.complaints());
        if (className.isPresent() && arguments.size() > 1) {
            complaints.add("--class names one class, and there are " + arguments.size()
                    + " definitions; run once for each, or leave --class out");
        }
        if (!complaints.isEmpty()) {
            throw new WrongInputException(complaints);
        }
        return settings;
    }

    /** All classes in memory first: nothing is written before everything has turned out right. */
    private List<GeneratedClass> generate(BuildPlan plan) {
        Mistakes mistakes = new Mistakes();
        List<GeneratedClass> classes = new ArrayList<>();
        try (Progress progress = new Progress(terminal, plan.kernelCount())) {
            for (BuildPlan.Part part : plan.parts()) {
                for (KernelSpecification kernel : part.kernels()) {
                    progress.next(kernel.className());
                    mistakes.attempt(() -> generate(part.definition(), kernel)).ifPresent(classes::add);
                }
            }
        }
        mistakes.throwIfAny();
        return classes;
    }

    private static GeneratedClass generate(MetricDefinition definition, KernelSpecification kernel) {
        return new KernelGenerator().generate(definition, kernel);
    }
}
