package manyskies.result;

import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * What a block's files must be: the text of {@code blocks/STEM.sha256}, which the usual tools check
 * too ({@code cd RUN/blocks; sha256sum --check *.sha256}). Its last line seals the text itself.
 */
record BlockSeal(
        BlockId id,
        long bandpowersSize,
        String bandpowersHash,
        long fieldsSize,
        String fieldsHash) {
    private static final Pattern TEXT =
            Pattern.compile(
                    "# block [^\\n]*\\n"
                            + "# set (\\S+), number (\\d{1,9}), first (\\d{1,9}), count (\\d{1,9})\\n"
                            + "# bytes (\\d{1,18}) and (\\d{1,18})\\n"
                            + "([0-9a-f]{64})  [^\\n]*\\n"
                            + "([0-9a-f]{64})  [^\\n]*\\n"
                            + "# sealed [0-9a-f]{64}\\n");

    static BlockSeal of(EncodedBlock block) {
        return new BlockSeal(
                block.id(),
                block.bandpowers().length,
                block.bandpowersHash(),
                block.fields().length,
                block.fieldsHash());
    }

    String text() {
        String stem = id.stem();
        String text =
                String.format(
                        Locale.ROOT,
                        """
                        # block %s
                        # set %s, number %d, first %d, count %d
                        # bytes %d and %d
                        %s  %s.parquet
                        %s  ../fields/%s.parquet
                        """,
                        stem,
                        id.set(),
                        id.number(),
                        id.first(),
                        id.count(),
                        bandpowersSize,
                        fieldsSize,
                        bandpowersHash,
                        stem,
                        fieldsHash,
                        stem);
        return text + "# sealed " + Sha256.of(text.getBytes(StandardCharsets.UTF_8)) + "\n";
    }

    /** The seal of a text; empty unless the text is exactly what {@link #text} writes. */
    static Optional<BlockSeal> parse(String text) {
        Matcher found = TEXT.matcher(text);
        if (!found.matches()) {
            return Optional.empty();
        }
        BlockId id =
                new BlockId(
                        found.group(1),
                        Integer.parseInt(found.group(2)),
                        Integer.parseInt(found.group(3)),
                        Integer.parseInt(found.group(4)));
        BlockSeal seal =
                new BlockSeal(
                        id,
                        Long.parseLong(found.group(5)),
                        found.group(7),
                        Long.parseLong(found.group(6)),
                        found.group(8));
        return seal.text().equals(text) ? Optional.of(seal) : Optional.empty();
    }
}
