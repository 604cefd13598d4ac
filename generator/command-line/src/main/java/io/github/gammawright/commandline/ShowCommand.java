package io.github.gammawright.commandline;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.generation.BuildPlan;
import io.github.gammawright.generation.BuildSettings;
import io.github.gammawright.generation.BuildSettings.Precedence;
import io.github.gammawright.generation.FormulaPrinter;
import io.github.gammawright.generation.FormulaView;
import io.github.gammawright.generation.GeneratedClass;
import io.github.gammawright.generation.KernelGenerator;
import io.github.gammawright.generation.KernelSpecification;
import io.github.gammawright.generation.Vocabulary;
import io.github.gammawright.geometry.Quantity;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Shows what a definition gives. */
@Command(name = "show", description = "Shows the formulas of a definition, or what its kernels cost.")
final class ShowCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Parameters(paramLabel = "DEFINITION", description = "A definition file, or the name of a built-in definition.")
    private String argument;

    @Option(
            names = "--quantity",
            paramLabel = "Q",
            split = ",",
            converter = GenerationArguments.QuantityConverter.class,
            description = "What to show, such as metric or geodesic-acceleration; christoffel by default.")
    private List<Quantity> quantities = List.of(Quantity.CHRISTOFFEL);

    @Option(
            names = "--form",
            paramLabel = "F",
            converter = FormConverter.class,
            description = "How to show it: text (default), latex, or java for the class that generate would write.")
    private Form form = Form.TEXT;

    @Option(names = "--cost", description = "Show the operation counts after each stage instead of the formulas.")
    private boolean cost;

    @Mixin
    private GenerationArguments generation = new GenerationArguments();

    ShowCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        MetricDefinition definition =
                DefinitionArguments.read(List.of(argument)).get(0);
        if (cost || form == Form.JAVA) {
            for (KernelSpecification kernel : kernels(definition)) {
                GeneratedClass made = new KernelGenerator().generate(definition, kernel);
                terminal.out().print(cost ? CostTable.of(made) : made.source());
            }
        } else {
            FormulaPrinter.Form notation = form == Form.TEXT ? FormulaPrinter.Form.TEXT : FormulaPrinter.Form.LATEX;
            for (Quantity quantity : quantities) {
                FormulaView.lines(definition, quantity, notation).forEach(terminal.out()::println);
            }
        }
        return ExitStatus.DONE;
    }

    private List<KernelSpecification> kernels(MetricDefinition definition) {
        BuildSettings settings = new BuildSettings(
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
        return BuildPlan.of(List.of(definition), settings).parts().get(0).kernels();
    }

    /** The forms that a formula can be shown in. */
    private enum Form {
        TEXT,
        LATEX,
        JAVA
    }

    private static final class FormConverter extends WordConverter<Form> {
        FormConverter() {
            super(new Vocabulary<>(
                    "form", List.of(Form.values()), form -> form.name().toLowerCase(Locale.ROOT)));
        }
    }
}
