package sill.worker;

import java.io.File;
import java.net.URISyntaxException;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import org.apache.commons.math3.util.FastMath;
import sill.stdlib.Plot;

/** What worksheet code is compiled against, besides the JDK: the stdlib and Commons Math. */
final class WorksheetClassPath {
    private WorksheetClassPath() {}

    /** The jars or folders, joined as the JDK's tools want them. */
    static String text() {
        return List.of(Plot.class, FastMath.class).stream()
                .map(WorksheetClassPath::location)
                .map(Path::toString)
                .collect(Collectors.joining(File.pathSeparator));
    }

    private static Path location(Class<?> type) {
        try {
            return Path.of(
                    type.getProtectionDomain().getCodeSource().getLocation().toURI());
        } catch (URISyntaxException e) {
            throw new IllegalStateException("class path entry has no path", e);
        }
    }
}
