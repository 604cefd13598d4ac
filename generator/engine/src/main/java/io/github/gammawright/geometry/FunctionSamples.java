package io.github.gammawright.geometry;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.Differentiation;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.Symbol;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/** Values of the caller's functions and their derivatives at points of the domain, from the samples of a definition. */
final class FunctionSamples {

    private final MetricDefinition definition;
    private final ExpressionGraph graph;
    private final ExpressionTranslator translator;
    private final Differentiation differentiation;
    private final Map<Symbol, double[]> known = new HashMap<>();

    /** Samples over points that give coordinates and parameters. */
    FunctionSamples(MetricDefinition definition, SamplePoints points) {
        this.definition = definition;
        this.graph = new ExpressionGraph(points);
        this.translator = new ExpressionTranslator(graph);
        this.differentiation = new Differentiation(graph);
        for (int i = 0; i < definition.dimension(); i++) {
            String name = definition.coordinates().get(i);
            translator.define(name, graph.symbol(coordinate(name)));
        }
        for (int i = 0; i < definition.parameters().size(); i++) {
            String name = definition.parameters().get(i).name();
            translator.define(name, graph.symbol(Symbol.of(Symbol.Kind.PARAMETER, name, i)));
        }
    }

    private Symbol coordinate(String name) {
        return Symbol.of(Symbol.Kind.COORDINATE, name, definition.coordinates().indexOf(name));
    }

    /** The values of a function or of a derivative at all points; nothing for a function without a sample. */
    Optional<double[]> values(Symbol function) {
        MetricDefinition.CallerFunction declared = definition.functions().get(function.index());
        return declared.sample().map(sample -> known.computeIfAbsent(function, f -> values(declared, f, sample)));
    }

    private double[] values(MetricDefinition.CallerFunction declared, Symbol function, Expression sample) {
        Node value = translator.translate(sample);
        for (int i = 0; i < function.orders().size(); i++) {
            for (int k = 0; k < function.orders().get(i); k++) {
                value = differentiation.derivative(
                        value, coordinate(declared.of().get(i)));
            }
        }
        return graph.realValues(value);
    }
}
