package manyskies.aggregate;

/** What a check comes to. */
public enum Verdict {
    /** The probability to exceed is at or above the threshold. */
    CONSISTENT("consistent"),
    /** The probability to exceed is below the threshold. */
    INCONSISTENT("inconsistent"),
    /** Too few realisations for a covariance of so many bands; the check says how many it needs. */
    TOO_FEW("not enough realisations"),
    /** The blocks lack a column, or the covariance is singular; the check says which. */
    NOT_MEASURED("not measured");

    private final String words;

    Verdict(String words) {
        this.words = words;
    }

    /** The verdict as the tables write it. */
    public String words() {
        return words;
    }
}
