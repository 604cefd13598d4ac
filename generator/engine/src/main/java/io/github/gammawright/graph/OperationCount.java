package io.github.gammawright.graph;

import java.util.Map;
import java.util.TreeMap;

/**
 * How many operations one evaluation costs. Each binary + − × / on doubles counts 1 and an fma 2; negation, stores,
 * index arithmetic and work on parameters alone count 0; square roots and elementary functions are listed apart. Where a
 * class computes sine and cosine by itself, both of an argument together are listed as one {@code sincos}.
 *
 * @param additions sums and differences
 * @param multiplications products
 * @param divisions quotients, reciprocals included
 * @param functions calls by name, {@code sqrt} included; sorted by name
 */
public record OperationCount(int additions, int multiplications, int divisions, Map<String, Integer> functions) {

    /** Sine and cosine of one argument, computed together. */
    public static final String SINCOS = "sincos";

    public OperationCount {
        functions = java.util.Collections.unmodifiableMap(new TreeMap<>(functions));
    }

    /** All binary operations together. */
    public int operations() {
        return additions + multiplications + divisions;
    }

    /** For example {@code 53 operations (20 +, 31 ×, 2 ÷) and cos 1, sin 1}. */
    @Override
    public String toString() {
        StringBuilder text = new StringBuilder();
        text.append(operations()).append(operations() == 1 ? " operation" : " operations");
        if (operations() > 0) {
            text.append(" (")
                    .append(additions)
                    .append(" +, ")
                    .append(multiplications)
                    .append(" ×, ");
            text.append(divisions).append(" ÷)");
        }
        String separator = " and ";
        for (Map.Entry<String, Integer> function : functions.entrySet()) {
            text.append(separator).append(function.getKey()).append(' ').append(function.getValue());
            separator = ", ";
        }
        return text.toString();
    }
}
