package manyskies.result;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

/**
 * The committed blocks of a run folder.
 *
 * <p>A block is three files: {@code blocks/STEM.sha256} (the seal), {@code fields/STEM.parquet} and
 * {@code blocks/STEM.parquet}, renamed to their places in this order. It exists when the last one
 * stands; before, nothing of it counts.
 */
final class BlockStore {
    private static final String PARQUET = ".parquet";
    private static final String SEAL = ".sha256";
    private static final String DAMAGED = ".damaged";

    private final FileSystemOperations files;
    private final Path blocks;
    private final Path fields;

    BlockStore(FileSystemOperations files, Path run) {
        this.files = files;
        blocks = run.resolve("blocks");
        fields = run.resolve("fields");
    }

    void makeFolders() throws IOException {
        files.makeFolder(blocks);
        files.makeFolder(fields);
    }

    /**
     * Makes a block permanent. All bytes are on the disk before the first name changes, so a full
     * disk changes nothing. A block of the same name but other contents, such as one that has grown,
     * is withdrawn first: it never stands half old and half new.
     */
    void commit(EncodedBlock block) {
        requireIntact(block);
        String stem = block.id().stem();
        String seal = BlockSeal.of(block).text();
        try {
            Path[] targets = {seal(stem), fields(stem), bandpowers(stem)};
            byte[][] bytes = {
                seal.getBytes(StandardCharsets.UTF_8), block.fields(), block.bandpowers()
            };
            Path[] beside = stage(targets, bytes);
            withdrawUnless(seal, stem);
            for (int file = 0; file < targets.length; file++) {
                files.rename(beside[file], targets[file]);
                files.sync(targets[file].getParent());
            }
        } catch (IOException e) {
            throw RunFolderException.writing(bandpowers(stem), e);
        }
    }

    private static void requireIntact(EncodedBlock block) {
        String set = block.id().set();
        if (!set.matches("[a-z0-9_-]+")) {
            throw new IllegalArgumentException(
                    "set '" + set + "': a set's name has lower case letters, digits, _ and - only");
        }
        if (!Sha256.of(block.bandpowers()).equals(block.bandpowersHash())
                || !Sha256.of(block.fields()).equals(block.fieldsHash())) {
            throw new RunFolderException(
                    block.id().stem()
                            + ": its bytes changed between the task and the commit; nothing was"
                            + " written. Check memory and network; the same command goes on.");
        }
    }

    private Path[] stage(Path[] targets, byte[][] bytes) throws IOException {
        Path[] beside = new Path[targets.length];
        for (int file = 0; file < targets.length; file++) {
            byte[] content = bytes[file];
            try {
                beside[file] = AtomicFile.stage(files, targets[file], out -> out.write(content));
            } catch (IOException e) {
                for (int staged = 0; staged < file; staged++) {
                    AtomicFile.clear(files, beside[staged], e);
                }
                throw e;
            }
        }
        return beside;
    }

    private void withdrawUnless(String seal, String stem) throws IOException {
        Path standing = seal(stem);
        boolean same = Files.exists(standing) && Files.readString(standing).equals(seal);
        if (!same && Files.exists(bandpowers(stem))) {
            files.delete(bandpowers(stem));
            files.sync(blocks);
        }
    }

    /** Stems of the blocks that exist, damaged or not, in the order of their names. */
    List<String> stems() {
        return stems(blocks, PARQUET);
    }

    /** Whether a block exists, damaged or not. */
    boolean exists(String stem) {
        return Files.exists(bandpowers(stem));
    }

    /**
     * A block's seal, after a look at presence and sizes.
     *
     * @throws DamagedBlockException if a file is missing or has another size
     */
    BlockSeal sealOf(String stem) {
        BlockSeal seal =
                BlockSeal.parse(new String(read(stem, seal(stem)), StandardCharsets.UTF_8))
                        .filter(found -> found.id().stem().equals(stem))
                        .orElseThrow(
                                () ->
                                        new DamagedBlockException(
                                                stem, seal(stem), "is no block's checksum file"));
        requireSize(stem, bandpowers(stem), seal.bandpowersSize());
        requireSize(stem, fields(stem), seal.fieldsSize());
        return seal;
    }

    private static void requireSize(String stem, Path file, long expected) {
        try {
            long size = Files.size(file);
            if (size != expected) {
                throw new DamagedBlockException(
                        stem, file, "has " + size + " bytes, expected " + expected);
            }
        } catch (NoSuchFileException e) {
            throw new DamagedBlockException(stem, file, "is missing");
        } catch (IOException e) {
            throw RunFolderException.reading(file, e);
        }
    }

    /**
     * A block's bytes, which are those that were committed.
     *
     * @throws DamagedBlockException if not
     */
    EncodedBlock load(String stem) {
        BlockSeal seal = sealOf(stem);
        EncodedBlock block =
                new EncodedBlock(seal.id(), read(stem, bandpowers(stem)), read(stem, fields(stem)));
        requireHash(stem, bandpowers(stem), block.bandpowersHash(), seal.bandpowersHash());
        requireHash(stem, fields(stem), block.fieldsHash(), seal.fieldsHash());
        return block;
    }

    private static void requireHash(String stem, Path file, String found, String expected) {
        if (!found.equals(expected)) {
            throw new DamagedBlockException(
                    stem,
                    file,
                    "its contents have changed, SHA-256 is " + found + ", expected " + expected);
        }
    }

    private static byte[] read(String stem, Path file) {
        try {
            return Files.readAllBytes(file);
        } catch (NoSuchFileException e) {
            throw new DamagedBlockException(stem, file, "is missing");
        } catch (IOException e) {
            throw RunFolderException.reading(file, e);
        }
    }

    /** Renames what there is of a block to names that do not count; the block's own name first. */
    void discard(String stem) {
        for (Path file : List.of(bandpowers(stem), fields(stem), seal(stem))) {
            try {
                if (Files.exists(file)) {
                    files.rename(file, file.resolveSibling(file.getFileName() + DAMAGED));
                    files.sync(file.getParent());
                }
            } catch (IOException e) {
                throw RunFolderException.writing(file, e);
            }
        }
    }

    /** Deletes what a commit that was cut off left behind. */
    void deleteHalves() throws IOException {
        for (String stem : stems(blocks, SEAL)) {
            if (!exists(stem)) {
                files.delete(seal(stem));
            }
        }
        for (String stem : stems(fields, PARQUET)) {
            if (!exists(stem)) {
                files.delete(fields(stem));
            }
        }
    }

    private static List<String> stems(Path folder, String ending) {
        List<String> stems = new ArrayList<>();
        for (String name : names(folder)) {
            if (name.endsWith(ending)) {
                stems.add(name.substring(0, name.length() - ending.length()));
            }
        }
        return stems;
    }

    /** Names in a folder, sorted; none if there is no folder. */
    static List<String> names(Path folder) {
        try (Stream<Path> found = Files.list(folder)) {
            return found.map(file -> file.getFileName().toString()).sorted().toList();
        } catch (NoSuchFileException | NotDirectoryException e) {
            return List.of();
        } catch (IOException e) {
            throw RunFolderException.reading(folder, e);
        }
    }

    private Path bandpowers(String stem) {
        return blocks.resolve(stem + PARQUET);
    }

    private Path fields(String stem) {
        return fields.resolve(stem + PARQUET);
    }

    private Path seal(String stem) {
        return blocks.resolve(stem + SEAL);
    }
}
