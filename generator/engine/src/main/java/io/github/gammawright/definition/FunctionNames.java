package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.Spelling;
import java.util.Collection;
import java.util.Map;
import java.util.Optional;

/** Other names and other functions that people write, and how expressions say the same. */
final class FunctionNames {

    private static final Map<String, String> SAYINGS = Map.ofEntries(
            Map.entry("ln", "log(x)"),
            Map.entry("log10", "log(x)/log(10)"),
            Map.entry("log2", "log(x)/log(2)"),
            Map.entry("lg", "log(x)/log(10)"),
            Map.entry("arcsin", "asin(x)"),
            Map.entry("arccos", "acos(x)"),
            Map.entry("arctan", "atan(x)"),
            Map.entry("arctan2", "atan2(y, x)"),
            Map.entry("arcsinh", "asinh(x)"),
            Map.entry("arccosh", "acosh(x)"),
            Map.entry("arctanh", "atanh(x)"),
            Map.entry("arsinh", "asinh(x)"),
            Map.entry("arcosh", "acosh(x)"),
            Map.entry("artanh", "atanh(x)"),
            Map.entry("cot", "1/tan(x)"),
            Map.entry("sec", "1/cos(x)"),
            Map.entry("csc", "1/sin(x)"),
            Map.entry("coth", "1/tanh(x)"),
            Map.entry("sech", "1/cosh(x)"),
            Map.entry("csch", "1/sinh(x)"),
            Map.entry("pow", "x^y"),
            Map.entry("power", "x^y"),
            Map.entry("sqr", "x^2"),
            Map.entry("square", "x^2"),
            Map.entry("cbrt", "x^(1/3)"),
            Map.entry("hypot", "sqrt(x^2 + y^2)"),
            Map.entry("expm1", "exp(x) - 1"),
            Map.entry("log1p", "log(1 + x)"),
            Map.entry("fabs", "abs(x)"),
            Map.entry("sign", "x/abs(x)"),
            Map.entry("sgn", "x/abs(x)"),
            Map.entry("max", "(x + y + abs(x - y))/2"),
            Map.entry("min", "(x + y - abs(x - y))/2"));

    private FunctionNames() {}

    /** How to say what the unknown function means, if it can be guessed. */
    static Optional<String> replacement(String name, Collection<String> known) {
        String saying = SAYINGS.get(name.toLowerCase(java.util.Locale.ROOT));
        if (saying != null) {
            return Optional.of("Write " + saying + ".");
        }
        return Spelling.nearest(name, known).map(nearest -> "Did you mean '" + nearest + "'?");
    }
}
