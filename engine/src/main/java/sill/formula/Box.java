package sill.formula;

import java.util.ArrayList;
import java.util.List;

/** A formula laid out in two dimensions, in the terms of presentation MathML. */
sealed interface Box {
    /** What a token is. */
    enum Style {
        /** A variable of one letter, or a constant: MathML knows how to set it. */
        LETTER("mi"),
        /** A variable that is a word. */
        WORD("mi"),
        /** A function's name, an index that is a word: upright. */
        UPRIGHT("mi"),
        NUMBER("mn"),
        /** An operator between two operands. */
        BETWEEN("mo"),
        /** A sign before its operand. */
        BEFORE("mo"),
        OPENING("mo"),
        CLOSING("mo"),
        COMMA("mo"),
        /** Nothing to see: what stands before is applied to what follows. */
        APPLICATION("mo"),
        TEXT("mtext");

        private final String element;

        Style(String element) {
            this.element = element;
        }

        String element() {
            return element;
        }
    }

    /**
     * A token.
     *
     * @param name the Java name that it is the symbol of, or the symbol's base; empty for other tokens
     */
    record Token(Style style, String text, String name) implements Box {
        Token(Style style, String text) {
            this(style, text, "");
        }
    }

    /**
     * Boxes side by side.
     *
     * @param group whether they stay together as one operand: brackets then reach as high as what they hold
     */
    record Row(List<Box> boxes, boolean group) implements Box {
        public Row {
            boxes = List.copyOf(boxes);
        }

        /** A row of boxes, in which other rows dissolve that are no groups. */
        static Row of(Box... boxes) {
            List<Box> flat = new ArrayList<>();
            for (Box box : boxes) {
                if (box instanceof Row row && !row.group()) {
                    flat.addAll(row.boxes());
                } else {
                    flat.add(box);
                }
            }
            return new Row(flat, false);
        }

        Row grouped() {
            return new Row(boxes, true);
        }
    }

    record Fraction(Box top, Box bottom) implements Box {}

    record Raised(Box base, Box exponent) implements Box {}

    record Lowered(Box base, Box index) implements Box {}

    /** A root; the degree is empty for the square root. */
    record Root(Box body, String degree) implements Box {}

    /** Cases, each a row of cells: value, condition, and where it is known a word for the one that applies. */
    record Cases(List<List<Box>> rows) implements Box {
        public Cases {
            rows = List.copyOf(rows);
        }
    }

    /** About how wide it is, in digits. */
    default double width() {
        if (this instanceof Token token) {
            int length = token.text().codePointCount(0, token.text().length());
            return token.style() == Style.BETWEEN ? length + 1.2 : length;
        } else if (this instanceof Row row) {
            return sum(row.boxes());
        } else if (this instanceof Fraction fraction) {
            return Math.max(fraction.top().width(), fraction.bottom().width()) + 0.5;
        } else if (this instanceof Raised raised) {
            return raised.base().width() + 0.75 * raised.exponent().width();
        } else if (this instanceof Lowered lowered) {
            return lowered.base().width() + 0.75 * lowered.index().width();
        } else if (this instanceof Root root) {
            return root.body().width() + 1.5;
        }
        double widest = 0;
        for (List<Box> row : ((Cases) this).rows()) {
            widest = Math.max(widest, sum(row) + row.size() + 1);
        }
        return widest;
    }

    private static double sum(List<Box> boxes) {
        double width = 0;
        for (Box box : boxes) {
            width += box.width();
        }
        return width;
    }
}
