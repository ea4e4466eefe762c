package manyskies.result;

/** Another process that encodes a block. */
final class BlockHashes {
    private BlockHashes() {}

    public static void main(String[] arguments) {
        System.out.println(text());
    }

    static String text() {
        EncodedBlock block = TestBlocks.encoded(3);
        return block.bandpowersHash() + " " + block.fieldsHash();
    }
}
