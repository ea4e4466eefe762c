package manyskies.specification;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/**
 * The known name that an unknown one was probably meant to be.
 *
 * <p>Distance is the number of letters to insert, remove or replace (Levenshtein 1966); a name is
 * near if fewer than half of the letters change, or one of a short name's.
 */
final class NearName {
    private NearName() {}

    /** The nearest of the known names, the first of equally near ones, or none. */
    static Optional<String> of(String unknown, Collection<String> known) {
        int allowed = Math.max(1, unknown.length() / 2 - (unknown.length() > 5 ? 1 : 0));
        String nearest = null;
        int least = allowed + 1;
        for (String name : known) {
            int distance = distance(plain(unknown), plain(name));
            if (distance < least) {
                least = distance;
                nearest = name;
            }
        }
        return Optional.ofNullable(nearest);
    }

    /** How to go on after an unknown name: the nearest known one, else all of them. */
    static String mend(String unknown, Collection<String> known) {
        return of(unknown, known)
                .map(name -> "the nearest is '" + name + "'.")
                .orElseGet(() -> "allowed are " + String.join(", ", known) + ".");
    }

    private static String plain(String name) {
        return name.toLowerCase(Locale.ROOT).replace('_', '-');
    }

    private static int distance(String a, String b) {
        int[] above = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            above[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int[] row = new int[b.length() + 1];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int replaced = above[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(replaced, 1 + Math.min(above[j], row[j - 1]));
            }
            above = row;
        }
        return above[b.length()];
    }
}
