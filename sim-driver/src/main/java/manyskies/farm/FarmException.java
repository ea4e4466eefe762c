package manyskies.farm;

/** The environment failed (a lost cluster, a host without disk); the message says what to do. */
public final class FarmException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** With its sentence. */
    public FarmException(String message, Throwable cause) {
        super(message, cause);
    }

    /** With its sentence. */
    public FarmException(String message) {
        super(message);
    }
}
