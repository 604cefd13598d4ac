package io.github.gammawright.diagnostic;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;

/**
 * Collects what is wrong with one definition, so that its author learns of everything in one run. Not thread-safe.
 *
 * <p>The same mistake at the same place counts once. Of very many only the first are shown, with a last one that says
 * how many there are.
 */
public final class Diagnostics {

    /** How many mistakes are shown of a definition; whoever has more mends these first. */
    public static final int SHOWN = 50;

    private static final int KEPT = 1_000;

    private final SourceText source;
    private final TreeSet<Diagnostic> found = new TreeSet<>();
    private int dropped;

    /** Nothing is wrong with the text so far. */
    public Diagnostics(SourceText source) {
        this.source = source;
    }

    /** The text that the positions refer to. */
    public SourceText source() {
        return source;
    }

    /** Reports a mistake in the code's own wording. */
    public void report(DiagnosticCode code, SourcePosition position, Object... arguments) {
        add(Diagnostic.of(code, source, position, arguments));
    }

    /** Reports a mistake for which there is a better remedy than the code's general one. */
    public void reportWithRemedy(DiagnosticCode code, SourcePosition position, String remedy, Object... arguments) {
        add(new Diagnostic(code, source, position, code.message(arguments), remedy));
    }

    /** Adds a finished diagnostic. */
    public void add(Diagnostic diagnostic) {
        if (found.size() >= KEPT) {
            dropped++;
        } else {
            found.add(diagnostic);
        }
    }

    /** Whether nothing is wrong. */
    public boolean isEmpty() {
        return found.isEmpty();
    }

    /** Whether so much is wrong that nothing further would be shown; searching on is then a waste. */
    public boolean isFull() {
        return found.size() >= KEPT;
    }

    /** How many mistakes there are. */
    public int size() {
        return found.size() + dropped;
    }

    /** What is wrong, by position, at most {@link #SHOWN} of it and a last entry that says so. */
    public List<Diagnostic> list() {
        List<Diagnostic> shown = new ArrayList<>(found);
        if (shown.size() > SHOWN) {
            Diagnostic next = shown.get(SHOWN);
            shown.subList(SHOWN, shown.size()).clear();
            shown.add(Diagnostic.of(DiagnosticCode.TOO_MANY_MISTAKES, source, next.position(), size() - SHOWN, SHOWN));
        }
        return List.copyOf(shown);
    }

    /**
     * Stops if anything is wrong.
     *
     * @throws DefinitionException with all of it
     */
    public void throwIfAny() {
        if (!isEmpty()) {
            throw new DefinitionException(list());
        }
    }
}
