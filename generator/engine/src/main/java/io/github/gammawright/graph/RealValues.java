package io.github.gammawright.graph;

import java.util.ArrayList;
import java.util.List;

/**
 * Approximate values of all nodes at a few points of the domain. They tell apart what values in a prime field cannot:
 * the branches of roots, such as √(x²) and x.
 */
final class RealValues {

    private static final double TOLERANCE = 1e-7;

    private final SamplePoints points;
    private final List<double[]> values = new ArrayList<>();
    private final List<double[]> magnitudes = new ArrayList<>();

    RealValues(SamplePoints points) {
        this.points = points;
    }

    void add(Node node) {
        double[] value = new double[points.count()];
        double[] magnitude = new double[points.count()];
        for (int k = 0; k < value.length; k++) {
            value[k] = value(node, k);
            magnitude[k] = magnitude(node, k, value[k]);
        }
        values.add(value);
        magnitudes.add(magnitude);
    }

    void removeLast() {
        values.remove(values.size() - 1);
        magnitudes.remove(magnitudes.size() - 1);
    }

    double[] of(Node node) {
        return values.get(node.id());
    }

    /** Whether two nodes, the second times a factor, agree wherever both have values, and do so somewhere. */
    boolean agree(Node a, Node b, double factor) {
        int compared = 0;
        for (int k = 0; k < points.count(); k++) {
            double x = values.get(a.id())[k];
            double y = factor * values.get(b.id())[k];
            if (!Double.isFinite(x) || !Double.isFinite(y)) {
                continue;
            }
            double scale =
                    magnitudes.get(a.id())[k] + Math.abs(factor) * magnitudes.get(b.id())[k];
            if (Math.abs(x - y) > TOLERANCE * scale) {
                return false;
            }
            compared++;
        }
        return compared > 0;
    }

    /** Whether a node is zero wherever it has a value, and has one somewhere. */
    boolean isZero(Node a) {
        int compared = 0;
        for (int k = 0; k < points.count(); k++) {
            double x = values.get(a.id())[k];
            if (!Double.isFinite(x)) {
                continue;
            }
            if (Math.abs(x) > TOLERANCE * magnitudes.get(a.id())[k]) {
                return false;
            }
            compared++;
        }
        return compared > 0;
    }

    private double at(Node node, int k) {
        return values.get(node.id())[k];
    }

    private double magnitude(Node node, int k, double value) {
        double magnitude = Math.abs(value);
        if (node instanceof Node.Sum sum) {
            double total = Math.abs(sum.constant().doubleValue());
            for (int i = 0; i < sum.operands().size(); i++) {
                total += Math.abs(sum.coefficients().get(i).doubleValue())
                        * magnitudes.get(sum.operands().get(i).id())[k];
            }
            magnitude = Math.max(magnitude, total);
        } else if (node instanceof Node.Product product) {
            double total = 1;
            for (Node factor : product.operands()) {
                total *= magnitudes.get(factor.id())[k];
            }
            magnitude = Math.max(magnitude, total);
        }
        return magnitude;
    }

    private double value(Node node, int k) {
        if (node instanceof Node.Constant constant) {
            return constant.value().doubleValue();
        }
        if (node instanceof Node.Pi) {
            return Math.PI;
        }
        if (node instanceof Node.Leaf leaf) {
            return points.value(leaf.symbol(), k);
        }
        if (node instanceof Node.Multiple multiple) {
            return multiple.coefficient().doubleValue() * at(multiple.node(), k);
        }
        if (node instanceof Node.Sum sum) {
            double total = sum.constant().doubleValue();
            for (int i = 0; i < sum.operands().size(); i++) {
                total += sum.coefficients().get(i).doubleValue()
                        * at(sum.operands().get(i), k);
            }
            return total;
        }
        if (node instanceof Node.Product product) {
            double total = 1;
            for (Node factor : product.operands()) {
                total *= at(factor, k);
            }
            return total;
        }
        if (node instanceof Node.Power power) {
            return StrictMath.pow(at(power.base(), k), power.exponent().doubleValue());
        }
        if (node instanceof Node.ParameterPower power) {
            return StrictMath.pow(at(power.base(), k), at(power.exponent(), k));
        }
        Node.Call call = (Node.Call) node;
        double[] arguments = new double[call.operands().size()];
        for (int i = 0; i < arguments.length; i++) {
            arguments[i] = at(call.operands().get(i), k);
        }
        return RealFunctions.value(call.function(), arguments);
    }
}
