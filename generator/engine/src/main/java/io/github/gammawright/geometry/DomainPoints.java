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

/**
 * Points of a definition's sample box that meet its conditions, the same in every run; the caller's functions have the
 * values of their samples there.
 */
public final class DomainPoints implements SamplePoints {

    private static final int FEW = 6;
    private static final int DRAWS = 20000;

    private final List<Map<Symbol, Double>> points;
    private final SamplePoints others;

    private final FunctionSamples functions;

    private DomainPoints(MetricDefinition definition, List<Map<Symbol, Double>> points) {
        this.points = points;
        this.others = SamplePoints.arbitrary(points.size());
        this.functions = new FunctionSamples(definition, this);
    }

    /** A few points of the domain; arbitrary ones if none is found. */
    static SamplePoints draw(MetricDefinition definition) {
        return draw(definition, FEW);
    }

    /** So many points of the domain; arbitrary ones if none is found. */
    public static SamplePoints draw(MetricDefinition definition, int wanted) {
        List<Map<Symbol, Double>> points = new Drawing(definition).points(wanted);
        return points.isEmpty() ? SamplePoints.arbitrary(3) : new DomainPoints(definition, points);
    }

    /** So many points of the domain, and as many again close to its edges and to those of the sample box. */
    public static SamplePoints guard(MetricDefinition definition, int wanted) {
        Drawing drawing = new Drawing(definition);
        List<Map<Symbol, Double>> points = drawing.points(wanted);
        if (points.isEmpty()) {
            return SamplePoints.arbitrary(wanted);
        }
        points.addAll(drawing.pressed(points));
        return new DomainPoints(definition, points);
    }

    /** Draws points from a definition's box. */
    private static final class Drawing {
        private final MetricDefinition definition;
        private final DefinitionScope scope;
        private final DomainProgram domain;
        private final SamplePoints fallback = SamplePoints.arbitrary(1);
        private final SplittableRandom random = new SplittableRandom(20_260_101L);

        Drawing(MetricDefinition definition) {
            this.definition = definition;
            this.scope = new DefinitionScope(definition, SamplePoints.arbitrary(1));
            this.domain = DomainProgram.of(definition, scope);
        }

        List<Map<Symbol, Double>> points(int wanted) {
            List<Map<Symbol, Double>> points = new ArrayList<>();
            for (int draw = 0; draw < DRAWS && points.size() < wanted; draw++) {
                Map<Symbol, Double> point = new HashMap<>();
                for (Symbol parameter : scope.parameters()) {
                    point.put(parameter, parameter(definition, parameter, random));
                }
                for (Symbol coordinate : scope.coordinates()) {
                    point.put(coordinate, DomainPoints.draw(range(coordinate), random));
                }
                if (contains(point)) {
                    points.add(point);
                }
            }
            return points;
        }

        /** From each point one coordinate moved to just inside the edge of the domain that it meets first. */
        List<Map<Symbol, Double>> pressed(List<Map<Symbol, Double>> inside) {
            List<Map<Symbol, Double>> pressed = new ArrayList<>();
            for (int i = 0; i < inside.size(); i++) {
                Symbol coordinate =
                        scope.coordinates().get(i % scope.coordinates().size());
                boolean up = random.nextBoolean();
                double start = inside.get(i).get(coordinate);
                double width = range(coordinate).to() - range(coordinate).from();
                double inner = start;
                double outer = up ? start + width : start - width;
                if (contains(moved(inside.get(i), coordinate, outer))) {
                    continue;
                }
                while (Math.abs(outer - inner) > 1e-12 * width) {
                    double middle = 0.5 * (inner + outer);
                    if (contains(moved(inside.get(i), coordinate, middle))) {
                        inner = middle;
                    } else {
                        outer = middle;
                    }
                }
                double distance = Math.abs(inner - start) * StrictMath.pow(10, -1 - random.nextInt(6));
                Map<Symbol, Double> point = moved(inside.get(i), coordinate, up ? inner - distance : inner + distance);
                if (contains(point)) {
                    pressed.add(point);
                }
            }
            return pressed;
        }

        private MetricDefinition.Range range(Symbol coordinate) {
            return definition.domain().sample().getOrDefault(coordinate.name(), new MetricDefinition.Range(-1, 1));
        }

        private static Map<Symbol, Double> moved(Map<Symbol, Double> point, Symbol coordinate, double to) {
            Map<Symbol, Double> moved = new HashMap<>(point);
            moved.put(coordinate, to);
            return moved;
        }

        private boolean contains(Map<Symbol, Double> point) {
            return domain.contains(symbol -> {
                Double value = point.get(symbol);
                return value != null ? value : fallback.value(symbol, 0);
            });
        }
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
        if (symbol.kind() == Symbol.Kind.CALLER_FUNCTION) {
            return functions.values(symbol).map(values -> values[point]).orElseGet(() -> others.value(symbol, point));
        }
        // the entries of vectors take both signs
        return 2 * (others.value(symbol, point) - 1);
    }
}
