package manyskies.result;

import java.nio.file.Path;

/** A committed block whose files are not what was committed; the message names the file. */
public final class DamagedBlockException extends RunFolderException {
    private static final long serialVersionUID = 1L;

    private final String stem;

    DamagedBlockException(String stem, Path file, String found) {
        super(file + ": " + found + "; it will be computed again by 'manyskies run'");
        this.stem = stem;
    }

    /** Stem of the block's file names, for example {@code data-000003}. */
    public String stem() {
        return stem;
    }
}
