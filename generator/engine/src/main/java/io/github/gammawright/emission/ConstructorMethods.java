package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.FieldSpec;
import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.Instruction;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import javax.lang.model.element.Modifier;

/**
 * Writes fields and constructors. The parameters are what is serialised; values that depend on them alone are transient
 * and computed by the constructor, which a deserialised object passes through again.
 */
final class ConstructorMethods {

    private final EmissionContext context;
    private final List<KernelModel.Condition> conditions;
    private final Inlining inlining;

    ConstructorMethods(EmissionContext context) {
        this.context = context;
        this.conditions = context.kernel().conditions().stream()
                .filter(context.kernel()::isOnParameters)
                .toList();
        List<Integer> roots = new ArrayList<>();
        conditions.forEach(condition -> roots.addAll(condition.operands()));
        context.kept().stream().forEach(roots::add);
        this.inlining =
                new Inlining(context.program(), roots, i -> context.values().isGiven(i), context.kept());
    }

    void emit() {
        for (String parameter : context.names().parameters()) {
            context.type().addField(double.class, parameter, Modifier.PRIVATE, Modifier.FINAL);
        }
        MethodSpec.Builder constructor = MethodSpec.constructorBuilder().addModifiers(Modifier.PUBLIC);
        for (String parameter : context.names().parameters()) {
            constructor.addParameter(double.class, parameter);
            constructor.addStatement("this.$L = $L", parameter, parameter);
        }
        constructor.addCode(body());
        for (int i = context.kept().nextSetBit(0); i >= 0; i = context.kept().nextSetBit(i + 1)) {
            String name = context.values().variable(i);
            context.type()
                    .addField(
                            FieldSpec.builder(double.class, name, Modifier.PRIVATE, Modifier.FINAL, Modifier.TRANSIENT)
                                    .build());
            context.values().give(i, name);
        }
        noArguments();
        context.type().addMethod(constructor.build());
    }

    private CodeBlock body() {
        CodeBlock.Builder code = CodeBlock.builder();
        ExpressionPrinter printer = context.values().printer(inlining, context.functions());
        BitSet pending = (BitSet) inlining.variables().clone();
        for (KernelModel.Condition condition : conditions) {
            BitSet needed = DomainMethod.variablesOf(condition, context.program(), inlining);
            needed.and(pending);
            define(needed, printer, code);
            pending.andNot(needed);
            code.beginControlFlow("if (!($L))", DomainMethod.comparisons(condition, printer));
            code.addStatement("throw new $T($L)", IllegalArgumentException.class, message(condition));
            code.endControlFlow();
        }
        define(pending, printer, code);
        return code.build();
    }

    private void define(BitSet values, ExpressionPrinter printer, CodeBlock.Builder code) {
        for (int i = values.nextSetBit(0); i >= 0; i = values.nextSetBit(i + 1)) {
            String type = context.kept().get(i) ? "" : "double ";
            code.add("$L;\n", LineBreaks.wrap(type + context.values().variable(i) + " = " + printer.definition(i)));
        }
    }

    /** Quotes the condition and the values of the parameters behind it. */
    private CodeBlock message(KernelModel.Condition condition) {
        BitSet behind = new BitSet();
        condition.operands().forEach(behind::set);
        CodeBlock.Builder message = CodeBlock.builder();
        List<CodeBlock> values = new ArrayList<>();
        for (int i = behind.length() - 1; i >= 0; i--) {
            if (behind.get(i)) {
                context.program().instruction(i).operands().forEach(behind::set);
            }
        }
        for (int i = behind.nextSetBit(0); i >= 0; i = behind.nextSetBit(i + 1)) {
            if (context.program().instruction(i) instanceof Instruction.Load load) {
                values.add(CodeBlock.of(
                        "$S + $L",
                        load.symbol().name() + " = ",
                        context.values().given(i)));
            }
        }
        message.add(
                "$S", "the parameters do not meet the condition " + condition.text() + (values.isEmpty() ? "" : ": "));
        for (int i = 0; i < values.size(); i++) {
            message.add(i == 0 ? " + $L" : " + \", \" + $L", values.get(i));
        }
        return message.build();
    }

    private void noArguments() {
        List<MetricDefinition.Parameter> parameters =
                context.model().definition().parameters();
        boolean defaults =
                parameters.stream().allMatch(p -> p.defaultExpression().isPresent());
        if (!defaults || !context.model().definition().functions().isEmpty()) {
            return;
        }
        MethodSpec.Builder constructor = MethodSpec.constructorBuilder().addModifiers(Modifier.PUBLIC);
        if (!parameters.isEmpty()) {
            List<String> values = parameters.stream()
                    .map(p -> DoubleLiteral.of(
                            DefaultValue.of(p.defaultExpression().orElseThrow())))
                    .toList();
            constructor.addStatement("this($L)", String.join(", ", values));
            context.type().addMethod(constructor.build());
        }
    }
}
