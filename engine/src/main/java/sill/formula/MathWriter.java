package sill.formula;

import java.util.ArrayList;
import java.util.List;
import sill.formula.Box.Row;
import sill.formula.Box.Style;
import sill.formula.Box.Token;
import sill.markup.Markup;

/**
 * Writes a formula as presentation MathML. A long one becomes several elements side by side, so that a line of text can break
 * between them as it does between words; browsers do not break inside one.
 */
public final class MathWriter {
    /** Where the names of a formula are set. */
    @FunctionalInterface
    public interface Places {
        /** The id of the place where a name is set; empty for a name that leads nowhere. */
        String of(String name);
    }

    private static final Places NOWHERE = name -> "";

    /** A shorter formula stays whole. */
    private static final int SHORT = 16;

    /** A longer piece is broken inside its brackets too. */
    private static final int LONG_PIECE = 36;

    private final Markup page;
    private final Places places;

    private MathWriter(Markup page, Places places) {
        this.page = page;
        this.places = places;
    }

    /** Writes the first side of an equation. */
    public static void first(Markup page, Expression expression) {
        first(page, expression, NOWHERE);
    }

    /** Writes the first side of an equation, each name with its place for a class. */
    public static void first(Markup page, Expression expression, Places places) {
        new MathWriter(page, places).write(pieces(Layout.side(expression)));
    }

    /** Writes a further side with its equals sign, from which no line break parts it. */
    public static void next(Markup page, Expression expression) {
        next(page, expression, NOWHERE);
    }

    /** Writes a further side with its equals sign, each name with its place for a class. */
    public static void next(Markup page, Expression expression, Places places) {
        List<List<Box>> pieces = new ArrayList<>(pieces(Layout.side(expression)));
        List<Box> start = new ArrayList<>(pieces.get(0));
        start.add(0, new Token(Style.BETWEEN, "="));
        pieces.set(0, start);
        new MathWriter(page, places).write(pieces);
    }

    /** Whether a formula writes a name letter by letter as Java does: without an index, and not as a Greek letter. */
    public static boolean isAsTyped(String name) {
        return Symbol.of(name).equals(new Symbol(name, ""));
    }

    private void write(List<List<Box>> pieces) {
        for (int i = 0; i < pieces.size(); i++) {
            if (i > 0) {
                page.single("wbr");
            }
            page.open("math");
            pieces.get(i).forEach(box -> write(box));
            page.close();
        }
    }

    private static List<List<Box>> pieces(Box box) {
        List<Box> row = box instanceof Row whole ? whole.boxes() : List.of(box);
        return box.width() <= SHORT ? List.of(row) : split(row);
    }

    /** Breaks before operators and behind commas. */
    private static List<List<Box>> split(List<Box> row) {
        List<List<Box>> pieces = new ArrayList<>();
        List<Box> piece = new ArrayList<>();
        boolean comma = false;
        for (Box box : row) {
            boolean operator = box instanceof Token token && token.style() == Style.BETWEEN;
            if ((operator || comma) && !piece.isEmpty()) {
                pieces.add(piece);
                piece = new ArrayList<>();
            }
            comma = box instanceof Token token && token.style() == Style.COMMA;
            piece.add(box);
        }
        pieces.add(piece);
        List<List<Box>> all = new ArrayList<>();
        for (List<Box> each : pieces) {
            all.addAll(opened(each));
        }
        return all;
    }

    /** A long piece, broken inside its brackets. */
    private static List<List<Box>> opened(List<Box> piece) {
        boolean groups = piece.stream().anyMatch(box -> box instanceof Row);
        if (!groups || new Row(piece, false).width() <= LONG_PIECE) {
            return List.of(piece);
        }
        List<Box> open = new ArrayList<>();
        for (Box box : piece) {
            if (box instanceof Row row) {
                open.addAll(row.boxes());
            } else {
                open.add(box);
            }
        }
        return split(open);
    }

    private void write(Box box) {
        if (box instanceof Token token) {
            token(token, false);
        } else if (box instanceof Row row) {
            boolean tall = row.boxes().stream().anyMatch(MathWriter::isTall);
            page.open("mrow");
            row.boxes().forEach(each -> write(each, tall));
            page.close();
        } else if (box instanceof Box.Fraction fraction) {
            element("mfrac", List.of(one(fraction.top()), one(fraction.bottom())));
        } else if (box instanceof Box.Raised raised) {
            element("msup", List.of(one(raised.base()), one(raised.exponent())));
        } else if (box instanceof Box.Lowered lowered) {
            element("msub", List.of(one(lowered.base()), one(lowered.index())));
        } else if (box instanceof Box.Root root) {
            if (root.degree().isEmpty()) {
                element("msqrt", List.of(root.body()));
            } else {
                element("mroot", List.of(one(root.body()), new Token(Style.NUMBER, root.degree())));
            }
        } else if (box instanceof Box.Cases cases) {
            cases(cases);
        }
    }

    /** Writes a box of a row; brackets grow with a row that is tall, and with no other: not every font does that well. */
    private void write(Box box, boolean tall) {
        if (box instanceof Token token) {
            token(token, tall);
        } else {
            write(box);
        }
    }

    private static boolean isTall(Box box) {
        if (box instanceof Row row) {
            return row.boxes().stream().anyMatch(MathWriter::isTall);
        } else if (box instanceof Box.Raised raised) {
            return isTall(raised.base());
        }
        return box instanceof Box.Fraction || box instanceof Box.Cases;
    }

    private void element(String name, List<Box> boxes) {
        page.open(name);
        boxes.forEach(box -> write(box));
        page.close();
    }

    /** A row of one box is that box. */
    private static Box one(Box box) {
        return box instanceof Row row && row.boxes().size() == 1 ? row.boxes().get(0) : box;
    }

    private void cases(Box.Cases cases) {
        page.open("mrow").leaf("mo", "{", "form", "prefix").open("mtable", "class", "cases");
        for (List<Box> row : cases.rows()) {
            page.open("mtr");
            row.forEach(cell -> element("mtd", List.of(cell)));
            page.close();
        }
        page.close().close();
    }

    private void token(Token token, boolean tall) {
        String place = token.name().isEmpty() ? "" : places.of(token.name());
        page.open(token.style().element());
        switch (token.style()) {
            case WORD -> page.with("class", place.isEmpty() ? "word" : "word " + place);
            case LETTER -> {
                if (!place.isEmpty()) {
                    page.with("class", place);
                }
            }
            case UPRIGHT -> {
                if (token.text().codePointCount(0, token.text().length()) == 1) {
                    page.with("mathvariant", "normal");
                }
            }
            // Told outright, since a piece may begin or end with it.
            case BETWEEN -> page.with("form", "infix");
            case BEFORE -> page.with("form", "prefix");
            case OPENING -> page.with("form", "prefix").with("stretchy", String.valueOf(tall));
            case CLOSING -> page.with("form", "postfix").with("stretchy", String.valueOf(tall));
            default -> {
                // The element's own rules are right.
            }
        }
        if (token.style() == Style.APPLICATION) {
            page.trusted("&#x2061;");
        } else {
            page.text(token.text());
        }
        page.close();
    }
}
