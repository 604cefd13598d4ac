package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import javax.lang.model.element.Modifier;

/** Writes the test of the definition's conditions at a point. */
final class DomainMethod {

    private final EmissionContext context;
    private final List<KernelModel.Condition> conditions;

    DomainMethod(EmissionContext context) {
        this.context = context;
        this.conditions = context.kernel().conditions().stream()
                .filter(condition -> !context.kernel().isOnParameters(condition))
                .toList();
    }

    void emit() {
        MethodSpec.Builder method = MethodSpec.methodBuilder("inDomain")
                .addModifiers(Modifier.PUBLIC)
                .returns(boolean.class)
                .addParameter(double[].class, "point");
        method.addStatement("requireLength($S, point.length, DIMENSION)", "point");
        List<Integer> roots = new ArrayList<>();
        conditions.forEach(condition -> roots.addAll(condition.operands()));
        Inlining inlining = new Inlining(context.program(), roots, context.values()::isGiven, new BitSet());
        for (EmissionContext.InputUse use : context.inputUses(inlining)) {
            method.addStatement("double $L = point[$L]", use.name(), use.index());
        }
        method.addCode(tests(inlining));
        context.type().addMethod(method.build());
    }

    private CodeBlock tests(Inlining inlining) {
        CodeBlock.Builder code = CodeBlock.builder();
        ExpressionPrinter printer = context.values().printer(inlining, context.functions());
        BitSet pending = (BitSet) inlining.variables().clone();
        for (KernelModel.Condition condition : conditions) {
            BitSet needed = variablesOf(condition, context.program(), inlining);
            needed.and(pending);
            for (int i = needed.nextSetBit(0); i >= 0; i = needed.nextSetBit(i + 1)) {
                code.add(
                        "$L;\n",
                        LineBreaks.wrap("double " + context.values().variable(i) + " = " + printer.definition(i)));
            }
            pending.andNot(needed);
            code.beginControlFlow("if (!($L))", comparisons(condition, printer));
            code.addStatement("return false");
            code.endControlFlow();
        }
        return code.addStatement("return true").build();
    }

    /** The variables that a condition needs, directly or through others. */
    static BitSet variablesOf(KernelModel.Condition condition, StraightLineProgram program, Inlining inlining) {
        BitSet reached = new BitSet();
        condition.operands().forEach(reached::set);
        for (int i = reached.length() - 1; i >= 0; i--) {
            if (reached.get(i) && inlining.live().get(i)) {
                program.instruction(i).operands().forEach(reached::set);
            }
        }
        reached.and(inlining.variables());
        return reached;
    }

    /** A chain as Java has it, {@code a < b && b <= c}; false where an operand is NaN. */
    static String comparisons(KernelModel.Condition condition, ExpressionPrinter printer) {
        List<String> parts = new ArrayList<>();
        for (int i = 0; i < condition.comparisons().size(); i++) {
            parts.add(printer.print(condition.operands().get(i)) + " "
                    + condition.comparisons().get(i).symbol() + " "
                    + printer.print(condition.operands().get(i + 1)));
        }
        return String.join(" && ", parts);
    }
}
