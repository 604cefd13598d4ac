package io.github.gammawright.emission;

import io.github.gammawright.graph.RealFunction;
import java.util.EnumSet;
import java.util.Set;

/** Functions as the emitted class calls them; remembers which helpers of its own it needs. */
final class FunctionNames implements JavaExpressions.FunctionCalls {

    private final String className;
    private final String math;
    private final boolean sharedTrigonometry;
    private final Set<RealFunction> helpers = EnumSet.noneOf(RealFunction.class);

    FunctionNames(String className, boolean sharedTrigonometry) {
        this.className = className;
        this.math = javaLang("Math");
        this.sharedTrigonometry = sharedTrigonometry;
    }

    /** The name of a class of {@code java.lang}, which the kernel's own would hide if it were the same. */
    String javaLang(String name) {
        return className.equals(name) ? "java.lang." + name : name;
    }

    @Override
    public String callee(RealFunction function) {
        boolean own = switch (function) {
            case ASINH, ACOSH, ATANH -> true;
            case SIN, COS -> sharedTrigonometry;
            default -> false;
        };
        if (own) {
            helpers.add(function);
        }
        return own ? function.symbol() : math + "." + function.symbol();
    }

    @Override
    public String fma() {
        return math + ".fma";
    }

    @Override
    public String pi() {
        return math + ".PI";
    }

    String math() {
        return math;
    }

    /** The functions that the class computes by itself and that were printed so far. */
    Set<RealFunction> helpers() {
        return helpers;
    }
}
