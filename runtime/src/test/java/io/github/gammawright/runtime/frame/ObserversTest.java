package io.github.gammawright.runtime.frame;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.runtime.KerrByHand;
import io.github.gammawright.runtime.MetricTensor;
import io.github.gammawright.runtime.NormalizationException;
import io.github.gammawright.runtime.Signature;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class ObserversTest {

    private static final double SPIN = 0.875;

    private final KerrByHand kerr = new KerrByHand(SPIN);
    private final MetricTensor metric = new MetricTensor(4, kerr::metric);
    private final Observers observers = new Observers(metric, Signature.MOSTLY_PLUS);

    /**
     * Angular velocity 2Mar/A and lapse √(ΣΔ/A) of the observers of zero angular momentum (Bardeen, Press &amp; Teukolsky
     * 1972, eq. 2.3 and after; from memory), computed with 60 digits from those formulas.
     */
    @Test
    void zeroAngularMomentumObserversTurnWithTheHole() {
        double[] u = observers.zeroAngularMomentumVelocity(new double[] {0, 2, 0.5, 0});
        assertThat(u[3] / u[0]).isCloseTo(0.1550288126680230, within(1e-15));
        assertThat(1 / u[0]).isCloseTo(0.3945207792882800, within(1e-15));
        double[] p = new double[4];
        metric.lower(new double[] {0, 2, 0.5, 0}, u, p);
        assertThat(p[3]).isCloseTo(0, within(1e-15));
    }

    @Test
    void nothingRestsInTheErgosphere() {
        double[] inside = {0, 1.75, Math.PI / 2, 0};
        assertThatThrownBy(() -> observers.staticVelocity(inside))
                .isInstanceOf(NormalizationException.class)
                .hasMessageContaining("nothing can be at rest");
        assertThat(observers.zeroAngularMomentumVelocity(inside)[0]).isPositive();
        double[] outside = {0, 6, 1.25, 0};
        double[] u = observers.staticVelocity(outside);
        assertThat(metric.square(outside, u)).isCloseTo(-1, within(1e-15));
        assertThat(u).endsWith(0, 0, 0);
    }

    @Property
    void framesAreOrthonormalAndHaveTheirHandedness(
            @ForAll @DoubleRange(min = 2, max = 50) double r,
            @ForAll @DoubleRange(min = 0.1, max = 3) double theta,
            @ForAll @DoubleRange(min = -0.5, max = 0.5) double along,
            @ForAll Handedness handedness) {
        double[] point = {0, r, theta, 0};
        double[] u = observers.zeroAngularMomentumVelocity(point);
        u[1] += along * 0.1 * u[0];
        OrthonormalFrame frame = observers.frame(
                point, u, handedness, new double[] {0, 1, 0, 0}, new double[] {0, along, 0, 1}, new double[] {0, 0, 1, 0
                });
        for (int a = 0; a < 4; a++) {
            for (int b = 0; b < 4; b++) {
                double expected = a != b ? 0 : a == 0 ? -1 : 1;
                assertThat(metric.product(point, frame.vector(a), frame.vector(b)))
                        .isCloseTo(expected, within(1e-12));
            }
        }
        // The seeds e_φ, e_θ stand in the odd order, so that the last vector says which way it was turned.
        double eTheta = frame.vector(3)[2];
        assertThat(eTheta > 0).isEqualTo(handedness == Handedness.LEFT);
        double[] components = {1.25, -0.5, 0.25, 2};
        double[] back = frame.toFrame(frame.toCoordinates(components));
        for (int a = 0; a < 4; a++) {
            assertThat(back[a]).isCloseTo(components[a], within(1e-12));
        }
    }

    @Test
    void coordinateSeedsGiveARightHandedFrameWithoutTurning() {
        double[] point = {0, 6, 1.25, 0};
        OrthonormalFrame frame = observers.frame(point, observers.staticVelocity(point), Handedness.RIGHT);
        for (int a = 1; a < 4; a++) {
            assertThat(frame.vector(a)[a]).isPositive();
        }
        assertThat(frame.point()).containsExactly(point);
    }

    @Test
    void dependentSeedsAreRefused() {
        double[] point = {0, 6, 1.25, 0};
        double[] u = observers.staticVelocity(point);
        double[] v = {0, 1, 0, 0};
        double[] w = {0, 0, 1, 0};
        assertThatThrownBy(() -> observers.frame(point, u, Handedness.RIGHT, v, w, new double[] {1, 3, -2, 0}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("vector 3");
        assertThatThrownBy(() -> observers.frame(point, u, Handedness.RIGHT, v, w))
                .hasMessageContaining("3 vectors besides the velocity, not 2");
        assertThatThrownBy(() -> observers.frame(point, v, Handedness.RIGHT))
                .isInstanceOf(NormalizationException.class);
    }

    /**
     * Light from a static observer to another: the energy it is seen with, −g(k, u), is that at infinity over √(1 − 2M/r)
     * (Misner, Thorne &amp; Wheeler 1973, sec. 25.4; from memory).
     */
    @Test
    void aCamerasLightIsNullAndOfUnitEnergy() {
        double[] point = {0, 10, 1.25, 0.5};
        double[] u = observers.staticVelocity(point);
        Camera camera = new Camera(observers.frame(point, u, Handedness.RIGHT));
        for (double right : new double[] {0, 0.5, -2}) {
            for (double up : new double[] {0, 0.25, -1}) {
                for (double[] k : new double[][] {camera.incoming(right, up), camera.outgoing(right, up)}) {
                    assertThat(metric.square(point, k)).isCloseTo(0, within(1e-14));
                    assertThat(metric.product(point, k, u)).isCloseTo(-1, within(1e-14));
                    assertThat(k[0]).isPositive();
                }
            }
        }
        // The middle of a picture looks along e_1, and a pixel at the right edge half the field of view to the right.
        double[] middle = camera.incomingAtPixel(49.5, 24.5, 100, 50, 1);
        double[] ahead = camera.incoming(0, 0);
        double[] edge = camera.incomingAtPixel(99.5, 24.5, 100, 50, 1);
        double[] right = camera.incoming(0.5, 0);
        double[] top = camera.frame().toFrame(camera.incomingAtPixel(49.5, 0, 100, 50, 1));
        for (int i = 0; i < 4; i++) {
            assertThat(middle[i]).isCloseTo(ahead[i], within(1e-15));
            assertThat(edge[i]).isCloseTo(right[i], within(1e-15));
        }
        assertThat(top[3]).isNegative(); // light from above goes down
        assertThatThrownBy(() -> camera.incomingAtPixel(0, 0, 10, 10, 4)).hasMessageContaining("between 0 and π");
    }
}
