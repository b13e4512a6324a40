package sill.inference;

import java.util.HashMap;
import java.util.Map;
import javax.lang.model.element.Element;

/**
 * What is known of the local variables at a place in the code. A branch sees what was known before it and keeps what it
 * changes to itself until it is joined.
 */
final class Environment {
    private final Environment parent;
    private final Frame frame;
    private final boolean lambda;
    private final Map<Element, Value> own = new HashMap<>();

    /** The call that code runs in: its receiver, the offset it was called at (-1 for none), what it has returned so far. */
    static final class Frame {
        final Value self;
        final int calledAt;
        private Value returned = Quantity.ANY;

        Frame(Value self, int calledAt) {
            this.self = self;
            this.calledAt = calledAt;
        }

        void give(Value value) {
            returned = Value.join(returned, value);
        }

        Value returned() {
            return returned;
        }
    }

    private Environment(Environment parent, Frame frame, boolean lambda) {
        this.parent = parent;
        this.frame = frame;
        this.lambda = lambda;
    }

    /** That of a method's body. */
    static Environment ofBody(Frame frame) {
        return new Environment(null, frame, false);
    }

    /** That of a lambda's body, which sees the variables around it. */
    Environment ofLambda(Frame inner) {
        return new Environment(this, inner, true);
    }

    Environment branch() {
        return new Environment(this, frame, false);
    }

    Frame frame() {
        return frame;
    }

    /** Whether what happens here happens once and always, when the method runs. */
    boolean isOutermost() {
        return parent == null;
    }

    Value get(Element variable) {
        for (Environment at = this; at != null; at = at.parent) {
            Value value = at.own.get(variable);
            if (value != null) {
                return value;
            }
        }
        return Quantity.UNKNOWN;
    }

    void set(Element variable, Value value) {
        own.put(variable, value);
    }

    /** Something inside what a variable holds is changed: for a lambda's captured variable, outside the lambda too. */
    void alter(Element variable, Value value) {
        Environment at = this;
        for (Environment up = this; up != null && !up.own.containsKey(variable); up = up.parent) {
            if (up.lambda) {
                at = up.parent;
            }
        }
        at.set(variable, value);
    }

    /** Goes on as the branch ended. */
    void take(Environment branch) {
        own.putAll(branch.own);
    }

    /** Goes on as either branch ended. */
    void takeEither(Environment one, Environment other) {
        Map<Element, Value> joined = new HashMap<>();
        one.own.keySet().forEach(variable -> joined.put(variable, Value.join(one.get(variable), other.seen(variable))));
        other.own
                .keySet()
                .forEach(variable -> joined.put(variable, Value.join(one.seen(variable), other.get(variable))));
        own.putAll(joined);
    }

    /**
     * Goes on as it was, or as the branch ended.
     *
     * @return whether that changes anything
     */
    boolean takeToo(Environment branch) {
        boolean changed = false;
        for (Map.Entry<Element, Value> entry : branch.own.entrySet()) {
            Value before = seen(entry.getKey());
            Value after = Value.join(before, entry.getValue());
            if (!after.equals(before)) {
                set(entry.getKey(), after);
                changed = true;
            }
        }
        return changed;
    }

    /** As {@link #get}, with no claim on a variable that is not declared yet. */
    private Value seen(Element variable) {
        for (Environment at = this; at != null; at = at.parent) {
            if (at.own.containsKey(variable)) {
                return at.own.get(variable);
            }
        }
        return Quantity.ANY;
    }
}
