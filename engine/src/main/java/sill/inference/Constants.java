package sill.inference;

import com.sun.source.tree.BinaryTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.LiteralTree;
import com.sun.source.tree.TypeCastTree;
import com.sun.source.tree.UnaryTree;
import java.util.Optional;
import javax.lang.model.element.VariableElement;
import javax.lang.model.type.TypeKind;
import sill.units.Rational;

/** Numbers that the source alone tells. */
final class Constants {
    private static final int LARGEST_DENOMINATOR = 12;
    private static final double CLOSE = 1e-12;

    private final SheetTree tree;

    Constants(SheetTree tree) {
        this.tree = tree;
    }

    /** The fraction that an exponent stands for; empty when it is no constant, or none with a small denominator. */
    Optional<Rational> fraction(ExpressionTree expression) {
        double value = value(expression);
        for (int denominator = 1; denominator <= LARGEST_DENOMINATOR; denominator++) {
            double numerator = value * denominator;
            if (Math.abs(numerator) < 1000 && Math.abs(numerator - Math.rint(numerator)) < CLOSE) {
                return Optional.of(new Rational((int) Math.rint(numerator), denominator));
            }
        }
        return Optional.empty();
    }

    /** NaN when it is no constant. */
    private double value(ExpressionTree expression) {
        ExpressionTree inner = SheetTree.bare(expression);
        if (inner instanceof LiteralTree literal) {
            return literal.getValue() instanceof Number number ? number.doubleValue() : Double.NaN;
        } else if (inner instanceof TypeCastTree cast) {
            return value(cast.getExpression());
        } else if (inner instanceof UnaryTree unary) {
            double operand = value(unary.getExpression());
            return switch (unary.getKind()) {
                case UNARY_MINUS -> -operand;
                case UNARY_PLUS -> operand;
                default -> Double.NaN;
            };
        } else if (inner instanceof BinaryTree binary) {
            return value(binary);
        }
        return tree.element(inner)
                .filter(VariableElement.class::isInstance)
                .map(element -> ((VariableElement) element).getConstantValue())
                .filter(Number.class::isInstance)
                .map(number -> ((Number) number).doubleValue())
                .orElse(Double.NaN);
    }

    private double value(BinaryTree binary) {
        double left = value(binary.getLeftOperand());
        double right = value(binary.getRightOperand());
        boolean whole =
                tree.type(binary).filter(type -> type.getKind() == TypeKind.INT).isPresent();
        return switch (binary.getKind()) {
            case PLUS -> left + right;
            case MINUS -> left - right;
            case MULTIPLY -> left * right;
            // 1 / 2 of whole numbers is 0.
            case DIVIDE -> whole && right != 0 ? (int) (left / right) : left / right;
            default -> Double.NaN;
        };
    }
}
