package io.github.gammawright.verification.reference;

/** The elementary functions in the precision of one arithmetic. */
record RealFunctions(RealArithmetic arithmetic, ExponentialFunctions exponential, CircularFunctions circular) {

    RealFunctions(RealArithmetic arithmetic) {
        this(arithmetic, new ExponentialFunctions(arithmetic), new CircularFunctions(arithmetic));
    }

    /**
     * base^exponent for any real exponent: by multiplication where it is an integer; else exp(exponent · ln base), 0 for
     * base 0 and a positive exponent, undefined for a negative base.
     */
    Real power(Real base, Real exponent) {
        if (base.isUndefined() || exponent.isUndefined()) {
            return Real.UNDEFINED;
        }
        if (exponent.isInteger() && exponent.magnitude() <= 62) {
            return arithmetic.power(base, exponent.toBigInteger().longValueExact());
        }
        if (base.isZero()) {
            return exponent.signum() > 0 ? base : Real.UNDEFINED;
        }
        if (base.signum() < 0) {
            return Real.UNDEFINED;
        }
        if (exponent.scaled(1).isInteger() && exponent.magnitude() <= 16) {
            RealArithmetic wider = arithmetic.widened(32);
            long halves = exponent.scaled(1).toBigInteger().longValueExact();
            return arithmetic.round(wider.power(wider.sqrt(base), halves));
        }
        // The relative error of the result is the absolute one of the exponent: as many bits more as it has before
        // its binary point.
        RealArithmetic wider = arithmetic.widened(80);
        Real logarithm = new ExponentialFunctions(wider).log(base);
        return arithmetic.round(new ExponentialFunctions(wider).exp(wider.multiply(exponent, logarithm)));
    }
}
