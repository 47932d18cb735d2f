package lyate.sheet;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.UUID;

/** Writes a file in full or not at all. */
public final class AtomicFile {

    private AtomicFile() {}

    /** Writes beside the file, forces the bytes to the disk, then takes the file's place; keeps its permissions. */
    public static void write(Path file, byte[] content) throws IOException {
        Path target = target(file);
        Path beside = target.resolveSibling("." + target.getFileName() + "." + UUID.randomUUID() + ".part");
        try {
            try (FileChannel channel = FileChannel.open(beside, StandardOpenOption.WRITE, StandardOpenOption.CREATE_NEW)) {
                keepPermissions(beside, target);
                ByteBuffer bytes = ByteBuffer.wrap(content);
                while (bytes.hasRemaining()) {
                    channel.write(bytes);
                }
                channel.force(true);
            }
            move(beside, target);
        } finally {
            Files.deleteIfExists(beside);
        }
    }

    /** Gives a complete file of the same folder the name, and the permissions, of the one it replaces. */
    public static void takePlace(Path beside, Path file) throws IOException {
        Path target = target(file);
        keepPermissions(beside, target);
        move(beside, target);
    }

    /** A link stays a link; what it points to is replaced. */
    private static Path target(Path file) throws IOException {
        return Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
    }

    private static void move(Path beside, Path target) throws IOException {
        try {
            Files.move(beside, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(beside, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static void keepPermissions(Path beside, Path target) throws IOException {
        PosixFileAttributeView old = Files.getFileAttributeView(target, PosixFileAttributeView.class);
        if (old != null && Files.exists(target)) {
            Files.setPosixFilePermissions(beside, old.readAttributes().permissions());
        }
    }
}
