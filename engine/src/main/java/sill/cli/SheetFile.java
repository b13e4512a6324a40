package sill.cli;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Locale;

/**
 * A worksheet's file, read whole.
 *
 * @param path as the user gave it
 * @param bytes its bytes
 * @param text its text
 */
record SheetFile(Path path, byte[] bytes, String text) {
    private static final String ENDING = ".sill";
    private static final long LARGEST = 64L << 20;

    static SheetFile read(Path path) throws Unusable {
        try {
            if (Files.isDirectory(path)) {
                throw new Unusable(path + " is a folder, a worksheet file was expected", "name the file in it");
            }
            long size = Files.size(path);
            if (size > LARGEST) {
                throw new Unusable(
                        path + " has " + size + " bytes, at most " + LARGEST + " are read",
                        "keep data in files of their own and name them in a given");
            }
            byte[] bytes = Files.readAllBytes(path);
            return new SheetFile(path, bytes, decode(path, bytes));
        } catch (NoSuchFileException e) {
            throw new Unusable(
                    "there is no file " + path, "check the path; \"sill new " + path + "\" makes a worksheet");
        } catch (AccessDeniedException e) {
            throw new Unusable(path + " may not be read", "give yourself the right to read it");
        } catch (IOException e) {
            throw new Unusable(path + " can't be read: " + e.getMessage(), "check the disk and the path");
        }
    }

    /** The file's name without folders. */
    String name() {
        return path.getFileName().toString();
    }

    /** The file's name without folders and without its ending. */
    String baseName() {
        return name().endsWith(ENDING) ? name().substring(0, name().length() - ENDING.length()) : name();
    }

    /** The folder it lies in. */
    Path folder() {
        return path.toAbsolutePath().normalize().getParent();
    }

    private static String decode(Path path, byte[] bytes) throws Unusable {
        ByteBuffer in = ByteBuffer.wrap(bytes);
        try {
            return StandardCharsets.UTF_8
                    .newDecoder()
                    .onMalformedInput(CodingErrorAction.REPORT)
                    .onUnmappableCharacter(CodingErrorAction.REPORT)
                    .decode(in)
                    .toString();
        } catch (CharacterCodingException e) {
            int at = in.position();
            int line = 1;
            for (int i = 0; i < at; i++) {
                line += bytes[i] == '\n' ? 1 : 0;
            }
            throw new Unusable(
                    path + " is not UTF-8: line " + line + " has the byte "
                            + String.format(Locale.ROOT, "0x%02X", bytes[at] & 0xFF),
                    "save the file as UTF-8");
        }
    }
}
