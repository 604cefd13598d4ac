package io.github.gammawright.runtime.chart;

/**
 * The change between the coordinates of Boyer and Lindquist (t, r, θ, φ) and the ingoing Cartesian ones of Kerr and Schild
 * (T, x, y, z), which reach through the future horizon: x + iy = (r + ia) sin θ exp(i(φ + ∫ a dr/Δ)), z = r cos θ,
 * T = t + ∫ 2Mr dr/Δ, Δ = r² − 2Mr + a² (Kerr 1963; Boyer &amp; Lindquist 1967; Misner, Thorne &amp; Wheeler 1973, box 33.2;
 * from memory).
 *
 * <p>The angle φ comes back from x and y between −π and π: whole turns are lost.
 */
public final class KerrCharts {

    private final double mass;
    private final double spin;
    private final double outer;
    private final double inner;

    /**
     * Takes the hole.
     *
     * @param mass M &gt; 0
     * @param spin a with |a| ≤ M
     */
    public KerrCharts(double mass, double spin) {
        if (!(mass > 0 && Math.abs(spin) <= mass)) {
            throw new IllegalArgumentException("a hole of mass " + mass + " can't have the spin " + spin);
        }
        this.mass = mass;
        this.spin = spin;
        double root = Math.sqrt((mass - spin) * (mass + spin));
        this.outer = mass + root;
        this.inner = spin * spin / outer;
    }

    /** From Boyer–Lindquist to Kerr–Schild, outside the outer horizon. */
    public ChartChange toKerrSchild() {
        return new ChartChange(4, this::kerrSchild, this::kerrSchildJacobian);
    }

    /** From Kerr–Schild to Boyer–Lindquist, outside the outer horizon. */
    public ChartChange toBoyerLindquist() {
        return new ChartChange(4, this::boyerLindquist, this::boyerLindquistJacobian);
    }

    /** The radius r of a point in Kerr–Schild coordinates: r⁴ − (x² + y² + z² − a²) r² − a² z² = 0. */
    public double radius(double x, double y, double z) {
        double half = (x * x + y * y + z * z - spin * spin) / 2;
        double az = spin * z;
        double root = Math.hypot(half, az);
        double square = half >= 0 ? half + root : az * az / (root - half);
        return Math.sqrt(square);
    }

    /** The map to (T, x, y, z). */
    public void kerrSchild(double[] point, double[] result) {
        double t = point[0];
        double r = point[1];
        double s = Math.sin(point[2]);
        double c = Math.cos(point[2]);
        double angle = point[3] + twist(r);
        double cosine = Math.cos(angle);
        double sine = Math.sin(angle);
        result[0] = t + delay(r);
        result[1] = (r * cosine - spin * sine) * s;
        result[2] = (r * sine + spin * cosine) * s;
        result[3] = r * c;
    }

    /** Its Jacobian. */
    public void kerrSchildJacobian(double[] point, double[] result) {
        double r = point[1];
        double s = Math.sin(point[2]);
        double c = Math.cos(point[2]);
        double angle = point[3] + twist(r);
        double cosine = Math.cos(angle);
        double sine = Math.sin(angle);
        double delta = (r - outer) * (r - inner);
        double byTwist = spin / delta;
        double x = (r * cosine - spin * sine) * s;
        double y = (r * sine + spin * cosine) * s;
        java.util.Arrays.fill(result, 0);
        result[0] = 1;
        result[1] = 2 * mass * r / delta;
        result[5] = cosine * s - y * byTwist;
        result[6] = (r * cosine - spin * sine) * c;
        result[7] = -y;
        result[9] = sine * s + x * byTwist;
        result[10] = (r * sine + spin * cosine) * c;
        result[11] = x;
        result[13] = c;
        result[14] = -r * s;
    }

    /** The map to (t, r, θ, φ). */
    public void boyerLindquist(double[] point, double[] result) {
        double time = point[0];
        double x = point[1];
        double y = point[2];
        double z = point[3];
        double r = radius(x, y, z);
        if (!(r > outer)) {
            java.util.Arrays.fill(result, Double.NaN);
            return;
        }
        result[0] = time - delay(r);
        result[1] = r;
        result[2] = Math.atan2(Math.hypot(x, y) / Math.hypot(r, spin), z / r);
        result[3] = Math.IEEEremainder(Math.atan2(y, x) - Math.atan2(spin, r) - twist(r), 2 * Math.PI);
    }

    /** Its Jacobian. */
    public void boyerLindquistJacobian(double[] point, double[] result) {
        double x = point[1];
        double y = point[2];
        double z = point[3];
        double r = radius(x, y, z);
        if (!(r > outer)) {
            java.util.Arrays.fill(result, Double.NaN);
            return;
        }
        double a2 = spin * spin;
        double cos = z / r;
        double sigma = r * r + a2 * cos * cos;
        double sum = r * r + a2;
        double rho2 = x * x + y * y;
        double sin = Math.sqrt(rho2 / sum);
        double delta = (r - outer) * (r - inner);
        double[] dr = {r * x / sigma, r * y / sigma, sum * z / (sigma * r)};
        java.util.Arrays.fill(result, 0);
        result[0] = 1;
        for (int i = 0; i < 3; i++) {
            result[1 + i] = -2 * mass * r / delta * dr[i];
            result[5 + i] = dr[i];
            // z = r cos θ
            result[9 + i] = ((i == 2 ? -1 : 0) + cos * dr[i]) / (r * sin);
            // φ = atan2(y, x) − atan2(a, r) − twist(r)
            double own = i == 0 ? -y / rho2 : i == 1 ? x / rho2 : 0;
            result[13 + i] = own + (spin / sum - spin / delta) * dr[i];
        }
    }

    /** ∫ 2Mr dr/Δ. */
    private double delay(double r) {
        double gap = outer - inner;
        if (gap == 0) {
            return 2 * mass * (Math.log(r - mass) - mass / (r - mass));
        }
        return 2 * mass / gap * (outer * Math.log(r - outer) - inner * Math.log(r - inner));
    }

    /** ∫ a dr/Δ, 0 far away. */
    private double twist(double r) {
        double gap = outer - inner;
        if (gap == 0) {
            return -spin / (r - mass);
        }
        return spin / gap * Math.log((r - outer) / (r - inner));
    }
}
