package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.Symbol;
import java.util.List;
import java.util.Optional;

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
 */
@SuppressWarnings("ArrayRecordComponent") // the matrix is read by index everywhere and never handed out of the engine
public record MetricGraph(
        ExpressionGraph graph,
        List<Symbol> coordinates,
        Node[][] components,
        Optional<Node> quadraticForm,
        List<Symbol> velocities,
        Optional<List<WeightedSquare>> squares) {

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
}
