package manyskies.result;

import java.io.Serializable;

/**
 * A finished block as the bytes of its two files, encoded by the task and committed by the driver.
 * The hashes are the task's, so that damage on the way is seen.
 *
 * <p>The arrays belong to the block and are read only to others.
 */
public final class EncodedBlock implements Serializable {
    private static final long serialVersionUID = 1L;

    private final BlockId id;
    private final byte[] bandpowers;
    private final byte[] fields;
    private final String bandpowersHash;
    private final String fieldsHash;

    /** The bytes of the files under blocks/ and fields/ of a run folder. */
    public EncodedBlock(BlockId id, byte[] bandpowers, byte[] fields) {
        this.id = id;
        this.bandpowers = bandpowers;
        this.fields = fields;
        this.bandpowersHash = Sha256.of(bandpowers);
        this.fieldsHash = Sha256.of(fields);
    }

    /** Which block. */
    public BlockId id() {
        return id;
    }

    /** The file under blocks/. */
    public byte[] bandpowers() {
        return bandpowers;
    }

    /** The file under fields/. */
    public byte[] fields() {
        return fields;
    }

    /** SHA-256 of the file under blocks/, taken where the block was made: 64 hexadecimal digits. */
    public String bandpowersHash() {
        return bandpowersHash;
    }

    /** SHA-256 of the file under fields/, taken where the block was made. */
    public String fieldsHash() {
        return fieldsHash;
    }
}
