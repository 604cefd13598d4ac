package io.github.gammawright.generation;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricDefinition.KernelEntry;
import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.generation.BuildSettings.Precedence;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.ArrayList;
import java.util.List;

/**
 * Which classes a run makes from which definition.
 *
 * @param parts one for each definition, in the given order
 */
public record BuildPlan(List<Part> parts) {

    public BuildPlan {
        parts = List.copyOf(parts);
    }

    /** How many classes there are in all. */
    public int kernelCount() {
        return parts.stream().mapToInt(part -> part.kernels().size()).sum();
    }

    /** The classes of one definition. */
    public record Part(MetricDefinition definition, List<KernelSpecification> kernels) {

        public Part {
            kernels = List.copyOf(kernels);
        }
    }

    /**
     * Plans a run. A definition's {@code [[kernel]]} tables say what is made of it, unless the settings have precedence
     * and name quantities or a class.
     *
     * @throws DefinitionException with every unknown name in a table, and every class that two would make
     */
    public static BuildPlan of(List<MetricDefinition> definitions, BuildSettings settings) {
        List<Part> parts = new ArrayList<>();
        List<Diagnostic> wrong = new ArrayList<>();
        TakenNames taken = new TakenNames();
        for (MetricDefinition definition : definitions) {
            Diagnostics diagnostics = new Diagnostics(definition.source());
            List<KernelSpecification> kernels = new ArrayList<>();
            for (Planned planned : plan(definition, settings, diagnostics)) {
                taken.claim(planned, definition, diagnostics);
                kernels.add(planned.specification());
            }
            parts.add(new Part(definition, kernels));
            wrong.addAll(diagnostics.list());
        }
        if (!wrong.isEmpty()) {
            throw new DefinitionException(wrong);
        }
        return new BuildPlan(parts);
    }

    private static List<Planned> plan(MetricDefinition definition, BuildSettings settings, Diagnostics diagnostics) {
        boolean asked = !settings.quantities().isEmpty() || settings.className().isPresent();
        boolean settingsDecide = asked && settings.precedence() == Precedence.SETTINGS;
        if (!definition.kernels().isEmpty() && !settingsDecide) {
            List<Planned> planned = new ArrayList<>();
            for (KernelEntry table : definition.kernels()) {
                planned.addAll(new KernelTable(definition, table, settings, diagnostics).plan());
            }
            return planned;
        }
        return planBySettings(definition, settings);
    }

    private static List<Planned> planBySettings(MetricDefinition definition, BuildSettings settings) {
        List<Quantity> quantities = settings.quantities().isEmpty() ? settings.defaults() : settings.quantities();
        return Planned.classes(
                definition,
                settings.packageName().orElse(BuildSettings.DEFAULT_PACKAGE),
                settings.className(),
                quantities,
                settings.layout().orElse(Layout.FULL),
                options(settings),
                SourceSearch.quoted(definition.source(), definition.name()));
    }

    private static GenerationOptions options(BuildSettings settings) {
        GenerationOptions standard = GenerationOptions.DEFAULT;
        return new GenerationOptions(
                settings.effort().orElse(standard.effort()),
                settings.trigonometry().orElse(standard.trigonometry()),
                settings.fma().orElse(standard.fma()),
                settings.prefer().orElse(standard.prefer()));
    }
}
