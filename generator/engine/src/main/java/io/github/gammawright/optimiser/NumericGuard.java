package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.RealFunctions;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.Arrays;
import java.util.function.IntPredicate;
import java.util.stream.IntStream;

/**
 * Measures how far the outputs of a network are from the truth at some points of the domain, in multiples of the
 * conditioning limit, and weighs that against what a rewriting saves: it is accepted or turned down as in simulated
 * annealing (Metropolis, Rosenbluth, Rosenbluth, Teller &amp; Teller 1953), so that digits once lost can come back.
 */
final class NumericGuard {

    private static final double WORST = 1e15;

    private final StraightLineProgram program;
    private final int[] points;
    private final double[][] sourceValues;
    private final double tolerance;
    private final double weight;
    private final int[] distinct;
    private final double[][] high;
    private final double[][] low;
    private final double[][] limit;
    private final double[] penalties;
    private double[][] known = new double[0][];

    /**
     * A guard over the outputs of a network just made from a program.
     *
     * @param exact what its outputs are, which every program for these outputs shares
     * @param points the numbers of the points where errors are measured
     * @param tolerance the multiple of the limit up to which an error costs nothing
     * @param weight what an error e times the tolerance costs at each point, in units of the cost model
     */
    NumericGuard(Network network, ExactOutputs exact, int[] points, double tolerance, double weight) {
        this.program = network.program;
        this.points = points;
        this.sourceValues = new double[points.length][];
        this.tolerance = tolerance;
        this.weight = weight;
        this.distinct = distinct(network);
        this.high = new double[distinct.length][points.length];
        this.low = new double[distinct.length][points.length];
        this.limit = new double[distinct.length][points.length];
        this.penalties = new double[distinct.length];
        for (int k = 0; k < points.length; k++) {
            sourceValues[k] = exact.run(program, points[k]);
            for (int i = 0; i < distinct.length; i++) {
                DoubleDouble value = exact.value[distinct[i]][points[k]];
                high[i][k] = value.high();
                low[i][k] = value.low();
                limit[i][k] = exact.limit[distinct[i]][points[k]];
            }
        }
        for (int i = 0; i < distinct.length; i++) {
            double[] values = new double[points.length];
            for (int k = 0; k < points.length; k++) {
                values[k] = sourceValues[k][program.outputs().get(distinct[i])];
            }
            penalties[i] = penalty(i, values, false);
        }
    }

    /** The outputs without those that are the same value as an earlier one. */
    private static int[] distinct(Network network) {
        return IntStream.range(0, network.outputs.length)
                .filter(o -> IntStream.range(0, o).noneMatch(p -> network.outputs[p] == network.outputs[o]))
                .toArray();
    }

    /**
     * Whether a rewriting is worth its errors.
     *
     * @param touched whether a value is computed otherwise than at the last call that accepted
     * @param allowed by how much the errors may cost more than at the last call that accepted
     */
    boolean accepts(Network network, IntPredicate touched, double allowed) {
        if (known.length < network.size) {
            known = Arrays.copyOf(known, 2 * network.size);
        }
        double[][] fresh = new double[network.size][];
        double[] changed = new double[distinct.length];
        double more = 0;
        for (int i = 0; i < distinct.length; i++) {
            int v = network.outputs[distinct[i]];
            double[] values = value(network, v, touched, fresh);
            changed[i] = fresh[v] == null ? penalties[i] : penalty(i, values, network.outputMinus[distinct[i]]);
            more += changed[i] - penalties[i];
        }
        if (!(more <= allowed)) {
            return false;
        }
        System.arraycopy(changed, 0, penalties, 0, changed.length);
        for (int v = 0; v < fresh.length; v++) {
            if (fresh[v] != null) {
                known[v] = fresh[v];
            }
        }
        return true;
    }

    /** How far an error in multiples of the limit is beyond the tolerance, as a natural logarithm. */
    static double excess(double error, double tolerance) {
        return error <= tolerance ? 0 : StrictMath.log(Math.min(error / tolerance, WORST));
    }

    private double penalty(int output, double[] values, boolean minus) {
        double total = 0;
        for (int k = 0; k < points.length; k++) {
            double actual = minus ? -values[k] : values[k];
            total += excess(ExactOutputs.error(actual, high[output][k], low[output][k], limit[output][k]), tolerance);
        }
        return weight * total;
    }

    private double[] value(Network network, int v, IntPredicate touched, double[][] fresh) {
        if (fresh[v] != null) {
            return fresh[v];
        }
        if (known[v] != null && !touched.test(v)) {
            return known[v];
        }
        double[] value = new double[points.length];
        byte operation = network.operation[v];
        if (operation == Network.ATOM) {
            atom(network, v, value, touched, fresh);
        } else if (network.origin[v] >= 0 && operation == Network.FREE) {
            given(network, v, value);
        } else {
            byte kind = operation == Network.FREE ? network.freeOperation[v] : operation;
            double[] a = value(network, network.left[v], touched, fresh);
            double[] b = value(network, network.right[v], touched, fresh);
            combine(kind, network.leftMinus[v], network.rightMinus[v], a, b, value);
        }
        fresh[v] = value;
        return value;
    }

    /** The values of an instruction of the source program, which nothing can change. */
    private void given(Network network, int v, double[] value) {
        for (int k = 0; k < value.length; k++) {
            double x = sourceValues[k][network.origin[v]];
            value[k] = network.leftMinus[v] ? -x : x;
        }
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

    private void atom(Network network, int v, double[] value, IntPredicate touched, double[][] fresh) {
        Instruction instruction = program.instruction(network.origin[v]);
        if (!(instruction instanceof Instruction.Call call)) {
            given(network, v, value);
            return;
        }
        double[][] arguments = new double[network.arguments[v].length][];
        for (int i = 0; i < arguments.length; i++) {
            arguments[i] = value(network, network.arguments[v][i], touched, fresh);
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
            value[k] = network.leftMinus[v] ? -y : y;
        }
    }
}
