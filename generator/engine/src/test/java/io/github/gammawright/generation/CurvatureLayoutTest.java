package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.lang.reflect.InvocationTargetException;
import org.junit.jupiter.api.Test;

/** Where the three layouts have the components of the curvature tensor. */
class CurvatureLayoutTest {

    private static final double[] PARAMETERS = {1, 0.625};
    private static final double[] POINT = {0, 3.5, 0.75, 0};

    @Test
    void allLayoutsHoldTheSameTensor() {
        TrialKernel full = TrialKernel.of("kerr", Quantity.RIEMANN, Layout.FULL);
        TrialKernel packed = TrialKernel.of("kerr", Quantity.RIEMANN, Layout.PACKED);
        TrialKernel nonZero = TrialKernel.of("kerr", Quantity.RIEMANN, Layout.NON_ZERO);
        double[] g = TrialKernel.of("kerr", Quantity.METRIC, Layout.FULL).values(PARAMETERS, POINT);
        double[] mixed = full.values(PARAMETERS, POINT);
        double[] lower = packed.values(PARAMETERS, POINT);
        double[] few = nonZero.values(PARAMETERS, POINT);
        assertThat(mixed).hasSize(256);
        assertThat(lower).hasSize(21);
        // 13 in Carter's coordinates (Chandrasekhar 1983, The Mathematical Theory of Black Holes, from memory)
        assertThat(few).hasSize(13);
        for (int k = 0; k < 4; k++) {
            for (int l = 0; l < 4; l++) {
                for (int i = 0; i < 4; i++) {
                    for (int j = 0; j < 4; j++) {
                        double lowered = 0;
                        for (int m = 0; m < 4; m++) {
                            lowered += g[k * 4 + m] * mixed[full.index("index", m, l, i, j)];
                        }
                        int sign = packed.index("sign", k, l, i, j);
                        double stored = sign == 0 ? 0 : sign * lower[packed.index("index", k, l, i, j)];
                        assertThat(stored).isCloseTo(lowered, within(1e-13));
                        int fewSign = nonZero.index("sign", k, l, i, j);
                        int place = nonZero.index("index", k, l, i, j);
                        assertThat(fewSign == 0).isEqualTo(place < 0);
                        assertThat(fewSign == 0 ? 0 : fewSign * few[place]).isCloseTo(lowered, within(1e-13));
                        // pairs A = k(k − 1)/2 + l and B alike, at A(A + 1)/2 + B
                        if (k > l && i > j && (k > i || (k == i && l >= j))) {
                            int a = k * (k - 1) / 2 + l;
                            assertThat(packed.index("index", k, l, i, j))
                                    .isEqualTo(a * (a + 1) / 2 + i * (i - 1) / 2 + j);
                        }
                    }
                }
            }
        }
    }

    @Test
    void indicesAreChecked() {
        TrialKernel packed = TrialKernel.of("sphere", Quantity.WEYL, Layout.PACKED);
        assertThat(packed.index("index", 1, 1, 0, 1)).isEqualTo(-1);
        assertThatThrownBy(() -> packed.index("sign", 0, 2, 0, 1))
                .hasRootCauseInstanceOf(IndexOutOfBoundsException.class)
                .hasCauseInstanceOf(InvocationTargetException.class);
    }
}
