package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.SourceText;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A metric as its author defined it, read and checked: every name in every expression is declared, every line element
 * is quadratic in the differentials, and the abbreviations stand in an order in which each uses only earlier ones.
 *
 * @param name lower-case words joined by hyphens
 * @param title free text; empty when not given
 * @param reference where the metric comes from; empty when not given
 * @param coordinates in index order
 * @param parameters in declared order
 * @param abbreviations sorted so that each uses only earlier ones
 * @param functions functions of coordinates that the caller supplies
 * @param form the metric itself
 * @param domain where the metric is meant to be used
 * @param claims what the author believes of it
 * @param kernels the classes that a build makes; empty when not given
 * @param source the text that all this was read from
 */
public record MetricDefinition(
        String name,
        String title,
        String reference,
        List<String> coordinates,
        List<Parameter> parameters,
        List<Abbreviation> abbreviations,
        List<CallerFunction> functions,
        MetricForm form,
        Domain domain,
        Claims claims,
        List<KernelEntry> kernels,
        SourceText source) {

    public MetricDefinition {
        coordinates = List.copyOf(coordinates);
        parameters = List.copyOf(parameters);
        abbreviations = List.copyOf(abbreviations);
        functions = List.copyOf(functions);
        kernels = List.copyOf(kernels);
    }

    /** The number of coordinates, 1 to 16. */
    public int dimension() {
        return coordinates.size();
    }

    /**
     * A constructor argument of the kernels.
     *
     * @param defaultExpression free of names; absent when the definition gives no default
     * @param description free text, empty when not given
     * @param unit free text, empty when not given
     */
    public record Parameter(
            String name,
            Optional<Expression> defaultExpression,
            String description,
            String unit,
            SourcePosition position) {}

    /** A name for an expression. */
    public record Abbreviation(String name, Expression expression, SourcePosition position) {}

    /**
     * A function of some of the coordinates whose values the caller of a kernel supplies.
     *
     * @param of the coordinates it depends on, in declared order
     * @param sample an expression in these coordinates and the parameters that checks use in its place
     */
    public record CallerFunction(String name, List<String> of, Optional<Expression> sample, SourcePosition position) {

        public CallerFunction {
            of = List.copyOf(of);
        }
    }

    /** A comparison chain {@code e0 < e1 <= e2 …}; it holds when every comparison in it does, and never for NaN. */
    public record Condition(
            List<Expression> operands, List<Comparison> comparisons, String text, SourcePosition position) {

        public Condition {
            operands = List.copyOf(operands);
            comparisons = List.copyOf(comparisons);
        }
    }

    /** The comparisons that a condition may use. */
    public enum Comparison {
        LESS("<"),
        LESS_OR_EQUAL("<="),
        GREATER(">"),
        GREATER_OR_EQUAL(">=");

        private final String symbol;

        Comparison(String symbol) {
            this.symbol = symbol;
        }

        /** The comparison as it is written, in definitions and in Java alike. */
        public String symbol() {
            return symbol;
        }
    }

    /** A closed interval from which points are drawn. */
    public record Range(double from, double to) {}

    /**
     * Where the metric is meant to be used.
     *
     * @param conditions all of them hold inside
     * @param sample ranges by the name of a coordinate or parameter, in the file's order
     */
    public record Domain(List<Condition> conditions, Map<String, Range> sample) {

        public Domain {
            conditions = List.copyOf(conditions);
            sample = java.util.Collections.unmodifiableMap(new java.util.LinkedHashMap<>(sample));
        }
    }

    /**
     * What the author believes of the metric; absent where nothing is claimed.
     *
     * @param signature one {@code +} or {@code -} for each dimension, in index order or sorted
     * @param einsteinConstant Λ in R_ij = Λ g_ij for the claim {@code einstein-constant}
     * @param killing vector fields by their contravariant components
     */
    public record Claims(
            Optional<Boolean> vacuum,
            Optional<String> signature,
            Optional<List<String>> independentOf,
            Optional<Boolean> conformallyFlat,
            Optional<Expression> einsteinConstant,
            List<List<Expression>> killing) {

        public Claims {
            killing = killing.stream().map(List::copyOf).toList();
        }

        /** No claim at all. */
        public static Claims none() {
            return new Claims(
                    Optional.empty(),
                    Optional.empty(),
                    Optional.empty(),
                    Optional.empty(),
                    Optional.empty(),
                    List.of());
        }
    }

    /**
     * A {@code [[kernel]]} table, its values as they were written; what is absent takes the build's setting.
     *
     * @param quantities names of quantities, not empty
     */
    public record KernelEntry(
            Optional<String> className,
            List<String> quantities,
            Optional<String> layout,
            Optional<String> packageName,
            Optional<String> effort,
            Optional<String> trigonometry,
            Optional<Boolean> fma,
            Optional<String> prefer,
            SourcePosition position) {

        public KernelEntry {
            quantities = List.copyOf(quantities);
        }
    }
}
