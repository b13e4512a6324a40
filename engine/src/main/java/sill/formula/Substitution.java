package sill.formula;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import sill.formula.Expression.Applies;
import sill.formula.Expression.Arithmetic;
import sill.formula.Expression.Component;
import sill.formula.Expression.Defined;
import sill.formula.Expression.Element;
import sill.formula.Expression.Kind;
import sill.formula.Expression.Name;

/**
 * Puts something in the place of names: numbers for those of the sheet, arguments for parameters. A call's form is treated
 * alike, so that what comes out can be evaluated as it stands.
 */
final class Substitution {
    /** Forms within forms multiply; far more than any line that is read has. */
    static final int MOST_NODES = 5000;

    private final Values values;
    private final int digits;
    private final Map<String, List<Expression>> parameters;
    private final int[] nodes;

    private Substitution(Values values, int digits, Map<String, List<Expression>> parameters, int[] nodes) {
        this.values = values;
        this.digits = digits;
        this.parameters = parameters;
        this.nodes = nodes;
    }

    /** The substitution of the sheet's names. */
    static Substitution of(Values values, int digits) {
        return new Substitution(values, digits, Map.of(), new int[1]);
    }

    /** The same within a form, whose parameters stand for expressions that are done already. */
    Substitution within(Map<String, List<Expression>> arguments) {
        return new Substitution(values, digits, arguments, nodes);
    }

    /** An expression has become too large. */
    static final class TooLarge extends RuntimeException {
        private static final long serialVersionUID = 1;

        TooLarge() {
            super("more than " + MOST_NODES + " parts", null, false, false);
        }
    }

    Expression in(Expression expression) {
        if (++nodes[0] > MOST_NODES) {
            throw new TooLarge();
        }
        if (expression instanceof Name name) {
            return name(name);
        } else if (expression instanceof Expression.Negation negation) {
            return new Expression.Negation(in(negation.of()));
        } else if (expression instanceof Arithmetic arithmetic) {
            return new Arithmetic(arithmetic.operator(), in(arithmetic.left()), in(arithmetic.right()));
        } else if (expression instanceof Expression.Function function) {
            return new Expression.Function(function.function(), all(function.arguments()));
        } else if (expression instanceof Expression.Comparison comparison) {
            return new Expression.Comparison(comparison.relation(), in(comparison.left()), in(comparison.right()));
        } else if (expression instanceof Expression.Logic logic) {
            return new Expression.Logic(logic.connective(), in(logic.left()), in(logic.right()));
        } else if (expression instanceof Expression.Not not) {
            return new Expression.Not(in(not.of()));
        } else if (expression instanceof Expression.Choice choice) {
            return choice(choice);
        } else if (expression instanceof Expression.Sum sum) {
            return sum(sum);
        } else if (expression instanceof Expression.Call call) {
            return new Expression.Call(call.name(), call.qualifier(), all(call.arguments()));
        } else if (expression instanceof Defined call) {
            return call(call);
        } else if (expression instanceof Component component) {
            Expression of = in(component.of());
            return looked(new Component(of, component.name()), of, component.name());
        } else if (expression instanceof Element element) {
            return element(element);
        }
        return expression;
    }

    /** Counts an argument wherever it is put in: shared parts cost memory once and time each time. */
    private void count(Expression expression) {
        if (++nodes[0] > MOST_NODES) {
            throw new TooLarge();
        }
        Parts.of(expression).forEach(this::count);
        if (expression instanceof Defined call) {
            call.forms().forEach(form -> count(form.body()));
        }
    }

    List<Expression> all(List<Expression> expressions) {
        List<Expression> done = new ArrayList<>();
        for (Expression expression : expressions) {
            done.add(in(expression));
        }
        return done;
    }

    private Expression name(Name name) {
        List<Expression> argument = parameters.get(name.name());
        if (argument != null) {
            argument.forEach(this::count);
            return argument.size() == 1 ? argument.get(0) : name;
        }
        return values.inPlaceOf(name.name(), List.of(), digits).orElse(name);
    }

    private Expression choice(Expression.Choice choice) {
        Expression condition = in(choice.condition());
        OptionalDouble holds = Evaluation.of(condition, values);
        Applies applies = holds.isEmpty() ? Applies.OPEN : holds.getAsDouble() != 0 ? Applies.FIRST : Applies.SECOND;
        return new Expression.Choice(condition, in(choice.first()), in(choice.second()), applies);
    }

    private Expression sum(Expression.Sum sum) {
        List<Expression> several = parameters.get(sum.over());
        if (several == null || several.isEmpty()) {
            return sum;
        }
        Expression total = null;
        for (Expression each : several) {
            Map<String, List<Expression>> one = new HashMap<>(parameters);
            one.put(sum.over(), List.of(each));
            Expression term = within(one).in(sum.term());
            total = total == null ? term : new Arithmetic(Expression.Operator.PLUS, total, term);
        }
        return total;
    }

    private Expression call(Defined call) {
        List<Expression> arguments = all(call.arguments());
        Substitution inside = within(bound(call, arguments));
        List<Expression.Form> forms = new ArrayList<>();
        for (Expression.Form form : call.forms()) {
            forms.add(new Expression.Form(form.component(), inside.in(form.body()), form.unit()));
        }
        return new Defined(call.kind(), call.name(), call.parameters(), arguments, forms);
    }

    /** What the parameters of a call stand for, given its arguments as they are after the substitution. */
    Map<String, List<Expression>> bound(Defined call, List<Expression> arguments) {
        Map<String, List<Expression>> bound = new HashMap<>();
        for (int i = 0; i < call.parameters().size(); i++) {
            Expression.Parameter parameter = call.parameters().get(i);
            if (call.kind() == Kind.OF_RECORD) {
                Expression record = arguments.get(0);
                Component component = new Component(record, parameter.name());
                bound.put(parameter.name(), List.of(looked(component, record, parameter.name())));
            } else if (parameter.several()) {
                bound.put(parameter.name(), arguments.subList(i, arguments.size()));
            } else {
                bound.put(parameter.name(), List.of(arguments.get(i)));
            }
        }
        return bound;
    }

    private Expression element(Element element) {
        Expression of = in(element.of());
        Expression index = in(element.index());
        OptionalDouble number = Evaluation.of(index, values);
        Element done = new Element(of, index);
        return number.isEmpty() ? done : looked(done, of, Long.toString((long) number.getAsDouble()));
    }

    /** The number that a step into a value leads to, or the step itself. */
    private Expression looked(Expression step, Expression of, String key) {
        List<String> path = new ArrayList<>();
        path.add(key);
        Expression root = of;
        while (!(root instanceof Name)) {
            if (root instanceof Component component) {
                path.add(0, component.name());
                root = component.of();
            } else if (root instanceof Element element) {
                OptionalDouble index = Evaluation.of(element.index(), values);
                if (index.isEmpty()) {
                    return step;
                }
                path.add(0, Long.toString((long) index.getAsDouble()));
                root = element.of();
            } else {
                return step;
            }
        }
        return values.inPlaceOf(((Name) root).name(), path, digits).orElse(step);
    }
}
