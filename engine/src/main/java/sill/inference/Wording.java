package sill.inference;

import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.IdentifierTree;
import java.util.HashMap;
import java.util.Map;
import javax.lang.model.element.Element;
import javax.lang.model.element.ElementKind;

/** Puts operands into words: their source, what they measure, and where that comes from. */
final class Wording {
    private static final int LONGEST = 40;

    private final SheetTree tree;
    private final Seeds seeds;
    private final Map<Element, Integer> setAt = new HashMap<>();
    private final Map<Element, Integer> calledAt = new HashMap<>();

    Wording(SheetTree tree, Seeds seeds) {
        this.tree = tree;
        this.seeds = seeds;
    }

    /** Notes where a variable was first set. */
    void set(Element variable, int offset) {
        setAt.putIfAbsent(variable, offset);
    }

    /** Notes the call that a parameter has its value from, for as long as the method's body is inferred for it. */
    void called(Element parameter, int offset) {
        calledAt.put(parameter, offset);
    }

    /** Such as {@code vSupply (V, given on line 9)}; a bare number stands for itself. */
    String said(Operand operand) {
        ExpressionTree expression = SheetTree.bare(operand.tree());
        String text = tree.text(expression, LONGEST);
        if (operand.quantity().kind() == Quantity.Kind.LITERAL && !(expression instanceof IdentifierTree)) {
            return text;
        }
        return text + " (" + operand.quantity().said() + origin(expression) + ")";
    }

    /** What an operand measures; a bare number is quoted. */
    String measure(Operand operand) {
        ExpressionTree expression = SheetTree.bare(operand.tree());
        if (operand.quantity().kind() == Quantity.Kind.LITERAL && !(expression instanceof IdentifierTree)) {
            return "a bare " + tree.text(expression, LONGEST);
        }
        return operand.quantity().said();
    }

    /** How to mend that a pure number stands where a unit is wanted; empty when that is not evident. */
    String mend(Operand pure, String unit) {
        ExpressionTree expression = SheetTree.bare(pure.tree());
        if (!pure.quantity().isMadeOfNumbers()) {
            return "";
        }
        if (!(expression instanceof IdentifierTree name)) {
            return pure.quantity().kind() == Quantity.Kind.LITERAL
                    ? "make " + tree.text(expression, LONGEST)
                            + " a given, or state its unit in the caption of a variable"
                    : "";
        }
        boolean result = tree.element(name).filter(tree::isField).isPresent();
        return result ? "state the unit of " + name.getName() + " in its caption: // [" + unit + "]" : "";
    }

    String text(ExpressionTree expression) {
        return tree.text(SheetTree.bare(expression), LONGEST);
    }

    private String origin(ExpressionTree expression) {
        if (!(expression instanceof IdentifierTree name)) {
            return "";
        }
        Element element = tree.element(name).orElse(null);
        if (element == null) {
            return "";
        }
        Seeds.GivenValue given =
                tree.isField(element) ? seeds.givens().get(name.getName().toString()) : null;
        if (given != null) {
            return ", given on line " + given.line();
        }
        if (element.getKind() == ElementKind.PARAMETER) {
            Integer call = calledAt.get(element);
            return call == null ? "" : ", from the call on line " + line(call);
        }
        Integer offset = setAt.get(element);
        return offset == null ? "" : ", set on line " + line(offset);
    }

    private int line(int offset) {
        return seeds.line().applyAsInt(offset);
    }
}
