package io.github.gammawright.runtime;

import org.hipparchus.analysis.differentiation.DSFactory;
import org.hipparchus.analysis.differentiation.DerivativeStructure;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.LUDecomposition;

/**
 * All kernels of a metric, for tests: by automatic differentiation of the line element and the definitions in Misner,
 * Thorne &amp; Wheeler (1973, from memory), with no thought of speed.
 */
public final class Spacetime {

    /** A metric of mass 1 that can be differentiated. */
    public interface Components {

        /** g_ij at a point. */
        DerivativeStructure[][] at(DerivativeStructure[] x);
    }

    private final int n;
    private final Components metric;
    private final DSFactory factory;

    private final double[][] g;
    private final double[][] inverse;
    private final double[][][] dg; // k, i, j
    private final double[][][] gamma; // k, i, j
    private final double[][][][] dgamma; // l, k, i, j

    public Spacetime(int n, Components metric) {
        this.n = n;
        this.metric = metric;
        this.factory = new DSFactory(n, 2);
        this.g = new double[n][n];
        this.inverse = new double[n][n];
        this.dg = new double[n][n][n];
        this.gamma = new double[n][n][n];
        this.dgamma = new double[n][n][n][n];
    }

    /** Kerr's metric of mass 1 in Boyer–Lindquist coordinates; Schwarzschild's for spin 0. */
    public static Spacetime kerr(double a) {
        return new Spacetime(4, x -> {
            DerivativeStructure zero = x[0].getField().getZero();
            DerivativeStructure r = x[1];
            DerivativeStructure s2 = x[2].sin().square();
            DerivativeStructure sigma = r.square().add(x[2].cos().square().multiply(a * a));
            DerivativeStructure delta = r.square().subtract(r.multiply(2)).add(a * a);
            DerivativeStructure h = r.multiply(2).divide(sigma);
            DerivativeStructure[][] g = new DerivativeStructure[4][4];
            for (DerivativeStructure[] row : g) {
                java.util.Arrays.fill(row, zero);
            }
            g[0][0] = h.subtract(1);
            g[0][3] = g[3][0] = h.multiply(s2).multiply(-a);
            g[1][1] = sigma.divide(delta);
            g[2][2] = sigma;
            g[3][3] = s2.multiply(r.square().add(a * a).add(h.multiply(s2).multiply(a * a)));
            return g;
        });
    }

    /** A flat universe of dust, −dt² + t^(4/3) (dx² + dy² + dz²). */
    public static Spacetime dust() {
        return new Spacetime(4, x -> {
            DerivativeStructure zero = x[0].getField().getZero();
            DerivativeStructure[][] g = new DerivativeStructure[4][4];
            for (int i = 0; i < 4; i++) {
                java.util.Arrays.fill(g[i], zero);
                g[i][i] = i == 0 ? zero.subtract(1) : x[0].pow(4.0 / 3);
            }
            return g;
        });
    }

    public void metric(double[] x, double[] result) {
        update(x);
        flatten(g, result);
    }

    public void inverseMetric(double[] x, double[] result) {
        update(x);
        flatten(inverse, result);
    }

    public void christoffel(double[] x, double[] result) {
        update(x);
        for (int k = 0; k < n; k++) {
            for (int i = 0; i < n; i++) {
                System.arraycopy(gamma[k][i], 0, result, (k * n + i) * n, n);
            }
        }
    }

    public void christoffelDerivative(double[] x, double[] result) {
        update(x);
        for (int l = 0; l < n; l++) {
            for (int k = 0; k < n; k++) {
                for (int i = 0; i < n; i++) {
                    System.arraycopy(dgamma[l][k][i], 0, result, ((l * n + k) * n + i) * n, n);
                }
            }
        }
    }

    public void acceleration(double[] x, double[] u, double[] result) {
        transport(x, u, u, result);
    }

    public void transport(double[] x, double[] u, double[] v, double[] result) {
        update(x);
        double[] sums = new double[n];
        for (int k = 0; k < n; k++) {
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    sums[k] -= gamma[k][i][j] * u[i] * v[j];
                }
            }
        }
        System.arraycopy(sums, 0, result, 0, n);
    }

    /** −R^k_ijl u^i ξ^j u^l with R^k_lij = ∂_i Γ^k_lj − ∂_j Γ^k_li + Γ^k_mi Γ^m_lj − Γ^k_mj Γ^m_li. */
    public void deviation(double[] x, double[] u, double[] xi, double[] result) {
        update(x);
        for (int k = 0; k < n; k++) {
            double sum = 0;
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    for (int l = 0; l < n; l++) {
                        sum -= riemann(k, i, j, l) * u[i] * xi[j] * u[l];
                    }
                }
            }
            result[k] = sum;
        }
    }

    private double riemann(int k, int l, int i, int j) {
        double sum = dgamma[i][k][l][j] - dgamma[j][k][l][i];
        for (int m = 0; m < n; m++) {
            sum += gamma[k][m][i] * gamma[m][l][j] - gamma[k][m][j] * gamma[m][l][i];
        }
        return sum;
    }

    public void flow(double[] x, double[] p, double[] result) {
        update(x);
        double[] u = new double[n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                u[i] += inverse[i][j] * p[j];
            }
        }
        for (int k = 0; k < n; k++) {
            double sum = 0;
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    sum += dg[k][i][j] * u[i] * u[j];
                }
            }
            result[k] = u[k];
            result[n + k] = sum / 2;
        }
    }

    public void accelerationByTime(double[] x, double[] v, double[] result) {
        double[] u = new double[n];
        u[0] = 1;
        System.arraycopy(v, 0, u, 1, n - 1);
        double[] a = new double[n];
        acceleration(x, u, a);
        for (int k = 1; k < n; k++) {
            result[k - 1] = a[k] - u[k] * a[0];
        }
    }

    public void flowByTime(double[] x, double[] p, double[] result) {
        double[] all = new double[2 * n];
        flow(x, p, all);
        for (int k = 1; k < n; k++) {
            result[k - 1] = all[k] / all[0];
            result[n - 2 + k] = all[n + k] / all[0];
        }
    }

    private void update(double[] point) {
        DerivativeStructure[] x = new DerivativeStructure[n];
        for (int i = 0; i < n; i++) {
            x[i] = factory.variable(i, point[i]);
        }
        DerivativeStructure[][] values = metric.at(x);
        double[][][][] second = new double[n][n][n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                g[i][j] = values[i][j].getValue();
                for (int k = 0; k < n; k++) {
                    int[] orders = new int[n];
                    orders[k]++;
                    dg[k][i][j] = values[i][j].getPartialDerivative(orders);
                    for (int l = 0; l < n; l++) {
                        orders[l]++;
                        second[l][k][i][j] = values[i][j].getPartialDerivative(orders);
                        orders[l]--;
                    }
                }
            }
        }
        double[][] solved = new LUDecomposition(new Array2DRowRealMatrix(g), 0)
                .getSolver()
                .getInverse()
                .getData();
        for (int i = 0; i < n; i++) {
            System.arraycopy(solved[i], 0, inverse[i], 0, n);
        }
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                for (int k = 0; k < n; k++) {
                    double sum = 0;
                    for (int m = 0; m < n; m++) {
                        sum += inverse[k][m] * (dg[i][m][j] + dg[j][i][m] - dg[m][i][j]) / 2;
                    }
                    gamma[k][i][j] = sum;
                }
            }
        }
        for (int l = 0; l < n; l++) {
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    for (int k = 0; k < n; k++) {
                        double sum = 0;
                        for (int m = 0; m < n; m++) {
                            sum += inverse[k][m] * (second[l][i][m][j] + second[l][j][i][m] - second[l][m][i][j]) / 2;
                            for (int q = 0; q < n; q++) {
                                sum -= inverse[k][m] * dg[l][m][q] * gamma[q][i][j];
                            }
                        }
                        dgamma[l][k][i][j] = sum;
                    }
                }
            }
        }
    }

    private void flatten(double[][] matrix, double[] result) {
        for (int i = 0; i < n; i++) {
            System.arraycopy(matrix[i], 0, result, i * n, n);
        }
    }
}
