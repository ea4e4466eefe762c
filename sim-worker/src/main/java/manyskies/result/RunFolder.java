package manyskies.result;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The folder of a run: {@code specification.yaml}, {@code blocks/}, {@code fields/}, {@code
 * tables/}, {@code journal.log}.
 *
 * <p>A block stands whole or does not exist, whatever stops the program. One driver writes at a
 * time; readers need no lock and may look while it works. Only one thread commits.
 *
 * <p>All methods throw {@link RunFolderException} if the disk does not serve.
 */
public final class RunFolder implements AutoCloseable {
    private static final String SPECIFICATION = "specification.yaml";
    private static final String JOURNAL = "journal.log";

    private final FileSystemOperations files;
    private final Path path;
    private final BlockStore store;
    private final Optional<FolderLock> lock;

    private RunFolder(FileSystemOperations files, Path path, Optional<FolderLock> lock) {
        this.files = files;
        this.path = path;
        this.lock = lock;
        store = new BlockStore(files, path);
    }

    /**
     * Opens a folder to write, and makes it if need be; clears what an interrupted program left.
     *
     * @throws RunFolderException if another driver works in it or it cannot be written
     */
    public static RunFolder open(Path path) {
        return open(new LocalFiles(), path);
    }

    static RunFolder open(FileSystemOperations files, Path path) {
        try {
            files.makeFolder(path);
        } catch (IOException e) {
            throw RunFolderException.writing(path, e);
        }
        RunFolder folder = new RunFolder(files, path, Optional.of(FolderLock.take(path)));
        try {
            folder.tidy();
        } catch (IOException e) {
            folder.close();
            throw RunFolderException.writing(path, e);
        } catch (RuntimeException e) {
            folder.close();
            throw e;
        }
        return folder;
    }

    /**
     * Opens a folder to write. One that holds no specification gets the given files, the
     * specification last; one that holds its own keeps it: compare {@link #specification} and
     * {@link #replace} it as the run may allow.
     *
     * @param extraFiles name to text of files that stand beside the specification
     */
    public static RunFolder createOrOpen(
            Path path, String canonicalSpecification, Map<String, String> extraFiles) {
        RunFolder folder = open(path);
        try {
            if (folder.specification().isEmpty()) {
                extraFiles.forEach(folder::replace);
                folder.replace(SPECIFICATION, canonicalSpecification);
            }
            return folder;
        } catch (RuntimeException e) {
            folder.close();
            throw e;
        }
    }

    /** Opens a folder to read, also while a driver works in it; changes nothing. */
    public static RunFolder reading(Path path) {
        return new RunFolder(new LocalFiles(), path, Optional.empty());
    }

    private void tidy() throws IOException {
        store.makeFolders();
        for (String folder : List.of("", "blocks", "fields", "tables")) {
            Path within = path.resolve(folder);
            for (String name : BlockStore.names(within)) {
                if (name.endsWith(AtomicFile.UNFINISHED)) {
                    files.delete(within.resolve(name));
                }
            }
        }
        store.deleteHalves();
        Journal.cutTornTail(files, path.resolve(JOURNAL));
        files.sync(path);
    }

    /** Where the folder is. */
    public Path path() {
        return path;
    }

    /** The text of {@code specification.yaml}, if there is one. */
    public Optional<String> specification() {
        Path file = path.resolve(SPECIFICATION);
        try {
            return Files.exists(file)
                    ? Optional.of(Files.readString(file, StandardCharsets.UTF_8))
                    : Optional.empty();
        } catch (IOException e) {
            throw RunFolderException.reading(file, e);
        }
    }

    /** Writes a file of the folder or replaces it whole; one with these bytes is left as it is. */
    public void replace(String name, byte[] bytes) {
        requireLock();
        Path file = path.resolve(name);
        try {
            if (Files.exists(file) && Arrays.equals(Files.readAllBytes(file), bytes)) {
                return;
            }
        } catch (IOException e) {
            throw RunFolderException.reading(file, e);
        }
        AtomicFile.write(files, file, out -> out.write(bytes));
    }

    private void replace(String name, String text) {
        replace(name, text.getBytes(StandardCharsets.UTF_8));
    }

    /**
     * Makes a block permanent. If this fails, the blocks before are untouched and this one is whole
     * or does not exist; committing a block again is harmless.
     */
    public void commit(EncodedBlock block) {
        requireLock();
        store.commit(block);
    }

    /**
     * The committed blocks whose three files are there with their right sizes, by set and number;
     * contents are not looked at.
     */
    public List<BlockId> committed() {
        List<BlockId> ids = new ArrayList<>();
        for (String stem : store.stems()) {
            idOf(stem).ifPresent(ids::add);
        }
        ids.sort(Comparator.comparing(BlockId::set).thenComparing(BlockId::number));
        return List.copyOf(ids);
    }

    private Optional<BlockId> idOf(String stem) {
        try {
            return Optional.of(store.sealOf(stem).id());
        } catch (DamagedBlockException e) { // damaged() names it
            return Optional.empty();
        }
    }

    /** SHA-256 over the checksums of all committed blocks in order: another with any other block. */
    public String fingerprint() {
        StringBuilder seals = new StringBuilder();
        committed().forEach(id -> seals.append(store.sealOf(id.stem()).text()));
        return Sha256.of(seals.toString().getBytes(StandardCharsets.UTF_8));
    }

    /** Reads all of every block and reports those that are not what was committed. */
    public List<DamagedBlockException> damaged() {
        List<DamagedBlockException> damaged = new ArrayList<>();
        for (String stem : store.stems()) {
            try {
                store.load(stem);
            } catch (DamagedBlockException e) {
                damaged.add(e);
            }
        }
        return damaged;
    }

    /** Discards all damaged blocks and reports them; what is left in {@link #committed} is whole. */
    public List<DamagedBlockException> setDamagedAside() {
        requireLock();
        List<DamagedBlockException> damaged = damaged();
        damaged.forEach(damage -> store.discard(damage.stem()));
        return damaged;
    }

    /**
     * Compares a block with its checksums.
     *
     * @throws DamagedBlockException naming the file that is missing or changed
     */
    public void verify(BlockId id) {
        store.load(id.stem());
    }

    /**
     * Sets a block aside: its files get the ending {@code .damaged} and do not count any more.
     * Harmless if there is no such block.
     */
    public void discard(BlockId id) {
        requireLock();
        store.discard(id.stem());
    }

    /**
     * Reads a block.
     *
     * @throws DamagedBlockException if it is not what was committed
     */
    public Block read(BlockId id) {
        return read(id.stem());
    }

    private Block read(String stem) {
        return BlockCodec.decode(store.load(stem));
    }

    /**
     * The blocks of a set in rising order of their numbers, read one at a time. Iterating throws
     * {@link DamagedBlockException} at a damaged one, so that none is left out in silence.
     */
    public Iterable<Block> blocks(String set) {
        List<String> stems =
                store.stems().stream()
                        .filter(stem -> stem.matches("\\Q" + set + "\\E-\\d+"))
                        .toList();
        return () -> {
            Iterator<String> next = stems.iterator();
            return new Iterator<>() {
                @Override
                public boolean hasNext() {
                    return next.hasNext();
                }

                @Override
                public Block next() {
                    return read(next.next());
                }
            };
        };
    }

    /** The run's journal. */
    public Journal journal(Clock clock) {
        requireLock();
        return new Journal(files, path.resolve(JOURNAL), clock);
    }

    private void requireLock() {
        if (lock.isEmpty()) {
            throw new IllegalStateException(path + " was opened to be read");
        }
    }

    /** Lets another driver in. */
    @Override
    public void close() {
        lock.ifPresent(FolderLock::close);
    }
}
