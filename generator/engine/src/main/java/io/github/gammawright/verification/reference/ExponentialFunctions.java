package io.github.gammawright.verification.reference;

import java.math.BigInteger;

/**
 * The exponential function, the logarithm, and the hyperbolic functions with their inverses, to the full precision of an
 * arithmetic (relative, near zeros of the functions too). An argument outside the real domain gives an undefined number.
 */
final class ExponentialFunctions {

    /** Arguments beyond 2 to this power overflow. */
    private static final int LARGEST_ARGUMENT = 44;

    private final RealArithmetic arithmetic;
    private final RealArithmetic wider;

    ExponentialFunctions(RealArithmetic arithmetic) {
        this.arithmetic = arithmetic;
        this.wider = arithmetic.widened(80);
    }

    Real exp(Real x) {
        return exp(x, arithmetic);
    }

    /** e^x in the precision of the given arithmetic. */
    private static Real exp(Real x, RealArithmetic precision) {
        if (x.isUndefined()) {
            return x;
        }
        if (x.magnitude() > LARGEST_ARGUMENT) {
            return x.signum() > 0 ? Real.UNDEFINED : Real.ZERO;
        }
        int bits = precision.bits();
        if (x.isZero() || x.magnitude() < -bits - 8) {
            return precision.add(Real.ONE, x);
        }
        int halvings = 4 + (int) Math.sqrt(bits) / 2;
        int fraction = bits + 2 * halvings + 16 + (int) Math.max(x.magnitude(), 0);
        BigInteger fixed = x.toFixedPoint(fraction);
        BigInteger logOfTwo = precision.constants().logOfTwo(fraction);
        BigInteger multiple = nearestMultiple(fixed, logOfTwo);
        BigInteger rest = fixed.subtract(multiple.multiply(logOfTwo)).shiftRight(halvings);
        BigInteger one = BigInteger.ONE.shiftLeft(fraction);
        BigInteger term = one;
        BigInteger sum = one;
        for (long k = 1; ; k++) {
            term = term.multiply(rest).shiftRight(fraction).divide(BigInteger.valueOf(k));
            if (term.signum() == 0) {
                break;
            }
            sum = sum.add(term);
        }
        for (int i = 0; i < halvings; i++) {
            sum = sum.multiply(sum).shiftRight(fraction);
        }
        return Real.of(sum, multiple.longValueExact() - fraction).rounded(bits);
    }

    /** The integer nearest to a / b for b &gt; 0. */
    static BigInteger nearestMultiple(BigInteger a, BigInteger b) {
        BigInteger[] division = a.shiftLeft(1).add(b).divideAndRemainder(b.shiftLeft(1));
        return division[1].signum() < 0 ? division[0].subtract(BigInteger.ONE) : division[0];
    }

    /** e^x − 1. */
    Real expm1(Real x) {
        if (x.isUndefined() || x.isZero()) {
            return x;
        }
        int bits = arithmetic.bits();
        if (x.magnitude() < -bits - 8) {
            return arithmetic.round(x);
        }
        RealArithmetic precision = arithmetic.widened((int) Math.max(-x.magnitude(), 0) + 8);
        return arithmetic.round(precision.subtract(exp(x, precision), Real.ONE));
    }

    /** ln x; undefined for x ≤ 0. */
    Real log(Real x) {
        if (x.isUndefined() || x.signum() <= 0) {
            return Real.UNDEFINED;
        }
        long twos = x.magnitude() - (x.scaled(-x.magnitude()).toDouble() < Math.sqrt(0.5) ? 1 : 0);
        Real reduced = x.scaled(-twos);
        Real logarithm = logNearOne(wider.subtract(reduced, Real.ONE));
        if (twos == 0) {
            return arithmetic.round(logarithm);
        }
        Real logOfTwo = Real.of(arithmetic.constants().logOfTwo(wider.bits() + 48), -wider.bits() - 48L);
        return arithmetic.round(wider.add(logarithm, wider.multiply(logOfTwo, twos)));
    }

    /** ln (1 + u); undefined for u ≤ −1. */
    Real log1p(Real u) {
        if (u.isUndefined() || u.isZero()) {
            return u;
        }
        boolean near = u.magnitude() <= -2;
        // Where 1 + u must be rounded, u is large enough for the 80 bits more to cover it.
        return near ? arithmetic.round(logNearOne(u)) : log(wider.add(Real.ONE, u));
    }

    /** ln (1 + u) for −0.3 ≤ u ≤ 0.42 in the wider precision. */
    private Real logNearOne(Real u) {
        if (u.magnitude() < -16) {
            return twiceArtanh(wider.divide(u, wider.add(Real.of(2), u)));
        }
        // One step from a double: ln m = y + 2 artanh((m − e^y) / (m + e^y)).
        Real start = Real.of(Math.log1p(u.toDouble()));
        Real m = wider.add(Real.ONE, u);
        Real exponential = exp(start, wider);
        Real small = wider.divide(wider.subtract(m, exponential), wider.add(m, exponential));
        return wider.add(start, twiceArtanh(small));
    }

    /** 2 (t + t³/3 + t⁵/5 + …) for small t. */
    private Real twiceArtanh(Real t) {
        Real square = wider.multiply(t, t);
        Real power = t;
        Real sum = t;
        for (long k = 3; !power.isZero() && power.magnitude() > t.magnitude() - wider.bits(); k += 2) {
            power = wider.multiply(power, square);
            sum = wider.add(sum, wider.divide(power, k));
        }
        return sum.scaled(1);
    }

    Real sinh(Real x) {
        Real e = expm1(x.abs());
        Real result = arithmetic
                .add(e, arithmetic.divide(e, arithmetic.add(e, Real.ONE)))
                .scaled(-1);
        return x.signum() < 0 ? result.negate() : result;
    }

    Real cosh(Real x) {
        Real e = exp(x.abs());
        return arithmetic.add(e, arithmetic.divide(Real.ONE, e)).scaled(-1);
    }

    Real tanh(Real x) {
        if (x.isUndefined()) {
            return x;
        }
        if (x.magnitude() > LARGEST_ARGUMENT - 2) {
            return Real.of(x.signum());
        }
        Real e = expm1(x.abs().scaled(1));
        Real result = arithmetic.divide(e, arithmetic.add(e, Real.of(2)));
        return x.signum() < 0 ? result.negate() : result;
    }

    Real asinh(Real x) {
        if (x.isUndefined() || x.isZero()) {
            return x;
        }
        Real size = x.abs();
        Real square = wider.multiply(size, size);
        Real root = wider.sqrt(wider.add(Real.ONE, square));
        Real result = log1p(wider.add(size, wider.divide(square, wider.add(Real.ONE, root))));
        return x.signum() < 0 ? result.negate() : result;
    }

    /** Undefined for x &lt; 1. */
    Real acosh(Real x) {
        if (x.isUndefined()) {
            return x;
        }
        Real beyond = wider.subtract(x, Real.ONE);
        Real root = wider.sqrt(wider.multiply(beyond, wider.add(beyond, Real.of(2))));
        return beyond.signum() < 0 ? Real.UNDEFINED : log1p(wider.add(beyond, root));
    }

    /** Undefined for |x| ≥ 1. */
    Real atanh(Real x) {
        if (x.isUndefined() || !x.abs().isLessThan(Real.ONE)) {
            return Real.UNDEFINED;
        }
        Real size = x.abs();
        Real result = log1p(wider.divide(size.scaled(1), wider.subtract(Real.ONE, size)))
                .scaled(-1);
        return x.signum() < 0 ? result.negate() : result;
    }
}
