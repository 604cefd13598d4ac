package io.github.gammawright.emission;

import io.github.gammawright.definition.MetricDefinition;
import java.util.List;

/** Writes the documentation of the constructors. */
final class ConstructorJavadoc {

    private final EmissionContext context;
    private final boolean conditions;

    /**
     * Writes for a class.
     *
     * @param conditions whether the parameters must meet any
     */
    ConstructorJavadoc(EmissionContext context, boolean conditions) {
        this.context = context;
        this.conditions = conditions;
    }

    String ofParameters() {
        MetricDefinition definition = context.model().definition();
        boolean none =
                definition.parameters().isEmpty() && definition.functions().isEmpty();
        StringBuilder text = new StringBuilder(
                none ? "A kernel; the metric has no parameters.\n" : "A kernel for the given parameters.\n\n");
        for (int i = 0; i < definition.parameters().size(); i++) {
            MetricDefinition.Parameter parameter = definition.parameters().get(i);
            String description = parameter.description().isBlank() ? "the parameter" : parameter.description();
            String unit = parameter.unit().isBlank() ? "" : " [" + parameter.unit() + "]";
            text.append(JavadocText.wrap("@param "
                            + context.names().parameters().get(i) + " " + JavadocText.escape(description + unit)))
                    .append('\n');
        }
        if (!definition.functions().isEmpty()) {
            text.append("@param functions the functions of coordinates that the metric is made of\n");
        }
        if (conditions) {
            text.append("@throws IllegalArgumentException if the parameters do not meet the conditions on them\n");
        }
        return text.toString();
    }

    String ofDefaults(List<String> values) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < values.size(); i++) {
            text.append(i == 0 ? "" : ", ")
                    .append(context.names().parameters().get(i))
                    .append(" = ")
                    .append(values.get(i));
        }
        return JavadocText.wrap("A kernel with the defaults: " + text + ".") + "\n";
    }
}
