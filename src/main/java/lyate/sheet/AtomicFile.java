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

/** Writes a file in full or not at all. */
public final class AtomicFile {

    private AtomicFile() {}

    /** Writes beside the file, forces the bytes to the disk, then takes the file's place; keeps its permissions. */
    public static void write(Path file, byte[] content) throws IOException {
        Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
        Path beside = Files.createTempFile(target.getParent(), "." + target.getFileName(), ".part");
        try {
            try (FileChannel channel = FileChannel.open(beside, StandardOpenOption.WRITE)) {
                ByteBuffer bytes = ByteBuffer.wrap(content);
                while (bytes.hasRemaining()) {
                    channel.write(bytes);
                }
                channel.force(true);
            }
            takePlace(beside, target);
        } finally {
            Files.deleteIfExists(beside);
        }
    }

    private static void takePlace(Path beside, Path target) throws IOException {
        keepPermissions(beside, target);
        try {
            Files.move(beside, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(beside, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static void keepPermissions(Path beside, Path target) throws IOException {
        PosixFileAttributeView old = Files.getFileAttributeView(target, PosixFileAttributeView.class);
        if (old == null) {
            return;
        }
        if (Files.exists(target)) {
            Files.setPosixFilePermissions(beside, old.readAttributes().permissions());
        } else {
            // A temporary file is private; a new sheet is as readable as any other new file.
            Path probe = Files.createFile(target);
            Files.setPosixFilePermissions(beside, Files.getPosixFilePermissions(probe));
        }
    }
}
