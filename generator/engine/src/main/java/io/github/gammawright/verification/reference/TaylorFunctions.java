package io.github.gammawright.verification.reference;

import io.github.gammawright.definition.ElementaryFunction;

/** Powers and elementary functions of power series. */
final class TaylorFunctions {

    private TaylorFunctions() {}

    /** An elementary function of one argument. */
    static Taylor apply(ElementaryFunction function, Taylor argument) {
        OuterSeries outer = new OuterSeries(argument.ring().functions());
        return argument.composed(outer.of(function, argument.value(), argument.order()));
    }

    /** base^exponent for a constant exponent. */
    static Taylor power(Taylor base, Real exponent) {
        OuterSeries outer = new OuterSeries(base.ring().functions());
        return base.composed(outer.power(base.value(), exponent, base.order()));
    }

    /**
     * base^exponent for an exponent that is a series itself. Where the base is not positive, the power is that of the
     * exponent's value, provided that the exponent depends on no coordinate; it is then undefined unless that value is an
     * integer.
     */
    static Taylor power(Taylor base, Taylor exponent) {
        boolean fixed = exponent.isConstant();
        if (fixed || (base.value().signum() <= 0 && exponent.isFreeOfCoordinates())) {
            return power(base, exponent.value());
        }
        return apply(ElementaryFunction.EXP, exponent.times(apply(ElementaryFunction.LOG, base)));
    }

    /** The angle of (x, y), from whichever of arctan(y/x) and −arctan(x/y) is regular at the point. */
    static Taylor atan2(Taylor y, Taylor x) {
        CircularFunctions circular = y.ring().functions().circular();
        Real value = circular.atan2(y.value(), x.value());
        boolean byQuotient = y.value().abs().isAtMost(x.value().abs());
        Taylor series = byQuotient
                ? apply(ElementaryFunction.ATAN, y.dividedBy(x))
                : apply(ElementaryFunction.ATAN, x.dividedBy(y)).negate();
        return series.withValue(value);
    }
}
