package sill.stdlib;

import java.io.IOException;
import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;

/** Finds what the module offers, so that a new helper is tested without being listed. */
final class Helpers {
    private Helpers() {}

    /** The public classes of the package. */
    static List<Class<?>> classes() {
        try {
            Path root = Path.of(Unit.class
                    .getProtectionDomain()
                    .getCodeSource()
                    .getLocation()
                    .toURI());
            try (Stream<Path> files = Files.list(root.resolve("sill/stdlib"))) {
                return files.map(file -> file.getFileName().toString())
                        .filter(name -> name.endsWith(".class") && !name.equals("package-info.class"))
                        .sorted()
                        .<Class<?>>map(name -> load("sill.stdlib." + name.substring(0, name.length() - 6)))
                        .filter(type -> Modifier.isPublic(type.getModifiers()))
                        .toList();
            }
        } catch (IOException | URISyntaxException e) {
            throw new IllegalStateException(e);
        }
    }

    /** The public methods that the module's own source declares, without those the compiler adds. */
    static List<Method> methods() {
        return classes().stream()
                .flatMap(type -> Arrays.stream(type.getDeclaredMethods()))
                .filter(method -> Modifier.isPublic(method.getModifiers()) && !method.isSynthetic())
                .sorted(Comparator.comparing(Method::toGenericString))
                .toList();
    }

    private static Class<?> load(String name) {
        try {
            return Class.forName(name);
        } catch (ClassNotFoundException e) {
            throw new IllegalStateException(e);
        }
    }
}
