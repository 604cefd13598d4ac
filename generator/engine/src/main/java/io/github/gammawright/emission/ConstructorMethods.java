package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.ParameterDefaults;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Objects;
import javax.lang.model.element.Modifier;

/**
 * Writes fields and constructors. The parameters are what is serialised; values that depend on them alone are transient
 * and computed by the constructor, which a deserialised object passes through again.
 */
final class ConstructorMethods {

    private static final int MOST_FIELDS = 300;
    private static final int CONDITIONS_AT_ONCE = 24;
    /** What a test of a condition takes beyond its operands. */
    private static final int CONDITION_SIZE = 60;

    private final EmissionContext context;
    private final CallerFunctions functions;
    private final Conditions conditions;
    private final ConstructorJavadoc javadoc;

    ConstructorMethods(EmissionContext context, CallerFunctions functions) {
        this.context = context;
        this.functions = functions;
        this.conditions = new Conditions(
                context.program(),
                context.kernel().conditions().stream()
                        .filter(context.kernel()::isOnParameters)
                        .toList());
        this.javadoc = new ConstructorJavadoc(context, !conditions.list().isEmpty());
    }

    void emit() {
        MethodSpec.Builder constructor = MethodSpec.constructorBuilder().addModifiers(Modifier.PUBLIC);
        constructor.addJavadoc("$L", javadoc.ofParameters());
        for (String parameter : context.names().parameters()) {
            context.type().addField(double.class, parameter, Modifier.PRIVATE, Modifier.FINAL);
            constructor.addParameter(double.class, parameter);
            constructor.addStatement("this.$L = $L", parameter, parameter);
        }
        if (functions.exist()) {
            context.type().addField(functions.type(), "functions", Modifier.PRIVATE, Modifier.FINAL);
            constructor.addParameter(functions.type(), "functions");
            constructor.addStatement("this.functions = $T.requireNonNull(functions, $S)", Objects.class, "functions");
        }
        Inlining inlining = inlining(new BitSet());
        if (isSmall(inlining)) {
            constructor.addCode(work(inlining));
            for (int i = context.kept().nextSetBit(0);
                    i >= 0;
                    i = context.kept().nextSetBit(i + 1)) {
                String name = context.values().variable(i);
                context.type().addField(double.class, name, Modifier.PRIVATE, Modifier.FINAL, Modifier.TRANSIENT);
                context.values().give(i, name);
            }
        } else {
            constructor.addCode(workInArray());
        }
        noArguments();
        context.type().addMethod(constructor.build());
        if (!context.kept().isEmpty() || !conditions.list().isEmpty()) {
            readResolve();
        }
    }

    private Inlining inlining(BitSet forced) {
        List<Integer> roots = new ArrayList<>(conditions.operands());
        context.kept().stream().forEach(roots::add);
        BitSet variables = (BitSet) context.kept().clone();
        variables.or(forced);
        return new Inlining(context.program(), roots, context.values()::isGiven, variables);
    }

    private boolean isSmall(Inlining inlining) {
        List<Statement> statements = new ArrayList<>();
        inlining.variables().stream().forEach(value -> statements.add(new Statement.Define(value)));
        Body body = new Body(context.program(), inlining, context.values(), statements, List.of());
        BytecodeSize size = new BytecodeSize(body);
        int bytes = conditions.list().size() * CONDITION_SIZE;
        for (int operand : conditions.operands()) {
            bytes += size.ofExpression(operand);
        }
        for (Statement statement : statements) {
            bytes += size.of(statement, 2 * statements.size());
        }
        return context.kept().cardinality() <= MOST_FIELDS && bytes <= BytecodeSize.LARGEST_METHOD;
    }

    private CodeBlock work(Inlining inlining) {
        CodeBlock.Builder code = CodeBlock.builder();
        JavaExpressions expressions = context.values().printer(inlining, context.functions());
        BitSet pending = (BitSet) inlining.variables().clone();
        for (KernelModel.Condition condition : conditions.list()) {
            BitSet needed = conditions.variables(condition, inlining);
            needed.and(pending);
            define(needed, expressions, code);
            pending.andNot(needed);
            code.add(conditions.requirement(condition, expressions::print, context.values()::given));
        }
        define(pending, expressions, code);
        return code.build();
    }

    private void define(BitSet values, JavaExpressions expressions, CodeBlock.Builder code) {
        for (int i = values.nextSetBit(0); i >= 0; i = values.nextSetBit(i + 1)) {
            String type = context.kept().get(i) ? "" : "double ";
            code.add("$L;\n", LineBreaks.wrap(type + context.values().variable(i) + " = " + expressions.definition(i)));
        }
    }

    /** All values go into an array, by several methods; then the conditions are tested, by several more. */
    private CodeBlock workInArray() {
        BitSet compared = new BitSet();
        conditions.operands().stream()
                .filter(value -> !context.values().isGiven(value))
                .forEach(compared::set);
        Inlining inlining = inlining(compared);
        KeptArray array = new KeptArray(context, inlining, "constants", 0);
        context.type().addField(double[].class, "constants", Modifier.PRIVATE, Modifier.FINAL, Modifier.TRANSIENT);
        CodeBlock.Builder code = CodeBlock.builder();
        code.addStatement("double[] constants = new double[$L]", array.length());
        code.add(array.fill("prepare"));
        code.addStatement("this.constants = constants");
        code.add(requirements(array));
        array.give(context.kept());
        return code.build();
    }

    private CodeBlock requirements(KeptArray array) {
        CodeBlock.Builder calls = CodeBlock.builder();
        List<KernelModel.Condition> list = conditions.list();
        for (int from = 0; from < list.size(); from += CONDITIONS_AT_ONCE) {
            String name = context.names().allocator().next("require");
            MethodSpec.Builder method = MethodSpec.methodBuilder(name)
                    .addModifiers(Modifier.PRIVATE)
                    .addParameter(double[].class, "constants");
            for (KernelModel.Condition condition :
                    list.subList(from, Math.min(from + CONDITIONS_AT_ONCE, list.size()))) {
                method.addCode(conditions.requirement(condition, array::operand, context.values()::given));
            }
            context.privateMethods().add(method.build());
            calls.addStatement("$L(constants)", name);
        }
        return calls.build();
    }

    private void noArguments() {
        List<MetricDefinition.Parameter> parameters =
                context.model().definition().parameters();
        boolean defaults =
                parameters.stream().allMatch(p -> p.defaultExpression().isPresent());
        if (!defaults || parameters.isEmpty() || functions.exist()) {
            return;
        }
        List<String> values = parameters.stream()
                .map(p -> DoubleLiteral.of(
                        ParameterDefaults.value(p.defaultExpression().orElseThrow())))
                .toList();
        context.type()
                .addMethod(MethodSpec.constructorBuilder()
                        .addModifiers(Modifier.PUBLIC)
                        .addJavadoc("$L", javadoc.ofDefaults(values))
                        .addCode("$L;\n", LineBreaks.wrap("this(" + String.join(", ", values) + ")"))
                        .build());
    }

    /** A stream holds the parameters only; whatever wrote it, the object goes through the constructor. */
    private void readResolve() {
        List<String> arguments = new ArrayList<>(context.names().parameters());
        if (functions.exist()) {
            arguments.add("functions");
        }
        context.privateMethods()
                .add(MethodSpec.methodBuilder("readResolve")
                        .addModifiers(Modifier.PRIVATE)
                        .returns(Object.class)
                        .addCode(
                                "return $L;\n",
                                LineBreaks.wrap("new " + context.model().className() + "("
                                        + String.join(", ", arguments) + ")"))
                        .build());
    }
}
