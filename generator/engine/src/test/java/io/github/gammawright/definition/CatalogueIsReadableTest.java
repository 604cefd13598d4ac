package io.github.gammawright.definition;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.catalogue.Catalogue;
import io.github.gammawright.diagnostic.SourceText;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every built-in definition is a valid one. */
class CatalogueIsReadableTest {

    static Stream<String> names() {
        return Catalogue.standard().names().stream();
    }

    @ParameterizedTest
    @MethodSource("names")
    void isRead(String name) {
        SourceText source = Catalogue.standard().find(name).orElseThrow();
        MetricDefinition definition = DefinitionReader.read(source);
        assertThat(definition.name()).isEqualTo(name);
        assertThat(definition.source()).isEqualTo(source);
        assertThat(definition.reference()).isNotEmpty();
    }
}
