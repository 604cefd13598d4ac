package io.github.gammawright.verification.reference;

import io.github.gammawright.definition.ElementaryFunction;
import io.github.gammawright.definition.Expression;
import io.github.gammawright.definition.Expression.Binary;
import io.github.gammawright.definition.Expression.Call;
import io.github.gammawright.definition.Expression.Name;
import io.github.gammawright.definition.Expression.Negation;
import io.github.gammawright.definition.Expression.Number;
import io.github.gammawright.definition.Expression.Operator;
import io.github.gammawright.definition.Expression.Pi;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashMap;
import java.util.Map;
import org.hipparchus.fraction.BigFraction;

/** Evaluates syntax trees as power series, with differentials as further indeterminates. */
final class ExpressionEvaluator {

    private final TaylorRing ring;
    private final int dimension;
    private final Map<String, DifferentialPolynomial> names;

    /** An evaluator that knows no name yet. */
    ExpressionEvaluator(TaylorRing ring, int dimension) {
        this(ring, dimension, new HashMap<>());
    }

    private ExpressionEvaluator(TaylorRing ring, int dimension, Map<String, DifferentialPolynomial> names) {
        this.ring = ring;
        this.dimension = dimension;
        this.names = names;
    }

    /** An evaluator that knows the names so far, and does not pass on those that it learns. */
    ExpressionEvaluator copy() {
        return new ExpressionEvaluator(ring, dimension, new HashMap<>(names));
    }

    /** Gives a name a meaning. */
    void define(String name, DifferentialPolynomial value) {
        names.put(name, value);
    }

    /** Gives a name a meaning without differentials. */
    void define(String name, Taylor value) {
        define(name, DifferentialPolynomial.scalar(dimension, value));
    }

    /** The series of an expression without differentials. */
    Taylor scalar(Expression expression) {
        return evaluate(expression).asScalar();
    }

    /** The value of an expression. */
    DifferentialPolynomial evaluate(Expression expression) {
        // A long sum is a tree that is deep on its left: down there by a loop, so that no stack overflows.
        Deque<Expression> spine = new ArrayDeque<>();
        Expression current = expression;
        while (true) {
            if (current instanceof Binary binary && binary.operator() != Operator.POWER) {
                spine.push(binary);
                current = binary.left();
            } else if (current instanceof Negation negation) {
                spine.push(negation);
                current = negation.operand();
            } else {
                break;
            }
        }
        DifferentialPolynomial value = leaf(current);
        while (!spine.isEmpty()) {
            value = spine.pop() instanceof Binary binary ? apply(binary, value) : value.negate();
        }
        return value;
    }

    private DifferentialPolynomial leaf(Expression expression) {
        if (expression instanceof Name name) {
            DifferentialPolynomial value = names.get(name.name());
            if (value == null) {
                throw new IllegalArgumentException("the name " + name.name() + " has no meaning here");
            }
            return value;
        }
        if (expression instanceof Binary power) {
            return power(evaluate(power.left()), power.right());
        }
        return DifferentialPolynomial.scalar(dimension, scalarLeaf(expression));
    }

    private Taylor scalarLeaf(Expression expression) {
        if (expression instanceof Number number) {
            return number.value().signum() == 0
                    ? ring.zero()
                    : ring.constant(ring.arithmetic().of(number.value()));
        }
        if (expression instanceof Pi) {
            return ring.constant(ring.arithmetic().pi());
        }
        Call call = (Call) expression;
        Taylor first = scalar(call.arguments().get(0));
        return call.function() == ElementaryFunction.ATAN2
                ? TaylorFunctions.atan2(first, scalar(call.arguments().get(1)))
                : TaylorFunctions.apply(call.function(), first);
    }

    private DifferentialPolynomial apply(Binary binary, DifferentialPolynomial left) {
        DifferentialPolynomial right = evaluate(binary.right());
        return switch (binary.operator()) {
            case ADD -> left.plus(right);
            case SUBTRACT -> left.plus(right.negate());
            case MULTIPLY -> left.times(right);
            case DIVIDE -> left.dividedBy(right.asScalar());
            case POWER -> throw new IllegalStateException("powers are evaluated elsewhere");
        };
    }

    private DifferentialPolynomial power(DifferentialPolynomial base, Expression exponent) {
        BigFraction rational = RationalConstants.valueOf(exponent).orElse(null);
        if (!base.isScalar()) {
            if (BigFraction.ONE.equals(rational)) {
                return base;
            }
            if (BigFraction.TWO.equals(rational)) {
                return base.times(base);
            }
            throw new IllegalArgumentException("a differential may be raised to the power 2 only");
        }
        Taylor value = base.asScalar();
        Taylor result = rational == null
                ? TaylorFunctions.power(value, scalar(exponent))
                : TaylorFunctions.power(value, ring.arithmetic().of(rational));
        return DifferentialPolynomial.scalar(dimension, result);
    }
}
