package sill.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import sill.record.DesignRecord;
import sill.record.RecordJson;
import sill.record.html.RecordPage;

/** Writes a record's two files. A file is replaced only by a finished one. */
final class RecordFiles {
    private final Path page;
    private final Path json;

    /**
     * The files of a record.
     *
     * @throws Unusable when they can't be written there, said before the run rather than after it
     */
    RecordFiles(Path folder, String baseName) throws Unusable {
        page = folder.resolve(baseName + ".html");
        json = folder.resolve(baseName + ".json");
        try {
            Files.createDirectories(folder);
        } catch (IOException e) {
            throw new Unusable("the folder " + folder + " can't be made", "choose another with --out");
        }
        if (!Files.isWritable(folder)) {
            throw new Unusable(
                    "the folder " + folder + " can't be written to",
                    "choose another with --out, or give yourself the right to write there");
        }
        for (Path file : List.of(page, json)) {
            if (Files.isDirectory(file)) {
                throw new Unusable(
                        file + " is a folder, the record's file would have that name",
                        "move it, or choose another folder with --out");
            }
        }
    }

    /** The page's file. */
    Path page() {
        return page;
    }

    void write(DesignRecord record) throws Unusable {
        replace(page, RecordPage.write(record));
        replace(json, RecordJson.write(record));
    }

    /** Writes beside, then renames: whoever looks sees the old file or the new one, never a part. */
    static void replace(Path file, String text) throws Unusable {
        Path beside = null;
        try {
            beside = Files.createTempFile(file.toAbsolutePath().getParent(), "." + file.getFileName(), ".part");
            Files.write(beside, text.getBytes(StandardCharsets.UTF_8));
            letOthersRead(beside);
            try {
                Files.move(beside, file, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
            } catch (AtomicMoveNotSupportedException e) {
                Files.move(beside, file, StandardCopyOption.REPLACE_EXISTING);
            }
        } catch (IOException e) {
            delete(beside);
            throw new Unusable(
                    file + " can't be written: " + e.getMessage(), "check the disk's space and the folder's rights");
        }
    }

    /** A temporary file is its owner's alone; a record can be read as any new file can. */
    private static void letOthersRead(Path file) throws IOException {
        if (Files.getFileStore(file).supportsFileAttributeView("posix")) {
            Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-r--r--"));
        }
    }

    private static void delete(Path file) {
        try {
            if (file != null) {
                Files.deleteIfExists(file);
            }
        } catch (IOException e) {
            // Where nothing can be written, little can be tidied up.
        }
    }
}
