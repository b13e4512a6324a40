package sill.tests.formulas;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.jsoup.nodes.Element;

/**
 * MathML on one line, for people who read tests: {@code a/b} as {@code {a}/{b}}, an index behind {@code _}, an exponent behind
 * {@code ^}, cases as {@code {v if c; w otherwise}}.
 */
final class Linear {
    private Linear() {}

    static String text(List<Element> elements) {
        return joined(elements).replace('\u00A0', ' ').strip();
    }

    private static String joined(List<Element> elements) {
        StringBuilder text = new StringBuilder();
        for (Element element : elements) {
            text.append(text(element));
        }
        return text.toString();
    }

    private static String text(Element element) {
        List<Element> children = new ArrayList<>(element.children());
        return switch (element.tagName()) {
            case "mo" -> operator(element);
            case "mi", "mn", "mtext" -> element.wholeText();
            case "math", "mrow" -> joined(children);
            case "mfrac" -> braced(children.get(0)) + "/" + braced(children.get(1));
            case "msup" -> text(children.get(0)) + "^" + one(children.get(1));
            case "msub" -> text(children.get(0)) + "_" + one(children.get(1));
            case "msqrt" -> "√{" + text(children) + "}";
            case "mroot" -> one(children.get(1)) + "√" + braced(children.get(0));
            case "mtable" ->
                children.stream()
                                .map(row -> row.children().stream()
                                        .map(cell -> text(List.of(cell.child(0))))
                                        .collect(Collectors.joining(" ")))
                                .collect(Collectors.joining("; "))
                        + "}";
            default -> throw new IllegalArgumentException("not presentation MathML of ours: " + element.tagName());
        };
    }

    private static String operator(Element operator) {
        String sign = operator.wholeText();
        if (sign.equals("\u2061")) {
            return "";
        } else if (sign.equals(",")) {
            return ", ";
        }
        return operator.attr("form").equals("infix") ? " " + sign + " " : sign;
    }

    private static String one(Element element) {
        boolean token = element.childrenSize() == 0 || element.tagName().equals("mi");
        return token ? element.wholeText() : braced(element);
    }

    private static String braced(Element element) {
        return "{" + text(element).replace('\u00A0', ' ').strip() + "}";
    }
}
