package sill.tests.formulas;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.Element;

/**
 * A result's line on the page.
 *
 * @param at its address
 * @param own its own equation
 * @param components a record's components as they are shown
 * @param source the Java that is shown instead of a formula; empty when there is one
 * @param beneath the equations of its calls
 */
record PageLine(String at, Equation own, Map<String, String> components, String source, List<Equation> beneath) {
    /**
     * Sides of an equation, each a list of {@code math} elements; empty where the side is not there.
     *
     * @param shown the printed value; empty when it is no text of its own
     */
    record Equation(List<Element> name, List<Element> formula, List<Element> numbers, String shown) {
        /** The side with the numbers; the formula where that has none to put in. */
        List<Element> closed() {
            return numbers.isEmpty() ? formula : numbers;
        }

        String what() {
            return Linear.text(name) + " " + Linear.text(formula) + " " + Linear.text(numbers) + " = " + shown;
        }
    }

    static List<PageLine> of(Document page) {
        List<PageLine> lines = new ArrayList<>();
        for (Element line : page.select(".line:has(.equation)")) {
            Element equation = line.selectFirst(".equation");
            Element number = equation.selectFirst("> details > summary > .number");
            Map<String, String> components = new LinkedHashMap<>();
            for (Element component : equation.select("> details > summary .components > span")) {
                String name = component.selectFirst("var").text();
                components.put(name, component.wholeText().substring(name.length() + 1));
            }
            Element code = equation.selectFirst("> code");
            List<Equation> beneath = new ArrayList<>();
            for (Element by : equation.select("> .beneath > .by")) {
                Element shown = by.selectFirst("> .number");
                beneath.add(equation(by, shown == null ? "" : shown.wholeText()));
            }
            lines.add(new PageLine(
                    line.selectFirst(".address").text(),
                    equation(equation, number == null ? "" : number.wholeText()),
                    components,
                    code == null ? "" : code.wholeText(),
                    beneath));
        }
        return lines;
    }

    private static Equation equation(Element within, String shown) {
        return new Equation(
                within.select("> .name > math"),
                within.select("> .formula > math"),
                within.select("> .numbers > math"),
                shown);
    }

    boolean hasFormula() {
        return !own.formula().isEmpty();
    }
}
