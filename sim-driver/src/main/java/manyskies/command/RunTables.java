package manyskies.command;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import manyskies.aggregate.Aggregation;
import manyskies.aggregate.BlockSource;
import manyskies.aggregate.HeadlineTable;
import manyskies.aggregate.RunFacts;
import manyskies.aggregate.Tables;
import manyskies.result.AtomicFile;
import manyskies.result.RunFolder;
import manyskies.result.Sha256;
import manyskies.specification.Specification;
import manyskies.specification.SpecificationHash;

/** Makes the tables of a run from its committed blocks, or finds that they stand already. */
final class RunTables {
    private static final String HEADLINE = "tables/headline.txt";

    private static final List<String> VOUCHED_FOR =
            List.of(
                    "tables/bandpowers.csv",
                    "tables/covariance.csv",
                    "tables/covariance.parquet",
                    "tables/summary.json",
                    HEADLINE);

    /**
     * What the tables were made from, and their checksums; written last, so that it vouches for the
     * others: a table that is lost or was changed since is made again.
     */
    private static final String MADE_FROM = "tables/made-from.txt";

    private RunTables() {}

    /** Writes the tables and returns the headline table. */
    static String make(Realisations realisations, Specification specification, RunFolder folder) {
        RunFacts facts =
                new RunFacts(
                        specification.name(),
                        SpecificationHash.of(specification),
                        specification.sets());
        BlockSource blocks = folder::blocks;
        Tables tables = new Aggregation(facts, realisations.known(specification)).of(blocks);
        tables.write(folder.path().resolve("tables"));
        String headline = HeadlineTable.render(tables.summary());
        write(folder, HEADLINE, headline);
        write(folder, MADE_FROM, origin(specification, folder));
        return headline;
    }

    private static void write(RunFolder folder, String name, String text) {
        AtomicFile.write(folder.path().resolve(name), text.getBytes(StandardCharsets.UTF_8));
    }

    /** The headline table, if the tables were made from the blocks that are there now. */
    static Optional<String> standing(Specification specification, RunFolder folder) {
        return read(folder, MADE_FROM).equals(Optional.of(origin(specification, folder)))
                ? read(folder, HEADLINE)
                : Optional.empty();
    }

    private static Optional<String> read(RunFolder folder, String name) {
        Path file = folder.path().resolve(name);
        try {
            return Files.exists(file) ? Optional.of(Files.readString(file)) : Optional.empty();
        } catch (IOException e) { // then they are made again, and the writing says what is wrong
            return Optional.empty();
        }
    }

    private static String origin(Specification specification, RunFolder folder) {
        StringBuilder text =
                new StringBuilder(
                        String.format(
                                Locale.ROOT,
                                "program %s\nspecification %s\nblocks %s\n",
                                ManyskiesCommand.Version.number(),
                                SpecificationHash.of(specification),
                                folder.fingerprint()));
        for (String name : VOUCHED_FOR) {
            text.append(checksum(folder, name)).append("  ").append(name).append('\n');
        }
        return text.toString();
    }

    private static String checksum(RunFolder folder, String name) {
        try {
            return Sha256.of(Files.readAllBytes(folder.path().resolve(name)));
        } catch (IOException e) {
            return "missing";
        }
    }
}
