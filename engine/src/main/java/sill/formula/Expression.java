package sill.formula;

import java.util.List;
import sill.units.PrintedQuantity;

/** What a line of Java means as mathematics. All numbers are in coherent SI. */
public sealed interface Expression {
    /** A number as it is typed. */
    record Literal(String text, double value) implements Expression {}

    /** A number of mathematics. */
    enum Constant implements Expression {
        PI("π", Math.PI),
        E("e", Math.E);

        private final String letter;
        private final double value;

        Constant(String letter, double value) {
            this.letter = letter;
            this.value = value;
        }

        String letter() {
            return letter;
        }

        double value() {
            return value;
        }
    }

    record Truth(boolean value) implements Expression {}

    record Text(String text) implements Expression {}

    /** A given, a result, or a parameter within the form of a call. */
    record Name(String name) implements Expression {}

    /** What is printed in a name's place where the numbers are put in. */
    record Shown(PrintedQuantity printed) implements Expression {}

    record Negation(Expression of) implements Expression {}

    /** The four operations. */
    enum Operator {
        PLUS,
        MINUS,
        TIMES,
        OVER
    }

    /** An operation on real numbers: a division of whole numbers is none. */
    record Arithmetic(Operator operator, Expression left, Expression right) implements Expression {}

    /** How two numbers are compared. */
    enum Relation {
        LESS("<"),
        AT_MOST("≤"),
        GREATER(">"),
        AT_LEAST("≥"),
        EQUAL("="),
        NOT_EQUAL("≠");

        private final String sign;

        Relation(String sign) {
            this.sign = sign;
        }

        String sign() {
            return sign;
        }
    }

    record Comparison(Relation relation, Expression left, Expression right) implements Expression {}

    /** How two statements are joined. */
    enum Connective {
        AND,
        OR
    }

    record Logic(Connective connective, Expression left, Expression right) implements Expression {}

    record Not(Expression of) implements Expression {}

    /** Which case of a choice applies. */
    enum Applies {
        /** The numbers are not put in. */
        OPEN,
        FIRST,
        SECOND
    }

    /** One value when a condition holds, else the other. */
    record Choice(Expression condition, Expression first, Expression second, Applies applies) implements Expression {}

    record Function(MathFunction function, List<Expression> arguments) implements Expression {
        public Function {
            arguments = List.copyOf(arguments);
        }
    }

    /** A term, added up over the values of a parameter that takes any number of them. */
    record Sum(Expression term, String over) implements Expression {}

    /**
     * A call of something that has no form.
     *
     * @param qualifier the constant it is asked of, as {@code E96}; empty for none
     */
    record Call(String name, String qualifier, List<Expression> arguments) implements Expression {
        public Call {
            arguments = List.copyOf(arguments);
        }
    }

    /**
     * A call whose value is told by a form in its parameters.
     *
     * @param parameters for a method of a record, the record's components; the one argument is then the record
     * @param forms one, or one for each component of the value
     */
    record Defined(Kind kind, String name, List<Parameter> parameters, List<Expression> arguments, List<Form> forms)
            implements Expression {
        public Defined {
            parameters = List.copyOf(parameters);
            arguments = List.copyOf(arguments);
            forms = List.copyOf(forms);
        }
    }

    /** What is called. */
    enum Kind {
        /** A static method of the stdlib: the units of its parameters are known. */
        HELPER,
        /** A method of a record of the stdlib. */
        OF_RECORD,
        /** A method of the worksheet. */
        METHOD,
        /** A record's constructor that keeps its arguments as they are. */
        RECORD
    }

    /**
     * A parameter.
     *
     * @param unit coherent SI unit symbol; empty when unknown
     * @param several whether it takes any number of values
     */
    record Parameter(String name, String unit, boolean several) {}

    /**
     * The value of a call, or of a component of its value.
     *
     * @param component empty for the value itself
     * @param body in the names of the parameters and of the sheet
     * @param unit coherent SI unit symbol; empty when unknown
     */
    record Form(String component, Expression body, String unit) {}

    /** A component of a record. */
    record Component(Expression of, String name) implements Expression {}

    /** An element of an array, counted from 0. */
    record Element(Expression of, Expression index) implements Expression {}
}
