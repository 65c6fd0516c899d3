package skytally.charts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;
import skytally.luminaire.IntensityDistribution;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;

@DisplayName("A fitting drawn from the side")
class TiltPictureTest {

    private static final Pattern POINT = Pattern.compile("L(-?[0-9.]+) (-?[0-9.]+)");

    private record Point(double x, double y) {}

    private static IntensityDistribution shape(String id) {
        return Shapes.byId(id).orElseThrow().distribution();
    }

    private static Document drawn(IntensityDistribution light, double tiltDeg) throws Exception {
        String svg = new TiltPicture(
                        "t",
                        light,
                        tiltDeg,
                        0,
                        "Type <A1> & more",
                        "It says \"so\"",
                        new TiltPicture.Words("level", tiltDeg == 0 ? "" : tiltDeg + "°", "ahead"))
                .svg();
        return DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new InputSource(new StringReader(svg)));
    }

    private static Optional<List<Point>> lobe(Document svg, String ink) {
        NodeList paths = svg.getElementsByTagName("path");
        for (int i = 0; i < paths.getLength(); i++) {
            Element path = (Element) paths.item(i);
            if (path.getAttribute("class").equals(ink)) {
                List<Point> points = new ArrayList<>();
                Matcher found = POINT.matcher(path.getAttribute("d"));
                while (found.find()) {
                    points.add(new Point(Double.parseDouble(found.group(1)), Double.parseDouble(found.group(2))));
                }
                return Optional.of(points);
            }
        }
        return Optional.empty();
    }

    private static double levelY(Document svg) {
        NodeList lines = svg.getElementsByTagName("line");
        for (int i = 0; i < lines.getLength(); i++) {
            Element line = (Element) lines.item(i);
            if (line.getAttribute("class").equals("app-tilt__level")) {
                return Double.parseDouble(line.getAttribute("y1"));
            }
        }
        throw new AssertionError("no level line");
    }

    /** A beam is strongest along its axis, which leans by its tilt from straight down toward the right. */
    @ParameterizedTest(name = "tilted {0}°")
    @CsvSource({"20", "64", "90", "120", "170"})
    void itsLongestLineIsItsAxis(double tiltDeg) throws Exception {
        Document svg = drawn(shape("beam-30"), tiltDeg);
        double y = levelY(svg);
        List<Point> all = new ArrayList<>();
        lobe(svg, "app-tilt__up").ifPresent(all::addAll);
        lobe(svg, "app-tilt__down").ifPresent(all::addAll);
        Point longest = all.stream()
                .max((a, b) -> Double.compare(Math.hypot(a.x - 170, a.y - y), Math.hypot(b.x - 170, b.y - y)))
                .orElseThrow();
        double turn = Math.toRadians(tiltDeg);
        assertThat(longest.x()).isCloseTo(170 + 116 * Math.sin(turn), within(1.2));
        assertThat(longest.y()).isCloseTo(y + 116 * Math.cos(turn), within(1.2));
    }

    @ParameterizedTest
    @MethodSource("skytally.luminaire.Shapes#all")
    void whatGoesAboveTheLevelIsInTheSecondInkAndNothingElseIs(Shape shape) throws Exception {
        for (double tiltDeg : new double[] {0, 30, 90, 150}) {
            Document svg = drawn(shape.distribution(), tiltDeg);
            double y = levelY(svg);
            double height = Double.parseDouble(
                    svg.getDocumentElement().getAttribute("viewBox").split(" ")[3]);
            lobe(svg, "app-tilt__up")
                    .ifPresent(up -> assertThat(up)
                            .allSatisfy(point -> assertThat(point.y()).isBetween(0.0, y + 0.06)));
            lobe(svg, "app-tilt__down")
                    .ifPresent(down -> assertThat(down)
                            .allSatisfy(point -> assertThat(point.y()).isBetween(y - 0.06, height)));
        }
        boolean up = lobe(drawn(shape.distribution(), 0), "app-tilt__up").isPresent();
        assertThat(up).isEqualTo(List.of("all-round", "diffuse-up", "narrow-up").contains(shape.id()));
    }

    @Test
    void namesItselfInWordsThatAreData() throws Exception {
        Document svg = drawn(shape("beam-60"), 64);
        Element root = svg.getDocumentElement();
        assertThat(root.getAttribute("role")).isEqualTo("img");
        assertThat(root.getAttribute("aria-labelledby")).isEqualTo("t-title t-says");
        assertThat(svg.getElementsByTagName("title").item(0).getTextContent()).isEqualTo("Type <A1> & more");
        assertThat(svg.getElementsByTagName("desc").item(0).getTextContent()).isEqualTo("It says \"so\"");
        assertThat(root.getTextContent()).contains("level", "64.0°", "ahead");
    }
}
