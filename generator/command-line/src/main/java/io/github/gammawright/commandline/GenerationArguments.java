package io.github.gammawright.commandline;

import io.github.gammawright.generation.GenerationOptions.Effort;
import io.github.gammawright.generation.GenerationOptions.Preference;
import io.github.gammawright.generation.GenerationOptions.Trigonometry;
import io.github.gammawright.generation.Vocabulary;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.Optional;
import picocli.CommandLine.Option;

/** The options that say how a kernel is made. */
final class GenerationArguments {

    @Option(
            names = "--layout",
            paramLabel = "L",
            converter = LayoutConverter.class,
            description = {
                "How results are laid out: full (default; row-major over all indices), packed (each symmetric pair"
                        + " once) or non-zero (only components that are not identically zero)."
            })
    private Layout layout;

    @Option(
            names = "--effort",
            paramLabel = "E",
            converter = EffortConverter.class,
            description = "How much work goes into fewer operations: quick, normal (default) or thorough.")
    private Effort effort;

    @Option(
            names = "--trigonometry",
            paramLabel = "T",
            converter = TrigonometryConverter.class,
            description = {
                "Whose sine and cosine the classes call: math (default; java.lang.Math) or shared (a method of the"
                        + " class that gives both at once)."
            })
    private Trigonometry trigonometry;

    @Option(
            names = "--fma",
            description = {"Let the classes call Math.fma, which is very slow on processors that do not have it."})
    private boolean fma;

    @Option(
            names = "--prefer",
            paramLabel = "P",
            converter = PreferenceConverter.class,
            description = "What decides between several ways to compute the same: speed (default) or accuracy.")
    private Preference prefer;

    Optional<Layout> layout() {
        return Optional.ofNullable(layout);
    }

    Optional<Effort> effort() {
        return Optional.ofNullable(effort);
    }

    Optional<Trigonometry> trigonometry() {
        return Optional.ofNullable(trigonometry);
    }

    Optional<Boolean> fma() {
        return fma ? Optional.of(true) : Optional.empty();
    }

    Optional<Preference> prefer() {
        return Optional.ofNullable(prefer);
    }

    static final class QuantityConverter extends WordConverter<Quantity> {
        QuantityConverter() {
            super(Vocabulary.quantities());
        }
    }

    static final class LayoutConverter extends WordConverter<Layout> {
        LayoutConverter() {
            super(Vocabulary.layouts());
        }
    }

    static final class EffortConverter extends WordConverter<Effort> {
        EffortConverter() {
            super(Vocabulary.efforts());
        }
    }

    static final class TrigonometryConverter extends WordConverter<Trigonometry> {
        TrigonometryConverter() {
            super(Vocabulary.trigonometry());
        }
    }

    static final class PreferenceConverter extends WordConverter<Preference> {
        PreferenceConverter() {
            super(Vocabulary.preferences());
        }
    }
}
