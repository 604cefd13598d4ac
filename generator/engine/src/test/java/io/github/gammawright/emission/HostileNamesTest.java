package io.github.gammawright.emission;

import static org.assertj.core.api.Assertions.assertThat;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** No name and no text of a definition gets in the way of the emitted class. */
class HostileNamesTest {

    private static final List<String> NAMES = List.of(
            "E",
            "I",
            "N",
            "D",
            "class",
            "double",
            "at",
            "point",
            "Math",
            "String",
            "christoffel",
            "t1",
            "this",
            "_",
            "λ",
            "µ");

    private static final String COMMENT = "*/ class X { } /* {@code <b>&amp; @param x \\u002a/ \\u000a \u202e $L $S";

    @Test
    void anyNamesWillDo() {
        TestModel model = new TestModel();
        model.coordinates = NAMES;
        List<String> parameters = List.of(
                "evaluate",
                "index",
                "LENGTH",
                "serialVersionUID",
                "null",
                "var",
                "point_",
                "at_",
                "java",
                "Object",
                "from",
                "results",
                "length",
                "𝛼",
                "ⅷ",
                "workspace",
                "functions",
                "inverseE",
                "E2",
                "sinE");
        TestProgram p = model.program;
        int sum = p.coordinate(NAMES.get(0), 0);
        for (int i = 1; i < NAMES.size(); i++) {
            sum = p.named("t" + i, p.add(sum, p.multiply(p.coordinate(NAMES.get(i), i), p.constant(i))));
        }
        for (int i = 0; i < parameters.size(); i++) {
            model.parameter(parameters.get(i), TestModel.number("1"));
            sum = p.add(sum, p.multiply(p.parameter(parameters.get(i), i), p.parameter(parameters.get(i), i)));
        }
        int[] components = new int[16];
        components[3] = sum;
        components[4] = p.divide(p.constant(1), p.coordinate("E", 0));
        components[5] = p.multiply(p.coordinate("E", 0), p.coordinate("E", 0));
        components[6] = p.call(io.github.gammawright.graph.RealFunction.SIN, p.coordinate("E", 0));
        model.result(Quantity.CHRISTOFFEL_TRACE, components);
        CompiledKernel kernel = CompiledKernel.of(model.build());
        double[] point = new double[16];
        java.util.Arrays.fill(point, 1.0);
        double[] values = (double[]) kernel.call(kernel.create(), "valuesAt", (Object) point);
        assertThat(values[3]).isEqualTo(1 + 15 * 16 / 2 + 20);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "Math",
                "String",
                "Arrays",
                "Objects",
                "Object",
                "Serializable",
                "Functions",
                "SuppressWarnings",
                "IllegalArgumentException",
                "Σ"
            })
    void classesMayHaveTheNamesOfThoseTheyUse(String className) {
        TestModel model = new TestModel();
        model.className = className;
        model.layout = Layout.NON_ZERO;
        model.function("f", "x", "y").parameter("a", null);
        TestProgram p = model.program;
        int x = p.coordinate("x", 0);
        int root = p.call(io.github.gammawright.graph.RealFunction.SQRT, x);
        int f = p.call(io.github.gammawright.graph.RealFunction.ACOSH, p.function("f", 0, 0, 0));
        model.result(Quantity.METRIC, root, f, f, p.pi());
        model.condition(model.domain.parameter("a", 0), MetricDefinition.Comparison.LESS, model.domain.pi(), "a < pi");
        assertThat(CompiledKernel.of(model.build()).type.getSimpleName()).isEqualTo(className);
    }

    @Test
    void textsDoNotEscapeFromComments() {
        TestModel model = new TestModel();
        model.name = COMMENT + "\nimport nothing;";
        model.title = COMMENT;
        model.reference = COMMENT + "\n\n/";
        model.coordinates = List.of("x");
        model.form = new MetricForm.LineElement(new Expression.Name(COMMENT, TestModel.NOWHERE));
        model.abbreviations.add(new MetricDefinition.Abbreviation(
                COMMENT, new Expression.Name("*", TestModel.NOWHERE), TestModel.NOWHERE));
        model.parameters.add(
                new MetricDefinition.Parameter("a", Optional.empty(), COMMENT, "*/ \ud800 \u0000", TestModel.NOWHERE));
        model.condition(
                model.domain.parameter("a", 0), MetricDefinition.Comparison.LESS, model.domain.pi(), "\"" + COMMENT);
        model.result(Quantity.METRIC, model.program.coordinate("x", 0));
        CompiledKernel kernel = CompiledKernel.of(model.build());
        assertThat(kernel.source).doesNotContain("\u202e", "\u0000", "\ud800");
        assertThat(kernel.source.lines().filter(line -> line.startsWith("//"))).hasSize(1);
    }
}
