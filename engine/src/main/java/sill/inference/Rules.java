package sill.inference;

import com.sun.source.tree.Tree;
import com.sun.source.tree.UnaryTree;
import java.util.List;
import sill.units.Dimension;

/** What operations demand of their operands, and the slips where that is not met. */
final class Rules {
    private final SheetTree tree;
    private final Wording wording;
    private final SlipLog log;

    Rules(SheetTree tree, Wording wording, SlipLog log) {
        this.tree = tree;
        this.wording = wording;
        this.log = log;
    }

    /** An operation on two operands of one dimension, in the words of its slip. */
    enum Pairing {
        ADD("%2$s is added to %1$s", " + "),
        SUBTRACT("%2$s is subtracted from %1$s", " - "),
        REMAINDER("%1$s is divided by %2$s for a remainder", " % "),
        LESS("%1$s is compared with %2$s", " < "),
        LESS_EQUAL("%1$s is compared with %2$s", " <= "),
        GREATER("%1$s is compared with %2$s", " > "),
        GREATER_EQUAL("%1$s is compared with %2$s", " >= "),
        EQUAL("%1$s is compared with %2$s", " == "),
        UNEQUAL("%1$s is compared with %2$s", " != "),
        CHOOSE("one branch gives %1$s, the other %2$s", " : "),
        ADD_TO("%2$s is added to %1$s", " += "),
        SUBTRACT_FROM("%2$s is subtracted from %1$s", " -= "),
        REMAINDER_OF("%1$s is divided by %2$s for a remainder", " %= ");

        private final String words;
        private final String sign;

        Pairing(String words, String sign) {
            this.words = words;
            this.sign = sign;
        }
    }

    /** Two operands of one dimension, which is the result's too. */
    Quantity alike(Operand left, Operand right, Pairing pairing, int offset) {
        Quantity a = left.quantity();
        Quantity b = right.quantity();
        if (a.fits(b)) {
            return sum(a, b);
        }
        slip(
                offset,
                left,
                right,
                String.format(pairing.words, wording.measure(left), wording.measure(right)) + ": " + wording.said(left)
                        + pairing.sign + wording.said(right));
        return Quantity.UNKNOWN;
    }

    /** Arguments of one dimension, which is the result's too. */
    Quantity alike(String function, List<Operand> arguments, Tree call) {
        Operand first = arguments.get(0);
        Quantity result = first.quantity();
        for (Operand next : arguments.subList(1, arguments.size())) {
            if (!result.fits(next.quantity())) {
                slip(
                        tree.start(call),
                        first,
                        next,
                        function + " is taken of " + wording.measure(first) + " and " + wording.measure(next) + ": "
                                + wording.said(first) + ", " + wording.said(next));
                return Quantity.UNKNOWN;
            }
            first = first.quantity().hasDimension() ? first : next;
            result = sum(result, next.quantity());
        }
        return result;
    }

    /** An argument that must be a pure number. */
    Quantity pure(String function, Operand argument) {
        Quantity quantity = argument.quantity();
        if (!quantity.hasDimension() || quantity.isPure()) {
            return quantity;
        }
        log.add(new Slip(
                "",
                tree.start(argument.tree()),
                pair(quantity, Quantity.LITERAL),
                function + " expects a pure number, found " + quantity.said() + ": " + wording.said(argument),
                "Divide by a reference value in " + quantity.said() + " first."));
        return Quantity.UNKNOWN;
    }

    /** A step by 1 of something that is no count. */
    void step(UnaryTree step, Operand operand, String words) {
        int start = tree.start(step);
        int inner = tree.start(step.getExpression());
        log.add(new Slip(
                "",
                inner > start ? start : tree.end(step.getExpression()),
                pair(operand.quantity(), Quantity.LITERAL),
                words + operand.quantity().said() + ": " + wording.said(operand),
                "Add a given with the unit " + operand.quantity().said() + " instead."));
    }

    /** A check whose limits measure something else than its expression. */
    void limit(Operand found, Dimension limit) {
        Quantity limits = Quantity.of(limit);
        String unit = found.quantity().said();
        String hint = limits.isPure()
                ? "Give the limit its unit, such as '1 " + unit + "'."
                : "Correct the expression, or give the limit "
                        + (found.quantity().isPure() ? "without a unit." : "in " + unit + ".");
        log.add(new Slip(
                "",
                tree.start(found.tree()),
                pair(found.quantity(), limits),
                "the limit is " + (limits.isPure() ? "a pure number" : "in " + limits.said()) + ", found "
                        + wording.said(found),
                hint));
    }

    /** An operand in words. */
    String said(Operand operand) {
        return wording.said(operand);
    }

    /** Logs a slip of two operands at an offset. */
    void slip(int offset, Operand left, Operand right, String message) {
        boolean leftLacks = left.quantity().isPure() && !right.quantity().isPure();
        boolean rightLacks = right.quantity().isPure() && !left.quantity().isPure();
        String hint = "";
        if (leftLacks) {
            hint = wording.mend(left, right.quantity().said());
        } else if (rightLacks) {
            hint = wording.mend(right, left.quantity().said());
        }
        log.add(new Slip("", offset, pair(left.quantity(), right.quantity()), message, hint));
    }

    /** Logs an argument or value that should measure something else. */
    void unfit(Operand operand, Dimension expected, String message, String hint) {
        String mend = hint.isEmpty() && operand.quantity().isPure() ? wording.mend(operand, expected.toString()) : hint;
        log.add(new Slip(
                "", tree.start(operand.tree()), pair(operand.quantity(), Quantity.of(expected)), message, mend));
    }

    static String pair(Quantity a, Quantity b) {
        return a.said() + " and " + b.said();
    }

    /** What is unknown stays so: an operand that slipped must not slip again. */
    private static Quantity sum(Quantity a, Quantity b) {
        if (a.kind() == Quantity.Kind.UNKNOWN || b.kind() == Quantity.Kind.UNKNOWN) {
            return Quantity.UNKNOWN;
        }
        return a.join(b);
    }
}
