package io.github.gammawright.definition;

import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.SourcePosition;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The names that a definition declares, each with what it is and where that was said. */
final class Declarations {

    private final Diagnostics diagnostics;
    private final Map<String, Declaration> declared = new LinkedHashMap<>();
    private final Map<String, String> differentials = new LinkedHashMap<>();

    Declarations(Diagnostics diagnostics) {
        this.diagnostics = diagnostics;
    }

    /** Declares a name, which is then normalised; reports if it can't be one, and gives nothing. */
    Optional<String> declare(String written, NameKind kind, SourcePosition position) {
        String name = Names.normalised(written);
        if (!Names.isName(name)) {
            String remedy = DefinitionKeys.TOP_LEVEL.contains(written)
                    ? "'" + written + "' belongs before the first table."
                    : DiagnosticCode.NAME_INVALID.remedy(written, Names.LONGEST);
            diagnostics.reportWithRemedy(DiagnosticCode.NAME_INVALID, position, remedy, written);
            return Optional.empty();
        }
        if (Names.isReserved(name)) {
            diagnostics.report(DiagnosticCode.NAME_RESERVED, position, name);
            return Optional.empty();
        }
        Declaration before = declared.get(name);
        if (before != null) {
            diagnostics.report(
                    DiagnosticCode.NAME_DUPLICATE,
                    position,
                    name,
                    before.kind().phrase(),
                    before.position().line());
            return Optional.empty();
        }
        declared.put(name, new Declaration(kind, position));
        if (kind == NameKind.COORDINATE) {
            differentials.put(Names.differential(name), name);
        }
        return Optional.of(name);
    }

    /** Once all is declared: no name may be the differential of a coordinate. */
    void checkDifferentials() {
        declared.forEach((name, declaration) -> {
            String coordinate = differentials.get(name);
            if (coordinate != null) {
                diagnostics.report(DiagnosticCode.NAME_IS_DIFFERENTIAL, declaration.position(), name, coordinate);
            }
        });
    }

    /** What the name was declared as. */
    Optional<NameKind> kind(String name) {
        return Optional.ofNullable(declared.get(name)).map(Declaration::kind);
    }

    /** The coordinate of which this is the differential. */
    Optional<String> coordinateOf(String differential) {
        return Optional.ofNullable(differentials.get(differential));
    }

    /** The names of a kind, in the order of their declaration. */
    List<String> names(NameKind kind) {
        List<String> names = new ArrayList<>();
        declared.forEach((name, declaration) -> {
            if (declaration.kind() == kind) {
                names.add(name);
            }
        });
        return names;
    }

    private record Declaration(NameKind kind, SourcePosition position) {}
}
