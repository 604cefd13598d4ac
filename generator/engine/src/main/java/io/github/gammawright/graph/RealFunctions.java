package io.github.gammawright.graph;

/** The functions of {@link RealFunction} on doubles, the same to the last bit on every machine. */
public final class RealFunctions {

    private RealFunctions() {}

    /** The value of a function at its arguments, as many as its arity; NaN outside its domain. */
    public static double value(RealFunction function, double... x) {
        return switch (function) {
            case SQRT -> Math.sqrt(x[0]);
            case CBRT -> StrictMath.cbrt(x[0]);
            case SIN -> StrictMath.sin(x[0]);
            case COS -> StrictMath.cos(x[0]);
            case TAN -> StrictMath.tan(x[0]);
            case ASIN -> StrictMath.asin(x[0]);
            case ACOS -> StrictMath.acos(x[0]);
            case ATAN -> StrictMath.atan(x[0]);
            case ATAN2 -> StrictMath.atan2(x[0], x[1]);
            case SINH -> StrictMath.sinh(x[0]);
            case COSH -> StrictMath.cosh(x[0]);
            case TANH -> StrictMath.tanh(x[0]);
            case ASINH -> asinh(x[0]);
            case ACOSH -> acosh(x[0]);
            case ATANH -> 0.5 * StrictMath.log1p(2 * x[0] / (1 - x[0]));
            case EXP -> StrictMath.exp(x[0]);
            case LOG -> StrictMath.log(x[0]);
            case POW -> StrictMath.pow(x[0], x[1]);
            case ABS -> Math.abs(x[0]);
            case SIGNUM -> Math.signum(x[0]);
        };
    }

    private static double asinh(double x) {
        double a = Math.abs(x);
        if (a > 0x1p28) {
            return Math.copySign(StrictMath.log(a) + StrictMath.log(2), x);
        }
        double a2 = a * a;
        return Math.copySign(StrictMath.log1p(a + a2 / (1 + Math.sqrt(1 + a2))), x);
    }

    private static double acosh(double x) {
        if (x > 0x1p28) {
            return StrictMath.log(x) + StrictMath.log(2);
        }
        double y = x - 1;
        return StrictMath.log1p(y + Math.sqrt(y * (y + 2)));
    }
}
