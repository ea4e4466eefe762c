package manyskies.result;

import java.nio.file.Path;

/** Another process that opens a run folder and stays in it. */
final class LockHolder {
    private LockHolder() {}

    public static void main(String[] arguments) throws InterruptedException {
        try (RunFolder folder = RunFolder.open(Path.of(arguments[0]))) {
            System.out.print("!" + folder.path());
            System.out.flush();
            Thread.sleep(60_000);
        }
    }
}
