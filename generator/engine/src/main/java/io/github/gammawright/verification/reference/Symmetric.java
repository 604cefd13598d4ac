package io.github.gammawright.verification.reference;

/** Tables over three indices that are symmetric in the last two. */
final class Symmetric {

    private Symmetric() {}

    /** An entry of a table. */
    @FunctionalInterface
    interface Entry {
        Taylor at(int k, int i, int j);
    }

    /** Computes the entries with i ≥ j and mirrors them. */
    static Taylor[][][] table(int n, Entry entry) {
        Taylor[][][] table = new Taylor[n][n][n];
        for (int k = 0; k < n; k++) {
            for (int i = 0; i < n; i++) {
                for (int j = 0; j <= i; j++) {
                    table[k][i][j] = entry.at(k, i, j);
                    table[k][j][i] = table[k][i][j];
                }
            }
        }
        return table;
    }
}
