package io.github.gammawright.commandline;

import java.util.List;

/** The command line asks for what does not exist or does not go together; each message is one line. */
final class WrongInputException extends RuntimeException {

    private final transient List<String> messages;

    WrongInputException(List<String> messages) {
        super(String.join("; ", messages));
        this.messages = List.copyOf(messages);
    }

    WrongInputException(String message) {
        this(List.of(message));
    }

    List<String> messages() {
        return messages;
    }
}
