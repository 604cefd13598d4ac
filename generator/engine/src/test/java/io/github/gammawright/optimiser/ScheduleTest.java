package io.github.gammawright.optimiser;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.ProgramBuilder;
import io.github.gammawright.graph.ProgramInterpreter;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;

class ScheduleTest {

    private static int load(ProgramBuilder builder, Symbol.Kind kind, int index) {
        return builder.append(new Instruction.Load(Symbol.of(kind, kind.name() + index, index)));
    }

    private static StraightLineProgram random(int seed, int size) {
        Random random = new Random(seed);
        ProgramBuilder builder = new ProgramBuilder();
        List<Integer> values = new ArrayList<>();
        for (int i = 0; i < 3; i++) {
            values.add(load(builder, Symbol.Kind.COORDINATE, i));
            values.add(load(builder, Symbol.Kind.PARAMETER, i));
        }
        for (int i = 0; i < size; i++) {
            int a = values.get(random.nextInt(values.size()));
            int b = values.get(values.size() - 1 - random.nextInt(Math.min(9, values.size())));
            values.add(
                    switch (random.nextInt(8)) {
                        case 0 -> builder.negate(a);
                        case 1 -> builder.append(new Instruction.Call(RealFunction.SIN, List.of(a)));
                        case 2 -> builder.append(new Instruction.MultiplyAdd(a, b, a));
                        case 3 -> builder.divide(a, b);
                        case 4, 5 -> builder.multiply(a, b);
                        default -> builder.subtract(a, b);
                    });
            if (i % 7 == 0) {
                builder.name(values.get(values.size() - 1), "n" + i);
            }
        }
        List<Integer> outputs = new ArrayList<>();
        for (int o = 0; o < 12; o++) {
            outputs.add(values.get(random.nextInt(values.size())));
        }
        return builder.build(outputs);
    }

    private static double[] outputs(StraightLineProgram program) {
        double[] values = ProgramInterpreter.run(
                program, symbol -> 0.3 + 0.7 * symbol.index() + symbol.kind().ordinal());
        return program.outputs().stream().mapToDouble(o -> values[o]).toArray();
    }

    @Property(tries = 200)
    void valuesStayToTheLastBit(@ForAll int seed, @ForAll @IntRange(max = 120) int size) {
        StraightLineProgram program = random(seed, size);
        StraightLineProgram ordered = Schedule.of(program);
        assertThat(outputs(ordered)).containsExactly(outputs(program));
        assertThat(ordered.size()).isLessThanOrEqualTo(program.size());
        assertThat(program.names().values()).containsAll(ordered.names().values());
        assertThat(Schedule.pressure(ordered)).isLessThanOrEqualTo(Math.max(16, Schedule.pressure(program)));
    }

    /** All products first and then all sums, as a graph may come, needs a place for each product; one after the other two. */
    @Test
    void resultsAreFinishedOneByOne() {
        ProgramBuilder builder = new ProgramBuilder();
        int x = load(builder, Symbol.Kind.COORDINATE, 0);
        List<Integer> products = new ArrayList<>();
        for (int i = 1; i <= 40; i++) {
            products.add(builder.multiply(x, load(builder, Symbol.Kind.PARAMETER, i)));
        }
        List<Integer> sums = products.stream().map(p -> builder.add(p, x)).toList();
        StraightLineProgram program = builder.build(sums);
        assertThat(Schedule.pressure(program)).isGreaterThan(40);
        assertThat(Schedule.pressure(Schedule.of(program))).isLessThanOrEqualTo(3);
    }

    @Test
    void functionsComeFirst() {
        ProgramBuilder builder = new ProgramBuilder();
        int x = load(builder, Symbol.Kind.COORDINATE, 0);
        int y = load(builder, Symbol.Kind.COORDINATE, 1);
        int square = builder.multiply(x, x);
        int quotient = builder.divide(square, y);
        int sine = builder.append(new Instruction.Call(RealFunction.SIN, List.of(y)));
        StraightLineProgram ordered = Schedule.of(builder.build(List.of(quotient, builder.multiply(quotient, sine))));
        assertThat(ordered.instruction(1)).isInstanceOf(Instruction.Call.class);
    }

    @Test
    void whatNoResultNeedsIsLeftOut() {
        ProgramBuilder builder = new ProgramBuilder();
        int x = load(builder, Symbol.Kind.COORDINATE, 0);
        builder.multiply(x, x);
        assertThat(Schedule.of(builder.build(List.of(x))).size()).isEqualTo(1);
    }
}
