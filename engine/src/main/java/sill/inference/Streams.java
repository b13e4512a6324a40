package sill.inference;

import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.MethodInvocationTree;
import javax.lang.model.element.Element;

/** Streams, known by their elements. */
final class Streams {
    private final SheetTree tree;
    private final LibraryUses uses;

    Streams(SheetTree tree, LibraryUses uses) {
        this.tree = tree;
        this.uses = uses;
    }

    Value call(LibraryCall call) {
        Value element = call.receiver();
        return switch (call.name()) {
            case "map", "mapToObj", "mapToDouble", "mapToInt", "mapToLong", "flatMap", "flatMapToDouble" ->
                uses.applied(call, 0, element);
            case "filter", "takeWhile", "dropWhile", "peek" -> {
                uses.applied(call, 0, element);
                yield element;
            }
            case "forEach", "forEachOrdered", "anyMatch", "allMatch", "noneMatch" -> uses.applied(call, 0, element);
            case "sorted", "max", "min" -> {
                uses.applied(call, 0, element, element);
                yield element;
            }
            case "count" -> Quantity.NUMBER;
            case "reduce" -> reduce(call);
            case "collect" -> collect(call);
            case "of", "concat", "builder", "ofNullable", "empty" -> call.joined();
            case "iterate" -> iterate(call);
            case "generate" -> uses.applied(call, 0);
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
            case "add" -> Value.join(call.receiver(), uses.added(call, 0));
            case "accept" -> uses.added(call, 0);
            default -> Quantity.UNKNOWN;
        };
    }

    private Value reduce(LibraryCall call) {
        boolean seeded = call.count() > 1;
        Value result = seeded ? call.argument(0) : call.receiver();
        int operator = seeded ? 1 : 0;
        for (int round = 0; round < 2; round++) {
            result = Value.join(result, uses.applied(call, operator, result, call.receiver()));
        }
        return result;
    }

    private Value iterate(LibraryCall call) {
        Value result = call.argument(0);
        for (int i = 1; i < call.count(); i++) {
            Value next = uses.applied(call, i, result);
            result = i == call.count() - 1 ? Value.join(result, next) : result;
        }
        return result;
    }

    private Value collect(LibraryCall call) {
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
}
