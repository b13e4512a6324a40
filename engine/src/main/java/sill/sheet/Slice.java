package sill.sheet;

import java.util.List;
import java.util.Map;

/**
 * The part of a sheet that the results of one tolerance cell need, compiled to be repeated. Its class is a {@code
 * BiConsumer<double[], double[]>}: it takes the values of the varied givens in their order and puts the results in theirs. Its
 * state is static, so that instances that work side by side need a class loader each.
 *
 * @param className name of the class
 * @param classes the class and its nested ones, by name
 * @param held givens that it reads and that do not vary: public static fields, to be set before the first call
 */
public record Slice(String className, Map<String, byte[]> classes, List<String> held) {
    public Slice {
        classes = Map.copyOf(classes);
        held = List.copyOf(held);
    }

    /** How much of the sheet a slice holds and where its values live; the first that compiles and agrees serves. */
    public enum Form {
        /** What the results need, in local variables where that can be: the compiler of the JVM makes most of these. */
        LOCALS,
        /** What the results need, in fields: a local variable may clash with a name inside a lambda or a loop. */
        FIELDS,
        /** All cells before, but for plots and output: a value may be made in ways that do not show. */
        WHOLE
    }

    /**
     * What is studied.
     *
     * @param field the field that the sheet's class holds its nominal value in
     * @param components the components of a record to be studied; empty for a number
     */
    public record Output(String field, List<String> components) {
        public Output {
            components = List.copyOf(components);
        }
    }
}
