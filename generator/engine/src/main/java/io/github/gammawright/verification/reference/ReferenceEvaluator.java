package io.github.gammawright.verification.reference;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricDefinition.Comparison;
import io.github.gammawright.definition.MetricDefinition.Condition;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.concurrent.ConcurrentHashMap;

/**
 * Evaluates a definition in high precision: {@code new ReferenceEvaluator(definition, 50).at(parameters, point)} gives
 * an object from which any quantity can be asked at that point. Thread-safe.
 *
 * <p>All doubles that go in are taken as exact. Numbers are carried with at least 64 bits more than the digits asked for,
 * so that those digits hold through cancellations that lose up to about 15 of them.
 */
public final class ReferenceEvaluator {

    /** The digits that are used where nothing else is said. */
    public static final int DEFAULT_DIGITS = 50;

    private final MetricDefinition definition;
    private final int digits;
    private final RealFunctions functions;
    private List<FrameOrder.Step> frameOrder;
    private final Map<BasisKey, TaylorBasis> bases = new ConcurrentHashMap<>();

    /** An evaluator in {@value #DEFAULT_DIGITS} digits. */
    public ReferenceEvaluator(MetricDefinition definition) {
        this(definition, DEFAULT_DIGITS);
    }

    /**
     * An evaluator.
     *
     * @param digits decimal digits, from 10 to 1,000
     */
    public ReferenceEvaluator(MetricDefinition definition, int digits) {
        this(definition, digits, RealArithmetic.ofDigits(digits));
        if (digits < 10 || digits > 1000) {
            throw new IllegalArgumentException("digits must be from 10 to 1000, not " + digits);
        }
    }

    private ReferenceEvaluator(MetricDefinition definition, int digits, RealArithmetic arithmetic) {
        this.definition = definition;
        this.digits = digits;
        this.functions = new RealFunctions(arithmetic);
    }

    /**
     * An evaluator that rounds every operation to the 53 bits of a double, as a plain program would: no reference, but a
     * measure of the rounding noise that such a program leaves where a value is zero.
     */
    public static ReferenceEvaluator inDoublePrecision(MetricDefinition definition) {
        return new ReferenceEvaluator(definition, 16, new RealArithmetic(53));
    }

    /** An evaluator in so many digits more, which shows by comparison what of a small number is rounding. */
    public ReferenceEvaluator finer(int moreDigits) {
        return new ReferenceEvaluator(definition, digits + moreDigits, RealArithmetic.ofDigits(digits + moreDigits));
    }

    private record BasisKey(int variables, int order) {}

    /** What is evaluated. */
    public MetricDefinition definition() {
        return definition;
    }

    /** The decimal digits that results hold. */
    public int digits() {
        return digits;
    }

    /**
     * The definition at a point.
     *
     * @param parameters one for each parameter, in declared order
     * @param point one for each coordinate, in index order
     */
    public ReferencePoint at(double[] parameters, double[] point) {
        requireLength("parameters", parameters, definition.parameters().size());
        requireLength("coordinates", point, definition.dimension());
        return new ReferencePoint(this, parameters.clone(), point.clone());
    }

    /** Whether all conditions of the definition's domain hold; a comparison with an undefined number does not. */
    public boolean inDomain(double[] parameters, double[] point) {
        return firstFailedCondition(parameters, point) < 0;
    }

    /** The number of the first condition that does not hold, −1 when all do. */
    public int firstFailedCondition(double[] parameters, double[] point) {
        MetricSeries series = at(parameters, point).plainSeries(0);
        List<Condition> conditions = definition.domain().conditions();
        for (int i = 0; i < conditions.size(); i++) {
            if (!holds(conditions.get(i), series)) {
                return i;
            }
        }
        return -1;
    }

    private static boolean holds(Condition condition, MetricSeries series) {
        List<Real> operands = new ArrayList<>();
        for (Expression operand : condition.operands()) {
            operands.add(series.scalar(operand).value());
        }
        for (int i = 0; i < condition.comparisons().size(); i++) {
            if (!holds(condition.comparisons().get(i), operands.get(i), operands.get(i + 1))) {
                return false;
            }
        }
        return true;
    }

    private static boolean holds(Comparison comparison, Real left, Real right) {
        return switch (comparison) {
            case LESS -> left.isLessThan(right);
            case LESS_OR_EQUAL -> left.isAtMost(right);
            case GREATER -> right.isLessThan(left);
            case GREATER_OR_EQUAL -> right.isAtMost(left);
        };
    }

    /** The default of each parameter, rounded once to the nearest double; empty where the definition gives none. */
    public List<OptionalDouble> defaultParameters() {
        ExpressionEvaluator evaluator = new ExpressionEvaluator(ring(1, 0), 1);
        List<OptionalDouble> defaults = new ArrayList<>();
        for (MetricDefinition.Parameter parameter : definition.parameters()) {
            defaults.add(parameter
                    .defaultExpression()
                    .map(expression -> OptionalDouble.of(
                            evaluator.scalar(expression).value().toDouble()))
                    .orElse(OptionalDouble.empty()));
        }
        return List.copyOf(defaults);
    }

    /**
     * Partial derivatives of a caller's function, from its sample.
     *
     * @param function its name
     * @param arguments one for each of its own arguments, in their order
     * @param orders for each derivative wanted, how often to differentiate by each argument; all 0 for the value
     */
    public List<Real> functionDerivatives(
            String function, double[] parameters, double[] arguments, List<List<Integer>> orders) {
        MetricDefinition.CallerFunction declared = definition.functions().stream()
                .filter(f -> f.name().equals(function))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("there is no function " + function));
        requireLength("arguments of " + function, arguments, declared.of().size());
        int order = orders.stream()
                .mapToInt(o -> o.stream().mapToInt(Integer::intValue).sum())
                .max()
                .orElse(0);
        TaylorRing ring = ring(arguments.length, order);
        ExpressionEvaluator evaluator = new ExpressionEvaluator(ring, definition.dimension());
        for (int i = 0; i < parameters.length; i++) {
            evaluator.define(definition.parameters().get(i).name(), ring.constant(Real.of(parameters[i])));
        }
        for (int i = 0; i < arguments.length; i++) {
            evaluator.define(declared.of().get(i), ring.variable(i, Real.of(arguments[i])));
        }
        Taylor series = declared.sample().map(evaluator::scalar).orElseGet(ring::undefined);
        List<Real> derivatives = new ArrayList<>();
        for (List<Integer> wanted : orders) {
            Taylor derivative = series;
            for (int i = 0; i < arguments.length; i++) {
                for (int k = 0; k < wanted.get(i); k++) {
                    derivative = derivative.derivative(i);
                }
            }
            derivatives.add(derivative.value());
        }
        return List.copyOf(derivatives);
    }

    /** The order of the legs of orthonormal frames. */
    synchronized List<FrameOrder.Step> frameOrder() {
        if (frameOrder == null) {
            frameOrder = FrameOrder.of(this);
        }
        return frameOrder;
    }

    /** Series in so many variables, the first of them the coordinates. */
    TaylorRing ring(int variables, int order) {
        TaylorBasis basis =
                bases.computeIfAbsent(new BasisKey(variables, order), key -> new TaylorBasis(key.variables, key.order));
        return new TaylorRing(functions, basis, definition.dimension());
    }

    static void requireLength(String what, double[] array, int length) {
        if (array.length != length) {
            throw new IllegalArgumentException("there must be " + length + " " + what + ", not " + array.length);
        }
    }
}
