package manyskies.command;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import manyskies.realisation.BlockRunner;
import manyskies.result.BlockId;
import manyskies.specification.Sets;
import manyskies.specification.Specification;

/**
 * The blocks of a run: each set in blocks of the specification's size, in index order.
 *
 * <p>Counts are multiples of the block size (the specification's reader sees to it), so more
 * realisations are more blocks and no block ever changes.
 */
final class Plan {
    static final String DATA = BlockRunner.DATA;
    static final String PAIRS = BlockRunner.PAIRS;

    private final List<BlockId> blocks;

    private Plan(List<BlockId> blocks) {
        this.blocks = List.copyOf(blocks);
    }

    static Plan of(Specification specification) {
        List<BlockId> blocks = new ArrayList<>();
        counts(specification.sets())
                .forEach((set, count) -> add(blocks, set, count, specification.block()));
        return new Plan(blocks);
    }

    private static Map<String, Integer> counts(Sets sets) {
        Map<String, Integer> counts = new LinkedHashMap<>();
        counts.put(DATA, sets.data());
        counts.put(PAIRS, sets.pairs());
        return counts;
    }

    private static void add(List<BlockId> blocks, String set, int count, int size) {
        for (int first = 0; first < count; first += size) {
            blocks.add(new BlockId(set, first / size, first, Math.min(size, count - first)));
        }
    }

    /** All blocks. */
    List<BlockId> blocks() {
        return blocks;
    }

    /** The blocks that are not among those given. */
    List<BlockId> missing(Collection<BlockId> present) {
        Set<BlockId> there = Set.copyOf(present);
        return blocks.stream().filter(id -> !there.contains(id)).toList();
    }

    /** The blocks of a set. */
    List<BlockId> ofSet(String set) {
        return blocks.stream().filter(id -> id.set().equals(set)).toList();
    }

    /** Names of the sets that have blocks, in order. */
    List<String> sets() {
        return blocks.stream().map(BlockId::set).distinct().toList();
    }

    /** 1 block, 2 blocks. */
    static String count(int blocks) {
        return blocks + (blocks == 1 ? " block" : " blocks");
    }

    static int realisations(Collection<BlockId> blocks) {
        return blocks.stream().mapToInt(BlockId::count).sum();
    }
}
