package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import io.github.gammawright.geometry.Layout;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Emitted classes are compiled, run, and compared with the program that they were made from. */
class KernelEmitterTest {

    private static final double[] POINT = {0.3, 6.25, 1.1, -2.0};

    @ParameterizedTest
    @EnumSource(Layout.class)
    void everyEntryHasTheValueOfItsInstruction(Layout layout) {
        KernelModel model = Schwarzschild.christoffel(layout);
        CompiledKernel kernel = CompiledKernel.of(model);
        double[] expected = Schwarzschild.values(model.program(), 1.25, POINT);
        List<Integer> slots = model.results().get(0).slots();
        double[] values = (double[]) kernel.call(kernel.create(1.25), "valuesAt", (Object) POINT);
        assertThat(values).hasSize(slots.size());
        for (int slot = 0; slot < values.length; slot++) {
            double wanted = slots.get(slot) < 0 ? 0.0 : expected[slots.get(slot)];
            assertThat(values[slot]).isEqualTo(wanted);
        }
    }

    @Test
    void wrongLengthsAreToldWithBothLengths() {
        CompiledKernel kernel = CompiledKernel.of(Schwarzschild.christoffel(Layout.FULL));
        Object created = kernel.create();
        assertThatThrownBy(() -> kernel.call(created, "evaluate", new double[3], new double[64]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("point has length 3, not the required 4");
        assertThatThrownBy(() -> kernel.call(created, "evaluate", new double[4], new double[63]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("christoffel has length 63, not the required 64");
    }
}
