package io.github.gammawright.verification.claims;

import io.github.gammawright.algebra.AlgebraBudget;
import io.github.gammawright.algebra.FormStyle;
import io.github.gammawright.algebra.NormalForms;
import io.github.gammawright.algebra.NormalForms.Term;
import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.geometry.DegenerateMetricException;
import io.github.gammawright.geometry.MetricGraphBuilder;
import io.github.gammawright.geometry.UndefinedValueException;
import io.github.gammawright.graph.Node;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** Tries to show that a tensor vanishes identically, whatever the parameters and the caller's functions. */
final class Proof {

    /** A graph that grows beyond this is given up: checks have other things to do. */
    private static final int MOST_NODES = 60_000;

    private final MetricDefinition definition;

    Proof(MetricDefinition definition) {
        this.definition = definition;
    }

    /** What is known of a tensor from algebra alone. */
    enum Outcome {
        /** The normal form of each component is 0. */
        ZERO_BY_NORMAL_FORMS,
        /** Each component is 0 at random points of the prime field. */
        ZERO_IN_PRIME_FIELD,
        /** Neither could be shown. */
        OPEN
    }

    /**
     * Examines a tensor.
     *
     * @param expressions of the definition, which the tensor needs
     * @param tensor its components from the metric and the values of these expressions
     */
    Outcome examine(List<Expression> expressions, Tensor tensor) {
        return attempt(expressions, (nodes, values) -> {
                    List<List<Term>> components = tensor.components(nodes, values);
                    for (List<Term> component : components) {
                        if (!nodes.value(component).isZero()) {
                            return Outcome.OPEN;
                        }
                    }
                    return byNormalForms(nodes, components);
                })
                .orElse(Outcome.OPEN);
    }

    private static Outcome byNormalForms(MetricNodes nodes, List<List<Term>> components) {
        NormalForms forms = new NormalForms(nodes.graph(), FormStyle.READABLE, AlgebraBudget.normal());
        for (List<Term> component : components) {
            List<Term> present = component.stream()
                    .filter(term -> term.factors().stream().noneMatch(Node::isZero))
                    .toList();
            if (!forms.vanishes(present).orElse(false)) {
                return Outcome.ZERO_IN_PRIME_FIELD;
            }
        }
        return Outcome.ZERO_BY_NORMAL_FORMS;
    }

    /** Of which coordinates the metric is free, and whether they don't even occur in it; empty if nothing is known. */
    Optional<List<Outcome>> freeOf() {
        return attempt(List.of(), (nodes, none) -> {
            List<Outcome> outcomes = new ArrayList<>();
            for (int k = 0; k < definition.dimension(); k++) {
                outcomes.add(freeOf(nodes, k));
            }
            return outcomes;
        });
    }

    private Outcome freeOf(MetricNodes nodes, int k) {
        boolean occurs = false;
        for (Node[] row : nodes.metric().components()) {
            for (Node component : row) {
                occurs |= nodes.graph()
                        .dependsOn(component, nodes.metric().coordinates().get(k));
                if (!nodes.derivative(component, k).isZero()) {
                    return Outcome.OPEN;
                }
            }
        }
        return occurs ? Outcome.ZERO_IN_PRIME_FIELD : Outcome.ZERO_BY_NORMAL_FORMS;
    }

    private <T> Optional<T> attempt(List<Expression> expressions, Work<T> work) {
        try {
            MetricGraphBuilder.WithExpressions built = MetricGraphBuilder.build(definition, expressions);
            return Optional.of(work.on(new MetricNodes(built.metric(), MOST_NODES), built.expressions()));
        } catch (MetricNodes.TooLarge | UndefinedValueException | DegenerateMetricException e) {
            return Optional.empty();
        }
    }

    private interface Work<T> {
        T on(MetricNodes nodes, List<Node> values);
    }

    /** The components of a tensor. */
    @FunctionalInterface
    interface Tensor {
        List<List<Term>> components(MetricNodes nodes, List<Node> values);

        /** A tensor that needs nothing but the metric. */
        static Tensor of(Function<MetricNodes, List<List<Term>>> tensor) {
            return (nodes, values) -> tensor.apply(nodes);
        }

        /** A tensor that the algebra has no components of, so that nothing is shown. */
        static Tensor unknown() {
            return (nodes, values) -> {
                throw new MetricNodes.TooLarge();
            };
        }
    }
}
