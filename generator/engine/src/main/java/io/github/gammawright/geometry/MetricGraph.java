package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.function.UnaryOperator;

/**
 * A metric as nodes of a graph.
 *
 * @param graph where the nodes live
 * @param coordinates in index order
 * @param components g_ij, symmetric
 * @param quadraticForm g_ij u^i u^j as the author wrote it, with the velocities in place of the differentials; absent
 *     when the metric was given by its components
 * @param velocities the symbols u^i
 * @param squares the author's line element as a sum of weighted squares of one-forms, where it is one
 * @param split the author's lapse and shift, where the metric was given by them
 * @param coframe the author's orthonormal one-forms, where the metric was given by them
 * @param notNegative tells of values that they are certainly nowhere negative in the domain
 */
@SuppressWarnings("ArrayRecordComponent") // the matrix is read by index everywhere and never handed out of the engine
public record MetricGraph(
        ExpressionGraph graph,
        List<Symbol> coordinates,
        Node[][] components,
        Optional<Node> quadraticForm,
        List<Symbol> velocities,
        Optional<List<WeightedSquare>> squares,
        Optional<Split> split,
        Optional<Coframe> coframe,
        Predicate<Node> notNegative) {

    /**
     * The same metric on another graph, with what its author wrote.
     *
     * @param copy takes values there
     */
    public MetricGraph on(ExpressionGraph target, UnaryOperator<Node> copy) {
        int n = dimension();
        Node[][] copied = new Node[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                copied[i][j] = copy.apply(components[i][j]);
            }
        }
        return new MetricGraph(
                target,
                coordinates,
                copied,
                quadraticForm.map(copy),
                velocities,
                squares.map(list -> list.stream()
                        .map(square ->
                                new WeightedSquare(copy.apply(square.weight()), copies(square.coefficients(), copy)))
                        .toList()),
                split.map(given -> new Split(copy.apply(given.lapse()), copies(given.shift(), copy))),
                coframe.map(given -> new Coframe(
                        given.signs(),
                        given.oneForms().stream()
                                .map(oneForm -> copies(oneForm, copy))
                                .toList())),
                notNegative);
    }

    private static List<Node> copies(List<Node> nodes, UnaryOperator<Node> copy) {
        return nodes.stream().map(copy).toList();
    }

    /** The number of coordinates. */
    public int dimension() {
        return coordinates.size();
    }

    /**
     * weight · (Σ_i coefficients[i] dx^i)².
     *
     * @param coefficients one for each coordinate
     */
    public record WeightedSquare(Node weight, List<Node> coefficients) {}

    /**
     * The split by the first coordinate.
     *
     * @param lapse α, of either sign
     * @param shift β^i, from the second coordinate on
     */
    public record Split(Node lapse, List<Node> shift) {}

    /**
     * One-forms ω^a with g = Σ_a signs[a] ω^a ω^a.
     *
     * @param signs 1 or −1
     * @param oneForms coefficients ω^a_i; a, i
     */
    public record Coframe(List<Integer> signs, List<List<Node>> oneForms) {}

    MetricGraph with(Split given) {
        return new MetricGraph(
                graph,
                coordinates,
                components,
                quadraticForm,
                velocities,
                squares,
                Optional.of(given),
                coframe,
                notNegative);
    }

    MetricGraph with(Coframe given) {
        return new MetricGraph(
                graph,
                coordinates,
                components,
                quadraticForm,
                velocities,
                squares,
                split,
                Optional.of(given),
                notNegative);
    }

    /** The metric that this one induces where the first coordinate is constant. */
    MetricGraph spatial() {
        int n = dimension();
        Node[][] spatial = new Node[n - 1][];
        for (int i = 1; i < n; i++) {
            spatial[i - 1] = Arrays.copyOfRange(components[i], 1, n);
        }
        Optional<List<WeightedSquare>> restricted = squares.map(list -> list.stream()
                .map(square -> new WeightedSquare(
                        square.weight(), square.coefficients().subList(1, n)))
                .filter(square -> !square.coefficients().stream().allMatch(Node::isZero))
                .toList());
        return new MetricGraph(
                graph,
                coordinates.subList(1, n),
                spatial,
                Optional.empty(),
                velocities.subList(1, n),
                restricted,
                Optional.empty(),
                Optional.empty(),
                notNegative);
    }
}
