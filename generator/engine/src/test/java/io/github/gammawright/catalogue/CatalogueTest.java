package io.github.gammawright.catalogue;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.diagnostic.SourceText;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

class CatalogueTest {

    private static final Path FOLDER = Path.of("src/main/resources/io/github/gammawright/catalogue");

    private final Catalogue catalogue = Catalogue.standard();

    @Test
    void indexNamesWhatTheFolderHolds() throws IOException {
        try (Stream<Path> files = Files.list(FOLDER)) {
            List<String> inFolder = files.map(file -> file.getFileName().toString())
                    .filter(file -> file.endsWith(Catalogue.FILE_SUFFIX))
                    .map(file -> file.substring(0, file.length() - Catalogue.FILE_SUFFIX.length()))
                    .sorted()
                    .toList();

            assertThat(catalogue.names()).isNotEmpty().isEqualTo(inFolder);
        }
    }

    @Test
    void findsEveryNameWithItsText() throws IOException {
        for (String name : catalogue.names()) {
            SourceText source = catalogue.find(name).orElseThrow();

            assertThat(source.name()).isEqualTo(name + ".metric.toml");
            assertThat(source.text()).isEqualTo(Files.readString(FOLDER.resolve(source.name())));
        }
    }

    @Test
    void findsNothingUnderOtherNames() {
        assertThat(catalogue.find("no-such-metric")).isEmpty();
        assertThat(catalogue.find("")).isEmpty();
        assertThat(catalogue.find("Kerr")).isEmpty();
        assertThat(catalogue.find("kerr.metric.toml")).isEmpty();
        assertThat(catalogue.find("catalogue.index")).isEmpty();
        assertThat(catalogue.find("../catalogue/kerr")).isEmpty();
    }

    /** One for each spacetime or surface that users expect to find, under the name that they will type. */
    @Test
    void holdsTheMetricsThatUsersAskForByName() {
        assertThat(catalogue.names())
                .contains("minkowski", "minkowski-spherical", "minkowski-cylindrical")
                .contains("schwarzschild", "schwarzschild-isotropic", "painleve-gullstrand", "eddington-finkelstein")
                .contains("reissner-nordstrom", "kerr", "kerr-schild", "kerr-schild-spherical", "kerr-newman")
                .contains("de-sitter", "anti-de-sitter", "flrw-flat", "flrw-open", "flrw-closed", "godel", "kasner")
                .contains("ellis-wormhole", "plane-wave", "majumdar-papapetrou", "tangherlini")
                .contains("sphere", "torus", "ellipsoid-of-revolution", "ellipsoid-three-axis", "dense-eight");
    }
}
