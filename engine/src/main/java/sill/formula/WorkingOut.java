package sill.formula;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import sill.formula.Expression.Component;
import sill.formula.Expression.Defined;
import sill.formula.Expression.Kind;
import sill.formula.Expression.Name;
import sill.formula.Expression.Shown;

/**
 * Works a result out: puts the numbers in with as many digits as it takes for the printed formula, evaluated with the printed
 * numbers, to give the result to the digits that are printed of it. A line that no number of digits makes agree is not shown.
 */
public final class WorkingOut {
    /** Significant digits of a result, and the fewest of the numbers it is made from. */
    private static final int DIGITS = 4;

    /** With so many digits a decimal number is read back as the same {@code double}. */
    private static final int ALL_DIGITS = 17;

    private static final int MOST_LINES = 12;

    /** Larger formulas are no reading matter. */
    private static final int MOST_PARTS = 150;

    private final String name;
    private final Expression expression;
    private final Values values;
    private final PrintedResult result;

    private WorkingOut(String name, Expression expression, Values values, PrintedResult result) {
        this.name = name;
        this.expression = expression;
        this.values = values;
        this.result = result;
    }

    /**
     * The working of a result.
     *
     * @param name empty for a bare expression
     * @return empty when there is nothing to show but its source
     */
    public static Optional<Working> of(String name, Expression expression, Values values, PrintedResult result) {
        return new WorkingOut(name, expression, values, result).working();
    }

    private Optional<Working> working() {
        try {
            for (int digits = DIGITS; digits < ALL_DIGITS; digits++) {
                Optional<Working> working = new Attempt(digits).working();
                if (working.isPresent()) {
                    return working;
                }
            }
            return new Attempt(ALL_DIGITS).working();
        } catch (Substitution.TooLarge e) {
            return Optional.empty();
        }
    }

    /** A try with so many digits. */
    private final class Attempt {
        private final Substitution numbers;
        private final Substitution exact = Substitution.of(values, ALL_DIGITS);
        private final Substitution symbols = Substitution.of(Symbols.ONLY, 0);
        private final int digits;
        private final List<Working.Line> lines = new ArrayList<>();
        private final Set<Defined> done = new HashSet<>();
        private boolean agrees = true;

        Attempt(int digits) {
            this.digits = digits;
            numbers = Substitution.of(values, digits);
        }

        Optional<Working> working() {
            Expression left = name.isEmpty() ? null : new Name(name);
            add(left, expression, numbers.in(expression), "", result.shown(""));
            calls(expression, numbers, exact, true);
            return agrees ? Optional.of(new Working(lines)) : Optional.empty();
        }

        /** Adds a line and holds its numbers against what is shown of its value. */
        private void add(Expression left, Expression formula, Expression closed, String component, String shown) {
            OptionalDouble value = Evaluation.of(closed, values);
            agrees &= value.isEmpty()
                    || shown.isEmpty()
                    || result.shown(component, value.getAsDouble()).equals(shown);
            line(left, formula, closed, shown);
        }

        private void line(Expression left, Expression formula, Expression closed, String shown) {
            if (Math.max(size(formula), size(closed)) > MOST_PARTS) {
                agrees &= !lines.isEmpty();
                return;
            }
            boolean bare = formula instanceof Expression.Literal;
            lines.add(new Working.Line(
                    Optional.ofNullable(left),
                    formula instanceof Expression.Literal ? Optional.empty() : Optional.of(formula),
                    bare || closed instanceof Shown || Layout.side(closed).equals(Layout.side(formula))
                            ? Optional.empty()
                            : Optional.of(closed),
                    shown));
        }

        /** Lines of the calls in an expression, the inner ones first. */
        private void calls(Expression within, Substitution numbers, Substitution exact, boolean whole) {
            if (within instanceof Defined call) {
                call(call, "", numbers, exact, whole);
            } else if (within instanceof Component component && component.of() instanceof Defined call) {
                call(call, component.name(), numbers, exact, whole);
            } else {
                Parts.of(within).forEach(part -> calls(part, numbers, exact, false));
            }
        }

        private void call(Defined call, String component, Substitution numbers, Substitution exact, boolean whole) {
            call.arguments().forEach(argument -> calls(argument, numbers, exact, false));
            List<Expression> arguments = numbers.all(call.arguments());
            Defined closed = new Defined(call.kind(), call.name(), call.parameters(), arguments, List.of());
            if (lines.size() >= MOST_LINES || component.isEmpty() && !done.add(closed)) {
                return;
            }
            Map<String, List<Expression>> bound = numbers.bound(call, arguments);
            Map<String, List<Expression>> exactly = exact.bound(call, exact.all(call.arguments()));
            Map<String, List<Expression>> named = symbols.bound(call, call.arguments());
            if (call.kind() == Kind.HELPER) {
                bound = printed(call, bound);
            }
            boolean ofArguments = call.kind() == Kind.OF_RECORD || call.kind() == Kind.RECORD;
            for (Expression.Form form : call.forms()) {
                if (!component.isEmpty()
                        && !form.component().isEmpty()
                        && !form.component().equals(component)) {
                    continue;
                }
                Expression formula = ofArguments ? symbols.within(named).in(form.body()) : form.body();
                Expression put = numbers.within(bound).in(form.body());
                Expression precise = exact.within(exactly).in(form.body());
                if (whole && (component.isEmpty() || form.component().equals(component))) {
                    // The record prints this value already.
                    String of = component.isEmpty() ? form.component() : "";
                    add(left(call, form, component.isEmpty()), formula, put, of, result.shown(of));
                } else {
                    inner(left(call, form, false), form, formula, put, precise);
                }
                if (call.kind() == Kind.METHOD) {
                    calls(form.body(), numbers.within(bound), exact.within(exactly), false);
                }
            }
        }

        /** A line of a value that the record does not print elsewhere; without a unit the value is left out. */
        private void inner(
                Expression left, Expression.Form form, Expression formula, Expression put, Expression precise) {
            OptionalDouble value = Evaluation.of(precise, values);
            String shown = "";
            if (isUnit(form.unit()) && value.isPresent()) {
                shown = text(value.getAsDouble(), form.unit());
                OptionalDouble printed = Evaluation.of(put, values);
                agrees &= printed.isPresent()
                        && text(printed.getAsDouble(), form.unit()).equals(shown);
            }
            line(left, formula, put, shown);
        }

        private String text(double value, String unit) {
            return values.quantity(value, unit, DIGITS).text();
        }

        private Expression left(Defined call, Expression.Form form, boolean named) {
            if (call.kind() == Kind.OF_RECORD) {
                return call;
            } else if (call.kind() == Kind.RECORD) {
                Name component = new Name(form.component());
                return named && !name.isEmpty() ? new Component(new Name(name), form.component()) : component;
            }
            List<Expression> names = new ArrayList<>();
            call.parameters().forEach(parameter -> names.add(new Name(parameter.name())));
            Defined head = new Defined(call.kind(), call.name(), call.parameters(), names, List.of());
            return form.component().isEmpty() ? head : new Component(head, form.component());
        }

        /** Arguments as numbers with the units of the parameters they are passed to. */
        private Map<String, List<Expression>> printed(Defined call, Map<String, List<Expression>> bound) {
            Map<String, List<Expression>> printed = new HashMap<>();
            for (Expression.Parameter parameter : call.parameters()) {
                List<Expression> each = new ArrayList<>();
                for (Expression argument : bound.get(parameter.name())) {
                    each.add(isUnit(parameter.unit()) ? printed(argument, parameter.unit()) : argument);
                }
                printed.put(parameter.name(), each);
            }
            return printed;
        }

        private Expression printed(Expression argument, String unit) {
            if (argument instanceof Shown shown && !shown.printed().unit().isEmpty()) {
                return argument;
            }
            OptionalDouble value = Evaluation.of(argument, values);
            return value.isEmpty() ? argument : new Shown(values.quantity(value.getAsDouble(), unit, digits));
        }
    }

    private static int size(Expression expression) {
        int size = 1;
        for (Expression part : Parts.of(expression)) {
            size += size(part);
        }
        return size;
    }

    /** Whether a helper states this very unit: a question mark stands for any. */
    private static boolean isUnit(String symbol) {
        return !symbol.isEmpty() && symbol.charAt(0) != '?';
    }
}
