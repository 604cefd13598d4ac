package io.github.gammawright.benchmarks;

/**
 * The twenty closed forms of Kerr's connection as a general printer of formulas emits them: each on its own, with
 * {@code Math.pow} and trigonometry in place. Stored as in {@link ExpertNonZero}.
 */
public final class NaiveEmission {

    private final double M;
    private final double a;

    /** Takes the mass and the angular momentum per mass. */
    public NaiveEmission(double mass, double spin) {
        this.M = mass;
        this.a = spin;
    }

    /**
     * Evaluates all twenty.
     *
     * @param point t, r, θ, φ
     * @param gamma receives the symbols in index order
     */
    public void evaluate(double[] point, double[] gamma) {
        double r = point[1];
        double theta = point[2];
        gamma[0] = M
                * (Math.pow(r, 2) + Math.pow(a, 2))
                * (Math.pow(r, 2) - Math.pow(a, 2) * Math.pow(Math.cos(theta), 2))
                / (Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2)
                        * (Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2)));
        gamma[1] = -2
                * M
                * Math.pow(a, 2)
                * r
                * Math.sin(theta)
                * Math.cos(theta)
                / Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2);
        gamma[2] = -M
                * a
                * Math.pow(Math.sin(theta), 2)
                * (Math.pow(r, 2) * (3 * Math.pow(r, 2) + Math.pow(a, 2))
                        + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2) * (Math.pow(r, 2) - Math.pow(a, 2)))
                / (Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2)
                        * (Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2)));
        gamma[3] = 2
                * M
                * Math.pow(a, 3)
                * r
                * Math.pow(Math.sin(theta), 3)
                * Math.cos(theta)
                / Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2);
        gamma[4] = M
                * (Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2))
                * (Math.pow(r, 2) - Math.pow(a, 2) * Math.pow(Math.cos(theta), 2))
                / Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 3);
        gamma[5] = (r * Math.pow(a, 2) * Math.pow(Math.sin(theta), 2)
                        - M * (Math.pow(r, 2) - Math.pow(a, 2) * Math.pow(Math.cos(theta), 2)))
                / ((Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2))
                        * (Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2)));
        gamma[6] = -Math.pow(a, 2)
                * Math.sin(theta)
                * Math.cos(theta)
                / (Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2));
        gamma[7] = -r
                * (Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2))
                / (Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2));
        gamma[8] = -M
                * a
                * (Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2))
                * Math.pow(Math.sin(theta), 2)
                * (Math.pow(r, 2) - Math.pow(a, 2) * Math.pow(Math.cos(theta), 2))
                / Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 3);
        gamma[9] = -(Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2))
                * Math.pow(Math.sin(theta), 2)
                * (r * Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2)
                        - M
                                * Math.pow(a, 2)
                                * Math.pow(Math.sin(theta), 2)
                                * (Math.pow(r, 2) - Math.pow(a, 2) * Math.pow(Math.cos(theta), 2)))
                / Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 3);
        gamma[10] = -2
                * M
                * Math.pow(a, 2)
                * r
                * Math.sin(theta)
                * Math.cos(theta)
                / Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 3);
        gamma[11] = Math.pow(a, 2)
                * Math.sin(theta)
                * Math.cos(theta)
                / ((Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2))
                        * (Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2)));
        gamma[12] = r / (Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2));
        gamma[13] = -Math.pow(a, 2)
                * Math.sin(theta)
                * Math.cos(theta)
                / (Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2));
        gamma[14] = 2
                * M
                * a
                * r
                * (Math.pow(r, 2) + Math.pow(a, 2))
                * Math.sin(theta)
                * Math.cos(theta)
                / Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 3);
        gamma[15] = -Math.sin(theta)
                * Math.cos(theta)
                * ((Math.pow(Math.pow(r, 2) + Math.pow(a, 2), 2)
                                        - Math.pow(a, 2)
                                                * (Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2))
                                                * Math.pow(Math.sin(theta), 2))
                                * (Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2))
                        + 2 * M * r * Math.pow(a, 2) * Math.pow(Math.sin(theta), 2) * (Math.pow(r, 2) + Math.pow(a, 2)))
                / Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 3);
        gamma[16] = M
                * a
                * (Math.pow(r, 2) - Math.pow(a, 2) * Math.pow(Math.cos(theta), 2))
                / (Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2)
                        * (Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2)));
        gamma[17] = -2
                * M
                * a
                * r
                * Math.cos(theta)
                / (Math.sin(theta) * Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2));
        gamma[18] = (r * Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2)
                        + M
                                * (Math.pow(a, 4) * Math.pow(Math.sin(theta), 2) * Math.pow(Math.cos(theta), 2)
                                        - Math.pow(r, 2)
                                                * ((Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2))
                                                        + (Math.pow(r, 2) + Math.pow(a, 2)))))
                / (Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2)
                        * (Math.pow(r, 2) - 2 * M * r + Math.pow(a, 2)));
        gamma[19] = Math.cos(theta)
                / Math.sin(theta)
                * (Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2)
                        + 2 * M * Math.pow(a, 2) * r * Math.pow(Math.sin(theta), 2))
                / Math.pow(Math.pow(r, 2) + Math.pow(a, 2) * Math.pow(Math.cos(theta), 2), 2);
    }
}
