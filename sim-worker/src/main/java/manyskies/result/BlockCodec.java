package manyskies.result;

/**
 * Blocks to the bytes of their two Parquet files, and back.
 *
 * <p>The bandpower file has one row per realisation: {@code set} (text), {@code index} (int32) and
 * per column of the block a list of doubles. The field file has one row per mode: {@code mode}
 * (int32) and per field sum {@code name.re} and {@code name.im}. Equal blocks give equal bytes: no
 * times, no compression, columns in the order of their names.
 */
public final class BlockCodec {
    private BlockCodec() {}

    /**
     * A block's files.
     *
     * @throws IllegalArgumentException if its field sums differ in length
     */
    public static EncodedBlock encode(Block block) {
        return new EncodedBlock(block.id(), BandpowerFile.encode(block), FieldFile.encode(block));
    }

    /**
     * The block of two files.
     *
     * @throws IllegalArgumentException if the bytes are not those of the named block
     */
    public static Block decode(EncodedBlock encoded) {
        return Block.of(
                encoded.id(),
                BandpowerFile.decode(encoded.id(), encoded.bandpowers()),
                FieldFile.decode(encoded.fields()));
    }
}
