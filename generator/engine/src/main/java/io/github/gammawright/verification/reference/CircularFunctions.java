package io.github.gammawright.verification.reference;

import java.math.BigInteger;

/**
 * Sine, cosine, tangent and their inverses, to the full precision of an arithmetic (relative, near zeros of the functions
 * too). An argument outside the real domain gives an undefined number.
 */
final class CircularFunctions {

    /** Beyond 2 to this power an argument's reduction would need too many digits of π. */
    private static final int LARGEST_ARGUMENT = 1 << 16;

    /** Outside 2 to plus or minus this power the inverse tangent is an elementary limit, and doubles end. */
    private static final int RANGE_OF_START = 900;

    private final RealArithmetic arithmetic;
    private final RealArithmetic wider;

    CircularFunctions(RealArithmetic arithmetic) {
        this.arithmetic = arithmetic;
        this.wider = arithmetic.widened(80);
    }

    /** The sine and the cosine of one angle. */
    record Pair(Real sine, Real cosine) {}

    Pair sineAndCosine(Real x) {
        return sineAndCosine(x, arithmetic);
    }

    Real tan(Real x) {
        Pair pair = sineAndCosine(x);
        return arithmetic.divide(pair.sine, pair.cosine);
    }

    private static Pair sineAndCosine(Real x, RealArithmetic precision) {
        if (x.isUndefined() || x.magnitude() > LARGEST_ARGUMENT) {
            return new Pair(Real.UNDEFINED, Real.UNDEFINED);
        }
        int bits = precision.bits();
        if (x.isZero() || x.magnitude() < -bits - 8) {
            return new Pair(precision.round(x), Real.ONE);
        }
        int halvings = 4 + (int) Math.sqrt(bits) / 2;
        int fraction = bits + 2 * halvings + 16 + (int) Math.max(x.magnitude(), 0);
        BigInteger quadrant;
        BigInteger rest;
        // What is left after the reduction must keep all its bits, however close x is to a multiple of π/2.
        for (int attempt = 0; ; attempt++) {
            BigInteger fixed = x.toFixedPoint(fraction);
            BigInteger half = precision.constants().pi(fraction).shiftRight(1);
            quadrant = ExponentialFunctions.nearestMultiple(fixed, half);
            rest = fixed.subtract(quadrant.multiply(half));
            int missing = bits + 2 * halvings + 16 - rest.bitLength();
            if (missing <= 0 || attempt == 3) {
                break;
            }
            fraction += missing + 8;
        }
        Pair reduced = byDoubling(rest, fraction, halvings, bits);
        return switch (quadrant.intValue() & 3) {
            case 0 -> reduced;
            case 1 -> new Pair(reduced.cosine, reduced.sine.negate());
            case 2 -> new Pair(reduced.sine.negate(), reduced.cosine.negate());
            default -> new Pair(reduced.cosine.negate(), reduced.sine);
        };
    }

    /** Power series at angle / 2^halvings, then sin 2t = 2 sin t cos t, cos 2t = 1 − 2 sin² t. */
    private static Pair byDoubling(BigInteger angle, int fraction, int halvings, int bits) {
        BigInteger one = BigInteger.ONE.shiftLeft(fraction);
        BigInteger small = angle.shiftRight(halvings);
        BigInteger square = small.multiply(small).shiftRight(fraction).negate();
        BigInteger sine = small;
        BigInteger cosine = one;
        BigInteger sineTerm = small;
        BigInteger cosineTerm = one;
        for (long k = 1; cosineTerm.signum() != 0; k++) {
            cosineTerm =
                    cosineTerm.multiply(square).shiftRight(fraction).divide(BigInteger.valueOf((2 * k - 1) * 2 * k));
            sineTerm = sineTerm.multiply(square).shiftRight(fraction).divide(BigInteger.valueOf(2 * k * (2 * k + 1)));
            cosine = cosine.add(cosineTerm);
            sine = sine.add(sineTerm);
        }
        for (int i = 0; i < halvings; i++) {
            BigInteger product = sine.multiply(cosine).shiftRight(fraction - 1);
            cosine = one.subtract(sine.multiply(sine).shiftRight(fraction - 1));
            sine = product;
        }
        return new Pair(
                Real.of(sine, -fraction).rounded(bits),
                Real.of(cosine, -fraction).rounded(bits));
    }

    Real atan(Real x) {
        return arithmetic.round(atanWider(x));
    }

    /** One step from a double: arctan x = y + arctan((x cos y − sin y) / (cos y + x sin y)). */
    private Real atanWider(Real x) {
        if (x.isUndefined() || x.isZero() || x.magnitude() < -RANGE_OF_START) {
            return x;
        }
        if (x.magnitude() > RANGE_OF_START) {
            Real quarter = wider.pi().scaled(-1);
            Real rest = wider.divide(Real.ONE, x);
            return wider.subtract(x.signum() < 0 ? quarter.negate() : quarter, rest);
        }
        Real start = Real.of(Math.atan(x.toDouble()));
        Pair pair = sineAndCosine(start, wider);
        Real t = wider.divide(
                wider.subtract(wider.multiply(x, pair.cosine), pair.sine),
                wider.add(pair.cosine, wider.multiply(x, pair.sine)));
        Real square = wider.multiply(t, t).negate();
        Real power = t;
        Real sum = t;
        for (long k = 3; !power.isZero() && power.magnitude() > t.magnitude() - wider.bits(); k += 2) {
            power = wider.multiply(power, square);
            sum = wider.add(sum, wider.divide(power, k));
        }
        return wider.add(start, sum);
    }

    /** The angle of (x, y) in (−π, π]; undefined at the origin. */
    Real atan2(Real y, Real x) {
        if (x.isUndefined() || y.isUndefined() || (x.isZero() && y.isZero())) {
            return Real.UNDEFINED;
        }
        if (y.abs().isAtMost(x.abs())) {
            Real angle = atanWider(wider.divide(y, x));
            if (x.signum() < 0) {
                angle = y.signum() < 0 ? wider.subtract(angle, wider.pi()) : wider.add(angle, wider.pi());
            }
            return arithmetic.round(angle);
        }
        Real quarter = wider.pi().scaled(-1);
        Real angle = wider.subtract(y.signum() < 0 ? quarter.negate() : quarter, atanWider(wider.divide(x, y)));
        return arithmetic.round(angle);
    }

    /** Undefined for |x| &gt; 1. */
    Real asin(Real x) {
        return atan2(x, otherLeg(x));
    }

    /** Undefined for |x| &gt; 1. */
    Real acos(Real x) {
        return atan2(otherLeg(x), x);
    }

    /** √(1 − x²). */
    private Real otherLeg(Real x) {
        return wider.sqrt(wider.multiply(wider.subtract(Real.ONE, x), wider.add(Real.ONE, x)));
    }
}
