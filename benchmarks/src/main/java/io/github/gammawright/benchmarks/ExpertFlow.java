package io.github.gammawright.benchmarks;

/**
 * Hamilton's equations of a geodesic of Kerr's metric as an expert writes them by hand: 55 operations, one sine and one
 * cosine.
 *
 * <p>They start from 2ΣH = Δ p_r² + p_θ² + B² − A²/Δ with A = (r² + a²)p_t + a p_φ and B = a sin θ p_t + p_φ/sin θ
 * (Carter, 1968, from memory), and get H itself from p_i dx^i/dλ = 2H.
 */
public final class ExpertFlow {

    private final double mass;
    private final double twoMass;
    private final double spin;
    private final double spinSquared;

    /** Takes the mass and the angular momentum per mass. */
    public ExpertFlow(double mass, double spin) {
        this.mass = mass;
        this.twoMass = 2 * mass;
        this.spin = spin;
        this.spinSquared = spin * spin;
    }

    /**
     * Evaluates the derivatives.
     *
     * @param point t, r, θ, φ
     * @param momentum p_k
     * @param flow receives dx^k/dλ, then dp_k/dλ
     */
    public void evaluate(double[] point, double[] momentum, double[] flow) {
        double r = point[1];
        double sine = Math.sin(point[2]);
        double cosine = Math.cos(point[2]);
        double pt = momentum[0];
        double pr = momentum[1];
        double ptheta = momentum[2];
        double pphi = momentum[3];

        double rho2 = r * r + spinSquared;
        double as = spin * sine;
        double sigma = rho2 - as * as;
        double delta = rho2 - twoMass * r;
        double perSigma = 1 / sigma;
        double perDelta = 1 / delta;
        double perSine = 1 / sine;

        double f = pphi * perSine;
        double b = as * pt + f;
        double alpha = (rho2 * pt + spin * pphi) * perDelta; // A/Δ
        double dt = (as * b - rho2 * alpha) * perSigma;
        double dr = delta * pr * perSigma;
        double dtheta = ptheta * perSigma;
        double dphi = (b * perSine - spin * alpha) * perSigma;

        double k = (dt * pt + dphi * pphi) + (dr * pr + dtheta * ptheta); // 2H
        double pa = pt * alpha;
        double dpr = (r * (k + (pa + pa)) - (r - mass) * (pr * pr + alpha * alpha)) * perSigma;
        double minusDptheta = cosine * (b * (spin * pt - f * perSine) + k * (spin * as)) * perSigma;

        flow[0] = dt;
        flow[1] = dr;
        flow[2] = dtheta;
        flow[3] = dphi;
        flow[4] = 0;
        flow[5] = dpr;
        flow[6] = -minusDptheta;
        flow[7] = 0;
    }
}
