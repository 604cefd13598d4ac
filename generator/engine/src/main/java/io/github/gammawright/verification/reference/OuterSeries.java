package io.github.gammawright.verification.reference;

import io.github.gammawright.definition.ElementaryFunction;

/**
 * The coefficients f_0, f_1, … of f(a + h) = Σ f_k h^k for the elementary functions of one argument, each by the
 * recurrence that its differential equation gives.
 */
final class OuterSeries {

    private final RealArithmetic arithmetic;
    private final RealFunctions functions;

    OuterSeries(RealFunctions functions) {
        this.arithmetic = functions.arithmetic();
        this.functions = functions;
    }

    /** The coefficients up to the given order. */
    Real[] of(ElementaryFunction function, Real a, int order) {
        ExponentialFunctions exponential = functions.exponential();
        CircularFunctions circular = functions.circular();
        return switch (function) {
            case EXP -> exponential(exponential.exp(a), order);
            case LOG -> integrated(exponential.log(a), power(polynomial(a, 0, 1), -1, order), order);
            case SQRT -> power(a, Real.of(0.5), order);
            case SIN -> {
                CircularFunctions.Pair pair = circular.sineAndCosine(a);
                yield oscillating(pair.sine(), pair.cosine(), -1, order);
            }
            case COS -> {
                CircularFunctions.Pair pair = circular.sineAndCosine(a);
                yield oscillating(pair.cosine(), pair.sine().negate(), -1, order);
            }
            case SINH -> oscillating(exponential.sinh(a), exponential.cosh(a), 1, order);
            case COSH -> oscillating(exponential.cosh(a), exponential.sinh(a), 1, order);
            case TAN -> tangent(circular.tan(a), 1, order);
            case TANH -> tangent(exponential.tanh(a), -1, order);
            case ATAN -> integrated(circular.atan(a), power(polynomial(a, 1, 1), -1, order), order);
            case ATANH -> integrated(exponential.atanh(a), power(polynomial(a, 1, -1), -1, order), order);
            case ASIN -> integrated(circular.asin(a), power(polynomial(a, 1, -1), -0.5, order), order);
            case ACOS -> integrated(circular.acos(a), negated(power(polynomial(a, 1, -1), -0.5, order)), order);
            case ASINH -> integrated(exponential.asinh(a), power(polynomial(a, 1, 1), -0.5, order), order);
            case ACOSH -> integrated(exponential.acosh(a), power(polynomial(a, -1, 1), -0.5, order), order);
            case ABS -> absolute(a, order);
            case ATAN2 -> throw new IllegalArgumentException("atan2 has two arguments");
        };
    }

    /** (a + h)^exponent: f_k = binomial(exponent, k) a^(exponent − k). */
    Real[] power(Real a, Real exponent, int order) {
        Real[] f = new Real[order + 1];
        f[0] = functions.power(a, exponent);
        Real binomial = Real.ONE;
        for (int k = 1; k <= order; k++) {
            Real factor = arithmetic.subtract(exponent, Real.of(k - 1L));
            binomial = arithmetic.divide(arithmetic.multiply(binomial, factor), k);
            if (a.isZero()) {
                // The falling factorial of a natural number ends, and with it the series.
                Real rest = arithmetic.subtract(exponent, Real.of(k));
                f[k] = binomial.isZero() ? binomial : arithmetic.multiply(binomial, functions.power(a, rest));
            } else {
                f[k] = arithmetic.divide(arithmetic.multiply(f[k - 1], factor), arithmetic.multiply(a, k));
            }
        }
        return f;
    }

    private Real[] exponential(Real value, int order) {
        Real[] f = new Real[order + 1];
        f[0] = value;
        for (int k = 1; k <= order; k++) {
            f[k] = arithmetic.divide(f[k - 1], k);
        }
        return f;
    }

    /** f″ = sign · f. */
    private Real[] oscillating(Real value, Real slope, int sign, int order) {
        Real[] f = new Real[Math.max(order, 1) + 1];
        f[0] = value;
        f[1] = slope;
        for (int k = 2; k <= order; k++) {
            f[k] = arithmetic.divide(f[k - 2], sign * (k - 1L) * k);
        }
        return f;
    }

    /** f′ = 1 + sign · f². */
    private Real[] tangent(Real value, int sign, int order) {
        Real[] f = new Real[order + 1];
        f[0] = value;
        for (int k = 0; k < order; k++) {
            Real square = Real.ZERO;
            for (int j = 0; j <= k; j++) {
                square = arithmetic.add(square, arithmetic.multiply(f[j], f[k - j]));
            }
            Real slope = sign < 0 ? square.negate() : square;
            f[k + 1] = arithmetic.divide(k == 0 ? arithmetic.add(Real.ONE, slope) : slope, k + 1L);
        }
        return f;
    }

    /** The coefficients of constant + quadratic · (a + h)²; of a + h itself when the constant is 0. */
    private Real[] polynomial(Real a, int constant, int quadratic) {
        if (constant == 0) {
            return new Real[] {a, Real.ONE, Real.ZERO};
        }
        // 1 − a² as a product, which keeps its digits near a = ±1.
        Real value = constant * quadratic > 0
                ? arithmetic.add(Real.ONE, arithmetic.multiply(a, a))
                : arithmetic.multiply(arithmetic.subtract(Real.ONE, a), arithmetic.add(Real.ONE, a));
        Real signed = constant < 0 ? value.negate() : value;
        return new Real[] {signed, arithmetic.multiply(a, 2L * quadratic), Real.of(quadratic)};
    }

    /** The power of a quadratic polynomial, by the recurrence of J. C. P. Miller (Knuth, TAOCP 2, section 4.7). */
    private Real[] power(Real[] u, double exponent, int order) {
        Real alpha = Real.of(exponent);
        Real[] v = new Real[order + 1];
        v[0] = functions.power(u[0], alpha);
        for (int k = 1; k <= order; k++) {
            Real sum = Real.ZERO;
            for (int j = 1; j <= Math.min(k, 2); j++) {
                Real weight = arithmetic.subtract(arithmetic.multiply(alpha, j), Real.of((long) k - j));
                sum = arithmetic.add(sum, arithmetic.multiply(weight, arithmetic.multiply(u[j], v[k - j])));
            }
            v[k] = arithmetic.divide(sum, arithmetic.multiply(u[0], k));
        }
        return v;
    }

    /** The coefficients of the function of the given value whose derivative has the given ones. */
    private Real[] integrated(Real value, Real[] derivative, int order) {
        Real[] f = new Real[order + 1];
        f[0] = value;
        for (int k = 1; k <= order; k++) {
            f[k] = value.isUndefined() ? value : arithmetic.divide(derivative[k - 1], k);
        }
        return f;
    }

    private static Real[] negated(Real[] f) {
        Real[] negated = new Real[f.length];
        for (int k = 0; k < f.length; k++) {
            negated[k] = f[k].negate();
        }
        return negated;
    }

    private static Real[] absolute(Real a, int order) {
        Real[] f = new Real[order + 1];
        f[0] = a.abs();
        for (int k = 1; k <= order; k++) {
            if (a.signum() == 0) {
                f[k] = Real.UNDEFINED;
            } else {
                f[k] = k == 1 ? Real.of(a.signum()) : Real.ZERO;
            }
        }
        return f;
    }
}
