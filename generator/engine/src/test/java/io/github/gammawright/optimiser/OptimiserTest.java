package io.github.gammawright.optimiser;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.LoweredProgram;
import io.github.gammawright.graph.Lowering;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.ProgramInterpreter;
import io.github.gammawright.graph.RandomNodes;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.StraightLineProgram;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;

class OptimiserTest {

    private static final Symbol X = Symbol.of(Symbol.Kind.COORDINATE, "x", 0);
    private static final Symbol Y = Symbol.of(Symbol.Kind.COORDINATE, "y", 1);
    private static final Symbol A = Symbol.of(Symbol.Kind.PARAMETER, "a", 0);
    private static final SamplePoints POINTS = SamplePoints.arbitrary(12);

    /** A step or two of work for one round; rounds are of fixed length. */
    private static final long ONE_ROUND = 1;

    @Property(tries = 25)
    void valuesStayAndTheCostDoesNotRise(@ForAll long seed) {
        ExpressionGraph graph = new ExpressionGraph();
        RandomNodes nodes = new RandomNodes(graph, seed, List.of(graph.symbol(X), graph.symbol(Y), graph.symbol(A)));
        List<Node> outputs = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            outputs.add(nodes.next(4));
        }
        LoweredProgram start = Lowering.lowerWithValues(graph, outputs);
        LoweredProgram better =
                new Optimiser(POINTS, ONE_ROUND).optimise(List.of(start)).program();
        assertThat(modelledCost(better)).isLessThanOrEqualTo(modelledCost(start));
        for (int k = 0; k < 40; k++) {
            double shift = 0.02 * k;
            double[] before = run(start.program(), shift);
            double[] after = run(better.program(), shift);
            for (int o = 0; o < outputs.size(); o++) {
                double expected = before[start.program().outputs().get(o)];
                double tolerance = 1e-9 * (1 + Math.abs(expected));
                assertThat(after[better.program().outputs().get(o)]).isCloseTo(expected, within(tolerance));
            }
        }
    }

    private static int modelledCost(LoweredProgram program) {
        return new Network(program).totalCost();
    }

    private static double[] run(StraightLineProgram program, double shift) {
        return ProgramInterpreter.run(
                program, symbol -> shift + 0.6 + 0.3 * symbol.index() + (symbol.isParameter() ? 0.1 : 0));
    }

    @Test
    void theSameProgramComesOutEveryTime() {
        List<Instruction> first = optimiseSample();
        assertThat(optimiseSample()).isEqualTo(first);
    }

    private static List<Instruction> optimiseSample() {
        ExpressionGraph graph = new ExpressionGraph();
        RandomNodes nodes = new RandomNodes(graph, 7, List.of(graph.symbol(X), graph.symbol(Y), graph.symbol(A)));
        LoweredProgram start = Lowering.lowerWithValues(graph, List.of(nodes.next(12), nodes.next(5)));
        return new Optimiser(POINTS, ONE_ROUND)
                .optimise(List.of(start))
                .program()
                .program()
                .instructions();
    }

    /** sin x and a sin x: the first is cheaper as a quotient of the second by nothing, for a may be zero. */
    @Test
    void nothingIsDividedByAParameterThatMayVanish() {
        ExpressionGraph graph = new ExpressionGraph();
        Node a = graph.symbol(A);
        Node sin = graph.call(RealFunction.SIN, graph.symbol(X));
        Node y = graph.symbol(Y);
        Node product = graph.product(List.of(a, sin, y));
        graph.keep(product);
        Node other = graph.multiply(sin, y);
        LoweredProgram start = Lowering.lowerWithValues(graph, List.of(product, graph.add(product, y), other));
        for (int seed = 0; seed < 5; seed++) {
            StraightLineProgram program = new Optimiser(POINTS, ONE_ROUND)
                    .optimise(List.of(start))
                    .program()
                    .program();
            double[] values = ProgramInterpreter.run(program, symbol -> symbol.isParameter() ? 0 : 0.75);
            for (int output : program.outputs()) {
                assertThat(values[output]).isFinite();
            }
            assertThat(program.count().divisions()).isZero();
        }
    }

    /** x² − y² next to (x − y): one operation each after the first, where the plain program takes three. */
    @Test
    void factorsAreFound() {
        ExpressionGraph graph = new ExpressionGraph();
        Node x = graph.symbol(X);
        Node y = graph.symbol(Y);
        Node difference = graph.subtract(x, y);
        Node sum = graph.add(x, y);
        Node squares = graph.subtract(
                graph.power(graph.add(x, graph.constant(1)), 2), graph.power(graph.add(y, graph.constant(1)), 2));
        Node expanded = graph.subtract(squares, graph.multiple(new org.hipparchus.fraction.BigFraction(2), difference));
        LoweredProgram start = Lowering.lowerWithValues(graph, List.of(difference, sum, expanded));
        StraightLineProgram program = new Optimiser(POINTS, ONE_ROUND)
                .optimise(List.of(start))
                .program()
                .program();
        assertThat(program.count().operations()).isEqualTo(3);
    }
}
