package io.github.gammawright.geometry;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;

/** The names of a definition as nodes of a new graph: coordinates, parameters, caller's functions, abbreviations. */
final class DefinitionScope {

    private final ExpressionGraph graph;
    private final ExpressionTranslator translator;
    private final List<Symbol> coordinates = new ArrayList<>();
    private final List<Symbol> parameters = new ArrayList<>();

    DefinitionScope(MetricDefinition definition, SamplePoints points) {
        graph = new ExpressionGraph(points);
        translator = new ExpressionTranslator(graph);
        for (String name : definition.coordinates()) {
            Symbol symbol = Symbol.of(Symbol.Kind.COORDINATE, name, coordinates.size());
            coordinates.add(symbol);
            translator.define(name, graph.symbol(symbol));
        }
        for (MetricDefinition.Parameter parameter : definition.parameters()) {
            Symbol symbol = Symbol.of(Symbol.Kind.PARAMETER, parameter.name(), parameters.size());
            parameters.add(symbol);
            translator.define(parameter.name(), graph.symbol(symbol));
        }
        for (int i = 0; i < definition.functions().size(); i++) {
            MetricDefinition.CallerFunction function = definition.functions().get(i);
            List<Symbol> arguments = new ArrayList<>();
            for (String of : function.of()) {
                arguments.add(coordinates.get(definition.coordinates().indexOf(of)));
            }
            translator.define(function.name(), graph.callerFunction(function.name(), i, arguments));
        }
        for (MetricDefinition.Abbreviation abbreviation : definition.abbreviations()) {
            Node value = translator.translate(abbreviation.expression());
            graph.name(value, abbreviation.name());
            translator.define(abbreviation.name(), value);
        }
    }

    ExpressionGraph graph() {
        return graph;
    }

    ExpressionTranslator translator() {
        return translator;
    }

    List<Symbol> coordinates() {
        return coordinates;
    }

    List<Symbol> parameters() {
        return parameters;
    }
}
