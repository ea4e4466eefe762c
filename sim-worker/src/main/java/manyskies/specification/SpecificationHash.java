package manyskies.specification;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Map;
import java.util.function.Predicate;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.Spectrum;

/**
 * SHA-256 of what a specification says: its canonical entries and the numbers of its spectra, never
 * the spelling of a file or the path of the spectra.
 */
public final class SpecificationHash {
    /** Changes whenever the same entries come to mean other skies or other results. */
    private static final String MEANING = "manyskies specification 1\n";

    private SpecificationHash() {}

    /** 64 hexadecimal digits; equal for equal specifications only. */
    public static String of(Specification specification) {
        return hash(specification, key -> true);
    }

    /**
     * The same without name and set counts: two specifications of one identity differ in how many
     * realisations they ask for at most, so one's run can be extended to the other's.
     */
    public static String identity(Specification specification) {
        return hash(specification, key -> !key.equals("name") && !key.startsWith("sets."));
    }

    private static String hash(Specification specification, Predicate<String> counts) {
        MessageDigest digest = sha256();
        digest.update(MEANING.getBytes(StandardCharsets.UTF_8));
        for (Map.Entry<String, String> entry : Entries.of(specification).entrySet()) {
            if (counts.test(entry.getKey())) {
                String line = entry.getKey() + ": " + entry.getValue() + "\n";
                digest.update(line.getBytes(StandardCharsets.UTF_8));
            }
        }
        update(digest, specification.unlensed());
        return HexFormat.of().formatHex(digest.digest());
    }

    private static void update(MessageDigest digest, Spectra spectra) {
        for (Spectrum name : Spectrum.values()) {
            double[] values = spectra.values(name);
            ByteBuffer bytes = ByteBuffer.allocate(Double.BYTES * values.length);
            for (double value : values) {
                bytes.putDouble(value + 0.0); // -0.0 and 0.0 are the same spectrum
            }
            digest.update(name.name().getBytes(StandardCharsets.UTF_8));
            digest.update(bytes.array());
        }
    }

    private static MessageDigest sha256() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
