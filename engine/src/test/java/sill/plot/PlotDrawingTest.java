package sill.plot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import javax.xml.parsers.DocumentBuilderFactory;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;
import sill.stdlib.Plot;

class PlotDrawingTest {
    private static final Plot.Axis TIME = new Plot.Axis("time", "s", Plot.Scale.LINEAR);
    private static final Plot.Axis VOLTAGE = new Plot.Axis("voltage", "V", Plot.Scale.LINEAR);

    private static Plot plot(Plot.Style style, double[] x, double[] y) {
        return new Plot(
                "Ramp <b>&",
                "Voltage over time \u202E",
                TIME,
                VOLTAGE,
                List.of(new Plot.Curve("ramp", style, false, x, y)),
                List.of(new Plot.Mark(Plot.Side.Y, 0.004, "limit", Plot.Role.LIMIT)));
    }

    private static Plot ramp() {
        return plot(Plot.Style.LINE, new double[] {0, 1, 2}, new double[] {0, 0.001, 0.005});
    }

    private static Document parse(String svg) throws Exception {
        return DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new InputSource(new StringReader(svg)));
    }

    private static List<Element> elements(Document svg, String name) {
        NodeList found = svg.getElementsByTagName(name);
        return IntStream.range(0, found.getLength())
                .mapToObj(i -> (Element) found.item(i))
                .toList();
    }

    private static Element curve(Document svg) {
        return elements(svg, "path").stream()
                .filter(path -> path.getAttribute("class").startsWith("curve"))
                .findFirst()
                .orElseThrow();
    }

    /** Left, right, top and bottom of the frame. */
    private static double[] frame(Document svg) {
        String path = elements(svg, "path").stream()
                .filter(element -> element.getAttribute("class").equals("frame"))
                .findFirst()
                .orElseThrow()
                .getAttribute("d");
        Matcher parts = Pattern.compile("M(\\S+) (\\S+)H(\\S+)V(\\S+)H").matcher(path);
        assertThat(parts.lookingAt()).isTrue();
        return new double[] {
            Double.parseDouble(parts.group(1)),
            Double.parseDouble(parts.group(3)),
            Double.parseDouble(parts.group(2)),
            Double.parseDouble(parts.group(4))
        };
    }

    /** SVG 2, 5.8 and WAI-ARIA Graphics Module 1.0: title and description are the text alternative of an image. */
    @Test
    void itIsAnImageWithATextAlternative() throws Exception {
        Document svg = parse(PlotDrawing.svg(ramp(), "plot-3-1"));
        Element root = svg.getDocumentElement();
        assertThat(root.getAttribute("role")).isEqualTo("img");
        assertThat(root.getAttribute("aria-labelledby")).isEqualTo("plot-3-1-title plot-3-1-desc");
        assertThat(elements(svg, "title").get(0).getAttribute("id")).isEqualTo("plot-3-1-title");
        assertThat(elements(svg, "title").get(0).getTextContent()).isEqualTo("Ramp <b>&");
        assertThat(elements(svg, "desc").get(0).getTextContent()).isEqualTo("Voltage over time [U+202E]");
    }

    @Test
    void axesNameQuantityAndUnit() throws Exception {
        List<String> texts = elements(parse(PlotDrawing.svg(ramp(), "p")), "text").stream()
                .map(Element::getTextContent)
                .toList();
        assertThat(texts).contains("time / s", "voltage / mV", "limit 4\u00A0mV", "ramp", "5", "2.0");
    }

    @Test
    void pointsLieWhereTheirValuesAre() throws Exception {
        Document svg = parse(PlotDrawing.svg(ramp(), "p"));
        double[] frame = frame(svg);
        double left = frame[0];
        double width = frame[1] - left;
        double bottom = frame[3];
        double height = bottom - frame[2];
        String[] points = curve(svg).getAttribute("d").substring(1).split("L");
        assertThat(points).hasSize(3);
        // The vertical axis runs 5 % of 5 mV beyond both ends; half a tenth is lost in writing.
        double[] mid = coordinates(points[1]);
        assertThat(mid[0]).isCloseTo(left + width / 2, Offset.offset(0.1));
        assertThat(mid[1]).isCloseTo(bottom - height * (1 + 0.25) / 5.5, Offset.offset(0.1));
    }

    private static double[] coordinates(String point) {
        String[] parts = point.split(" ");
        return new double[] {Double.parseDouble(parts[0]), Double.parseDouble(parts[1])};
    }

    @Test
    void aGapIsAGapAndALonePointIsADot() throws Exception {
        double[] x = {0, 1, 2, 3, 4};
        double[] y = {1, 2, Double.NaN, 4, Double.POSITIVE_INFINITY};
        String path =
                curve(parse(PlotDrawing.svg(plot(Plot.Style.LINE, x, y), "p"))).getAttribute("d");
        assertThat(path).matches("M[0-9. ]+L[0-9. ]+M[0-9. ]+h0");
    }

    @Test
    void aStepRunsLevelThenUp() throws Exception {
        double[] x = {0, 1, 2};
        double[] y = {0, 1, 0};
        String path =
                curve(parse(PlotDrawing.svg(plot(Plot.Style.STEP, x, y), "p"))).getAttribute("d");
        String[] points = path.substring(1).split("L");
        assertThat(points).hasSize(5);
        assertThat(coordinates(points[1])[1]).isEqualTo(coordinates(points[0])[1]);
        assertThat(coordinates(points[2])[0]).isEqualTo(coordinates(points[1])[0]);
    }

    @Test
    void aLongCurveStaysSmallAndKeepsItsSpike() throws Exception {
        int length = 1_000_000;
        double[] x = IntStream.range(0, length).mapToDouble(i -> i * 1e-6).toArray();
        double[] y = IntStream.range(0, length)
                .mapToDouble(i -> StrictMath.sin(i * 0.37) * 0.001)
                .toArray();
        y[654_321] = 1;
        for (Plot.Style style : Plot.Style.values()) {
            String svg = PlotDrawing.svg(plot(style, x, y), "p");
            assertThat(svg.getBytes(StandardCharsets.UTF_8).length)
                    .as(style.name())
                    .isLessThan(200_000);
            double[] frame = frame(parse(svg));
            String spike = Px.text(frame[2] + (frame[3] - frame[2]) * 0.05 / 1.1);
            assertThat(curve(parse(svg)).getAttribute("d")).as(style.name()).containsPattern(" 5?" + spike + "\\D");
        }
    }

    @Test
    void noLocaleChangesIt() {
        String svg = PlotDrawing.svg(ramp(), "p");
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
            assertThat(PlotDrawing.svg(ramp(), "p")).isEqualTo(svg);
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void curvesDifferInDashAsWellAsColour() throws Exception {
        List<Plot.Curve> curves = IntStream.range(0, 5)
                .mapToObj(i -> new Plot.Curve("c" + i, Plot.Style.LINE, true, new double[] {0, 1}, new double[] {i, i}))
                .toList();
        Document svg = parse(PlotDrawing.svg(new Plot("t", "d", TIME, VOLTAGE, curves, List.of()), "p"));
        List<Element> drawn = elements(svg, "path").stream()
                .filter(path -> path.getAttribute("class").startsWith("curve"))
                .limit(5)
                .toList();
        assertThat(drawn).extracting(path -> path.getAttribute("stroke")).doesNotHaveDuplicates();
        assertThat(drawn)
                .extracting(path -> path.getAttribute("stroke-dasharray"))
                .doesNotHaveDuplicates();
        assertThat(elements(svg, "path").stream()
                        .filter(path -> path.getAttribute("class").startsWith("arrow")))
                .hasSize(5);
    }

    @Test
    void extremeValuesStillMakeADrawing() throws Exception {
        double[][] extremes = {
            {0, 0, 0},
            {5, 5, 5},
            {1e300, -1e300, 0},
            {Double.MAX_VALUE, 1, 2},
            {Double.MIN_VALUE, 0, Double.MIN_VALUE},
            {Double.NaN, Double.NaN, Double.NaN},
            {1, 1 + Math.ulp(1.0), 1}
        };
        for (double[] y : extremes) {
            String svg = PlotDrawing.svg(plot(Plot.Style.LINE, new double[] {0, 1, 2}, y), "p");
            assertThat(svg).doesNotContain("NaN", "Infinity").doesNotContainPattern("[0-9.]E[-+0-9]");
            parse(svg);
        }
        assertThat(PlotDrawing.svg(plot(Plot.Style.LINE, new double[] {0, 1, 2}, extremes[3]), "p"))
                .contains("1 point is outside what the axes can show");
    }

    @Test
    void theIdPrefixMustBeAnId() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> PlotDrawing.svg(ramp(), "3\" onload="))
                .withMessage("idPrefix must be a letter, then letters, digits and hyphens, got \"3\" onload=\"");
    }
}
