package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.FieldSpec;
import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Shape;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import javax.lang.model.element.Modifier;

/** Writes the constants that give the lengths, and the methods that say where a component is. */
final class IndexMethods {

    private static final List<String> INDICES = List.of("l", "k", "i", "j");

    private static final List<String> CURVATURE_INDICES = List.of("k", "l", "i", "j");

    private static final int LARGEST_SWITCH = 128;

    private final EmissionContext context;

    IndexMethods(EmissionContext context) {
        this.context = context;
    }

    void emitLengths() {
        constant(
                "DIMENSION",
                "The number of coordinates.",
                context.model().definition().dimension());
        for (int r = 0; r < context.model().results().size(); r++) {
            String name = context.names().results().get(r);
            constant(context.lengthConstant(r), "The number of entries of {@code " + name + "}.", context.length(r));
        }
    }

    void emitWorkspaceLength(int length) {
        constant("WORKSPACE_LENGTH", "The number of entries that a workspace needs.", length);
    }

    void emit() {
        for (KernelModel.Result result : context.model().results()) {
            index(result);
        }
    }

    private void constant(String name, String javadoc, int value) {
        context.type()
                .addField(FieldSpec.builder(int.class, name, Modifier.PUBLIC, Modifier.STATIC, Modifier.FINAL)
                        .addJavadoc(javadoc)
                        .initializer("$L", value)
                        .build());
    }

    private void index(KernelModel.Result result) {
        Shape shape = result.shape();
        String name = context.isSingle() ? "index" : result.quantity().variableName() + "Index";
        MethodSpec.Builder method = MethodSpec.methodBuilder(name)
                .addModifiers(Modifier.PUBLIC, Modifier.STATIC)
                .returns(int.class)
                .addJavadoc(
                        "$L",
                        MethodJavadoc.index(
                                result, context.isSingle(), context.model().layout() == Layout.NON_ZERO));
        boolean packed = context.model().layout() != Layout.FULL;
        boolean curvature = shape.symmetry() == Shape.Symmetry.CURVATURE;
        List<String> indices = curvature ? CURVATURE_INDICES : names(shape.rank());
        indices.forEach(index -> method.addParameter(int.class, index));
        method.addCode(packed && curvature ? pairPosition(shape.extents().get(0)) : position(shape, indices, packed));
        if (isLookedUp()) {
            lookUp(result, method);
        }
        context.type().addMethod(method.build());
        if (packed && curvature) {
            sign(result, name);
        }
    }

    /** The sign with which the stored component enters that of the given indices. */
    private void sign(KernelModel.Result result, String index) {
        String name = context.isSingle() ? "sign" : result.quantity().variableName() + "Sign";
        MethodSpec.Builder method = MethodSpec.methodBuilder(name)
                .addModifiers(Modifier.PUBLIC, Modifier.STATIC)
                .returns(int.class)
                .addJavadoc("$L", MethodJavadoc.sign(result, context.isSingle()));
        CURVATURE_INDICES.forEach(i -> method.addParameter(int.class, i));
        method.addStatement("return $L(k, l, i, j) < 0 ? 0 : (k > l) == (i > j) ? 1 : -1", index);
        context.type().addMethod(method.build());
    }

    /** Pairs A = k(k−1)/2 + l of k &gt; l and B alike, at A(A+1)/2 + B for A ≥ B. */
    private CodeBlock pairPosition(int n) {
        CodeBlock.Builder code = CodeBlock.builder();
        for (String index : CURVATURE_INDICES) {
            code.addStatement("$T.checkIndex($L, $L)", Objects.class, index, n);
        }
        code.beginControlFlow("if (k == l || i == j)").addStatement("return -1").endControlFlow();
        String math = context.functions().math();
        code.addStatement("int first = $1L.max(k, l) * ($1L.max(k, l) - 1) / 2 + $1L.min(k, l)", math);
        code.addStatement("int second = $1L.max(i, j) * ($1L.max(i, j) - 1) / 2 + $1L.min(i, j)", math);
        code.addStatement("int row = $L.max(first, second)", math);
        code.addStatement("int column = $L.min(first, second)", math);
        code.addStatement("$L row * (row + 1) / 2 + column", isLookedUp() ? "int position =" : "return");
        return code.build();
    }

    private boolean isLookedUp() {
        return context.model().layout() == Layout.NON_ZERO;
    }

    private static List<String> names(int rank) {
        return switch (rank) {
            case 1 -> List.of("k");
            case 2 -> List.of("i", "j");
            default -> INDICES.subList(INDICES.size() - rank, INDICES.size());
        };
    }

    /** Row-major order, in which the last two indices may be folded to a triangle. */
    private CodeBlock position(Shape shape, List<String> indices, boolean packed) {
        CodeBlock.Builder code = CodeBlock.builder();
        boolean triangle = packed && shape.symmetricPair();
        int rows = triangle ? shape.rank() - 2 : shape.rank();
        for (int i = 0; i < indices.size(); i++) {
            String index = indices.get(i);
            String counted = shape.first() == 0 ? index : index + " - " + shape.first();
            code.addStatement(
                    "$T.checkIndex($L, $L)",
                    Objects.class,
                    counted,
                    shape.extents().get(i));
        }
        StringBuilder position = new StringBuilder();
        for (int i = 0; i < rows; i++) {
            String counted = shape.first() == 0 ? indices.get(i) : indices.get(i) + " - " + shape.first();
            if (i == 0) {
                position.append(counted);
            } else {
                String former = position.toString();
                position.setLength(0);
                position.append(i == 1 && shape.first() == 0 ? former : "(" + former + ")");
                position.append(" * ")
                        .append(shape.extents().get(i))
                        .append(" + ")
                        .append(counted);
            }
        }
        if (triangle) {
            int n = shape.extents().get(shape.rank() - 1);
            String counted = shape.first() == 0 ? "" : " - " + shape.first();
            String i = indices.get(shape.rank() - 2) + counted;
            String j = indices.get(shape.rank() - 1) + counted;
            code.addStatement("int row = $L.max($L, $L)", context.functions().math(), i, j);
            code.addStatement("int column = $L.min($L, $L)", context.functions().math(), i, j);
            String former =
                    rows == 0 ? "" : (rows == 1 ? position : "(" + position + ")") + " * " + n * (n + 1) / 2 + " + ";
            position = new StringBuilder(former + "row * (row + 1) / 2 + column");
        }
        code.addStatement(
                "$L $L", isLookedUp() ? "int position =" : "return", position.isEmpty() ? "0" : position.toString());
        return code.build();
    }

    private void lookUp(KernelModel.Result result, MethodSpec.Builder method) {
        int[] slots = new int[result.shape().packedLength()];
        Arrays.fill(slots, -1);
        for (int slot = 0; slot < result.components().size(); slot++) {
            int[] tuple =
                    result.components().get(slot).stream().mapToInt(i -> i).toArray();
            slots[result.shape().packedIndex(tuple)] = slot;
        }
        if (result.components().size() > LARGEST_SWITCH) {
            String name = context.isSingle() ? "INDEX" : result.quantity().name() + "_INDEX";
            IndexTable table = new IndexTable(name, slots);
            table.emit(context.type());
            method.addCode(table.lookUp());
            return;
        }
        method.beginControlFlow("switch (position)");
        for (int position = 0; position < slots.length; position++) {
            if (slots[position] >= 0) {
                method.addCode("case $L: return $L;\n", position, slots[position]);
            }
        }
        method.addCode("default: return -1;\n");
        method.endControlFlow();
    }
}
