package sill.inference;

import com.sun.source.tree.LiteralTree;
import com.sun.source.tree.Tree;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.lang.model.element.AnnotationMirror;
import javax.lang.model.element.AnnotationValue;
import javax.lang.model.element.Element;
import javax.lang.model.element.ElementKind;
import javax.lang.model.element.ExecutableElement;
import javax.lang.model.element.RecordComponentElement;
import javax.lang.model.element.TypeElement;
import javax.lang.model.element.VariableElement;
import javax.lang.model.type.DeclaredType;
import javax.lang.model.type.TypeMirror;
import sill.units.Unit;
import sill.units.UnitException;

/**
 * The helpers' units, as {@code @Unit} states them on parameters, results and record components. A symbol that starts with
 * a question mark is a variable of the one call: the first argument that has a dimension settles it. On a {@code String} it
 * says that this text names the unit; on a function, an arrow stands between its argument's and its result's.
 */
final class HelperUnits {
    private static final String UNIT = "sill.stdlib.Unit";
    private static final String ARROW = "->";

    private final Rules rules;
    private final Wording wording;
    private final Behaviours behaviours;
    private final Map<String, Quantity> known = new HashMap<>();

    HelperUnits(Rules rules, Wording wording, Behaviours behaviours) {
        this.rules = rules;
        this.wording = wording;
        this.behaviours = behaviours;
    }

    /** Whether a helper states any unit of itself. */
    static boolean own(ExecutableElement method) {
        Element type = method.getEnclosingElement();
        return type instanceof TypeElement owner
                && owner.getQualifiedName().toString().startsWith("sill.stdlib.");
    }

    /** The value of a call. */
    Value call(ExecutableElement method, List<Operand> arguments, Tree call) {
        Map<String, Quantity> variables = new HashMap<>();
        boolean swapped = false;
        for (int i = 0; i < arguments.size(); i++) {
            Operand argument = arguments.get(i);
            String symbol = symbol(parameter(method, i)).orElse("");
            if (symbol.isEmpty() || symbol.contains(ARROW)) {
                continue;
            } else if (argument.tree() instanceof LiteralTree text && text.getValue() instanceof String named) {
                variables.merge(symbol, unit(named), HelperUnits::settle);
            } else if (argument.quantity().kind() == Quantity.Kind.LITERAL
                    || !argument.quantity().hasDimension()) {
                variables.merge(symbol, argument.quantity(), HelperUnits::settle);
            } else {
                Quantity expected = symbol.startsWith("?")
                        ? variables.merge(symbol, argument.quantity(), HelperUnits::settle)
                        : unit(symbol);
                if (!expected.fits(argument.quantity()) && !swapped) {
                    int other = swappedWith(method, arguments, i, argument.quantity());
                    swapped = other > i;
                    slip(method, i, other, argument, expected, arguments);
                }
            }
        }
        applyFunctions(method, arguments, variables, call);
        return result(method, variables);
    }

    /** Arguments as the worksheet's own method states them, where it does. */
    List<Value> asStated(ExecutableElement method, List<Operand> arguments) {
        List<Value> values = new ArrayList<>();
        boolean swapped = false;
        for (int i = 0; i < arguments.size(); i++) {
            Operand argument = arguments.get(i);
            Quantity stated = method.getParameters().isEmpty() ? Quantity.UNKNOWN : unitOf(method, i);
            if (!stated.hasDimension()) {
                values.add(argument.value());
                continue;
            }
            boolean fits = argument.quantity().kind() == Quantity.Kind.LITERAL || stated.fits(argument.quantity());
            if (!fits && !swapped) {
                int other = swappedWith(method, arguments, i, argument.quantity());
                swapped = other > i;
                slip(method, i, other, argument, stated, arguments);
            }
            values.add(stated);
        }
        return values;
    }

    /** The result as the worksheet's own method states it, where it does. */
    Optional<Value> result(ExecutableElement method) {
        return symbol(method).filter(symbol -> !symbol.startsWith("?")).map(this::unit);
    }

    /** The value that a type's record components state, unknown when it states none. */
    Value ofType(TypeMirror type) {
        if (!(type instanceof DeclaredType declared) || declared.asElement().getKind() != ElementKind.RECORD) {
            return Quantity.UNKNOWN;
        }
        Map<String, Value> parts = new LinkedHashMap<>();
        boolean stated = false;
        for (RecordComponentElement component : ((TypeElement) declared.asElement()).getRecordComponents()) {
            Optional<String> symbol = symbol(component).or(() -> symbol(component.getAccessor()));
            stated |= symbol.isPresent();
            parts.put(
                    component.getSimpleName().toString(), symbol.map(this::unit).orElse(Quantity.UNKNOWN));
        }
        return stated ? new Components(parts) : Quantity.UNKNOWN;
    }

    private Value result(ExecutableElement method, Map<String, Quantity> variables) {
        Optional<String> symbol = symbol(method);
        if (symbol.isPresent()) {
            return symbol.get().startsWith("?")
                    ? variables.getOrDefault(symbol.get(), Quantity.UNKNOWN)
                    : unit(symbol.get());
        }
        boolean constructor = method.getKind() == ElementKind.CONSTRUCTOR;
        return ofType(constructor ? method.getEnclosingElement().asType() : method.getReturnType());
    }

    private void applyFunctions(
            ExecutableElement method, List<Operand> arguments, Map<String, Quantity> variables, Tree call) {
        for (int i = 0; i < arguments.size(); i++) {
            String symbol = symbol(parameter(method, i)).orElse("");
            int arrow = symbol.indexOf(ARROW);
            if (arrow < 0 || !(arguments.get(i).value() instanceof Behaviour function)) {
                continue;
            }
            Quantity from = resolved(symbol.substring(0, arrow).strip(), variables);
            Quantity to = resolved(symbol.substring(arrow + ARROW.length()).strip(), variables);
            Operand argument = new Operand(from.named(), arguments.get(i).tree());
            Operand result = new Operand(
                    behaviours.apply(function, List.of(argument), call),
                    arguments.get(i).tree());
            if (result.quantity().kind() != Quantity.Kind.LITERAL && !to.fits(result.quantity())) {
                rules.unfit(
                        result,
                        to.dimension(),
                        name(method) + " expects a function that gives " + to.said() + ", found "
                                + wording.said(result),
                        "");
            }
        }
    }

    private Quantity resolved(String symbol, Map<String, Quantity> variables) {
        return symbol.startsWith("?") ? variables.getOrDefault(symbol, Quantity.UNKNOWN) : unit(symbol);
    }

    private void slip(
            ExecutableElement method, int i, int other, Operand argument, Quantity expected, List<Operand> arguments) {
        boolean many = arguments.size() > 1;
        String place = many ? " as argument " + (i + 1) : "";
        String hint = other >= 0 ? "Swap arguments " + (i + 1) + " and " + (other + 1) + "." : "";
        rules.unfit(
                argument,
                expected.dimension(),
                name(method) + " expects " + expected.said() + place + ", found " + wording.said(argument),
                hint);
    }

    /** The later argument that would fit here as this one would fit there; -1 when there is none. */
    private int swappedWith(ExecutableElement method, List<Operand> arguments, int i, Quantity argument) {
        Quantity here = unitOf(method, i);
        for (int other = i + 1; other < arguments.size(); other++) {
            Quantity there = unitOf(method, other);
            Quantity found = arguments.get(other).quantity();
            boolean both = here.hasDimension() && there.hasDimension() && found.hasDimension();
            if (both && there.fits(argument) && here.fits(found) && !here.fits(there)) {
                return other;
            }
        }
        return -1;
    }

    private Quantity unitOf(ExecutableElement method, int i) {
        String symbol = symbol(parameter(method, i)).orElse("?");
        return symbol.startsWith("?") ? Quantity.UNKNOWN : unit(symbol);
    }

    private static VariableElement parameter(ExecutableElement method, int i) {
        List<? extends VariableElement> parameters = method.getParameters();
        return parameters.get(Math.min(i, parameters.size() - 1));
    }

    private static String name(ExecutableElement method) {
        String type = method.getEnclosingElement().getSimpleName().toString();
        if (method.getKind() == ElementKind.CONSTRUCTOR) {
            return "new " + type;
        }
        // The sheet's own class has a name that no worksheet says.
        return (type.startsWith("$") ? "" : type + ".") + method.getSimpleName();
    }

    /** A variable that one argument settled stays; bare numbers and unknown ones settle nothing. */
    private static Quantity settle(Quantity before, Quantity now) {
        boolean settled = before.hasDimension() && before.kind() != Quantity.Kind.LITERAL;
        boolean weaker = !now.hasDimension() || now.kind() == Quantity.Kind.LITERAL;
        return settled || weaker && before.kind() == Quantity.Kind.UNKNOWN ? before : now;
    }

    private Quantity unit(String symbol) {
        return known.computeIfAbsent(symbol, text -> {
            try {
                return Quantity.of(Unit.parse(text).dimension());
            } catch (UnitException e) {
                return Quantity.UNKNOWN;
            }
        });
    }

    static Optional<String> symbol(Element element) {
        if (element == null) {
            return Optional.empty();
        }
        for (AnnotationMirror annotation : element.getAnnotationMirrors()) {
            if (annotation.getAnnotationType().toString().equals(UNIT)) {
                for (AnnotationValue value : annotation.getElementValues().values()) {
                    return Optional.of(value.getValue().toString());
                }
            }
        }
        return Optional.empty();
    }
}
