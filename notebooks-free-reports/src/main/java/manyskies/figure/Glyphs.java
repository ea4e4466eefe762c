package manyskies.figure;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;

/** Letters of our own, so that pictures are the same on hosts with other fonts or none. */
final class Glyphs {
    static final int COLUMNS = 5;
    static final int ROWS = 9;

    /** From one letter to the next, and what a line needs above its letters' feet. */
    static final int ADVANCE = 6;

    private static final Map<Character, int[]> ROWS_OF = read();
    private static final int[] UNKNOWN = {31, 17, 17, 17, 17, 17, 31, 0, 0};

    private Glyphs() {}

    /** Whether a letter covers a cell; one that is not known is a box. */
    static boolean covers(char letter, int column, int row) {
        int bits = letter == ' ' ? 0 : ROWS_OF.getOrDefault(letter, UNKNOWN)[row];
        return (bits >> (COLUMNS - 1 - column) & 1) == 1;
    }

    /** Whether a letter is known. */
    static boolean knows(char letter) {
        return letter == ' ' || ROWS_OF.containsKey(letter);
    }

    private static Map<Character, int[]> read() {
        Map<Character, int[]> all = new HashMap<>();
        try (InputStream file = Glyphs.class.getResourceAsStream("glyphs.txt");
                BufferedReader lines =
                        new BufferedReader(new InputStreamReader(file, StandardCharsets.UTF_8))) {
            lines.lines()
                    .filter(line -> !line.startsWith("#"))
                    .forEach(line -> all.put(line.charAt(0), rows(line)));
        } catch (IOException e) {
            throw new UncheckedIOException("glyphs.txt of the program cannot be read", e);
        }
        return all;
    }

    private static int[] rows(String line) {
        int[] rows = new int[ROWS];
        String[] words = line.split(" ", -1);
        for (int row = 0; row < words.length - 1; row++) {
            rows[row] = Integer.parseInt(words[row + 1], 2);
        }
        return rows;
    }
}
