package manyskies.farm;

import java.io.Serializable;
import manyskies.result.BlockId;
import manyskies.result.EncodedBlock;

/**
 * What one task does: compute a block and encode it.
 *
 * <p>A pure function of the block's id, for it may be called more than once, on any host and in any
 * order; it travels to the hosts by Java serialisation, so it should hold a specification and no
 * maps. An implementation keeps what many blocks share (plans, filters, scratch) in a static cache
 * of the JVM it finds itself in, for each task receives a copy of its own.
 */
@FunctionalInterface
public interface BlockWork extends Serializable {

    /**
     * The finished block.
     *
     * @throws RuntimeException naming the realisation that failed; the farm reports it and goes on
     *     with other blocks
     * @throws java.io.UncheckedIOException if the host failed, not the work; the task is tried again
     */
    EncodedBlock run(BlockId id);
}
