package io.github.gammawright.commandline;

import io.github.gammawright.generation.ExitActions;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;

/**
 * Ends an interrupted run (Ctrl-C, a request to terminate) with the status of what could not be done, after what is
 * half done has been tidied up.
 */
final class Interruption implements ExitActions {

    private final List<Runnable> actions = new CopyOnWriteArrayList<>();
    private final Terminal terminal;
    private final Registration registration;

    private Interruption(Terminal terminal) {
        this.terminal = terminal;
        this.registration = ExitActions.ofJvm().add(this::interrupted);
    }

    /** From now on an end of the JVM is an interruption. */
    static Interruption watch(Terminal terminal) {
        return new Interruption(terminal);
    }

    /** The run has ended by itself. */
    void finished() {
        registration.withdraw();
    }

    @Override
    public Registration add(Runnable action) {
        actions.add(action);
        return () -> actions.remove(action);
    }

    // Other hooks may still be running when the JVM is halted here, so that nothing may depend on one.
    private void interrupted() {
        actions.forEach(Runnable::run);
        terminal.err().println("gammawright: interrupted; no class is half-written");
        Runtime.getRuntime().halt(ExitStatus.COULD_NOT);
    }
}
