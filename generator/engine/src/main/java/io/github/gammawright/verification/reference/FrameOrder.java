package io.github.gammawright.verification.reference;

import io.github.gammawright.definition.MetricDefinition;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;

/**
 * In which order the coordinate directions become legs of a frame, decided at points drawn from the definition's sample
 * box, many of them close to its faces: the last direction left whose part across the legs so far has a square of one sign; failing that, a null one with
 * the last partner whose product with it has one sign. Squares and products are ratios of Gram's determinants.
 */
final class FrameOrder {

    private static final int POINTS = 256;
    private static final int DRAWS = 20_000;
    /** What is smaller than this is zero; numbers have 50 digits. */
    private static final double NOTHING = 1e-25;

    private final List<Taylor[][]> metrics = new ArrayList<>();
    private final int n;

    /** A leg, or two with a null coordinate; −1 where there is none. */
    record Step(int coordinate, int nullCoordinate) {}

    private FrameOrder(ReferenceEvaluator evaluator) {
        MetricDefinition definition = evaluator.definition();
        n = definition.dimension();
        Random random = new Random(1_917);
        for (int draw = 0; draw < DRAWS && metrics.size() < POINTS; draw++) {
            double[] parameters = new double[definition.parameters().size()];
            for (int i = 0; i < parameters.length; i++) {
                double standard = evaluator.defaultParameters().get(i).orElse(Double.NaN);
                parameters[i] = draw(definition, definition.parameters().get(i).name(), standard, random);
            }
            double[] point = new double[n];
            for (int i = 0; i < n; i++) {
                point[i] = draw(definition, definition.coordinates().get(i), Double.NaN, random);
            }
            if (evaluator.inDomain(parameters, point)) {
                metrics.add(evaluator.at(parameters, point).plainSeries(0).metric());
            }
        }
    }

    private static double draw(MetricDefinition definition, String name, double standard, Random random) {
        MetricDefinition.Range range = definition.domain().sample().get(name);
        if (range == null && !Double.isNaN(standard)) {
            return standard;
        }
        MetricDefinition.Range box = range == null ? new MetricDefinition.Range(-1, 1) : range;
        double width = box.to() - box.from();
        return switch (random.nextInt(8)) {
            case 0 -> box.from() + 0.01 * random.nextDouble() * width;
            case 1 -> box.to() - 0.01 * random.nextDouble() * width;
            default -> box.from() + random.nextDouble() * width;
        };
    }

    /** The steps; fewer than all where no order serves the whole domain. */
    static List<Step> of(ReferenceEvaluator evaluator) {
        return new FrameOrder(evaluator).steps();
    }

    private List<Step> steps() {
        List<Step> steps = new ArrayList<>();
        List<Integer> legs = new ArrayList<>();
        List<Integer> left = new ArrayList<>();
        for (int i = n - 1; i >= 0; i--) {
            left.add(i);
        }
        while (!left.isEmpty()) {
            Step step = next(legs, left);
            if (step == null) {
                break;
            }
            steps.add(step);
            for (int leg : List.of(step.coordinate, step.nullCoordinate)) {
                if (leg >= 0) {
                    legs.add(leg);
                    left.remove((Integer) leg);
                }
            }
        }
        return List.copyOf(steps);
    }

    private Step next(List<Integer> legs, List<Integer> left) {
        for (int k : left) {
            if (oneSign(legs, k, k)) {
                return new Step(k, -1);
            }
        }
        for (int k : left) {
            boolean isNull = metrics.stream().allMatch(metric -> Math.abs(product(metric, legs, k, k)) < NOTHING);
            for (int j : left) {
                if (isNull && j != k && oneSign(legs, j, k)) {
                    return new Step(j, k);
                }
            }
        }
        return null;
    }

    private boolean oneSign(List<Integer> legs, int i, int j) {
        List<Double> products = new ArrayList<>();
        for (Taylor[][] metric : metrics) {
            products.add(product(metric, legs, i, j));
        }
        return !products.isEmpty() && (Collections.min(products) > NOTHING || Collections.max(products) < -NOTHING);
    }

    /** The product of two directions across the legs. */
    private static double product(Taylor[][] metric, List<Integer> legs, int i, int j) {
        double whole = gram(metric, legs, i, j);
        return legs.isEmpty() ? whole : whole / gram(metric, legs.subList(1, legs.size()), legs.get(0), legs.get(0));
    }

    private static double gram(Taylor[][] metric, List<Integer> legs, int i, int j) {
        int size = legs.size() + 1;
        Taylor[][] gram = new Taylor[size][size];
        for (int a = 0; a < size; a++) {
            for (int b = 0; b < size; b++) {
                int row = a == 0 ? i : legs.get(a - 1);
                int column = b == 0 ? j : legs.get(b - 1);
                gram[a][b] = metric[row][column];
            }
        }
        Taylor determinant = TaylorMatrix.invert(gram, metric[0][0].ring()).determinant();
        double value = determinant.value().toDouble();
        return Double.isNaN(value) ? 0 : value;
    }
}
