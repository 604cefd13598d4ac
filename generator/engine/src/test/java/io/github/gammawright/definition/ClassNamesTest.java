package io.github.gammawright.definition;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import javax.lang.model.SourceVersion;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.api.Test;

class ClassNamesTest {

    @Test
    void capitalisesEachWord() {
        assertThat(ClassNames.prefix("lantern-star")).isEqualTo("LanternStar");
        assertThat(ClassNames.prefix("kerr")).isEqualTo("Kerr");
        assertThat(ClassNames.prefix("star-2d")).isEqualTo("Star2d");
        assertThat(ClassNames.prefix("i-3-x")).isEqualTo("I3X");
        assertThatThrownBy(() -> ClassNames.prefix("Kerr")).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void definitionNamesAreLowerCaseWords() {
        assertThat(ClassNames.isDefinitionName("a")).isTrue();
        assertThat(ClassNames.isDefinitionName("a-1-b2")).isTrue();
        assertThat(ClassNames.isDefinitionName("a".repeat(64))).isTrue();
        for (String wrong : new String[] {"", "A", "1a", "-a", "a-", "a--b", "a_b", "a b", "ä", "a/b", "a.b", "ı"}) {
            assertThat(ClassNames.isDefinitionName(wrong)).as(wrong).isFalse();
        }
        assertThat(ClassNames.isDefinitionName("a".repeat(65))).isFalse();
    }

    @Property
    void everyPrefixBeginsALegalClassName(@ForAll("names") String name) {
        assertThat(ClassNames.isClassName(ClassNames.prefix(name) + "Metric")).isTrue();
    }

    @Provide
    Arbitrary<String> names() {
        return Arbitraries.strings()
                .withChars("abcz019-")
                .ofMinLength(1)
                .ofMaxLength(12)
                .map(s -> "x" + s)
                .filter(ClassNames::isDefinitionName);
    }

    @Test
    void classNamesAreUsableInJava() {
        assertThat(ClassNames.isClassName("LanternStarOrbit")).isTrue();
        assertThat(ClassNames.isClassName("Σ")).isTrue();
        for (String wrong : new String[] {
            "class", "int", "true", "_", "record", "var", "1A", "A-B", "A.B", "", "A B", "Math", "String", "A\u200bB"
        }) {
            assertThat(ClassNames.isClassName(wrong)).as(wrong).isFalse();
        }
    }

    @Test
    void packageNamesAreUsableInJava() {
        assertThat(ClassNames.isPackageName("com.example.kernels")).isTrue();
        assertThat(ClassNames.isPackageName("kernels")).isTrue();
        for (String wrong : new String[] {"", "com..x", ".x", "x.", "com.class", "a/b", "../x", "a.b;c"}) {
            assertThat(ClassNames.isPackageName(wrong)).as(wrong).isFalse();
        }
        assertThat(SourceVersion.isName("com.example.kernels")).isTrue();
    }

    @Test
    void reservedNames() {
        assertThat(Names.isReserved("pi")).isTrue();
        assertThat(Names.isReserved("atan2")).isTrue();
        assertThat(Names.isReserved("Pi")).isFalse();
        assertThat(Names.isReserved("e")).isFalse();
        assertThat(Names.differential("theta")).isEqualTo("dtheta");
        assertThat(Names.isName("r_1")).isTrue();
        assertThat(Names.isName("1r")).isFalse();
        assertThat(Names.isName("r'")).isFalse();
        assertThat(Names.isName("*/")).isFalse();
    }
}
