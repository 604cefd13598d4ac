package io.github.gammawright.runtime;

/** Small systems of linear equations, by elimination with the largest pivot of each column, without allocating. */
public final class LinearSystem {

    private final int n;
    private final double[] work;
    private final double[] right;

    /** Makes room for systems of n equations. */
    public LinearSystem(int n) {
        this.n = n;
        this.work = new double[n * n];
        this.right = new double[n];
    }

    /**
     * Solves A x = b.
     *
     * @param matrix A_ij at i·n + j; only read
     * @param b the right-hand side; only read
     * @param x receives the solution; may be b; is as it was where there is none
     * @return whether there is a finite solution
     */
    public boolean solve(double[] matrix, double[] b, double[] x) {
        System.arraycopy(matrix, 0, work, 0, n * n);
        System.arraycopy(b, 0, right, 0, n);
        for (int column = 0; column < n; column++) {
            int pivot = column;
            for (int row = column + 1; row < n; row++) {
                if (Math.abs(work[row * n + column]) > Math.abs(work[pivot * n + column])) {
                    pivot = row;
                }
            }
            if (work[pivot * n + column] == 0) {
                return false;
            }
            swap(pivot, column);
            for (int row = column + 1; row < n; row++) {
                double factor = work[row * n + column] / work[column * n + column];
                for (int j = column + 1; j < n; j++) {
                    work[row * n + j] -= factor * work[column * n + j];
                }
                right[row] -= factor * right[column];
            }
        }
        for (int row = n - 1; row >= 0; row--) {
            double sum = right[row];
            for (int j = row + 1; j < n; j++) {
                sum -= work[row * n + j] * right[j];
            }
            right[row] = sum / work[row * n + row];
            if (!Double.isFinite(right[row])) {
                return false;
            }
        }
        System.arraycopy(right, 0, x, 0, n);
        return true;
    }

    private void swap(int a, int b) {
        if (a == b) {
            return;
        }
        for (int j = 0; j < n; j++) {
            double kept = work[a * n + j];
            work[a * n + j] = work[b * n + j];
            work[b * n + j] = kept;
        }
        double kept = right[a];
        right[a] = right[b];
        right[b] = kept;
    }
}
