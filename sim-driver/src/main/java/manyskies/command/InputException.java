package manyskies.command;

/** What the user gave cannot be used; the message is for them. */
final class InputException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    InputException(String message) {
        super(message);
    }
}
