package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.function.IntFunction;
import javax.lang.model.element.Modifier;

/** Writes the tests of the arguments, and the methods behind them, small enough to be compiled into their callers. */
final class ArgumentChecks {

    /** With more results than this, each is compared with those before it in a method of its own. */
    private static final int MOST_RESULTS = 8;

    private final EmissionContext context;
    private final Set<String> written = new HashSet<>();
    private boolean distinct;
    private boolean apart;

    ArgumentChecks(EmissionContext context) {
        this.context = context;
    }

    CodeBlock inputs() {
        CodeBlock.Builder code = CodeBlock.builder();
        for (KernelInput input : context.names().inputs()) {
            code.addStatement("requireLength($1S, $1L.length, $2L)", input.name(), length(input));
        }
        return code.build();
    }

    CodeBlock results() {
        CodeBlock.Builder code = CodeBlock.builder();
        List<String> results = context.names().results();
        for (int r = 0; r < results.size(); r++) {
            code.addStatement("requireLength($1S, $1L.length, $2L)", results.get(r), context.lengthConstant(r));
        }
        for (int r = 1; r < results.size(); r++) {
            CodeBlock.Builder row = CodeBlock.builder();
            for (String other : results.subList(0, r)) {
                row.add(distinct(other, results.get(r)));
            }
            List<String> arrays = results.subList(0, r + 1);
            code.add(inline(row.build(), "requireDistinct" + r, arrays, List.of()));
        }
        return code.build();
    }

    CodeBlock workspace() {
        CodeBlock.Builder code = CodeBlock.builder();
        code.addStatement("requireRange($S, workspace.length, 0, WORKSPACE_LENGTH)", "workspace");
        context.names().results().forEach(result -> code.add(distinct("workspace", result)));
        return code.build();
    }

    private CodeBlock distinct(String a, String b) {
        distinct = true;
        return CodeBlock.of("requireDistinct($L, $L, $S);\n", a, b, a + " and " + b);
    }

    CodeBlock ranges(List<String> results, Function<KernelInput, String> from, IntFunction<String> to) {
        CodeBlock.Builder code = CodeBlock.builder();
        for (KernelInput input : context.names().inputs()) {
            code.add(range(input.plural(), from.apply(input), length(input)));
        }
        for (int r = 0; r < results.size(); r++) {
            code.add(range(results.get(r), to.apply(r), context.lengthConstant(r)));
        }
        List<String> offsets = new ArrayList<>();
        for (int r = 0; r < results.size(); r++) {
            offsets.add(to.apply(r));
            CodeBlock.Builder row = CodeBlock.builder();
            for (int s = 0; s < r; s++) {
                apart = true;
                row.add(
                        "$L;\n",
                        LineBreaks.wrap("requireApart(" + results.get(s) + ", " + to.apply(s) + ", "
                                + context.lengthConstant(s) + ", " + results.get(r) + ", " + to.apply(r) + ", "
                                + context.lengthConstant(r) + ", " + quoted(results.get(s) + " and " + results.get(r))
                                + ")"));
            }
            code.add(inline(row.build(), "requireApart" + r, results.subList(0, r + 1), offsets));
        }
        return code.build();
    }

    private static CodeBlock range(String array, String from, String count) {
        return CodeBlock.of(
                "$L;\n",
                LineBreaks.wrap(
                        "requireRange(" + quoted(array) + ", " + array + ".length, " + from + ", " + count + ")"));
    }

    /** Names of variables need no escapes. */
    private static String quoted(String names) {
        return '"' + names + '"';
    }

    private CodeBlock inline(CodeBlock row, String name, List<String> arrays, List<String> offsets) {
        if (context.names().results().size() <= MOST_RESULTS || row.isEmpty()) {
            return row;
        }
        MethodSpec.Builder method = check(name);
        List<String> arguments = new ArrayList<>();
        for (int i = 0; i < arrays.size(); i++) {
            method.addParameter(double[].class, arrays.get(i));
            arguments.add(arrays.get(i));
            if (!offsets.isEmpty()) {
                method.addParameter(int.class, offsets.get(i));
                arguments.add(offsets.get(i));
            }
        }
        if (written.add(name)) {
            context.privateMethods().add(method.addCode(row).build());
        }
        return CodeBlock.of("$L;\n", LineBreaks.wrap(name + "(" + String.join(", ", arguments) + ")"));
    }

    private static String length(KernelInput input) {
        return input.isPoint() ? "DIMENSION" : Integer.toString(input.length());
    }

    /** The private methods that the tests call. */
    void emit() {
        MethodSpec.Builder length = check("requireLength")
                .addParameter(String.class, "name")
                .addParameter(int.class, "length")
                .addParameter(int.class, "required")
                .beginControlFlow("if (length != required)");
        refuse(length, "name + $S + length + $S + required", " has length ", ", not the required ");
        MethodSpec.Builder range = check("requireRange")
                .addParameter(String.class, "name")
                .addParameter(int.class, "length")
                .addParameter(int.class, "from")
                .addParameter(int.class, "count")
                .beginControlFlow("if (from < 0 || from > length - count)");
        refuse(
                range,
                "name + $S + length + $S\n+ count + $S + from",
                " has length ",
                ", too short for ",
                " entries from ");
        if (distinct) {
            MethodSpec.Builder method = check("requireDistinct")
                    .addParameter(double[].class, "a")
                    .addParameter(double[].class, "b")
                    .addParameter(String.class, "names")
                    .beginControlFlow("if (a == b)");
            refuse(method, "names + $S", " are one array, but each needs its own");
        }
        if (apart) {
            MethodSpec.Builder method = check("requireApart")
                    .addParameter(double[].class, "a")
                    .addParameter(int.class, "aFrom")
                    .addParameter(int.class, "aLength")
                    .addParameter(double[].class, "b")
                    .addParameter(int.class, "bFrom")
                    .addParameter(int.class, "bLength")
                    .addParameter(String.class, "names")
                    .beginControlFlow("if (a == b && aFrom < bFrom + bLength && bFrom < aFrom + aLength)");
            refuse(method, "names + $S", " overlap in one array");
        }
    }

    private void refuse(MethodSpec.Builder method, String message, Object... texts) {
        CodeBlock text = CodeBlock.of(message, texts);
        method.addCode("throw new $T(", IllegalArgumentException.class);
        method.addCode(CodeBlock.builder()
                .indent()
                .indent()
                .add(text)
                .unindent()
                .unindent()
                .add(");\n")
                .build());
        context.privateMethods().add(method.endControlFlow().build());
    }

    private static MethodSpec.Builder check(String name) {
        return MethodSpec.methodBuilder(name).addModifiers(Modifier.PRIVATE, Modifier.STATIC);
    }
}
