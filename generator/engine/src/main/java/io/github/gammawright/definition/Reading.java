package io.github.gammawright.definition;

import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.LocatedText;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.hipparchus.fraction.BigFraction;

/** What the sections of a definition share while they are read. */
final class Reading {

    private final Limits limits;
    private final Diagnostics diagnostics;
    private final Declarations declarations;
    private final ExpressionParser parser;
    private final ConstantCheck constants;
    private final Set<String> dependsOnCoordinates = new HashSet<>();
    private final List<SymmetryCheck.Pair> upperTriangle = new ArrayList<>();
    private boolean sound = true;
    private int constantCalls;

    Reading(Limits limits, Diagnostics diagnostics) {
        this.limits = limits;
        this.diagnostics = diagnostics;
        this.declarations = new Declarations(diagnostics);
        this.parser = new ExpressionParser(limits, diagnostics, declarations::kind);
        this.constants = new ConstantCheck(limits, diagnostics);
    }

    Limits limits() {
        return limits;
    }

    Diagnostics diagnostics() {
        return diagnostics;
    }

    Declarations declarations() {
        return declarations;
    }

    /** What is known of constants, once the abbreviations are. */
    ConstantCheck constants() {
        return constants;
    }

    /** The abbreviations whose value is not the same everywhere. */
    Set<String> dependsOnCoordinates() {
        return dependsOnCoordinates;
    }

    /** Entries of a matrix above the diagonal with those that they should equal. */
    List<SymmetryCheck.Pair> upperTriangle() {
        return upperTriangle;
    }

    /** Whether all abbreviations are known, so that expressions can be evaluated. */
    boolean isSound() {
        return sound;
    }

    void unsound() {
        sound = false;
    }

    /** Parses the value of a key and resolves its names; reports what is wrong and then gives nothing. */
    Optional<Expression> expression(TomlValue value, String key, Scope scope) {
        return expression(value, key)
                .filter(expression -> scope.resolve(expression, declarations, diagnostics))
                .filter(expression -> constants.check(expression).isPresent());
    }

    private Optional<Expression> expression(TomlValue value, String key) {
        if (value instanceof TomlValue.Text text) {
            return parser.parse(text.text());
        }
        if (value instanceof TomlValue.Number number) {
            return number(number);
        }
        diagnostics.report(
                DiagnosticCode.TYPE_WRONG, value.position(), key, "a number or an expression in quotes", value.kind());
        return Optional.empty();
    }

    /** Parses a condition and resolves its names; reports what is wrong and then gives nothing. */
    Optional<MetricDefinition.Condition> condition(LocatedText text) {
        Scope scope = Scope.everything("in a condition");
        return parser.parseCondition(text).filter(condition -> {
            boolean resolved = true;
            for (Expression operand : condition.operands()) {
                resolved &= scope.resolve(operand, declarations, diagnostics)
                        && constants.check(operand).isPresent();
            }
            return resolved;
        });
    }

    /** The double nearest to a constant expression; reports if it is none, or not a finite one, and gives nothing. */
    Optional<Double> finiteValue(Expression constant) {
        constantCalls += Expressions.calls(constant);
        if (constantCalls > limits.constantCalls()) {
            diagnostics.report(
                    DiagnosticCode.CONSTANTS_TOO_COSTLY, Expressions.start(constant), limits.constantCalls());
            return Optional.empty();
        }
        double value = ParameterDefaults.value(constant);
        if (Double.isFinite(value)) {
            return Optional.of(value);
        }
        diagnostics.report(
                DiagnosticCode.PARAMETER_NOT_FINITE,
                Expressions.start(constant),
                Double.isNaN(value) ? "no real number" : "too large for a double");
        return Optional.empty();
    }

    private Optional<Expression> number(TomlValue.Number number) {
        String literal = number.literal();
        boolean negative = literal.startsWith("-");
        String magnitude = negative || literal.startsWith("+") ? literal.substring(1) : literal;
        if (magnitude.equals("nan") || magnitude.equals("inf")) {
            diagnostics.report(DiagnosticCode.NUMBER_NOT_FINITE, number.position(), literal);
            return Optional.empty();
        }
        Optional<BigFraction> value = NumberLiteral.value(magnitude, limits.digits());
        if (value.isEmpty()) {
            diagnostics.report(DiagnosticCode.NUMBER_TOO_LONG, number.position(), limits.digits());
            return Optional.empty();
        }
        Expression exact = new Expression.Number(value.get(), number.position());
        return Optional.of(negative ? new Expression.Negation(exact, number.position()) : exact);
    }
}
