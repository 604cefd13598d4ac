package io.github.gammawright.verification.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;

import io.github.gammawright.verification.TestMetrics;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Equations of motion against one another and against the symbols that they contract. */
class MotionTest {

    private static final int DIGITS = 50;
    private static final RealArithmetic ARITHMETIC = RealArithmetic.ofDigits(DIGITS);
    private static final double[] POINT = {0, 4, 1.5, 2};
    private static final double[] VELOCITY = {1.25, 0.5, -0.125, 0.25};

    private static ReferencePoint kerrSchild() {
        return new ReferenceEvaluator(TestMetrics.named("kerr-schild")).at(new double[] {1, 0.5}, POINT);
    }

    /** g_ij u^j. */
    private static double[] lowered(ReferencePoint point, double[] u) {
        List<Real> metric = point.values(ReferenceQuantity.METRIC);
        double[] lowered = new double[4];
        for (int i = 0; i < 4; i++) {
            for (int j = 0; j < 4; j++) {
                lowered[i] += metric.get(4 * i + j).toDouble() * u[j];
            }
        }
        return lowered;
    }

    @Test
    void accelerationContractsTheSymbols() {
        ReferencePoint point = kerrSchild();
        List<Real> gamma = point.values(ReferenceQuantity.CHRISTOFFEL);
        List<Real> acceleration = point.values(ReferenceQuantity.GEODESIC_ACCELERATION, VELOCITY);
        List<Real> transport = point.values(ReferenceQuantity.PARALLEL_TRANSPORT, VELOCITY, VELOCITY);
        for (int k = 0; k < 4; k++) {
            Real sum = Real.ZERO;
            for (int i = 0; i < 4; i++) {
                for (int j = 0; j < 4; j++) {
                    Real uu = ARITHMETIC.multiply(Real.of(VELOCITY[i]), Real.of(VELOCITY[j]));
                    sum = ARITHMETIC.add(sum, ARITHMETIC.multiply(gamma.get((k * 4 + i) * 4 + j), uu));
                }
            }
            Reals.assertClose(acceleration.get(k), sum.negate(), DIGITS, 0.01, "a^" + k);
            Reals.assertClose(transport.get(k), sum.negate(), DIGITS, 0.01, "transport " + k);
        }
    }

    /** With p = g u, Hamilton's equations give back u, and dp/dλ = ½ ∂_k g_ij u^i u^j. */
    @Test
    void hamiltonianFlowGivesTheVelocityBack() {
        ReferencePoint point = kerrSchild();
        List<Real> flow = point.values(ReferenceQuantity.HAMILTONIAN_FLOW, lowered(point, VELOCITY));
        List<Real> derivative = point.values(ReferenceQuantity.METRIC_DERIVATIVE);
        for (int i = 0; i < 4; i++) {
            assertThat(flow.get(i).toDouble()).isCloseTo(VELOCITY[i], offset(1e-14));
            double force = 0;
            for (int a = 0; a < 4; a++) {
                for (int b = 0; b < 4; b++) {
                    force += derivative.get((i * 4 + a) * 4 + b).toDouble() * VELOCITY[a] * VELOCITY[b] / 2;
                }
            }
            assertThat(flow.get(4 + i).toDouble()).isCloseTo(force, offset(1e-14));
        }
    }

    @Test
    void byTimeIsTheSameCurve() {
        ReferencePoint point = kerrSchild();
        double[] byTime = {VELOCITY[1] / VELOCITY[0], VELOCITY[2] / VELOCITY[0], VELOCITY[3] / VELOCITY[0]};
        List<Real> affine = point.values(ReferenceQuantity.GEODESIC_ACCELERATION, VELOCITY);
        List<Real> actual = point.values(ReferenceQuantity.GEODESIC_ACCELERATION_BY_TIME, byTime);
        double[] momentum = lowered(point, VELOCITY);
        List<Real> flow = point.values(ReferenceQuantity.HAMILTONIAN_FLOW, momentum);
        List<Real> flowByTime = point.values(ReferenceQuantity.HAMILTONIAN_FLOW_BY_TIME, momentum);
        assertThat(actual).hasSize(3);
        assertThat(flowByTime).hasSize(6);
        double rate = VELOCITY[0];
        for (int k = 1; k < 4; k++) {
            // d²x/dt² = (a^k − v^k a^0) / (dt/dλ)²
            double expected =
                    (affine.get(k).toDouble() - byTime[k - 1] * affine.get(0).toDouble()) / (rate * rate);
            assertThat(actual.get(k - 1).toDouble()).isCloseTo(expected, offset(1e-14));
            assertThat(flowByTime.get(k - 1).toDouble())
                    .isCloseTo(flow.get(k).toDouble() / flow.get(0).toDouble(), offset(1e-14));
            assertThat(flowByTime.get(2 + k).toDouble())
                    .isCloseTo(flow.get(4 + k).toDouble() / flow.get(0).toDouble(), offset(1e-14));
        }
    }

    @Test
    void remainingContractions() {
        ReferencePoint point = kerrSchild();
        List<Real> inverse = point.values(ReferenceQuantity.INVERSE_METRIC);
        List<Real> gamma = point.values(ReferenceQuantity.CHRISTOFFEL);
        List<Real> contracted = point.values(ReferenceQuantity.CONTRACTED_CHRISTOFFEL);
        List<Real> derivative = point.values(ReferenceQuantity.METRIC_DERIVATIVE);
        List<Real> source = point.values(ReferenceQuantity.STRESS_SOURCE);
        Real volume = point.values(ReferenceQuantity.VOLUME_ELEMENT).get(0);
        for (int k = 0; k < 4; k++) {
            Real sum = Real.ZERO;
            for (int ij = 0; ij < 16; ij++) {
                sum = ARITHMETIC.add(sum, ARITHMETIC.multiply(inverse.get(ij), gamma.get(16 * k + ij)));
                Reals.assertClose(
                        source.get(16 * k + ij),
                        ARITHMETIC.multiply(volume, derivative.get(16 * k + ij)).scaled(-1),
                        DIGITS,
                        0.01,
                        "stress source");
            }
            Reals.assertClose(contracted.get(k), sum, DIGITS, 0.01, "Γ^" + k);
        }
    }
}
