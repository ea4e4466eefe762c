package manyskies.command;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.lang.management.ManagementFactory;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

/** The program in a JVM of its own, which a test may kill. */
final class ChildProgram {
    private static final long PATIENCE_SECONDS = 300;

    private final Path folder;
    private final Process process;

    private ChildProgram(Path folder, Process process) {
        this.folder = folder;
        this.process = process;
    }

    /** Starts {@link StandInProgram}. */
    static ChildProgram start(Path folder, String... arguments) throws IOException {
        return start(StandInProgram.class, folder, arguments);
    }

    /** Starts a class with a main method; relative paths of its arguments lie in the folder. */
    static ChildProgram start(Class<?> program, Path folder, String... arguments)
            throws IOException {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.add("-Xmx512m");
        ManagementFactory.getRuntimeMXBean().getInputArguments().stream()
                .filter(argument -> argument.startsWith("--add-opens"))
                .forEach(command::add);
        String classPath = System.getProperty("surefire.test.class.path");
        command.addAll(
                List.of(
                        "-cp",
                        classPath == null ? System.getProperty("java.class.path") : classPath,
                        program.getName()));
        command.addAll(List.of(arguments));
        Process process =
                new ProcessBuilder(command)
                        .directory(folder.toFile())
                        .redirectOutput(folder.resolve("out.txt").toFile())
                        .redirectError(folder.resolve("err.txt").toFile())
                        .start();
        return new ChildProgram(folder, process);
    }

    /** Waits until so many blocks stand in a run, or the program has ended. */
    void awaitBlocks(Path run, int count) throws IOException, InterruptedException {
        long deadline = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
        while (blocks(run) < count && process.isAlive()) {
            if (System.nanoTime() > deadline) {
                throw new IllegalStateException("no " + count + " blocks: " + error());
            }
            Thread.sleep(2);
        }
    }

    static long blocks(Path run) throws IOException {
        Path blocks = run.resolve("blocks");
        if (!Files.isDirectory(blocks)) {
            return 0;
        }
        try (Stream<Path> files = Files.list(blocks)) {
            return files.filter(f -> f.getFileName().toString().endsWith(".parquet")).count();
        } catch (UncheckedIOException e) { // a file vanished under the listing
            return 0;
        }
    }

    /** kill -9. */
    void kill() throws InterruptedException {
        process.destroyForcibly();
        exitCode();
    }

    /**
     * Ctrl-C; where whoever started the tests has them ignore it (a shell's background job does), a
     * program started by them never hears it, and the polite request to terminate stands for it.
     */
    void interrupt() throws IOException, InterruptedException {
        String signal = interruptIsIgnored(process.pid()) ? "-TERM" : "-INT";
        new ProcessBuilder("kill", signal, Long.toString(process.pid())).start().waitFor();
    }

    /** Whether the second lowest bit, that of SIGINT, is set in the mask of ignored signals. */
    private static boolean interruptIsIgnored(long pid) throws IOException {
        Path status = Path.of("/proc", Long.toString(pid), "status");
        if (!Files.exists(status)) { // no such file but on Linux
            return false;
        }
        try (Stream<String> lines = Files.lines(status)) {
            return lines.filter(line -> line.startsWith("SigIgn:"))
                    .map(line -> line.substring("SigIgn:".length()).strip())
                    .anyMatch(mask -> (Long.parseUnsignedLong(mask, 16) & 2) != 0);
        }
    }

    int exitCode() throws InterruptedException {
        if (!process.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS)) {
            process.destroyForcibly();
            throw new IllegalStateException("the program does not end");
        }
        return process.exitValue();
    }

    String error() throws IOException {
        return Files.readString(folder.resolve("err.txt"), StandardCharsets.UTF_8);
    }
}
