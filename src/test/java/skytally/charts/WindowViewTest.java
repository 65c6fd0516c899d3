package skytally.charts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;
import skytally.assessment.SeenLamps.SeenLamp;
import skytally.charts.WindowView.Size;
import skytally.geometry.Position;

@DisplayName("The view from a window")
class WindowViewTest {

    /** Venus of magnitude -4.6 through 1.99 air masses of 0.20 mag each: 1.22e-4 lx at the eye. */
    private static final double VENUS_LX = 2.54e-6 * Math.pow(10, -0.4 * (-4.6 + 0.20 * 1.99429));

    private record Dot(double x, double y, double r) {}

    private static SeenLamp lamp(String type, double bearing, double altitude, double lux) {
        return new SeenLamp(type + "-1", type, new Position(bearing, altitude, 5), bearing, altitude, lux, lux);
    }

    private static String draw(Size size, SeenLamp... lamps) {
        return new WindowView("v", "The view", "In words", List.of(lamps), OptionalDouble.of(-1.5), type -> type, size)
                .svg();
    }

    private static Document read(String svg) {
        try {
            return DocumentBuilderFactory.newInstance()
                    .newDocumentBuilder()
                    .parse(new InputSource(new StringReader(svg)));
        } catch (Exception broken) {
            throw new AssertionError("The picture is not well formed: " + svg, broken);
        }
    }

    private static List<Element> all(Document svg, String element) {
        NodeList found = svg.getElementsByTagName(element);
        List<Element> elements = new ArrayList<>();
        for (int i = 0; i < found.getLength(); i++) {
            elements.add((Element) found.item(i));
        }
        return elements;
    }

    private static double number(Element element, String attribute) {
        return Double.parseDouble(element.getAttribute(attribute));
    }

    private static List<Dot> dots(Document svg, boolean reference) {
        return all(svg, "circle").stream()
                .filter(dot -> ((Element) dot.getParentNode()).hasAttribute("data-reference") == reference)
                .map(dot -> new Dot(number(dot, "cx"), number(dot, "cy"), number(dot, "r")))
                .toList();
    }

    private static Element words(Document svg, String words) {
        return all(svg, "text").stream()
                .filter(text -> text.getTextContent().replace(".0°", "°").equals(words))
                .findFirst()
                .orElseThrow(() -> new AssertionError("No " + words));
    }

    /** Where the border says a bearing stands, and where the level line is drawn: read off as a person would. */
    @ParameterizedTest
    @EnumSource
    void putsALampWhereTheScalesOnItsBorderSay(Size size) {
        Document svg = read(
                draw(size, lamp("A", 207.25, -1.25, 1e-4), lamp("B", 208.5, -1, 1e-4), lamp("C", 209, -0.5, 1e-4)));

        double at207 = number(words(svg, "207°"), "x");
        double at209 = number(words(svg, "209°"), "x");
        double level = number(words(svg, "0°"), "y");
        double below = number(words(svg, "−1°"), "y");
        double xPerDegree = (at209 - at207) / 2;
        double yPerDegree = below - level;
        assertThat(xPerDegree).as("one scale both ways").isCloseTo(yPerDegree, within(0.2));
        assertThat(dots(svg, false))
                .satisfiesExactlyInAnyOrder(
                        dot -> assertStandsAt(dot, at207 + 0.25 * xPerDegree, level - 4.5 + 1.25 * yPerDegree),
                        dot -> assertStandsAt(dot, at207 + 1.5 * xPerDegree, level - 4.5 + yPerDegree),
                        dot -> assertStandsAt(dot, at207 + 2 * xPerDegree, level - 4.5 + 0.5 * yPerDegree));
    }

    private static void assertStandsAt(Dot dot, double x, double y) {
        assertThat(dot.x()).isCloseTo(x, within(0.3));
        assertThat(dot.y()).isCloseTo(y, within(0.3));
    }

    @Test
    void givesEveryPointTheAreaOfItsLightOnTheScaleOfVenus() {
        Document svg = read(draw(Size.WIDE, lamp("A", 10, -1, 2 * VENUS_LX), lamp("B", 11, -1, VENUS_LX / 4)));

        assertThat(words(svg, "Venus").getTextContent()).isEqualTo("Venus");
        double venus = dots(svg, true).get(0).r();
        assertThat(dots(svg, false))
                .extracting(dot -> dot.r() * dot.r() / (venus * venus))
                .satisfiesExactly(
                        brighter -> assertThat(brighter).isCloseTo(2, within(0.01)),
                        fainter -> assertThat(fainter).isCloseTo(0.25, within(0.002)));
    }

    @Test
    void takesTheMoonForItsScaleWhereVenusWouldBeTooSmall() {
        Document svg = read(draw(Size.NARROW, lamp("A", 10, 4, 3)));

        double moon = dots(svg, true).get(0).r();
        // the full Moon 30° up gives 0.219 lx: magnitude -12.74 through 1.99 air masses of 0.20
        assertThat(words(svg, "full Moon on the same scale")).isNotNull();
        double moonLx = 2.54e-6 * Math.pow(10, -0.4 * (-12.74 + 0.20 * 1.99429));
        double lamp = dots(svg, false).get(0).r();
        assertThat(lamp * lamp / (moon * moon)).isCloseTo(3 / moonLx, within(0.02 * 3 / moonLx));
    }

    @Test
    void looksAcrossNorthWithoutGoingAllTheWayRound() {
        Document svg = read(draw(Size.WIDE, lamp("A", 359.5, -1, 1e-4), lamp("B", 0.5, -1, 1e-4)));

        List<Dot> dots = dots(svg, false);
        double at0 = number(words(svg, "0°"), "x");
        assertThat(dots)
                .extracting(Dot::x)
                .satisfiesExactlyInAnyOrder(
                        west -> assertThat(west).isLessThan(at0),
                        east -> assertThat(east).isGreaterThan(at0));
        assertThat(words(svg, "359.5°")).isNotNull();
    }

    @Test
    void makesLampsOfOneColumnOnePointWithAllTheirLight() {
        Position column = new Position(100, 200, 8);
        SeenLamp one = new SeenLamp("A-1", "A", column, 26, 1, 1e-4, 1e-4);
        SeenLamp other = new SeenLamp("A-2", "A", new Position(100, 200, 9), 26, 1.2, 1e-4, 3e-4);

        Document svg = read(draw(Size.WIDE, one, other));

        double venus = dots(svg, true).get(0).r();
        assertThat(dots(svg, false))
                .hasSize(1)
                .allSatisfy(dot ->
                        assertThat(dot.r() * dot.r() / (venus * venus)).isCloseTo(4e-4 / VENUS_LX, within(0.02)));
    }

    @Test
    void namesTypesSoThatNoNameTouchesAnother() {
        List<SeenLamp> lamps = new ArrayList<>();
        for (int i = 0; i < 6; i++) {
            lamps.add(lamp("Type number " + i, 200 + 0.02 * i, -1, 1e-4 + 1e-6 * i));
        }
        for (Size size : Size.values()) {
            Document svg = read(draw(size, lamps.toArray(SeenLamp[]::new)));
            List<Element> names = all(svg, "text").stream()
                    .filter(text -> text.getTextContent().startsWith("Type number"))
                    .toList();

            assertThat(names).hasSizeGreaterThan(2);
            for (Element one : names) {
                for (Element other : names) {
                    boolean sameLine = Math.abs(number(one, "y") - number(other, "y")) < 17;
                    boolean sameSide = one.getAttribute("text-anchor").equals(other.getAttribute("text-anchor"));
                    assertThat(one != other && sameLine && sameSide)
                            .as(one.getTextContent() + " and " + other.getTextContent())
                            .isFalse();
                }
            }
        }
    }

    @Test
    void staysSmallWithTwentyThousandLightsAndKeepsTheirLight() {
        Random random = new Random(7);
        List<SeenLamp> city = new ArrayList<>();
        double lux = 0;
        for (int i = 0; i < 20_000; i++) {
            double one = 1e-4 * random.nextDouble();
            lux += one;
            city.add(new SeenLamp(
                    "L" + i,
                    "T" + i % 300,
                    new Position(i, 1, 5),
                    360 * random.nextDouble(),
                    40 * random.nextDouble() - 10,
                    one,
                    one));
        }
        for (Size size : Size.values()) {
            String svg = draw(size, city.toArray(SeenLamp[]::new));
            Document read = read(svg);

            assertThat(svg.length()).isLessThan(150_000);
            double venus = dots(read, true).get(0).r();
            double drawn = dots(read, false).stream()
                    .mapToDouble(dot -> dot.r() * dot.r() / (venus * venus) * VENUS_LX)
                    .sum();
            assertThat(drawn).isCloseTo(lux, within(0.02 * lux));
        }
    }

    @Test
    void takesMarkupInNamesAsWords() {
        String svg = draw(Size.WIDE, lamp("<script>alert(1)</script>", 10, 1, 1e-4));

        assertThat(svg).contains("&lt;script&gt;").doesNotContain("<script>");
        read(svg);
    }

    @Test
    void isNotDrawnWithoutALamp() {
        assertThatThrownBy(() -> draw(Size.WIDE)).isInstanceOf(IllegalArgumentException.class);
    }
}
