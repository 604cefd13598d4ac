package io.github.gammawright.emission;

import io.github.gammawright.graph.RealFunction;
import java.util.EnumSet;
import java.util.Set;

/** Functions as the emitted class calls them; remembers which helpers of its own it needs. */
final class FunctionNames implements JavaExpressions.FunctionCalls {

    private final String math;
    private final Set<RealFunction> helpers = EnumSet.noneOf(RealFunction.class);

    /** A class of the name {@code Math} would hide that of {@code java.lang}. */
    FunctionNames(String className) {
        this.math = className.equals("Math") ? "java.lang.Math" : "Math";
    }

    @Override
    public String callee(RealFunction function) {
        return switch (function) {
            case ASINH, ACOSH, ATANH -> {
                helpers.add(function);
                yield function.symbol();
            }
            default -> math + "." + function.symbol();
        };
    }

    @Override
    public String pi() {
        return math + ".PI";
    }

    String math() {
        return math;
    }

    /** The functions that {@code java.lang.Math} lacks and that were printed so far. */
    Set<RealFunction> helpers() {
        return helpers;
    }
}
