package io.github.gammawright.emission;

import java.util.List;

/**
 * How an emitted class asks its caller for a function of coordinates.
 *
 * @param name the function's name in the definition
 * @param method the method of the nested interface; it takes the function's arguments, then the array to fill
 * @param orders for each entry of that array, how often the function is differentiated by each of its arguments; the
 *     first entry is the value, the others are the derivatives that the class needs, in graded order
 */
public record EmittedFunction(String name, String method, List<List<Integer>> orders) {

    public EmittedFunction {
        orders = orders.stream().map(List::copyOf).toList();
    }
}
