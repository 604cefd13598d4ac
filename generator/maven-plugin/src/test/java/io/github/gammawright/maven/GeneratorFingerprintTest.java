package io.github.gammawright.maven;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.List;
import org.junit.jupiter.api.Test;

class GeneratorFingerprintTest {

    @Test
    void dependsOnTheLibraries() throws IOException {
        String one = GeneratorFingerprint.of(List.of("a:1", "b:1"));

        assertThat(one).matches("[0-9a-f]{64}");
        assertThat(GeneratorFingerprint.of(List.of("b:1", "a:1"))).isEqualTo(one);
        assertThat(GeneratorFingerprint.of(List.of("a:1", "b:2"))).isNotEqualTo(one);
    }

    /** Else a change could hide in the boundary between two. */
    @Test
    void itemsDoNotRunIntoEachOther() {
        assertThat(new Fingerprint().add("ab").add("c").hex())
                .isNotEqualTo(new Fingerprint().add("a").add("bc").hex());
        assertThat(Fingerprint.of(new byte[0])).hasSize(64);
    }
}
