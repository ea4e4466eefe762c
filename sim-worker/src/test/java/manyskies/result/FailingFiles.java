package manyskies.result;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * The file system, until it fails at a step: then either with an error, once and for all later
 * writes too, or by an outage, after which the program does nothing more.
 */
final class FailingFiles implements FileSystemOperations {
    /** What the power failing is to the program: nothing it could catch. */
    static final class Outage extends Error {
        private static final long serialVersionUID = 1L;
    }

    /** When, within the step that fails. */
    enum Moment {
        BEFORE,
        HALFWAY,
        AFTER
    }

    private final FileSystemOperations real = new LocalFiles();
    private final int failingStep;
    private final Moment moment;
    private final String reason; // empty: an outage
    private final List<String> steps = new ArrayList<>();
    private boolean out;

    private FailingFiles(int failingStep, Moment moment, String reason) {
        this.failingStep = failingStep;
        this.moment = moment;
        this.reason = reason;
    }

    static FailingFiles never() {
        return new FailingFiles(Integer.MAX_VALUE, Moment.BEFORE, "");
    }

    /** Fails at a step, from 0, with the operating system's reason. */
    static FailingFiles withError(int step, Moment moment, String reason) {
        return new FailingFiles(step, moment, reason);
    }

    static FailingFiles withOutage(int step, Moment moment) {
        return new FailingFiles(step, moment, "");
    }

    /** What was done, in order. */
    List<String> steps() {
        return steps;
    }

    private interface Step {
        void run() throws IOException;
    }

    private void step(String name, Path file, Step whole, Step half) throws IOException {
        if (out) {
            throw new Outage();
        }
        boolean fails = steps.size() == failingStep;
        steps.add(name + " " + file.getFileName().toString().replaceAll("\\.\\d+\\.", ".PID."));
        if (!fails || moment == Moment.AFTER) {
            whole.run();
        } else if (moment == Moment.HALFWAY) {
            half.run();
        }
        if (fails && reason.isEmpty()) {
            out = true;
            throw new Outage();
        }
        if (fails) {
            throw new IOException(reason);
        }
    }

    @Override
    public void makeFolder(Path folder) throws IOException {
        step("make", folder, () -> real.makeFolder(folder), () -> {});
    }

    @Override
    public void write(Path file, Content content) throws IOException {
        step(
                "write",
                file,
                () -> real.write(file, content),
                () -> {
                    real.write(file, content);
                    real.truncate(file, Files.size(file) / 2);
                });
    }

    @Override
    public void append(Path file, byte[] bytes) throws IOException {
        byte[] half = java.util.Arrays.copyOf(bytes, bytes.length / 2);
        step("append", file, () -> real.append(file, bytes), () -> real.append(file, half));
    }

    @Override
    public void truncate(Path file, long size) throws IOException {
        step("truncate", file, () -> real.truncate(file, size), () -> {});
    }

    @Override
    public void rename(Path from, Path to) throws IOException {
        step("rename", to, () -> real.rename(from, to), () -> {});
    }

    @Override
    public void sync(Path folder) throws IOException {
        step("sync", folder, () -> real.sync(folder), () -> {});
    }

    @Override
    public void delete(Path file) throws IOException {
        step("delete", file, () -> real.delete(file), () -> {});
    }
}
