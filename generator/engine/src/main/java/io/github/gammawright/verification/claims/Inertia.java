package io.github.gammawright.verification.claims;

import io.github.gammawright.verification.reference.Real;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Optional;

/**
 * The numbers of positive and negative eigenvalues of a symmetric matrix, by symmetric elimination (Sylvester's law of
 * inertia).
 *
 * @param positive how many are positive
 * @param negative how many are negative
 */
record Inertia(int positive, int negative) {

    private static final MathContext DIGITS = new MathContext(60);

    /** What is left of a pivot by rounding is this much smaller than its row was. */
    private static final BigDecimal NOTHING = new BigDecimal("1e-40");

    /**
     * The inertia of a matrix.
     *
     * @param components row-major
     * @return empty if a component is undefined or the matrix is singular
     */
    static Optional<Inertia> of(List<Real> components, int n) {
        if (components.stream().anyMatch(Real::isUndefined)) {
            return Optional.empty();
        }
        BigDecimal[][] a = new BigDecimal[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                a[i][j] = components.get(i * n + j).toBigDecimal(60);
            }
        }
        return eliminate(a);
    }

    private static Optional<Inertia> eliminate(BigDecimal[][] a) {
        int n = a.length;
        boolean[] done = new boolean[n];
        BigDecimal scale = largest(a, done);
        int positive = 0;
        int negative = 0;
        for (int step = 0; step < n; step++) {
            if (largest(a, done).compareTo(scale.multiply(NOTHING)) <= 0) {
                return Optional.empty();
            }
            int pivot = pivot(a, done);
            if (pivot < 0) {
                mix(a, done);
                pivot = pivot(a, done);
            }
            done[pivot] = true;
            positive += a[pivot][pivot].signum() > 0 ? 1 : 0;
            negative += a[pivot][pivot].signum() < 0 ? 1 : 0;
            for (int i = 0; i < n; i++) {
                BigDecimal factor = done[i] ? BigDecimal.ZERO : a[i][pivot].divide(a[pivot][pivot], DIGITS);
                for (int j = 0; j < n && factor.signum() != 0; j++) {
                    a[i][j] = done[j] ? a[i][j] : a[i][j].subtract(factor.multiply(a[pivot][j]), DIGITS);
                }
            }
        }
        return Optional.of(new Inertia(positive, negative));
    }

    /** The largest diagonal element that is not small beside its row; −1 if there is none. */
    private static int pivot(BigDecimal[][] a, boolean[] done) {
        int best = -1;
        for (int i = 0; i < a.length; i++) {
            if (!done[i]
                    && a[i][i].abs().multiply(BigDecimal.TEN).compareTo(rowSize(a, done, i)) >= 0
                    && a[i][i].signum() != 0
                    && (best < 0 || a[i][i].abs().compareTo(a[best][best].abs()) > 0)) {
                best = i;
            }
        }
        return best;
    }

    private static BigDecimal rowSize(BigDecimal[][] a, boolean[] done, int i) {
        BigDecimal size = BigDecimal.ZERO;
        for (int j = 0; j < a.length; j++) {
            size = done[j] ? size : size.max(a[i][j].abs());
        }
        return size;
    }

    /** Adds a multiple of one row and column to another, which keeps the inertia, so that a diagonal element is large. */
    private static void mix(BigDecimal[][] a, boolean[] done) {
        int p = -1;
        int q = -1;
        for (int i = 0; i < a.length; i++) {
            for (int j = 0; j < i; j++) {
                if (!done[i] && !done[j] && (p < 0 || a[i][j].abs().compareTo(a[p][q].abs()) > 0)) {
                    p = i;
                    q = j;
                }
            }
        }
        // a_pp + 2 a_pq + a_qq or a_pp − 2 a_pq + a_qq: the one that does not cancel
        boolean subtract = a[p][p].add(a[q][q]).signum() * a[p][q].signum() < 0;
        for (int j = 0; j < a.length; j++) {
            a[p][j] = subtract ? a[p][j].subtract(a[q][j]) : a[p][j].add(a[q][j]);
        }
        for (BigDecimal[] row : a) {
            row[p] = subtract ? row[p].subtract(row[q]) : row[p].add(row[q]);
        }
    }

    private static BigDecimal largest(BigDecimal[][] a, boolean[] done) {
        BigDecimal largest = BigDecimal.ZERO;
        for (int i = 0; i < a.length; i++) {
            largest = done[i] ? largest : largest.max(rowSize(a, done, i));
        }
        return largest;
    }
}
