package sill.sheet;

import java.util.List;
import java.util.stream.Collectors;
import javax.lang.model.element.ElementKind;
import javax.lang.model.element.TypeElement;
import javax.lang.model.type.ArrayType;
import javax.lang.model.type.DeclaredType;
import javax.lang.model.type.IntersectionType;
import javax.lang.model.type.TypeKind;
import javax.lang.model.type.TypeMirror;
import javax.lang.model.type.TypeVariable;
import javax.lang.model.type.WildcardType;

/**
 * Writes a type as source text. A type without a name in source is written as its nearest supertype that has one, as the
 * JDK's prompt does for its variables.
 */
final class TypeNames {
    /** A bound that refers to itself ends here. */
    private static final int DEEPEST = 6;

    private TypeNames() {}

    /** The type as source; empty when it is in error. */
    static String source(TypeMirror type) {
        return source(type, 0);
    }

    private static String source(TypeMirror type, int depth) {
        return switch (type.getKind()) {
            case BOOLEAN, BYTE, SHORT, INT, LONG, CHAR, FLOAT, DOUBLE, VOID ->
                type.getKind().name().toLowerCase(java.util.Locale.ROOT);
            case ARRAY -> array((ArrayType) type, depth);
            case DECLARED -> declared((DeclaredType) type, depth);
            case INTERSECTION -> source(((IntersectionType) type).getBounds().get(0), depth);
            case TYPEVAR -> source(((TypeVariable) type).getUpperBound(), depth);
            case WILDCARD -> wildcard((WildcardType) type, depth);
            case NULL -> "Object";
            default -> "";
        };
    }

    private static String array(ArrayType type, int depth) {
        String component = source(type.getComponentType(), depth);
        return component.isEmpty() ? "" : component + "[]";
    }

    private static String declared(DeclaredType type, int depth) {
        TypeElement element = (TypeElement) type.asElement();
        if (element.getSimpleName().isEmpty()) {
            List<? extends TypeMirror> interfaces = element.getInterfaces();
            return source(interfaces.isEmpty() ? element.getSuperclass() : interfaces.get(0), depth);
        }
        String name = name(element);
        if (type.getTypeArguments().isEmpty()) {
            return name;
        }
        List<String> arguments = type.getTypeArguments().stream()
                .map(argument -> argument(argument, depth + 1))
                .toList();
        return arguments.contains("") ? "" : name + "<" + String.join(", ", arguments) + ">";
    }

    private static String argument(TypeMirror type, int depth) {
        if (depth > DEEPEST) {
            return "?";
        }
        if (type.getKind() == TypeKind.TYPEVAR || type.getKind() == TypeKind.INTERSECTION || isNameless(type)) {
            String bound = source(type, depth);
            return bound.isEmpty() || bound.equals("Object") ? "?" : "? extends " + bound;
        }
        return source(type, depth);
    }

    private static boolean isNameless(TypeMirror type) {
        return type instanceof DeclaredType declared
                && declared.asElement().getSimpleName().isEmpty();
    }

    private static String wildcard(WildcardType type, int depth) {
        if (type.getSuperBound() != null) {
            return "? super " + source(type.getSuperBound(), depth + 1);
        }
        return type.getExtendsBound() == null ? "?" : "? extends " + source(type.getExtendsBound(), depth + 1);
    }

    /** The worksheet's own types stand inside the sheet's class, whose name they do without. */
    private static String name(TypeElement element) {
        String qualified = element.getQualifiedName().toString();
        if (qualified.isEmpty() || element.getEnclosingElement().getKind() == ElementKind.METHOD) {
            return element.getSimpleName().toString();
        }
        return qualified.startsWith(ClassText.NAME + ".")
                ? qualified.substring(ClassText.NAME.length() + 1)
                : qualified;
    }

    /** A type's source text as a reader wants it: without packages. */
    static String withoutPackages(String source) {
        return java.util.Arrays.stream(source.split("(?<=[<>, \\[])|(?=[<>, \\[])"))
                .map(word -> word.replaceFirst("^([a-z_][\\w]*\\.)+(?=[A-Z$])", ""))
                .collect(Collectors.joining());
    }
}
