package io.github.gammawright.runtime.frame;

import io.github.gammawright.runtime.LinearSystem;
import java.util.Arrays;

/**
 * An orthonormal frame at a point: vectors e_0 (timelike, the observer's velocity), e_1, … with g(e_a, e_b) = ±δ_ab.
 *
 * <p>Immutable.
 */
public final class OrthonormalFrame {

    private final double[] point;
    private final double[][] vectors;

    OrthonormalFrame(double[] point, double[][] vectors) {
        this.point = point.clone();
        this.vectors = new double[vectors.length][];
        for (int a = 0; a < vectors.length; a++) {
            this.vectors[a] = vectors[a].clone();
        }
    }

    /** The coordinates of the point; a new array. */
    public double[] point() {
        return point.clone();
    }

    /** How many vectors there are. */
    public int dimension() {
        return vectors.length;
    }

    /** The coordinate components e_a^i; a new array. */
    public double[] vector(int a) {
        return vectors[a].clone();
    }

    /**
     * The coordinate components v^i = v^a e_a^i of a vector given in the frame.
     *
     * @param components v^a, entry 0 along the observer's velocity
     * @return a new array
     * @throws IllegalArgumentException if there is not one component for each vector
     */
    public double[] toCoordinates(double... components) {
        requireLength(components);
        double[] result = new double[vectors.length];
        for (int a = 0; a < vectors.length; a++) {
            for (int i = 0; i < result.length; i++) {
                result[i] += components[a] * vectors[a][i];
            }
        }
        return result;
    }

    /**
     * The components v^a in the frame of a vector given in coordinates.
     *
     * @param vector v^i at the point of the frame
     * @return a new array
     * @throws IllegalArgumentException if there is not one component for each coordinate
     */
    public double[] toFrame(double[] vector) {
        requireLength(vector);
        int n = vectors.length;
        double[] matrix = new double[n * n];
        for (int a = 0; a < n; a++) {
            for (int i = 0; i < n; i++) {
                matrix[i * n + a] = vectors[a][i];
            }
        }
        double[] result = new double[n];
        new LinearSystem(n).solve(matrix, vector, result);
        return result;
    }

    private void requireLength(double[] components) {
        if (components.length != vectors.length) {
            throw new IllegalArgumentException(
                    "a vector has " + components.length + " components, and " + vectors.length + " are needed");
        }
    }

    @Override
    public String toString() {
        return "frame at " + Arrays.toString(point) + ": " + Arrays.deepToString(vectors);
    }
}
