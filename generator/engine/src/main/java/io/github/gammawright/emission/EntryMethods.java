package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.emission.EmissionContext.InputUse;
import java.util.ArrayList;
import java.util.List;
import javax.lang.model.element.Modifier;

/** Writes the public methods that evaluate: each checks its arguments and hands over to the one body. */
final class EntryMethods {

    /** More doubles than this are not taken one by one. */
    private static final int MOST_SCALARS = 24;

    private final EmissionContext context;
    private final List<InputUse> uses;
    private final ArgumentChecks checks;

    EntryMethods(EmissionContext context, List<InputUse> uses) {
        this.context = context;
        this.uses = uses;
        this.checks = new ArgumentChecks(context);
    }

    void emit() {
        evaluate();
        if (context.isSingle()) {
            valuesAt();
        }
        evaluateAt();
        int scalars =
                context.names().inputs().stream().mapToInt(KernelInput::length).sum();
        if (scalars <= MOST_SCALARS) {
            evaluateScalars();
        }
        checks.emit();
    }

    private void evaluate() {
        MethodSpec.Builder method = MethodSpec.methodBuilder("evaluate").addModifiers(Modifier.PUBLIC);
        inputs(method);
        results(method);
        method.addCode(checks.inputs()).addCode(checks.results());
        List<String> arguments = new ArrayList<>();
        for (InputUse use : uses) {
            arguments.add(use.input().name() + "[" + use.index() + "]");
        }
        context.names().results().forEach(result -> arguments.add(result + ", 0"));
        method.addCode(compute(arguments));
        context.type().addMethod(method.build());
    }

    private void valuesAt() {
        MethodSpec.Builder method = MethodSpec.methodBuilder("valuesAt")
                .addModifiers(Modifier.PUBLIC)
                .returns(double[].class);
        inputs(method);
        String result = context.names().results().get(0);
        method.addStatement("double[] $L = new double[LENGTH]", result);
        List<String> arguments = new ArrayList<>();
        context.names().inputs().forEach(input -> arguments.add(input.name()));
        arguments.add(result);
        method.addStatement("evaluate($L)", String.join(", ", arguments));
        method.addStatement("return $L", result);
        context.type().addMethod(method.build());
    }

    private void evaluateAt() {
        MethodSpec.Builder method = MethodSpec.methodBuilder("evaluateAt").addModifiers(Modifier.PUBLIC);
        List<KernelInput> inputs = context.names().inputs();
        for (KernelInput input : inputs) {
            method.addParameter(double[].class, input.plural());
            method.addParameter(int.class, from(input));
        }
        List<String> results = resultsOfMany();
        for (int r = 0; r < results.size(); r++) {
            method.addParameter(double[].class, results.get(r));
            method.addParameter(int.class, to(r));
        }
        method.addCode(checks.ranges(results, this::from, this::to));
        List<String> arguments = new ArrayList<>();
        for (InputUse use : uses) {
            ArrayTarget array = new ArrayTarget(use.input().plural(), from(use.input()));
            arguments.add(array.element(use.index()));
        }
        for (int r = 0; r < results.size(); r++) {
            arguments.add(results.get(r) + ", " + to(r));
        }
        method.addCode(compute(arguments));
        context.type().addMethod(method.build());
    }

    private void evaluateScalars() {
        MethodSpec.Builder method = MethodSpec.methodBuilder("evaluateScalars").addModifiers(Modifier.PUBLIC);
        for (KernelInput input : context.names().inputs()) {
            context.names().scalars(input).forEach(name -> method.addParameter(double.class, name));
        }
        results(method);
        method.addCode(checks.results());
        List<String> arguments = new ArrayList<>();
        uses.forEach(use -> arguments.add(use.name()));
        context.names().results().forEach(result -> arguments.add(result + ", 0"));
        method.addCode(compute(arguments));
        context.type().addMethod(method.build());
    }

    private static CodeBlock compute(List<String> arguments) {
        return CodeBlock.of("$L;\n", LineBreaks.wrap("compute(" + String.join(", ", arguments) + ")"));
    }

    private void inputs(MethodSpec.Builder method) {
        context.names().inputs().forEach(input -> method.addParameter(double[].class, input.name()));
    }

    private void results(MethodSpec.Builder method) {
        context.names().results().forEach(result -> method.addParameter(double[].class, result));
    }

    private String from(KernelInput input) {
        return input.name().equals("point") ? "from" : input.plural() + "From";
    }

    private List<String> resultsOfMany() {
        return context.isSingle() ? List.of("results") : context.names().results();
    }

    private String to(int result) {
        return context.isSingle() ? "to" : context.names().results().get(result) + "To";
    }
}
