package io.github.gammawright.runtime.swarm;

/** Is told how far a swarm is; by one thread at a time, with counts that never fall. */
@FunctionalInterface
public interface ProgressListener {

    /**
     * Takes note.
     *
     * @param done how many rays are through, failed ones included
     * @param total how many there are
     */
    void progress(int done, int total);
}
