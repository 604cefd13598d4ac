package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;

/** The connection that closed forms give at a point: what they don't name is zero. */
final class ExpectedConnection {

    private final int dimension;
    private final double[] values;
    private final boolean[] named;

    ExpectedConnection(int dimension) {
        this.dimension = dimension;
        this.values = new double[dimension * dimension * dimension];
        this.named = new boolean[values.length];
    }

    /** Sets Γ^k_ij and Γ^k_ji. */
    ExpectedConnection with(int k, int i, int j, double value) {
        for (int position : new int[] {position(k, i, j), position(k, j, i)}) {
            assertThat(named[position] && i != j && values[position] != value)
                    .as("Γ %d %d %d is named twice", k, i, j)
                    .isFalse();
            values[position] = value;
            named[position] = true;
        }
        return this;
    }

    /**
     * Compares a kernel's result in the layout full, entry by entry.
     *
     * @param tolerance the error allowed, relative to the entry and to a thousandth of the largest; an entry that is
     *     not named must be exactly zero
     * @return how many independent symbols were compared with a closed form
     */
    int compareWith(double[] actual, double tolerance) {
        assertThat(actual).hasSameSizeAs(values);
        double largest = 0;
        for (double value : values) {
            largest = Math.max(largest, Math.abs(value));
        }
        int compared = 0;
        for (int k = 0; k < dimension; k++) {
            for (int i = 0; i < dimension; i++) {
                for (int j = 0; j < dimension; j++) {
                    int position = position(k, i, j);
                    double allowed = named[position] ? tolerance * (Math.abs(values[position]) + 1e-3 * largest) : 0;
                    assertThat(Math.abs(actual[position] - values[position]))
                            .as("Γ %d %d %d is %s, the closed form %s", k, i, j, actual[position], values[position])
                            .isLessThanOrEqualTo(allowed);
                    compared += named[position] && j <= i ? 1 : 0;
                }
            }
        }
        return compared;
    }

    private int position(int k, int i, int j) {
        return (k * dimension + i) * dimension + j;
    }
}
