package io.github.gammawright.emission;

import java.util.List;

/** Writes the documentation of the public methods. */
final class MethodJavadoc {

    private MethodJavadoc() {}

    static String evaluate(EmissionContext context, boolean allocates) {
        StringBuilder text = new StringBuilder("Evaluates at a point.");
        text.append(allocates ? " Allocates one workspace; evaluateWith does not.\n\n" : " Allocates nothing.\n\n");
        inputs(context, text);
        results(context, text);
        return text.append(lengths(context)).toString();
    }

    static String evaluateWith(EmissionContext context) {
        StringBuilder text = new StringBuilder("Evaluates at a point with the caller's memory. Allocates nothing.\n\n");
        text.append(
                        "@param workspace at least {@code WORKSPACE_LENGTH} entries, overwritten; in use by one thread at a")
                .append("\n    time, and none of the results\n");
        inputs(context, text);
        results(context, text);
        return text.append(lengths(context)).toString();
    }

    static String valuesAt(EmissionContext context) {
        StringBuilder text = new StringBuilder("The values at a point, in a new array.\n\n");
        inputs(context, text);
        text.append("@return ").append(entries(context, 0)).append('\n');
        return text.append("@throws IllegalArgumentException if an array has a wrong length\n")
                .toString();
    }

    static String evaluateAt(EmissionContext context, boolean allocates) {
        StringBuilder text = new StringBuilder("Evaluates at a point that is part of a larger array.");
        text.append(allocates ? " Allocates one workspace.\n\n" : " Allocates nothing.\n\n");
        for (KernelInput input : context.names().inputs()) {
            text.append("@param ")
                    .append(input.plural())
                    .append(" holds the ")
                    .append(input.name())
                    .append('\n');
            String from = input.isPoint() ? "from" : input.plural() + "From";
            text.append("@param ").append(from).append(" where it starts\n");
        }
        for (int r = 0; r < context.names().results().size(); r++) {
            String name =
                    context.isSingle() ? "results" : context.names().results().get(r);
            String to = context.isSingle() ? "to" : name + "To";
            text.append("@param ").append(name).append(" where the result goes\n");
            text.append("@param ").append(to).append(" where its first entry goes\n");
        }
        return text.append("@throws IllegalArgumentException if an array is too short")
                .append(context.isSingle() ? "\n" : ", or two results overlap\n")
                .toString();
    }

    static String evaluateScalars(EmissionContext context, boolean allocates) {
        StringBuilder text = new StringBuilder("Evaluates at a point given by its coordinates.");
        text.append(allocates ? " Allocates one workspace.\n\n" : " Allocates nothing.\n\n");
        for (KernelInput input : context.names().inputs()) {
            List<String> scalars = context.names().scalars(input);
            for (int i = 0; i < scalars.size(); i++) {
                text.append("@param ").append(scalars.get(i)).append(' ');
                String coordinate = JavadocText.escape(input.coordinates().get(i));
                text.append(input.isPoint() ? "the coordinate " : "the " + input.name() + " along ");
                text.append(coordinate).append('\n');
            }
        }
        results(context, text);
        return text.append(lengths(context)).toString();
    }

    static String inDomain(EmissionContext context, boolean allocates) {
        return JavadocText.wrap("Whether a point meets the conditions of the definition; NaN meets none."
                        + (allocates ? " Allocates memory for the caller's functions." : ""))
                + "\n\n@param point " + pointEntries(context) + "\n@return whether it does\n"
                + "@throws IllegalArgumentException if the array has a wrong length\n";
    }

    static String sign(KernelModel.Result result, boolean single) {
        String name = single ? "the result" : "{@code " + result.quantity().variableName() + "}";
        return "How a component with all indices below comes from the entry of " + name
                + " that index points to.\n\n@return 1 or -1, which the entry is to be multiplied with, or 0 for a"
                + " component that is zero\n@throws IndexOutOfBoundsException if there is no such component\n";
    }

    static String index(KernelModel.Result result, boolean single, boolean mayBeZero) {
        String name = single ? "the result" : "{@code " + result.quantity().variableName() + "}";
        StringBuilder text = new StringBuilder("Where a component is in " + name + ".");
        if (result.shape().first() > 0) {
            text.append(" Indices count from ").append(result.shape().first()).append('.');
        }
        text.append("\n\n@return the position").append(mayBeZero ? ", or -1 for a component that is zero\n" : "\n");
        if (result.shape().rank() > 0) {
            text.append("@throws IndexOutOfBoundsException if there is no such component\n");
        }
        return text.toString();
    }

    private static void inputs(EmissionContext context, StringBuilder text) {
        for (KernelInput input : context.names().inputs()) {
            text.append("@param ").append(input.name()).append(' ');
            String entries = input.isPoint()
                    ? pointEntries(context)
                    : input.length() + " entries, one for each of "
                            + JavadocText.escape(String.join(", ", input.coordinates()));
            text.append(entries).append('\n');
        }
    }

    private static String pointEntries(EmissionContext context) {
        return JavadocText.escape(String.join(", ", context.model().definition().coordinates()));
    }

    private static void results(EmissionContext context, StringBuilder text) {
        for (int r = 0; r < context.names().results().size(); r++) {
            text.append("@param ").append(context.names().results().get(r)).append(" overwritten with ");
            text.append(entries(context, r)).append('\n');
        }
    }

    private static String entries(EmissionContext context, int result) {
        String formula = context.model()
                .results()
                .get(result)
                .quantity()
                .formula(context.model().layout());
        return JavadocText.escape(formula) + ", {@code " + context.lengthConstant(result) + "} entries";
    }

    private static String lengths(EmissionContext context) {
        return "@throws IllegalArgumentException if an array has a wrong length"
                + (context.isSingle() ? "\n" : ", or two results are one array\n");
    }
}
