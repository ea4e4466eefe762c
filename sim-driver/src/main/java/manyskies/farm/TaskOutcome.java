package manyskies.farm;

import java.io.Serializable;
import manyskies.result.EncodedBlock;

/** What comes back from a task. */
sealed interface TaskOutcome extends Serializable {

    /** The block, encoded. */
    record Finished(EncodedBlock block) implements TaskOutcome {}

    /** Why there is none. */
    record Failed(BlockFailure failure) implements TaskOutcome {}
}
