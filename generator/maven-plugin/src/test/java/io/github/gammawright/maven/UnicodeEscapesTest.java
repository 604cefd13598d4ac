package io.github.gammawright.maven;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class UnicodeEscapesTest {

    @Test
    void escapesWhatIsBeyondAscii() {
        assertThat(UnicodeEscapes.escape("double \u0393 = 1; // \ud835\udefe"))
                .isEqualTo("double \\u0393 = 1; // \\ud835\\udefe");
    }
}
