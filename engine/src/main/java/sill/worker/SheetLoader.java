package sill.worker;

import java.util.HashMap;
import java.util.Map;
import jdk.jshell.execution.LoaderDelegate;
import jdk.jshell.spi.ExecutionControl.ClassBytecodes;

/**
 * Defines the classes of a sheet. They see the JDK, the stdlib and Commons Math, and nothing of the engine; their functions
 * are those of {@code StrictMath}.
 */
final class SheetLoader implements LoaderDelegate {
    private final Loader loader;

    /** A loader to which classes come as they are evaluated. */
    SheetLoader() {
        this(Map.of());
    }

    /** A loader of classes that are known, by name. */
    SheetLoader(Map<String, byte[]> classes) {
        loader = new Loader(classes);
    }

    @Override
    public void load(ClassBytecodes[] classes) {
        for (ClassBytecodes bytecodes : classes) {
            loader.known.put(bytecodes.name(), StrictFunctions.in(bytecodes.bytecodes()));
        }
    }

    @Override
    public void classesRedefined(ClassBytecodes[] classes) {
        throw new IllegalStateException("a sheet's class is defined once");
    }

    @Override
    public void addToClasspath(String path) {
        // The class path is fixed when the worker starts.
    }

    @Override
    public Class<?> findClass(String name) throws ClassNotFoundException {
        return loader.loadClass(name);
    }

    /** The class whose simple name is given. */
    Class<?> withSimpleName(String simpleName) throws ClassNotFoundException {
        for (String name : loader.known.keySet()) {
            if (name.endsWith("$" + simpleName)) {
                return loader.loadClass(name);
            }
        }
        throw new ClassNotFoundException(simpleName);
    }

    private static final class Loader extends ClassLoader {
        final Map<String, byte[]> known;

        Loader(Map<String, byte[]> classes) {
            super(SheetLoader.class.getClassLoader());
            known = new HashMap<>(classes);
        }

        @Override
        protected Class<?> loadClass(String name, boolean resolve) throws ClassNotFoundException {
            if (name.startsWith("sill.") && !name.startsWith("sill.stdlib.")) {
                throw new ClassNotFoundException(name);
            }
            return super.loadClass(name, resolve);
        }

        @Override
        protected Class<?> findClass(String name) throws ClassNotFoundException {
            byte[] bytes = known.get(name);
            if (bytes == null) {
                throw new ClassNotFoundException(name);
            }
            return defineClass(name, bytes, 0, bytes.length);
        }
    }
}
