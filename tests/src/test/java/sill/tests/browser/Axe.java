package sill.tests.browser;

import com.deque.html.axecore.results.CheckedNode;
import com.deque.html.axecore.results.Rule;
import com.deque.html.axecore.selenium.AxeBuilder;
import java.util.ArrayList;
import java.util.List;

/** axe-core: what stands in the way of people with a disability. */
final class Axe {
    private Axe() {}

    /** The violations on the page that is open, each with its place. */
    static List<String> violations(Browser browser) {
        List<String> found = new ArrayList<>();
        for (Rule rule : new AxeBuilder().analyze(browser.driver()).getViolations()) {
            for (CheckedNode node : rule.getNodes()) {
                found.add(rule.getId() + " " + node);
            }
        }
        return found;
    }
}
