package io.github.gammawright.emission;

import io.github.gammawright.definition.Expression;

/** The value of a parameter's default. */
final class DefaultValue {

    private DefaultValue() {}

    static double of(Expression expression) {
        if (expression instanceof Expression.Number number) {
            return DoubleLiteral.nearest(number.value());
        }
        throw new IllegalArgumentException("not yet");
    }
}
