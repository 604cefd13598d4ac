package io.github.gammawright.generation;

import java.util.Locale;

/**
 * How a kernel is to be made.
 *
 * @param effort how many steps the optimiser may take
 * @param trigonometry whose sine and cosine the kernel calls
 * @param fma whether {@code Math.fma} may be emitted
 * @param prefer what decides between candidates
 */
public record GenerationOptions(Effort effort, Trigonometry trigonometry, boolean fma, Preference prefer) {

    /** What is used where nothing else is said. */
    public static final GenerationOptions DEFAULT =
            new GenerationOptions(Effort.NORMAL, Trigonometry.MATH, false, Preference.SPEED);

    /** The optimiser's budget; it counts steps, so that the outcome is the same on every machine. */
    public enum Effort {
        QUICK,
        NORMAL,
        THOROUGH;

        /** The name on the command line. */
        public String symbol() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /** Whose sine and cosine a kernel calls. */
    public enum Trigonometry {
        /** {@code Math.sin} and {@code Math.cos}. */
        MATH,
        /** One private method of the class that gives both. */
        SHARED;

        /** The name on the command line. */
        public String symbol() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /** What decides between candidates. */
    public enum Preference {
        SPEED,
        ACCURACY;

        /** The name on the command line. */
        public String symbol() {
            return name().toLowerCase(Locale.ROOT);
        }
    }
}
