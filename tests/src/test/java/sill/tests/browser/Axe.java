package sill.tests.browser;

import com.deque.html.axecore.results.CheckedNode;
import com.deque.html.axecore.results.Rule;
import com.deque.html.axecore.selenium.AxeBuilder;
import java.util.ArrayList;
import java.util.List;

/**
 * axe-core: what stands in the way of people with a disability. It still holds what is inside {@code math} to be hidden from
 * assistive technology, as WAI-ARIA 1.1 had it; WAI-ARIA 1.2 (section 5.4, role {@code math}; w3c/aria issue 425) has dropped
 * that, and browsers hand formulas on with their links. So a link in a formula, and nothing else, is let pass.
 */
final class Axe {
    private static final String HIDDEN_INSIDE = "nested-interactive";

    private Axe() {}

    /** The violations on the page that is open, each with its place. */
    static List<String> violations(Browser browser) {
        List<String> found = new ArrayList<>();
        for (Rule rule : new AxeBuilder().analyze(browser.driver()).getViolations()) {
            for (CheckedNode node : rule.getNodes()) {
                if (!rule.getId().equals(HIDDEN_INSIDE) || !node.getHtml().startsWith("<math")) {
                    found.add(rule.getId() + " " + node);
                }
            }
        }
        return found;
    }
}
