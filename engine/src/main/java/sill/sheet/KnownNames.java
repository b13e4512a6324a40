package sill.sheet;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import javax.lang.model.element.Element;
import javax.lang.model.element.Modifier;
import javax.lang.model.util.Elements;

/**
 * Names that every worksheet may use without an import.
 *
 * @param names helpers, what they offer, and the functions of {@code Math}
 * @param types types of the stdlib and of the JDK's packages at hand
 */
record KnownNames(List<String> names, List<String> types) {
    static final KnownNames NONE = new KnownNames(List.of(), List.of());

    private static final List<String> PACKAGES =
            List.of("sill.stdlib", "java.lang", "java.util", "java.util.function", "java.util.stream", "java.math");

    static KnownNames in(Elements elements) {
        Set<String> names = new LinkedHashSet<>();
        for (Element type : elements.getPackageElement(PACKAGES.get(0)).getEnclosedElements()) {
            names.add(type.getSimpleName().toString());
            names.addAll(publicNames(type));
        }
        names.addAll(publicNames(elements.getTypeElement("java.lang.Math")));
        names.remove("<init>");
        List<String> types = new ArrayList<>();
        PACKAGES.forEach(name -> types.addAll(publicNames(elements.getPackageElement(name))));
        return new KnownNames(List.copyOf(names), types);
    }

    private static List<String> publicNames(Element owner) {
        return owner.getEnclosedElements().stream()
                .filter(member -> member.getModifiers().contains(Modifier.PUBLIC))
                .map(member -> member.getSimpleName().toString())
                .toList();
    }
}
