package io.github.gammawright.emission;

import com.palantir.javapoet.CodeBlock;
import com.palantir.javapoet.MethodSpec;
import io.github.gammawright.graph.RealFunction;
import java.util.List;
import javax.lang.model.element.Modifier;

/**
 * Writes sine and cosine as methods of the class, for kernels that don't call the library's. Both reduce their argument
 * and evaluate the same two polynomials, and neither branches within |x| ≤ 2²⁰, so that the virtual machine's compiler,
 * which inlines them, computes what they have in common once. Operation counts list the two of one argument, or either,
 * as one {@code sincos}.
 *
 * <p>Reduction after Cody &amp; Waite, Software Manual for the Elementary Functions (1980): π/2 in three parts of 33 bits,
 * whose multiples are exact, and a fourth; the remainder is the sum of two doubles. The polynomials are minimax for the
 * relative error on |y| ≤ 1.001·π/4, found by Remez' exchange with the coefficients rounded one after the other: 2^−57.9
 * for the sine, 2^−63.9 for the cosine.
 */
final class TrigonometryHelpers {

    private static final String[] SINE = {
        "-0x1.5555555555548p-3",
        "0x1.111111110f730p-7",
        "-0x1.a01a019be9209p-13",
        "0x1.71de355529c96p-19",
        "-0x1.ae5e4b8222338p-26",
        "0x1.5d8b54ece59b1p-33"
    };

    private static final String[] COSINE = {
        "0x1.555555555554bp-5",
        "-0x1.6c16c16c15005p-10",
        "0x1.a01a019c8c7efp-16",
        "-0x1.27e4f7ef0fd63p-22",
        "0x1.1ee9d9c91f80cp-29",
        "-0x1.8fa5554ee835bp-37"
    };

    private final EmissionContext context;

    TrigonometryHelpers(EmissionContext context) {
        this.context = context;
    }

    void emit() {
        List<MethodSpec> methods = context.privateMethods();
        boolean sine = context.functions().helpers().contains(RealFunction.SIN);
        boolean cosine = context.functions().helpers().contains(RealFunction.COS);
        if (sine) {
            methods.add(
                    method("sin", "x").addStatement("return circular(x, 0L)").build());
        }
        if (cosine) {
            methods.add(
                    method("cos", "x").addStatement("return circular(x, 1L)").build());
        }
        if (sine || cosine) {
            methods.add(circular());
            methods.add(sinePolynomial());
            methods.add(cosinePolynomial());
        }
    }

    private static MethodSpec.Builder method(String name, String... arguments) {
        MethodSpec.Builder method = MethodSpec.methodBuilder(name)
                .addModifiers(Modifier.PRIVATE, Modifier.STATIC)
                .returns(double.class);
        for (String argument : arguments) {
            method.addParameter(double.class, argument);
        }
        return method;
    }

    private MethodSpec circular() {
        String math = context.functions().math();
        String strict = context.functions().javaLang("StrictMath");
        String bits = context.functions().javaLang("Double") + ".doubleToRawLongBits";
        return method("circular", "x")
                .addParameter(long.class, "quarters")
                .addJavadoc("""
                        sin(x + quarters·π/2) for 0 or 1 quarter turn: sine or cosine, with an error below one unit in
                        the last place and the same to the last bit on every machine.
                        """)
                .addStatement("double magnitude = $L.abs(x)", math)
                .beginControlFlow("if (!(magnitude >= 0x1p-27 && magnitude <= 0x1p20))")
                .beginControlFlow("if (magnitude < 1.0)")
                .addStatement("return quarters == 0L ? x : 1.0")
                .endControlFlow()
                .addStatement("return quarters == 0L ? $1L.sin(x) : $1L.cos(x)", strict)
                .endControlFlow()
                .addComment("the nearest multiple n of \u03c0/2; the sum ends in the bits of that integer")
                .addStatement("double shifted = x * 0x1.45f306dc9c883p-1 + 0x1.8p52")
                .addStatement("double n = shifted - 0x1.8p52")
                .addStatement("double y0 = x - n * 0x1.921fb544p0")
                .addStatement("double n1 = n * 0x1.0b4611a6p-34")
                .addStatement("double n2 = n * 0x1.3198a2ep-69")
                .addStatement("double rest = n1 + n2")
                .addStatement("double y = y0 - rest")
                .addStatement("double low = ((y0 - y) - rest) - (((n1 - rest) + n2) + n * 0x1.b839a252049c1p-104)")
                .addStatement("long sine = $L(sinePolynomial(y, low))", bits)
                .addStatement("long cosine = $L(cosinePolynomial(y, low))", bits)
                .addStatement("long turn = $L(shifted) + quarters", bits)
                .addStatement("long chosen = sine ^ ((sine ^ cosine) & -(turn & 1L))")
                .addStatement(
                        "return $L.longBitsToDouble(chosen ^ ((turn & 2L) << 62))",
                        context.functions().javaLang("Double"))
                .build();
    }

    private static MethodSpec sinePolynomial() {
        return method("sinePolynomial", "y", "low")
                .addStatement("double z = y * y")
                .addStatement("double z2 = z * z")
                .addCode(pairs(SINE))
                .addStatement("return y + (z * y * (a + z2 * (b + z2 * c)) + low * (1.0 - 0.5 * z))")
                .build();
    }

    private static MethodSpec cosinePolynomial() {
        return method("cosinePolynomial", "y", "low")
                .addStatement("double z = y * y")
                .addStatement("double z2 = z * z")
                .addCode(pairs(COSINE))
                .addStatement("double h = 1.0 - 0.5 * z")
                .addStatement("return h + ((((1.0 - h) - 0.5 * z) - y * low) + z2 * (a + z2 * (b + z2 * c)))")
                .build();
    }

    /** The polynomial in pairs of coefficients, which a processor can compute side by side. */
    private static CodeBlock pairs(String... coefficients) {
        CodeBlock.Builder code = CodeBlock.builder();
        for (int i = 0; i < 3; i++) {
            String first = coefficients[2 * i];
            String second = coefficients[2 * i + 1];
            String operator = second.startsWith("-") ? "-" : "+";
            code.addStatement(
                    "double $L = $L $L z * $L", "abc".charAt(i), first, operator, second.replace("-0x", "0x"));
        }
        return code.build();
    }
}
