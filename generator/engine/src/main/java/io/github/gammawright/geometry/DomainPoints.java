package io.github.gammawright.geometry;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;

/** Points of a definition's sample box that meet its conditions, the same in every run. */
public final class DomainPoints implements SamplePoints {

    private static final int FEW = 6;
    private static final int DRAWS = 20000;

    private final List<Map<Symbol, Double>> points;
    private final SamplePoints others;

    private DomainPoints(List<Map<Symbol, Double>> points) {
        this.points = points;
        this.others = SamplePoints.arbitrary(points.size());
    }

    /** A few points of the domain; arbitrary ones if none is found. */
    static SamplePoints draw(MetricDefinition definition) {
        return draw(definition, FEW);
    }

    /** So many points of the domain; arbitrary ones if none is found. */
    public static SamplePoints draw(MetricDefinition definition, int wanted) {
        DefinitionScope scope = new DefinitionScope(definition, SamplePoints.arbitrary(1));
        DomainProgram domain = DomainProgram.of(definition, scope);
        SplittableRandom random = new SplittableRandom(20_260_101L);
        List<Map<Symbol, Double>> points = new ArrayList<>();
        for (int draw = 0; draw < DRAWS && points.size() < wanted; draw++) {
            Map<Symbol, Double> point = new HashMap<>();
            for (Symbol parameter : scope.parameters()) {
                point.put(parameter, parameter(definition, parameter, random));
            }
            for (Symbol coordinate : scope.coordinates()) {
                MetricDefinition.Range range =
                        definition.domain().sample().getOrDefault(coordinate.name(), new MetricDefinition.Range(-1, 1));
                point.put(coordinate, draw(range, random));
            }
            SamplePoints fallback = SamplePoints.arbitrary(DRAWS);
            int number = draw;
            if (domain.contains(symbol -> point.getOrDefault(symbol, fallback.value(symbol, number)))) {
                points.add(point);
            }
        }
        return points.isEmpty() ? SamplePoints.arbitrary(3) : new DomainPoints(points);
    }

    private static double parameter(MetricDefinition definition, Symbol parameter, SplittableRandom random) {
        MetricDefinition.Range range = definition.domain().sample().get(parameter.name());
        if (range != null) {
            return draw(range, random);
        }
        return definition
                .parameters()
                .get(parameter.index())
                .defaultExpression()
                .map(expression -> {
                    ExpressionGraph graph = new ExpressionGraph();
                    Node value = new ExpressionTranslator(graph).translate(expression);
                    return graph.realValues(value)[0];
                })
                .orElseGet(() -> 0.5 + random.nextDouble());
    }

    private static double draw(MetricDefinition.Range range, SplittableRandom random) {
        return range.from() + random.nextDouble() * (range.to() - range.from());
    }

    @Override
    public int count() {
        return points.size();
    }

    @Override
    public double value(Symbol symbol, int point) {
        Double value = points.get(point).get(symbol);
        if (value != null) {
            return value;
        }
        double other = others.value(symbol, point);
        // the entries of vectors take both signs
        return symbol.kind() == Symbol.Kind.CALLER_FUNCTION ? other : 2 * (other - 1);
    }
}
