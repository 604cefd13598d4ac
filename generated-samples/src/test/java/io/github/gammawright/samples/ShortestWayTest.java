package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;

/** The direct problem against published worked examples and against the elliptic integrals of Legendre and Bessel. */
class ShortestWayTest {

    private static final double WGS84_A = 6378137;
    private static final double WGS84_F = 1 / 298.257223563;

    /**
     * φ1, α1 in degrees, s in metres, then φ2, λ2, α2 in degrees, evaluated with 40 digits: Karney 2013, J. Geod. 87, 43,
     * table 2 (WGS84).
     */
    @Test
    void thePublishedExampleComesOut() {
        compare(new ShortestWay(), 40, 30, 1e7, 41.79331020505624, 137.8449000437715, 149.0901693180718, 2e-13);
    }

    /**
     * The five examples of Vincenty 1975, Survey Review 23, 88, table II (from memory), on the ellipsoids of Bessel and of
     * 1924, as evaluated with 40 digits; his own digits end at 3e-5 seconds of arc.
     */
    @Test
    void vincentysExamplesComeOut() {
        ShortestWay bessel = new ShortestWay(6377397.155, 1 / 299.1528128);
        ShortestWay international = new ShortestWay(6378388, 1 / 297.0);
        compare(
                bessel,
                degrees(55, 45, 0),
                degrees(96, 36, 8.79960),
                14110526.170,
                -33.43333333670669,
                108.2166666689434,
                137.8727818133891,
                1e-12);
        compare(
                international,
                degrees(37, 19, 54.95367),
                degrees(95, 27, 59.63089),
                4085966.703,
                26.12856651478563,
                41.47652980630991,
                118.0997115597070,
                1e-12);
        compare(
                international,
                degrees(35, 16, 11.24862),
                degrees(15, 44, 23.74850),
                8084823.839,
                67.37077121115207,
                137.7911984386776,
                144.9277559723192,
                1e-12);
        compare(international, 1, 89, 19960000, -0.9982863227437500, 179.2966749934233, 91.00169925744488, 1e-12);
        compare(
                international,
                1,
                degrees(4, 59, 59.99995),
                19780006.558,
                1.020885984884422,
                179.7716228994655,
                174.9999680018168,
                1e-12);
    }

    private static double degrees(int degrees, int minutes, double seconds) {
        return degrees + minutes / 60.0 + seconds / 3600;
    }

    private static void compare(
            ShortestWay way,
            double phi,
            double alpha,
            double s,
            double phi2,
            double lambda2,
            double alpha2,
            double within) {
        double[] end = way.follow(Math.toRadians(phi), 0, Math.toRadians(alpha), s, (parameter, state) -> {});
        assertThat(end[0]).isCloseTo(Math.toRadians(phi2), within(within));
        assertThat(end[1]).isCloseTo(Math.toRadians(lambda2), within(within));
        assertThat(end[2]).isCloseTo(Math.toRadians(alpha2), within(within));
    }

    /**
     * 200 random ways, none within 1° of a pole, to 20 nm: on the auxiliary sphere s/b = ∫ √(1 + k² sin²σ) dσ and λ = ω − f
     * sin α0 ∫ (2 − f)/(1 + (1 − f) √(1 + k² sin²σ)) dσ (Legendre 1806; Bessel 1825; from memory), by quadrature.
     */
    @Test
    void randomWaysAgreeWithTheEllipticIntegrals() {
        Random random = new Random(1825);
        ShortestWay way = new ShortestWay();
        int compared = 0;
        double worst = 0;
        while (compared < 200) {
            double phi = Math.toRadians(-89 + 178 * random.nextDouble());
            double alpha = 2 * Math.PI * random.nextDouble() - Math.PI;
            double s = 2e7 * random.nextDouble();
            // The way comes no closer to a pole than cos β = |sin α0|.
            double beta = Math.atan((1 - WGS84_F) * Math.tan(phi));
            if (Math.abs(Math.sin(alpha) * Math.cos(beta)) < Math.sin(Math.toRadians(1.01))) {
                continue;
            }
            double[] expected = bessel(phi, alpha, s);
            double[] end = way.follow(phi, 0, alpha, s, (parameter, state) -> {});
            double north = (end[0] - expected[0]) * WGS84_A;
            double east = Math.IEEEremainder(end[1] - expected[1], 2 * Math.PI) * WGS84_A * Math.cos(end[0]);
            worst = Math.max(worst, Math.hypot(north, east));
            compared++;
        }
        assertThat(worst).isLessThan(20e-9);
    }

    private static double[] bessel(double phi, double alpha, double s) {
        double f = WGS84_F;
        double b = WGS84_A * (1 - f);
        double e2 = f * (2 - f);
        double beta = Math.atan((1 - f) * Math.tan(phi));
        double sin0 = Math.sin(alpha) * Math.cos(beta);
        double cos0 = Math.hypot(Math.cos(alpha), Math.sin(alpha) * Math.sin(beta));
        double k2 = e2 / (1 - e2) * cos0 * cos0;
        double sigma1 = Math.atan2(Math.sin(beta), Math.cos(alpha) * Math.cos(beta));
        double omega1 = Math.atan2(sin0 * Math.sin(sigma1), Math.cos(sigma1));
        UnivariateFunction length = x -> Math.sqrt(1 + k2 * Math.sin(x) * Math.sin(x));
        double sigma2 = sigma1 + s / b;
        for (int i = 0; i < 8; i++) {
            sigma2 -= (integral(length, sigma1, sigma2) - s / b) / length.value(sigma2);
        }
        double beta2 = Math.atan2(cos0 * Math.sin(sigma2), Math.hypot(cos0 * Math.cos(sigma2), sin0));
        double omega2 = Math.atan2(sin0 * Math.sin(sigma2), Math.cos(sigma2));
        double lag = f * sin0 * integral(x -> (2 - f) / (1 + (1 - f) * length.value(x)), sigma1, sigma2);
        return new double[] {Math.atan(Math.tan(beta2) / (1 - f)), omega2 - omega1 - lag};
    }

    private static double integral(UnivariateFunction function, double from, double to) {
        GaussIntegratorFactory factory = new GaussIntegratorFactory();
        double sum = 0;
        int panels = 8;
        for (int i = 0; i < panels; i++) {
            double left = from + (to - from) * i / panels;
            double right = from + (to - from) * (i + 1) / panels;
            GaussIntegrator integrator = factory.legendre(16, left, right);
            sum += integrator.integrate(function);
        }
        return sum;
    }

    @Test
    void aWayOverAPoleIsRefused() {
        assertThatThrownBy(() -> new ShortestWay().follow(1, 0, 0, 1e7, (parameter, state) -> {}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("pole");
    }
}
