package io.github.gammawright.generation;

/** What is to be done if the JVM is told to end in the middle of something. */
public interface ExitActions {

    /**
     * Has the action run if the JVM ends before it is removed.
     *
     * @throws IllegalStateException if the JVM is ending already
     */
    void add(Thread action);

    /** Forgets an action that was added; does nothing if the JVM is ending already. */
    void remove(Thread action);

    /** Shutdown hooks of the JVM. */
    static ExitActions ofJvm() {
        return new ExitActions() {
            @Override
            public void add(Thread action) {
                Runtime.getRuntime().addShutdownHook(action);
            }

            @Override
            public void remove(Thread action) {
                try {
                    Runtime.getRuntime().removeShutdownHook(action);
                } catch (IllegalStateException e) {
                    // The JVM is ending, and runs it.
                    return;
                }
            }
        };
    }
}
