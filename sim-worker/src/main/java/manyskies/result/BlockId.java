package manyskies.result;

import java.io.Serializable;

/**
 * Which realisations a block holds: those of one set with indices first .. first + count - 1.
 *
 * @param set name of the set, for example {@code data} or {@code pairs}
 * @param number running number of the block within its set, from 0
 * @param first index of the first realisation
 * @param count number of realisations
 */
public record BlockId(String set, int number, int first, int count) implements Serializable {

    /** The stem of the block's file names: {@code data-000003}. */
    public String stem() {
        return String.format(java.util.Locale.ROOT, "%s-%06d", set, number);
    }
}
