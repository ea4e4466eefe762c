package manyskies.specification;

import java.util.List;

/** Reads how many realisations there are, and checks them against the block. */
final class SetsReader {
    static final List<String> KEYS = List.of("data", "pairs");

    private static final int MOST = 10_000_000;

    private final Section section;
    private final double block;

    private SetsReader(Section section, double block) {
        this.section = section;
        this.block = block;
    }

    /** The sets; their numbers mean nothing if a fault was added. */
    static Sets read(Section section, double block) {
        return new SetsReader(section, block).read();
    }

    private Sets read() {
        section.require("data", "data: 128");
        double data = section.whole("data", Double.NaN, 1, MOST);
        requireBlocks("data", data, 1);
        double pairs = section.whole("pairs", Math.floor(data / 2 / block) * block, 0, MOST);
        requireBlocks("pairs", pairs, 0);
        return new Sets((int) data, (int) pairs);
    }

    private void requireBlocks(String key, double count, int fewestBlocks) {
        double blocks = Math.floor(count / block);
        if (blocks * block == count || Double.isNaN(blocks)) {
            return;
        }
        String below =
                blocks >= fewestBlocks ? "are " + Decimal.text(blocks * block) + " and " : "is ";
        section.fault(
                key,
                Decimal.text(count),
                "it must be a multiple of block, "
                        + Decimal.text(block)
                        + ", since a block is committed whole; the nearest "
                        + below
                        + Decimal.text((blocks + 1) * block));
    }
}
