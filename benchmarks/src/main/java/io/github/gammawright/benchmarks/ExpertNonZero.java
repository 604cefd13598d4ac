package io.github.gammawright.benchmarks;

/**
 * The connection of Kerr's metric in Boyer–Lindquist coordinates as an expert writes it by hand: 51 operations, one sine
 * and one cosine for all twenty symbols that are not identically zero.
 *
 * <p>It rests on identities between the symbols, which the comments name; all follow from the closed forms. None of them
 * subtracts large numbers that nearly cancel, except close to the horizon, where Γ^φ_rφ comes from the trace identity.
 * Stored in index order: t_rt, t_θt, t_φr, t_φθ, r_tt, r_rr, r_θr, r_θθ, r_φt, r_φφ, θ likewise, φ_rt, φ_θt, φ_φr, φ_φθ.
 */
public final class ExpertNonZero {

    private final double mass;
    private final double twoMass;
    private final double spin;
    private final double minusSpin;
    private final double spinSquared;

    /** Takes the mass and the angular momentum per mass. */
    public ExpertNonZero(double mass, double spin) {
        this.mass = mass;
        this.twoMass = 2 * mass;
        this.spin = spin;
        this.minusSpin = -spin;
        this.spinSquared = spin * spin;
    }

    /**
     * Evaluates all twenty.
     *
     * @param point t, r, θ, φ
     * @param gamma receives the symbols in index order
     */
    public void evaluate(double[] point, double[] gamma) {
        double r = point[1];
        double sine = Math.sin(point[2]);
        double cosine = Math.cos(point[2]);

        double s2 = sine * sine;
        double b = minusSpin * s2; // −a sin²θ, the factor between symbols with t and with φ
        double y = spin * b; // −a² sin²θ
        double rho2 = r * r + spinSquared;
        double sigma = rho2 + y;
        double k = twoMass * r;
        double delta = rho2 - k;
        double perSigma = 1 / sigma;
        double perDelta = 1 / delta;
        double cot = cosine / sine;

        double u = r * perSigma;
        double h = k * perSigma;
        double hr = h * r;
        double q = hr - mass; // M (r² − a² cos²θ)/Σ
        double p = q * perSigma;
        double pOverDelta = p * perDelta;
        double ttr = rho2 * pOverDelta;
        gamma[0] = ttr;
        gamma[16] = spin * pOverDelta;

        double deltaOverSigma = delta * perSigma;
        double rtt = deltaOverSigma * p;
        double rtphi = b * rtt; // Γ^r_tφ = −a sin²θ Γ^r_tt
        double minusRThetaTheta = r * deltaOverSigma;
        gamma[4] = rtt;
        gamma[8] = rtphi;
        gamma[7] = -minusRThetaTheta;
        gamma[9] = b * rtphi - s2 * minusRThetaTheta; // Γ^r_φφ = sin²θ Γ^r_θθ − a sin²θ Γ^r_tφ

        double yOverSigma = y * perSigma;
        double minusRrr = (r * yOverSigma + q) * perDelta; // (r − M)/Δ − r/Σ without its cancellation
        gamma[5] = -minusRrr;
        gamma[18] = (u - ttr) + minusRrr; // trace: Γ^m_mr = 2r/Σ
        gamma[2] = b * (ttr + hr * perDelta); // Γ^t_rφ = −a sin²θ (Γ^t_tr + 2Mr²/(ΣΔ))

        double rrtheta = yOverSigma * cot;
        gamma[6] = rrtheta;
        gamma[13] = rrtheta; // Γ^θ_θθ = Γ^r_rθ
        gamma[11] = -(rrtheta * perDelta);
        gamma[12] = u;

        double minusPhiTTheta = (h * perSigma) * (spin * cot);
        gamma[17] = -minusPhiTTheta;
        double n = s2 * minusPhiTTheta;
        double minusTTTheta = spin * n; // Γ^t_tθ = a sin²θ Γ^φ_tθ
        double nOverSigma = n * perSigma;
        double thetaTPhi = rho2 * nOverSigma;
        gamma[1] = -minusTTTheta;
        gamma[10] = -(spin * nOverSigma); // Γ^θ_tt = Γ^t_tθ/Σ
        gamma[14] = thetaTPhi;
        gamma[3] = -(b * minusTTTheta); // Γ^t_θφ = −a sin²θ Γ^t_tθ

        double phiThetaPhi = cot + minusTTTheta; // cot θ − Γ^t_tθ
        gamma[19] = phiThetaPhi;
        gamma[15] = s2 * (rrtheta - phiThetaPhi) + b * thetaTPhi;
    }
}
