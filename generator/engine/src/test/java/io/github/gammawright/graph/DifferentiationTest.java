package io.github.gammawright.graph;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.hipparchus.analysis.differentiation.Gradient;

/** Derivatives on the graph against forward automatic differentiation by Hipparchus, a general-purpose library. */
class DifferentiationTest {

    private static final Symbol X = Symbol.of(Symbol.Kind.COORDINATE, "x", 0);
    private static final Symbol Y = Symbol.of(Symbol.Kind.COORDINATE, "y", 1);

    @Property
    void forwardAndBackwardDerivativesAreTheSameNodesAndTheLibrarysValues(@ForAll long seed) {
        ExpressionGraph graph = new ExpressionGraph();
        RandomNodes nodes = new RandomNodes(graph, seed, List.of(graph.symbol(X), graph.symbol(Y)));
        Node value = nodes.next(9);
        Differentiation differentiation = new Differentiation(graph);
        List<Node> gradient = differentiation.gradient(value, List.of(X, Y));
        List<Node> forward = List.of(differentiation.derivative(value, X), differentiation.derivative(value, Y));
        StraightLineProgram program =
                Lowering.lower(graph, List.of(value, forward.get(0), forward.get(1), gradient.get(0), gradient.get(1)));
        double[] point = {0.375, -0.8125};
        double[] values = ProgramInterpreter.run(program, symbol -> point[symbol.index()]);
        Gradient expected =
                GradientInterpreter.run(program, point)[program.outputs().get(0)];
        double scale = 1e-9 * (1 + Math.abs(expected.getValue()));
        for (int i = 0; i < 2; i++) {
            double derivative = expected.getPartialDerivative(i);
            double tolerance = scale + 1e-9 * Math.abs(derivative);
            assertThat(values[program.outputs().get(1 + i)]).isCloseTo(derivative, within(tolerance));
            assertThat(values[program.outputs().get(3 + i)]).isCloseTo(derivative, within(tolerance));
        }
    }
}
