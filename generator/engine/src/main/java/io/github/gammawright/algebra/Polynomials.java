package io.github.gammawright.algebra;

import edu.jas.arith.BigInteger;
import edu.jas.kern.ComputerThreads;
import edu.jas.poly.ExpVector;
import edu.jas.poly.GenPolynomial;
import edu.jas.poly.GenPolynomialRing;
import edu.jas.poly.TermOrder;
import edu.jas.ufd.GCDFactory;
import edu.jas.ufd.GreatestCommonDivisorAbstract;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * Polynomials with integer coefficients in a fixed number of variables, over JAS, each operation counted against the
 * budget of the request in hand.
 */
final class Polynomials {

    static {
        // no pool of threads that would keep the virtual machine alive
        ComputerThreads.NO_THREADS = true;
    }

    private final GenPolynomialRing<BigInteger> ring;
    private final GreatestCommonDivisorAbstract<BigInteger> divisors = GCDFactory.getImplementation(BigInteger.ONE);
    private WorkMeter meter;

    Polynomials(int variables, WorkMeter meter) {
        String[] names = new String[variables];
        for (int i = 0; i < variables; i++) {
            names[i] = "v" + (variables - 1 - i);
        }
        this.ring = new GenPolynomialRing<>(BigInteger.ONE, names, new TermOrder(TermOrder.INVLEX));
        this.meter = meter;
    }

    /** Starts a new request. */
    void meter(WorkMeter newMeter) {
        this.meter = newMeter;
    }

    WorkMeter meter() {
        return meter;
    }

    int variables() {
        return ring.nvar;
    }

    /** A fresh 0, to which terms may be put. */
    GenPolynomial<BigInteger> zero() {
        return new GenPolynomial<>(ring);
    }

    GenPolynomial<BigInteger> one() {
        return ring.getONE();
    }

    GenPolynomial<BigInteger> constant(java.math.BigInteger value) {
        return new GenPolynomial<>(ring, new BigInteger(value));
    }

    /** variable^exponent. */
    GenPolynomial<BigInteger> variable(int index, int exponent) {
        return new GenPolynomial<>(ring, BigInteger.ONE, ExpVector.create(ring.nvar, index, exponent));
    }

    GenPolynomial<BigInteger> monomial(ExpVector exponents) {
        return new GenPolynomial<>(ring, BigInteger.ONE, exponents);
    }

    GenPolynomial<BigInteger> add(GenPolynomial<BigInteger> a, GenPolynomial<BigInteger> b) {
        meter.spend(a.length() + b.length());
        return meter.check(a.sum(b));
    }

    GenPolynomial<BigInteger> scale(GenPolynomial<BigInteger> a, java.math.BigInteger factor) {
        if (factor.equals(java.math.BigInteger.ONE)) {
            return a;
        }
        meter.spend(a.length());
        return meter.check(a.multiply(new BigInteger(factor)));
    }

    GenPolynomial<BigInteger> multiply(GenPolynomial<BigInteger> a, GenPolynomial<BigInteger> b) {
        if (a.isONE()) {
            return b;
        }
        if (b.isONE()) {
            return a;
        }
        meter.spend((long) a.length() * b.length());
        return meter.check(a.multiply(b));
    }

    GenPolynomial<BigInteger> power(GenPolynomial<BigInteger> base, long exponent) {
        if (exponent * base.totalDegree() > meter.budget().degree()) {
            throw new BudgetExceededException();
        }
        GenPolynomial<BigInteger> result = one();
        for (long i = 0; i < exponent; i++) {
            result = multiply(result, base);
        }
        return result;
    }

    /** p / divisor where that is a polynomial with integer coefficients. */
    Optional<GenPolynomial<BigInteger>> quotient(GenPolynomial<BigInteger> p, GenPolynomial<BigInteger> divisor) {
        if (divisor.isONE()) {
            return Optional.of(p);
        }
        if (p.isZERO()) {
            return Optional.of(p);
        }
        if (!p.degreeVector().multipleOf(divisor.degreeVector())) {
            return Optional.empty();
        }
        ExpVector leading = divisor.leadingExpVector();
        java.math.BigInteger leadingCoefficient = divisor.leadingBaseCoefficient().val;
        ExpVector trailing = divisor.trailingExpVector();
        java.math.BigInteger trailingCoefficient = divisor.coefficient(divisor.trailingExpVector()).val;
        if (!p.trailingExpVector().multipleOf(trailing)
                || p.coefficient(p.trailingExpVector())
                                .val
                                .mod(trailingCoefficient.abs())
                                .signum()
                        != 0) {
            return Optional.empty();
        }
        SortedMap<ExpVector, BigInteger> rest = new TreeMap<>(p.getMap());
        GenPolynomial<BigInteger> quotient = new GenPolynomial<>(ring);
        meter.spend(p.length());
        while (!rest.isEmpty()) {
            ExpVector top = rest.firstKey();
            java.math.BigInteger coefficient = rest.get(top).val;
            if (!top.multipleOf(leading)) {
                return Optional.empty();
            }
            java.math.BigInteger[] division = coefficient.divideAndRemainder(leadingCoefficient);
            if (division[1].signum() != 0) {
                return Optional.empty();
            }
            ExpVector shift = top.subtract(leading);
            meter.spend(divisor.length());
            for (Map.Entry<ExpVector, BigInteger> term : divisor.getMap().entrySet()) {
                java.math.BigInteger product = term.getValue().val.multiply(division[0]);
                rest.merge(
                        term.getKey().sum(shift),
                        new BigInteger(product.negate()),
                        (x, y) -> x.sum(y).isZERO() ? null : x.sum(y));
            }
            quotient.doPutToMap(shift, new BigInteger(division[0]));
            if (quotient.length() > meter.budget().terms()) {
                throw new BudgetExceededException();
            }
        }
        return Optional.of(quotient);
    }

    /** The positive greatest common divisor of the coefficients; 1 for zero. */
    static java.math.BigInteger content(GenPolynomial<BigInteger> p) {
        java.math.BigInteger content = java.math.BigInteger.ZERO;
        for (BigInteger coefficient : p.getMap().values()) {
            content = content.gcd(coefficient.val);
            if (content.equals(java.math.BigInteger.ONE)) {
                break;
            }
        }
        return content.signum() == 0 ? java.math.BigInteger.ONE : content;
    }

    /** p divided by a number that divides all its coefficients. */
    GenPolynomial<BigInteger> divideExactly(GenPolynomial<BigInteger> p, java.math.BigInteger number) {
        return number.equals(java.math.BigInteger.ONE) ? p : p.divide(new BigInteger(number));
    }

    /** The largest monomial that divides a polynomial other than zero. */
    ExpVector monomialContent(GenPolynomial<BigInteger> p) {
        ExpVector content = null;
        for (ExpVector exponents : p.getMap().keySet()) {
            content = content == null ? exponents : content.gcd(exponents);
        }
        return content;
    }

    GenPolynomial<BigInteger> divideByMonomial(GenPolynomial<BigInteger> p, ExpVector monomial) {
        if (monomial.isZERO()) {
            return p;
        }
        GenPolynomial<BigInteger> quotient = new GenPolynomial<>(ring);
        for (Map.Entry<ExpVector, BigInteger> term : p.getMap().entrySet()) {
            quotient.doPutToMap(term.getKey().subtract(monomial), term.getValue());
        }
        return quotient;
    }

    /** The coefficients of the powers of a variable, by rising exponent. */
    SortedMap<Long, GenPolynomial<BigInteger>> coefficients(GenPolynomial<BigInteger> p, int variable) {
        SortedMap<Long, GenPolynomial<BigInteger>> parts = new TreeMap<>();
        meter.spend(p.length());
        for (Map.Entry<ExpVector, BigInteger> term : p.getMap().entrySet()) {
            long exponent = term.getKey().getVal(variable);
            parts.computeIfAbsent(exponent, e -> new GenPolynomial<>(ring))
                    .doPutToMap(term.getKey().subst(variable, 0), term.getValue());
        }
        return parts;
    }

    static long degree(GenPolynomial<BigInteger> p, int variable) {
        long degree = 0;
        for (ExpVector exponents : p.getMap().keySet()) {
            degree = Math.max(degree, exponents.getVal(variable));
        }
        return degree;
    }

    static boolean contains(GenPolynomial<BigInteger> p, int variable) {
        return degree(p, variable) > 0;
    }

    /** p with variable^degree replaced by another polynomial, as often as possible. */
    GenPolynomial<BigInteger> replacePower(
            GenPolynomial<BigInteger> p, int variable, int degree, GenPolynomial<BigInteger> by) {
        if (degree(p, variable) < degree) {
            return p;
        }
        GenPolynomial<BigInteger> result = zero();
        GenPolynomial<BigInteger> power = one();
        long reached = 0;
        for (Map.Entry<Long, GenPolynomial<BigInteger>> part :
                coefficients(p, variable).entrySet()) {
            while (reached < part.getKey() / degree) {
                power = multiply(power, by);
                reached++;
            }
            GenPolynomial<BigInteger> rest =
                    multiply(part.getValue(), variable(variable, (int) (part.getKey() % degree)));
            result = add(result, multiply(rest, power));
        }
        return result;
    }

    /** The greatest common divisor, positive, of integer content 1. */
    GenPolynomial<BigInteger> gcd(GenPolynomial<BigInteger> a, GenPolynomial<BigInteger> b) {
        if (a.isZERO()) {
            return b;
        }
        if (b.isZERO()) {
            return a;
        }
        if (a.length() == 1 || b.length() == 1) {
            return monomial(monomialContent(a).gcd(monomialContent(b)));
        }
        meter.spend(gcdWork(a, b));
        GenPolynomial<BigInteger> gcd = divisors.gcd(a, b);
        return divideExactly(gcd, content(gcd)).abs();
    }

    /** An upper estimate of the work in a modular gcd: images at all points below the degrees. */
    private static long gcdWork(GenPolynomial<BigInteger> a, GenPolynomial<BigInteger> b) {
        ExpVector common = a.degreeVector().gcd(b.degreeVector());
        long work = (long) a.length() + b.length();
        for (int i = 0; i < common.length(); i++) {
            work = Math.multiplyExact(work, common.getVal(i) + 1);
            if (work > Integer.MAX_VALUE) {
                return work;
            }
        }
        return work;
    }

    /** The polynomial whose square is p, with a positive leading coefficient, if there is one. */
    Optional<GenPolynomial<BigInteger>> squareRoot(GenPolynomial<BigInteger> p) {
        if (p.isZERO()) {
            return Optional.of(p);
        }
        Optional<GenPolynomial<BigInteger>> first = rootOfTerm(p.leadingExpVector(), p.leadingBaseCoefficient().val);
        if (first.isEmpty()
                || rootOfTerm(p.trailingExpVector(), p.coefficient(p.trailingExpVector()).val)
                        .isEmpty()) {
            return Optional.empty();
        }
        GenPolynomial<BigInteger> root = first.get();
        ExpVector leading = root.leadingExpVector();
        java.math.BigInteger twice = root.leadingBaseCoefficient().val.shiftLeft(1);
        while (true) {
            meter.spend((long) root.length() * root.length());
            GenPolynomial<BigInteger> rest = p.subtract(root.multiply(root));
            if (rest.isZERO()) {
                return Optional.of(root);
            }
            ExpVector top = rest.leadingExpVector();
            java.math.BigInteger[] division = rest.leadingBaseCoefficient().val.divideAndRemainder(twice);
            if (!top.multipleOf(leading) || division[1].signum() != 0 || root.length() > p.length()) {
                return Optional.empty();
            }
            ExpVector next = top.subtract(leading);
            if (next.compareTo(root.trailingExpVector()) == 0 || root.getMap().containsKey(next)) {
                return Optional.empty();
            }
            root = root.sum(new BigInteger(division[0]), next);
        }
    }

    private Optional<GenPolynomial<BigInteger>> rootOfTerm(ExpVector exponents, java.math.BigInteger coefficient) {
        if (coefficient.signum() < 0) {
            return Optional.empty();
        }
        java.math.BigInteger[] root = coefficient.sqrtAndRemainder();
        if (root[1].signum() != 0) {
            return Optional.empty();
        }
        ExpVector half = ExpVector.create(exponents.length());
        for (int i = 0; i < exponents.length(); i++) {
            if (exponents.getVal(i) % 2 != 0) {
                return Optional.empty();
            }
            half = half.subst(i, exponents.getVal(i) / 2);
        }
        return Optional.of(new GenPolynomial<>(ring, new BigInteger(root[0]), half));
    }
}
