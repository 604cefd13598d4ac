package io.github.gammawright.generation;

import io.github.gammawright.definition.ClassNames;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.List;
import java.util.Optional;

/** A class to be made, and where in the definition its name comes from. */
record Planned(KernelSpecification specification, SourcePosition position) {

    /** One class of that name for all the quantities, or without a name one for each. */
    static List<Planned> classes(
            MetricDefinition definition,
            String packageName,
            Optional<String> className,
            List<Quantity> quantities,
            Layout layout,
            GenerationOptions options,
            SourcePosition position) {
        if (className.isPresent()) {
            KernelSpecification all =
                    new KernelSpecification(packageName, className.get(), quantities, layout, options);
            return List.of(new Planned(all, position));
        }
        String prefix = ClassNames.prefix(definition.name());
        return quantities.stream()
                .map(quantity -> new KernelSpecification(
                        packageName, prefix + quantity.classSuffix(), List.of(quantity), layout, options))
                .map(specification -> new Planned(specification, position))
                .toList();
    }
}
