package io.github.gammawright.verification;

/** Determinants with bounds on their errors, by elimination with the largest pivot. */
final class Determinants {

    private Determinants() {}

    /** The determinant of a matrix that is given row by row. */
    static Approximate of(Approximate[] matrix, int n) {
        Approximate[] a = matrix.clone();
        Approximate determinant = Approximate.exactly(1);
        for (int column = 0; column < n; column++) {
            int pivot = column;
            for (int i = column; i < n; i++) {
                pivot = Math.abs(a[i * n + column].value()) > Math.abs(a[pivot * n + column].value()) ? i : pivot;
            }
            for (int j = 0; j < n && pivot != column; j++) {
                Approximate upper = a[column * n + j];
                a[column * n + j] = a[pivot * n + j];
                a[pivot * n + j] = upper.times(-1);
            }
            Approximate diagonal = a[column * n + column];
            determinant = determinant.times(diagonal);
            for (int i = column + 1; i < n; i++) {
                Approximate factor = quotient(a[i * n + column], diagonal);
                for (int j = column + 1; j < n; j++) {
                    a[i * n + j] = a[i * n + j].minus(factor.times(a[column * n + j]));
                }
            }
        }
        return determinant;
    }

    private static Approximate quotient(Approximate a, Approximate b) {
        if (a.value() == 0 && a.error() == 0) {
            return Approximate.ZERO;
        }
        double least = Math.abs(b.value()) - b.error();
        double quotient = a.value() / b.value();
        double error = least > 0 ? (a.error() + Math.abs(quotient) * b.error()) / least : Double.POSITIVE_INFINITY;
        return new Approximate(quotient, error + 0x1p-53 * Math.abs(quotient));
    }
}
