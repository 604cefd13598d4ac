package io.github.gammawright.runtime.conserved;

/** Constants of the motion that Kerr's metric has in Boyer–Lindquist coordinates t, r, θ, φ, signature −+++. */
public final class KerrConstants {

    private KerrConstants() {}

    /**
     * Carter's constant Q = p_θ² + cos²θ (a² (μ² − p_t²) + p_φ²/sin²θ) (Carter 1968, Phys. Rev. 174, 1559; Misner, Thorne
     * &amp; Wheeler 1973, sec. 33.5; from memory).
     *
     * @param spin a, angular momentum over mass of the hole
     * @param mass μ of the body; 0 for light, 1 where momenta are per unit of mass
     */
    public static PhaseFunction carter(double spin, double mass) {
        return (point, p) -> {
            double cosine = Math.cos(point[2]);
            double sine = Math.sin(point[2]);
            return p[2] * p[2]
                    + cosine * cosine * (spin * spin * (mass * mass - p[0] * p[0]) + p[3] * p[3] / (sine * sine));
        };
    }
}
