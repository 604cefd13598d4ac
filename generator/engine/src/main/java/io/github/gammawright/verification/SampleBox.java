package io.github.gammawright.verification;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricDefinition.Range;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The box from which points are drawn: parameters with a range and all coordinates vary, parameters without one keep
 * their default.
 */
final class SampleBox {

    private static final Range UNIT = new Range(-1, 1);

    private final List<Range> ranges = new ArrayList<>();
    private final List<String> missing = new ArrayList<>();
    private final int parameters;

    SampleBox(ReferenceEvaluator evaluator) {
        MetricDefinition definition = evaluator.definition();
        parameters = definition.parameters().size();
        List<OptionalDouble> defaults = evaluator.defaultParameters();
        for (int i = 0; i < parameters; i++) {
            String name = definition.parameters().get(i).name();
            Range range = definition.domain().sample().get(name);
            if (range != null) {
                ranges.add(range);
            } else if (defaults.get(i).isPresent()) {
                double value = defaults.get(i).getAsDouble();
                ranges.add(new Range(value, value));
            } else {
                missing.add(name);
                ranges.add(new Range(Double.NaN, Double.NaN));
            }
        }
        for (String coordinate : definition.coordinates()) {
            ranges.add(definition.domain().sample().getOrDefault(coordinate, UNIT));
        }
    }

    /** The parameters that have neither a default nor a range. */
    List<String> missing() {
        return missing;
    }

    /** How many numbers make a point: the parameters, then the coordinates. */
    int dimension() {
        return ranges.size();
    }

    /** The range of a coordinate. */
    Range coordinate(int index) {
        return ranges.get(parameters + index);
    }

    /** The parameters at a point of the unit cube. */
    double[] parameters(double[] unit) {
        return scaled(unit, 0, parameters);
    }

    /** The coordinates at a point of the unit cube. */
    double[] coordinates(double[] unit) {
        return scaled(unit, parameters, ranges.size());
    }

    private double[] scaled(double[] unit, int from, int to) {
        double[] values = new double[to - from];
        for (int i = from; i < to; i++) {
            Range range = ranges.get(i);
            // So written that neither a huge range overflows nor rounding leaves the range.
            double value = range.from() * (1 - unit[i]) + range.to() * unit[i];
            values[i - from] = Math.min(Math.max(value, range.from()), range.to());
        }
        return values;
    }
}
