package io.github.gammawright.definition;

import io.github.gammawright.definition.toml.TomlDocument;
import io.github.gammawright.definition.toml.TomlValue;
import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostics;
import io.github.gammawright.diagnostic.SourceText;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/**
 * Reads metric definitions: TOML 1.0 with expressions in strings. A definition is data; nothing in it is run, and a file
 * of any content is read in bounded time and memory.
 *
 * <p>Everything that is wrong is collected and thrown together, each with its line and column and how to mend it. What
 * comes back is complete and consistent, as {@link MetricDefinition} says.
 */
public final class DefinitionReader {

    private final Diagnostics diagnostics;
    private final Limits limits;

    private DefinitionReader(SourceText source, Limits limits) {
        this.diagnostics = new Diagnostics(source);
        this.limits = limits;
    }

    /**
     * Reads a file with the usual limits.
     *
     * @throws DefinitionException if it can't be read, or with all that is wrong in it
     */
    public static MetricDefinition read(Path file) {
        return read(file, Limits.DEFAULT);
    }

    /**
     * Reads a file.
     *
     * @throws DefinitionException if it can't be read, or with all that is wrong in it
     */
    public static MetricDefinition read(Path file, Limits limits) {
        return read(DefinitionFiles.read(file, limits), limits);
    }

    /**
     * Reads a text with the usual limits.
     *
     * @throws DefinitionException with all that is wrong in it
     */
    public static MetricDefinition read(SourceText source) {
        return read(source, Limits.DEFAULT);
    }

    /**
     * Reads a text.
     *
     * @throws DefinitionException with all that is wrong in it
     */
    public static MetricDefinition read(SourceText source, Limits limits) {
        return new DefinitionReader(source, limits).read();
    }

    /**
     * The text of a file as {@link #read(Path)} sees it, without byte order mark.
     *
     * @throws DefinitionException if the file can't be read
     */
    public static SourceText sourceOf(Path file, Limits limits) {
        return DefinitionFiles.read(file, limits);
    }

    private MetricDefinition read() {
        TextCheck.check(diagnostics, limits);
        diagnostics.throwIfAny();
        Optional<TomlValue.Table> document = TomlDocument.read(diagnostics);
        if (document.isEmpty()) {
            diagnostics.throwIfAny();
            throw new IllegalStateException("a document was refused without a reason");
        }
        MetricDefinition definition = definition(document.get());
        diagnostics.throwIfAny();
        return definition;
    }

    /** Reads on after mistakes, to find them all; the result is of use only if there was none. */
    private MetricDefinition definition(TomlValue.Table document) {
        KeyedTable top = new KeyedTable(document, "at the top level", diagnostics);
        top.allow(DefinitionKeys.TOP_LEVEL);

        Reading reading = new Reading(limits, diagnostics);
        HeadSection head = HeadSection.read(top, reading);
        ParameterSection parameters = ParameterSection.declare(top, reading);
        FunctionSection functions = FunctionSection.declare(top, reading);
        AbbreviationSection abbreviations = AbbreviationSection.declare(top, reading);
        reading.declarations().checkDifferentials();

        List<MetricDefinition.Parameter> parameterList = parameters.read();
        List<MetricDefinition.CallerFunction> functionList = functions.read();
        List<MetricDefinition.Abbreviation> abbreviationList = abbreviations.read();
        Optional<MetricForm> form = FormSection.read(top, head.coordinates(), reading);
        MetricDefinition.Domain domain = DomainSection.read(top, reading);
        MetricDefinition.Claims claims = ClaimsSection.read(top, head.coordinates(), reading);
        List<MetricDefinition.KernelEntry> kernels = KernelSection.read(top, reading);
        MetricDefinition definition = new MetricDefinition(
                head.name(),
                head.title(),
                head.reference(),
                head.coordinates(),
                parameterList,
                abbreviationList,
                functionList,
                form.orElseGet(() -> new MetricForm.Matrix(List.of())),
                domain,
                claims,
                kernels,
                diagnostics.source());
        if (form.isEmpty() && diagnostics.isEmpty()) {
            throw new IllegalStateException("a form was refused without a reason");
        }
        if (form.isPresent() && reading.isSound()) {
            SymmetryCheck.check(reading.upperTriangle(), definition, diagnostics);
        }
        return definition;
    }
}
