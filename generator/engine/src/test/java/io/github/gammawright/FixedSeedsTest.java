package io.github.gammawright;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.lifecycle.AfterContainer;

/** A property sees the same values in every build, but for campaigns. */
class FixedSeedsTest {

    private static final List<Integer> SEEN = new ArrayList<>();

    @Property(tries = 20, edgeCases = EdgeCasesMode.NONE)
    void seesTheSameValues(@ForAll int value) {
        SEEN.add(value);
    }

    @AfterContainer
    static void compare() {
        if (!Boolean.getBoolean("gammawright.campaigns")) {
            assertThat(SEEN).hasSize(20).startsWith(479318, -4, -4, -138);
        }
    }
}
