package io.github.gammawright.emission;

import com.palantir.javapoet.ClassName;
import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import com.palantir.javapoet.TypeSpec;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.graph.Instruction;
import io.github.gammawright.graph.Symbol;
import java.io.Serializable;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import java.util.function.IntPredicate;
import javax.lang.model.element.Modifier;

/**
 * Writes the nested interface of the functions that the caller supplies, and the calls of its methods. Each method
 * fills the value and the derivatives that the class needs, in graded order: by the total order, then by how often
 * each argument is differentiated, the first one first.
 */
final class CallerFunctions {

    private final EmissionContext context;
    private final List<MetricDefinition.CallerFunction> functions;
    private final List<List<List<Integer>>> orders = new ArrayList<>();

    CallerFunctions(EmissionContext context) {
        this.context = context;
        this.functions = context.model().definition().functions();
        for (int f = 0; f < functions.size(); f++) {
            TreeSet<List<Integer>> needed = new TreeSet<>(CallerFunctions::compare);
            needed.add(functions.get(f).of().stream().map(argument -> 0).toList());
            for (Instruction instruction : context.program().instructions()) {
                if (instruction instanceof Instruction.Load load
                        && load.symbol().kind() == Symbol.Kind.CALLER_FUNCTION
                        && load.symbol().index() == f) {
                    needed.add(load.symbol().orders());
                }
            }
            orders.add(List.copyOf(needed));
        }
    }

    private static int compare(List<Integer> a, List<Integer> b) {
        int total = Integer.compare(total(a), total(b));
        for (int i = 0; total == 0 && i < a.size(); i++) {
            total = Integer.compare(b.get(i), a.get(i));
        }
        return total;
    }

    private static int total(List<Integer> orders) {
        return orders.stream().mapToInt(Integer::intValue).sum();
    }

    /** How the class asks for each function. */
    List<EmittedFunction> described() {
        List<EmittedFunction> described = new ArrayList<>();
        for (int f = 0; f < functions.size(); f++) {
            described.add(new EmittedFunction(
                    functions.get(f).name(), context.names().functions().get(f), orders.get(f)));
        }
        return described;
    }

    boolean exist() {
        return !functions.isEmpty();
    }

    ClassName type() {
        return ClassName.get("", context.names().functionsType());
    }

    void emitInterface() {
        TypeSpec.Builder type = TypeSpec.interfaceBuilder(context.names().functionsType())
                .addModifiers(Modifier.PUBLIC, Modifier.STATIC)
                .addSuperinterface(Serializable.class)
                .addJavadoc("""
                        The functions of coordinates that the metric is made of. Each method fills the value and the
                        derivatives that this class needs into the first entries of an array, and leaves the others
                        alone. Implementations that many threads use at once must allow for it.
                        """);
        for (int f = 0; f < functions.size(); f++) {
            MethodSpec.Builder method = MethodSpec.methodBuilder(
                            context.names().functions().get(f))
                    .addModifiers(Modifier.PUBLIC, Modifier.ABSTRACT);
            method.addJavadoc("$L", javadoc(f));
            arguments(f).forEach(argument -> method.addParameter(double.class, argument));
            method.addParameter(double[].class, "result");
            type.addMethod(method.build());
        }
        context.type().addType(type.build());
    }

    private String javadoc(int function) {
        MetricDefinition.CallerFunction of = functions.get(function);
        StringBuilder text = new StringBuilder("Fills <code>" + JavadocText.escape(of.name()) + "</code>.\n\n");
        for (int i = 0; i < of.of().size(); i++) {
            text.append("@param ").append(arguments(function).get(i)).append(" the coordinate ");
            text.append(JavadocText.escape(of.of().get(i))).append('\n');
        }
        text.append("@param result ");
        List<List<Integer>> entries = orders.get(function);
        for (int e = 0; e < entries.size(); e++) {
            text.append(e == 0 ? "" : ",\n    ").append("entry ").append(e).append(": <code>");
            text.append(JavadocText.escape(derivative(of, entries.get(e)))).append("</code>");
        }
        return text.append('\n').toString();
    }

    /** {@code ∂²nu/∂r∂theta}. */
    private static String derivative(MetricDefinition.CallerFunction function, List<Integer> orders) {
        int total = total(orders);
        if (total == 0) {
            return function.name();
        }
        StringBuilder text = new StringBuilder("∂" + power(total) + function.name() + "/");
        for (int i = 0; i < orders.size(); i++) {
            if (orders.get(i) > 0) {
                text.append('∂').append(function.of().get(i)).append(power(orders.get(i)));
            }
        }
        return text.toString();
    }

    private static String power(int exponent) {
        return exponent == 1 ? "" : exponent < 10 ? "" + "⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(exponent) : "^" + exponent;
    }

    private List<String> arguments(int function) {
        return functions.get(function).of().stream()
                .map(coordinate -> context.names().coordinate(coordinate))
                .toList();
    }

    /** The functions that a body needs. */
    List<Integer> used(IntPredicate usesValue) {
        TreeSet<Integer> used = new TreeSet<>();
        for (int i = 0; i < context.program().size(); i++) {
            if (usesValue.test(i)
                    && context.program().instruction(i) instanceof Instruction.Load load
                    && load.symbol().kind() == Symbol.Kind.CALLER_FUNCTION) {
                used.add(load.symbol().index());
            }
        }
        return List.copyOf(used);
    }

    /** The coordinates that calls of the functions take, by the author's names. */
    List<String> coordinates(List<Integer> used) {
        return used.stream()
                .flatMap(f -> functions.get(f).of().stream())
                .distinct()
                .toList();
    }

    /** The entries that calls of the functions fill, at most. */
    int resultLength(List<Integer> used) {
        return used.stream().mapToInt(f -> orders.get(f).size()).max().orElse(0);
    }

    /** Calls the functions one after the other and takes from the array what is needed. */
    CodeBlock calls(List<Integer> used, IntPredicate usesValue, String array) {
        CodeBlock.Builder code = CodeBlock.builder();
        for (int f : used) {
            List<String> arguments = new ArrayList<>(arguments(f));
            arguments.add(array);
            code.addStatement("functions.$L($L)", context.names().functions().get(f), String.join(", ", arguments));
            for (int i = 0; i < orders.get(f).size(); i++) {
                int load = load(f, orders.get(f).get(i));
                if (load >= 0 && usesValue.test(load)) {
                    code.addStatement("double $L = $L[$L]", context.values().given(load), array, i);
                }
            }
        }
        return code.build();
    }

    private int load(int function, List<Integer> order) {
        for (int i = 0; i < context.program().size(); i++) {
            if (context.program().instruction(i) instanceof Instruction.Load load
                    && load.symbol().kind() == Symbol.Kind.CALLER_FUNCTION
                    && load.symbol().index() == function
                    && load.symbol().orders().equals(order)) {
                return i;
            }
        }
        return -1;
    }
}
