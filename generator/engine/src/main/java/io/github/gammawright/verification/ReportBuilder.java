package io.github.gammawright.verification;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** Gathers a report while the check goes on. */
final class ReportBuilder {

    private final String className;
    private final String definition;
    private final CheckSettings settings;
    private final List<QuantityReport> quantities = new ArrayList<>();
    private final List<String> defects = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();
    private List<String> warnings = List.of();
    private Optional<MethodSize> largestMethod = Optional.empty();
    private Optional<String> notChecked = Optional.empty();
    private int points;
    private int edgePoints;

    ReportBuilder(String className, String definition, CheckSettings settings) {
        this.className = className;
        this.definition = definition;
        this.settings = settings;
    }

    void compiled(CompiledClasses classes) {
        warnings = classes.warnings();
        largestMethod = classes.methodSizes().stream().max(Comparator.comparingInt(MethodSize::bytecodes));
    }

    void points(List<SamplePoint> sample) {
        points = sample.size();
        edgePoints = (int) sample.stream().filter(SamplePoint::isAtEdge).count();
    }

    void quantity(QuantityReport report) {
        quantities.add(report);
    }

    void defect(String text) {
        defects.add(text);
    }

    void note(String text) {
        notes.add(text);
    }

    KernelReport notChecked(String reason) {
        notChecked = Optional.of(reason);
        return build();
    }

    KernelReport build() {
        return new KernelReport(
                className,
                definition,
                settings,
                points,
                edgePoints,
                quantities,
                defects,
                notes,
                notChecked,
                warnings,
                largestMethod);
    }
}
