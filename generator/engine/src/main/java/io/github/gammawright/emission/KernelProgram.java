package io.github.gammawright.emission;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * The computation of a kernel and of its domain's conditions in one program, so that what both need on parameters alone
 * is kept once.
 *
 * @param slots for each result the number of the instruction behind each entry, −1 for zero
 * @param conditions with operands that refer to the common program
 */
record KernelProgram(StraightLineProgram program, List<List<Integer>> slots, List<KernelModel.Condition> conditions) {

    static KernelProgram of(KernelModel model) {
        List<Instruction> instructions = new ArrayList<>(model.program().instructions());
        Map<Instruction, Integer> known = new HashMap<>();
        for (int i = 0; i < instructions.size(); i++) {
            known.putIfAbsent(instructions.get(i), i);
        }
        Map<Integer, String> names = new TreeMap<>(model.program().names());
        StraightLineProgram domain = model.domain().program();
        int[] numbers = new int[domain.size()];
        for (int i = 0; i < numbers.length; i++) {
            Instruction instruction = domain.instruction(i).renumbered(operand -> numbers[operand]);
            Integer number = known.get(instruction);
            if (number == null) {
                number = instructions.size();
                instructions.add(instruction);
                known.put(instruction, number);
            }
            numbers[i] = number;
            if (domain.names().containsKey(i)) {
                names.putIfAbsent(number, domain.names().get(i));
            }
        }
        List<KernelModel.Condition> conditions = new ArrayList<>();
        for (KernelModel.Condition condition : model.domain().conditions()) {
            List<Integer> operands =
                    condition.operands().stream().map(o -> numbers[o]).toList();
            conditions.add(new KernelModel.Condition(operands, condition.comparisons(), condition.text()));
        }
        return new KernelProgram(
                new StraightLineProgram(instructions, names, List.of()),
                model.results().stream().map(KernelModel.Result::slots).toList(),
                List.copyOf(conditions));
    }

    Instruction instruction(int number) {
        return program.instruction(number);
    }

    boolean isOnParameters(KernelModel.Condition condition) {
        return condition.operands().stream().allMatch(program::isParameterOnly);
    }
}
