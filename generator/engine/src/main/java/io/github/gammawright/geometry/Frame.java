package io.github.gammawright.geometry;

import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.hipparchus.fraction.BigFraction;

/**
 * An orthonormal frame: g(e_a, e_b) = η_ab.
 *
 * @param vectors e_a^i; a, i
 * @param covectors e_ai = g_ij e_a^j; a, i
 * @param signs η_aa
 */
record Frame(Node[][] vectors, Node[][] covectors, int[] signs) {

    /** The frame of a metric: that of the author's coframe, or else by a plan. */
    static Frame of(MetricGraph metric, FramePlan plan) {
        return metric.coframe()
                .map(coframe -> ofCoframe(metric.graph(), coframe))
                .orElseGet(() -> new Construction(metric).along(plan));
    }

    /** e_a is dual to ω^a. */
    private static Frame ofCoframe(ExpressionGraph graph, MetricGraph.Coframe coframe) {
        int n = coframe.signs().size();
        Node[][] forms = new Node[n][];
        Node[][] covectors = new Node[n][n];
        int[] signs = new int[n];
        for (int a = 0; a < n; a++) {
            forms[a] = coframe.oneForms().get(a).toArray(Node[]::new);
            signs[a] = coframe.signs().get(a);
            for (int i = 0; i < n; i++) {
                covectors[a][i] = graph.multiple(new BigFraction(signs[a]), forms[a][i]);
            }
        }
        Node[][] inverse = GeneralInverse.of(graph, forms);
        Node[][] vectors = new Node[n][n];
        for (int a = 0; a < n; a++) {
            for (int i = 0; i < n; i++) {
                vectors[a][i] = inverse[i][a];
            }
        }
        return new Frame(vectors, covectors, signs);
    }

    /** Makes the directions of the coordinates orthogonal, one after the other. */
    private static final class Construction {
        private final MetricGraph metric;
        private final ExpressionGraph graph;
        private final int n;
        /** What is left of the directions. */
        private final Node[][] directions;
        /** g of what is left. */
        private final Node[][] rest;

        private final boolean[] done;
        private final Node[][] vectors;
        private final Node[][] covectors;
        private final int[] signs;

        Construction(MetricGraph metric) {
            this.metric = metric;
            this.graph = metric.graph();
            this.n = metric.dimension();
            this.directions = new Node[n][n];
            this.rest = new Node[n][];
            for (int i = 0; i < n; i++) {
                Arrays.fill(directions[i], graph.zero());
                directions[i][i] = graph.one();
                rest[i] = metric.components()[i].clone();
            }
            this.done = new boolean[n];
            this.vectors = new Node[n][n];
            this.covectors = new Node[n][n];
            this.signs = new int[n];
        }

        Frame along(FramePlan plan) {
            for (FramePlan.Step step : plan.steps()) {
                if (step instanceof FramePlan.Single single) {
                    single(single.coordinate(), single.sign());
                } else if (step instanceof FramePlan.NullPair pair) {
                    pair(pair.partner(), pair.nullCoordinate());
                }
            }
            return new Frame(vectors, covectors, signs);
        }

        private void single(int k, int sign) {
            Node square = graph.multiple(new BigFraction(sign), rest[k][k]);
            boolean isNormal = k == 0 && sign < 0 && metric.split().isPresent() && left().equals(List.of(0));
            Node norm = isNormal ? lapse() : PositiveRoot.of(graph, square, metric.notNegative());
            Node scale = kept(graph.reciprocal(norm));
            signs[k] = sign;
            for (int i = 0; i < n; i++) {
                vectors[k][i] = kept(graph.multiply(scale, directions[k][i]));
                covectors[k][i] = done[i] ? graph.zero() : kept(graph.multiply(scale, rest[k][i]));
            }
            Node reciprocal = kept(graph.reciprocal(rest[k][k]));
            Node[] pivot = rest[k].clone();
            done[k] = true;
            for (int i : left()) {
                Node share = kept(graph.multiply(pivot[i], reciprocal));
                subtract(i, share, directions[k]);
                for (int j : left()) {
                    if (j <= i) {
                        rest[i][j] = kept(graph.subtract(rest[i][j], graph.multiply(share, pivot[j])));
                        rest[j][i] = rest[i][j];
                    }
                }
            }
        }

        private Node lapse() {
            Node authors = metric.split().orElseThrow().lapse();
            return Arrays.stream(graph.realValues(authors)).allMatch(value -> value > 0)
                    ? authors
                    : PositiveRoot.of(graph, graph.power(authors, 2), metric.notNegative());
        }

        private void pair(int j, int k) {
            Node reciprocal = kept(graph.reciprocal(rest[j][k]));
            Node half = kept(graph.multiple(BigFraction.ONE_HALF, graph.multiply(rest[j][j], reciprocal)));
            Node[] other = new Node[n];
            Node[] along = new Node[n];
            Node[] otherLowered = new Node[n];
            Node[] alongLowered = new Node[n];
            for (int i = 0; i < n; i++) {
                other[i] = kept(graph.subtract(directions[j][i], graph.multiply(half, directions[k][i])));
                along[i] = kept(graph.multiply(reciprocal, directions[k][i]));
                otherLowered[i] =
                        done[i] ? graph.zero() : kept(graph.subtract(rest[i][j], graph.multiply(half, rest[i][k])));
                alongLowered[i] = done[i] ? graph.zero() : kept(graph.multiply(reciprocal, rest[i][k]));
            }
            Node scale = graph.power(graph.constant(2), BigFraction.ONE_HALF.negate());
            signs[j] = -1;
            signs[k] = 1;
            for (int i = 0; i < n; i++) {
                vectors[j][i] = kept(graph.multiply(scale, graph.subtract(other[i], along[i])));
                vectors[k][i] = kept(graph.multiply(scale, graph.add(other[i], along[i])));
                covectors[j][i] = kept(graph.multiply(scale, graph.subtract(otherLowered[i], alongLowered[i])));
                covectors[k][i] = kept(graph.multiply(scale, graph.add(otherLowered[i], alongLowered[i])));
            }
            done[j] = true;
            done[k] = true;
            for (int i : left()) {
                subtract(i, otherLowered[i], along);
                subtract(i, alongLowered[i], other);
                for (int l : left()) {
                    if (l <= i) {
                        Node change = graph.add(
                                graph.multiply(otherLowered[i], alongLowered[l]),
                                graph.multiply(alongLowered[i], otherLowered[l]));
                        rest[i][l] = kept(graph.subtract(rest[i][l], change));
                        rest[l][i] = rest[i][l];
                    }
                }
            }
        }

        private void subtract(int i, Node share, Node[] vector) {
            for (int l = 0; l < n; l++) {
                directions[i][l] = kept(graph.subtract(directions[i][l], graph.multiply(share, vector[l])));
            }
        }

        private List<Integer> left() {
            List<Integer> left = new ArrayList<>();
            for (int i = 0; i < n; i++) {
                if (!done[i]) {
                    left.add(i);
                }
            }
            return left;
        }

        private Node kept(Node node) {
            graph.keep(node);
            return node;
        }
    }
}
