package io.github.gammawright.algebra;

import edu.jas.arith.BigInteger;
import edu.jas.poly.ExpVector;
import edu.jas.poly.GenPolynomial;
import edu.jas.ufd.FactorFactory;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * Factors of polynomials. What is linear or quadratic in one of its variables is settled by contents and a
 * discriminant; only the rest goes to the general algorithm, and only where its cost is bounded. What is not settled
 * stays whole, which is never wrong.
 */
final class Factoring {

    /** Factorisation by evaluation and lifting tries combinations of factors; beyond this it may not end. */
    private static final int GENERAL_TERMS = 60;

    private static final long GENERAL_DEGREE_PRODUCT = 400;

    private final Polynomials polynomials;
    private final List<GenPolynomial<BigInteger>> known = new ArrayList<>();
    private final Map<GenPolynomial<BigInteger>, List<GenPolynomial<BigInteger>>> settled = new HashMap<>();

    Factoring(Polynomials polynomials) {
        this.polynomials = polynomials;
    }

    /** Remembers a polynomial as a likely factor of others. */
    void remember(GenPolynomial<BigInteger> factor) {
        if (!factor.isConstant() && factor.length() > 1 && !known.contains(factor)) {
            known.add(factor);
        }
    }

    /**
     * Factors of a polynomial other than zero, each of content 1 with a positive leading coefficient, with their
     * multiplicities; what is missing is an integer, which may be negative.
     */
    SortedMap<GenPolynomial<BigInteger>, Integer> factors(GenPolynomial<BigInteger> polynomial) {
        SortedMap<GenPolynomial<BigInteger>, Integer> factors = new TreeMap<>();
        GenPolynomial<BigInteger> rest = normal(polynomial);
        ExpVector monomial = polynomials.monomialContent(rest);
        for (int i = 0; i < monomial.length(); i++) {
            if (monomial.getVal(i) > 0) {
                factors.merge(polynomials.variable(i, 1), (int) monomial.getVal(i), Integer::sum);
            }
        }
        rest = polynomials.divideByMonomial(rest, monomial);
        for (GenPolynomial<BigInteger> candidate : known) {
            while (!rest.isONE()) {
                Optional<GenPolynomial<BigInteger>> quotient = polynomials.quotient(rest, candidate);
                if (quotient.isEmpty()) {
                    break;
                }
                factors.merge(candidate, 1, Integer::sum);
                rest = normal(quotient.get());
            }
        }
        for (GenPolynomial<BigInteger> factor : split(rest)) {
            factors.merge(factor, 1, Integer::sum);
        }
        return factors;
    }

    /** A polynomial divided by its integer content, with a positive leading coefficient. */
    GenPolynomial<BigInteger> normal(GenPolynomial<BigInteger> polynomial) {
        return polynomials
                .divideExactly(polynomial, Polynomials.content(polynomial))
                .abs();
    }

    private List<GenPolynomial<BigInteger>> split(GenPolynomial<BigInteger> p) {
        if (p.isConstant()) {
            return List.of();
        }
        List<GenPolynomial<BigInteger>> known = settled.get(p);
        if (known == null) {
            known = splitAnew(p);
            settled.put(p, known);
        }
        return known;
    }

    private List<GenPolynomial<BigInteger>> splitAnew(GenPolynomial<BigInteger> p) {
        if (p.length() == 1) {
            return splitMonomial(p);
        }
        int variable = simplestVariable(p);
        SortedMap<Long, GenPolynomial<BigInteger>> coefficients = polynomials.coefficients(p, variable);
        GenPolynomial<BigInteger> content = polynomials.zero();
        try {
            for (GenPolynomial<BigInteger> coefficient : byLength(coefficients)) {
                content = polynomials.gcd(content, coefficient);
                if (content.isConstant()) {
                    break;
                }
            }
        } catch (BudgetExceededException e) {
            return List.of(p);
        }
        if (!content.isConstant()) {
            List<GenPolynomial<BigInteger>> factors = new ArrayList<>(split(normal(content)));
            GenPolynomial<BigInteger> rest = polynomials.quotient(p, content).orElseThrow();
            factors.addAll(split(normal(rest)));
            return factors;
        }
        return switch ((int) Polynomials.degree(p, variable)) {
            case 1 -> List.of(p);
            case 2 -> quadratic(p, variable, coefficients);
            default -> general(p);
        };
    }

    private List<GenPolynomial<BigInteger>> splitMonomial(GenPolynomial<BigInteger> p) {
        List<GenPolynomial<BigInteger>> factors = new ArrayList<>();
        ExpVector exponents = p.leadingExpVector();
        for (int i = 0; i < exponents.length(); i++) {
            for (long k = 0; k < exponents.getVal(i); k++) {
                factors.add(polynomials.variable(i, 1));
            }
        }
        return factors;
    }

    private static List<GenPolynomial<BigInteger>> byLength(SortedMap<Long, GenPolynomial<BigInteger>> coefficients) {
        List<GenPolynomial<BigInteger>> sorted = new ArrayList<>(coefficients.values());
        sorted.sort(java.util.Comparator.comparingInt(GenPolynomial::length));
        return sorted;
    }

    /** A variable of the lowest degree, and among these of the shortest leading coefficient. */
    private int simplestVariable(GenPolynomial<BigInteger> p) {
        int best = -1;
        long bestDegree = 0;
        int bestLength = 0;
        ExpVector degrees = p.degreeVector();
        for (int i = 0; i < degrees.length(); i++) {
            long degree = degrees.getVal(i);
            if (degree == 0 || (best >= 0 && degree > bestDegree)) {
                continue;
            }
            SortedMap<Long, GenPolynomial<BigInteger>> coefficients = polynomials.coefficients(p, i);
            int length = coefficients.get(coefficients.lastKey()).length();
            if (best < 0 || degree < bestDegree || length < bestLength) {
                best = i;
                bestDegree = degree;
                bestLength = length;
            }
        }
        return best;
    }

    /** A v² + B v + C of content 1 has factors just when B² − 4AC is a square. */
    private List<GenPolynomial<BigInteger>> quadratic(
            GenPolynomial<BigInteger> p, int variable, SortedMap<Long, GenPolynomial<BigInteger>> coefficients) {
        GenPolynomial<BigInteger> a = coefficients.get(2L);
        GenPolynomial<BigInteger> b = coefficients.getOrDefault(1L, polynomials.zero());
        GenPolynomial<BigInteger> c = coefficients.getOrDefault(0L, polynomials.zero());
        try {
            GenPolynomial<BigInteger> fourfold =
                    polynomials.scale(polynomials.multiply(a, c), java.math.BigInteger.valueOf(-4));
            GenPolynomial<BigInteger> discriminant = polynomials.add(polynomials.multiply(b, b), fourfold);
            Optional<GenPolynomial<BigInteger>> root = polynomials.squareRoot(discriminant);
            if (root.isEmpty()) {
                return List.of(p);
            }
            // p divides (2Av + B − D)(2Av + B + D) = 4A p, so that each factor of p is found by a divisor in common
            GenPolynomial<BigInteger> twice = polynomials.multiply(
                    polynomials.scale(a, java.math.BigInteger.TWO), polynomials.variable(variable, 1));
            GenPolynomial<BigInteger> first = normal(polynomials.add(polynomials.add(twice, b), root.get()));
            GenPolynomial<BigInteger> factor = normal(withoutContent(first, variable));
            Optional<GenPolynomial<BigInteger>> other = polynomials.quotient(p, factor);
            return other.isEmpty() ? List.of(p) : List.of(factor, normal(other.get()));
        } catch (BudgetExceededException e) {
            return List.of(p);
        }
    }

    private GenPolynomial<BigInteger> withoutContent(GenPolynomial<BigInteger> p, int variable) {
        GenPolynomial<BigInteger> content = polynomials.zero();
        for (GenPolynomial<BigInteger> coefficient : byLength(polynomials.coefficients(p, variable))) {
            content = polynomials.gcd(content, coefficient);
        }
        return polynomials.quotient(p, content).orElseThrow();
    }

    private List<GenPolynomial<BigInteger>> general(GenPolynomial<BigInteger> p) {
        long product = 1;
        ExpVector degrees = p.degreeVector();
        for (int i = 0; i < degrees.length(); i++) {
            product *= degrees.getVal(i) + 1;
            if (product > GENERAL_DEGREE_PRODUCT) {
                return List.of(p);
            }
        }
        if (p.length() > GENERAL_TERMS) {
            return List.of(p);
        }
        polynomials.meter().spend(product * p.length());
        SortedMap<GenPolynomial<BigInteger>, Long> found =
                FactorFactory.getImplementation(BigInteger.ONE).factors(p);
        List<GenPolynomial<BigInteger>> factors = new ArrayList<>();
        GenPolynomial<BigInteger> product2 = polynomials.one();
        for (Map.Entry<GenPolynomial<BigInteger>, Long> factor : found.entrySet()) {
            for (long k = 0; k < factor.getValue(); k++) {
                product2 = polynomials.multiply(product2, factor.getKey());
                if (!factor.getKey().isConstant()) {
                    factors.add(normal(factor.getKey()));
                }
            }
        }
        return product2.equals(p) ? factors : List.of(p);
    }
}
