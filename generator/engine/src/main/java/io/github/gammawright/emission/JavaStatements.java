package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import java.util.Arrays;
import java.util.List;
import java.util.function.IntFunction;

/** Writes statements as Java. */
final class JavaStatements {

    /** Zeros in a row from this many on are written by one call; up to it, single stores were measured faster. */
    static final int LONG_RUN = 33;

    private final JavaExpressions expressions;
    private final IntFunction<String> variables;
    private final List<ArrayTarget> arrays;

    JavaStatements(JavaExpressions expressions, IntFunction<String> variables, List<ArrayTarget> arrays) {
        this.expressions = expressions;
        this.variables = variables;
        this.arrays = List.copyOf(arrays);
    }

    CodeBlock print(List<Statement> statements) {
        CodeBlock.Builder code = CodeBlock.builder();
        for (Statement statement : statements) {
            print(statement, code);
        }
        return code.build();
    }

    private void print(Statement statement, CodeBlock.Builder code) {
        if (statement instanceof Statement.Define define) {
            String name = variables.apply(define.value());
            add(code, "double " + name + " = " + expressions.definition(define.value()));
        } else if (statement instanceof Statement.Store store) {
            String target = arrays.get(store.array()).element(store.slot());
            add(code, target + " = " + expressions.print(store.value()));
        } else if (statement instanceof Statement.Copy copy) {
            String source = arrays.get(copy.fromArray()).element(copy.fromSlot());
            add(code, arrays.get(copy.array()).element(copy.slot()) + " = " + source);
        } else if (statement instanceof Statement.Zero zero) {
            ArrayTarget array = arrays.get(zero.array());
            if (zero.to() - zero.from() >= LONG_RUN) {
                code.add(
                        "$T.fill($L, $L, $L, 0.0);\n",
                        Arrays.class,
                        array.name(),
                        array.position(zero.from()),
                        array.position(zero.to()));
            } else {
                for (int slot = zero.from(); slot < zero.to(); slot++) {
                    add(code, array.element(slot) + " = 0.0");
                }
            }
        }
    }

    private static void add(CodeBlock.Builder code, String statement) {
        code.add("$L;\n", LineBreaks.wrap(statement));
    }
}
