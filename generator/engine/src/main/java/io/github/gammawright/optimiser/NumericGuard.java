package io.github.gammawright.optimiser;

import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.ProgramInterpreter;
import io.github.gammawright.graph.RealFunctions;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.StraightLineProgram;
import java.util.Arrays;
import java.util.function.IntPredicate;

/**
 * Measures how far the outputs of a network are from the truth at sample points of the domain, in multiples of the
 * conditioning limit, so that rewritings that cancel digits are turned down.
 */
final class NumericGuard {

    /** How far above its least error a network beyond the tolerance may go, so that rounding does not stop it. */
    private static final double SLACK = 1.2;

    private final StraightLineProgram program;
    private final SamplePoints points;
    private final ExactOutputs exact;
    private final double[][] sourceValues;
    private final double tolerance;
    private double reached;
    private double least;
    private double[][] known = new double[0][];

    /**
     * A guard over the outputs of a program.
     *
     * @param exact what its outputs are, which every program for these outputs shares
     * @param tolerance the multiple of the limit that every output may reach; a program that is worse to begin with
     *     must not become worse still
     */
    NumericGuard(StraightLineProgram program, ExactOutputs exact, SamplePoints points, double tolerance) {
        this.program = program;
        this.points = points;
        this.exact = exact;
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
        this.least = reached;
    }

    /**
     * Whether the outputs stay within the tolerance, or at least come no further from it than they were.
     *
     * @param touched whether a value is computed otherwise than at the last call that accepted
     */
    boolean accepts(Network network, IntPredicate touched) {
        if (known.length < network.size) {
            known = Arrays.copyOf(known, 2 * network.size);
        }
        double[][] fresh = new double[network.size][];
        double worst = worst(network, touched, fresh);
        if (worst > tolerance && worst > SLACK * least) {
            return false;
        }
        reached = worst;
        least = Math.min(least, worst);
        for (int v = 0; v < fresh.length; v++) {
            if (fresh[v] != null) {
                known[v] = fresh[v];
            }
        }
        return true;
    }

    /** The error of the worst output of the network that was accepted last, in multiples of the limit. */
    double reached() {
        return reached;
    }

    private double worst(Network network, IntPredicate touched, double[][] fresh) {
        double worst = 0;
        for (int o = 0; o < network.outputs.length; o++) {
            double[] value = value(network, network.outputs[o], touched, fresh);
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

    private double[] value(Network network, int v, IntPredicate touched, double[][] fresh) {
        if (fresh[v] != null) {
            return fresh[v];
        }
        if (known[v] != null && !touched.test(v)) {
            return known[v];
        }
        double[] value = new double[points.count()];
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
