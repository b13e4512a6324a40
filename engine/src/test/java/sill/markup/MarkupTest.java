package sill.markup;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatIllegalStateException;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.jsoup.Jsoup;
import org.jsoup.nodes.Element;
import org.junit.jupiter.api.Test;

class MarkupTest {
    @Test
    void textAndAttributesAreEscaped() {
        Markup markup = new Markup()
                .open("p", "title", "a\"b'<c>&amp;")
                .text("x < y & \"z\"")
                .close();
        assertThat(markup).hasToString("<p title=\"a&quot;b&#39;&lt;c&gt;&amp;amp;\">x &lt; y &amp; &quot;z&quot;</p>");
    }

    @Test
    void elementsCloseInTurn() {
        Markup markup = new Markup()
                .open("ul")
                .leaf("li", "1", "class", "a")
                .close()
                .single("hr")
                .shape("path", "d", "M0 0");
        assertThat(markup).hasToString("<ul><li class=\"a\">1</li></ul><hr><path d=\"M0 0\"/>");
    }

    @Test
    void anOpenElementIsOurError() {
        Markup markup = new Markup().open("ul").open("li");
        assertThatIllegalStateException()
                .isThrownBy(markup::toString)
                .withMessage("elements must be closed, still open: [li, ul]");
    }

    @Test
    void anAttributeWithoutValueIsOurError() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Markup().open("p", "class"))
                .withMessage("attributes must be names and values in turn, got 1 texts");
    }

    @Test
    void attributesMayFollow() {
        Markup markup = new Markup()
                .open("p", "class", "a")
                .with("title", "<")
                .text("b")
                .close();
        assertThat(markup).hasToString("<p class=\"a\" title=\"&lt;\">b</p>");
        assertThatIllegalStateException()
                .isThrownBy(() -> markup.with("id", "c"))
                .withMessage("an attribute must follow its start tag, got id after content");
    }

    /** jsoup, which reads as browsers do, finds one element with the text and the attribute that went in. */
    @Property
    void noTextBecomesMarkup(@ForAll String text) {
        Element body = Jsoup.parse(
                        new Markup().leaf("pre", "." + text, "title", text).toString())
                .body();
        assertThat(body.getAllElements()).hasSize(2);
        assertThat(body.child(0).wholeText()).isEqualTo("." + VisibleText.of(text));
        assertThat(body.child(0).attr("title")).isEqualTo(VisibleText.of(text));
    }
}
