package sill.inference;

import java.util.List;

/** Java's own library, as far as it hands numbers on: containers, streams, functions, boxed numbers. */
final class Library {
    private final Rules rules;
    private final Behaviours behaviours;
    private final Streams streams;
    private final Maps maps;
    private final Containers containers;

    Library(SheetTree tree, Rules rules, Behaviours behaviours, Targets targets) {
        this.rules = rules;
        this.behaviours = behaviours;
        LibraryUses uses = new LibraryUses(behaviours, targets);
        streams = new Streams(tree, uses);
        maps = new Maps(uses);
        containers = new Containers(uses);
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

    Value call(LibraryCall call) {
        String owner = call.owner();
        if (owner.equals("java.lang.Double") || owner.equals("java.lang.Number") || owner.equals("java.lang.Integer")) {
            return boxed(call);
        } else if (call.receiver() instanceof Behaviour function) {
            return function(function, call);
        } else if (owner.startsWith("java.util.stream.")) {
            return streams.call(call);
        } else if (owner.equals("java.util.Random") || owner.equals("java.util.random.RandomGenerator")) {
            return call.count() == 2 ? Value.join(call.argument(0), call.argument(1)) : Quantity.NUMBER;
        } else if (owner.equals("java.util.Map") || owner.equals("java.util.Map.Entry") || owner.endsWith("Map")) {
            return maps.call(call);
        } else if (owner.equals("java.lang.String")) {
            return call.name().equals("length") || call.name().equals("indexOf") ? Quantity.NUMBER : Quantity.UNKNOWN;
        } else if (owner.startsWith("java.util.") || owner.equals("java.lang.Iterable")) {
            return containers.call(call);
        } else if (call.name().equals("clone")) {
            return call.receiver();
        }
        return Quantity.UNKNOWN;
    }

    private Value boxed(LibraryCall call) {
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

    private Value function(Behaviour function, LibraryCall call) {
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
}
