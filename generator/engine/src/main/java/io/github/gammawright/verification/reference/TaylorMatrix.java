package io.github.gammawright.verification.reference;

import java.util.Arrays;

/**
 * The inverse and the determinant of a matrix of power series, by elimination (Gauss–Jordan) with the largest pivot of
 * each column. Both are undefined when the matrix is singular or undefined at the point.
 */
final class TaylorMatrix {

    private final Taylor[][] inverse;
    private final Taylor determinant;

    private TaylorMatrix(Taylor[][] inverse, Taylor determinant) {
        this.inverse = inverse;
        this.determinant = determinant;
    }

    Taylor[][] inverse() {
        return inverse;
    }

    Taylor determinant() {
        return determinant;
    }

    /** Inverts a square matrix, which stays as it is. */
    static TaylorMatrix invert(Taylor[][] matrix, TaylorRing ring) {
        int n = matrix.length;
        Taylor[][] left = new Taylor[n][];
        Taylor[][] right = new Taylor[n][n];
        for (int i = 0; i < n; i++) {
            left[i] = matrix[i].clone();
            for (int j = 0; j < n; j++) {
                right[i][j] = i == j ? ring.constant(Real.ONE) : ring.zero();
            }
        }
        Taylor determinant = ring.constant(Real.ONE);
        for (int column = 0; column < n; column++) {
            int pivot = largest(left, column);
            if (left[pivot][column].value().signum() == 0) {
                return undefined(n, ring, left[0][0].order());
            }
            if (pivot != column) {
                swap(left, pivot, column);
                swap(right, pivot, column);
                determinant = determinant.negate();
            }
            determinant = determinant.times(left[column][column]);
            Taylor reciprocal = left[column][column].reciprocal();
            scale(left[column], reciprocal);
            scale(right[column], reciprocal);
            for (int row = 0; row < n; row++) {
                if (row != column && !left[row][column].isAbsent()) {
                    Taylor factor = left[row][column];
                    subtract(left[row], factor, left[column], column);
                    subtract(right[row], factor, right[column], 0);
                }
            }
        }
        return new TaylorMatrix(right, determinant);
    }

    private static int largest(Taylor[][] rows, int column) {
        int largest = column;
        for (int row = column + 1; row < rows.length; row++) {
            Real candidate = rows[row][column].value();
            Real best = rows[largest][column].value();
            if (best.abs().isLessThan(candidate.abs())) {
                largest = row;
            }
        }
        return largest;
    }

    private static void swap(Taylor[][] rows, int first, int second) {
        Taylor[] row = rows[first];
        rows[first] = rows[second];
        rows[second] = row;
    }

    private static void scale(Taylor[] row, Taylor factor) {
        for (int i = 0; i < row.length; i++) {
            row[i] = row[i].times(factor);
        }
    }

    private static void subtract(Taylor[] row, Taylor factor, Taylor[] other, int from) {
        for (int i = from; i < row.length; i++) {
            if (!other[i].isAbsent()) {
                row[i] = row[i].minus(factor.times(other[i]));
            }
        }
    }

    private static TaylorMatrix undefined(int n, TaylorRing ring, int order) {
        Taylor undefined = ring.undefined().truncated(order);
        Taylor[][] inverse = new Taylor[n][n];
        for (Taylor[] row : inverse) {
            Arrays.fill(row, undefined);
        }
        return new TaylorMatrix(inverse, undefined);
    }
}
