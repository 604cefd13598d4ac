package io.github.gammawright.emission;

import com.palantir.javapoet.MethodSpec;
import com.palantir.javapoet.TypeSpec;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntPredicate;

/**
 * What the writers of a class's parts share.
 *
 * @param names of everything that has a name outside the bodies
 * @param kernel what is computed
 * @param values names of the computed values
 * @param functions how functions are called
 * @param kept the values on parameters alone that the constructor computes for later
 * @param type the class under construction
 * @param privateMethods what the class ends with
 */
record EmissionContext(
        KernelModel model,
        KernelNames names,
        KernelProgram kernel,
        ValueNames values,
        FunctionNames functions,
        BitSet kept,
        TypeSpec.Builder type,
        List<MethodSpec> privateMethods) {

    static EmissionContext of(KernelModel model, TypeSpec.Builder type) {
        KernelNames names = new KernelNames(model);
        KernelProgram kernel = KernelProgram.of(model);
        StraightLineProgram program = kernel.program();
        ValueNames values = new ValueNames(program, names, componentNames(model));
        List<Integer> roots = new ArrayList<>();
        kernel.slots().forEach(roots::addAll);
        for (KernelModel.Condition condition : kernel.conditions()) {
            if (!kernel.isOnParameters(condition)) {
                roots.addAll(condition.operands());
            }
        }
        BitSet kept = ParameterWork.kept(program, roots);
        return new EmissionContext(
                model,
                names,
                kernel,
                values,
                new FunctionNames(model.className(), model.sharedTrigonometry()),
                kept,
                type,
                new ArrayList<>());
    }

    StraightLineProgram program() {
        return kernel.program();
    }

    boolean isSingle() {
        return model.results().size() == 1;
    }

    /** The number of entries of a result array. */
    int length(int result) {
        return model.results().get(result).slots().size();
    }

    /** The constant that holds it. */
    String lengthConstant(int result) {
        return KernelNames.lengthConstant(model.results().get(result).quantity(), isSingle());
    }

    /** The results as private methods see them. */
    List<ArrayTarget> resultTargets() {
        List<ArrayTarget> targets = new ArrayList<>();
        for (int r = 0; r < model.results().size(); r++) {
            targets.add(new ArrayTarget(names.results().get(r), names.offsets().get(r)));
        }
        return targets;
    }

    /**
     * The entries of inputs that a body uses, in the order of the inputs.
     *
     * @param used whether it uses a value of the program
     * @param coordinates what it uses besides, by the author's names
     */
    List<InputUse> inputUses(IntPredicate used, List<String> coordinates) {
        Map<Symbol.Kind, BitSet> entries = new EnumMap<>(Symbol.Kind.class);
        for (int i = 0; i < program().size(); i++) {
            if (used.test(i) && program().instruction(i) instanceof Instruction.Load load) {
                Symbol symbol = load.symbol();
                entries.computeIfAbsent(symbol.kind(), kind -> new BitSet()).set(symbol.index());
            }
        }
        for (String coordinate : coordinates) {
            int index = model.definition().coordinates().indexOf(coordinate);
            entries.computeIfAbsent(Symbol.Kind.COORDINATE, kind -> new BitSet())
                    .set(index);
        }
        List<InputUse> uses = new ArrayList<>();
        for (KernelInput input : names.inputs()) {
            entries.getOrDefault(input.kind(), new BitSet()).stream()
                    .forEach(i ->
                            uses.add(new InputUse(input, i, names.scalars(input).get(i))));
        }
        return uses;
    }

    /** An entry of an input that a body reads. */
    record InputUse(KernelInput input, int index, String name) {}

    /** {@code christoffel_t_t_r} for the value behind that entry; the first entry counts. */
    private static Map<Integer, String> componentNames(KernelModel model) {
        Map<Integer, String> names = new HashMap<>();
        List<String> coordinates = model.definition().coordinates();
        for (KernelModel.Result result : model.results()) {
            for (int slot = 0; slot < result.slots().size(); slot++) {
                StringBuilder name = new StringBuilder(result.quantity().variableName());
                // the flow by time has no entries for the time, though its positions count from 0
                int first = result.quantity() == Quantity.HAMILTONIAN_FLOW_BY_TIME
                        ? 1
                        : result.shape().first();
                for (int index : result.components().get(slot)) {
                    int coordinate = index + first;
                    name.append('_').append(coordinate < coordinates.size() ? coordinates.get(coordinate) : coordinate);
                }
                names.putIfAbsent(result.slots().get(slot), name.toString());
            }
        }
        return names;
    }
}
