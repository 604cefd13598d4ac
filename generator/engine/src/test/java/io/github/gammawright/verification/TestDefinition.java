package io.github.gammawright.verification;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricDefinition.Abbreviation;
import io.github.gammawright.definition.MetricDefinition.CallerFunction;
import io.github.gammawright.definition.MetricDefinition.Comparison;
import io.github.gammawright.definition.MetricDefinition.Condition;
import io.github.gammawright.definition.MetricDefinition.Parameter;
import io.github.gammawright.definition.MetricDefinition.Range;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.diagnostic.SourcePosition;
import io.github.gammawright.diagnostic.SourceText;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/** Builds definitions for tests. */
public final class TestDefinition {

    private final String name;
    private final List<String> coordinates;
    private final List<Parameter> parameters = new ArrayList<>();
    private final List<Abbreviation> abbreviations = new ArrayList<>();
    private final List<CallerFunction> functions = new ArrayList<>();
    private final List<Condition> conditions = new ArrayList<>();
    private final Map<String, Range> ranges = new LinkedHashMap<>();

    private TestDefinition(String name, List<String> coordinates) {
        this.name = name;
        this.coordinates = coordinates;
    }

    public static TestDefinition of(String name, String... coordinates) {
        return new TestDefinition(name, List.of(coordinates));
    }

    public TestDefinition parameter(String parameter, String defaultText) {
        parameters.add(
                new Parameter(parameter, Optional.of(ExpressionText.parse(defaultText)), "", "", SourcePosition.START));
        return this;
    }

    public TestDefinition parameterWithoutDefault(String parameter) {
        parameters.add(new Parameter(parameter, Optional.empty(), "", "", SourcePosition.START));
        return this;
    }

    public TestDefinition abbreviation(String abbreviation, String text) {
        abbreviations.add(new Abbreviation(abbreviation, ExpressionText.parse(text), SourcePosition.START));
        return this;
    }

    public TestDefinition function(String function, String sample, String... of) {
        functions.add(new CallerFunction(
                function, List.of(of), Optional.of(ExpressionText.parse(sample)), SourcePosition.START));
        return this;
    }

    public TestDefinition condition(String text) {
        List<Comparison> comparisons = new ArrayList<>();
        Matcher matcher = Pattern.compile("<=|>=|<|>").matcher(text);
        while (matcher.find()) {
            comparisons.add(Stream.of(Comparison.values())
                    .filter(c -> c.symbol().equals(matcher.group()))
                    .findFirst()
                    .orElseThrow());
        }
        conditions.add(new Condition(
                Stream.of(text.split("<=|>=|<|>")).map(ExpressionText::parse).toList(),
                comparisons,
                text,
                SourcePosition.START));
        return this;
    }

    public TestDefinition range(String variable, double from, double to) {
        ranges.put(variable, new Range(from, to));
        return this;
    }

    public MetricDefinition lineElement(String text) {
        return build(new MetricForm.LineElement(ExpressionText.parse(text)));
    }

    /** Rows of the lower triangle, entries separated by semicolons. */
    public MetricDefinition matrix(String... rows) {
        return build(new MetricForm.Matrix(Stream.of(rows)
                .map(row -> Stream.of(row.split(";")).map(ExpressionText::parse).toList())
                .toList()));
    }

    public MetricDefinition threePlusOne(String lapse, List<String> shift, String spatial) {
        return build(new MetricForm.ThreePlusOne(
                ExpressionText.parse(lapse),
                shift.stream().map(ExpressionText::parse).toList(),
                ExpressionText.parse(spatial)));
    }

    public MetricDefinition coframe(List<Integer> signs, String... oneForms) {
        return build(new MetricForm.Coframe(
                Stream.of(oneForms).map(ExpressionText::parse).toList(), signs));
    }

    private MetricDefinition build(MetricForm form) {
        return new MetricDefinition(
                name,
                "",
                "",
                coordinates,
                parameters,
                abbreviations,
                functions,
                form,
                new MetricDefinition.Domain(conditions, ranges),
                MetricDefinition.Claims.none(),
                List.of(),
                new SourceText(name, ""));
    }
}
