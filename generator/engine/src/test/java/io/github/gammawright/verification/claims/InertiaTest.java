package io.github.gammawright.verification.claims;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.verification.reference.Real;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.EigenDecompositionSymmetric;
import org.junit.jupiter.api.Test;

class InertiaTest {

    @Test
    void agreesWithEigenvalues() {
        Random random = new Random(5);
        int compared = 0;
        for (int trial = 0; trial < 300; trial++) {
            int n = 1 + trial % 6;
            double[][] matrix = new double[n][n];
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    // many zeros, on the diagonal too, as in null coordinates
                    matrix[i][j] = random.nextInt(3) == 0 ? random.nextInt(7) - 3 : 0;
                    matrix[j][i] = matrix[i][j];
                }
            }
            double[] eigenvalues = new EigenDecompositionSymmetric(new Array2DRowRealMatrix(matrix)).getEigenvalues();
            if (Arrays.stream(eigenvalues).allMatch(value -> Math.abs(value) > 1e-9)) {
                int positive = (int)
                        Arrays.stream(eigenvalues).filter(value -> value > 0).count();
                assertThat(Inertia.of(reals(matrix), n))
                        .as(Arrays.deepToString(matrix))
                        .hasValue(new Inertia(positive, n - positive));
                compared++;
            }
        }
        assertThat(compared).isGreaterThanOrEqualTo(70);
    }

    @Test
    void singularOrUndefinedMatricesHaveNone() {
        assertThat(Inertia.of(reals(new double[][] {{1, 2}, {2, 4}}), 2)).isEmpty();
        assertThat(Inertia.of(reals(new double[][] {{0, 0}, {0, 0}}), 2)).isEmpty();
        assertThat(Inertia.of(List.of(Real.UNDEFINED), 1)).isEmpty();
    }

    @Test
    void coordinatesOfVeryDifferentUnitsDoNotMatter() {
        assertThat(Inertia.of(reals(new double[][] {{-1e-12, 1e-3}, {1e-3, 1e12}}), 2))
                .hasValue(new Inertia(1, 1));
    }

    private static List<Real> reals(double[][] matrix) {
        List<Real> all = new ArrayList<>();
        for (double[] row : matrix) {
            for (double entry : row) {
                all.add(Real.of(entry));
            }
        }
        return all;
    }
}
