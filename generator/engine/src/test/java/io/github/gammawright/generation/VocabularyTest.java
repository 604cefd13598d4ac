package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import org.junit.jupiter.api.Test;

class VocabularyTest {

    @Test
    void everyWordIsFound() {
        for (Quantity quantity : Quantity.values()) {
            assertThat(Vocabulary.quantities().find(quantity.symbol())).contains(quantity);
        }
        assertThat(Vocabulary.layouts().find("non-zero")).contains(Layout.NON_ZERO);
        assertThat(Vocabulary.layouts().find("NON_ZERO")).isEmpty();
    }

    @Test
    void complaintsOfferTheNearestWord() {
        assertThat(Vocabulary.quantities().complaint("geodesic-accelration"))
                .isEqualTo("unknown quantity 'geodesic-accelration'; did you mean 'geodesic-acceleration'?");
        assertThat(Vocabulary.layouts().complaint("sideways"))
                .isEqualTo("unknown layout 'sideways'; known are full, packed, non-zero");
        assertThat(Vocabulary.layouts().complaint("\u001b[31m")).doesNotContain("\u001b");
    }
}
