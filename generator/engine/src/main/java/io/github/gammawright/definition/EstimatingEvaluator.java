package io.github.gammawright.definition;

import java.util.HashMap;
import java.util.Map;
import java.util.Random;
import java.util.function.Function;

/** Evaluates the expressions of a definition at random points, in doubles, with bounds on the errors. */
final class EstimatingEvaluator {

    private static final MetricDefinition.Range UNNAMED = new MetricDefinition.Range(-1, 1);

    private final MetricDefinition definition;
    private final Random random;
    private final Map<String, Estimate> values = new HashMap<>();

    /** The seed decides the points. */
    EstimatingEvaluator(MetricDefinition definition, long seed) {
        this.definition = definition;
        this.random = new Random(seed);
    }

    /** Goes to another point of the sample box; whether the conditions hold there. */
    boolean draw() {
        values.clear();
        for (MetricDefinition.Parameter parameter : definition.parameters()) {
            values.put(parameter.name(), Estimate.exact(parameter(parameter)));
        }
        for (String coordinate : definition.coordinates()) {
            values.put(coordinate, Estimate.exact(inRange(coordinate)));
        }
        for (MetricDefinition.CallerFunction function : definition.functions()) {
            values.put(
                    function.name(),
                    function.sample().map(this::value).orElseGet(() -> Estimate.exact(1 + random.nextDouble())));
        }
        for (MetricDefinition.Abbreviation abbreviation : definition.abbreviations()) {
            values.put(abbreviation.name(), value(abbreviation.expression()));
        }
        return definition.domain().conditions().stream().allMatch(this::holds);
    }

    /** Not the default itself, which may be special. */
    private double parameter(MetricDefinition.Parameter parameter) {
        if (definition.domain().sample().containsKey(parameter.name())
                || parameter.defaultExpression().isEmpty()) {
            return inRange(parameter.name());
        }
        double usual = ParameterDefaults.value(parameter.defaultExpression().get());
        double factor = 0.75 + 0.5 * random.nextDouble();
        return usual == 0 ? random.nextDouble() - 0.5 : usual * factor;
    }

    private double inRange(String name) {
        MetricDefinition.Range range = definition.domain().sample().getOrDefault(name, UNNAMED);
        double part = random.nextDouble();
        return range.from() * (1 - part) + range.to() * part;
    }

    private boolean holds(MetricDefinition.Condition condition) {
        for (int i = 0; i < condition.comparisons().size(); i++) {
            double left = value(condition.operands().get(i)).value();
            double right = value(condition.operands().get(i + 1)).value();
            boolean holds = switch (condition.comparisons().get(i)) {
                case LESS -> left < right;
                case LESS_OR_EQUAL -> left <= right;
                case GREATER -> left > right;
                case GREATER_OR_EQUAL -> left >= right;
            };
            if (!holds) {
                return false;
            }
        }
        return true;
    }

    /** The value at the present point. */
    Estimate value(Expression expression) {
        return value(expression, values::get);
    }

    private static Estimate value(Expression expression, Function<String, Estimate> names) {
        if (expression instanceof Expression.Number number) {
            return Estimate.rounded(CorrectRounding.toDouble(number.value()));
        }
        if (expression instanceof Expression.Name name) {
            return names.apply(name.name());
        }
        if (expression instanceof Expression.Negation negation) {
            return value(negation.operand(), names).negated();
        }
        if (expression instanceof Expression.Call call) {
            Estimate first = value(call.arguments().get(0), names);
            return call.function() == ElementaryFunction.ATAN2
                    ? Estimate.atan2(first, value(call.arguments().get(1), names))
                    : first.through(call.function());
        }
        if (expression instanceof Expression.Binary binary) {
            Estimate left = value(binary.left(), names);
            Estimate right = value(binary.right(), names);
            return switch (binary.operator()) {
                case ADD -> left.plus(right);
                case SUBTRACT -> left.plus(right.negated());
                case MULTIPLY -> left.times(right);
                case DIVIDE -> left.over(right);
                case POWER -> left.toThe(right);
            };
        }
        return Estimate.rounded(Math.PI);
    }
}
