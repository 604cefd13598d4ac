package io.github.gammawright.algebra;

/**
 * How much one request to the algebra may take. It counts work and never time, so that the outcome is the same on every
 * machine.
 *
 * @param generators how many variables polynomials may have
 * @param nodes how many nodes of the graph one value may be made of
 * @param terms how many terms a polynomial may have
 * @param degree the largest total degree of a polynomial
 * @param bits the largest length of a coefficient
 * @param steps how many products of two terms may be formed
 */
public record AlgebraBudget(int generators, int nodes, int terms, int degree, int bits, long steps) {

    /** Enough for the curvature of most metrics in the literature; the largest request takes about a second. */
    public static AlgebraBudget normal() {
        return new AlgebraBudget(24, 5_000, 1_500, 60, 2_000, 400_000);
    }

    /** A tenth of the normal budget. */
    public static AlgebraBudget quick() {
        return new AlgebraBudget(16, 1_500, 400, 40, 1_000, 40_000);
    }

    /** Ten times the normal budget. */
    public static AlgebraBudget thorough() {
        return new AlgebraBudget(40, 20_000, 6_000, 120, 8_000, 4_000_000);
    }
}
