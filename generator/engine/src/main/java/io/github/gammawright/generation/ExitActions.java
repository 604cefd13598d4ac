package io.github.gammawright.generation;

/** What is to be done if the program is told to end in the middle of something. */
public interface ExitActions {

    /**
     * Has the action run if the program is told to end before the action is withdrawn.
     *
     * @throws IllegalStateException if the program is ending already
     */
    Registration add(Runnable action);

    /** An action that was added. */
    interface Registration {

        /** Forgets the action; does nothing if the program is ending already. */
        void withdraw();
    }

    /** The actions of a program that has no other way to end than that of its JVM: shutdown hooks. */
    static ExitActions ofJvm() {
        return action -> {
            Thread hook = new Thread(action, "gammawright-exit");
            Runtime.getRuntime().addShutdownHook(hook);
            return () -> {
                try {
                    Runtime.getRuntime().removeShutdownHook(hook);
                } catch (IllegalStateException e) {
                    // The JVM is ending, and runs it.
                    return;
                }
            };
        };
    }
}
