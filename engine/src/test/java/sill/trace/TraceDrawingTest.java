package sill.trace;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.StringReader;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

class TraceDrawingTest {
    private static Document parse(Trace trace) throws Exception {
        String svg = TraceDrawing.svg(trace, "t", "at-");
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
        assertThat(svg.getDocumentElement().getAttribute("aria-labelledby")).isEqualTo("t-title");
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
        assertThat(TraceDrawing.svg(Traces.of("given a"), "t", "")).contains("rx=\"0\"");
        assertThat(TraceDrawing.svg(Traces.of("result a"), "t", "")).contains("rx=\"10\"");
        assertThat(TraceDrawing.svg(Traces.of("plot a"), "t", "").split("class=\"box\""))
                .hasSize(3);
        assertThat(TraceDrawing.svg(Traces.of("check a"), "t", "")).doesNotContain("<rect");
    }

    @Test
    void theSameTraceIsTheSameDrawing() {
        assertThat(TraceDrawing.svg(Traces.ofSize(60, 3), "t", "at-"))
                .isEqualTo(TraceDrawing.svg(Traces.ofSize(60, 3), "t", "at-"));
    }
}
