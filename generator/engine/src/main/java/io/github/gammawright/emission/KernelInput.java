package io.github.gammawright.emission;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * An array that a kernel reads.
 *
 * @param kind what its entries are in the program
 * @param name the name of the array as an argument
 * @param coordinates the author's names of the coordinates that its entries belong to, in their order
 */
record KernelInput(Symbol.Kind kind, String name, List<String> coordinates) {

    KernelInput {
        coordinates = List.copyOf(coordinates);
    }

    int length() {
        return coordinates.size();
    }

    boolean isPoint() {
        return kind == Symbol.Kind.COORDINATE;
    }

    /** The name for an array of many such inputs. */
    String plural() {
        return name.endsWith("y") ? name.substring(0, name.length() - 1) + "ies" : name + "s";
    }

    /** The point, then the further inputs of all results, each once. */
    static List<KernelInput> of(KernelModel model) {
        MetricDefinition definition = model.definition();
        List<KernelInput> inputs = new ArrayList<>();
        inputs.add(new KernelInput(Symbol.Kind.COORDINATE, "point", definition.coordinates()));
        for (KernelModel.Result result : model.results()) {
            for (String further : result.quantity().furtherInputs()) {
                KernelInput input = further(further, definition);
                if (!inputs.contains(input)) {
                    inputs.add(input);
                }
            }
        }
        return List.copyOf(inputs);
    }

    /** What the entries of a further input are, by its name. */
    static Symbol.Kind kind(String name) {
        return Symbol.Kind.valueOf(name.replaceAll("(?=[A-Z])", "_").toUpperCase(Locale.ROOT));
    }

    private static KernelInput further(String name, MetricDefinition definition) {
        Symbol.Kind kind = kind(name);
        // a velocity by coordinate time has no entry for the time, which is 1
        boolean byTime = kind == Symbol.Kind.COORDINATE_VELOCITY;
        List<String> coordinates = definition.coordinates();
        return new KernelInput(kind, name, byTime ? coordinates.subList(1, coordinates.size()) : coordinates);
    }
}
