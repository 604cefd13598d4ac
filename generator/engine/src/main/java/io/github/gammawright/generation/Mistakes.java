package io.github.gammawright.generation;

import io.github.gammawright.diagnostic.DefinitionException;
import io.github.gammawright.diagnostic.Diagnostic;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;

/** Collects what is wrong with several definitions, so that one run tells everything. Not thread-safe. */
public final class Mistakes {

    private final Set<Diagnostic> found = new LinkedHashSet<>();

    /** The result of the work; nothing if a definition turns out wrong; why is kept, once. */
    public <T> Optional<T> attempt(Supplier<T> work) {
        try {
            return Optional.of(work.get());
        } catch (DefinitionException e) {
            found.addAll(e.diagnostics());
            return Optional.empty();
        }
    }

    /**
     * Stops if anything was wrong.
     *
     * @throws DefinitionException with all of it, in the order in which it was found
     */
    public void throwIfAny() {
        if (!found.isEmpty()) {
            throw new DefinitionException(List.copyOf(found));
        }
    }
}
