package sill.inference;

/** Maps and their entries, known by their keys and values. */
final class Maps {
    private final LibraryUses uses;

    Maps(LibraryUses uses) {
        this.uses = uses;
    }

    Value call(LibraryCall call) {
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
            case "computeIfAbsent" -> put(call, call.argument(0), uses.applied(call, 1, call.argument(0)), value);
            case "forEach" -> uses.applied(call, 0, key, value);
            default -> Quantity.UNKNOWN;
        };
    }

    private Value merged(LibraryCall call, Value value) {
        Value result = Value.join(value, call.argument(1));
        return Value.join(result, uses.applied(call, 2, result, call.argument(1)));
    }

    private Value put(LibraryCall call, Value key, Value value, Value before) {
        uses.addedTo(call, Components.entry(named(key), named(value)));
        return Value.join(before, value);
    }

    private Value mapOf(LibraryCall call) {
        if (call.name().equals("entry")) {
            return Components.entry(named(call.argument(0)), named(call.argument(1)));
        } else if (!call.name().equals("of")) {
            return call.joined();
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
}
