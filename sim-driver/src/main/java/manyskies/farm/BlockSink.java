package manyskies.farm;

import manyskies.result.EncodedBlock;

/** Where finished blocks go, called by one thread only. */
@FunctionalInterface
public interface BlockSink {

    /** Makes the block permanent; an exception ends the run, and what was committed before stands. */
    void commit(EncodedBlock block);
}
