package io.github.gammawright.catalogue;

import io.github.gammawright.diagnostic.SourceText;
import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;

/**
 * The built-in metric definitions: texts in the format that users write, found by name.
 *
 * <pre>{@code
 * Catalogue catalogue = Catalogue.standard();
 * catalogue.names();        // [..., kerr, kerr-newman, kerr-schild, ...]
 * catalogue.find("kerr");   // the text of kerr.metric.toml
 * catalogue.find("mistle"); // empty
 * }</pre>
 *
 * <p>Immutable and thread-safe.
 */
public final class Catalogue {

    /** What follows the name of a definition in the name of its file. */
    public static final String FILE_SUFFIX = ".metric.toml";

    /** A class path cannot be listed portably, so a resource says what is there: one name a line, sorted. */
    private static final String INDEX = "catalogue.index";

    private final List<String> names;

    private Catalogue(List<String> names) {
        this.names = List.copyOf(names);
    }

    /** The catalogue that comes with the engine. */
    public static Catalogue standard() {
        return new Catalogue(resource(INDEX).lines().toList());
    }

    /** The names of all built-in definitions in alphabetical order. */
    public List<String> names() {
        return names;
    }

    /**
     * The definition of the given name, if there is one. Messages refer to it as {@code NAME.metric.toml}.
     *
     * @param name a name without suffix, such as {@code kerr-schild}; anything at all may be asked for
     */
    public Optional<SourceText> find(String name) {
        if (!names.contains(name)) {
            return Optional.empty();
        }
        String file = name + FILE_SUFFIX;
        return Optional.of(new SourceText(file, resource(file)));
    }

    private static String resource(String name) {
        try (InputStream stream = Catalogue.class.getResourceAsStream(name)) {
            if (stream == null) {
                throw new FileNotFoundException(name + " is missing from the engine's class path");
            }
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
