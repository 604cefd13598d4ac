package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import java.util.List;
import java.util.function.Function;
import java.util.function.IntFunction;
import javax.lang.model.element.Modifier;

/** Writes the tests of array lengths, and the methods behind them, small enough to be compiled into their callers. */
final class ArgumentChecks {

    private final EmissionContext context;
    private boolean distinct;

    ArgumentChecks(EmissionContext context) {
        this.context = context;
    }

    CodeBlock inputs() {
        CodeBlock.Builder code = CodeBlock.builder();
        for (KernelInput input : context.names().inputs()) {
            code.addStatement("requireLength($S, $L.length, $L)", input.name(), input.name(), length(input));
        }
        return code.build();
    }

    CodeBlock results() {
        CodeBlock.Builder code = CodeBlock.builder();
        List<String> results = context.names().results();
        for (int r = 0; r < results.size(); r++) {
            String name = results.get(r);
            code.addStatement("requireLength($S, $L.length, $L)", name, name, context.lengthConstant(r));
        }
        for (int r = 1; r < results.size(); r++) {
            for (int s = 0; s < r; s++) {
                distinct = true;
                code.addStatement(
                        "requireDistinct($L, $L, $S)",
                        results.get(s),
                        results.get(r),
                        results.get(s) + " and " + results.get(r));
            }
        }
        return code.build();
    }

    CodeBlock workspace() {
        CodeBlock.Builder code = CodeBlock.builder();
        code.addStatement("requireRange($S, workspace.length, 0, WORKSPACE_LENGTH)", "workspace");
        for (String result : context.names().results()) {
            distinct = true;
            code.addStatement("requireDistinct(workspace, $L, $S)", result, "workspace and " + result);
        }
        return code.build();
    }

    CodeBlock ranges(List<String> results, Function<KernelInput, String> from, IntFunction<String> to) {
        CodeBlock.Builder code = CodeBlock.builder();
        for (KernelInput input : context.names().inputs()) {
            String name = input.plural();
            code.addStatement("requireRange($S, $L.length, $L, $L)", name, name, from.apply(input), length(input));
        }
        for (int r = 0; r < results.size(); r++) {
            String name = results.get(r);
            code.addStatement(
                    "requireRange($S, $L.length, $L, $L)", name, name, to.apply(r), context.lengthConstant(r));
        }
        for (int r = 1; r < results.size(); r++) {
            for (int s = 0; s < r; s++) {
                code.beginControlFlow(
                        "if ($1L == $2L && $3L < $4L + $5L && $4L < $3L + $6L)",
                        results.get(s),
                        results.get(r),
                        to.apply(s),
                        to.apply(r),
                        context.lengthConstant(r),
                        context.lengthConstant(s));
                code.addStatement(
                        "throw new IllegalArgumentException($S)",
                        results.get(s) + " and " + results.get(r) + " overlap in one array");
                code.endControlFlow();
            }
        }
        return code.build();
    }

    private static String length(KernelInput input) {
        return input.isPoint() ? "DIMENSION" : Integer.toString(input.length());
    }

    /** The private methods that the tests call. */
    void emit() {
        context.privateMethods()
                .add(check("requireLength")
                        .addParameter(String.class, "name")
                        .addParameter(int.class, "length")
                        .addParameter(int.class, "required")
                        .beginControlFlow("if (length != required)")
                        .addStatement(
                                "throw new $T(name + $S + length + $S + required)",
                                IllegalArgumentException.class,
                                " has length ",
                                ", not the required ")
                        .endControlFlow()
                        .build());
        context.privateMethods()
                .add(check("requireRange")
                        .addParameter(String.class, "name")
                        .addParameter(int.class, "length")
                        .addParameter(int.class, "from")
                        .addParameter(int.class, "count")
                        .beginControlFlow("if (from < 0 || from > length - count)")
                        .addStatement(
                                "throw new $T(name + $S + length + $S + count + $S + from)",
                                IllegalArgumentException.class,
                                " has length ",
                                ", too short for ",
                                " entries from ")
                        .endControlFlow()
                        .build());
        if (distinct) {
            context.privateMethods()
                    .add(check("requireDistinct")
                            .addParameter(double[].class, "a")
                            .addParameter(double[].class, "b")
                            .addParameter(String.class, "names")
                            .beginControlFlow("if (a == b)")
                            .addStatement(
                                    "throw new $T(names + $S)",
                                    IllegalArgumentException.class,
                                    " are one array, but each needs its own")
                            .endControlFlow()
                            .build());
        }
    }

    private static MethodSpec.Builder check(String name) {
        return MethodSpec.methodBuilder(name).addModifiers(Modifier.PRIVATE, Modifier.STATIC);
    }
}
