package skytally.project.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.assessment.Assessment;
import skytally.assessment.Assessor;
import skytally.assessment.Circumstance;
import skytally.assessment.Contribution;
import skytally.assessment.Figure;
import skytally.project.Project;
import skytally.project.SceneDrawing;
import skytally.project.SceneDrawing.Drawn;
import skytally.project.SceneDrawing.Period;
import skytally.project.Scheme;

@DisplayName("Every figure of the samples")
class SampleFiguresTest {

    private static final Path FROZEN = Path.of("src/test/resources/frozen/ferrin-lane.csv");

    /** What is held: light at the eye and on the window, glare, and the sky in two directions. */
    private static final List<String> HELD = List.of(
            "direct/one-lamp-illuminance",
            "direct/illuminance",
            "direct/window-illuminance",
            "direct/worst-plane-illuminance",
            "beside/glare/veil",
            "zenith/sky/artificial",
            "zenith/sky/increase",
            "zenith/sky/increase-over-present",
            "toward-site/sky/artificial",
            "toward-site/sky/brightness",
            "zenith/eye/limit");

    static Stream<Arguments> schemesByPeriod() {
        return SampleProjects.all().entrySet().stream()
                .flatMap(sample -> sample.getValue().schemes().stream()
                        .filter(scheme -> !scheme.types().isEmpty())
                        .flatMap(scheme -> Stream.of(Period.values())
                                .map(period -> Arguments.of(sample.getKey(), scheme.mark(), period))));
    }

    private static Assessment assessed(String sample, String scheme, Period period) {
        Project project = SampleProjects.all().get(sample);
        Scheme drawn = project.scheme(scheme).orElseThrow();
        return assessed(SceneDrawing.of(project, drawn, period), period);
    }

    private static Assessment assessed(Drawn drawn, Period period) {
        Circumstance.Moment moment = period == Period.EARLY ? Circumstance.Moment.EARLY : Circumstance.Moment.LATE;
        return new Assessor(new Circumstance(moment, Circumstance.Cloud.NONE)).assess(drawn.scene());
    }

    @ParameterizedTest(name = "{0}, {1}, {2}")
    @MethodSource("schemesByPeriod")
    void hasAWorkingASourceAndAUnit(String sample, String scheme, Period period) {
        Assessment assessment = assessed(sample, scheme, period);
        Set<String> names = new HashSet<>();
        assertThat(assessment.figures()).hasSizeGreaterThan(100);
        for (Figure figure : assessment.figures().values()) {
            assertThat(names.add(figure.key())).as(figure.key()).isTrue();
            assertThat(figure.key()).matches("[^/]+/([^/]+/)?(direct|lamp|glare|eye|sky)/[a-z-]+/(early|late)/clear");
            assertThat(figure.name()).as(figure.key()).isNotBlank();
            assertThat(figure.unit().symbol()).as(figure.key()).isNotBlank();
            assertThat(figure.working().formula()).as(figure.key()).contains("=");
            assertThat(figure.working().substituted()).as(figure.key()).doesNotContain("NaN", "Infinity");
            assertThat(figure.working().sources())
                    .as(figure.key())
                    .isNotEmpty()
                    .allSatisfy(source -> assertThat(source.reference()).isNotBlank());
            assertThat(figure.working().inputs()).as(figure.key()).allSatisfy(input -> {
                assertThat(input.value()).isNotBlank().doesNotContain("NaN", "Infinity");
                assertThat(input.known().from()).isNotBlank();
            });
        }
    }

    /** Light adds, so what the types cause adds up to what all cause. */
    @ParameterizedTest(name = "{0}, {1}, {2}")
    @MethodSource("schemesByPeriod")
    void isTheSumOfWhatTheTypesCause(String sample, String scheme, Period period) {
        Assessment assessment = assessed(sample, scheme, period);
        for (String place : assessment.eyes().keySet()) {
            adds(assessment, place, "direct/illuminance", Contribution::illuminanceLx);
            adds(assessment, place, "direct/window-illuminance", Contribution::windowLx);
            if (!place.equals(Assessment.PROPERTY_LINE)) {
                adds(assessment, place, "beside/glare/veil", Contribution::veilCdM2);
                adds(assessment, place, "zenith/sky/artificial", Contribution::skyZenithCdM2);
                adds(assessment, place, "toward-site/sky/artificial", Contribution::skyTowardCdM2);
            }
        }
    }

    private static void adds(Assessment assessment, String place, String measure, ToDoubleFunction<Contribution> part) {
        double whole = assessment.figure(place, measure).likely();
        double sum = assessment.contributions().stream()
                .filter(contribution -> contribution.place().equals(place))
                .mapToDouble(part)
                .sum();
        assertThat(sum).as(place + " " + measure).isCloseTo(whole, within(1e-9 * Math.max(whole, 1e-30)));
    }

    /** Sample B has an outline: the worst point of its property line is one of the places, and lies on the line. */
    @Test
    void tellsTheWorstPointOfThePropertyLine() {
        Assessment assessment = assessed("sillow-gateway", "proposed", Period.EARLY);
        var eye = assessment.eyes().get(Assessment.PROPERTY_LINE);
        double feetEast = eye.eastM() / 0.3048;
        double feetNorth = eye.northM() / 0.3048;
        assertThat(Math.min(
                        Math.min(Math.abs(feetEast), Math.abs(feetEast - 700)),
                        Math.min(Math.abs(feetNorth), Math.abs(feetNorth - 590))))
                .isLessThan(1e-6);
        assertThat(assessment
                        .figure(Assessment.PROPERTY_LINE, "direct/window-illuminance")
                        .likely())
                .isGreaterThan(assessment
                        .figure("VB4", "direct/worst-plane-illuminance")
                        .likely());
    }

    /** A change of any of these is a change of method: the commit says by how much and why. */
    @Test
    void standsAtTheObservatoryAndAtEveryOtherPlaceAsItStood() throws IOException {
        List<String> now = lines();
        List<String> held = Files.readAllLines(FROZEN, StandardCharsets.UTF_8);
        assertThat(held).hasSameSizeAs(now).hasSizeGreaterThan(150);
        for (int i = 0; i < held.size(); i++) {
            String[] was = held.get(i).split(",");
            String[] is = now.get(i).split(",");
            assertThat(is[0]).isEqualTo(was[0]);
            double value = Double.parseDouble(was[1]);
            assertThat(Double.parseDouble(is[1]))
                    .as(was[0])
                    .isCloseTo(value, within(1e-8 * Math.max(Math.abs(value), 1e-30)));
        }
    }

    private static List<String> lines() {
        List<String> lines = new ArrayList<>();
        for (Period period : Period.values()) {
            Assessment assessment = assessed("ferrin-lane", "proposed", period);
            for (String place : assessment.eyes().keySet()) {
                for (String measure : HELD) {
                    Figure figure = assessment.figure(place, measure);
                    figure.range()
                            .ifPresent(range -> lines.add(
                                    figure.key() + "," + String.format(Locale.ROOT, "%.12e", range.likely())));
                }
            }
        }
        return lines;
    }

    /** Writes the numbers anew, for a commit that changes the method. */
    public static void main(String[] args) throws IOException {
        Files.createDirectories(FROZEN.getParent());
        Files.write(FROZEN, lines(), StandardCharsets.UTF_8);
    }
}
