package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.Spelling;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;

/**
 * The names that may be used in some part of a definition.
 *
 * @param place the part, as it follows "has no place"
 * @param allowed of the declared names, those that may be used
 * @param differentials those that may be used
 * @param remedy what to do about a name that may not; empty where there is no advice
 */
record Scope(String place, Predicate<String> allowed, Set<String> differentials, String remedy) {

    /** All declared names and no differential. */
    static Scope everything(String place) {
        return new Scope(
                place,
                name -> true,
                Set.of(),
                "Differentials belong in line-element, spatial-line-element and coframe.");
    }

    /** No names. */
    static Scope nothing(String place) {
        return new Scope(place, name -> false, Set.of(), "Only numbers, pi and functions of them are known here.");
    }

    /** Reports each name in the expression that is not known or not allowed; whether there is none. */
    boolean resolve(Expression expression, Declarations declarations, Diagnostics diagnostics) {
        boolean[] sound = {true};
        Expressions.forEachName(expression, name -> {
            if (!diagnostics.isFull()) {
                sound[0] &= resolve(name, declarations, diagnostics);
            }
        });
        return sound[0];
    }

    private boolean resolve(Expression.Name name, Declarations declarations, Diagnostics diagnostics) {
        String written = name.name();
        Optional<NameKind> kind = declarations.kind(written);
        Optional<String> coordinate = declarations.coordinateOf(written);
        if (kind.isPresent() ? allowed.test(written) : coordinate.isPresent() && differentials.contains(written)) {
            return true;
        }
        if (kind.isPresent() || coordinate.isPresent()) {
            String phrase = kind.map(NameKind::phrase)
                    .orElseGet(() -> "the differential of the coordinate " + coordinate.orElseThrow());
            diagnostics.reportWithRemedy(
                    DiagnosticCode.NAME_NOT_ALLOWED, name.position(), remedy, written, phrase, place);
            return false;
        }
        Optional<String> nearest = Spelling.nearest(written, usable(declarations));
        if (nearest.isPresent()) {
            diagnostics.reportWithRemedy(
                    DiagnosticCode.NAME_UNKNOWN, name.position(), "Did you mean '" + nearest.get() + "'?", written);
        } else {
            diagnostics.report(DiagnosticCode.NAME_UNKNOWN, name.position(), written);
        }
        return false;
    }

    private List<String> usable(Declarations declarations) {
        List<String> usable = new ArrayList<>();
        Arrays.stream(NameKind.values())
                .flatMap(kind -> declarations.names(kind).stream())
                .filter(allowed)
                .forEach(usable::add);
        usable.addAll(differentials);
        usable.add(Names.PI);
        return usable;
    }
}
