package io.github.gammawright.emission;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** All names of a class but those of its temporaries: each value has one name, the same in every method. */
final class KernelNames {

    /** Fields, and arguments and variables of methods in which the author's names stand for values. */
    private static final List<String> TAKEN = List.of(
            "DIMENSION",
            "LENGTH",
            "WORKSPACE_LENGTH",
            "INDEX",
            "serialVersionUID",
            "functions",
            "constants",
            "operands",
            "workspace",
            "result",
            "at",
            "from");

    private final NameAllocator allocator = new NameAllocator();
    /** Methods may be called as variables are. */
    private final NameAllocator methods = new NameAllocator();

    private final String className;
    private final List<KernelInput> inputs;
    private final List<String> results = new ArrayList<>();
    private final List<String> offsets = new ArrayList<>();
    private final List<String> parameters = new ArrayList<>();
    private final List<String> functions = new ArrayList<>();
    private final Map<Symbol.Kind, List<String>> scalars = new HashMap<>();
    private final MetricDefinition definition;

    KernelNames(KernelModel model) {
        this.definition = model.definition();
        this.className = model.className();
        this.inputs = KernelInput.of(model);
        TAKEN.forEach(allocator::reserve);
        allocator.reserve(className);
        for (KernelInput input : inputs) {
            allocator.reserve(input.name());
            allocator.reserve(input.name() + "From");
        }
        for (KernelModel.Result result : model.results()) {
            String name = result.quantity().variableName();
            results.add(allocator.allocate(name));
            boolean single = model.results().size() == 1;
            offsets.add(single ? "at" : allocator.allocate(name + "At"));
            allocator.reserve(result.quantity().name() + "_INDEX");
            allocator.reserve(lengthConstant(result.quantity(), single));
        }
        List<String> coordinates = new ArrayList<>();
        for (String coordinate : definition.coordinates()) {
            coordinates.add(allocator.allocate(coordinate));
        }
        scalars.put(Symbol.Kind.COORDINATE, coordinates);
        for (MetricDefinition.Parameter parameter : definition.parameters()) {
            parameters.add(allocator.allocate(parameter.name()));
        }
        for (MetricDefinition.CallerFunction function : definition.functions()) {
            functions.add(methods.allocate(function.name()));
        }
        for (KernelInput input : inputs) {
            if (input.kind() != Symbol.Kind.COORDINATE) {
                List<String> names = new ArrayList<>();
                for (String coordinate : input.coordinates()) {
                    names.add(allocator.allocate(input.name() + "_" + coordinate));
                }
                scalars.put(input.kind(), names);
            }
        }
    }

    /** The constant that holds a result's length. */
    static String lengthConstant(Quantity quantity, boolean single) {
        return single ? "LENGTH" : quantity.symbol().replace('-', '_').toUpperCase(Locale.ROOT) + "_LENGTH";
    }

    /** For temporaries, private methods and everything else that comes later. */
    NameAllocator allocator() {
        return allocator;
    }

    /** The name of a coordinate as a variable. */
    String coordinate(String coordinate) {
        return scalars.get(Symbol.Kind.COORDINATE).get(definition.coordinates().indexOf(coordinate));
    }

    List<KernelInput> inputs() {
        return inputs;
    }

    /** The names of an input's entries. */
    List<String> scalars(KernelInput input) {
        return scalars.get(input.kind());
    }

    List<String> results() {
        return results;
    }

    /** Where each result starts in its array, as an argument of the private methods. */
    List<String> offsets() {
        return offsets;
    }

    List<String> parameters() {
        return parameters;
    }

    /** The methods of the interface for the caller's functions. */
    List<String> functions() {
        return functions;
    }

    /** The nested interface, which may not be called as the class itself. */
    String functionsType() {
        return className.equals("Functions") ? "CallerFunctions" : "Functions";
    }

    /** The name of a value that is given, null for a caller's function. */
    String symbol(Symbol symbol) {
        return switch (symbol.kind()) {
            case PARAMETER -> parameters.get(symbol.index());
            case CALLER_FUNCTION -> null;
            default -> scalars.get(symbol.kind()).get(symbol.index());
        };
    }

    /** How a derivative of a caller's function is called: {@code nu_r_r}. */
    String wantedDerivative(Symbol symbol) {
        StringBuilder name = new StringBuilder(symbol.name());
        List<String> arguments = definition.functions().get(symbol.index()).of();
        for (int i = 0; i < symbol.orders().size(); i++) {
            name.append(("_" + arguments.get(i)).repeat(symbol.orders().get(i)));
        }
        return name.toString();
    }
}
