package sill.sheet;

import java.util.ArrayList;
import java.util.List;
import javax.lang.model.element.AnnotationMirror;
import javax.lang.model.element.AnnotationValue;
import javax.lang.model.element.Element;

/** Texts that annotations of the stdlib state. */
final class Annotations {
    private Annotations() {}

    /** The texts of an annotation with one value or a list; empty when it is not there. */
    static List<String> texts(Element annotated, String annotation) {
        List<String> texts = new ArrayList<>();
        for (AnnotationMirror mirror : annotated.getAnnotationMirrors()) {
            if (mirror.getAnnotationType().toString().equals(annotation)) {
                for (AnnotationValue value : mirror.getElementValues().values()) {
                    if (value.getValue() instanceof List<?> list) {
                        list.forEach(each -> texts.add(String.valueOf(((AnnotationValue) each).getValue())));
                    } else {
                        texts.add(value.getValue().toString());
                    }
                }
            }
        }
        return texts;
    }
}
