package manyskies.command;

/**
 * What the program's exit codes mean; scripts may rely on them.
 *
 * <p>A verdict that is negative (a transfer function that is not one, say) is a finding, not a
 * failure: it stands in {@code tables/summary.json} and changes no exit code.
 */
public enum ExitCode {
    /** Done as asked. */
    OK(0, "done as asked, whatever the verdicts say"),
    /** A fault of the program; other blocks of a run are kept. */
    OUR_FAULT(1, "a fault of the program; what was finished is kept"),
    /** The specification, a file or the command line is faulty; nothing was written. */
    BAD_INPUT(2, "faulty specification, file or command line; nothing was written"),
    /** Disk, memory or hosts failed; committed blocks stay and the same command resumes. */
    ENVIRONMENT(3, "disk, memory or hosts failed; the same command resumes"),
    /** Ended by Ctrl-C; committed blocks stay and the same command resumes. */
    INTERRUPTED(130, "ended by Ctrl-C; the same command resumes");

    private final int code;
    private final String meaning;

    ExitCode(int code, String meaning) {
        this.code = code;
        this.meaning = meaning;
    }

    /** The number the process returns. */
    public int code() {
        return code;
    }

    /** One line for the help. */
    public String meaning() {
        return meaning;
    }
}
