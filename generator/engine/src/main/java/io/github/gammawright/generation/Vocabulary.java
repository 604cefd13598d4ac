package io.github.gammawright.generation;

import io.github.gammawright.diagnostic.Spelling;
import io.github.gammawright.diagnostic.VisibleText;
import io.github.gammawright.generation.GenerationOptions.Effort;
import io.github.gammawright.generation.GenerationOptions.Preference;
import io.github.gammawright.generation.GenerationOptions.Trigonometry;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * The words that a command line, a Maven configuration or a {@code [[kernel]]} table may use for one thing.
 *
 * @param kind what the words name, such as {@code quantity}
 * @param values what they stand for
 * @param symbol the word for a value
 */
public record Vocabulary<T>(String kind, List<T> values, Function<T, String> symbol) {

    /** The names of quantities. */
    public static Vocabulary<Quantity> quantities() {
        return new Vocabulary<>("quantity", List.of(Quantity.values()), Quantity::symbol);
    }

    /** The names of layouts. */
    public static Vocabulary<Layout> layouts() {
        return new Vocabulary<>("layout", List.of(Layout.values()), Layout::symbol);
    }

    /** The names of efforts. */
    public static Vocabulary<Effort> efforts() {
        return new Vocabulary<>("effort", List.of(Effort.values()), Effort::symbol);
    }

    /** The names of the ways to compute sine and cosine. */
    public static Vocabulary<Trigonometry> trigonometry() {
        return new Vocabulary<>("trigonometry", List.of(Trigonometry.values()), Trigonometry::symbol);
    }

    /** The names of preferences. */
    public static Vocabulary<Preference> preferences() {
        return new Vocabulary<>("preference", List.of(Preference.values()), Preference::symbol);
    }

    /** All words, in the order of their values. */
    public List<String> words() {
        return values.stream().map(symbol).toList();
    }

    /** What the word stands for, if it is known. */
    public Optional<T> find(String word) {
        return values.stream().filter(value -> symbol.apply(value).equals(word)).findFirst();
    }

    /** The word that was probably meant. */
    public Optional<String> nearest(String word) {
        return Spelling.nearest(word, words());
    }

    /** Says in one line that a word is not known, and which one may be meant. */
    public String complaint(String word) {
        String advice = nearest(word)
                .map(nearest -> "did you mean '" + nearest + "'?")
                .orElseGet(() -> "known are " + String.join(", ", words()));
        return "unknown " + kind + " '" + VisibleText.of(word) + "'; " + advice;
    }
}
