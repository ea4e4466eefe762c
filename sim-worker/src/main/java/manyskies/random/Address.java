package manyskies.random;

import java.io.Serializable;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;

/**
 * The name of one realisation's randomness.
 *
 * <p>Two addresses that differ anywhere have independent numbers; equal ones have equal numbers.
 * Skies are shared on purpose by sharing addresses: the same lenses under another CMB are drawn
 * with one address for phi and another for T and E.
 *
 * @param seed the run's seed
 * @param set name of the set of realisations
 * @param index index of the realisation within its set, 0 or more
 */
public record Address(long seed, String set, int index) implements Serializable {

    /** Checks the index. */
    public Address {
        if (index < 0) {
            throw new IllegalArgumentException(
                    "realisations are counted from 0, found index " + index + " in set " + set);
        }
    }

    /** The Gaussian numbers of one field of this realisation. */
    public GaussianRows field(String name) {
        ByteBuffer key = ByteBuffer.wrap(digest(name));
        return new GaussianRows(key.getLong(), key.getLong(), key.getLong(), key.getLong());
    }

    /**
     * SHA-256 of: seed (8 bytes), index (4), length of the set's name in bytes (4), that name in
     * UTF-8, the field's name in UTF-8; integers with the high byte first. The length keeps ("a",
     * "bc") and ("ab", "c") apart.
     */
    private byte[] digest(String field) {
        byte[] setName = set.getBytes(StandardCharsets.UTF_8);
        byte[] fieldName = field.getBytes(StandardCharsets.UTF_8);
        ByteBuffer text = ByteBuffer.allocate(16 + setName.length + fieldName.length);
        text.putLong(seed).putInt(index).putInt(setName.length).put(setName).put(fieldName);
        try {
            return MessageDigest.getInstance("SHA-256").digest(text.array());
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
