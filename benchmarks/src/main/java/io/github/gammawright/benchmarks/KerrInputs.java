package io.github.gammawright.benchmarks;

import java.util.Random;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;

/**
 * Inputs that change from call to call, so that nothing can be computed once: 1024 points outside the horizon of Kerr's
 * hole, with a vector at each.
 */
@State(Scope.Thread)
public class KerrInputs {

    /** How many there are; a power of two. */
    static final int COUNT = 1024;

    /** The mass of the hole. */
    static final double MASS = 1;

    /** Its angular momentum per mass. */
    static final double SPIN = 0.6;

    private final double[][] points = new double[COUNT][];
    private final double[][] vectors = new double[COUNT][];
    private int next;

    /** Draws the inputs, the same in every run. */
    public KerrInputs() {
        Random random = new Random(20);
        for (int i = 0; i < COUNT; i++) {
            double r = 1.85 + 38.15 * random.nextDouble();
            double theta = 0.05 + 3.04 * random.nextDouble();
            points[i] = new double[] {random.nextDouble(), r, theta, random.nextDouble()};
            vectors[i] = random.doubles(4, -1, 1).toArray();
        }
    }

    /** Goes on to the next input. */
    final void advance() {
        next = (next + 1) & (COUNT - 1);
    }

    /** The point of the present input: t, r, θ, φ. */
    final double[] point() {
        return points[next];
    }

    /** The velocity or momentum of the present input. */
    final double[] vector() {
        return vectors[next];
    }
}
