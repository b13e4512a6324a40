package sill.inference;

/** Lists, sets, queues, arrays and optional values, known by their elements. */
final class Containers {
    private final LibraryUses uses;

    Containers(LibraryUses uses) {
        this.uses = uses;
    }

    Value call(LibraryCall call) {
        if (call.target().isEmpty()) {
            return made(call);
        }
        Value element = call.receiver();
        return switch (call.name()) {
            case "size", "length", "indexOf", "getCount", "nextInt", "cardinality" -> Quantity.NUMBER;
            case "add", "addLast", "addFirst", "push", "offer", "accept", "addAll", "offerLast", "offerFirst" -> {
                uses.added(call, call.count() - 1);
                yield Quantity.UNKNOWN;
            }
            case "set" -> {
                uses.added(call, call.count() - 1);
                yield element;
            }
            case "orElse" -> Value.join(element, call.argument(0));
            case "orElseGet" -> Value.join(element, uses.applied(call, 0));
            case "map", "flatMap" -> uses.applied(call, 0, element);
            case "filter" -> {
                uses.applied(call, 0, element);
                yield element;
            }
            case "forEach", "removeIf", "ifPresent", "ifPresentOrElse" -> uses.applied(call, 0, element);
            case "replaceAll" -> uses.addedTo(call, uses.applied(call, 0, element));
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

    private Value made(LibraryCall call) {
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
                call.name().startsWith("copyOf") || call.name().equals("stream") ? call.argument(0) : call.joined();
            case "nCopies" -> call.argument(1);
            case "fill" -> {
                uses.fill(call, 0, call.argument(call.count() - 1));
                yield Quantity.UNKNOWN;
            }
            case "setAll" -> {
                Value each = uses.applied(call, 1, Quantity.NUMBER);
                uses.fill(call, 0, each);
                yield Quantity.UNKNOWN;
            }
            case "binarySearch", "frequency" -> Quantity.NUMBER;
            default -> Quantity.UNKNOWN;
        };
    }
}
