package io.github.gammawright.graph;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.hipparchus.fraction.BigFraction;

/**
 * Exact values of all nodes of a graph at independent random points of a prime field.
 *
 * <p>Two nodes with different values are different functions. Two nodes with equal values are equal functions but for a
 * probability of at most (d/p)^{@value #POINTS} when they are quotients of polynomials of degree d in the symbols and
 * the generators (Schwartz 1980; Zippel 1979); with p ≈ 2^61 and d below 10^4 that is under 10^−42 for each pair.
 *
 * <p>Sine and cosine of an angle are a rational point of the circle, sums and multiples of angles follow exactly.
 * Roots are taken in the group of squares, whose order q is prime, so that they are unique and multiplicative; a point
 * where a radicand is no square is drawn anew. Exponentials are powers of a fixed square, their exponents evaluated
 * modulo q (Gonnet 1984). The remaining functions take values that depend on those of their arguments alone, so that
 * relations between them are missed but never made up.
 */
final class Fingerprints {

    /** How many points are used. */
    static final int POINTS = 3;

    private static final PrimeField P = PrimeField.VALUES;
    private static final PrimeField Q = PrimeField.EXPONENTS;
    private static final long SQUARE = 4;
    private static final int ANGLE_PARTS = 12;
    private static final int REDRAWS = 3000;
    private static final BigInteger LARGEST_WINDING = BigInteger.valueOf(1_000_000);

    private final List<long[]> values = new ArrayList<>();
    private final List<Map<Integer, Long>> exponentValues = new ArrayList<>();
    private final long[] seeds = new long[POINTS];
    private final Set<Integer> opaque = new HashSet<>();
    private int redraws;

    Fingerprints() {
        for (int k = 0; k < POINTS; k++) {
            seeds[k] = 0x6A09E667F3BCC909L + 1_000_003L * k;
            exponentValues.add(new HashMap<>());
        }
    }

    /** Thrown inside when a point does not suit a node. */
    private static final class UnsuitablePoint extends RuntimeException {
        private static final long serialVersionUID = 1L;

        UnsuitablePoint() {
            super(null, null, false, false);
        }
    }

    /** The values of a node, one for each point. */
    long[] of(Node node) {
        return values.get(node.id());
    }

    /**
     * Adds the next node.
     *
     * @return whether a point had to be drawn anew, so that values kept elsewhere are out of date
     */
    boolean add(Node node, List<Node> earlier) {
        if (node.id() != values.size()) {
            throw new IllegalStateException("node " + node.id() + " added as number " + values.size());
        }
        boolean redrawn = false;
        values.add(new long[POINTS]);
        for (int k = 0; k < POINTS; k++) {
            boolean fresh = false;
            while (true) {
                try {
                    if (fresh) {
                        for (Node known : earlier) {
                            values.get(known.id())[k] = value(known, k);
                        }
                    }
                    values.get(node.id())[k] = value(node, k);
                    break;
                } catch (UnsuitablePoint e) {
                    if (!node.operands().isEmpty()
                            && node.operands().get(0) instanceof Node.Constant
                            && opaque.add(node.id())) {
                        // the root of a number: no other point would help
                        continue;
                    }
                    redraws++;
                    if (redraws > REDRAWS) {
                        // the relations of this root stay unseen from here on; nothing becomes wrong
                        opaque.add(node.id());
                    }
                    seeds[k] += 0x632BE59BD9B4E019L;
                    exponentValues.get(k).clear();
                    fresh = true;
                    redrawn = true;
                }
            }
        }
        return redrawn;
    }

    /** Forgets the last node, which turned out to equal an earlier one. */
    void removeLast() {
        int last = values.size() - 1;
        values.remove(last);
        opaque.remove(last);
        for (Map<Integer, Long> known : exponentValues) {
            known.remove(last);
        }
    }

    private long value(Node node, int k) {
        if (node instanceof Node.Constant constant) {
            return P.element(constant.value());
        }
        if (node instanceof Node.Pi) {
            return oracle(P, k, 1);
        }
        if (node instanceof Node.Leaf leaf) {
            return oracle(P, k, 2, symbolKey(leaf.symbol()));
        }
        if (node instanceof Node.Multiple multiple) {
            return P.multiply(P.element(multiple.coefficient()), at(multiple.node(), k));
        }
        if (node instanceof Node.Sum sum) {
            long total = P.element(sum.constant());
            for (int i = 0; i < sum.operands().size(); i++) {
                long term = at(sum.operands().get(i), k);
                BigFraction coefficient = sum.coefficients().get(i);
                total = P.add(
                        total, coefficient.equals(BigFraction.ONE) ? term : P.multiply(P.element(coefficient), term));
            }
            return total;
        }
        if (node instanceof Node.Product product) {
            long total = 1;
            for (Node factor : product.operands()) {
                total = P.multiply(total, at(factor, k));
            }
            return total;
        }
        if (node instanceof Node.Power power) {
            return power(power, k);
        }
        if (node instanceof Node.ParameterPower power) {
            long base = at(power.base(), k);
            if (opaque.contains(power.id())) {
                return oracle(P, k, 10, base, exponentValue(power.exponent(), k));
            }
            requireSquare(base);
            return P.power(base, exponentValue(power.exponent(), k));
        }
        return call((Node.Call) node, k);
    }

    private long power(Node.Power power, int k) {
        long base = at(power.base(), k);
        BigInteger numerator = power.exponent().getNumerator();
        BigInteger denominator = power.exponent().getDenominator();
        if (denominator.equals(BigInteger.ONE)) {
            if (numerator.signum() < 0 && base == 0) {
                if (opaque.contains(power.id())) {
                    return oracle(P, k, 3, numerator.longValue(), base);
                }
                throw new UnsuitablePoint();
            }
            long e = numerator.mod(BigInteger.valueOf(P.prime() - 1)).longValueExact();
            if (numerator.equals(BigInteger.ONE.negate())) {
                return P.inverse(base);
            }
            return P.power(base, e);
        }
        if (opaque.contains(power.id())) {
            long root = oracle(P, k, 3, denominator.longValue(), base);
            return P.power(
                    root, numerator.mod(BigInteger.valueOf(P.prime() - 1)).longValueExact());
        }
        requireSquare(base);
        if (numerator.signum() < 0 && base == 0) {
            throw new UnsuitablePoint();
        }
        BigInteger q = BigInteger.valueOf(Q.prime());
        long e = numerator.multiply(denominator.modInverse(q)).mod(q).longValueExact();
        return P.power(base, e);
    }

    private long call(Node.Call call, int k) {
        Node x = call.operands().get(0);
        return switch (call.function()) {
            case SIN -> angle(x, k)[1];
            case COS -> angle(x, k)[0];
            case EXP -> P.power(SQUARE, exponentValue(x, k));
            case SINH, COSH, TANH -> hyperbolic(call.function(), exponentValue(x, k));
            case ABS -> P.isSquare(at(x, k)) ? at(x, k) : P.negate(at(x, k));
            case SIGNUM -> at(x, k) == 0 ? 0 : P.isSquare(at(x, k)) ? 1 : P.negate(1);
            default -> {
                long[] key = new long[2 + call.operands().size()];
                key[0] = 4;
                key[1] = textKey(call.function().symbol());
                for (int i = 0; i < call.operands().size(); i++) {
                    key[2 + i] = at(call.operands().get(i), k);
                }
                yield oracle(P, k, key);
            }
        };
    }

    private static long hyperbolic(RealFunction function, long exponent) {
        long up = P.power(SQUARE, exponent);
        long down = P.inverse(up);
        long half = P.inverse(2);
        long sinh = P.multiply(half, P.subtract(up, down));
        long cosh = P.multiply(half, P.add(up, down));
        if (function == RealFunction.SINH) {
            return sinh;
        }
        if (function == RealFunction.COSH) {
            return cosh;
        }
        if (cosh == 0) {
            throw new UnsuitablePoint();
        }
        return P.multiply(sinh, P.inverse(cosh));
    }

    /** Cosine and sine of an angle, which is taken apart into rational multiples of nodes. */
    private long[] angle(Node angle, int k) {
        long cos = 1;
        long sin = 0;
        List<Node> nodes = new ArrayList<>();
        List<BigFraction> coefficients = new ArrayList<>();
        BigFraction constant = BigFraction.ZERO;
        if (angle instanceof Node.Sum sum) {
            nodes.addAll(sum.operands());
            coefficients.addAll(sum.coefficients());
            constant = sum.constant();
        } else if (angle instanceof Node.Multiple multiple && multiple.node() instanceof Node.Sum sum) {
            for (int i = 0; i < sum.operands().size(); i++) {
                nodes.add(sum.operands().get(i));
                coefficients.add(sum.coefficients().get(i).multiply(multiple.coefficient()));
            }
            constant = sum.constant().multiply(multiple.coefficient());
        } else if (angle instanceof Node.Multiple multiple) {
            nodes.add(multiple.node());
            coefficients.add(multiple.coefficient());
        } else if (angle instanceof Node.Constant number) {
            constant = number.value();
        } else {
            nodes.add(angle);
            coefficients.add(BigFraction.ONE);
        }
        for (int i = 0; i <= nodes.size(); i++) {
            BigFraction coefficient = i < nodes.size() ? coefficients.get(i) : constant;
            if (coefficient.signum() == 0) {
                continue;
            }
            long key = i < nodes.size() ? at(nodes.get(i), k) : 1;
            BigInteger parts = BigInteger.valueOf(ANGLE_PARTS);
            BigFraction winding = coefficient.multiply(parts);
            if (!winding.getDenominator().equals(BigInteger.ONE)
                    || winding.getNumerator().abs().compareTo(LARGEST_WINDING) > 0) {
                parts = coefficient.getDenominator();
                winding = coefficient.multiply(parts);
            }
            long t = oracle(P, k, 5, key, parts.longValue());
            long t2 = P.multiply(t, t);
            // −1 is no square, so that the denominator never vanishes
            long scale = P.inverse(P.add(1, t2));
            long c = P.multiply(P.subtract(1, t2), scale);
            long s = P.multiply(P.add(t, t), scale);
            BigInteger turns = winding.getNumerator();
            if (turns.signum() < 0) {
                s = P.negate(s);
                turns = turns.negate();
            }
            long pc = 1;
            long ps = 0;
            for (int bit = turns.bitLength() - 1; bit >= 0; bit--) {
                long c2 = P.subtract(P.multiply(pc, pc), P.multiply(ps, ps));
                long s2 = P.multiply(P.add(pc, pc), ps);
                pc = c2;
                ps = s2;
                if (turns.testBit(bit)) {
                    long c3 = P.subtract(P.multiply(pc, c), P.multiply(ps, s));
                    ps = P.add(P.multiply(pc, s), P.multiply(ps, c));
                    pc = c3;
                }
            }
            long sum = P.subtract(P.multiply(cos, pc), P.multiply(sin, ps));
            sin = P.add(P.multiply(cos, ps), P.multiply(sin, pc));
            cos = sum;
        }
        return new long[] {cos, sin};
    }

    /** The value of an exponent modulo q, on values of the symbols of its own. */
    private long exponentValue(Node node, int k) {
        Long known = exponentValues.get(k).get(node.id());
        if (known != null) {
            return known;
        }
        long value = computeExponentValue(node, k);
        exponentValues.get(k).put(node.id(), value);
        return value;
    }

    private long computeExponentValue(Node node, int k) {
        if (node instanceof Node.Constant constant) {
            return Q.element(constant.value());
        }
        if (node instanceof Node.Pi) {
            return oracle(Q, k, 6);
        }
        if (node instanceof Node.Leaf leaf) {
            return oracle(Q, k, 7, symbolKey(leaf.symbol()));
        }
        if (node instanceof Node.Multiple multiple) {
            return Q.multiply(Q.element(multiple.coefficient()), exponentValue(multiple.node(), k));
        }
        if (node instanceof Node.Sum sum) {
            long total = Q.element(sum.constant());
            for (int i = 0; i < sum.operands().size(); i++) {
                total = Q.add(
                        total,
                        Q.multiply(
                                Q.element(sum.coefficients().get(i)),
                                exponentValue(sum.operands().get(i), k)));
            }
            return total;
        }
        if (node instanceof Node.Product product) {
            long total = 1;
            for (Node factor : product.operands()) {
                total = Q.multiply(total, exponentValue(factor, k));
            }
            return total;
        }
        if (node instanceof Node.Power power) {
            long base = exponentValue(power.base(), k);
            BigInteger denominator = power.exponent().getDenominator();
            if (!denominator.equals(BigInteger.ONE)) {
                base = oracle(Q, k, 8, denominator.longValue(), base);
            }
            if (base == 0) {
                throw new UnsuitablePoint();
            }
            BigInteger order = BigInteger.valueOf(Q.prime() - 1);
            return Q.power(base, power.exponent().getNumerator().mod(order).longValueExact());
        }
        List<Node> operands = node.operands();
        long[] key = new long[2 + operands.size()];
        key[0] = 9;
        key[1] = node instanceof Node.Call call ? textKey(call.function().symbol()) : -1;
        for (int i = 0; i < operands.size(); i++) {
            key[2 + i] = exponentValue(operands.get(i), k);
        }
        return oracle(Q, k, key);
    }

    private long at(Node node, int k) {
        return values.get(node.id())[k];
    }

    private static void requireSquare(long value) {
        if (!P.isSquare(value)) {
            throw new UnsuitablePoint();
        }
    }

    /** A number that depends on the letters of a name alone. */
    private static long textKey(String text) {
        return text.hashCode();
    }

    private static long symbolKey(Symbol symbol) {
        // the same bits in every virtual machine, unlike the hash code of an enum constant
        long key = textKey(symbol.kind().name()) * 1_000_003L + symbol.index();
        for (int order : symbol.orders()) {
            key = key * 31 + order + 1;
        }
        return key;
    }

    private long oracle(PrimeField field, int k, long... key) {
        long state = seeds[k];
        for (long part : key) {
            state = PrimeField.VALUES.scramble(state ^ Long.rotateLeft(part, 23)) * 0x9E3779B97F4A7C15L + part;
        }
        return field.scramble(state);
    }
}
