package sill.worksheet;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The data files that a worksheet's givens name, with their bytes. Links are followed before it is asked whether a file lies
 * in the worksheet's folder.
 *
 * @param bytes bytes by path, as the givens write it; files that can't be had are missing
 * @param problems why they are missing, each at its given's line
 */
public record DataFiles(Map<String, byte[]> bytes, List<Problem> problems) {
    /** A record carries its data: larger files would make it unwieldy. */
    static final long LARGEST = 64L << 20;

    /**
     * Reads them.
     *
     * @param folder the worksheet's folder
     */
    public static DataFiles read(Worksheet worksheet, Path folder) {
        Map<String, byte[]> bytes = new LinkedHashMap<>();
        List<Problem> problems = new ArrayList<>();
        for (Cell cell : worksheet.cells()) {
            if (cell instanceof Cell.Givens givens) {
                for (Given given : givens.givens()) {
                    if (given.value() instanceof Given.DataFile file && !bytes.containsKey(file.path())) {
                        try {
                            bytes.put(file.path(), read(folder, file.path()));
                        } catch (Missing e) {
                            problems.add(
                                    Problem.error(given.line(), given.column(), cell.number(), e.getMessage(), e.mend));
                        }
                    }
                }
            }
        }
        return new DataFiles(bytes, problems);
    }

    private static byte[] read(Path folder, String path) throws Missing {
        String named = "Data file \"" + path + "\" ";
        try {
            Path file = folder.resolve(path).toRealPath();
            if (!file.startsWith(folder.toRealPath())) {
                throw new Missing(
                        named + "lies outside the worksheet's folder",
                        "Copy it into that folder, so that the record can be made again elsewhere.");
            }
            if (!Files.isRegularFile(file)) {
                throw new Missing(named + "is no file", "Name a file, not a folder.");
            }
            if (Files.size(file) > LARGEST) {
                throw new Missing(
                        named + "has " + Files.size(file) + " bytes, at most " + LARGEST + " travel in a record",
                        "Keep only the rows and columns that the design rests on.");
            }
            return Files.readAllBytes(file);
        } catch (NoSuchFileException | InvalidPathException e) {
            throw new Missing(named + "was not found", "The path starts from the worksheet's folder.");
        } catch (IOException e) {
            throw new Missing(named + "can't be read", "Check its rights and the disk.");
        }
    }

    private static final class Missing extends Exception {
        private static final long serialVersionUID = 1;
        private final String mend;

        Missing(String message, String mend) {
            super(message);
            this.mend = mend;
        }
    }
}
