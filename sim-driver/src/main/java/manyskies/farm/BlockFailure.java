package manyskies.farm;

import java.io.PrintWriter;
import java.io.Serializable;
import java.io.StringWriter;
import manyskies.result.BlockId;

/**
 * A block that could not be computed, as text, since the exception's classes stay on its host.
 *
 * @param id the block
 * @param message one sentence
 * @param stackTrace for a report
 * @param outOfMemory whether the heap was too small, which is no fault of the block
 */
public record BlockFailure(BlockId id, String message, String stackTrace, boolean outOfMemory)
        implements Serializable {

    static BlockFailure of(BlockId id, Throwable thrown) {
        StringWriter trace = new StringWriter();
        thrown.printStackTrace(new PrintWriter(trace));
        String text = thrown.getMessage() == null ? thrown.toString() : thrown.getMessage();
        String message = "block " + id.stem() + ": " + text;
        return new BlockFailure(id, message, trace.toString(), causedByMemory(thrown));
    }

    private static boolean causedByMemory(Throwable thrown) {
        for (Throwable t = thrown; t != null; t = t.getCause()) {
            if (t instanceof OutOfMemoryError) {
                return true;
            }
        }
        return false;
    }
}
