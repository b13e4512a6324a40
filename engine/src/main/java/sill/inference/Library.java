package sill.inference;

import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.Tree;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.lang.model.element.Element;

/** Java's own library, as far as it hands numbers on: containers, streams, functions, boxed numbers. */
final class Library {
    private final SheetTree tree;
    private final Rules rules;
    private final Behaviours behaviours;
    private final Targets targets;

    Library(SheetTree tree, Rules rules, Behaviours behaviours, Targets targets) {
        this.tree = tree;
        this.rules = rules;
        this.behaviours = behaviours;
        this.targets = targets;
    }

    /**
     * A call.
     *
     * @param owner qualified name of the type that declares the method
     * @param target the expression it is called on; empty for a static method
     * @param receiver that expression's value
     */
    record Call(
            String owner,
            String name,
            Optional<ExpressionTree> target,
            Value receiver,
            List<Operand> arguments,
            Tree tree,
            Environment env) {
        Value argument(int i) {
            return i < arguments.size() ? arguments.get(i).value() : Quantity.UNKNOWN;
        }

        Optional<Behaviour> function(int i) {
            return argument(i) instanceof Behaviour behaviour ? Optional.of(behaviour) : Optional.empty();
        }

        int count() {
            return arguments.size();
        }
    }

    /** A library object made by its constructor. */
    Value make(String owner, List<Operand> arguments) {
        if (owner.startsWith("java.util.") && !owner.startsWith("java.util.concurrent.")) {
            boolean container = owner.endsWith("List")
                    || owner.endsWith("Set")
                    || owner.endsWith("Map")
                    || owner.endsWith("Deque")
                    || owner.endsWith("Queue")
                    || owner.endsWith("Statistics");
            if (container) {
                boolean copies =
                        arguments.size() == 1 && !arguments.get(0).quantity().isPure();
                return copies ? arguments.get(0).value() : Quantity.ANY;
            }
        }
        return Quantity.UNKNOWN;
    }

    Value call(Call call) {
        String owner = call.owner();
        if (owner.equals("java.lang.Double") || owner.equals("java.lang.Number") || owner.equals("java.lang.Integer")) {
            return boxed(call);
        } else if (call.receiver() instanceof Behaviour function) {
            return function(function, call);
        } else if (owner.startsWith("java.util.stream.")) {
            return stream(call);
        } else if (owner.equals("java.util.Random") || owner.equals("java.util.random.RandomGenerator")) {
            return call.count() == 2 ? Value.join(call.argument(0), call.argument(1)) : Quantity.NUMBER;
        } else if (owner.equals("java.util.Map") || owner.equals("java.util.Map.Entry") || owner.endsWith("Map")) {
            return map(call);
        } else if (owner.equals("java.lang.String")) {
            return call.name().equals("length") || call.name().equals("indexOf") ? Quantity.NUMBER : Quantity.UNKNOWN;
        } else if (owner.startsWith("java.util.") || owner.equals("java.lang.Iterable")) {
            return container(call);
        } else if (call.name().equals("clone")) {
            return call.receiver();
        }
        return Quantity.UNKNOWN;
    }

    private Value boxed(Call call) {
        return switch (call.name()) {
            case "valueOf", "doubleValue", "intValue", "longValue", "floatValue" ->
                call.target().isPresent() && call.count() == 0
                        ? call.receiver()
                        : call.argument(0).quantity();
            case "sum", "max", "min" -> rules.alike(call.name(), call.arguments(), call.tree());
            case "compare" -> {
                rules.alike("compare", call.arguments(), call.tree());
                yield Quantity.NUMBER;
            }
            default -> Quantity.UNKNOWN;
        };
    }

    private Value function(Behaviour function, Call call) {
        return switch (call.name()) {
            case "applyAsDouble",
                    "applyAsInt",
                    "applyAsLong",
                    "apply",
                    "test",
                    "accept",
                    "get",
                    "getAsDouble",
                    "getAsInt",
                    "call",
                    "run",
                    "compare" -> behaviours.apply(function, call.arguments(), call.tree());
            default -> Quantity.UNKNOWN;
        };
    }

    private Value stream(Call call) {
        Value element = call.receiver();
        return switch (call.name()) {
            case "map", "mapToObj", "mapToDouble", "mapToInt", "mapToLong", "flatMap", "flatMapToDouble" ->
                applied(call, 0, element);
            case "filter", "takeWhile", "dropWhile", "peek" -> {
                applied(call, 0, element);
                yield element;
            }
            case "forEach", "forEachOrdered", "anyMatch", "allMatch", "noneMatch" -> applied(call, 0, element);
            case "sorted", "max", "min" -> {
                applied(call, 0, element, element);
                yield element;
            }
            case "count" -> Quantity.NUMBER;
            case "reduce" -> reduce(call);
            case "collect" -> collect(call);
            case "of", "concat", "builder", "ofNullable", "empty" -> joined(call, 0);
            case "iterate" -> iterate(call);
            case "generate" -> applied(call, 0);
            case "range", "rangeClosed" -> Quantity.NUMBER;
            case "boxed",
                    "distinct",
                    "limit",
                    "skip",
                    "toArray",
                    "toList",
                    "sum",
                    "average",
                    "findFirst",
                    "findAny",
                    "asDoubleStream",
                    "asLongStream",
                    "iterator",
                    "parallel",
                    "sequential",
                    "unordered",
                    "summaryStatistics",
                    "build" -> element;
            case "add" -> Value.join(call.receiver(), added(call, 0));
            case "accept" -> added(call, 0);
            default -> Quantity.UNKNOWN;
        };
    }

    private Value reduce(Call call) {
        boolean seeded = call.count() > 1;
        Value result = seeded ? call.argument(0) : call.receiver();
        int operator = seeded ? 1 : 0;
        for (int round = 0; round < 2; round++) {
            result = Value.join(result, applied(call, operator, result, call.receiver()));
        }
        return result;
    }

    private Value iterate(Call call) {
        Value result = call.argument(0);
        for (int i = 1; i < call.count(); i++) {
            Value next = applied(call, i, result);
            result = i == call.count() - 1 ? Value.join(result, next) : result;
        }
        return result;
    }

    private Value collect(Call call) {
        ExpressionTree collector = SheetTree.bare(call.arguments().get(0).tree());
        if (!(collector instanceof MethodInvocationTree made)) {
            return Quantity.UNKNOWN;
        }
        String name = tree.element(made)
                .map(Element::getSimpleName)
                .map(Object::toString)
                .orElse("");
        return switch (name) {
            case "toList", "toSet", "toUnmodifiableList", "toUnmodifiableSet", "minBy", "maxBy" -> call.receiver();
            case "counting" -> Quantity.NUMBER;
            default -> Quantity.UNKNOWN;
        };
    }

    private Value map(Call call) {
        if (call.target().isEmpty()) {
            return mapOf(call);
        }
        Components map = call.receiver() instanceof Components entries
                ? entries
                : Components.entry(call.receiver(), call.receiver());
        Value key = map.part(Components.KEY);
        Value value = map.part(Components.VALUE);
        return switch (call.name()) {
            case "get", "getValue", "remove", "values" -> value;
            case "getKey", "keySet", "firstKey", "lastKey" -> key;
            case "size" -> Quantity.NUMBER;
            case "getOrDefault" -> Value.join(value, call.argument(1));
            case "entrySet",
                    "firstEntry",
                    "lastEntry",
                    "floorEntry",
                    "ceilingEntry",
                    "descendingMap",
                    "headMap",
                    "tailMap" -> map;
            case "put", "putIfAbsent" -> put(call, call.argument(0), call.argument(1), value);
            case "merge" -> put(call, call.argument(0), merged(call, value), value);
            case "computeIfAbsent" -> put(call, call.argument(0), applied(call, 1, call.argument(0)), value);
            case "forEach" -> applied(call, 0, key, value);
            default -> Quantity.UNKNOWN;
        };
    }

    private Value merged(Call call, Value value) {
        Value result = Value.join(value, call.argument(1));
        return Value.join(result, applied(call, 2, result, call.argument(1)));
    }

    private Value put(Call call, Value key, Value value, Value before) {
        targets.add(call.target().orElseThrow(), Components.entry(named(key), named(value)), call.env());
        return Value.join(before, value);
    }

    private Value mapOf(Call call) {
        if (call.name().equals("entry")) {
            return Components.entry(named(call.argument(0)), named(call.argument(1)));
        } else if (!call.name().equals("of")) {
            return joined(call, 0);
        }
        Value key = Quantity.ANY;
        Value value = Quantity.ANY;
        for (int i = 0; i + 1 < call.count(); i += 2) {
            key = Value.join(key, call.argument(i));
            value = Value.join(value, call.argument(i + 1));
        }
        return Components.entry(key, value);
    }

    private static Value named(Value value) {
        return value instanceof Quantity quantity ? quantity.named() : value;
    }

    private Value container(Call call) {
        if (call.target().isEmpty()) {
            return made(call);
        }
        Value element = call.receiver();
        return switch (call.name()) {
            case "size", "length", "indexOf", "getCount", "nextInt", "cardinality" -> Quantity.NUMBER;
            case "add", "addLast", "addFirst", "push", "offer", "accept", "addAll", "offerLast", "offerFirst" -> {
                added(call, call.count() - 1);
                yield Quantity.UNKNOWN;
            }
            case "set" -> {
                added(call, call.count() - 1);
                yield element;
            }
            case "orElse" -> Value.join(element, call.argument(0));
            case "orElseGet" -> Value.join(element, applied(call, 0));
            case "map", "flatMap" -> applied(call, 0, element);
            case "filter" -> {
                applied(call, 0, element);
                yield element;
            }
            case "forEach", "removeIf", "ifPresent", "ifPresentOrElse" -> applied(call, 0, element);
            case "replaceAll" -> addedTo(call, applied(call, 0, element));
            case "get",
                    "getFirst",
                    "getLast",
                    "first",
                    "last",
                    "next",
                    "previous",
                    "peek",
                    "poll",
                    "pop",
                    "element",
                    "remove",
                    "removeFirst",
                    "removeLast",
                    "peekFirst",
                    "peekLast",
                    "pollFirst",
                    "pollLast",
                    "floor",
                    "ceiling",
                    "higher",
                    "lower",
                    "getAsDouble",
                    "getAsInt",
                    "getAsLong",
                    "orElseThrow",
                    "getMax",
                    "getMin",
                    "getSum",
                    "getAverage",
                    "stream",
                    "iterator",
                    "listIterator",
                    "subList",
                    "headSet",
                    "tailSet",
                    "descendingSet",
                    "reversed",
                    "toArray",
                    "clone",
                    "nextDouble",
                    "descendingIterator" -> element;
            default -> Quantity.UNKNOWN;
        };
    }

    private Value made(Call call) {
        return switch (call.name()) {
            case "asList",
                    "of",
                    "ofNullable",
                    "copyOf",
                    "copyOfRange",
                    "stream",
                    "unmodifiableList",
                    "max",
                    "min",
                    "singletonList",
                    "emptyList",
                    "empty",
                    "list" ->
                call.name().startsWith("copyOf") || call.name().equals("stream") ? call.argument(0) : joined(call, 0);
            case "nCopies" -> call.argument(1);
            case "fill" -> {
                targets.add(call.arguments().get(0).tree(), call.argument(call.count() - 1), call.env());
                yield Quantity.UNKNOWN;
            }
            case "setAll" -> {
                Value each = applied(call, 1, Quantity.NUMBER);
                targets.add(call.arguments().get(0).tree(), each, call.env());
                yield Quantity.UNKNOWN;
            }
            case "binarySearch", "frequency" -> Quantity.NUMBER;
            default -> Quantity.UNKNOWN;
        };
    }

    /** Adds an argument to the container it is called on, and gives that argument. */
    private Value added(Call call, int argument) {
        return addedTo(call, call.argument(argument));
    }

    private Value addedTo(Call call, Value element) {
        call.target().ifPresent(target -> targets.add(target, element, call.env()));
        return element;
    }

    private static Value joined(Call call, int from) {
        Value result = Quantity.ANY;
        for (int i = from; i < call.count(); i++) {
            result = Value.join(result, call.argument(i));
        }
        return result;
    }

    /** What an argument gives when it is called; unknown when it is no code that can be seen. */
    private Value applied(Call call, int function, Value... values) {
        return call.function(function)
                .map(behaviour -> {
                    List<Operand> operands = new ArrayList<>();
                    for (Value value : values) {
                        operands.add(new Operand(
                                value, call.arguments().get(function).tree()));
                    }
                    return behaviours.apply(behaviour, operands, call.tree());
                })
                .orElse(Quantity.UNKNOWN);
    }
}
