package io.github.gammawright.emission;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.SourceText;
import io.github.gammawright.geometry.Layout;
import io.github.gammawright.geometry.Quantity;
import io.github.gammawright.geometry.Shape;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.hipparchus.fraction.BigFraction;

/** Builds kernel models for tests; what a test does not care for has a plain value. */
final class TestModel {

    static final SourcePosition NOWHERE = SourcePosition.START;

    String name = "paper-lantern";
    String title = "";
    String reference = "";
    String className = "PaperLanternKernel";
    String packageName = "kernels";
    Layout layout = Layout.FULL;
    List<String> coordinates = List.of("x", "y");
    final List<MetricDefinition.Parameter> parameters = new ArrayList<>();
    final List<MetricDefinition.CallerFunction> functions = new ArrayList<>();
    final List<MetricDefinition.Abbreviation> abbreviations = new ArrayList<>();
    final List<KernelModel.Result> results = new ArrayList<>();
    final TestProgram program = new TestProgram();
    final TestProgram domain = new TestProgram();
    final List<KernelModel.Condition> conditions = new ArrayList<>();
    MetricForm form = new MetricForm.LineElement(power(new Expression.Name("dx", NOWHERE), 2));

    static Expression number(String decimal) {
        return new Expression.Number(
                new BigFraction(new java.math.BigDecimal(decimal).unscaledValue())
                        .divide(new BigFraction(
                                java.math.BigInteger.TEN.pow(new java.math.BigDecimal(decimal).scale()))),
                NOWHERE);
    }

    static Expression power(Expression base, int exponent) {
        return new Expression.Binary(Expression.Operator.POWER, base, number(Integer.toString(exponent)), NOWHERE);
    }

    TestModel parameter(String parameter, Expression defaultValue) {
        parameters.add(new MetricDefinition.Parameter(parameter, Optional.ofNullable(defaultValue), "", "", NOWHERE));
        return this;
    }

    TestModel function(String function, String... of) {
        functions.add(new MetricDefinition.CallerFunction(function, List.of(of), Optional.empty(), NOWHERE));
        return this;
    }

    /** A condition between two values of the domain's program. */
    TestModel condition(int left, MetricDefinition.Comparison comparison, int right, String text) {
        conditions.add(new KernelModel.Condition(List.of(left, right), List.of(comparison), text));
        return this;
    }

    /** A result in the model's layout, from the values of all its components in row-major order. */
    TestModel result(Quantity quantity, int... components) {
        Shape shape = quantity.shape(coordinates.size());
        List<Integer> slots = new ArrayList<>();
        List<List<Integer>> tuples = new ArrayList<>();
        for (int[] tuple : layout == Layout.FULL ? shape.tuples() : shape.independentTuples()) {
            int value = components[shape.fullIndex(tuple)];
            if (layout != Layout.NON_ZERO || value >= 0) {
                slots.add(value);
                tuples.add(Arrays.stream(tuple).boxed().toList());
            }
        }
        results.add(new KernelModel.Result(quantity, shape, slots, tuples));
        return this;
    }

    KernelModel build() {
        MetricDefinition definition = new MetricDefinition(
                name,
                title,
                reference,
                coordinates,
                parameters,
                abbreviations,
                functions,
                form,
                new MetricDefinition.Domain(List.of(), Map.of()),
                MetricDefinition.Claims.none(),
                List.of(),
                new SourceText(name, ""));
        return new KernelModel(
                definition,
                packageName,
                className,
                layout,
                results,
                program.build(),
                new KernelModel.Domain(domain.build(), conditions),
                "gammawright generate " + name + " --out DIR");
    }
}
