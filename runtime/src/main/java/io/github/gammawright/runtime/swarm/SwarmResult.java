package io.github.gammawright.runtime.swarm;

import java.util.BitSet;
import java.util.List;

/** What came of a swarm. */
public final class SwarmResult {

    private final int count;
    private final int width;
    private final double[] values;
    private final BitSet done;
    private final List<RayFailure> failures;

    SwarmResult(int count, int width, double[] values, BitSet done, List<RayFailure> failures) {
        this.count = count;
        this.width = width;
        this.values = values;
        this.done = done;
        this.failures = failures;
    }

    /** How many rays there were. */
    public int count() {
        return count;
    }

    /** How many numbers were kept of each ray. */
    public int width() {
        return width;
    }

    /** Whether a ray was followed to its end; if not, it failed, or the swarm was cancelled before. */
    public boolean done(int index) {
        return done.get(index);
    }

    /** Whether all rays were looked at. */
    public boolean complete() {
        return done.cardinality() + failures.size() == count;
    }

    /**
     * A number of a ray.
     *
     * @throws IllegalStateException if that ray was not followed to its end
     */
    public double value(int index, int entry) {
        if (!done.get(index)) {
            throw new IllegalStateException("ray " + index + " was not followed to its end");
        }
        return values[index * width + entry];
    }

    /** The rays that failed, by their numbers. */
    public List<RayFailure> failures() {
        return failures;
    }
}
