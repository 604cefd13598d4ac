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
import java.util.Optional;
import java.util.SplittableRandom;

/**
 * Points of a definition's sample box that meet its conditions, the same in every run; the caller's functions have the
 * values of their samples there.
 */
public final class DomainPoints implements SamplePoints {

    private static final int FEW = 6;
    private static final int DRAWS = 20000;

    /** Points without an edge in any direction, after which no edges are looked for. */
    private static final int FRUITLESS = 4;

    /** So many widths of its range a coordinate is moved to find an edge. */
    private static final int FARTHEST = 4;

    private static final int BISECTIONS = 60;

    /** Powers of ten between the closest points to an edge and the farthest that count as close. */
    private static final double CLOSEST = 7.5;

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

    /**
     * Twice so many points of the domain, those with even numbers from its sample box, as many of the others as there
     * are close to edges.
     */
    public static SamplePoints guard(MetricDefinition definition, int wanted) {
        Drawing drawing = new Drawing(definition);
        List<Map<Symbol, Double>> inside = drawing.points(wanted);
        if (inside.isEmpty()) {
            return SamplePoints.arbitrary(wanted);
        }
        List<Map<Symbol, Double>> pressed = drawing.pressed(inside, wanted);
        List<Map<Symbol, Double>> points = new ArrayList<>();
        for (int i = 0; i < inside.size(); i++) {
            points.add(inside.get(i));
            if (i < pressed.size()) {
                points.add(pressed.get(i));
            }
        }
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

        /** From each point each coordinate in turn moved to just inside the edge of the domain that it meets first. */
        List<Map<Symbol, Double>> pressed(List<Map<Symbol, Double>> inside, int wanted) {
            List<Map<Symbol, Double>> pressed = new ArrayList<>();
            for (int i = 0; i < inside.size(); i++) {
                if (i == FRUITLESS && pressed.isEmpty()) {
                    break;
                }
                for (Symbol coordinate : scope.coordinates()) {
                    for (int direction = -1; direction <= 1; direction += 2) {
                        pressed(inside.get(i), coordinate, direction).ifPresent(pressed::add);
                        if (pressed.size() == wanted) {
                            return pressed;
                        }
                    }
                }
            }
            return pressed;
        }

        private Optional<Map<Symbol, Double>> pressed(Map<Symbol, Double> inside, Symbol coordinate, int direction) {
            double start = inside.get(coordinate);
            double width = range(coordinate).to() - range(coordinate).from();
            double inner = start;
            double outer = start + direction * FARTHEST * width;
            if (contains(moved(inside, coordinate, outer))) {
                return Optional.empty();
            }
            for (int step = 0; step < BISECTIONS; step++) {
                double middle = 0.5 * (inner + outer);
                if (contains(moved(inside, coordinate, middle))) {
                    inner = middle;
                } else {
                    outer = middle;
                }
            }
            double distance = Math.abs(inner - start) * StrictMath.pow(10, -1 - CLOSEST * random.nextDouble());
            Map<Symbol, Double> point = moved(inside, coordinate, inner - direction * distance);
            return contains(point) ? Optional.of(point) : Optional.empty();
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
