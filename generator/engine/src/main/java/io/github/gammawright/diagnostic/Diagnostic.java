package io.github.gammawright.diagnostic;

import java.util.Comparator;

/**
 * One thing that is wrong with a definition, where, and how to mend it.
 *
 * @param code what kind of mistake it is; stable
 * @param source the text it is in
 * @param position where in the text
 * @param message what is wrong: one line, no full stop
 * @param remedy how to mend it: a sentence, or empty where there is nothing to say
 */
public record Diagnostic(DiagnosticCode code, SourceText source, SourcePosition position, String message, String remedy)
        implements Comparable<Diagnostic> {

    private static final Comparator<Diagnostic> ORDER = Comparator.comparing(Diagnostic::position)
            .thenComparing(Diagnostic::code)
            .thenComparing(Diagnostic::message);

    /** A diagnostic with the code's own wording; the arguments fill the places in it. */
    public static Diagnostic of(DiagnosticCode code, SourceText source, SourcePosition position, Object... arguments) {
        return new Diagnostic(code, source, position, code.message(arguments), code.remedy(arguments));
    }

    /**
     * What the author reads: {@code FILE:LINE:COLUMN: what is wrong}, then the line with a caret below the place, then
     * the remedy. For example
     *
     * <pre>{@code
     * lantern-star.metric.toml:5:46: unknown name 'mm'
     * line-element = "-exp(2*nu)*dt^2 + dr^2/(1 - 2*mm/r)"
     *                                               ^
     * Did you mean 'm'?
     * }</pre>
     *
     * <p>Lines end with a line feed, the last one with none. Characters that a terminal would act upon are replaced by
     * visible ones.
     */
    public String render() {
        StringBuilder out = new StringBuilder(heading());
        if (code.showsLine()) {
            out.append('\n').append(Excerpt.of(source.line(position.line()), position.column()));
        }
        if (!remedy.isEmpty()) {
            out.append('\n').append(remedy);
        }
        return out.toString();
    }

    /** The first line of {@link #render()} alone. */
    public String heading() {
        return VisibleText.of(source.name()) + ":" + position.line() + ":" + position.column() + ": " + message;
    }

    @Override
    public int compareTo(Diagnostic other) {
        return ORDER.compare(this, other);
    }
}
