package manyskies.result;

import java.io.Serializable;

/**
 * A finished block as the bytes of its two files, encoded by the task and committed by the driver.
 *
 * <p>The arrays belong to the block and are read only to others.
 */
public final class EncodedBlock implements Serializable {
    private static final long serialVersionUID = 1L;

    private final BlockId id;
    private final byte[] bandpowers;
    private final byte[] fields;

    /** The bytes of the files under blocks/ and fields/ of a run folder. */
    public EncodedBlock(BlockId id, byte[] bandpowers, byte[] fields) {
        this.id = id;
        this.bandpowers = bandpowers;
        this.fields = fields;
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
}
