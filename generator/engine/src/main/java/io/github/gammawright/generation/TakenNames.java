package io.github.gammawright.generation;

import io.github.gammawright.definition.MetricDefinition;
import io.github.gammawright.diagnostic.DiagnosticCode;
import io.github.gammawright.diagnostic.Diagnostics;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;

/** The classes planned so far; no two may have one name, nor names that some file systems cannot tell apart. */
final class TakenNames {

    private final Map<String, Claim> taken = new HashMap<>();

    /** Notes a class, or says who has its name already. */
    void claim(Planned planned, MetricDefinition definition, Diagnostics diagnostics) {
        String name = planned.specification().qualifiedName();
        Claim earlier = taken.putIfAbsent(name.toLowerCase(Locale.ROOT), new Claim(name, definition));
        if (earlier == null) {
            return;
        }
        String by = earlier.definition().source().name();
        if (earlier.name().equals(name)) {
            diagnostics.report(DiagnosticCode.CLASS_DUPLICATE, planned.position(), name, by);
        } else {
            diagnostics.report(DiagnosticCode.CLASS_DIFFERS_IN_CASE, planned.position(), name, earlier.name(), by);
        }
    }

    private record Claim(String name, MetricDefinition definition) {}
}
