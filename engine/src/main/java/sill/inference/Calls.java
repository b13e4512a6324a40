package sill.inference;

import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.LiteralTree;
import com.sun.source.tree.MemberReferenceTree;
import com.sun.source.tree.MemberSelectTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.NewClassTree;
import com.sun.source.tree.Tree;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.lang.model.element.Element;
import javax.lang.model.element.ElementKind;
import javax.lang.model.element.ExecutableElement;
import javax.lang.model.element.Modifier;
import javax.lang.model.element.TypeElement;
import sill.units.Dimension;

/** Finds who knows what a call gives: mathematics, the worksheet's own methods, the helpers, or Java's library. */
final class Calls {
    private static final String TABLE_COLUMN = "sill.stdlib.Table.column";

    private final SheetTree tree;
    private final Seeds seeds;
    private final Walker walker;
    private final MathRules math;
    private final Behaviours behaviours;
    private final HelperUnits helpers;
    private final MethodBodies bodies;
    private final Library library;

    Calls(SheetTree tree, Seeds seeds, Fields fields, Wording wording, SlipLog log, Targets targets, Walker walker) {
        this.tree = tree;
        this.seeds = seeds;
        this.walker = walker;
        Rules rules = new Rules(tree, wording, log);
        math = new MathRules(rules, new Constants(tree));
        behaviours = new Behaviours(tree, wording, log, walker, this);
        helpers = new HelperUnits(rules, wording, behaviours);
        bodies = new MethodBodies(tree, fields, wording, log, targets, walker, helpers);
        library = new Library(tree, rules, behaviours, targets);
    }

    Behaviours behaviours() {
        return behaviours;
    }

    MethodBodies bodies() {
        return bodies;
    }

    /** A call by its name. */
    Value call(MethodInvocationTree call, Environment env) {
        ExpressionTree select = SheetTree.bare(call.getMethodSelect());
        Element element = tree.element(call).orElse(null);
        ExpressionTree target = null;
        Value receiver = env.frame().self;
        if (select instanceof MemberSelectTree member) {
            boolean isStatic = element == null || element.getModifiers().contains(Modifier.STATIC);
            target = isStatic ? null : member.getExpression();
            receiver = isStatic ? Quantity.UNKNOWN : walker.value(target, env);
        }
        List<Operand> arguments = operands(call.getArguments(), env);
        if (!(element instanceof ExecutableElement method)) {
            return Quantity.UNKNOWN;
        }
        if (qualified(method).equals(TABLE_COLUMN)) {
            return column(target, call.getArguments().get(0));
        }
        return call(method, receiver, Optional.ofNullable(target), arguments, call, env);
    }

    /** A constructor's call. */
    Value make(NewClassTree made, Environment env) {
        List<Operand> arguments = operands(made.getArguments(), env);
        if (made.getClassBody() != null || !(tree.element(made).orElse(null) instanceof ExecutableElement method)) {
            return Quantity.UNKNOWN;
        } else if (bodies.own(method)) {
            return bodies.call(method, Quantity.UNKNOWN, arguments, made, env);
        } else if (HelperUnits.own(method)) {
            return helpers.call(method, arguments, made);
        }
        return library.make(owner(method), arguments);
    }

    /** A method reference, called. */
    Value refer(MemberReferenceTree reference, Behaviour behaviour, List<Operand> arguments, Tree call) {
        if (!(tree.element(reference).orElse(null) instanceof ExecutableElement method)) {
            return Quantity.UNKNOWN;
        } else if (method.getKind() == ElementKind.CONSTRUCTOR) {
            return bodies.own(method)
                    ? bodies.call(method, Quantity.UNKNOWN, arguments, call, behaviour.captured())
                    : HelperUnits.own(method) ? helpers.call(method, arguments, call) : Quantity.UNKNOWN;
        }
        boolean isStatic = method.getModifiers().contains(Modifier.STATIC);
        boolean unbound = !isStatic && arguments.size() > method.getParameters().size();
        Value receiver = unbound ? arguments.get(0).value() : behaviour.receiver();
        List<Operand> rest = unbound ? arguments.subList(1, arguments.size()) : arguments;
        Optional<ExpressionTree> target =
                unbound || isStatic ? Optional.empty() : Optional.of(reference.getQualifierExpression());
        return call(method, receiver, target, rest, call, behaviour.captured());
    }

    private Value call(
            ExecutableElement method,
            Value receiver,
            Optional<ExpressionTree> target,
            List<Operand> arguments,
            Tree call,
            Environment env) {
        if (MathRules.own(owner(method))) {
            return math.call(method.getSimpleName().toString(), arguments, call);
        } else if (bodies.own(method)) {
            return bodies.call(method, receiver, arguments, call, env);
        } else if (isAccessor(method)) {
            Value part = receiver instanceof Components record
                    ? record.part(method.getSimpleName().toString())
                    : Quantity.UNKNOWN;
            return part.equals(Quantity.UNKNOWN) ? helpers.call(method, arguments, call) : part;
        } else if (HelperUnits.own(method)) {
            return helpers.call(method, arguments, call);
        }
        return library.call(new LibraryCall(
                owner(method), method.getSimpleName().toString(), target, receiver, arguments, call, env));
    }

    private List<Operand> operands(List<? extends ExpressionTree> expressions, Environment env) {
        List<Operand> operands = new ArrayList<>();
        expressions.forEach(expression -> operands.add(walker.operand(expression, env)));
        return operands;
    }

    /** A table's column measures what its header says. */
    private Value column(ExpressionTree table, ExpressionTree name) {
        Seeds.GivenValue given = table == null
                ? null
                : tree.element(SheetTree.bare(table))
                        .filter(tree::isField)
                        .map(element ->
                                seeds.givens().get(element.getSimpleName().toString()))
                        .orElse(null);
        if (given != null && SheetTree.bare(name) instanceof LiteralTree literal) {
            Dimension dimension = given.columns().get(String.valueOf(literal.getValue()));
            return dimension == null ? Quantity.UNKNOWN : Quantity.of(dimension);
        }
        return Quantity.UNKNOWN;
    }

    private static boolean isAccessor(ExecutableElement method) {
        return method.getParameters().isEmpty()
                && method.getEnclosingElement() instanceof TypeElement type
                && type.getKind() == ElementKind.RECORD
                && type.getRecordComponents().stream()
                        .anyMatch(component -> component.getSimpleName().equals(method.getSimpleName()));
    }

    private static String owner(ExecutableElement method) {
        return method.getEnclosingElement() instanceof TypeElement type
                ? type.getQualifiedName().toString()
                : "";
    }

    private static String qualified(ExecutableElement method) {
        return owner(method) + "." + method.getSimpleName();
    }
}
