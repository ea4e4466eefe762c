package manyskies.farm;

import manyskies.result.BlockId;

/** Hears how the farm is getting on, from one thread. */
public interface Progress {

    /** Says nothing. */
    Progress SILENT =
            new Progress() {
                @Override
                public void blockDone(BlockId id) {}

                @Override
                public void blockFailed(BlockFailure failure) {}
            };

    /** A block was committed. */
    void blockDone(BlockId id);

    /** A block could not be computed. */
    void blockFailed(BlockFailure failure);
}
