package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import java.util.ArrayList;
import java.util.List;
import javax.lang.model.element.Modifier;

/** Writes the public methods that evaluate: each checks its arguments and hands over to the one body. */
final class EntryMethods {

    private static final String NEW_WORKSPACE = "new double[WORKSPACE_LENGTH]";

    private final EmissionContext context;
    private final ComputeSignature compute;
    private final ArgumentChecks checks;

    EntryMethods(EmissionContext context, ComputeSignature compute) {
        this.context = context;
        this.compute = compute;
        this.checks = new ArgumentChecks(context);
    }

    void emit() {
        evaluate();
        if (compute.needsWorkspace()) {
            evaluateWith();
        }
        if (context.isSingle()) {
            valuesAt();
        }
        evaluateAt();
        int scalars =
                context.names().inputs().stream().mapToInt(KernelInput::length).sum();
        if (scalars <= PartMethods.MOST_ARGUMENTS) {
            evaluateScalars();
        }
        checks.emit();
    }

    private void evaluate() {
        MethodSpec.Builder method = method("evaluate");
        inputs(method);
        results(method);
        method.addJavadoc("$L", MethodJavadoc.evaluate(context, compute.needsWorkspace()));
        if (compute.needsWorkspace()) {
            List<String> arguments = new ArrayList<>();
            arguments.add(NEW_WORKSPACE);
            context.names().inputs().forEach(input -> arguments.add(input.name()));
            arguments.addAll(context.names().results());
            method.addCode(call("evaluateWith", arguments));
        } else {
            method.addCode(checks.inputs()).addCode(checks.results());
            method.addCode("$L;\n", compute.call(EntryMethods::whole, "", startingAtZero()));
        }
        context.type().addMethod(method.build());
    }

    private void evaluateWith() {
        MethodSpec.Builder method = method("evaluateWith");
        method.addParameter(double[].class, "workspace");
        inputs(method);
        results(method);
        method.addJavadoc("$L", MethodJavadoc.evaluateWith(context));
        method.addCode(checks.workspace()).addCode(checks.inputs()).addCode(checks.results());
        method.addCode("$L;\n", compute.call(EntryMethods::whole, "workspace", startingAtZero()));
        context.type().addMethod(method.build());
    }

    private void valuesAt() {
        MethodSpec.Builder method = method("valuesAt").returns(double[].class);
        inputs(method);
        method.addJavadoc("$L", MethodJavadoc.valuesAt(context));
        String result = context.names().results().get(0);
        method.addStatement("double[] $L = new double[LENGTH]", result);
        List<String> arguments = new ArrayList<>();
        context.names().inputs().forEach(input -> arguments.add(input.name()));
        arguments.add(result);
        method.addCode(call("evaluate", arguments));
        method.addStatement("return $L", result);
        context.type().addMethod(method.build());
    }

    private void evaluateAt() {
        MethodSpec.Builder method = method("evaluateAt");
        for (KernelInput input : context.names().inputs()) {
            method.addParameter(double[].class, input.plural());
            method.addParameter(int.class, from(input));
        }
        List<String> results =
                context.isSingle() ? List.of("results") : context.names().results();
        List<String> targets = new ArrayList<>();
        for (int r = 0; r < results.size(); r++) {
            method.addParameter(double[].class, results.get(r));
            method.addParameter(int.class, to(r));
            targets.add(results.get(r) + ", " + to(r));
        }
        method.addJavadoc("$L", MethodJavadoc.evaluateAt(context, compute.needsWorkspace()));
        method.addCode(checks.ranges(results, EntryMethods::from, this::to));
        method.addCode(
                "$L;\n", compute.call(input -> new ArrayTarget(input.plural(), from(input)), NEW_WORKSPACE, targets));
        context.type().addMethod(method.build());
    }

    private void evaluateScalars() {
        MethodSpec.Builder method = method("evaluateScalars");
        for (KernelInput input : context.names().inputs()) {
            context.names().scalars(input).forEach(name -> method.addParameter(double.class, name));
        }
        results(method);
        method.addJavadoc("$L", MethodJavadoc.evaluateScalars(context, compute.needsWorkspace()));
        method.addCode(checks.results());
        method.addCode("$L;\n", compute.callWithScalars(NEW_WORKSPACE, startingAtZero()));
        context.type().addMethod(method.build());
    }

    private static MethodSpec.Builder method(String name) {
        return MethodSpec.methodBuilder(name).addModifiers(Modifier.PUBLIC);
    }

    private static ArrayTarget whole(KernelInput input) {
        return new ArrayTarget(input.name(), null);
    }

    private List<String> startingAtZero() {
        return context.names().results().stream().map(result -> result + ", 0").toList();
    }

    private static CodeBlock call(String name, List<String> arguments) {
        return CodeBlock.of("$L;\n", LineBreaks.wrap(name + "(" + String.join(", ", arguments) + ")"));
    }

    private void inputs(MethodSpec.Builder method) {
        context.names().inputs().forEach(input -> method.addParameter(double[].class, input.name()));
    }

    private void results(MethodSpec.Builder method) {
        context.names().results().forEach(result -> method.addParameter(double[].class, result));
    }

    private static String from(KernelInput input) {
        return input.isPoint() ? "from" : input.plural() + "From";
    }

    private String to(int result) {
        return context.isSingle() ? "to" : context.names().results().get(result) + "To";
    }
}
