package manyskies.farm;

import manyskies.result.BlockId;
import manyskies.result.EncodedBlock;

/** A block made of its id alone, with faults on demand. */
final class StandInWork {
    private StandInWork() {}

    static EncodedBlock block(BlockId id) {
        byte[] bytes = new byte[64];
        for (int i = 0; i < bytes.length; i++) {
            bytes[i] = (byte) (31 * id.number() + i);
        }
        return new EncodedBlock(id, bytes, new byte[0]);
    }

    static BlockWork plain() {
        return StandInWork::block;
    }

    static BlockWork failingAt(int number, int index) {
        return id -> {
            if (id.number() == number) {
                throw new IllegalStateException("realisation " + index + " failed");
            }
            return block(id);
        };
    }

    static BlockWork lasting(long milliseconds) {
        return id -> {
            try {
                Thread.sleep(milliseconds);
            } catch (InterruptedException e) {
                throw new IllegalStateException(e);
            }
            return block(id);
        };
    }
}
