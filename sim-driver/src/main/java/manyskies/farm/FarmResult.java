package manyskies.farm;

import java.util.List;

/**
 * How a run of the farm ended.
 *
 * @param committed blocks committed by it
 * @param failures blocks that could not be computed, in the order they were met
 * @param stopped whether it was asked to end before all blocks were done
 */
public record FarmResult(int committed, List<BlockFailure> failures, boolean stopped) {

    /** The result of a farm without blocks. */
    public static final FarmResult NOTHING_TO_DO = new FarmResult(0, List.of(), false);

    /** Copies the list. */
    public FarmResult {
        failures = List.copyOf(failures);
    }
}
