package io.github.gammawright.verification;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.verification.SlotMap.Entry;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class SlotMapTest {

    private static final SlotMap.ClassIndex UNUSED = indices -> {
        throw new IllegalStateException("not asked");
    };

    @Test
    void fullIsRowMajor() {
        SlotMap map = SlotMap.of(ReferenceQuantity.CHRISTOFFEL, 4, Layout.FULL, 0, UNUSED, 0);
        assertThat(map.length()).isEqualTo(64);
        for (Entry entry : map.entries()) {
            List<Integer> kij = entry.indices();
            assertThat(entry.slot()).isEqualTo((kij.get(0) * 4 + kij.get(1)) * 4 + kij.get(2));
            assertThat(entry.component()).isEqualTo(entry.slot());
        }
    }

    @Test
    void packedStoresPairsOnce() {
        SlotMap map = SlotMap.of(ReferenceQuantity.CHRISTOFFEL, 4, Layout.PACKED, 0, UNUSED, 0);
        assertThat(map.length()).isEqualTo(40);
        assertThat(map.entries()).hasSize(40);
        for (Entry entry : map.entries()) {
            int k = entry.indices().get(0);
            int i = entry.indices().get(1);
            int j = entry.indices().get(2);
            assertThat(i).isGreaterThanOrEqualTo(j);
            assertThat(entry.slot()).isEqualTo(k * 10 + i * (i + 1) / 2 + j);
            assertThat(entry.component()).isEqualTo((k * 4 + i) * 4 + j);
        }
    }

    @Test
    void packedOfWhatHasNoSymmetry() {
        SlotMap map = SlotMap.of(ReferenceQuantity.SHIFT_DERIVATIVE, 4, Layout.PACKED, 0, UNUSED, 1);
        assertThat(map.length()).isEqualTo(9);
        assertThat(map.entries()).allMatch(entry -> entry.slot() == entry.component());
    }

    /** N(N+1)/2 entries with N = n(n−1)/2: 21 for n = 4. */
    @Test
    void packedCurvatureStoresPairsOfPairsOnce() {
        SlotMap map = SlotMap.of(ReferenceQuantity.LOWERED_RIEMANN, 4, Layout.PACKED, 0, UNUSED, 0);
        assertThat(map.length()).isEqualTo(21);
        assertThat(map.entries().stream().map(Entry::slot))
                .containsExactlyInAnyOrderElementsOf(
                        IntStream.range(0, 21).boxed().toList());
        assertThat(map.entries())
                .contains(
                        new Entry(List.of(1, 0, 1, 0), 68, 0),
                        new Entry(List.of(2, 1, 2, 0), 152, 4),
                        new Entry(List.of(3, 2, 3, 2), 238, 20));
    }

    @Test
    void scalarsHaveOneEntry() {
        for (Layout layout : List.of(Layout.FULL, Layout.PACKED)) {
            SlotMap map = SlotMap.of(ReferenceQuantity.VOLUME_ELEMENT, 3, layout, 0, UNUSED, 0);
            assertThat(map.entries()).containsExactly(new Entry(List.of(), 0, 0));
        }
    }

    @Test
    void nonZeroAsksTheClassWithItsOwnIndices() {
        SlotMap map = SlotMap.of(
                ReferenceQuantity.GEODESIC_ACCELERATION_BY_TIME,
                3,
                Layout.NON_ZERO,
                1,
                tuple -> tuple[0] == 2 ? 0 : -1,
                1);
        assertThat(map.entries()).containsExactly(new Entry(List.of(0), 0, -1), new Entry(List.of(1), 1, 0));
    }
}
