package manyskies.farm;

import java.io.Serializable;
import java.io.UncheckedIOException;
import manyskies.result.BlockId;
import org.apache.spark.TaskContext;
import scala.collection.Iterator;
import scala.runtime.AbstractFunction2;

/** The function Spark runs: one partition, one block. */
final class BlockTask extends AbstractFunction2<TaskContext, Iterator<BlockId>, TaskOutcome>
        implements Serializable {
    private static final long serialVersionUID = 1L;

    private final BlockWork work;

    BlockTask(BlockWork work) {
        this.work = work;
    }

    /** The block's outcome. Only a failing host (I/O) leaves by exception: Spark tries again. */
    @Override
    public TaskOutcome apply(TaskContext context, Iterator<BlockId> partition) {
        return outcome(work, partition.next());
    }

    static TaskOutcome outcome(BlockWork work, BlockId id) {
        try {
            return new TaskOutcome.Finished(work.run(id));
        } catch (UncheckedIOException e) {
            throw e;
        } catch (RuntimeException | OutOfMemoryError | StackOverflowError | LinkageError e) {
            return new TaskOutcome.Failed(BlockFailure.of(id, e));
        }
    }
}
