package io.github.gammawright.algebra;

import edu.jas.poly.ExpVector;
import java.math.BigInteger;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** A polynomial written in a certain way, and so with a certain cost. */
sealed interface Formula {

    /** coefficient · Π variable^exponent. */
    record Monomial(BigInteger coefficient, ExpVector exponents) implements Formula {}

    /** A sum of at least two formulas. */
    record Sum(List<Formula> terms) implements Formula {}

    /** A product of at least two formulas. */
    record Product(List<Formula> factors) implements Formula {}

    /** How many additions and multiplications formulas take together, what is alike in them counted once. */
    static int cost(Iterable<Formula> formulas) {
        Set<Object> seen = new HashSet<>();
        int cost = 0;
        for (Formula formula : formulas) {
            cost += cost(formula, seen);
        }
        return cost;
    }

    private static int cost(Formula formula, Set<Object> seen) {
        if (!seen.add(formula)) {
            return 0;
        }
        if (formula instanceof Monomial monomial) {
            return cost(monomial, seen);
        }
        List<Formula> parts = formula instanceof Sum sum ? sum.terms() : ((Product) formula).factors();
        int cost = parts.size() - 1;
        for (Formula part : parts) {
            cost += cost(part, seen);
        }
        return cost;
    }

    private static int cost(Monomial monomial, Set<Object> seen) {
        int factors = monomial.coefficient().abs().equals(BigInteger.ONE) ? 0 : 1;
        int powers = 0;
        for (int i = 0; i < monomial.exponents().length(); i++) {
            long exponent = monomial.exponents().getVal(i);
            if (exponent > 0) {
                factors++;
                // squarings and products of the binary method, each power computed once
                for (long e = exponent; e > 1; e = e % 2 == 0 ? e / 2 : e - 1) {
                    if (seen.add(List.of(i, e))) {
                        powers++;
                    }
                }
            }
        }
        return Math.max(0, factors - 1) + powers;
    }
}
