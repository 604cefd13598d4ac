package io.github.gammawright.emission;

import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.graph.RealFunction;
import javax.lang.model.element.Modifier;

/**
 * Writes the inverse hyperbolic functions, which {@code java.lang.Math} lacks, by the formulas of Abramowitz &amp; Stegun
 * (1964), section 4.6, in forms that lose no digits for small arguments. Operation counts list a call as one function.
 */
final class HyperbolicHelpers {

    private static final String LOG_2 = "0.6931471805599453";

    private final EmissionContext context;

    HyperbolicHelpers(EmissionContext context) {
        this.context = context;
    }

    void emit() {
        for (RealFunction function : context.functions().helpers()) {
            switch (function) {
                case ASINH -> context.privateMethods().add(asinh());
                case ACOSH -> context.privateMethods().add(acosh());
                case ATANH -> context.privateMethods().add(atanh());
                default -> {}
            }
        }
    }

    private MethodSpec.Builder method(String name) {
        return MethodSpec.methodBuilder(name)
                .addModifiers(Modifier.PRIVATE, Modifier.STATIC)
                .returns(double.class)
                .addParameter(double.class, "x");
    }

    /** ln(x + √(x² + 1)) as log1p; from 2²⁸ on the root is x to the last bit. */
    private MethodSpec asinh() {
        String math = context.functions().math();
        return method("asinh")
                .addStatement("double a = $L.abs(x)", math)
                .addStatement("double y = a * a / (1.0 + $1L.sqrt(1.0 + a * a))", math)
                .addStatement("y = a > 0x1p28 ? $1L.log(a) + $2L : $1L.log1p(a + y)", math, LOG_2)
                .addStatement("return $L.copySign(y, x)", math)
                .build();
    }

    /** ln(x + √(x² − 1)) as log1p of what exceeds 1. */
    private MethodSpec acosh() {
        String math = context.functions().math();
        return method("acosh")
                .addStatement("double y = x - 1.0")
                .addStatement(
                        "return x > 0x1p28 ? $1L.log(x) + $2L : $1L.log1p(y + $1L.sqrt(y * (y + 2.0)))", math, LOG_2)
                .build();
    }

    /** ½ ln((1 + x)/(1 − x)), even in form, so that it is odd to the last bit. */
    private MethodSpec atanh() {
        String math = context.functions().math();
        return method("atanh")
                .addStatement("double a = $L.abs(x)", math)
                .addStatement("return $1L.copySign(0.5 * $1L.log1p(2.0 * a / (1.0 - a)), x)", math)
                .build();
    }
}
