package sill.sheet;

import com.sun.source.tree.ArrayAccessTree;
import com.sun.source.tree.BinaryTree;
import com.sun.source.tree.ConditionalExpressionTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.IdentifierTree;
import com.sun.source.tree.LiteralTree;
import com.sun.source.tree.MemberSelectTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.NewClassTree;
import com.sun.source.tree.ParenthesizedTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.TypeCastTree;
import com.sun.source.tree.UnaryTree;
import com.sun.source.util.TreePath;
import com.sun.source.util.Trees;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import javax.lang.model.element.Element;
import javax.lang.model.element.ElementKind;
import javax.lang.model.type.TypeMirror;
import sill.formula.Expression;
import sill.formula.Expression.Arithmetic;
import sill.formula.Expression.Operator;

/**
 * Reads what an attributed expression means as mathematics. It is strict: what real numbers do not do the way Java does, as a
 * division of whole numbers, a cast, a change of a variable, has no mathematics here, and the record shows its source.
 */
final class FormulaReader {
    /** Deeper and larger expressions are no reading matter. */
    private static final int DEEPEST = 40;

    private static final int MOST_PARTS = 200;

    private final Trees trees;
    private final TreePath root;
    private final String text;
    private final CallReader calls;
    private final Set<String> names = new HashSet<>();
    private int depth;
    private int parts;

    /**
     * @param root path of the compilation unit
     * @param text the unit's text
     */
    FormulaReader(Trees trees, TreePath root, String text) {
        this.trees = trees;
        this.root = root;
        this.text = text;
        calls = new CallReader(trees, this);
    }

    /**
     * What a result's Java means.
     *
     * @param names the sheet's names it reads, also within the forms of calls
     */
    record Formula(Expression expression, Set<String> names) {}

    /** What an expression means; empty when it has no mathematics. */
    static Optional<Formula> read(Trees trees, TreePath root, String text, ExpressionTree tree) {
        FormulaReader reader = new FormulaReader(trees, root, text);
        try {
            Expression expression = reader.expression(tree);
            return Optional.of(new Formula(expression, Set.copyOf(reader.names)));
        } catch (NoMathematics e) {
            return Optional.empty();
        }
    }

    /** Java that has no mathematics. */
    static final class NoMathematics extends RuntimeException {
        private static final long serialVersionUID = 1;

        NoMathematics() {
            super("no mathematics", null, false, false);
        }
    }

    Expression expression(ExpressionTree tree) {
        if (depth >= DEEPEST || ++parts > MOST_PARTS) {
            throw new NoMathematics();
        }
        depth++;
        try {
            return kind(tree);
        } finally {
            depth--;
        }
    }

    /** An operand of arithmetic: a number that computes as a real one does. */
    Expression number(ExpressionTree tree) {
        if (!NumberTypes.isNumber(type(tree))) {
            throw new NoMathematics();
        }
        return expression(tree);
    }

    List<Expression> expressions(List<? extends ExpressionTree> trees) {
        List<Expression> list = new ArrayList<>();
        for (ExpressionTree tree : trees) {
            list.add(expression(tree));
        }
        return list;
    }

    TypeMirror type(Tree tree) {
        return trees.getTypeMirror(new TreePath(root, tree));
    }

    Element element(Tree tree) {
        Element element = trees.getElement(new TreePath(root, tree));
        if (element == null) {
            throw new NoMathematics();
        }
        return element;
    }

    private Expression kind(ExpressionTree tree) {
        if (tree instanceof ParenthesizedTree brackets) {
            return expression(brackets.getExpression());
        } else if (tree instanceof LiteralTree literal) {
            return literal(literal);
        } else if (tree instanceof IdentifierTree identifier) {
            return name(element(identifier));
        } else if (tree instanceof BinaryTree binary) {
            return binary(binary);
        } else if (tree instanceof UnaryTree unary) {
            return unary(unary);
        } else if (tree instanceof MethodInvocationTree call) {
            return calls.call(call);
        } else if (tree instanceof MemberSelectTree select) {
            return constant(element(select));
        } else if (tree instanceof ConditionalExpressionTree choice) {
            return new Expression.Choice(
                    expression(choice.getCondition()),
                    expression(choice.getTrueExpression()),
                    expression(choice.getFalseExpression()),
                    Expression.Applies.OPEN);
        } else if (tree instanceof ArrayAccessTree access) {
            return new Expression.Element(expression(access.getExpression()), number(access.getIndex()));
        } else if (tree instanceof TypeCastTree cast && NumberTypes.isDouble(type(cast))) {
            return number(cast.getExpression());
        } else if (tree instanceof NewClassTree made) {
            return calls.made(made);
        }
        throw new NoMathematics();
    }

    private Expression literal(LiteralTree literal) {
        Object value = literal.getValue();
        if (value instanceof Double number) {
            int start = (int) trees.getSourcePositions().getStartPosition(root.getCompilationUnit(), literal);
            int end = (int) trees.getSourcePositions().getEndPosition(root.getCompilationUnit(), literal);
            String typed = text.substring(start, end);
            boolean suffix = typed.endsWith("d") || typed.endsWith("D");
            return new Expression.Literal(suffix ? typed.substring(0, typed.length() - 1) : typed, number);
        } else if (value instanceof Integer || value instanceof Long) {
            double number = ((Number) value).doubleValue();
            if (value.toString().startsWith("-")) {
                // The compiler takes the sign of a whole number for a part of it.
                return new Expression.Negation(
                        new Expression.Literal(value.toString().substring(1), -number));
            }
            return new Expression.Literal(value.toString(), number);
        } else if (value instanceof Boolean truth) {
            return new Expression.Truth(truth);
        } else if (value instanceof String string) {
            return new Expression.Text(string);
        }
        throw new NoMathematics();
    }

    private Expression name(Element element) {
        String name = element.getSimpleName().toString();
        if (element.getKind() == ElementKind.PARAMETER && calls.isParameter(element)) {
            return new Expression.Name(name);
        }
        Element owner = element.getEnclosingElement();
        boolean sheet = owner != null && owner.getSimpleName().contentEquals(ClassText.NAME);
        if (sheet && element.getKind() == ElementKind.FIELD) {
            names.add(name);
            return new Expression.Name(name);
        }
        return constant(element);
    }

    private static Expression constant(Element element) {
        String owner = String.valueOf(element.getEnclosingElement());
        if (owner.equals("java.lang.Math") || owner.equals("java.lang.StrictMath")) {
            for (Expression.Constant constant : Expression.Constant.values()) {
                if (element.getSimpleName().contentEquals(constant.name())) {
                    return constant;
                }
            }
        }
        throw new NoMathematics();
    }

    private Expression unary(UnaryTree unary) {
        return switch (unary.getKind()) {
            case UNARY_MINUS -> new Expression.Negation(number(unary.getExpression()));
            case UNARY_PLUS -> number(unary.getExpression());
            case LOGICAL_COMPLEMENT -> new Expression.Not(expression(unary.getExpression()));
            default -> throw new NoMathematics();
        };
    }

    private Expression binary(BinaryTree binary) {
        return switch (binary.getKind()) {
            case PLUS -> arithmetic(Operator.PLUS, binary);
            case MINUS -> arithmetic(Operator.MINUS, binary);
            case MULTIPLY -> arithmetic(Operator.TIMES, binary);
            case DIVIDE -> {
                if (!NumberTypes.isDouble(type(binary))) {
                    throw new NoMathematics();
                }
                yield arithmetic(Operator.OVER, binary);
            }
            case LESS_THAN -> comparison(Expression.Relation.LESS, binary);
            case LESS_THAN_EQUAL -> comparison(Expression.Relation.AT_MOST, binary);
            case GREATER_THAN -> comparison(Expression.Relation.GREATER, binary);
            case GREATER_THAN_EQUAL -> comparison(Expression.Relation.AT_LEAST, binary);
            case EQUAL_TO -> equality(Expression.Relation.EQUAL, binary);
            case NOT_EQUAL_TO -> equality(Expression.Relation.NOT_EQUAL, binary);
            case CONDITIONAL_AND -> logic(Expression.Connective.AND, binary);
            case CONDITIONAL_OR -> logic(Expression.Connective.OR, binary);
            default -> throw new NoMathematics();
        };
    }

    private Expression arithmetic(Operator operator, BinaryTree binary) {
        return new Arithmetic(operator, number(binary.getLeftOperand()), number(binary.getRightOperand()));
    }

    private Expression comparison(Expression.Relation relation, BinaryTree binary) {
        return new Expression.Comparison(relation, number(binary.getLeftOperand()), number(binary.getRightOperand()));
    }

    /** Objects are compared by what they are, not by the numbers they hold. */
    private Expression equality(Expression.Relation relation, BinaryTree binary) {
        boolean primitive = type(binary.getLeftOperand()).getKind().isPrimitive()
                || type(binary.getRightOperand()).getKind().isPrimitive();
        if (!primitive) {
            throw new NoMathematics();
        }
        return comparison(relation, binary);
    }

    private Expression logic(Expression.Connective connective, BinaryTree binary) {
        return new Expression.Logic(
                connective, expression(binary.getLeftOperand()), expression(binary.getRightOperand()));
    }
}
