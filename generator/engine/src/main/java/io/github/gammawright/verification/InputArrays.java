package io.github.gammawright.verification;

import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.verification.reference.ReferenceQuantity;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/**
 * The arrays that a class takes between the point and the results: those of all its quantities, each once. They are
 * filled with numbers between −1 and 1 that follow from the seed.
 */
final class InputArrays {

    private final List<Input> inputs = new ArrayList<>();
    private final int dimension;
    private final long seed;

    private record Input(String name, int length) {}

    InputArrays(List<Quantity> quantities, int dimension, long seed) {
        this.dimension = dimension;
        this.seed = seed;
        for (Quantity quantity : quantities) {
            for (Input input : of(quantity)) {
                if (!inputs.contains(input)) {
                    inputs.add(input);
                }
            }
        }
    }

    private List<Input> of(Quantity quantity) {
        List<Integer> lengths =
                ReferenceQuantity.named(quantity.symbol()).orElseThrow().inputLengths(dimension);
        List<Input> own = new ArrayList<>();
        for (int i = 0; i < lengths.size(); i++) {
            own.add(new Input(quantity.furtherInputs().get(i), lengths.get(i)));
        }
        return own;
    }

    /** How many arrays there are. */
    int count() {
        return inputs.size();
    }

    /** The arrays at the point with that number. */
    double[][] at(int point) {
        Random random = new Random(seed * 0x9E3779B97F4A7C15L + point);
        double[][] arrays = new double[inputs.size()][];
        for (int i = 0; i < arrays.length; i++) {
            arrays[i] = random.doubles(inputs.get(i).length(), -1, 1).toArray();
        }
        return arrays;
    }

    /** Those of the arrays that one quantity takes. */
    double[][] select(Quantity quantity, double[][] arrays) {
        List<Input> own = of(quantity);
        double[][] selected = new double[own.size()][];
        for (int i = 0; i < selected.length; i++) {
            selected[i] = arrays[inputs.indexOf(own.get(i))];
        }
        return selected;
    }
}
