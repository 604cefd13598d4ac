package io.github.gammawright.definition;

import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.LocatedText;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** The metric itself, in whichever of its forms it is given. */
final class FormSection {

    private final KeyedTable top;
    private final List<String> coordinates;
    private final Reading reading;

    private FormSection(KeyedTable top, List<String> coordinates, Reading reading) {
        this.top = top;
        this.coordinates = coordinates;
        this.reading = reading;
    }

    /** The form; nothing if anything was wrong with it, which is then reported. */
    static Optional<MetricForm> read(KeyedTable top, List<String> coordinates, Reading reading) {
        return new FormSection(top, coordinates, reading).read();
    }

    private Optional<MetricForm> read() {
        List<TomlValue.Entry> given = top.entries().stream()
                .filter(entry -> DefinitionKeys.FORMS.contains(entry.key()))
                .toList();
        if (given.isEmpty()) {
            reading.diagnostics().report(DiagnosticCode.FORM_MISSING, SourcePosition.START);
            return Optional.empty();
        }
        for (TomlValue.Entry further : given.subList(1, given.size())) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.FORM_SEVERAL,
                            further.position(),
                            given.get(0).key(),
                            further.key());
        }
        TomlValue.Entry form = given.get(0);
        if (top.has(DefinitionKeys.SIGNATURE) && !form.key().equals(DefinitionKeys.COFRAME)) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.SIGNATURE_MISPLACED,
                            top.entry(DefinitionKeys.SIGNATURE).orElseThrow().position());
        }
        if (coordinates.isEmpty() && !form.key().equals(DefinitionKeys.PULL_BACK)) {
            return Optional.empty();
        }
        return switch (form.key()) {
            case DefinitionKeys.LINE_ELEMENT -> lineElement(form);
            case DefinitionKeys.METRIC -> MatrixSection.read(top, form, coordinates, reading);
            case DefinitionKeys.THREE_PLUS_ONE -> threePlusOne(form);
            case DefinitionKeys.COFRAME -> coframe(form);
            default -> {
                reading.diagnostics().report(DiagnosticCode.PULL_BACK_UNSUPPORTED, form.position());
                yield Optional.empty();
            }
        };
    }

    private Optional<MetricForm> lineElement(TomlValue.Entry form) {
        return quadraticForm(form.value(), form.key(), coordinates, Set.of()).map(MetricForm.LineElement::new);
    }

    private Optional<MetricForm> threePlusOne(TomlValue.Entry form) {
        Optional<KeyedTable> table = top.table(form.key());
        if (table.isEmpty()) {
            return Optional.empty();
        }
        KeyedTable split = table.get();
        split.allow(DefinitionKeys.IN_THREE_PLUS_ONE);
        if (coordinates.size() < 2) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.LENGTH_WRONG,
                            form.position(),
                            DefinitionKeys.COORDINATES,
                            "two entries or more for this form",
                            coordinates.size());
            return Optional.empty();
        }
        Scope scope = Scope.everything("in lapse and shift");
        Optional<Expression> lapse = required(split, DefinitionKeys.LAPSE, "lapse = \"1\"")
                .flatMap(value -> reading.expression(value, DefinitionKeys.LAPSE, scope));
        lapse.filter(this::isZero)
                .ifPresent(zero -> reading.diagnostics()
                        .report(DiagnosticCode.METRIC_DEGENERATE, Expressions.start(zero), "the lapse"));
        Optional<List<Expression>> shift = shift(split, scope);
        String time = Names.differential(coordinates.get(0));
        Optional<Expression> spatial = required(
                        split, DefinitionKeys.SPATIAL_LINE_ELEMENT, "spatial-line-element = \"dx^2 + dy^2 + dz^2\"")
                .flatMap(value -> quadraticForm(
                        value,
                        DefinitionKeys.SPATIAL_LINE_ELEMENT,
                        coordinates.subList(1, coordinates.size()),
                        Set.of(time)));
        if (lapse.isEmpty() || shift.isEmpty() || spatial.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new MetricForm.ThreePlusOne(lapse.get(), shift.get(), spatial.get()));
    }

    private Optional<TomlValue> required(KeyedTable table, String key, String example) {
        Optional<TomlValue> value = table.entry(key).map(TomlValue.Entry::value);
        if (value.isEmpty()) {
            table.missing(key, table.position(), example);
        }
        return value;
    }

    /** The contravariant components; a shift that isn't given is zero. */
    private Optional<List<Expression>> shift(KeyedTable split, Scope scope) {
        int count = coordinates.size() - 1;
        if (!split.has(DefinitionKeys.SHIFT)) {
            Expression zero = new Expression.Number(org.hipparchus.fraction.BigFraction.ZERO, split.position());
            return Optional.of(java.util.Collections.nCopies(count, zero));
        }
        return split.sequence(DefinitionKeys.SHIFT, "an array of expressions")
                .flatMap(array -> expressions(array, DefinitionKeys.SHIFT, scope, count));
    }

    /** As many expressions as there must be; nothing if there are others, or one is wrong. */
    private Optional<List<Expression>> expressions(TomlValue.Sequence array, String key, Scope scope, int count) {
        List<Expression> expressions = new ArrayList<>();
        for (TomlValue element : array.elements()) {
            reading.expression(element, key, scope).ifPresent(expressions::add);
        }
        if (array.elements().size() != count) {
            reading.diagnostics()
                    .report(
                            DiagnosticCode.LENGTH_WRONG,
                            array.position(),
                            key,
                            count + (count == 1 ? " entry" : " entries"),
                            array.elements().size());
            return Optional.empty();
        }
        return expressions.size() == count ? Optional.of(expressions) : Optional.empty();
    }

    private Optional<MetricForm> coframe(TomlValue.Entry form) {
        Optional<List<Integer>> signs = signs(form);
        Set<String> differentials = differentials(coordinates);
        Scope scope = new Scope("in a one-form", name -> true, differentials, "");
        Optional<List<Expression>> forms = top.sequence(form.key(), "an array of one-forms")
                .flatMap(array -> expressions(array, form.key(), scope, coordinates.size()));
        if (forms.isEmpty()) {
            return Optional.empty();
        }
        boolean linear = true;
        for (Expression oneForm : forms.get()) {
            linear &= DifferentialDegrees.isLinear(oneForm, differentials, reading.constants(), reading.diagnostics());
        }
        boolean complete = linear && hasAllDifferentials(forms.get(), coordinates, form.position());
        return complete && signs.isPresent()
                ? Optional.of(new MetricForm.Coframe(forms.get(), signs.get()))
                : Optional.empty();
    }

    private Optional<List<Integer>> signs(TomlValue.Entry form) {
        if (!top.has(DefinitionKeys.SIGNATURE)) {
            String example = "-" + "+".repeat(Math.max(0, coordinates.size() - 1));
            top.missing(DefinitionKeys.SIGNATURE, form.position(), "signature = \"" + example + "\"");
            return Optional.empty();
        }
        return top.text(DefinitionKeys.SIGNATURE)
                .filter(text -> isSignature(text, coordinates, reading))
                .map(text ->
                        text.toString().chars().mapToObj(c -> c == '+' ? 1 : -1).toList());
    }

    /** Whether the text is one sign for each coordinate; reports if it is not. */
    static boolean isSignature(LocatedText text, List<String> coordinates, Reading reading) {
        String signs = text.toString();
        boolean right = signs.matches("[+-]*") && (signs.length() == coordinates.size() || coordinates.isEmpty());
        if (!right) {
            int n = coordinates.size();
            reading.diagnostics()
                    .report(
                            DiagnosticCode.SIGNATURE_INVALID,
                            text.position(0, text.length()),
                            signs,
                            n + (n == 1 ? " dimension" : " dimensions"));
        }
        return right;
    }

    /** A quadratic form in the differentials of the given coordinates, with all of them. */
    private Optional<Expression> quadraticForm(
            TomlValue value, String key, List<String> of, Set<String> withoutDifferentials) {
        Set<String> differentials = differentials(of);
        String remedy = withoutDifferentials.isEmpty() ? "" : "Lapse and shift give the terms with the time.";
        Scope scope = new Scope("in " + key, name -> true, differentials, remedy);
        return reading.expression(value, key, scope)
                .filter(expression -> DifferentialDegrees.isQuadratic(
                        expression, differentials, reading.constants(), reading.diagnostics()))
                .filter(expression -> hasAllDifferentials(List.of(expression), of, Expressions.start(expression)));
    }

    private boolean hasAllDifferentials(List<Expression> expressions, List<String> of, SourcePosition position) {
        Set<String> used = new HashSet<>();
        expressions.forEach(expression -> Expressions.forEachName(expression, name -> used.add(name.name())));
        boolean complete = true;
        for (String coordinate : of) {
            String differential = Names.differential(coordinate);
            if (!used.contains(differential)) {
                complete = false;
                reading.diagnostics().report(DiagnosticCode.DIFFERENTIAL_MISSING, position, differential, coordinate);
            }
        }
        return complete;
    }

    private static Set<String> differentials(List<String> coordinates) {
        Set<String> differentials = new LinkedHashSet<>();
        coordinates.forEach(coordinate -> differentials.add(Names.differential(coordinate)));
        return differentials;
    }

    private boolean isZero(Expression expression) {
        return reading.constants().isZero(expression);
    }
}
