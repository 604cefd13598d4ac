package io.github.gammawright.generation;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.ExpressionParser;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.RealFunction;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.hipparchus.fraction.BigFraction;

/** A printed formula, read by the parser of definitions, is the value that was printed. */
class FormulaRoundTripTest {

    private static final List<RealFunction> FUNCTIONS = List.of(
            RealFunction.SIN,
            RealFunction.COS,
            RealFunction.EXP,
            RealFunction.SINH,
            RealFunction.COSH,
            RealFunction.TANH,
            RealFunction.ATAN,
            RealFunction.ASINH,
            RealFunction.LOG,
            RealFunction.ABS);

    private ExpressionGraph graph;
    private Map<String, Node> names;

    @Property
    void textCanBeReadAgain(@ForAll Random random) {
        graph = new ExpressionGraph();
        names = new HashMap<>();
        List<Node> values = new ArrayList<>();
        for (int i = 0; i < 3; i++) {
            values.add(symbol(Symbol.Kind.COORDINATE, "x" + i, i));
            values.add(symbol(Symbol.Kind.PARAMETER, "p" + i, i));
        }
        values.add(graph.pi());
        for (int i = 0; i < 25; i++) {
            Node a = values.get(random.nextInt(values.size()));
            Node b = values.get(values.size() - 1 - random.nextInt(Math.min(6, values.size())));
            Node value = combine(random, a, b);
            if (value instanceof Node.Constant || SharedParts.size(graph, value) > 200) {
                continue;
            }
            if (random.nextInt(8) == 0 && graph.nameOf(value).isEmpty() && !(value instanceof Node.Leaf)) {
                String name = "n" + names.size();
                graph.name(value, name);
                names.put(name, value);
            }
            values.add(value);
        }
        FormulaPrinter printer = new FormulaPrinter(graph, FormulaPrinter.Form.TEXT);
        for (Node value : values) {
            String text = printer.print(value);
            assertThat(translate(parse(text))).as(text).isSameAs(value);
        }
    }

    private Node symbol(Symbol.Kind kind, String name, int index) {
        Node node = graph.symbol(Symbol.of(kind, name, index));
        names.put(name, node);
        return node;
    }

    private Node combine(Random random, Node a, Node b) {
        try {
            return switch (random.nextInt(9)) {
                case 0, 1 -> graph.add(a, b);
                case 2 -> graph.subtract(a, graph.multiple(new BigFraction(random.nextInt(5) - 2, 3), b));
                case 3, 4 -> graph.multiply(a, b);
                case 5 -> graph.divide(a, b);
                case 6 -> graph.power(a, random.nextInt(4) - 1);
                case 7 -> graph.call(FUNCTIONS.get(random.nextInt(FUNCTIONS.size())), a);
                default ->
                    graph.power(graph.add(graph.power(a, 2), graph.one()), new BigFraction(random.nextInt(7) - 3, 2));
            };
        } catch (ArithmeticException e) {
            return a;
        }
    }

    private static Expression parse(String text) {
        SourceText source = new SourceText("formula", text);
        Diagnostics diagnostics = new Diagnostics(source);
        return new ExpressionParser(diagnostics)
                .parse(LocatedText.whole(source))
                .orElseThrow(() -> new AssertionError(text + ": " + diagnostics.list()));
    }

    private Node translate(Expression expression) {
        if (expression instanceof Expression.Number number) {
            return graph.constant(number.value());
        }
        if (expression instanceof Expression.Pi) {
            return graph.pi();
        }
        if (expression instanceof Expression.Name name) {
            return names.get(name.name());
        }
        if (expression instanceof Expression.Negation negation) {
            return graph.negate(translate(negation.operand()));
        }
        if (expression instanceof Expression.Binary binary) {
            Node left = translate(binary.left());
            Node right = translate(binary.right());
            return switch (binary.operator()) {
                case ADD -> graph.add(left, right);
                case SUBTRACT -> graph.subtract(left, right);
                case MULTIPLY -> graph.multiply(left, right);
                case DIVIDE -> graph.divide(left, right);
                case POWER -> graph.power(left, right);
            };
        }
        Expression.Call call = (Expression.Call) expression;
        Node[] arguments = call.arguments().stream().map(this::translate).toArray(Node[]::new);
        return graph.call(RealFunction.valueOf(call.function().name()), arguments);
    }
}
