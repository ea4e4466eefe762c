package manyskies.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Invariant: a run that was killed or interrupted, and resumed, has the bytes of one that was not. */
class InterruptedRunTest {
    private static final String[] RUN = {"run", "small.yaml", "--cores", "2", "--out", "run"};

    @TempDir private Path folder;
    private Path run;

    @BeforeEach
    void makeSpecification() throws IOException {
        new CommandLineHarness(folder).specification("small.yaml", 64, 32); // 24 blocks of 0.1 s
        run = folder.resolve("run");
    }

    /** Blocks that stand when the program is killed, and milliseconds after that. */
    private void killAt(int blocks, long milliseconds) throws IOException, InterruptedException {
        ChildProgram child = ChildProgram.start(folder, RUN);
        child.awaitBlocks(run, blocks);
        Thread.sleep(milliseconds);
        child.kill();
    }

    private void finishAndCompare() throws IOException, InterruptedException {
        ChildProgram last = ChildProgram.start(folder, RUN);
        assertThat(last.exitCode()).as(last.error()).isZero();
        Map<String, String> resumed = CommandLineHarness.digests(run);
        CommandLineHarness.Ran whole =
                new CommandLineHarness(folder).run("run", "small.yaml", "--out", "whole");
        assertThat(whole.code()).as(whole.err()).isZero();
        assertThat(resumed).isEqualTo(CommandLineHarness.digests(folder.resolve("whole")));
        assertThat(ChildProgram.blocks(run)).isEqualTo(24);
    }

    @Test
    void killedOnceAndResumed() throws IOException, InterruptedException {
        killAt(5, 13);
        assertThat(ChildProgram.blocks(run)).isBetween(5L, 23L);
        finishAndCompare();
    }

    @Test
    @Tag("slow")
    void killedFiveTimesAndResumed() throws IOException, InterruptedException {
        killAt(0, 700); // while it starts
        killAt(1, 0);
        killAt(7, 31);
        killAt(13, 57);
        killAt(24, 3); // while it aggregates, or after
        finishAndCompare();
    }

    @Test
    void controlCEndsItCleanlyAndSaysHowToGoOn() throws IOException, InterruptedException {
        ChildProgram child = ChildProgram.start(folder, RUN);
        child.awaitBlocks(run, 4);
        child.interrupt();
        assertThat(child.exitCode()).isEqualTo(ExitCode.INTERRUPTED.code());
        long done = ChildProgram.blocks(run);
        assertThat(done).isBetween(4L, 23L);
        assertThat(child.error().strip())
                .isEqualTo("stopped; " + done + " of 24 blocks done; the same command resumes");
        finishAndCompare();
    }
}
