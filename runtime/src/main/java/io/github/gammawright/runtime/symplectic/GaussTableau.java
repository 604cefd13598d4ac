package io.github.gammawright.runtime.symplectic;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * Coefficients of the Gauss–Legendre methods (Kuntzmann 1961; Butcher 1964; Hairer, Lubich &amp; Wanner 2006, sec. II.1.3;
 * from memory). Those of the stages come as a multiple of 1/1024 and a small rest, which has its digits a thousand times
 * finer: coefficients in one double each would let energies drift.
 *
 * @param c the abscissas
 * @param a the stages' coefficients, to a multiple of 1/1024
 * @param low the rests
 * @param weights b times the divisor, whole numbers
 * @param divisor a whole number
 */
record GaussTableau(double[] c, double[][] a, double[][] low, double[] weights, double divisor) {

    private static final MathContext DIGITS = new MathContext(50);

    /** The tableau of order 4 or 6. */
    static GaussTableau ofOrder(int order) {
        return order == 4 ? fourth() : sixth();
    }

    private static GaussTableau fourth() {
        BigDecimal root = BigDecimal.valueOf(3).sqrt(DIGITS);
        BigDecimal quarter = fraction(1, 4);
        BigDecimal sixth = root.divide(BigDecimal.valueOf(6), DIGITS);
        BigDecimal[][] exact = {{quarter, quarter.subtract(sixth)}, {quarter.add(sixth), quarter}};
        double offset = sixth.doubleValue();
        return of(new double[] {0.5 - offset, 0.5 + offset}, exact, new double[] {1, 1}, 2);
    }

    private static GaussTableau sixth() {
        BigDecimal root = BigDecimal.valueOf(15).sqrt(DIGITS);
        BigDecimal outer = fraction(5, 36);
        BigDecimal inner = fraction(2, 9);
        BigDecimal by15 = root.divide(BigDecimal.valueOf(15), DIGITS);
        BigDecimal by24 = root.divide(BigDecimal.valueOf(24), DIGITS);
        BigDecimal by30 = root.divide(BigDecimal.valueOf(30), DIGITS);
        BigDecimal[][] exact = {
            {outer, inner.subtract(by15), outer.subtract(by30)},
            {outer.add(by24), inner, outer.subtract(by24)},
            {outer.add(by30), inner.add(by15), outer}
        };
        double offset = root.divide(BigDecimal.TEN, DIGITS).doubleValue();
        return of(new double[] {0.5 - offset, 0.5, 0.5 + offset}, exact, new double[] {5, 8, 5}, 18);
    }

    private static GaussTableau of(double[] c, BigDecimal[][] exact, double[] weights, double divisor) {
        int n = c.length;
        double[][] a = new double[n][n];
        double[][] low = new double[n][n];
        for (int s = 0; s < n; s++) {
            for (int q = 0; q < n; q++) {
                a[s][q] = Math.rint(exact[s][q].doubleValue() * 1024) / 1024;
                low[s][q] = exact[s][q].subtract(new BigDecimal(a[s][q])).doubleValue();
            }
        }
        return new GaussTableau(c, a, low, weights, divisor);
    }

    private static BigDecimal fraction(int numerator, int denominator) {
        return BigDecimal.valueOf(numerator).divide(BigDecimal.valueOf(denominator), DIGITS);
    }

    /**
     * Weights that give a stage of the next step, minus the state there, from the derivatives of this one: the integral
     * of the polynomial through them from 1 to 1 + c_s.
     */
    double[][] extrapolation() {
        int n = c.length;
        double[][] result = new double[n][n];
        for (int q = 0; q < n; q++) {
            double[] polynomial = {1};
            double scale = 1;
            for (int m = 0; m < n; m++) {
                if (m != q) {
                    polynomial = timesRoot(polynomial, c[m]);
                    scale *= c[q] - c[m];
                }
            }
            for (int s = 0; s < n; s++) {
                result[s][q] = (integral(polynomial, 1 + c[s]) - integral(polynomial, 1)) / scale;
            }
        }
        return result;
    }

    private static double[] timesRoot(double[] polynomial, double root) {
        double[] result = new double[polynomial.length + 1];
        for (int i = 0; i < polynomial.length; i++) {
            result[i + 1] += polynomial[i];
            result[i] -= root * polynomial[i];
        }
        return result;
    }

    private static double integral(double[] polynomial, double to) {
        double sum = 0;
        for (int i = polynomial.length - 1; i >= 0; i--) {
            sum = sum * to + polynomial[i] / (i + 1);
        }
        return sum * to;
    }
}
