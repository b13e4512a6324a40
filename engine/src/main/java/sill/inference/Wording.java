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
        String text = text(expression);
        if (operand.quantity().kind() == Quantity.Kind.LITERAL && !(expression instanceof IdentifierTree)) {
            return text;
        }
        return text + " (" + operand.quantity().said() + origin(expression) + ")";
    }

    /** What an operand measures; a bare number is quoted. */
    String measure(Operand operand) {
        ExpressionTree expression = SheetTree.bare(operand.tree());
        if (operand.quantity().kind() == Quantity.Kind.LITERAL && !(expression instanceof IdentifierTree)) {
            return "a bare " + text(expression);
        }
        return operand.quantity().said();
    }

    /** How to mend that a pure number stands where a unit is wanted; empty when that is not evident. */
    String mend(Operand pure, String unit) {
        ExpressionTree expression = SheetTree.bare(pure.tree());
        boolean named = expression instanceof IdentifierTree;
        if (named && pure.quantity().isMadeOfNumbers()) {
            boolean result = tree.element(expression).filter(tree::isField).isPresent();
            return result ? "State the unit of " + text(expression) + " in its caption: // [" + unit + "]." : "";
        } else if (named || pure.quantity().kind() != Quantity.Kind.LITERAL) {
            return "";
        } else if (unit.equals("K") && text(expression).equals("273.15")) {
            return "A temperature is shown in °C by its caption: // [°C].";
        }
        if (text(expression).equals("1")) {
            return "What is added to 1 must be a pure number: divide it by a value in " + unit
                    + ", or give its factors their units.";
        }
        return "Make " + text(expression) + " a given, or state its unit in the caption of a variable.";
    }

    /** An expression's source, its white space narrowed, cut when it is long. */
    private String text(ExpressionTree expression) {
        int start = tree.start(expression);
        int end = tree.end(expression);
        String text = start < 0 || end < start
                ? expression.toString()
                : seeds.places().text(start, end);
        String line = text.strip().replaceAll("\\s+", " ");
        return line.length() <= LONGEST ? line : line.substring(0, LONGEST - 1) + "…";
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
            boolean far = call != null && line(call) != line(tree.start(expression));
            return far ? ", from the call on line " + line(call) : "";
        }
        Integer offset = setAt.get(element);
        return offset == null ? "" : ", set on line " + line(offset);
    }

    private int line(int offset) {
        return seeds.places().line(offset);
    }
}
