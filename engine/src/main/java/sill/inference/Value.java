package sill.inference;

/** What is known of a value in the place of the value itself. Equal values are known to be alike. */
sealed interface Value permits Quantity, Components, Behaviour {

    /** What is known of a value that is one or the other. */
    static Value join(Value a, Value b) {
        if (a.equals(b) || b == Quantity.ANY) {
            return a;
        } else if (a == Quantity.ANY) {
            return b;
        } else if (a instanceof Quantity p && b instanceof Quantity q) {
            return p.join(q);
        } else if (a instanceof Components p && b instanceof Components q) {
            return p.join(q);
        }
        return Quantity.UNKNOWN;
    }

    /** The value as a quantity; unknown when it has parts or is code. */
    default Quantity quantity() {
        return this instanceof Quantity quantity ? quantity : Quantity.UNKNOWN;
    }
}
