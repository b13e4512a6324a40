package sill.record.html;

import java.util.List;
import sill.formula.Expression;
import sill.formula.MathWriter;
import sill.formula.Working;
import sill.markup.Markup;

/** The working of a result: its sides as MathML, the forms of its calls beneath. */
final class Workings {
    /** An equals sign never ends a line: it goes with the side behind it. */
    private static final String EQUALS = " =\u00A0";

    /** Names of a helper's formula are its own, and numbers have none. */
    private static final MathWriter.Places NOWHERE = name -> "";

    private Workings() {}

    /** Name, formula and numbers, up to the equals sign before the result; the formula's names tell where they are set. */
    static void line(Markup page, Working.Line line, MathWriter.Places places) {
        line.left().ifPresent(left -> first(page, "name", left, NOWHERE));
        line.formula().ifPresent(formula -> {
            if (line.left().isPresent()) {
                next(page, "formula", formula, places);
            } else {
                first(page, "formula", formula, places);
            }
        });
        line.numbers().ifPresent(numbers -> next(page, "numbers", numbers, NOWHERE));
        boolean first = line.left().isEmpty()
                && line.formula().isEmpty()
                && line.numbers().isEmpty();
        page.text(first ? "" : EQUALS);
    }

    /** The lines of the calls. */
    static void beneath(Markup page, Working working) {
        List<Working.Line> lines = working.lines().subList(1, working.lines().size());
        if (lines.isEmpty()) {
            return;
        }
        page.open("div", "class", "beneath");
        for (Working.Line line : lines) {
            page.open("div", "class", "by");
            line.left().ifPresent(left -> first(page, "name", left, NOWHERE));
            line.formula().ifPresent(formula -> next(page, "formula", formula, NOWHERE));
            line.numbers().ifPresent(numbers -> next(page, "numbers", numbers, NOWHERE));
            if (!line.shown().isEmpty()) {
                page.text(EQUALS).leaf("span", line.shown(), "class", "number");
            }
            page.close();
        }
        page.close();
    }

    private static void first(Markup page, String kind, Expression expression, MathWriter.Places places) {
        page.open("span", "class", "side " + kind);
        MathWriter.first(page, expression, places);
        page.close();
    }

    private static void next(Markup page, String kind, Expression expression, MathWriter.Places places) {
        page.single("wbr").open("span", "class", "side " + kind);
        MathWriter.next(page, expression, places);
        page.close();
    }
}
