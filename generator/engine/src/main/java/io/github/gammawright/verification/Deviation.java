package io.github.gammawright.verification;

import java.util.List;

/**
 * One component at one point, as a kernel and the reference see it.
 *
 * @param indices of the component, as users of the class count them
 * @param parameters for which the kernel was made
 * @param point its coordinates
 * @param inputs velocities, momenta and so on that were given beside the point
 * @param expected the reference's value, rounded to a double
 * @param actual the kernel's value
 * @param ulps the error in units of the last place of the expected value; infinite when that is 0
 * @param limits the error in conditioning limits of the component; infinite when its limit is 0
 */
public record Deviation(
        List<Integer> indices,
        List<Double> parameters,
        List<Double> point,
        List<List<Double>> inputs,
        double expected,
        double actual,
        double ulps,
        double limits) {

    public Deviation {
        indices = List.copyOf(indices);
        parameters = List.copyOf(parameters);
        point = List.copyOf(point);
        inputs = inputs.stream().map(List::copyOf).toList();
    }
}
