package io.github.gammawright.samples;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.samples.kernels.SchwarzschildChristoffel;
import io.github.gammawright.samples.kernels.SchwarzschildNonZeroChristoffel;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.junit.jupiter.api.Test;

/**
 * Schwarzschild's nine symbols: Misner, Thorne &amp; Wheeler 1973, Gravitation, ch. 31; Carroll 2004, Spacetime and
 * Geometry, sec. 5.4 (from memory).
 */
class SchwarzschildTest {

    @Test
    void nineSymbolsAreNotZero() {
        assertThat(SchwarzschildNonZeroChristoffel.LENGTH).isEqualTo(9);
    }

    @Property
    void theNineHaveTheirClosedForms(
            @ForAll @DoubleRange(min = 0.25, max = 4) @Scale(12) double mass,
            @ForAll @DoubleRange(min = 2.03125, max = 500) @Scale(12) double radiusInMasses,
            @ForAll @DoubleRange(min = 0.001, max = 3.14) @Scale(12) double theta) {
        double r = radiusInMasses * mass;
        double s = Math.sin(theta);
        double c = Math.cos(theta);
        int compared = new ExpectedConnection(4)
                .with(0, 0, 1, mass / (r * (r - 2 * mass)))
                .with(1, 0, 0, mass * (r - 2 * mass) / (r * r * r))
                .with(1, 1, 1, -mass / (r * (r - 2 * mass)))
                .with(1, 2, 2, -(r - 2 * mass))
                .with(1, 3, 3, -(r - 2 * mass) * s * s)
                .with(2, 1, 2, 1 / r)
                .with(2, 3, 3, -s * c)
                .with(3, 1, 3, 1 / r)
                .with(3, 2, 3, c / s)
                .compareWith(new SchwarzschildChristoffel(mass).valuesAt(new double[] {1, r, theta, 2}), 2e-14);
        assertThat(compared).isEqualTo(9);
    }
}
