package sill.trace;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

class TraceDrawingTest {
    private static String svg(Trace trace) {
        return TraceDrawing.of(trace, "t").svg("at-");
    }

    private static Document parse(Trace trace) throws Exception {
        String svg = svg(trace);
        return DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new InputSource(new StringReader(svg)));
    }

    @Test
    void eachBoxLeadsToItsAddress() throws Exception {
        NodeList links = parse(Traces.ofSize(60, 3)).getElementsByTagName("a");
        assertThat(links.getLength()).isEqualTo(60);
        for (int i = 0; i < 60; i++) {
            assertThat(((Element) links.item(i)).getAttribute("href")).isEqualTo("#at-1." + (i + 1));
        }
    }

    @Test
    void itSaysWhatItShows() throws Exception {
        Document svg = parse(Traces.of("given a", "given b", "result c = a", "plot d = c", "check e = c"));
        assertThat(svg.getElementsByTagName("title").item(0).getTextContent())
                .isEqualTo("Trace of givens, results, plots and checks");
        assertThat(svg.getElementsByTagName("desc").item(0).getTextContent())
                .isEqualTo("Lines lead from what is used, on the left, to what uses it: 2 givens, 1 result, 1 plot,"
                        + " 1 check. Each box leads to its line.");
        Element whole = (Element) svg.getElementsByTagName("g").item(0);
        assertThat(whole.getAttribute("role")).isEqualTo("group");
        assertThat(whole.getAttribute("aria-labelledby")).isEqualTo("t-title");
        assertThat(whole.getAttribute("aria-describedby")).isEqualTo("t-desc");
    }

    @Test
    void aBoxHasNameAddressAndValue() throws Exception {
        Element box =
                (Element) parse(Traces.of("given a")).getElementsByTagName("a").item(0);
        assertThat(box.getAttribute("class")).isEqualTo("node node-given alone");
        assertThat(box.getElementsByTagName("text").item(0).getTextContent()).isEqualTo("a");
        assertThat(box.getElementsByTagName("text").item(1).getTextContent()).isEqualTo("1.1 · 1.5 V");
        assertThat(box.getElementsByTagName("title").getLength()).isZero();
    }

    @Test
    void whatDoesNotFitIsInTheTitle() throws Exception {
        TraceNode node = new TraceNode(
                TraceKind.CHECK, "2.1", "", "a < b && \"x\" ".repeat(9).strip(), "holds", List.of(), List.of());
        Element box = (Element)
                parse(Trace.of(List.of(node))).getElementsByTagName("a").item(0);
        assertThat(box.getElementsByTagName("text").item(0).getTextContent()).endsWith("…");
        assertThat(box.getElementsByTagName("title").item(0).getTextContent()).isEqualTo(node.label() + ", 2.1, holds");
    }

    @Test
    void kindsDifferInShape() {
        assertThat(svg(Traces.of("given a"))).contains("rx=\"0\"");
        assertThat(svg(Traces.of("result a"))).contains("rx=\"10\"");
        assertThat(svg(Traces.of("plot a")).split("class=\"box\"")).hasSize(3);
        assertThat(svg(Traces.of("check a"))).doesNotContain("<rect");
    }

    @Test
    void boxesOfAKindAreAGroupAndSayWhatTheyAreMadeFrom() throws Exception {
        Document svg = parse(Traces.of("given a", "given b", "result c = a b", "plot d = c", "check e = c"));
        List<String> groups = new ArrayList<>();
        NodeList found = svg.getElementsByTagName("g");
        for (int i = 0; i < found.getLength(); i++) {
            Element group = (Element) found.item(i);
            groups.add(group.getAttribute("aria-label") + " "
                    + group.getElementsByTagName("a").getLength());
        }
        assertThat(groups).containsExactly(" 5", "Givens 2", "Results 1", "Plots 1", "Checks 1");
        NodeList links = svg.getElementsByTagName("a");
        assertThat(((Element) links.item(0)).getElementsByTagName("desc").getLength())
                .isZero();
        assertThat(((Element) links.item(2))
                        .getElementsByTagName("desc")
                        .item(0)
                        .getTextContent())
                .isEqualTo("made from a, b");
    }

    @Test
    void aPartShowsASpanOfTheWhole() {
        Trace trace = Traces.ofSize(60, 3);
        TraceSheets sheets = TraceSheets.of(TraceLayout.of(trace));
        List<String> parts = TraceDrawing.of(trace, "t").parts();
        assertThat(parts).hasSameSizeAs(sheets.parts()).hasSizeGreaterThan(1);
        assertThat(parts.get(0))
                .startsWith("<svg class=\"trace-part\" viewBox=\"0 0 ")
                .endsWith("<use href=\"#t-whole\"/></svg>");
        assertThat(svg(trace)).contains("class=\"trace-drawing wide parted\"").contains("<g id=\"t-whole\" ");
        assertThat(TraceDrawing.of(Traces.of("given a"), "t").parts()).isEmpty();
        assertThat(svg(Traces.of("given a"))).contains("class=\"trace-drawing\"");
    }

    @Test
    void theSameTraceIsTheSameDrawing() {
        assertThat(svg(Traces.ofSize(60, 3))).isEqualTo(svg(Traces.ofSize(60, 3)));
    }
}
