package sill.inference;

import com.sun.source.tree.ArrayAccessTree;
import com.sun.source.tree.AssignmentTree;
import com.sun.source.tree.BinaryTree;
import com.sun.source.tree.CompoundAssignmentTree;
import com.sun.source.tree.ConditionalExpressionTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.IdentifierTree;
import com.sun.source.tree.InstanceOfTree;
import com.sun.source.tree.LambdaExpressionTree;
import com.sun.source.tree.LiteralTree;
import com.sun.source.tree.MemberReferenceTree;
import com.sun.source.tree.MemberSelectTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.NewArrayTree;
import com.sun.source.tree.NewClassTree;
import com.sun.source.tree.ParenthesizedTree;
import com.sun.source.tree.SwitchExpressionTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.TypeCastTree;
import com.sun.source.tree.UnaryTree;
import com.sun.source.util.SimpleTreeVisitor;
import java.util.Set;
import javax.lang.model.element.Element;
import javax.lang.model.element.VariableElement;
import javax.lang.model.type.TypeMirror;
import sill.inference.Rules.Pairing;

/** The values of expressions. */
final class Expressions extends SimpleTreeVisitor<Value, Environment> {
    private static final Set<String> BOXED = Set.of(
            "java.lang.Double",
            "java.lang.Float",
            "java.lang.Integer",
            "java.lang.Long",
            "java.lang.Short",
            "java.lang.Byte",
            "java.lang.Character");

    private final SheetTree tree;
    private final Rules rules;
    private final Targets targets;
    private final Calls calls;
    private final Statements statements;
    private final Walker walker;

    Expressions(SheetTree tree, Rules rules, Targets targets, Calls calls, Statements statements, Walker walker) {
        super(Quantity.UNKNOWN);
        this.tree = tree;
        this.rules = rules;
        this.targets = targets;
        this.calls = calls;
        this.statements = statements;
        this.walker = walker;
    }

    private Value value(ExpressionTree expression, Environment env) {
        return walker.value(expression, env);
    }

    private Operand operand(ExpressionTree expression, Environment env) {
        return walker.operand(expression, env);
    }

    @Override
    public Value visitParenthesized(ParenthesizedTree parentheses, Environment env) {
        return value(parentheses.getExpression(), env);
    }

    @Override
    public Value visitLiteral(LiteralTree literal, Environment env) {
        if (literal.getValue() instanceof Number number) {
            return number.doubleValue() == 0 ? Quantity.ANY : Quantity.LITERAL;
        }
        return literal.getKind() == Tree.Kind.NULL_LITERAL ? Quantity.ANY : Quantity.UNKNOWN;
    }

    @Override
    public Value visitIdentifier(IdentifierTree name, Environment env) {
        if (name.getName().contentEquals("this")) {
            return env.frame().self;
        }
        return tree.element(name)
                .filter(VariableElement.class::isInstance)
                .map(element -> variable(element, env))
                .orElse(Quantity.UNKNOWN);
    }

    private Value variable(Element element, Environment env) {
        Value constant = LibraryConstants.value(element);
        return constant.equals(Quantity.UNKNOWN) ? targets.read(element, env) : constant;
    }

    @Override
    public Value visitMemberSelect(MemberSelectTree select, Environment env) {
        Element element = tree.element(select).orElse(null);
        if (!(element instanceof VariableElement)) {
            return Quantity.UNKNOWN;
        } else if (tree.isField(element)) {
            return targets.read(element, env);
        }
        Value constant = LibraryConstants.value(element);
        if (!constant.equals(Quantity.UNKNOWN)) {
            return constant;
        }
        Value whole = value(select.getExpression(), env);
        if (whole instanceof Components record) {
            return record.part(select.getIdentifier().toString());
        }
        boolean length = select.getIdentifier().contentEquals("length");
        return length ? Quantity.NUMBER : Quantity.UNKNOWN;
    }

    @Override
    public Value visitBinary(BinaryTree binary, Environment env) {
        Operand left = operand(binary.getLeftOperand(), env);
        Operand right = operand(binary.getRightOperand(), env);
        boolean numbers = isNumber(binary.getLeftOperand()) && isNumber(binary.getRightOperand());
        if (!numbers) {
            return Quantity.UNKNOWN;
        }
        return switch (binary.getKind()) {
            case MULTIPLY -> left.quantity().times(right.quantity());
            case DIVIDE -> left.quantity().over(right.quantity());
            case PLUS -> alike(left, right, Pairing.ADD);
            case MINUS -> alike(left, right, Pairing.SUBTRACT);
            case REMAINDER -> alike(left, right, Pairing.REMAINDER);
            case LESS_THAN -> compared(left, right, Pairing.LESS);
            case LESS_THAN_EQUAL -> compared(left, right, Pairing.LESS_EQUAL);
            case GREATER_THAN -> compared(left, right, Pairing.GREATER);
            case GREATER_THAN_EQUAL -> compared(left, right, Pairing.GREATER_EQUAL);
            case EQUAL_TO -> compared(left, right, Pairing.EQUAL);
            case NOT_EQUAL_TO -> compared(left, right, Pairing.UNEQUAL);
            default -> left.quantity().isMadeOfNumbers() ? left.quantity() : Quantity.UNKNOWN;
        };
    }

    private Quantity alike(Operand left, Operand right, Pairing pairing) {
        return rules.alike(left, right, pairing, tree.between(left.tree(), right.tree()));
    }

    private Quantity compared(Operand left, Operand right, Pairing pairing) {
        alike(left, right, pairing);
        return Quantity.UNKNOWN;
    }

    @Override
    public Value visitUnary(UnaryTree unary, Environment env) {
        Operand operand = operand(unary.getExpression(), env);
        return switch (unary.getKind()) {
            case UNARY_MINUS, UNARY_PLUS -> operand.value();
            case PREFIX_INCREMENT, POSTFIX_INCREMENT -> step(unary, operand, "a bare 1 is added to ", env);
            case PREFIX_DECREMENT, POSTFIX_DECREMENT -> step(unary, operand, "a bare 1 is subtracted from ", env);
            default -> Quantity.UNKNOWN;
        };
    }

    private Value step(UnaryTree unary, Operand operand, String words, Environment env) {
        Quantity before = operand.quantity();
        Quantity after = before;
        if (!before.fits(Quantity.LITERAL)) {
            rules.step(unary, operand, words);
            after = Quantity.UNKNOWN;
        } else if (before.kind() != Quantity.Kind.UNKNOWN) {
            after = before.join(Quantity.NUMBER);
        }
        targets.assign(unary.getExpression(), new Operand(after, unary), env);
        boolean prefix = unary.getKind() == Tree.Kind.PREFIX_INCREMENT || unary.getKind() == Tree.Kind.PREFIX_DECREMENT;
        return prefix ? after : before;
    }

    @Override
    public Value visitAssignment(AssignmentTree assignment, Environment env) {
        visitIndex(assignment.getVariable(), env);
        Operand given = operand(assignment.getExpression(), env);
        targets.assign(assignment.getVariable(), given, env);
        return given.value();
    }

    private void visitIndex(ExpressionTree target, Environment env) {
        if (SheetTree.bare(target) instanceof ArrayAccessTree access) {
            value(access.getIndex(), env);
        }
    }

    @Override
    public Value visitCompoundAssignment(CompoundAssignmentTree assignment, Environment env) {
        Operand left = operand(assignment.getVariable(), env);
        Operand right = operand(assignment.getExpression(), env);
        boolean numbers = isNumber(assignment.getVariable()) && isNumber(assignment.getExpression());
        Value result = !numbers
                ? Quantity.UNKNOWN
                : switch (assignment.getKind()) {
                    case MULTIPLY_ASSIGNMENT -> left.quantity().times(right.quantity());
                    case DIVIDE_ASSIGNMENT -> left.quantity().over(right.quantity());
                    case PLUS_ASSIGNMENT -> alike(left, right, Pairing.ADD_TO);
                    case MINUS_ASSIGNMENT -> alike(left, right, Pairing.SUBTRACT_FROM);
                    case REMAINDER_ASSIGNMENT -> alike(left, right, Pairing.REMAINDER_OF);
                    default -> left.quantity().isMadeOfNumbers() ? left.quantity() : Quantity.UNKNOWN;
                };
        targets.assign(assignment.getVariable(), new Operand(result, assignment), env);
        return result;
    }

    @Override
    public Value visitConditionalExpression(ConditionalExpressionTree choice, Environment env) {
        value(choice.getCondition(), env);
        Environment first = env.branch();
        Environment second = env.branch();
        Operand left = operand(choice.getTrueExpression(), first);
        Operand right = operand(choice.getFalseExpression(), second);
        env.takeEither(first, second);
        if (!isNumber(choice)) {
            return Value.join(left.value(), right.value());
        }
        int offset = tree.between(choice.getCondition(), choice.getTrueExpression());
        return rules.alike(left, right, Pairing.CHOOSE, offset);
    }

    @Override
    public Value visitSwitchExpression(SwitchExpressionTree choice, Environment env) {
        return statements.choose(choice, env);
    }

    @Override
    public Value visitTypeCast(TypeCastTree cast, Environment env) {
        return value(cast.getExpression(), env);
    }

    @Override
    public Value visitInstanceOf(InstanceOfTree test, Environment env) {
        Value tested = value(test.getExpression(), env);
        if (test.getPattern() instanceof com.sun.source.tree.BindingPatternTree pattern) {
            tree.element(pattern.getVariable()).ifPresent(variable -> env.set(variable, tested));
        }
        return Quantity.UNKNOWN;
    }

    @Override
    public Value visitArrayAccess(ArrayAccessTree access, Environment env) {
        value(access.getIndex(), env);
        return value(access.getExpression(), env);
    }

    @Override
    public Value visitNewArray(NewArrayTree array, Environment env) {
        array.getDimensions().forEach(size -> value(size, env));
        Value element = Quantity.ANY;
        if (array.getInitializers() != null) {
            for (ExpressionTree initializer : array.getInitializers()) {
                element = Value.join(element, value(initializer, env));
            }
        }
        return element;
    }

    @Override
    public Value visitNewClass(NewClassTree made, Environment env) {
        return calls.make(made, env);
    }

    @Override
    public Value visitMethodInvocation(MethodInvocationTree call, Environment env) {
        return calls.call(call, env);
    }

    @Override
    public Value visitLambdaExpression(LambdaExpressionTree lambda, Environment env) {
        return calls.behaviours().of(lambda, env);
    }

    @Override
    public Value visitMemberReference(MemberReferenceTree reference, Environment env) {
        return calls.behaviours().of(reference, value(reference.getQualifierExpression(), env), env);
    }

    private boolean isNumber(ExpressionTree expression) {
        return tree.type(expression).filter(Expressions::isNumber).isPresent();
    }

    private static boolean isNumber(TypeMirror type) {
        return switch (type.getKind()) {
            case DOUBLE, FLOAT, INT, LONG, SHORT, BYTE, CHAR -> true;
            case DECLARED -> BOXED.contains(type.toString());
            default -> false;
        };
    }
}
