package io.github.gammawright.verification;

import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.KernelInstance.Defect;
import io.github.gammawright.verification.reference.ReferencePoint;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/**
 * What the classes of one definition give at one point, each component with the error that the check of its class allows:
 * from the reference come these bounds alone, never a value.
 */
final class IdentityPoint {

    private final Map<Quantity, CheckedKernel> kernels;
    private final CheckSettings settings;
    private final ReferenceTrio trio;
    private final SamplePoint point;
    private final Map<Quantity, Approximate[]> known = new HashMap<>();

    IdentityPoint(Map<Quantity, CheckedKernel> kernels, CheckSettings settings, ReferenceTrio trio, SamplePoint point) {
        this.kernels = kernels;
        this.settings = settings;
        this.trio = trio;
        this.point = point;
    }

    SamplePoint point() {
        return point;
    }

    /** The components of a quantity of the point alone, row-major. */
    Approximate[] of(Quantity quantity) throws Defect {
        Approximate[] components = known.get(quantity);
        if (components == null) {
            components = with(quantity);
            known.put(quantity, components);
        }
        return components;
    }

    /** The components of a quantity that takes further inputs, exact as they are. */
    Approximate[] with(Quantity quantity, double[]... inputs) throws Defect {
        CheckedKernel kernel = kernels.get(quantity);
        Object object = kernel.construct(point.parameters());
        double[] values = kernel.components(object, point.coordinates(), inputs);
        ReferencePoint.Conditioned conditioned = trio.conditioned(kernel.reference(), point, inputs);
        double largest = ReferenceTrio.largest(conditioned.values());
        double noise = Double.NaN;
        Approximate[] components = new Approximate[values.length];
        for (int i = 0; i < values.length; i++) {
            double error;
            if (conditioned.values().get(i).isZero()) {
                if (values[i] != 0 && Double.isNaN(noise)) {
                    noise = settings.limitMultiple() * trio.noise(kernel.reference(), point, inputs);
                }
                error = values[i] == 0 ? 0 : Math.max(Judge.NOISE * largest, noise);
            } else {
                error = settings.limitMultiple() * conditioned.limits().get(i).toDouble();
            }
            components[i] = new Approximate(values[i], error);
        }
        return components;
    }

    /** Whether a class of the quantity is there. */
    boolean has(Quantity quantity) {
        return kernels.containsKey(quantity);
    }

    /** The class of a quantity, if it is there. */
    Optional<CheckedKernel> kernel(Quantity quantity) {
        return Optional.ofNullable(kernels.get(quantity));
    }
}
