package manyskies.aggregate;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import manyskies.result.Block;

/** Where committed blocks come from; they are read one at a time. */
@FunctionalInterface
public interface BlockSource {
    /** The committed blocks of a set, in rising order of their numbers; none if there are none. */
    Iterable<Block> blocks(String set);

    /** Blocks that are in memory already, in any order. */
    static BlockSource of(Collection<Block> blocks) {
        List<Block> sorted = new ArrayList<>(blocks);
        sorted.sort(Comparator.comparingInt(block -> block.id().number()));
        return set -> sorted.stream().filter(block -> block.id().set().equals(set)).toList();
    }
}
