package io.github.gammawright.geometry;

import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.definition.MetricForm;
import io.github.gammawright.geometry.MetricGraph.WeightedSquare;
import io.github.gammawright.graph.ExpressionGraph;
import io.github.gammawright.graph.Node;
import io.github.gammawright.graph.SamplePoints;
import io.github.gammawright.graph.Symbol;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.fraction.BigFraction;

/** Builds the graph of a metric from its definition, whichever form that takes. */
public final class MetricGraphBuilder {

    private final MetricDefinition definition;
    private final DefinitionScope scope;
    private final ExpressionGraph graph;
    private final int n;
    private final List<Symbol> velocities = new ArrayList<>();

    private MetricGraphBuilder(MetricDefinition definition, SamplePoints points) {
        this.definition = definition;
        this.scope = new DefinitionScope(definition, points);
        this.graph = scope.graph();
        this.n = definition.dimension();
        for (int i = 0; i < n; i++) {
            velocities.add(
                    Symbol.of(Symbol.Kind.VELOCITY, definition.coordinates().get(i), i));
        }
    }

    /**
     * The graph of a definition's metric.
     *
     * @throws UndefinedValueException where an expression has no value anywhere
     */
    public static MetricGraph build(MetricDefinition definition) {
        return build(definition, DomainPoints.draw(definition));
    }

    /** The same, on a graph that knows these points of the domain. */
    static MetricGraph build(MetricDefinition definition, SamplePoints points) {
        return new MetricGraphBuilder(definition, points).build();
    }

    /** A metric, and the values of further expressions of its definition in the same graph. */
    public record WithExpressions(MetricGraph metric, List<Node> expressions) {

        public WithExpressions {
            expressions = List.copyOf(expressions);
        }
    }

    /**
     * The graph of a definition's metric, with further expressions of the definition.
     *
     * @param expressions free of differentials
     * @throws UndefinedValueException where an expression has no value anywhere
     */
    public static WithExpressions build(MetricDefinition definition, List<Expression> expressions) {
        MetricGraphBuilder builder = new MetricGraphBuilder(definition, DomainPoints.draw(definition));
        List<Node> values = expressions.stream()
                .map(expression -> builder.scope.translator().translate(expression))
                .toList();
        return new WithExpressions(builder.build(), values);
    }

    private MetricGraph build() {
        if (definition.form() instanceof MetricForm.LineElement lineElement) {
            return lineElement(lineElement.expression());
        }
        if (definition.form() instanceof MetricForm.ThreePlusOne split) {
            return threePlusOne(split);
        }
        if (definition.form() instanceof MetricForm.Coframe coframe) {
            return coframe(coframe);
        }
        return matrix((MetricForm.Matrix) definition.form());
    }

    private MetricGraph lineElement(Expression expression) {
        FormTranslator forms = forms(0);
        Form form = forms.translate(expression);
        Optional<List<WeightedSquare>> squares = forms.squares(expression);
        return metric(components(form), Optional.of(alongVelocity(expression)), squares);
    }

    /** A translator for which d + coordinate is that coordinate's differential, from the given coordinate on. */
    private FormTranslator forms(int first) {
        FormTranslator forms = new FormTranslator(graph, scope.translator(), n);
        for (int i = first; i < n; i++) {
            forms.define("d" + definition.coordinates().get(i), Form.differential(i, graph.one()));
        }
        return forms;
    }

    /** The expression with velocities in place of the differentials, so that its structure is kept. */
    private Node alongVelocity(Expression expression) {
        for (int i = 0; i < n; i++) {
            scope.translator().define("d" + definition.coordinates().get(i), graph.symbol(velocities.get(i)));
        }
        return scope.translator().translate(expression);
    }

    private MetricGraph threePlusOne(MetricForm.ThreePlusOne split) {
        Node lapse = scope.translator().translate(split.lapse());
        List<Node> shift = new ArrayList<>();
        for (Expression component : split.shift()) {
            shift.add(scope.translator().translate(component));
        }
        FormTranslator forms = new FormTranslator(graph, scope.translator(), n);
        for (int i = 1; i < n; i++) {
            Form form = Form.differential(i, graph.one()).plus(graph, Form.differential(0, shift.get(i - 1)));
            forms.define("d" + definition.coordinates().get(i), form);
        }
        Form spatial = forms.translate(split.spatialLineElement());
        Form time = Form.differential(0, graph.one());
        Node minusLapseSquared = graph.negate(graph.power(lapse, 2));
        Form form = spatial.plus(graph, time.times(graph, time).times(graph, minusLapseSquared));
        Optional<List<WeightedSquare>> squares = forms.squares(split.spatialLineElement())
                .map(list -> {
                    List<WeightedSquare> all = new ArrayList<>(list);
                    all.add(0, forms.square(minusLapseSquared, time));
                    return all;
                });
        Node velocityOfTime = graph.symbol(velocities.get(0));
        for (int i = 1; i < n; i++) {
            Node along = graph.add(graph.symbol(velocities.get(i)), graph.multiply(shift.get(i - 1), velocityOfTime));
            graph.keep(along);
            scope.translator().define("d" + definition.coordinates().get(i), along);
        }
        Node quadratic = graph.add(
                graph.multiply(minusLapseSquared, graph.power(velocityOfTime, 2)),
                scope.translator().translate(split.spatialLineElement()));
        return metric(components(form), Optional.of(quadratic), squares)
                .with(new MetricGraph.Split(lapse, List.copyOf(shift)));
    }

    private MetricGraph coframe(MetricForm.Coframe coframe) {
        FormTranslator forms = forms(0);
        Form total = Form.scalar(graph.zero());
        List<WeightedSquare> squares = new ArrayList<>();
        List<Node> terms = new ArrayList<>();
        List<Form> oneForms = new ArrayList<>();
        for (Expression expression : coframe.oneForms()) {
            oneForms.add(forms.translate(expression));
        }
        for (int a = 0; a < n; a++) {
            Node sign = graph.constant(coframe.signs().get(a));
            Form oneForm = oneForms.get(a);
            squares.add(forms.square(sign, oneForm));
            total = total.plus(graph, oneForm.times(graph, oneForm).times(graph, sign));
        }
        for (int a = 0; a < n; a++) {
            Node along = alongVelocity(coframe.oneForms().get(a));
            graph.keep(along);
            terms.add(graph.multiple(new BigFraction(coframe.signs().get(a)), graph.power(along, 2)));
        }
        List<List<Node>> coefficients =
                squares.stream().map(WeightedSquare::coefficients).toList();
        return metric(components(total), Optional.of(graph.sum(terms)), Optional.of(squares))
                .with(new MetricGraph.Coframe(coframe.signs(), coefficients));
    }

    private MetricGraph matrix(MetricForm.Matrix matrix) {
        Node[][] g = new Node[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                g[i][j] = scope.translator().translate(matrix.rows().get(i).get(j));
                g[j][i] = g[i][j];
            }
        }
        return metric(g, Optional.empty(), Optional.empty());
    }

    private Node[][] components(Form form) {
        Node[][] g = new Node[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                Node coefficient = form.quadratic(graph, i, j);
                g[i][j] = i == j ? coefficient : graph.multiple(BigFraction.ONE_HALF, coefficient);
                g[j][i] = g[i][j];
            }
        }
        return g;
    }

    private MetricGraph metric(Node[][] g, Optional<Node> quadraticForm, Optional<List<WeightedSquare>> squares) {
        for (Node[] row : g) {
            for (Node component : row) {
                graph.keep(component);
            }
        }
        return new MetricGraph(
                graph,
                scope.coordinates(),
                g,
                quadraticForm,
                velocities,
                squares,
                Optional.empty(),
                Optional.empty(),
                new DomainSigns(definition)::isNotNegative);
    }
}
