package io.github.gammawright.algebra;

import io.github.gammawright.graph.Node;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.hipparchus.fraction.BigFraction;

/** Turns values of a graph into elements of the field of functions of their generators. */
final class Conversion {

    private final Generators generators;
    private final Set<Node> opaque;
    private final FunctionField field;
    private final Polynomials polynomials;
    private final Map<Node, Fraction> converted = new HashMap<>();

    /**
     * @param variables how many variables polynomials have, at least one for each generator
     */
    Conversion(Generators generators, Set<Node> opaque, int variables, WorkMeter meter) {
        this.generators = generators;
        this.opaque = opaque;
        this.polynomials = new Polynomials(variables, meter);
        this.field = new FunctionField(polynomials, new Factoring(polynomials));
        for (int i = 0; i < generators.size(); i++) {
            relate(i, generators.all().get(i));
        }
    }

    Generators generators() {
        return generators;
    }

    FunctionField field() {
        return field;
    }

    private void relate(int index, Generator generator) {
        if (generator instanceof Generator.Paired paired) {
            Fraction square = field.of(polynomials.variable(paired.partner(), 2));
            BigFraction sign = paired.hyperbolic() ? BigFraction.ONE : BigFraction.MINUS_ONE;
            field.relate(index, 2, field.sum(List.of(field.one(), field.scale(sign, square))));
        } else if (generator instanceof Generator.Root root) {
            field.relate(index, root.degree(), convert(root.radicand()));
        } else if (generator instanceof Generator.Absolute absolute) {
            field.relate(index, 2, field.power(convert(absolute.argument()), 2));
        }
    }

    /**
     * The element that a value is.
     *
     * @throws ArithmeticException if a denominator vanishes identically
     */
    Fraction convert(Node node) {
        // by rising number, so that operands come first without recursion
        TreeSet<Node> pending = new TreeSet<>(java.util.Comparator.comparingInt(Node::id));
        Set<Node> seen = new HashSet<>();
        List<Node> stack = new ArrayList<>(List.of(node));
        while (!stack.isEmpty()) {
            Node next = stack.remove(stack.size() - 1);
            if (!converted.containsKey(next) && seen.add(next)) {
                pending.add(next);
                if (!(next instanceof Node.Call)) {
                    stack.addAll(Generators.parts(next, opaque));
                }
            }
        }
        for (Node next : pending) {
            converted.put(next, compute(next));
        }
        return converted.get(node);
    }

    private Fraction compute(Node node) {
        int index = generators.indexOf(node);
        if (index >= 0) {
            return field.of(polynomials.variable(index, 1));
        }
        if (node instanceof Node.Constant constant) {
            return field.constant(constant.value());
        }
        if (node instanceof Node.Multiple multiple) {
            return field.scale(multiple.coefficient(), converted.get(multiple.node()));
        }
        if (node instanceof Node.Sum sum) {
            List<Fraction> terms = new ArrayList<>(List.of(field.constant(sum.constant())));
            for (int i = 0; i < sum.operands().size(); i++) {
                terms.add(field.scale(
                        sum.coefficients().get(i), converted.get(sum.operands().get(i))));
            }
            return field.sum(terms);
        }
        if (node instanceof Node.Product product) {
            Fraction total = field.one();
            for (Node factor : product.operands()) {
                total = field.multiply(total, converted.get(factor));
            }
            return total;
        }
        if (node instanceof Node.Power power) {
            return power(power);
        }
        throw new IllegalStateException("no generator for " + node.getClass().getSimpleName());
    }

    private Fraction power(Node.Power power) {
        BigInteger numerator = power.exponent().getNumerator();
        BigInteger denominator = power.exponent().getDenominator();
        if (numerator.bitLength() > 12) {
            throw new BudgetExceededException();
        }
        if (denominator.equals(BigInteger.ONE)) {
            return field.power(converted.get(power.base()), numerator.intValueExact());
        }
        int root = generators.rootOf(power.base());
        int degree = ((Generator.Root) generators.all().get(root)).degree();
        int exponent = numerator.intValueExact() * (degree / denominator.intValueExact());
        int whole = Math.floorDiv(exponent, degree);
        Fraction rest = field.of(polynomials.variable(root, Math.floorMod(exponent, degree)));
        return field.multiply(rest, field.power(converted.get(power.base()), whole));
    }
}
