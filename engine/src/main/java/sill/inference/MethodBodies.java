package sill.inference;

import com.sun.source.tree.MethodTree;
import com.sun.source.tree.Tree;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javax.lang.model.element.Element;
import javax.lang.model.element.ElementKind;
import javax.lang.model.element.ExecutableElement;
import javax.lang.model.element.TypeElement;
import javax.lang.model.element.VariableElement;
import javax.lang.model.type.TypeKind;
import sill.inference.Trial.Outcome;

/**
 * The worksheet's own methods, inferred from their bodies for the arguments of each call. A result is kept for calls with
 * alike arguments. A method that calls itself runs until its result stays the same.
 */
final class MethodBodies {
    private static final int DEEPEST = 24;
    private static final int MOST_ROUNDS = 6;

    /** A method called with more kinds of arguments than this is one that makes new ones from its own. */
    private static final int MOST_VARIANTS = 64;

    private final SheetTree tree;
    private final Fields fields;
    private final Wording wording;
    private final SlipLog log;
    private final Targets targets;
    private final Walker walker;
    private final HelperUnits units;
    private final Map<Variant, Outcome> outcomes = new HashMap<>();
    private final List<Variant> order = new ArrayList<>();
    private final Map<Element, Integer> variants = new HashMap<>();
    private final Set<Variant> running = new HashSet<>();
    private final Set<Variant> recursive = new HashSet<>();
    private final Set<Element> called = new HashSet<>();
    private int changesSeen;

    MethodBodies(
            SheetTree tree,
            Fields fields,
            Wording wording,
            SlipLog log,
            Targets targets,
            Walker walker,
            HelperUnits units) {
        this.tree = tree;
        this.fields = fields;
        this.wording = wording;
        this.log = log;
        this.targets = targets;
        this.walker = walker;
        this.units = units;
    }

    private record Variant(Element method, Value self, List<Value> arguments) {}

    /** Whether the worksheet declares the method and says what it does. */
    boolean own(Element method) {
        MethodTree declared = tree.bodies().get(method);
        return declared != null && declared.getBody() != null;
    }

    /** The value of a call; for a constructor, the record it makes. */
    Value call(ExecutableElement method, Value self, List<Operand> arguments, Tree call, Environment env) {
        List<Value> values = units.asStated(method, arguments(method, arguments));
        Outcome outcome = Trial.run(values, given -> outcome(new Variant(method, self, given), call));
        log.addAll(outcome.slips());
        outcome.altered().forEach((i, value) -> {
            if (i < arguments.size()) {
                targets.add(arguments.get(i).tree(), value, env);
            }
        });
        return units.result(method).orElse(outcome.value());
    }

    /** Infers the methods that nothing calls, for arguments of which nothing is known. */
    void callUncalled(List<MethodTree> methods) {
        for (MethodTree method : methods) {
            Element element = tree.element(method).orElse(null);
            if (element instanceof ExecutableElement executable && own(element) && !called.contains(element)) {
                List<Value> unknown = new ArrayList<>();
                executable.getParameters().forEach(parameter -> unknown.add(Quantity.UNKNOWN));
                outcome(new Variant(executable, Quantity.UNKNOWN, unknown), method)
                        .slips()
                        .forEach(log::add);
            }
        }
    }

    private List<Operand> arguments(ExecutableElement method, List<Operand> arguments) {
        int count = method.getParameters().size();
        if (!method.isVarArgs() || arguments.size() < count) {
            return method.isVarArgs() && arguments.size() == count - 1 ? plus(arguments, Quantity.ANY) : arguments;
        }
        Value rest = arguments.subList(count - 1, arguments.size()).stream()
                .map(Operand::value)
                .reduce(Quantity.ANY, Value::join);
        List<Operand> gathered = new ArrayList<>(arguments.subList(0, count - 1));
        gathered.add(new Operand(rest, arguments.get(count - 1).tree()));
        return gathered;
    }

    private static List<Operand> plus(List<Operand> arguments, Value last) {
        List<Operand> all = new ArrayList<>(arguments);
        all.add(new Operand(last, null));
        return all;
    }

    private Outcome outcome(Variant variant, Tree call) {
        called.add(variant.method());
        forgetWhenFieldsChanged();
        Outcome known = outcomes.get(variant);
        if (known != null) {
            if (running.contains(variant)) {
                recursive.add(variant);
            }
            return known;
        }
        int count = variants.merge(variant.method(), 1, Integer::sum);
        if (running.size() >= DEEPEST || count > MOST_VARIANTS) {
            return new Outcome(Quantity.UNKNOWN, List.of());
        }
        outcomes.put(variant, new Outcome(Quantity.ANY, List.of()));
        order.add(variant);
        running.add(variant);
        try {
            return settle(variant, call);
        } finally {
            running.remove(variant);
        }
    }

    private Outcome settle(Variant variant, Tree call) {
        List<Slip> slips = new ArrayList<>();
        for (int round = 0; round < MOST_ROUNDS; round++) {
            int before = order.size();
            Value assumed = outcomes.get(variant).value();
            Outcome now = run(variant, call);
            slips.addAll(now.slips());
            Value value = Value.join(assumed, now.value());
            Outcome outcome = new Outcome(value, List.copyOf(slips), now.altered());
            if (!recursive.contains(variant) || value.equals(assumed)) {
                outcomes.put(variant, outcome);
                return outcome;
            }
            // What was inferred on the way rests on what was assumed.
            List<Variant> since = order.subList(before, order.size());
            since.forEach(outcomes::remove);
            since.clear();
            outcomes.put(variant, outcome);
        }
        Outcome unknown = new Outcome(Quantity.UNKNOWN, List.copyOf(slips));
        outcomes.put(variant, unknown);
        return unknown;
    }

    private Outcome run(Variant variant, Tree call) {
        MethodTree method = tree.bodies().get(variant.method());
        log.open();
        Environment.Frame frame = new Environment.Frame(variant.self(), tree.start(call));
        Environment env = Environment.ofBody(frame).branch();
        List<VariableElement> parameters = new ArrayList<>();
        for (int i = 0; i < method.getParameters().size(); i++) {
            Value value = i < variant.arguments().size() ? variant.arguments().get(i) : Quantity.UNKNOWN;
            Optional<Element> parameter = tree.element(method.getParameters().get(i));
            if (parameter.isPresent() && parameter.get() instanceof VariableElement variable) {
                parameters.add(variable);
                env.set(variable, value);
                wording.called(variable, tree.start(call));
            }
        }
        walker.run(method.getBody(), env);
        boolean makes = variant.method().getKind() == ElementKind.CONSTRUCTOR;
        Value value = makes ? made(variant.method(), parameters, env) : frame.returned();
        Map<Integer, Value> altered = new HashMap<>();
        for (int i = 0; i < parameters.size(); i++) {
            Value before = i < variant.arguments().size() ? variant.arguments().get(i) : Quantity.UNKNOWN;
            Value after = env.get(parameters.get(i));
            if (!parameters.get(i).asType().getKind().isPrimitive() && !after.equals(before)) {
                altered.put(i, after);
            }
        }
        return new Outcome(isVoid(variant.method()) && !makes ? Quantity.UNKNOWN : value, log.close(), altered);
    }

    /** The record that its canonical constructor makes of its parameters. */
    private Value made(Element constructor, List<VariableElement> parameters, Environment env) {
        Map<String, Value> parts = new LinkedHashMap<>();
        // No caption says what the bare numbers of a record measure: they fit anything.
        parameters.forEach(parameter -> {
            Value value = env.get(parameter);
            parts.put(parameter.getSimpleName().toString(), value.equals(Quantity.LITERAL) ? Quantity.ANY : value);
        });
        TypeElement type = (TypeElement) constructor.getEnclosingElement();
        List<String> components = type.getRecordComponents().stream()
                .map(component -> component.getSimpleName().toString())
                .toList();
        boolean canonical = type.getKind() == ElementKind.RECORD
                && List.copyOf(parts.keySet()).equals(components);
        return canonical ? new Components(parts) : Quantity.UNKNOWN;
    }

    private static boolean isVoid(Element method) {
        return ((ExecutableElement) method).getReturnType().getKind() == TypeKind.VOID;
    }

    private void forgetWhenFieldsChanged() {
        if (fields.changes() != changesSeen) {
            changesSeen = fields.changes();
            outcomes.keySet().removeIf(variant -> !running.contains(variant));
            variants.clear();
        }
    }
}
