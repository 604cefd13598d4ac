package io.github.gammawright.runtime;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.junit.jupiter.api.Test;

/** Velocities whose time component is known in closed form, and the ones that don't exist. */
class NormalizationTest {

    private static final double[] AT_TEN = {0, 10, 0};

    private final Normalization schwarzschild = normalization(Kernels::schwarzschildMetric);
    private final Normalization kerr = normalization(Kernels::kerrMetric);

    /** u^t = (1 − 3M/r)^(−1/2) (Misner, Thorne &amp; Wheeler 1973, Gravitation, sec. 25.5; from memory). */
    @Test
    void circularOrbitsHaveThePublishedTimeComponent() {
        double timeComponent = 1 / Math.sqrt(1 - 0.3);
        double[] velocity = {Double.NaN, 0, Math.sqrt(1e-3) * timeComponent};
        schwarzschild.solveTimeComponent(AT_TEN, velocity, Causality.TIMELIKE, Root.LARGER);
        assertThat(velocity[0]).isCloseTo(timeComponent, within(1e-15));
        schwarzschild.solveTimeComponent(AT_TEN, velocity, Causality.TIMELIKE, Root.SMALLER);
        assertThat(velocity[0]).isCloseTo(-timeComponent, within(1e-15));
        double[] direction = {1, 0, Math.sqrt(1e-3)};
        schwarzschild.rescale(AT_TEN, direction, Causality.TIMELIKE);
        assertThat(direction[0]).isCloseTo(timeComponent, within(1e-15));
    }

    /** Radial light has dr/dt = ±(1 − 2M/r) (the same, sec. 31.3; from memory). */
    @Test
    void radialLightHasThePublishedSpeed() {
        double[] velocity = {0, -1, 0};
        schwarzschild.solveTimeComponent(AT_TEN, velocity, Causality.NULL, Root.LARGER);
        assertThat(velocity[0]).isCloseTo(1 / 0.8, within(1e-15));
    }

    @Test
    void theOtherSignatureGivesTheSameVelocity() {
        MetricTensor opposite = new MetricTensor(3, (x, g) -> {
            Kernels.schwarzschildMetric(x, g);
            for (int i = 0; i < g.length; i++) {
                g[i] = -g[i];
            }
        });
        double[] here = {0, 0.25, 0.01};
        double[] there = here.clone();
        schwarzschild.solveTimeComponent(AT_TEN, here, Causality.TIMELIKE, Root.LARGER);
        new Normalization(opposite, Signature.MOSTLY_MINUS)
                .solveTimeComponent(AT_TEN, there, Causality.TIMELIKE, Root.LARGER);
        assertThat(there).containsExactly(here, within(1e-15));
    }

    /**
     * Inside the ergosphere, here at r = 1.5 M and so below 2M, g_tt > 0: nothing stays at rest, what goes round with the hole has two
     * time components of one sign (Misner, Thorne &amp; Wheeler 1973, sec. 33.4; from memory).
     */
    @Test
    void nothingRestsInTheErgosphere() {
        double[] point = {0, 1.5, 0};
        assertThatThrownBy(() -> kerr.solveTimeComponent(point, new double[3], Causality.TIMELIKE, Root.LARGER))
                .isInstanceOf(NormalizationException.class)
                .hasMessage("at [0.0, 1.5, 0.0] no time component makes the velocity timelike with the components"
                        + " [0.0, 0.0] in space");
        double[] velocity = {0, 0, 3};
        kerr.solveTimeComponent(point, velocity, Causality.TIMELIKE, Root.LARGER);
        double larger = velocity[0];
        kerr.solveTimeComponent(point, velocity, Causality.TIMELIKE, Root.SMALLER);
        assertThat(velocity[0]).isPositive().isLessThan(larger);
    }

    /** On the static limit r = 2M the equation is linear and has one solution. */
    @Test
    void theStaticLimitHasOneSolution() {
        double[] point = {0, 2, 0};
        double[] velocity = {0, 0, 0.5};
        kerr.solveTimeComponent(point, velocity, Causality.TIMELIKE, Root.LARGER);
        double[] other = velocity.clone();
        kerr.solveTimeComponent(point, other, Causality.TIMELIKE, Root.SMALLER);
        assertThat(other).containsExactly(velocity);
        assertThat(new MetricTensor(3, Kernels::kerrMetric).square(point, velocity))
                .isCloseTo(-1, within(1e-13));
    }

    @Test
    void whatCannotBeNormalisedIsSaidAndLeftAlone() {
        double[] spacelike = {0, 1, 0};
        assertThatThrownBy(() -> schwarzschild.rescale(AT_TEN, spacelike, Causality.TIMELIKE))
                .isInstanceOf(NormalizationException.class)
                .hasMessage("at [0.0, 10.0, 0.0] the velocity [0.0, 1.0, 0.0] is not timelike: its square is 1.25");
        assertThat(spacelike).containsExactly(0, 1, 0);
        assertThatThrownBy(() -> schwarzschild.rescale(AT_TEN, new double[3], Causality.SPACELIKE))
                .isInstanceOf(NormalizationException.class);
        assertThatThrownBy(() -> schwarzschild.rescale(AT_TEN, spacelike, Causality.NULL))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("solve for the time component");
        assertThatThrownBy(() -> schwarzschild.solveTimeComponent(AT_TEN, new double[4], Causality.NULL, Root.LARGER))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a vector has 4 entries, and 3 are needed");
        assertThatThrownBy(() -> schwarzschild.solveTimeComponent(
                        new double[] {0, Double.NaN, 0}, new double[3], Causality.TIMELIKE, Root.LARGER))
                .isInstanceOf(NormalizationException.class);
    }

    @Property
    void theSquareIsTheWantedOne(
            @ForAll @DoubleRange(min = 1.5, max = 60) @Scale(12) double radius,
            @ForAll @DoubleRange(min = -2, max = 2) @Scale(12) double radial,
            @ForAll @DoubleRange(min = -2, max = 2) @Scale(12) double angular,
            @ForAll Causality causality,
            @ForAll Root root) {
        double[] point = {0, radius, 0};
        double[] velocity = {0, radial, angular};
        try {
            kerr.solveTimeComponent(point, velocity, causality, root);
        } catch (NormalizationException none) {
            // Only in the ergosphere, or for a spacelike velocity that is too short.
            assertThat(radius <= 2 || causality == Causality.SPACELIKE).isTrue();
            return;
        }
        double[] g = new double[9];
        Kernels.kerrMetric(point, g);
        double size = 1;
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                size += Math.abs(g[3 * i + j] * velocity[i] * velocity[j]);
            }
        }
        assertThat(new MetricTensor(3, Kernels::kerrMetric).square(point, velocity))
                .isCloseTo(Signature.MOSTLY_PLUS.square(causality), within(1e-14 * size));
    }

    private static Normalization normalization(PointKernel kernel) {
        return new Normalization(new MetricTensor(3, kernel), Signature.MOSTLY_PLUS);
    }
}
