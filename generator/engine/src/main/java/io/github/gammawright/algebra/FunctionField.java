package io.github.gammawright.algebra;

import edu.jas.arith.BigInteger;
import edu.jas.poly.ExpVector;
import edu.jas.poly.GenPolynomial;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.hipparchus.fraction.BigFraction;

/**
 * Arithmetic with quotients of polynomials in generators some of which satisfy relations g^n = R. Denominators are kept
 * as products of atoms, polynomials that were found irreducible when they first came up as a denominator, so that a
 * common denominator needs no greatest common divisor and cancelling only exact divisions.
 */
final class FunctionField {

    private final Polynomials polynomials;
    private final Factoring factoring;
    private final List<GenPolynomial<BigInteger>> atoms = new ArrayList<>();
    private final Map<GenPolynomial<BigInteger>, Integer> atomNumbers = new HashMap<>();
    private final TreeMap<Integer, Relation> relations = new TreeMap<>(java.util.Comparator.reverseOrder());

    /** generator^degree = value, in earlier generators. */
    record Relation(int degree, Fraction value) {}

    FunctionField(Polynomials polynomials, Factoring factoring) {
        this.polynomials = polynomials;
        this.factoring = factoring;
    }

    Polynomials polynomials() {
        return polynomials;
    }

    Factoring factoring() {
        return factoring;
    }

    /** Adds the relation of a generator; those of earlier generators come first. */
    void relate(int generator, int degree, Fraction value) {
        relations.put(generator, new Relation(degree, value));
    }

    /** The relation of a generator, if it has one. */
    Optional<Relation> relationOf(int generator) {
        return Optional.ofNullable(relations.get(generator));
    }

    /** The polynomial that a number in a denominator stands for. */
    GenPolynomial<BigInteger> atom(int number) {
        return atoms.get(number);
    }

    Fraction zero() {
        return new Fraction(BigFraction.ZERO, polynomials.one(), new TreeMap<>());
    }

    Fraction one() {
        return constant(BigFraction.ONE);
    }

    Fraction constant(BigFraction value) {
        return new Fraction(value, polynomials.one(), new TreeMap<>());
    }

    /** A polynomial as an element of the field. */
    Fraction of(GenPolynomial<BigInteger> polynomial) {
        return reduce(fraction(BigFraction.ONE, polynomial, new TreeMap<>()));
    }

    private Fraction fraction(
            BigFraction coefficient, GenPolynomial<BigInteger> numerator, SortedMap<Integer, Integer> denominator) {
        if (numerator.isZERO() || coefficient.signum() == 0) {
            return zero();
        }
        java.math.BigInteger content = Polynomials.content(numerator);
        if (numerator.signum() < 0) {
            content = content.negate();
        }
        GenPolynomial<BigInteger> primitive = polynomials.divideExactly(numerator, content);
        BigFraction scaled = coefficient.multiply(content);
        int bits = polynomials.meter().budget().bits();
        if (scaled.getNumerator().bitLength() > bits || scaled.getDenominator().bitLength() > bits) {
            throw new BudgetExceededException();
        }
        return new Fraction(scaled, primitive, denominator);
    }

    /** c · a. */
    Fraction scale(BigFraction c, Fraction a) {
        return c.signum() == 0 ? zero() : new Fraction(a.coefficient().multiply(c), a.numerator(), a.denominator());
    }

    /** The sum of elements over their least common denominator. */
    Fraction sum(List<Fraction> summands) {
        List<Fraction> terms = summands.stream().filter(f -> !f.isZero()).toList();
        if (terms.isEmpty()) {
            return zero();
        }
        if (terms.size() == 1) {
            return terms.get(0);
        }
        TreeMap<Integer, Integer> common = new TreeMap<>();
        java.math.BigInteger scale = java.math.BigInteger.ONE;
        for (Fraction term : terms) {
            term.denominator().forEach((atom, exponent) -> common.merge(atom, exponent, Math::max));
            java.math.BigInteger denominator = term.coefficient().getDenominator();
            scale = scale.multiply(denominator).divide(scale.gcd(denominator));
        }
        GenPolynomial<BigInteger> numerator = polynomials.zero();
        for (Fraction term : terms) {
            GenPolynomial<BigInteger> part = polynomials.scale(
                    term.numerator(), term.coefficient().multiply(scale).getNumerator());
            for (Map.Entry<Integer, Integer> entry : common.entrySet()) {
                int missing = entry.getValue() - term.denominator().getOrDefault(entry.getKey(), 0);
                for (int k = 0; k < missing; k++) {
                    part = polynomials.multiply(part, atoms.get(entry.getKey()));
                }
            }
            numerator = polynomials.add(numerator, part);
        }
        return cancel(reduce(fraction(new BigFraction(java.math.BigInteger.ONE, scale), numerator, common)));
    }

    Fraction multiply(Fraction a, Fraction b) {
        if (a.isZero() || b.isZero()) {
            return zero();
        }
        TreeMap<Integer, Integer> denominator = new TreeMap<>(a.denominator());
        b.denominator().forEach((atom, exponent) -> denominator.merge(atom, exponent, Integer::sum));
        GenPolynomial<BigInteger> left = cancel(a.numerator(), b.denominator(), denominator);
        GenPolynomial<BigInteger> right = cancel(b.numerator(), a.denominator(), denominator);
        BigFraction coefficient = a.coefficient().multiply(b.coefficient());
        Fraction product = fraction(coefficient, polynomials.multiply(left, right), denominator);
        return isReduced(product.numerator()) ? product : cancel(reduce(product));
    }

    /** An integer power; a negative one of zero is an {@link ArithmeticException}. */
    Fraction power(Fraction base, int exponent) {
        if (exponent == 0) {
            return one();
        }
        if (exponent < 0) {
            return power(reciprocal(base), -exponent);
        }
        if (base.isZero()) {
            return base;
        }
        long degree =
                Math.multiplyFull(exponent, Math.toIntExact(base.numerator().totalDegree()));
        if (degree > 4L * polynomials.meter().budget().degree()) {
            throw new BudgetExceededException();
        }
        Fraction result = base;
        for (int i = 1; i < exponent; i++) {
            result = multiply(result, base);
        }
        return result;
    }

    /** 1 / a; generators with a relation are moved to the numerator where they are a factor. */
    Fraction reciprocal(Fraction a) {
        if (a.isZero()) {
            throw new ArithmeticException("division by zero");
        }
        GenPolynomial<BigInteger> numerator = polynomials.one();
        for (Map.Entry<Integer, Integer> entry : a.denominator().entrySet()) {
            for (int k = 0; k < entry.getValue(); k++) {
                numerator = polynomials.multiply(numerator, atoms.get(entry.getKey()));
            }
        }
        TreeMap<Integer, Integer> denominator = new TreeMap<>();
        List<Fraction> others = new ArrayList<>();
        java.math.BigInteger unit = a.numerator().leadingBaseCoefficient().val;
        for (Map.Entry<GenPolynomial<BigInteger>, Integer> factor :
                factoring.factors(a.numerator()).entrySet()) {
            int generator = relatedGenerator(factor.getKey());
            if (generator >= 0) {
                others.add(reciprocalOfGenerator(generator, factor.getValue()));
            } else {
                denominator.put(atomNumber(factor.getKey()), factor.getValue());
                for (int k = 0; k < factor.getValue(); k++) {
                    unit = unit.divide(factor.getKey().leadingBaseCoefficient().val);
                }
            }
        }
        // the factors are primitive as their product is, so that the leading coefficients divide out to one
        if (!unit.equals(java.math.BigInteger.ONE)) {
            throw new IllegalStateException("factors miss " + unit);
        }
        Fraction result = reduce(fraction(a.coefficient().reciprocal(), numerator, denominator));
        for (Fraction other : others) {
            result = multiply(result, other);
        }
        return result;
    }

    /** The related generator that a factor is, or −1. */
    private int relatedGenerator(GenPolynomial<BigInteger> factor) {
        if (factor.length() == 1) {
            for (int generator : relations.keySet()) {
                if (factor.leadingExpVector().getVal(generator) == 1) {
                    return generator;
                }
            }
        }
        return -1;
    }

    /** g^−k = g^(nm − k) / R^m with the least m for which the exponent is not negative. */
    private Fraction reciprocalOfGenerator(int generator, int exponent) {
        Relation relation = relations.get(generator);
        int m = (exponent + relation.degree() - 1) / relation.degree();
        GenPolynomial<BigInteger> monomial = polynomials.variable(generator, m * relation.degree() - exponent);
        return multiply(of(monomial), power(relation.value(), -m));
    }

    private int atomNumber(GenPolynomial<BigInteger> atom) {
        Integer number = atomNumbers.get(atom);
        if (number == null) {
            number = atoms.size();
            atoms.add(atom);
            atomNumbers.put(atom, number);
            factoring.remember(atom);
        }
        return number;
    }

    private boolean isReduced(GenPolynomial<BigInteger> p) {
        ExpVector degrees = p.degreeVector();
        return relations.entrySet().stream()
                .allMatch(r -> degrees.getVal(r.getKey()) < r.getValue().degree());
    }

    /** Replaces powers of related generators, the latest first. */
    private Fraction reduce(Fraction a) {
        Fraction result = a;
        for (Map.Entry<Integer, Relation> entry : relations.entrySet()) {
            int degree = entry.getValue().degree();
            if (Polynomials.degree(result.numerator(), entry.getKey()) < degree) {
                continue;
            }
            Fraction value = entry.getValue().value();
            if (value.denominator().isEmpty()
                    && value.coefficient().getDenominator().equals(java.math.BigInteger.ONE)) {
                GenPolynomial<BigInteger> by = value.isZero()
                        ? polynomials.zero()
                        : polynomials.scale(
                                value.numerator(), value.coefficient().getNumerator());
                result = fraction(
                        result.coefficient(),
                        polynomials.replacePower(result.numerator(), entry.getKey(), degree, by),
                        result.denominator());
            } else {
                result = reduceByFraction(result, entry.getKey(), degree, value);
            }
        }
        return result;
    }

    private Fraction reduceByFraction(Fraction a, int generator, int degree, Fraction value) {
        List<Fraction> terms = new ArrayList<>();
        for (Map.Entry<Long, GenPolynomial<BigInteger>> part :
                polynomials.coefficients(a.numerator(), generator).entrySet()) {
            int whole = Math.toIntExact(part.getKey() / degree);
            GenPolynomial<BigInteger> rest = polynomials.multiply(
                    part.getValue(), polynomials.variable(generator, (int) (part.getKey() % degree)));
            Fraction term = fraction(a.coefficient(), rest, a.denominator());
            terms.add(whole == 0 ? term : multiply(term, power(value, whole)));
        }
        return sum(terms);
    }

    /** Cancels atoms against the numerator. */
    Fraction cancel(Fraction a) {
        if (a.denominator().isEmpty() || a.isZero()) {
            return a;
        }
        TreeMap<Integer, Integer> denominator = new TreeMap<>(a.denominator());
        GenPolynomial<BigInteger> numerator = cancel(a.numerator(), a.denominator(), denominator);
        return fraction(a.coefficient(), numerator, denominator);
    }

    private GenPolynomial<BigInteger> cancel(
            GenPolynomial<BigInteger> numerator,
            SortedMap<Integer, Integer> candidates,
            Map<Integer, Integer> denominator) {
        GenPolynomial<BigInteger> rest = numerator;
        for (Map.Entry<Integer, Integer> candidate : candidates.entrySet()) {
            for (int k = 0; k < candidate.getValue(); k++) {
                Optional<GenPolynomial<BigInteger>> quotient =
                        polynomials.quotient(rest, atoms.get(candidate.getKey()));
                if (quotient.isEmpty()) {
                    break;
                }
                rest = quotient.get();
                denominator.computeIfPresent(candidate.getKey(), (atom, e) -> e == 1 ? null : e - 1);
            }
        }
        return rest;
    }
}
