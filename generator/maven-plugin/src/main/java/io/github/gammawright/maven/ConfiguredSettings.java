package io.github.gammawright.maven;

import io.github.gammawright.generation.BuildSettings;
import io.github.gammawright.generation.BuildSettings.Precedence;
import io.github.gammawright.generation.Vocabulary;
import io.github.gammawright.geometry.Quantity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.maven.plugin.MojoFailureException;

/** The configuration of a goal as it stands in the pom. */
record ConfiguredSettings(
        String packageName,
        List<String> quantities,
        String layout,
        String effort,
        String trigonometry,
        boolean fma,
        String prefer) {

    ConfiguredSettings {
        quantities = quantities == null ? List.of() : List.copyOf(quantities);
    }

    /** The configuration with its words looked up. */
    BuildSettings resolve() throws MojoFailureException {
        List<String> complaints = new ArrayList<>();
        List<Quantity> resolved = new ArrayList<>();
        for (String name : quantities) {
            lookUp("quantities", Vocabulary.quantities(), name, complaints).ifPresent(resolved::add);
        }
        BuildSettings settings = new BuildSettings(
                Precedence.TABLES,
                Optional.of(packageName),
                Optional.empty(),
                resolved,
                List.of(Quantity.METRIC, Quantity.INVERSE_METRIC, Quantity.CHRISTOFFEL, Quantity.GEODESIC_ACCELERATION),
                lookUp("layout", Vocabulary.layouts(), layout, complaints),
                lookUp("effort", Vocabulary.efforts(), effort, complaints),
                lookUp("trigonometry", Vocabulary.trigonometry(), trigonometry, complaints),
                Optional.of(fma),
                lookUp("prefer", Vocabulary.preferences(), prefer, complaints));
        complaints.addAll(settings.complaints());
        if (!complaints.isEmpty()) {
            throw new MojoFailureException(String.join("\n", complaints));
        }
        return settings;
    }

    private static <T> Optional<T> lookUp(
            String parameter, Vocabulary<T> vocabulary, String word, List<String> complaints) {
        Optional<T> value = vocabulary.find(word);
        if (value.isEmpty()) {
            complaints.add("<" + parameter + ">: " + vocabulary.complaint(word));
        }
        return value;
    }
}
