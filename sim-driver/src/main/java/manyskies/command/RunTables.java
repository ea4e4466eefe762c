package manyskies.command;

import manyskies.aggregate.Aggregation;
import manyskies.aggregate.BlockSource;
import manyskies.aggregate.HeadlineTable;
import manyskies.aggregate.RunFacts;
import manyskies.aggregate.Tables;
import manyskies.result.RunFolder;
import manyskies.specification.Specification;
import manyskies.specification.SpecificationHash;

/** Makes the tables of a run from its committed blocks. */
final class RunTables {
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
        return HeadlineTable.render(tables.summary());
    }
}
