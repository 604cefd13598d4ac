package io.github.gammawright.verification.reference;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricForm;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A definition at one point: gives the values of quantities there, and how sensitive they are to their inputs. Values are
 * row-major over all indices of the quantity; undefined ones are reported as {@link Real#UNDEFINED}. What quantities have
 * in common is computed once; not thread-safe.
 */
public final class ReferencePoint {

    private final ReferenceEvaluator evaluator;
    private final MetricDefinition definition;
    private final double[] parameters;
    private final double[] point;
    private final Map<SeriesKey, ReferenceGeometry> geometries = new HashMap<>();

    ReferencePoint(ReferenceEvaluator evaluator, double[] parameters, double[] point) {
        this.evaluator = evaluator;
        this.definition = evaluator.definition();
        this.parameters = parameters;
        this.point = point;
    }

    private record SeriesKey(int variables, int order) {}

    /**
     * Values with the limits that no evaluation in doubles can be expected to beat.
     *
     * @param values the components, row-major
     * @param limits 2⁻⁵³ (|f| + Σ_m |x_m ∂f/∂x_m|) of each component f, m over coordinates, parameters and further inputs
     */
    public record Conditioned(List<Real> values, List<Real> limits) {}

    /**
     * The components of a quantity.
     *
     * @param inputs velocity, momentum or what else the quantity takes, as many as {@link
     *     ReferenceQuantity#inputLengths} says
     */
    public List<Real> values(ReferenceQuantity quantity, double[]... inputs) {
        requireInputs(quantity, inputs);
        int n = definition.dimension();
        int order = quantity.metricOrder();
        ReferenceGeometry geometry = geometry(n, order, false);
        List<Taylor[]> vectors = new ArrayList<>();
        for (double[] input : inputs) {
            vectors.add(constants(geometry.ring(), input));
        }
        List<Real> values = new ArrayList<>();
        for (Taylor component : components(quantity, geometry, vectors, n, false)) {
            values.add(component.value());
        }
        return List.copyOf(values);
    }

    /** What vanishes here if statements about the metric hold. */
    public ReferenceResiduals residuals() {
        return new ReferenceResiduals(plainSeries(ReferenceResiduals.order(definition.dimension())));
    }

    /** The components of a quantity with their conditioning limits, by one order more of the series. */
    public Conditioned conditioned(ReferenceQuantity quantity, double[]... inputs) {
        requireInputs(quantity, inputs);
        int n = definition.dimension();
        int firstInput = n + parameters.length;
        int variables = firstInput;
        for (double[] input : inputs) {
            variables += input.length;
        }
        ReferenceGeometry geometry = geometry(variables, quantity.metricOrder() + 1, true);
        List<Taylor[]> vectors = new ArrayList<>();
        double[] all = new double[variables];
        System.arraycopy(point, 0, all, 0, n);
        System.arraycopy(parameters, 0, all, n, parameters.length);
        int next = firstInput;
        for (double[] input : inputs) {
            vectors.add(variables(geometry.ring(), next, input));
            System.arraycopy(input, 0, all, next, input.length);
            next += input.length;
        }
        List<Real> values = new ArrayList<>();
        List<Real> limits = new ArrayList<>();
        for (Taylor component : components(quantity, geometry, vectors, variables, true)) {
            values.add(component.value());
            limits.add(limit(component, all));
        }
        return new Conditioned(List.copyOf(values), List.copyOf(limits));
    }

    private Taylor[] components(
            ReferenceQuantity quantity,
            ReferenceGeometry geometry,
            List<Taylor[]> vectors,
            int variables,
            boolean parametersVary) {
        if (!quantity.isOfFrame()) {
            return QuantityFormulas.components(quantity, geometry, vectors);
        }
        ReferenceFrame frame;
        if (definition.form() instanceof MetricForm.Coframe form) {
            Taylor[][] oneForms =
                    series(variables, geometry.order(), parametersVary).oneForms(form);
            frame = ReferenceFrame.ofCoframe(geometry, oneForms, form.signs());
        } else {
            frame = ReferenceFrame.ofDirections(geometry, evaluator.frameOrder());
        }
        return quantity == ReferenceQuantity.ORTHONORMAL_FRAME ? frame.vectors() : frame.rotationCoefficients();
    }

    private static Real limit(Taylor component, double[] variables) {
        RealArithmetic arithmetic = component.ring().arithmetic();
        Real sum = component.value().abs();
        for (int m = 0; m < variables.length; m++) {
            Real slope = component.coefficient(component.ring().basis().raised(m, 0));
            sum = arithmetic.add(
                    sum, arithmetic.multiply(Real.of(variables[m]), slope).abs());
        }
        return sum.scaled(-53);
    }

    private static void requireInputs(ReferenceQuantity quantity, int n, double[][] inputs) {
        List<Integer> lengths = quantity.inputLengths(n);
        if (inputs.length != lengths.size()) {
            throw new IllegalArgumentException(
                    quantity.symbol() + " takes " + lengths.size() + " arrays beside the point, not " + inputs.length);
        }
        for (int i = 0; i < inputs.length; i++) {
            ReferenceEvaluator.requireLength("entries in an input of " + quantity.symbol(), inputs[i], lengths.get(i));
        }
    }

    private void requireInputs(ReferenceQuantity quantity, double[][] inputs) {
        requireInputs(quantity, definition.dimension(), inputs);
    }

    private ReferenceGeometry geometry(int variables, int order, boolean parametersVary) {
        return geometries.computeIfAbsent(
                new SeriesKey(parametersVary ? variables : -1, order),
                key -> new ReferenceGeometry(
                        series(variables, order, parametersVary).metric(), 0));
    }

    /** The definition with only the coordinates as variables. */
    MetricSeries plainSeries(int order) {
        return series(definition.dimension(), order, false);
    }

    private MetricSeries series(int variables, int order, boolean parametersVary) {
        TaylorRing ring = evaluator.ring(variables, order);
        Taylor[] values =
                parametersVary ? variables(ring, definition.dimension(), parameters) : constants(ring, parameters);
        return new MetricSeries(definition, ring, variables(ring, 0, point), values);
    }

    private static Taylor[] variables(TaylorRing ring, int first, double[] values) {
        Taylor[] series = new Taylor[values.length];
        for (int i = 0; i < values.length; i++) {
            series[i] = ring.variable(first + i, Real.of(values[i]));
        }
        return series;
    }

    private static Taylor[] constants(TaylorRing ring, double[] values) {
        Taylor[] series = new Taylor[values.length];
        for (int i = 0; i < values.length; i++) {
            series[i] = ring.constant(Real.of(values[i]));
        }
        return series;
    }
}
