package io.github.gammawright.geometry;

import io.github.gammawright.graph.Node;
import java.util.List;

/** An inverse metric in the form that its route of computation gives. */
interface InverseMetric {

    /** g^ij. */
    Node[][] components();

    /** The contravariant components g^ij v_j. */
    List<Node> raise(List<Node> covector);

    /** The scalar g^ij p_i p_j. */
    Node square(List<Node> covector);

    /** det g. */
    Node determinant();
}
