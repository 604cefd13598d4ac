package io.github.gammawright.verification;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.KernelInstance.Defect;
import io.github.gammawright.verification.SlotMap.Entry;
import io.github.gammawright.verification.reference.ReferenceEvaluator;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.util.Arrays;
import java.util.List;

/** A class of one quantity whose components can be asked for, wherever its layout keeps them. */
final class CheckedKernel {

    private final Quantity quantity;
    private final ReferenceQuantity reference;
    private final KernelInstance instance;
    private final SlotMap map;
    private final int n;
    private final KernelUnderTest kernel;
    private final ReferenceEvaluator evaluator;

    CheckedKernel(KernelUnderTest kernel, KernelInstance instance, ReferenceEvaluator evaluator) throws Defect {
        this.kernel = kernel;
        this.instance = instance;
        this.evaluator = evaluator;
        this.quantity = kernel.quantities().get(0);
        this.reference = ReferenceQuantity.named(quantity.symbol()).orElseThrow();
        this.n = evaluator.definition().dimension();
        this.map = SlotMap.of(
                reference,
                n,
                kernel.layout(),
                instance.length(quantity),
                instance.index(quantity, reference.extents(n).size()),
                quantity.shape(n).first());
    }

    Quantity quantity() {
        return quantity;
    }

    ReferenceQuantity reference() {
        return reference;
    }

    /** Whether a class of that kind can be asked: its quantity alone, and all components of a curvature tensor. */
    static boolean fits(KernelUnderTest kernel) {
        if (kernel.quantities().size() != 1) {
            return false;
        }
        return kernel.layout() == Layout.FULL
                || ReferenceQuantity.named(kernel.quantities().get(0).symbol())
                        .filter(quantity -> !quantity.isCurvature())
                        .isPresent();
    }

    /** An object of the class for the given parameters. */
    Object construct(double[] parameters) throws Defect {
        return instance.construct(
                parameters,
                !evaluator.definition().functions().isEmpty(),
                wanted -> CallerFunctionProxy.of(wanted, evaluator, parameters, kernel.functions()));
    }

    boolean inDomain(Object object, double[] point) throws Defect {
        return instance.inDomain(object, point);
    }

    /** All components, row-major. */
    double[] components(Object object, double[] point, double[]... inputs) throws Defect {
        double[][] arrays = new double[2 + inputs.length][];
        arrays[0] = point.clone();
        for (int i = 0; i < inputs.length; i++) {
            arrays[1 + i] = inputs[i].clone();
        }
        double[] result = new double[map.length()];
        Arrays.fill(result, Double.NaN);
        arrays[1 + inputs.length] = result;
        instance.evaluate(object, arrays);
        List<Integer> extents = reference.extents(n);
        double[] components = new double[extents.stream().reduce(1, Math::multiplyExact)];
        for (Entry entry : map.entries()) {
            double value = entry.slot() < 0 ? 0 : result[entry.slot()];
            components[entry.component()] = value;
            if (kernel.layout() != Layout.FULL && reference.isSymmetricInLastPair()) {
                components[mirrored(entry.component(), extents.get(extents.size() - 1))] = value;
            }
        }
        return components;
    }

    /** The component with its last two indices exchanged. */
    private static int mirrored(int component, int last) {
        int pair = component % (last * last);
        return component - pair + (pair % last) * last + pair / last;
    }
}
