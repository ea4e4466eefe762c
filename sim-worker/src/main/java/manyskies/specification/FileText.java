package manyskies.specification;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Locale;

/** Text files that a specification consists of, read whole and with a limit of their size. */
final class FileText {
    private static final int MEBIBYTE = 1 << 20;

    private FileText() {}

    /**
     * The text of a UTF-8 file, without a byte order mark.
     *
     * @throws Unreadable with a sentence that says why there is none; it has no subject, since the
     *     caller names the file
     */
    static String read(Path file, int mebibytes) throws Unreadable {
        byte[] bytes = bytes(file, mebibytes * MEBIBYTE);
        try {
            String text =
                    StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
            return text.startsWith("\ufeff") ? text.substring(1) : text;
        } catch (CharacterCodingException e) {
            throw new Unreadable("is not a text file in UTF-8; save it as UTF-8.", e);
        }
    }

    private static byte[] bytes(Path file, int limit) throws Unreadable {
        if (Files.isDirectory(file)) {
            throw new Unreadable("is a directory; name a file in it.", null);
        }
        try (InputStream in = Files.newInputStream(file)) {
            byte[] bytes = in.readNBytes(limit + 1);
            if (bytes.length > limit) {
                throw new Unreadable(tooLarge(limit), null);
            }
            return bytes;
        } catch (NoSuchFileException e) {
            throw new Unreadable("does not exist; check the path.", e);
        } catch (AccessDeniedException e) {
            throw new Unreadable("may not be read; give yourself the right to read it.", e);
        } catch (IOException e) {
            throw new Unreadable("cannot be read: " + e.getMessage() + ".", e);
        }
    }

    private static String tooLarge(int limit) {
        return String.format(
                Locale.ROOT,
                "is larger than %d MiB, the most such a file may have; is it the right file?",
                limit / MEBIBYTE);
    }

    /** Why a file gives no text. */
    static final class Unreadable extends Exception {
        private static final long serialVersionUID = 1L;

        Unreadable(String predicate, Exception cause) {
            super(predicate, cause);
        }
    }
}
