package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.ProgramInterpreter;
import io.github.gammawright.graph.RealFunctions;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.StraightLineProgram;

/**
 * Measures how far the outputs of a network are from the truth at sample points of the domain, in multiples of the
 * conditioning limit, so that rewritings that cancel digits are turned down.
 */
final class NumericGuard {

    private final StraightLineProgram program;
    private final SamplePoints points;
    private final ExactOutputs exact;
    private final double[][] sourceValues;
    private final double tolerance;
    private double reached;

    /**
     * A guard over the outputs of a program.
     *
     * @param tolerance the multiple of the limit that every output may reach; a program that is worse to begin with
     *     must not become worse still
     */
    NumericGuard(StraightLineProgram program, SamplePoints points, double tolerance) {
        this.program = program;
        this.points = points;
        this.exact = new ExactOutputs(program, points);
        this.sourceValues = new double[points.count()][];
        this.tolerance = tolerance;
        this.reached = 0;
        for (int k = 0; k < points.count(); k++) {
            int point = k;
            sourceValues[k] = ProgramInterpreter.run(program, symbol -> points.value(symbol, point));
            for (int o = 0; o < program.outputs().size(); o++) {
                reached = Math.max(
                        reached, error(o, k, sourceValues[k][program.outputs().get(o)]));
            }
        }
    }

    /** Whether the outputs stay within the tolerance, or at least come no further from it than they were. */
    boolean accepts(Network network) {
        double worst = worst(network);
        if (worst > tolerance && worst > reached) {
            return false;
        }
        reached = worst;
        return true;
    }

    /** The error of the worst output of the network that was accepted last, in multiples of the limit. */
    double reached() {
        return reached;
    }

    /** The error of the worst output in multiples of the limit. */
    double worst(Network network) {
        double worst = 0;
        double[][] values = values(network);
        for (int o = 0; o < network.outputs.length; o++) {
            double[] value = values[network.outputs[o]];
            for (int k = 0; k < points.count(); k++) {
                worst = Math.max(worst, error(o, k, network.outputMinus[o] ? -value[k] : value[k]));
            }
        }
        return worst;
    }

    private double error(int output, int point, double value) {
        if (!Double.isFinite(exact.limit[output][point]) || !Double.isFinite(exact.high[output][point])) {
            return 0;
        }
        double difference = Math.abs(value - exact.high[output][point] - exact.low[output][point]);
        if (difference == 0) {
            return 0;
        }
        return Double.isNaN(difference) ? Double.POSITIVE_INFINITY : difference / exact.limit[output][point];
    }

    private double[][] values(Network network) {
        double[][] values = new double[network.size][];
        for (int output : network.outputs) {
            value(network, output, values);
        }
        return values;
    }

    private double[] value(Network network, int v, double[][] values) {
        if (values[v] != null) {
            return values[v];
        }
        double[] value = new double[points.count()];
        byte operation = network.operation[v];
        if (operation == Network.ATOM) {
            atom(network, v, value, values);
        } else if (network.origin[v] >= 0 && operation == Network.FREE) {
            boolean minus = network.leftMinus[v];
            for (int k = 0; k < value.length; k++) {
                double x = sourceValues[k][network.origin[v]];
                value[k] = minus ? -x : x;
            }
        } else {
            byte kind = operation == Network.FREE ? network.freeOperation[v] : operation;
            double[] a = value(network, network.left[v], values);
            double[] b = value(network, network.right[v], values);
            combine(kind, network.leftMinus[v], network.rightMinus[v], a, b, value);
        }
        values[v] = value;
        return value;
    }

    private static void combine(byte kind, boolean minusA, boolean minusB, double[] a, double[] b, double[] value) {
        for (int k = 0; k < value.length; k++) {
            switch (kind) {
                case Network.ADD -> value[k] = (minusA ? -a[k] : a[k]) + (minusB ? -b[k] : b[k]);
                case Network.MULTIPLY -> value[k] = minusA ? -(a[k] * b[k]) : a[k] * b[k];
                default -> value[k] = minusA ? -(a[k] / b[k]) : a[k] / b[k];
            }
        }
    }

    private void atom(Network network, int v, double[] value, double[][] values) {
        boolean minus = network.leftMinus[v];
        Instruction instruction = program.instruction(network.origin[v]);
        if (!(instruction instanceof Instruction.Call call)) {
            for (int k = 0; k < value.length; k++) {
                double x = sourceValues[k][network.origin[v]];
                value[k] = minus ? -x : x;
            }
            return;
        }
        double[][] arguments = new double[network.arguments[v].length][];
        for (int i = 0; i < arguments.length; i++) {
            arguments[i] = value(network, network.arguments[v][i], values);
        }
        double[] x = new double[arguments.length];
        for (int k = 0; k < value.length; k++) {
            boolean same = true;
            for (int i = 0; i < x.length; i++) {
                int operand = call.operands().get(i);
                x[i] = network.minusOf[operand] ? -arguments[i][k] : arguments[i][k];
                same &= x[i] == sourceValues[k][operand];
            }
            double y = same ? sourceValues[k][network.origin[v]] : RealFunctions.value(call.function(), x);
            value[k] = minus ? -y : y;
        }
    }
}
