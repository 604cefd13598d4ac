package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import javax.lang.model.SourceVersion;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.Size;

/** The small pieces of source text: literals, identifiers, comments, line breaks. */
class LiteralsAndNamesTest {

    @Property(tries = 2000)
    void literalsDenoteTheirDoubles(@ForAll long bits) {
        double value = Double.longBitsToDouble(bits);
        String literal = DoubleLiteral.of(value);
        if (Double.isFinite(value)) {
            assertThat(Double.doubleToLongBits(Double.parseDouble(literal))).isEqualTo(bits);
            assertThat(literal).containsAnyOf(".", "e").hasSizeLessThanOrEqualTo(24);
        } else {
            assertThat(literal).startsWith("Double.");
        }
    }

    /** That is shortest, where {@code Double.toString} before Java 19 was not: 2.0e-3 and 2^-44 (JDK-4511638). */
    @Example
    void literalsAreShort() {
        assertThat(DoubleLiteral.of(0.6)).isEqualTo("0.6");
        assertThat(DoubleLiteral.of(-2)).isEqualTo("-2.0");
        assertThat(DoubleLiteral.of(2.0e-3)).isEqualTo("0.002");
        assertThat(DoubleLiteral.of(Double.parseDouble("1e23"))).isEqualTo("1.0e23");
        assertThat(DoubleLiteral.of(Math.scalb(1.0, -44))).isEqualTo("5.684341886080802e-14");
        assertThat(DoubleLiteral.of(1_000_000_000)).isEqualTo("1000000000.0");
        assertThat(DoubleLiteral.of(-0.0)).isEqualTo("-0.0");
        assertThat(DoubleLiteral.of(Double.MIN_VALUE)).isEqualTo("5.0e-324");
        assertThat(DoubleLiteral.of(1.0 / 3)).isEqualTo("0.3333333333333333");
    }

    @Property(tries = 1000)
    void identifiersAreLegalAndDistinct(@ForAll @Size(max = 8) List<String> names) {
        NameAllocator allocator = new NameAllocator();
        Set<String> given = new HashSet<>();
        for (String name : names) {
            String identifier = allocator.allocate(name);
            assertThat(SourceVersion.isName(identifier, SourceVersion.RELEASE_17))
                    .as("%s for %s", identifier, name)
                    .isTrue();
            assertThat(identifier).doesNotContain("$");
            assertThat(given.add(identifier)).isTrue();
        }
    }

    @Example
    void identifiersKeepLetters() {
        NameAllocator allocator = new NameAllocator();
        assertThat(allocator.allocate("Σ")).isEqualTo("Σ");
        assertThat(allocator.allocate("θ_1")).isEqualTo("θ_1");
        assertThat(allocator.allocate("double")).isEqualTo("double_");
        assertThat(allocator.allocate("double")).isEqualTo("double_2");
        assertThat(allocator.allocate("_")).isEqualTo("__");
        assertThat(allocator.allocate("𝛼")).isEqualTo("u1D6FC");
        assertThat(allocator.allocate("x\u0301")).isEqualTo("x_u301");
        assertThat(allocator.next("t")).isEqualTo("t1");
    }

    @Property(tries = 1000)
    void commentsCannotBeLeft(@ForAll String text) {
        assertThat(JavadocText.escape(text)).doesNotContain("*/", "\\", "@", "{", "<", "\r", "\u2028");
        assertThat(JavadocText.line(text)).doesNotContain("\n", "\\");
    }

    @Property(tries = 300)
    void brokenLinesHoldTheSameTokens(@ForAll @Size(min = 1, max = 60) List<Boolean> signs) {
        StringBuilder statement = new StringBuilder("double total = start");
        for (int i = 0; i < signs.size(); i++) {
            statement.append(signs.get(i) ? " + value" : " * Math.atan2(a, b)").append(i);
        }
        String wrapped = LineBreaks.wrap(statement.toString());
        assertThat(wrapped.replaceAll("\n *", " ")).isEqualTo(statement.toString());
        assertThat(wrapped.lines()).allMatch(line -> line.length() <= 112);
    }
}
