package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.emission.EmissionContext.InputUse;
import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.BitSet;
import java.util.List;
import javax.lang.model.element.Modifier;

/** Writes the private method {@code compute} that every public form of evaluation calls, and those that it calls. */
final class BodyMethods {

    private final EmissionContext context;
    private final CallerFunctions functions;
    private final Inlining inlining;
    private final List<Integer> called;
    private final List<InputUse> uses;
    private int workspaceLength;

    BodyMethods(EmissionContext context, CallerFunctions functions) {
        this.context = context;
        this.functions = functions;
        List<Integer> roots = context.kernel().slots().stream()
                .flatMap(List::stream)
                .filter(value -> value >= 0)
                .toList();
        this.inlining = new Inlining(context.program(), roots, context.values()::isGiven, calls(context.program()));
        this.called = functions.used(i -> inlining.uses(i) > 0);
        this.uses = context.inputUses(i -> inlining.uses(i) > 0, functions.coordinates(called));
    }

    /** Sine and cosine stand where the program has them, and not where they are used: a call moves all else to memory. */
    private static BitSet calls(StraightLineProgram program) {
        BitSet calls = new BitSet();
        for (int i = 0; i < program.size(); i++) {
            if (program.instruction(i) instanceof Instruction.Call call && call.isCircular()) {
                calls.set(i);
            }
        }
        return calls;
    }

    /** Writes the methods and says how {@code compute} is called. */
    ComputeSignature emit() {
        workspaceLength = functions.resultLength(called);
        boolean scalars = uses.size() <= PartMethods.MOST_ARGUMENTS;
        int first = context.privateMethods().size();
        CodeBlock work = work();
        ComputeSignature signature = new ComputeSignature(context.names(), uses, scalars, workspaceLength);
        context.privateMethods().add(first, compute(signature, work));
        return signature;
    }

    private MethodSpec compute(ComputeSignature signature, CodeBlock work) {
        MethodSpec.Builder method = MethodSpec.methodBuilder("compute").addModifiers(Modifier.PRIVATE);
        signature.addParameters(method);
        if (!signature.scalars()) {
            for (InputUse use : uses) {
                ArrayTarget array = new ArrayTarget(use.input().name(), signature.offset(use.input()));
                method.addStatement("double $L = $L", use.name(), array.element(use.index()));
            }
        }
        method.addCode(functions.calls(called, i -> inlining.uses(i) > 0, "workspace"));
        return method.addCode(work).build();
    }

    private CodeBlock work() {
        Body body = new Body(
                context.program(),
                inlining,
                context.values(),
                Statements.of(inlining, context.kernel().slots()),
                context.resultTargets());
        List<List<Statement>> parts = Partition.of(body, new BytecodeSize(body));
        if (parts.size() == 1) {
            JavaExpressions printer = context.values().printer(inlining, context.functions());
            return new JavaStatements(printer, context.values()::variable, body.arrays()).print(body.statements());
        }
        PartMethods methods = split(body.withZerosLast());
        if (methods.workspaceLength() > workspaceLength) {
            PartMethods others = split(body.withCopiesLast());
            methods = others.workspaceLength() < methods.workspaceLength() ? others : methods;
        }
        workspaceLength = methods.workspaceLength();
        return methods.emit();
    }

    private PartMethods split(Body body) {
        List<List<Statement>> parts = Partition.of(body, new BytecodeSize(body));
        return new PartMethods(context, body, parts, "part", workspaceLength);
    }
}
