package io.github.gammawright.definition;

/**
 * A double with a bound on its error, to first order in the unit roundoff: running error analysis (Higham 2002, section
 * 3.3). It tells values that differ from values that only came out differently.
 *
 * @param value the computed value, NaN where there is none
 * @param error how far it may be off
 */
record Estimate(double value, double error) {

    private static final double UNIT = Math.ulp(1.0);

    static Estimate exact(double value) {
        return new Estimate(value, 0);
    }

    /** A value that was computed with the given error in what went into it, and rounded. */
    private static Estimate rounded(double value, double inherited) {
        return new Estimate(value, inherited + 2 * UNIT * Math.abs(value));
    }

    static Estimate rounded(double value) {
        return rounded(value, 0);
    }

    Estimate negated() {
        return new Estimate(-value, error);
    }

    Estimate plus(Estimate other) {
        return rounded(value + other.value, error + other.error);
    }

    Estimate times(Estimate other) {
        return rounded(value * other.value, Math.abs(value) * other.error + Math.abs(other.value) * error);
    }

    Estimate over(Estimate other) {
        double quotient = value / other.value;
        return rounded(quotient, (error + Math.abs(quotient) * other.error) / Math.abs(other.value));
    }

    Estimate toThe(Estimate exponent) {
        double power = StrictMath.pow(value, exponent.value);
        double byBase = exponent.value == 0 ? 0 : Math.abs(exponent.value * power / value) * error;
        double byExponent =
                exponent.error == 0 ? 0 : Math.abs(power * StrictMath.log(Math.abs(value))) * exponent.error;
        return rounded(power, byBase + byExponent);
    }

    static Estimate atan2(Estimate y, Estimate x) {
        double square = x.value * x.value + y.value * y.value;
        double inherited = (Math.abs(x.value) * y.error + Math.abs(y.value) * x.error) / square;
        return rounded(StrictMath.atan2(y.value, x.value), inherited);
    }

    /** A function of one argument; the error passes through its derivative. */
    Estimate through(ElementaryFunction function) {
        double x = value;
        return switch (function) {
            case SIN -> rounded(StrictMath.sin(x), error * Math.abs(StrictMath.cos(x)));
            case COS -> rounded(StrictMath.cos(x), error * Math.abs(StrictMath.sin(x)));
            case TAN -> rounded(StrictMath.tan(x), error * (1 + square(StrictMath.tan(x))));
            case ASIN -> rounded(StrictMath.asin(x), error / Math.sqrt(1 - x * x));
            case ACOS -> rounded(StrictMath.acos(x), error / Math.sqrt(1 - x * x));
            case ATAN -> rounded(StrictMath.atan(x), error / (1 + x * x));
            case SINH -> rounded(StrictMath.sinh(x), error * StrictMath.cosh(x));
            case COSH -> rounded(StrictMath.cosh(x), error * Math.abs(StrictMath.sinh(x)));
            case TANH -> rounded(StrictMath.tanh(x), error);
            case ASINH ->
                rounded(
                        Math.copySign(StrictMath.log(Math.abs(x) + Math.sqrt(x * x + 1)), x),
                        error + UNIT * (1 + Math.abs(x)));
            case ACOSH -> rounded(StrictMath.log(x + Math.sqrt(x * x - 1)), (error + UNIT * x) / Math.sqrt(x * x - 1));
            case ATANH -> rounded(StrictMath.log((1 + x) / (1 - x)) / 2, (error + UNIT) / Math.abs(1 - x * x));
            case EXP -> rounded(StrictMath.exp(x), error * StrictMath.exp(x));
            case LOG -> rounded(StrictMath.log(x), error / Math.abs(x));
            case SQRT -> rounded(Math.sqrt(x), error == 0 ? 0 : error / (2 * Math.sqrt(x)));
            case ABS -> new Estimate(Math.abs(x), error);
            case ATAN2 -> throw new IllegalArgumentException("atan2 has two arguments");
        };
    }

    private static double square(double x) {
        return x * x;
    }

    /** Whether both are numbers and they differ by far more than their errors allow. */
    boolean surelyDiffersFrom(Estimate other) {
        double apart = Math.abs(value - other.value);
        return apart > 16 * (error + other.error) && apart > 0;
    }
}
