package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.graph.Instruction;
import java.util.BitSet;
import java.util.List;
import java.util.TreeSet;
import java.util.function.IntFunction;
import java.util.function.IntPredicate;
import javax.lang.model.element.Modifier;

/** Writes the test of the definition's conditions at a point; those on parameters the constructor has tested. */
final class DomainMethod {

    private static final int CONDITIONS_AT_ONCE = 100;
    /** What a test of a condition takes beyond its operands. */
    private static final int CONDITION_SIZE = 24;

    private final EmissionContext context;
    private final CallerFunctions functions;
    private final Conditions conditions;

    DomainMethod(EmissionContext context, CallerFunctions functions) {
        this.context = context;
        this.functions = functions;
        this.conditions = new Conditions(
                context.program(),
                context.kernel().conditions().stream()
                        .filter(condition -> !context.kernel().isOnParameters(condition))
                        .toList());
    }

    void emit() {
        MethodSpec.Builder method = MethodSpec.methodBuilder("inDomain")
                .addModifiers(Modifier.PUBLIC)
                .returns(boolean.class)
                .addParameter(double[].class, "point");
        method.addStatement("requireLength($S, point.length, DIMENSION)", "point");
        Inlining inlining = inlining(new BitSet());
        IntPredicate used = value -> inlining.uses(value) > 0;
        List<Integer> called = functions.used(used);
        for (EmissionContext.InputUse use : context.inputUses(used, functions.coordinates(called))) {
            method.addStatement("double $L = point[$L]", use.name(), use.index());
        }
        int workspaceLength = functions.resultLength(called);
        KeptArray array = null;
        CodeBlock fill = CodeBlock.of("");
        if (!isSmall(inlining)) {
            array = new KeptArray(context, inlining(compared()), "operands", workspaceLength);
            fill = array.fill("compare");
            workspaceLength = array.workspaceLength();
        }
        if (workspaceLength > 0) {
            method.addStatement("double[] workspace = new double[$L]", workspaceLength);
        }
        method.addCode(functions.calls(called, used, "workspace"));
        method.addJavadoc("$L", MethodJavadoc.inDomain(context, !called.isEmpty()));
        method.addCode(array == null ? tests(inlining) : testsInArray(array, fill));
        context.type().addMethod(method.build());
    }

    private Inlining inlining(BitSet forced) {
        return new Inlining(context.program(), conditions.operands(), context.values()::isGiven, forced);
    }

    /** What is compared and has to be computed. */
    private BitSet compared() {
        BitSet compared = new BitSet();
        conditions.operands().stream()
                .filter(value -> !context.values().isGiven(value))
                .forEach(compared::set);
        return compared;
    }

    private boolean isSmall(Inlining inlining) {
        Body body = new Body(context.program(), inlining, context.values(), List.of(), List.of());
        BytecodeSize size = new BytecodeSize(body);
        int bytes = conditions.list().size() * CONDITION_SIZE;
        for (int operand : conditions.operands()) {
            bytes += size.ofExpression(operand);
        }
        int locals = 2 * inlining.variables().cardinality();
        bytes += inlining.variables().stream()
                .map(value -> size.of(new Statement.Define(value), locals))
                .sum();
        return bytes <= BytecodeSize.LARGEST_METHOD;
    }

    private CodeBlock tests(Inlining inlining) {
        CodeBlock.Builder code = CodeBlock.builder();
        JavaExpressions expressions = context.values().printer(inlining, context.functions());
        BitSet pending = (BitSet) inlining.variables().clone();
        for (int c = 0; c < conditions.list().size(); c++) {
            KernelModel.Condition condition = conditions.list().get(c);
            BitSet needed = conditions.variables(condition, inlining);
            needed.and(pending);
            for (int i = needed.nextSetBit(0); i >= 0; i = needed.nextSetBit(i + 1)) {
                String name = context.values().variable(i);
                code.add("$L;\n", LineBreaks.wrap("double " + name + " = " + expressions.definition(i)));
            }
            pending.andNot(needed);
            if (c == conditions.list().size() - 1) {
                String last = Conditions.comparisons(condition, expressions::print);
                return code.add("return $L;\n", LineBreaks.wrap(last)).build();
            }
            test(condition, expressions::print, code);
        }
        return code.addStatement("return true").build();
    }

    private static void test(KernelModel.Condition condition, IntFunction<String> operand, CodeBlock.Builder code) {
        code.beginControlFlow("if ($L)", LineBreaks.wrap("!(" + Conditions.comparisons(condition, operand) + ")"));
        code.addStatement("return false");
        code.endControlFlow();
    }

    /** All compared values are in an array, which several methods filled; several more compare them. */
    private CodeBlock testsInArray(KeptArray array, CodeBlock fill) {
        CodeBlock.Builder code = CodeBlock.builder();
        code.addStatement("double[] operands = new double[$L]", array.length());
        code.add(fill);
        List<KernelModel.Condition> list = conditions.list();
        for (int from = 0; from < list.size(); from += CONDITIONS_AT_ONCE) {
            List<KernelModel.Condition> some = list.subList(from, Math.min(from + CONDITIONS_AT_ONCE, list.size()));
            String name = context.names().allocator().next("domainTest");
            MethodSpec.Builder method = MethodSpec.methodBuilder(name)
                    .addModifiers(Modifier.PRIVATE)
                    .returns(boolean.class)
                    .addParameter(double[].class, "operands");
            TreeSet<String> inputs = new TreeSet<>();
            for (int value : new Conditions(context.program(), some).operands()) {
                if (context.program().instruction(value) instanceof Instruction.Load load
                        && !load.symbol().isParameter()) {
                    inputs.add(context.values().given(value));
                }
            }
            inputs.forEach(input -> method.addParameter(double.class, input));
            CodeBlock.Builder tests = CodeBlock.builder();
            some.forEach(condition -> test(condition, array::operand, tests));
            context.privateMethods()
                    .add(method.addCode(tests.build())
                            .addStatement("return true")
                            .build());
            String arguments = String.join(", ", inputs);
            code.beginControlFlow("if (!$L(operands$L))", name, arguments.isEmpty() ? "" : ", " + arguments);
            code.addStatement("return false");
            code.endControlFlow();
        }
        return code.addStatement("return true").build();
    }
}
