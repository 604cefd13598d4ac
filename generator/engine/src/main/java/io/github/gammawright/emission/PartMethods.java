package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.IntFunction;
import javax.lang.model.element.Modifier;

/** Writes a body that is too large for one method as several, and the code that calls them in turn. */
final class PartMethods {

    /** The virtual machine's compiler refuses methods with too many arguments. */
    static final int MOST_ARGUMENTS = 24;

    /** With more variables than this, each method has names of its own for them. */
    static final int MOST_NAMES = 8_000;

    /** Calls of so many parts fit easily into one method. */
    private static final int CALLS_AT_ONCE = 48;

    private final EmissionContext context;
    private final Body body;
    private final List<List<Statement>> parts;
    private final List<ArrayTarget> arrays;
    private final BitSet arguments;
    private final ValueHomes homes;
    private final String prefix;

    /**
     * Plans the methods.
     *
     * @param prefix what their names begin with
     * @param workspaceLength the entries of the workspace that are in other use
     */
    PartMethods(EmissionContext context, Body body, List<List<Statement>> parts, String prefix, int workspaceLength) {
        this.context = context;
        this.body = body;
        this.parts = parts;
        this.prefix = prefix;
        this.arrays = new ArrayList<>(body.arrays());
        arrays.add(new ArrayTarget("workspace", null));
        BitSet inputs = new BitSet();
        int[] users = new int[body.program().size()];
        for (List<Statement> part : parts) {
            BitSet read = inputsOf(part);
            inputs.or(read);
            read.stream().forEach(input -> users[input]++);
        }
        this.arguments = mostUsed(inputs, users);
        BitSet others = (BitSet) inputs.clone();
        others.andNot(arguments);
        this.homes = ValueHomes.of(body, parts, others, workspaceLength);
    }

    private BitSet inputsOf(List<Statement> part) {
        BitSet inputs = new BitSet();
        part.forEach(statement ->
                body.reads(statement).stream().filter(body::isInput).forEach(inputs::set));
        return inputs;
    }

    private static BitSet mostUsed(BitSet inputs, int[] users) {
        BitSet arguments = new BitSet();
        inputs.stream()
                .boxed()
                .sorted((a, b) -> users[a] != users[b] ? users[b] - users[a] : a - b)
                .limit(MOST_ARGUMENTS)
                .forEach(arguments::set);
        return arguments;
    }

    /** How many entries the workspace needs. */
    int workspaceLength() {
        return homes.workspaceLength();
    }

    /** Adds the methods to the class; returns the code that runs them all, where all inputs and arrays are at hand. */
    CodeBlock emit() {
        CodeBlock.Builder code = CodeBlock.builder();
        BitSet inputs = new BitSet();
        parts.forEach(part -> inputs.or(inputsOf(part)));
        inputs.andNot(arguments);
        for (int input = inputs.nextSetBit(0); input >= 0; input = inputs.nextSetBit(input + 1)) {
            code.addStatement("$L = $L", element(input), body.values().given(input));
        }
        List<CodeBlock> calls = new ArrayList<>();
        List<BitSet> read = new ArrayList<>();
        List<Set<Integer>> touched = new ArrayList<>();
        for (List<Statement> part : parts) {
            Part written = new Part(part);
            String name = context.names().allocator().next(prefix);
            context.privateMethods()
                    .add(method(name, written.inputs, written.touched)
                            .addCode(written.code())
                            .build());
            calls.add(call(name, written.inputs, written.touched));
            read.add(written.inputs);
            touched.add(written.touched);
        }
        if (calls.size() <= CALLS_AT_ONCE) {
            calls.forEach(code::add);
            return code.build();
        }
        for (int from = 0; from < calls.size(); from += CALLS_AT_ONCE) {
            BitSet allRead = new BitSet();
            TreeSet<Integer> allTouched = new TreeSet<>();
            CodeBlock.Builder group = CodeBlock.builder();
            for (int i = from; i < Math.min(from + CALLS_AT_ONCE, calls.size()); i++) {
                allRead.or(read.get(i));
                allTouched.addAll(touched.get(i));
                group.add(calls.get(i));
            }
            String name = context.names().allocator().next(prefix + "Group");
            context.privateMethods()
                    .add(method(name, allRead, allTouched)
                            .addCode(group.build())
                            .build());
            code.add(call(name, allRead, allTouched));
        }
        return code.build();
    }

    private MethodSpec.Builder method(String name, BitSet inputs, Set<Integer> touched) {
        MethodSpec.Builder method = MethodSpec.methodBuilder(name).addModifiers(Modifier.PRIVATE);
        inputs.stream()
                .forEach(
                        input -> method.addParameter(double.class, body.values().given(input)));
        for (int array : touched) {
            method.addParameter(double[].class, arrays.get(array).name());
            if (arrays.get(array).offset() != null) {
                method.addParameter(int.class, arrays.get(array).offset());
            }
        }
        return method;
    }

    private CodeBlock call(String name, BitSet inputs, Set<Integer> touched) {
        List<String> arguments = new ArrayList<>();
        inputs.stream().forEach(input -> arguments.add(body.values().given(input)));
        touched.forEach(array -> arguments.add(arrays.get(array).argument()));
        return CodeBlock.of("$L;\n", LineBreaks.wrap(name + "(" + String.join(", ", arguments) + ")"));
    }

    private String element(int value) {
        ValueHomes.Home home = homes.home(value);
        return arrays.get(home.array()).element(home.slot());
    }

    /** One of the methods. */
    private final class Part {

        private final List<Statement> statements;
        private final BitSet inputs;
        private final List<Integer> loads = new ArrayList<>();
        private final TreeSet<Integer> touched = new TreeSet<>();

        Part(List<Statement> statements) {
            this.statements = statements;
            BitSet read = new BitSet();
            BitSet defined = new BitSet();
            for (Statement statement : statements) {
                body.reads(statement).forEach(read::set);
                if (statement instanceof Statement.Define define) {
                    defined.set(define.value());
                    if (homes.isWritten(define.value())) {
                        touched.add(homes.home(define.value()).array());
                    }
                } else if (statement instanceof Statement.Store store) {
                    touched.add(store.array());
                } else if (statement instanceof Statement.Copy copy) {
                    touched.add(copy.array());
                    touched.add(copy.fromArray());
                } else if (statement instanceof Statement.Zero zero) {
                    touched.add(zero.array());
                }
            }
            read.andNot(defined);
            this.inputs = (BitSet) read.clone();
            inputs.and(arguments);
            read.andNot(arguments);
            read.stream().forEach(value -> {
                loads.add(value);
                touched.add(homes.home(value).array());
            });
        }

        CodeBlock code() {
            CodeBlock.Builder code = CodeBlock.builder();
            boolean many = body.inlining().variables().cardinality() > MOST_NAMES;
            IntFunction<String> names = many ? body.values().ofOneMethod() : body.values()::variable;
            for (int value : loads) {
                String name = body.isVariable(value)
                        ? names.apply(value)
                        : body.values().given(value);
                code.addStatement("double $L = $L", name, element(value));
            }
            JavaExpressions expressions = body.values().printer(body.inlining(), names, context.functions());
            JavaStatements printer = new JavaStatements(expressions, names, arrays);
            for (Statement statement : statements) {
                code.add(printer.print(List.of(statement)));
                if (statement instanceof Statement.Define define && homes.isWritten(define.value())) {
                    code.addStatement("$L = $L", element(define.value()), names.apply(define.value()));
                }
            }
            return code.build();
        }
    }
}
