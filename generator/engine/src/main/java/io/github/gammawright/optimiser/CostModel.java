package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.Instruction.Operator;
import io.github.gammawright.graph.OperationCount;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.StraightLineProgram;
import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.EnumMap;
import java.util.Map;
import java.util.Properties;

/**
 * What operations cost at run time, in quarters of an addition. The numbers are a resource that the benchmarks wrote from a
 * measurement; nothing is measured when kernels are made, so that choices are the same on every machine.
 */
public final class CostModel {

    /** The name of the resource beside this class. */
    public static final String RESOURCE = "cost-model.properties";

    /** What an addition costs, the unit of reports. */
    public static final int ADDITION = 4;

    /** The values that are alive at once before some of them go to memory; a processor has sixteen registers for them. */
    static final int REGISTERS = 16;

    private final int add;
    private final int multiply;
    private final int divide;
    private final int spill;
    private final int sincos;
    private final Map<RealFunction, Integer> functions = new EnumMap<>(RealFunction.class);

    private CostModel(Properties properties) {
        add = number(properties, "add");
        multiply = number(properties, "multiply");
        divide = number(properties, "divide");
        spill = number(properties, "spill");
        sincos = number(properties, OperationCount.SINCOS);
        for (RealFunction function : RealFunction.values()) {
            functions.put(function, number(properties, function.symbol()));
        }
    }

    private static int number(Properties properties, String key) {
        String value = properties.getProperty(key);
        if (value == null) {
            throw new IllegalStateException(RESOURCE + " has no entry '" + key + "'");
        }
        return Integer.parseInt(value);
    }

    /** The model that comes with the engine. */
    public static CostModel standard() {
        Properties properties = new Properties();
        try (InputStream stream = CostModel.class.getResourceAsStream(RESOURCE)) {
            if (stream == null) {
                throw new FileNotFoundException(RESOURCE + " is missing from the engine's class path");
            }
            properties.load(stream);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return new CostModel(properties);
    }

    /** The cost of a binary operation. */
    public int of(Operator operator) {
        return switch (operator) {
            case ADD, SUBTRACT -> add;
            case MULTIPLY -> multiply;
            case DIVIDE -> divide;
        };
    }

    /** The cost of a function. */
    public int of(RealFunction function) {
        return functions.get(function);
    }

    /** The cost of one evaluation in the order of the program; work on parameters alone costs nothing. */
    public int of(StraightLineProgram program) {
        int total = spill * Math.max(0, Schedule.pressure(program) - REGISTERS);
        for (int i = 0; i < program.size(); i++) {
            if (!program.isParameterOnly(i)) {
                total += of(program.instruction(i));
            }
        }
        return total;
    }

    /** The same where sine and cosine of an argument are computed together. */
    public int withSharedTrigonometry(StraightLineProgram program) {
        OperationCount plain = program.count();
        int calls = of(RealFunction.SIN) * plain.functions().getOrDefault(RealFunction.SIN.symbol(), 0)
                + of(RealFunction.COS) * plain.functions().getOrDefault(RealFunction.COS.symbol(), 0);
        int angles = program.countWithSharedTrigonometry().functions().getOrDefault(OperationCount.SINCOS, 0);
        return of(program) - calls + sincos * angles;
    }

    private int of(Instruction instruction) {
        if (instruction instanceof Instruction.Arithmetic arithmetic) {
            return of(arithmetic.operator());
        }
        if (instruction instanceof Instruction.MultiplyAdd) {
            return Math.max(add, multiply);
        }
        return instruction instanceof Instruction.Call call ? of(call.function()) : 0;
    }
}
