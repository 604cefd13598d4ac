package io.github.gammawright.benchmarks;

/**
 * {@link ExpertNonZero} with all 64 symbols stored row by row, the 32 zeros among them: Γ^k_ij at (4k + i)·4 + j. The
 * operations are the same 51; see there for the identities.
 */
public final class ExpertFull {

    private final double mass;
    private final double twoMass;
    private final double spin;
    private final double minusSpin;
    private final double spinSquared;

    /** Takes the mass and the angular momentum per mass. */
    public ExpertFull(double mass, double spin) {
        this.mass = mass;
        this.twoMass = 2 * mass;
        this.spin = spin;
        this.minusSpin = -spin;
        this.spinSquared = spin * spin;
    }

    /**
     * Evaluates all 64.
     *
     * @param point t, r, θ, φ
     * @param gamma receives the symbols row by row
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
        gamma[1] = ttr;
        gamma[4] = ttr;
        double phiTR = spin * pOverDelta;
        gamma[49] = phiTR;
        gamma[52] = phiTR;

        double deltaOverSigma = delta * perSigma;
        double rtt = deltaOverSigma * p;
        double rtphi = b * rtt; // Γ^r_tφ = −a sin²θ Γ^r_tt
        double minusRThetaTheta = r * deltaOverSigma;
        gamma[16] = rtt;
        gamma[19] = rtphi;
        gamma[28] = rtphi;
        gamma[26] = -minusRThetaTheta;
        gamma[31] = b * rtphi - s2 * minusRThetaTheta; // Γ^r_φφ = sin²θ Γ^r_θθ − a sin²θ Γ^r_tφ

        double yOverSigma = y * perSigma;
        double minusRrr = (r * yOverSigma + q) * perDelta; // (r − M)/Δ − r/Σ without its cancellation
        gamma[21] = -minusRrr;
        double phiRPhi = (u - ttr) + minusRrr; // trace: Γ^m_mr = 2r/Σ
        gamma[55] = phiRPhi;
        gamma[61] = phiRPhi;
        double tRPhi = b * (ttr + hr * perDelta); // Γ^t_rφ = −a sin²θ (Γ^t_tr + 2Mr²/(ΣΔ))
        gamma[7] = tRPhi;
        gamma[13] = tRPhi;

        double rrtheta = yOverSigma * cot;
        gamma[22] = rrtheta;
        gamma[25] = rrtheta;
        gamma[42] = rrtheta; // Γ^θ_θθ = Γ^r_rθ
        gamma[37] = -(rrtheta * perDelta);
        gamma[38] = u;
        gamma[41] = u;

        double minusPhiTTheta = (h * perSigma) * (spin * cot);
        gamma[50] = -minusPhiTTheta;
        gamma[56] = -minusPhiTTheta;
        double n = s2 * minusPhiTTheta;
        double minusTTTheta = spin * n; // Γ^t_tθ = a sin²θ Γ^φ_tθ
        double nOverSigma = n * perSigma;
        double thetaTPhi = rho2 * nOverSigma;
        gamma[2] = -minusTTTheta;
        gamma[8] = -minusTTTheta;
        gamma[32] = -(spin * nOverSigma); // Γ^θ_tt = Γ^t_tθ/Σ
        gamma[35] = thetaTPhi;
        gamma[44] = thetaTPhi;
        double tThetaPhi = -(b * minusTTTheta); // Γ^t_θφ = −a sin²θ Γ^t_tθ
        gamma[11] = tThetaPhi;
        gamma[14] = tThetaPhi;

        double phiThetaPhi = cot + minusTTTheta; // cot θ − Γ^t_tθ
        gamma[59] = phiThetaPhi;
        gamma[62] = phiThetaPhi;
        gamma[47] = s2 * (rrtheta - phiThetaPhi) + b * thetaTPhi;

        gamma[0] = 0;
        gamma[3] = 0;
        gamma[5] = 0;
        gamma[6] = 0;
        gamma[9] = 0;
        gamma[10] = 0;
        gamma[12] = 0;
        gamma[15] = 0;
        gamma[17] = 0;
        gamma[18] = 0;
        gamma[20] = 0;
        gamma[23] = 0;
        gamma[24] = 0;
        gamma[27] = 0;
        gamma[29] = 0;
        gamma[30] = 0;
        gamma[33] = 0;
        gamma[34] = 0;
        gamma[36] = 0;
        gamma[39] = 0;
        gamma[40] = 0;
        gamma[43] = 0;
        gamma[45] = 0;
        gamma[46] = 0;
        gamma[48] = 0;
        gamma[51] = 0;
        gamma[53] = 0;
        gamma[54] = 0;
        gamma[57] = 0;
        gamma[58] = 0;
        gamma[60] = 0;
        gamma[63] = 0;
    }
}
