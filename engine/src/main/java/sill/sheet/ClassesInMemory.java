package sill.sheet;

import java.io.ByteArrayOutputStream;
import java.io.OutputStream;
import java.net.URI;
import java.util.LinkedHashMap;
import java.util.Map;
import javax.tools.FileObject;
import javax.tools.ForwardingJavaFileManager;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.StandardJavaFileManager;

/** Keeps the classes that the compiler writes instead of putting them into files. */
final class ClassesInMemory extends ForwardingJavaFileManager<StandardJavaFileManager> {
    private final Map<String, ByteArrayOutputStream> written = new LinkedHashMap<>();

    ClassesInMemory(StandardJavaFileManager files) {
        super(files);
    }

    /** The classes so far, by name. */
    Map<String, byte[]> bytes() {
        Map<String, byte[]> bytes = new LinkedHashMap<>();
        written.forEach((name, stream) -> bytes.put(name, stream.toByteArray()));
        return bytes;
    }

    @Override
    public JavaFileObject getJavaFileForOutput(
            Location location, String className, JavaFileObject.Kind kind, FileObject sibling) {
        return new SimpleJavaFileObject(URI.create("class:///" + className.replace('.', '/') + kind.extension), kind) {
            @Override
            public OutputStream openOutputStream() {
                ByteArrayOutputStream stream = new ByteArrayOutputStream();
                written.put(className, stream);
                return stream;
            }
        };
    }
}
