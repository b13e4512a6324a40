package sill.inference;

import java.util.ArrayList;
import java.util.List;

/** What a call of the library does with what it is given: it calls functions, and fills containers. */
final class LibraryUses {
    private final Behaviours behaviours;
    private final Targets targets;

    LibraryUses(Behaviours behaviours, Targets targets) {
        this.behaviours = behaviours;
        this.targets = targets;
    }

    /** What an argument gives when it is called; unknown when it is no code that can be seen. */
    Value applied(LibraryCall call, int function, Value... values) {
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

    /** Adds an argument to the container it is called on, and gives that argument. */
    Value added(LibraryCall call, int argument) {
        return addedTo(call, call.argument(argument));
    }

    Value addedTo(LibraryCall call, Value element) {
        call.target().ifPresent(target -> targets.add(target, element, call.env()));
        return element;
    }

    /** Adds an element to a container that is an argument. */
    void fill(LibraryCall call, int argument, Value element) {
        targets.add(call.arguments().get(argument).tree(), element, call.env());
    }
}
