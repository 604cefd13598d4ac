package io.github.gammawright.algebra;

import edu.jas.arith.BigInteger;
import edu.jas.poly.ExpVector;
import edu.jas.poly.GenPolynomial;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Writes polynomials so that they take few operations: common factors of terms are taken out where that saves any. */
final class Horner {

    private final Polynomials polynomials;

    Horner(Polynomials polynomials) {
        this.polynomials = polynomials;
    }

    /** A cheap way to write a polynomial other than zero. */
    Formula write(GenPolynomial<BigInteger> p) {
        if (p.length() == 1) {
            return monomial(p);
        }
        java.math.BigInteger content = Polynomials.content(p);
        if (p.signum() < 0) {
            content = content.negate();
        }
        ExpVector common = polynomials.monomialContent(p);
        Formula best = writePrimitive(polynomials.divideByMonomial(polynomials.divideExactly(p, content), common));
        if (common.isZERO() && content.equals(java.math.BigInteger.ONE)) {
            return best;
        }
        return new Formula.Product(List.of(new Formula.Monomial(content, common), best));
    }

    private Formula writePrimitive(GenPolynomial<BigInteger> p) {
        Formula best = expanded(p);
        int bestCost = Formula.cost(List.of(best));
        for (int variable = 0; variable < polynomials.variables(); variable++) {
            if (occurrences(p, variable) >= 2) {
                Formula nested = nested(p, variable);
                int cost = Formula.cost(List.of(nested));
                if (cost < bestCost) {
                    best = nested;
                    bestCost = cost;
                }
            }
        }
        return best;
    }

    private Formula nested(GenPolynomial<BigInteger> p, int first) {
        GenPolynomial<BigInteger> with = polynomials.zero();
        GenPolynomial<BigInteger> without = polynomials.zero();
        polynomials.meter().spend(p.length());
        for (Map.Entry<ExpVector, BigInteger> term : p.getMap().entrySet()) {
            (term.getKey().getVal(first) > 0 ? with : without).doPutToMap(term.getKey(), term.getValue());
        }
        List<Formula> terms = new ArrayList<>(List.of(group(with)));
        if (!without.isZERO()) {
            int next = mostFrequent(without);
            Formula rest = occurrences(without, next) < 2 ? expanded(without) : nested(without, next);
            if (rest instanceof Formula.Sum sum) {
                terms.addAll(sum.terms());
            } else {
                terms.add(rest);
            }
        }
        return terms.size() == 1 ? terms.get(0) : new Formula.Sum(List.copyOf(terms));
    }

    /** Terms with a factor in common, that factor taken out. */
    private Formula group(GenPolynomial<BigInteger> p) {
        if (p.length() == 1) {
            return monomial(p);
        }
        java.math.BigInteger content = Polynomials.content(p);
        ExpVector common = polynomials.monomialContent(p);
        GenPolynomial<BigInteger> rest = polynomials.divideByMonomial(polynomials.divideExactly(p, content), common);
        int next = mostFrequent(rest);
        Formula inner = occurrences(rest, next) < 2 ? expanded(rest) : nested(rest, next);
        return new Formula.Product(List.of(new Formula.Monomial(content, common), inner));
    }

    private int mostFrequent(GenPolynomial<BigInteger> p) {
        int best = 0;
        int most = -1;
        for (int i = 0; i < polynomials.variables(); i++) {
            int occurrences = occurrences(p, i);
            if (occurrences > most) {
                best = i;
                most = occurrences;
            }
        }
        return best;
    }

    private static int occurrences(GenPolynomial<BigInteger> p, int variable) {
        int count = 0;
        for (ExpVector exponents : p.getMap().keySet()) {
            if (exponents.getVal(variable) > 0) {
                count++;
            }
        }
        return count;
    }

    private static Formula expanded(GenPolynomial<BigInteger> p) {
        List<Formula> terms = new ArrayList<>();
        for (Map.Entry<ExpVector, BigInteger> term : p.getMap().entrySet()) {
            terms.add(new Formula.Monomial(term.getValue().val, term.getKey()));
        }
        return terms.size() == 1 ? terms.get(0) : new Formula.Sum(List.copyOf(terms));
    }

    private static Formula monomial(GenPolynomial<BigInteger> p) {
        return new Formula.Monomial(p.leadingBaseCoefficient().val, p.leadingExpVector());
    }
}
