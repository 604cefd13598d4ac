package io.github.gammawright.generation;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.List;

/**
 * One class to be made.
 *
 * @param packageName the Java package, empty for the unnamed one
 * @param className the simple name
 * @param quantities one or more, in the order of the result arrays
 * @param layout how each result is laid out
 * @param options how it is made
 */
public record KernelSpecification(
        String packageName, String className, List<Quantity> quantities, Layout layout, GenerationOptions options) {

    public KernelSpecification {
        quantities = List.copyOf(quantities);
        if (quantities.isEmpty()) {
            throw new IllegalArgumentException("a kernel has at least one quantity");
        }
    }

    /** The name with its package, as a source file needs it. */
    public String qualifiedName() {
        return packageName.isEmpty() ? className : packageName + "." + className;
    }
}
