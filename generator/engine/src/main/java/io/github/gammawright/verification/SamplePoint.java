package io.github.gammawright.verification;

import java.util.Arrays;
import java.util.List;

/** A point of a definition's domain, with the parameters for which it is one. Immutable. */
public final class SamplePoint {

    private final double[] parameters;
    private final double[] coordinates;
    private final boolean edge;

    SamplePoint(double[] parameters, double[] coordinates, boolean edge) {
        this.parameters = parameters.clone();
        this.coordinates = coordinates.clone();
        this.edge = edge;
    }

    /** The same coordinates with other parameters. */
    public SamplePoint withParameters(double[] others) {
        return new SamplePoint(others, coordinates, edge);
    }

    /** A copy of the parameters, in declared order. */
    public double[] parameters() {
        return parameters.clone();
    }

    /** A copy of the coordinates, in index order. */
    public double[] coordinates() {
        return coordinates.clone();
    }

    /** Whether the point is pressed against an edge of the domain. */
    public boolean isAtEdge() {
        return edge;
    }

    /** The parameters as a list. */
    List<Double> parameterList() {
        return Arrays.stream(parameters).boxed().toList();
    }

    /** The coordinates as a list. */
    List<Double> coordinateList() {
        return Arrays.stream(coordinates).boxed().toList();
    }
}
