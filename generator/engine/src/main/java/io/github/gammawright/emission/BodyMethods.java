package io.github.gammawright.emission;

import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.emission.EmissionContext.InputUse;
import java.util.BitSet;
import java.util.List;
import javax.lang.model.element.Modifier;

/** Writes the private methods that compute the results. */
final class BodyMethods {

    private final EmissionContext context;
    private final Inlining inlining;
    private final List<InputUse> uses;

    BodyMethods(EmissionContext context) {
        this.context = context;
        List<Integer> roots = context.kernel().slots().stream()
                .flatMap(List::stream)
                .filter(value -> value >= 0)
                .toList();
        this.inlining = new Inlining(context.program(), roots, context.values()::isGiven, new BitSet());
        this.uses = context.inputUses(inlining);
    }

    /** The entries of the inputs that the method {@code compute} takes, in its order. */
    List<InputUse> uses() {
        return uses;
    }

    void emit() {
        MethodSpec.Builder method = MethodSpec.methodBuilder("compute").addModifiers(Modifier.PRIVATE);
        uses.forEach(use -> method.addParameter(double.class, use.name()));
        for (ArrayTarget target : context.resultTargets()) {
            method.addParameter(double[].class, target.name());
            method.addParameter(int.class, target.offset());
        }
        List<Statement> statements = Statements.of(inlining, context.kernel().slots());
        ExpressionPrinter printer = context.values().printer(inlining, context.functions());
        method.addCode(new StatementPrinter(printer, context.values(), context.resultTargets()).print(statements));
        context.type().addMethod(method.build());
    }
}
