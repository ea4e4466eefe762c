package manyskies.farm;

/** One realisation failed; says which. */
public final class RealisationException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * Wraps what went wrong.
     *
     * @param set the realisation's set
     * @param index its index
     * @param cause what its code threw
     */
    public RealisationException(String set, int index, Throwable cause) {
        super("realisation " + index + " of set " + set + ": " + sentence(cause), cause);
    }

    private static String sentence(Throwable cause) {
        return cause.getMessage() == null ? cause.toString() : cause.getMessage();
    }
}
