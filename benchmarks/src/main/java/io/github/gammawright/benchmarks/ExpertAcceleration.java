package io.github.gammawright.benchmarks;

/**
 * The acceleration of a geodesic of Kerr's metric as an expert writes it by hand: 84 operations, one sine and one cosine.
 *
 * <p>It rests on the form of the metric in Carter's frame, ds² = −(Δ/Σ)X² + (sin²θ/Σ)Y² + (Σ/Δ)dr² + Σdθ² with
 * X = dt − a sin²θ dφ and Y = (r² + a²)dφ − a dt (Carter, 1968, from memory): in it ΔX and sin θ Y are linear in the two
 * conserved momenta, so that their derivatives are short.
 */
public final class ExpertAcceleration {

    private final double mass;
    private final double twoMass;
    private final double spin;
    private final double spinSquared;

    /** Takes the mass and the angular momentum per mass. */
    public ExpertAcceleration(double mass, double spin) {
        this.mass = mass;
        this.twoMass = 2 * mass;
        this.spin = spin;
        this.spinSquared = spin * spin;
    }

    /**
     * Evaluates the acceleration.
     *
     * @param point t, r, θ, φ
     * @param velocity u^k
     * @param acceleration receives −Γ^k_ij u^i u^j
     */
    public void evaluate(double[] point, double[] velocity, double[] acceleration) {
        double r = point[1];
        double sine = Math.sin(point[2]);
        double cosine = Math.cos(point[2]);
        double ut = velocity[0];
        double ur = velocity[1];
        double utheta = velocity[2];
        double uphi = velocity[3];

        double s2 = sine * sine;
        double as2 = spin * s2;
        double rho2 = r * r + spinSquared;
        double sigma = rho2 - spin * as2;
        double delta = rho2 - twoMass * r;
        double perSigma = 1 / sigma;
        double perDelta = 1 / delta;
        double rM = r - mass; // half of dΔ/dr

        double x = ut - as2 * uphi;
        double y = rho2 * uphi - spin * ut;
        double d = delta * x;
        double ad = spin * d;
        double s2y = s2 * y;
        double v = (d + spin * s2y) * perSigma; // −p_t
        double w = (ad + rho2 * y) * perSigma; // p_φ/sin²θ

        double sc = sine * cosine;
        double asc = spin * sc;
        double a2sc = spin * asc;
        double rur = r * ur;
        double f = ur * ((r * v - rM * x) * perDelta) + asc * (utheta * uphi); // half of dX/dλ + 2a sc u^θ u^φ
        double g = cosine / sine * utheta * w + rur * uphi; // minus half of dY/dλ − 2r u^r u^φ
        double twoPerSigma = perSigma + perSigma;
        double at = (rho2 * f - as2 * g) * twoPerSigma;
        double aphi = (spin * f - g) * twoPerSigma;

        double utheta2 = utheta * utheta;
        double e = ur * ur * perDelta;
        double radial = (r * (x * v + s2y * uphi) - rM * (x * x)) * perSigma + r * utheta2;
        double half = a2sc * utheta;
        double ar = (delta * radial + ur * ((half + half) - rur)) * perSigma + rM * e;
        double polar = sc * ((ad * uphi + y * w) * perSigma) + a2sc * (utheta2 - e);
        double cross = rur * utheta;
        double atheta = (polar - (cross + cross)) * perSigma;

        acceleration[0] = at;
        acceleration[1] = ar;
        acceleration[2] = atheta;
        acceleration[3] = aphi;
    }
}
