package io.github.gammawright.benchmarks;

/** What a metric and its derivatives, given as numbers, take to become a connection in four dimensions. */
final class Connection {

    private static final int N = 4;

    private final double[] work = new double[N * N];
    private final double[] inverse = new double[N * N];
    private final double[] lowered = new double[N];

    /**
     * Γ^k_ij = ½ g^kl (∂_i g_lj + ∂_j g_li − ∂_l g_ij).
     *
     * @param g the metric, row by row
     * @param derivatives ∂_k g_ij at (4k + i)·4 + j
     * @param gamma receives all 64 symbols
     */
    void evaluate(double[] g, double[] derivatives, double[] gamma) {
        invert(g);
        for (int i = 0; i < N; i++) {
            for (int j = 0; j <= i; j++) {
                for (int l = 0; l < N; l++) {
                    lowered[l] = 0.5
                            * (derivatives[(i * N + l) * N + j]
                                    + derivatives[(j * N + l) * N + i]
                                    - derivatives[(l * N + i) * N + j]);
                }
                for (int k = 0; k < N; k++) {
                    double sum = 0;
                    for (int l = 0; l < N; l++) {
                        sum += inverse[k * N + l] * lowered[l];
                    }
                    gamma[(k * N + i) * N + j] = sum;
                    gamma[(k * N + j) * N + i] = sum;
                }
            }
        }
    }

    /** Gauss and Jordan's elimination with row pivoting. */
    private void invert(double[] g) {
        System.arraycopy(g, 0, work, 0, N * N);
        for (int i = 0; i < N * N; i++) {
            inverse[i] = i % (N + 1) == 0 ? 1 : 0;
        }
        for (int column = 0; column < N; column++) {
            int pivot = column;
            for (int row = column + 1; row < N; row++) {
                if (Math.abs(work[row * N + column]) > Math.abs(work[pivot * N + column])) {
                    pivot = row;
                }
            }
            swap(pivot, column);
            double perPivot = 1 / work[column * N + column];
            for (int j = 0; j < N; j++) {
                work[column * N + j] *= perPivot;
                inverse[column * N + j] *= perPivot;
            }
            for (int row = 0; row < N; row++) {
                double factor = work[row * N + column];
                if (row != column && factor != 0) {
                    for (int j = 0; j < N; j++) {
                        work[row * N + j] -= factor * work[column * N + j];
                        inverse[row * N + j] -= factor * inverse[column * N + j];
                    }
                }
            }
        }
    }

    private void swap(int first, int second) {
        if (first == second) {
            return;
        }
        for (int j = 0; j < N; j++) {
            double value = work[first * N + j];
            work[first * N + j] = work[second * N + j];
            work[second * N + j] = value;
            value = inverse[first * N + j];
            inverse[first * N + j] = inverse[second * N + j];
            inverse[second * N + j] = value;
        }
    }
}
