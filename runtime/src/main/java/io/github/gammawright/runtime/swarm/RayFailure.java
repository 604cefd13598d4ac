package io.github.gammawright.runtime.swarm;

import java.util.Arrays;

/**
 * A ray that could not be followed.
 *
 * @param index its number
 * @param initial its initial data, as far as they were prepared
 * @param cause what was thrown
 */
public record RayFailure(int index, double[] initial, RuntimeException cause) {

    @Override
    public String toString() {
        return "ray " + index + " from " + Arrays.toString(initial) + ": " + cause;
    }
}
