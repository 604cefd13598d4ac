package io.github.gammawright.verification;

import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.List;

/**
 * A class that is to be checked.
 *
 * @param qualifiedName its name with its package
 * @param source its whole source text
 * @param quantities what its result arrays hold, in their order
 * @param layout how they are laid out
 * @param functions for each of the definition's functions how the class asks for it; empty when the definition has none
 */
public record KernelUnderTest(
        String qualifiedName,
        String source,
        List<Quantity> quantities,
        Layout layout,
        List<RequestedFunction> functions) {

    public KernelUnderTest {
        quantities = List.copyOf(quantities);
        functions = List.copyOf(functions);
    }

    /** A class of a definition without functions of the caller. */
    public KernelUnderTest(String qualifiedName, String source, List<Quantity> quantities, Layout layout) {
        this(qualifiedName, source, quantities, layout, List.of());
    }

    /**
     * How a class asks the caller for a function.
     *
     * @param name the function's name in the definition
     * @param method the method of the nested interface, which takes the function's arguments and the array to fill
     * @param orders for each entry of the array, how often the function is differentiated by each of its arguments
     */
    public record RequestedFunction(String name, String method, List<List<Integer>> orders) {

        public RequestedFunction {
            orders = orders.stream().map(List::copyOf).toList();
        }
    }
}
