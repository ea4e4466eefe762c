package manyskies.command;

/** This machine cannot do what is asked; the message says what it could. */
final class EnvironmentException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    EnvironmentException(String message) {
        super(message);
    }
}
