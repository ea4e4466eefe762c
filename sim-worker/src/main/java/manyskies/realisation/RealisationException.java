package manyskies.realisation;

/** A realisation failed; the message names it. */
public final class RealisationException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    RealisationException(String set, int index, Throwable cause) {
        super("realisation " + index + " of set " + set + " failed: " + cause.getMessage(), cause);
    }
}
