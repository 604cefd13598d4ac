package io.github.gammawright.emission;

import io.github.gammawright.definition.ExpressionPrinter;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Shape;
import io.github.gammawright.graph.Instruction;
import java.util.List;

/** Writes the documentation of a kernel class: a reader needs nothing but the file. */
final class ClassJavadoc {

    private final EmissionContext context;
    private final MetricDefinition definition;
    private final StringBuilder text = new StringBuilder();

    private ClassJavadoc(EmissionContext context) {
        this.context = context;
        this.definition = context.model().definition();
    }

    static String of(EmissionContext context) {
        ClassJavadoc javadoc = new ClassJavadoc(context);
        javadoc.metric();
        javadoc.parameters();
        javadoc.functions();
        javadoc.domain();
        javadoc.results();
        javadoc.use();
        return javadoc.text.toString();
    }

    private void metric() {
        String quantities = String.join(
                ", ",
                context.model().results().stream()
                        .map(result -> words(result) + " "
                                + result.quantity().formula(context.model().layout()))
                        .toList());
        String title = definition.title().isBlank() ? "" : ": " + definition.title();
        text.append(JavadocText.wrap(
                capitalised(JavadocText.escape(quantities + " of the metric " + definition.name() + title) + ".")));
        text.append("\n\n<pre>\n");
        for (String formula : new DefinitionText(definition).formulas()) {
            text.append(JavadocText.escape(formula.replace('\n', ' '))).append('\n');
        }
        text.append("</pre>\n");
        paragraph("Coordinates, in index order: "
                + code(String.join(", ", definition.coordinates())) + "."
                + (definition.reference().isBlank()
                        ? ""
                        : " Reference: " + JavadocText.escape(definition.reference()) + "."));
    }

    private void parameters() {
        if (definition.parameters().isEmpty()) {
            return;
        }
        paragraph("Parameters:");
        text.append("<ul>\n");
        for (MetricDefinition.Parameter parameter : definition.parameters()) {
            StringBuilder item = new StringBuilder(code(parameter.name()));
            if (!parameter.description().isBlank()) {
                item.append(": ").append(JavadocText.escape(parameter.description()));
            }
            if (!parameter.unit().isBlank()) {
                item.append(" [").append(JavadocText.escape(parameter.unit())).append(']');
            }
            parameter
                    .defaultExpression()
                    .ifPresent(expression ->
                            item.append("; by default ").append(code(ExpressionPrinter.print(expression))));
            text.append(JavadocText.wrap("<li>" + item + "</li>")).append('\n');
        }
        text.append("</ul>\n");
    }

    private void functions() {
        if (!definition.functions().isEmpty()) {
            paragraph("The functions "
                    + code(String.join(
                            ", ",
                            definition.functions().stream()
                                    .map(MetricDefinition.CallerFunction::name)
                                    .toList()))
                    + " are the caller's: see {@link " + context.names().functionsType() + "}.");
        }
    }

    private void domain() {
        List<String> conditions = context.kernel().conditions().stream()
                .map(condition -> code(condition.text()))
                .toList();
        if (!conditions.isEmpty()) {
            paragraph("Domain: " + String.join("; ", conditions)
                    + ". Outside of it results are whatever the formulas give.");
        }
    }

    private void results() {
        for (int r = 0; r < context.model().results().size(); r++) {
            KernelModel.Result result = context.model().results().get(r);
            paragraph("Result " + code(context.names().results().get(r)) + ": "
                    + code(result.quantity().formula(context.model().layout())) + ", " + context.length(r)
                    + (context.length(r) == 1 ? " entry" : " entries") + layout(result));
        }
        paragraph("Sign conventions of Misner, Thorne &amp; Wheeler (1973); indices follow the order of the"
                + " coordinates, counted from 0; components belong to the coordinate basis.");
    }

    private String layout(KernelModel.Result result) {
        boolean symmetric = result.shape().symmetricPair();
        if (result.shape().rank() == 0) {
            return ".";
        }
        if (result.shape().symmetry() == Shape.Symmetry.CURVATURE
                && context.model().layout() == Layout.PACKED) {
            return ", of the pairs A = k(k&#8722;1)/2 + l with k &gt; l and B of i &gt; j alike one entry at A(A+1)/2 + B"
                    + " for A &#8805; B; the static index and sign methods tell where each component is and with which"
                    + " sign.";
        }
        return switch (context.model().layout()) {
            case FULL -> ", row-major over all indices in the order of the formula.";
            case PACKED ->
                symmetric
                        ? ", row-major, of each symmetric pair i &#8805; j one entry at i(i+1)/2 + j."
                        : ", row-major over all indices in the order of the formula.";
            case NON_ZERO ->
                " in index order: the independent components that are not identically zero;"
                        + " the static index method tells where each is.";
        };
    }

    private void use() {
        paragraph("Each evaluation writes every entry of every result and takes "
                + JavadocText.escape(context.model().count().toString())
                + ". Inputs are read before anything is written, so that a result may be an input array; no two results"
                + " may be one array. Objects are immutable and may be shared by threads.");
        trigonometry();
        context.model().remarks().forEach(remark -> paragraph(JavadocText.escape(remark)));
        paragraph("To make it again: " + code(context.model().regenerate()));
        paragraph("For research use: not validated for navigation or other safety-critical use, which follows its own"
                + " standards and licensed practice.");
    }

    private void trigonometry() {
        boolean circular = context.model().program().instructions().stream()
                .anyMatch(i -> i instanceof Instruction.Call call && call.isCircular());
        if (context.model().sharedTrigonometry() && circular) {
            paragraph("Sine and cosine are the class's own: both of an argument together count as one sincos, their"
                    + " errors are below one unit in the last place, and they are the same to the last bit on every"
                    + " machine.");
        }
        boolean fused =
                context.model().program().instructions().stream().anyMatch(i -> i instanceof Instruction.MultiplyAdd);
        if (fused) {
            paragraph("It calls Math.fma, which is one instruction on processors that have it and some hundred times"
                    + " slower than a product and a sum on those that do not.");
        }
    }

    private void paragraph(String escaped) {
        text.append('\n').append(JavadocText.wrap("<p>" + escaped)).append('\n');
    }

    private static String words(KernelModel.Result result) {
        return result.quantity().symbol().replace('-', ' ');
    }

    private static String code(String raw) {
        return "<code>" + JavadocText.escape(raw.replace('\n', ' ')) + "</code>";
    }

    private static String capitalised(String words) {
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }
}
