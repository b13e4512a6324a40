package sill.sheet;

import javax.lang.model.element.ElementKind;
import javax.lang.model.type.DeclaredType;
import javax.lang.model.type.TypeKind;
import javax.lang.model.type.TypeMirror;

/** Types whose values a formula can speak of. */
final class NumberTypes {
    private NumberTypes() {}

    /** A {@code float} is none: its digits are not those that are typed. */
    static boolean isNumber(TypeMirror type) {
        return switch (kind(type)) {
            case DOUBLE, INT, LONG -> true;
            case DECLARED ->
                switch (type.toString()) {
                    case "java.lang.Double", "java.lang.Integer", "java.lang.Long" -> true;
                    default -> false;
                };
            default -> false;
        };
    }

    static boolean isDouble(TypeMirror type) {
        return kind(type) == TypeKind.DOUBLE;
    }

    static boolean isTruth(TypeMirror type) {
        return kind(type) == TypeKind.BOOLEAN;
    }

    static boolean isRecord(TypeMirror type) {
        return type instanceof DeclaredType declared && declared.asElement().getKind() == ElementKind.RECORD;
    }

    private static TypeKind kind(TypeMirror type) {
        return type == null ? TypeKind.NONE : type.getKind();
    }
}
