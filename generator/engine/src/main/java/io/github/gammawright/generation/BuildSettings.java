package io.github.gammawright.generation;

import io.github.gammawright.generation.GenerationOptions.Effort;
import io.github.gammawright.generation.GenerationOptions.Preference;
import io.github.gammawright.generation.GenerationOptions.Trigonometry;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * What a run was asked to make, by its command line or by a Maven configuration.
 *
 * @param precedence whether these settings or the {@code [[kernel]]} tables of a definition decide where both speak
 * @param packageName the Java package, empty for the unnamed one
 * @param className the one class that holds all the quantities; without it each quantity has its own
 * @param quantities what to compute; empty where the tables, or else the defaults, decide
 * @param defaults what is computed for a definition without tables when nothing was asked for
 */
public record BuildSettings(
        Precedence precedence,
        Optional<String> packageName,
        Optional<String> className,
        List<Quantity> quantities,
        List<Quantity> defaults,
        Optional<Layout> layout,
        Optional<Effort> effort,
        Optional<Trigonometry> trigonometry,
        Optional<Boolean> fma,
        Optional<Preference> prefer) {

    /** The package where none is named. */
    public static final String DEFAULT_PACKAGE = "kernels";

    public BuildSettings {
        quantities = List.copyOf(quantities);
        defaults = List.copyOf(defaults);
    }

    /** Nothing asked for: the tables of each definition, or else the defaults. */
    public static BuildSettings of(Precedence precedence, List<Quantity> defaults) {
        return new BuildSettings(
                precedence,
                Optional.empty(),
                Optional.empty(),
                List.of(),
                defaults,
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty());
    }

    /** What is wrong with the settings themselves, one line each: names that are none in Java, quantities given twice. */
    public List<String> complaints() {
        List<String> complaints = new ArrayList<>();
        packageName.flatMap(JavaNames::complaintAboutPackage).ifPresent(complaints::add);
        className.flatMap(JavaNames::complaintAboutClass).ifPresent(complaints::add);
        Set<Quantity> seen = EnumSet.noneOf(Quantity.class);
        for (Quantity quantity : quantities) {
            if (!seen.add(quantity)) {
                complaints.add("the quantity '" + quantity.symbol() + "' is given twice");
            }
        }
        return complaints;
    }

    /** Who decides where both the settings and a {@code [[kernel]]} table say something. */
    public enum Precedence {
        /** The settings were made for this very run, as on a command line. */
        SETTINGS,
        /** The settings are those of a whole project, and the table is about one class. */
        TABLES
    }
}
