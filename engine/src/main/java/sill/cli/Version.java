package sill.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;
import picocli.CommandLine.IVersionProvider;

/** Sill's version, as the build wrote it, and Java's. */
final class Version implements IVersionProvider {
    static String sill() {
        try (InputStream in = Version.class.getResourceAsStream("version.properties")) {
            Properties properties = new Properties();
            properties.load(in);
            return properties.getProperty("version");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static String java() {
        return Runtime.version().toString();
    }

    @Override
    public String[] getVersion() {
        return new String[] {"sill " + sill() + ", on Java " + java()};
    }
}
