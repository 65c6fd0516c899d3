package skytally.charts;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import skytally.charts.SitePlan.Frame;
import skytally.charts.SitePlan.Light;
import skytally.charts.SitePlan.Place;
import skytally.charts.SitePlan.Point;
import skytally.charts.SitePlan.Unit;

@DisplayName("The plan of a site")
class SitePlanTest {

    private static final double WIDTH = 400;

    /** 200 m wide and high about the reference point, so that a metre is two of 400 pixels. */
    private static final Frame GROUND = new Frame(-100, 100, -100, 100);

    private static final Frame FAR = new Frame(-6000, 6000, -6000, 6000);

    private static SitePlan plan(Frame frame, List<Light> lights, Place... places) {
        return new SitePlan(frame, Unit.METRES, List.of(), lights, List.of(places), null);
    }

    private static String ringStep(Frame frame, Unit unit) {
        return new SitePlan(frame, unit, List.of(), List.of(), List.of(), null).ringStep();
    }

    private static String svg(SitePlan plan) {
        return plan.svg("plan", "The site", "In words.", WIDTH);
    }

    private static List<double[]> numbers(String svg, String pattern) {
        Matcher found = Pattern.compile(pattern).matcher(svg);
        List<double[]> all = new ArrayList<>();
        while (found.find()) {
            double[] one = new double[found.groupCount()];
            for (int i = 0; i < one.length; i++) {
                one[i] = Double.parseDouble(found.group(i + 1));
            }
            all.add(one);
        }
        return all;
    }

    private static String path(String svg, String kind) {
        Matcher found = Pattern.compile("<path d=\"([^\"]*)\" class=\"[^\"]*" + kind + "\"")
                .matcher(svg);
        assertThat(found.find()).as(kind).isTrue();
        return found.group(1);
    }

    /** 30 pixels of edge, then 2 pixels a metre from the north-west corner. */
    @ParameterizedTest
    @CsvSource({"0, 0, 230, 230", "50, 0, 330, 230", "0, 50, 230, 130", "-100, 100, 30, 30"})
    void putsEastToTheRightAndNorthUp(double east, double north, double x, double y) {
        String svg = svg(plan(GROUND, List.of(new Light(new Point(east, north), null, false))));

        assertThat(numbers(path(svg, "light--proposed"), "M([\\d.]+) ([\\d.]+)h0"))
                .containsExactly(new double[] {x, y});
    }

    @ParameterizedTest
    @CsvSource({"0, 0, -11", "90, 11, 0", "180, 0, 11", "270, -11, 0", "45, 7.8, -7.8"})
    void turnsTheTickOfALightAlongItsBearing(double bearing, double right, double down) {
        String svg = svg(plan(GROUND, List.of(new Light(new Point(0, 0), bearing, false))));

        assertThat(numbers(path(svg, "tick--proposed"), "l(-?[\\d.]+) (-?[\\d.]+)"))
                .containsExactly(new double[] {right, down});
    }

    @Test
    void tellsExistingLightsByTheirShape() {
        String svg = svg(plan(
                GROUND, List.of(new Light(new Point(0, 0), null, false), new Light(new Point(10, 0), 90.0, true))));

        assertThat(path(svg, "light--hole")).isEqualTo(path(svg, "light--existing"));
        assertThat(path(svg, "light--proposed")).isNotEqualTo(path(svg, "light--existing"));
    }

    @Test
    void numbersRingsByTheirDistance() {
        SitePlan plan = plan(GROUND, List.of());
        String svg = svg(plan);

        assertThat(plan.ringStep()).isEqualTo("50\u00a0m");
        assertThat(plan.blockLength()).isEqualTo("20\u00a0m");
        assertThat(numbers(svg, "<circle cx=\"([\\d.]+)\" cy=\"([\\d.]+)\" r=\"([\\d.]+)\""))
                .containsExactly(new double[] {230, 230, 100}, new double[] {230, 230, 200});
        List<double[]> number = numbers(svg, "<text x=\"([\\d.]+)\" y=\"([\\d.]+)\"[^>]*>50\u00a0m<");
        assertThat(number).hasSize(1);
        double away = Math.hypot(number.get(0)[0] - 230, number.get(0)[1] - 4.5 - 230);
        assertThat(away).isCloseTo(100, within(0.2));
    }

    @Test
    void countsLongWaysInKilometresOrMiles() {
        assertThat(ringStep(FAR, Unit.METRES)).isEqualTo("2\u00a0km");
        assertThat(ringStep(FAR, Unit.FEET)).isEqualTo("2\u00a0mi");
        assertThat(ringStep(GROUND, Unit.FEET)).isEqualTo("200\u00a0ft");
    }

    @Test
    void drawsFewRingsFarFromTheReferencePoint() {
        Frame away = Frame.around(List.of(new Point(900_000, 900_000), new Point(900_030, 900_000)));

        assertThat(numbers(svg(plan(away, List.of())), "<circle cx=\"(-?[\\d.]+)\"")
                        .size())
                .isBetween(1, 20);
    }

    @Test
    void keepsTheMarksOfPlacesApartAndOnTheGround() {
        String svg = svg(plan(
                GROUND,
                List.of(),
                new Place("VA1", new Point(0, 60)),
                new Place("VA2", new Point(0, 60)),
                new Place("VA3", new Point(97, 60))));

        List<double[]> at = numbers(svg, "<text x=\"([\\d.]+)\" y=\"([\\d.]+)\"[^>]*>VA\\d<");
        assertThat(at).hasSize(3);
        assertThat(Math.abs(at.get(0)[0] - at.get(1)[0])).isGreaterThan(24);
        assertThat(at).allSatisfy(one -> assertThat(one[0]).isBetween(30.0, 430.0 - 22));
    }

    @Test
    void leavesTheMarksOfTheInsetToItsOwnPlan() {
        SitePlan all = new SitePlan(
                FAR,
                Unit.METRES,
                List.of(),
                List.of(),
                List.of(new Place("NEAR", new Point(10, 10)), new Place("FAR", new Point(3000, 3000))),
                GROUND);

        assertThat(svg(all)).contains(">FAR<", "app-plan__inset").doesNotContain(">NEAR<");
    }

    @Test
    void drawsTheOutlineOfTheSite() {
        SitePlan plan = new SitePlan(
                GROUND,
                Unit.METRES,
                List.of(new Point(-50, -50), new Point(50, -50), new Point(50, 50)),
                List.of(),
                List.of(),
                null);

        assertThat(path(svg(plan), "outline")).isEqualTo("M130 330L330 330L330 130z");
    }

    @Test
    void takesMarkupAsText() {
        SitePlan plan = plan(GROUND, List.of(), new Place("<b>\"&'", new Point(0, 0)));

        assertThat(plan.svg("plan", "<script>", "</desc><img src=x>", WIDTH))
                .contains("&lt;b&gt;&quot;&amp;&#39;", "&lt;script&gt;", "&lt;/desc&gt;&lt;img src=x&gt;")
                .doesNotContain("<script", "<img", "<b>");
    }

    @Test
    void staysSmallWithTwentyThousandLights() {
        List<Light> lights = new ArrayList<>();
        for (int i = 0; i < 20_000; i++) {
            // Spread evenly, by a step that shares no factor with their number, and each turned another way.
            double east = i * 7919L % 20_000 / 100.0 - 100;
            lights.add(new Light(new Point(east, i / 100.0 - 100), i * 37 % 360.0, i % 2 == 0));
        }
        SitePlan plan = plan(GROUND, lights);
        String both = plan.svg("wide", "", "", 500) + plan.svg("narrow", "", "", 300);

        assertThat(numbers(both, "M([\\d.]+) [\\d.]+h0").size()).isGreaterThan(1000);
        assertThat(both.length()).isLessThan(300_000);
    }

    @Test
    void framesWhatItIsGivenWithGroundBesideIt() {
        Frame frame = Frame.around(List.of(new Point(-100, 0), new Point(300, 100)));

        assertThat(frame.holds(new Point(-100, 0))).isTrue();
        assertThat(frame.widthM()).isCloseTo(456, within(1e-9));
        assertThat(frame.heightM()).isCloseTo(228, within(1e-9));
        Frame one = Frame.around(List.of(new Point(5, 5)));
        assertThat(one.holds(new Point(5, 5))).isTrue();
        assertThat(one.widthM()).isGreaterThan(10);
    }
}
