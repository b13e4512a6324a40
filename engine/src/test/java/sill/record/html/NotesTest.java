package sill.record.html;

import static org.assertj.core.api.Assertions.assertThat;

import org.jsoup.Jsoup;
import org.jsoup.nodes.Element;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sill.markup.Markup;

class NotesTest {
    private static Element note(String commonMark) {
        Markup page = new Markup();
        Notes.write(page, commonMark);
        return Jsoup.parse(page.toString()).body();
    }

    /** Examples 378 and 328 of the CommonMark spec 0.31.2 (from memory), in one line. */
    @Test
    void commonMarkIsRead() {
        assertThat(note("**foo bar** `foo`").html()).contains("<p><strong>foo bar</strong> <code>foo</code></p>");
    }

    @Test
    void rawHtmlIsText() {
        Element note = note("<script>alert(1)</script>\n\nx <b onclick=y>z</b>");
        assertThat(note.select("script, b")).isEmpty();
        assertThat(note.text()).isEqualTo("<script>alert(1)</script> x <b onclick=y>z</b>");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "javascript:alert(1)",
                "JaVaScRiPt:alert(1)",
                "&#x6A;avascript:alert(1)",
                "data:text/html,x",
                "vbscript:x",
                "file:///etc/passwd",
                "//example.org/x",
                "relative.html",
                "http://[bad",
                "http:"
            })
    void aLinkThatCannotBeTrustedIsText(String destination) {
        Element note = note("[name](<" + destination + ">)");
        assertThat(note.select("a")).isEmpty();
        assertThat(note.text()).startsWith("name (");
    }

    @ParameterizedTest
    @ValueSource(strings = {"https://example.org/a?b=c#d", "http://example.org", "mailto:desk@example.org"})
    void aLinkToTheWebStays(String destination) {
        assertThat(note("[name](" + destination + ")").select("a").attr("href")).isEqualTo(destination);
    }

    @Test
    void anImageIsNotFetched() {
        Element note = note("![a *board*](https://example.org/b.png)");
        assertThat(note.select("img")).isEmpty();
        assertThat(note.text()).isEqualTo("a board (image https://example.org/b.png, not part of this record)");
    }

    @Test
    void headingsGoBelowTheCellsAndSkipNoLevel() {
        Element note = note("### a\n\n# b\n\n## c\n\n###### d");
        assertThat(note.select("h4, h5, h6").eachText()).containsExactly("a", "b", "c", "d");
        assertThat(note.select("h4, h5, h6").stream().map(Element::tagName)).containsExactly("h4", "h4", "h5", "h6");
    }

    @Test
    void hiddenCharactersAreShown() {
        assertThat(note("a\u202Eb `\u0007`").text()).isEqualTo("a[U+202E]b [U+0007]");
    }

    /** Nesting could exhaust the stack of a renderer that recurses. */
    @Test
    void deepNestingIsNoError() {
        assertThat(note(">".repeat(20_000) + " a").text()).endsWith("a");
        assertThat(note("*a **a ".repeat(20_000) + "a** a*".repeat(20_000)).text())
                .startsWith("*a **a");
        assertThat(note("![".repeat(5_000) + "](u)".repeat(5_000)).text()).contains("](u)");
        assertThat(note("[".repeat(50_000)).text()).startsWith("[[[");
        assertThat(note("*a ".repeat(50_000)).text()).startsWith("*a *a");
    }
}
