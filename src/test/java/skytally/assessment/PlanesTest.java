package skytally.assessment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import skytally.geometry.Attitude;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.scene.GroundLine;
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Observer;
import skytally.scene.Pane;
import skytally.scene.Scene;
import skytally.scene.Surroundings;

/** Derived by hand: a bare lamp of 4π × 100 lm gives 100 cd every way. */
@DisplayName("Planes that light falls on")
class PlanesTest {

    private static final double HUNDRED_CANDELA = 400 * Math.PI;

    private static Lamp lamp(double east, double north, double height) {
        return TestScenes.lamp(
                "all-round", "led3000", HUNDRED_CANDELA, 1, new Position(east, north, height), Attitude.LEVEL);
    }

    private static Observer eye(double facingDeg, Optional<Pane> pane) {
        return new Observer(
                "here",
                new Position(0, 0, 2),
                Direction.toward(Math.toRadians(facingDeg), 0),
                List.of(),
                pane,
                OptionalDouble.empty(),
                GroundLine.OPEN);
    }

    private static PlaceNumbers numbers(Observer observer, Lamp... lamps) {
        return new PlaceNumbers(new SceneLights(TestScenes.scene(List.of(lamps), observer)), observer);
    }

    @Test
    void theBrightestUprightPlaneFacesASingleLamp() {
        PlaceNumbers numbers = numbers(eye(0, Optional.empty()), lamp(-10, 0, 2));
        assertThat(numbers.get(Measure.WORST_PLANE_FACING)).isEqualTo(270);
        assertThat(numbers.get(Measure.WORST_PLANE)).isCloseTo(1, within(1e-5)); // 100 cd at 10 m
        assertThat(numbers.get(Measure.WINDOW_ILLUMINANCE)).isZero(); // the wall faces north
    }

    /** Two equal lamps a right angle apart: 45° between them each gives cos 45°, together √2. */
    @Test
    void itLiesBetweenTwoLamps() {
        PlaceNumbers numbers = numbers(eye(0, Optional.empty()), lamp(10, 0, 2), lamp(0, 10, 2));
        assertThat(numbers.get(Measure.WORST_PLANE_FACING)).isEqualTo(45);
        assertThat(numbers.get(Measure.WORST_PLANE)).isCloseTo(Math.sqrt(2), within(2e-5));
    }

    /** Every facing worked out by itself, with nothing but the cosine law. */
    @ParameterizedTest(name = "{0} lamps")
    @ValueSource(ints = {1, 2, 7, 40})
    void itIsTheBrightestOfAllThatFaceAWholeDegree(int count) {
        List<Lamp> lamps = TestScenes.town(count);
        double most = -1;
        for (int facing = 0; facing < 360; facing++) {
            DirectLight.Sum sum = new DirectLight.Sum();
            new DirectLight(lamps, TestScenes.CLEAR)
                    .at(
                            new Position(0, 0, 2),
                            Direction.toward(Math.toRadians(facing), 0),
                            Direction.UP,
                            DirectLight.Veil.NONE,
                            sum);
            most = Math.max(most, sum.windowLx());
        }
        UprightPlane plane = new DirectLight(lamps, TestScenes.CLEAR).brightestPlane(eye(0, Optional.empty()));
        assertThat(plane.illuminanceLx()).isCloseTo(most, within(1e-12 * most));
    }

    /** 100 cd from 5 m above at 5 m: E = I sin 45° / d² with d² = 50. */
    @Test
    void theLevelPlaneGetsTheSineOfTheHeight() {
        PlaceNumbers numbers = numbers(eye(0, Optional.empty()), lamp(0, 5, 7));
        assertThat(numbers.get(Measure.LEVEL_ILLUMINANCE)).isCloseTo(100 * Math.sqrt(0.5) / 50, within(1e-5));
    }

    @Test
    void theLevelPlaneGetsNothingFromBelow() {
        assertThat(numbers(eye(0, Optional.empty()), lamp(0, 5, 1)).get(Measure.LEVEL_ILLUMINANCE))
                .isZero();
    }

    /**
     * A window 4 m wide facing north and a lamp 3 m before its right edge, level: at that edge E = 100 / 3², in the middle
     * 100 · (3 / √13) / 13.
     */
    @Test
    void theBrightestPointOfAWindowIsNextToTheLamp() {
        PlaceNumbers numbers = numbers(eye(0, Optional.of(new Pane(4, 1))), lamp(2, 3, 2));
        assertThat(numbers.get(Measure.WINDOW_WORST)).isCloseTo(100 / 9.0, within(1e-4));
        assertThat(numbers.get(Measure.WINDOW_ILLUMINANCE)).isCloseTo(300 / Math.pow(13, 1.5), within(1e-4));
        assertThat(numbers.worstOfPane().eastM()).isCloseTo(2, within(1e-12));
    }

    /** A square of 20 m around the reference point and a lamp 5 m outside the middle of its east side. */
    @Test
    void theWorstPointOfThePropertyLineIsNextToTheLamp() {
        List<Position> square = List.of(
                new Position(-10, -10, 0), new Position(10, -10, 0), new Position(10, 10, 0), new Position(-10, 10, 0));
        PropertyLine line = new PropertyLine(square);
        assertThat(line.points()).hasSize(80);
        Observer worst = line.worstPoint(new DirectLight(List.of(lamp(15, 0, 1.5)), TestScenes.CLEAR))
                .orElseThrow();
        assertThat(worst.eye()).isEqualTo(new Position(10, 0, 1.5));
        assertThat(worst.facing().x()).isCloseTo(1, within(1e-12));
    }

    @Test
    void noLineWithoutThreeCorners() {
        assertThat(new PropertyLine(List.of(new Position(0, 0, 0), new Position(9, 0, 0)))
                        .worstPoint(new DirectLight(List.of(lamp(15, 0, 1.5)), TestScenes.CLEAR)))
                .isEmpty();
    }

    @Test
    void thePropertyLineIsAPlaceOfTheAssessment() {
        Scene scene = new Scene(
                List.of(lamp(15, 0, 1.5)),
                List.of(),
                List.of(eye(0, Optional.empty())),
                new Surroundings(TestScenes.CLEAR, 0.12),
                Optional.empty(),
                List.of(new Position(-10, -10, 0), new Position(10, -10, 0), new Position(10, 10, 0)));
        Assessment assessment = new Assessor(Circumstance.EARLY_CLEAR).assess(TestScenes.settled(scene));
        assertThat(assessment.eyes()).containsKey(Assessment.PROPERTY_LINE);
        Figure window = assessment.figure(Assessment.PROPERTY_LINE, "direct/window-illuminance");
        assertThat(window.range().orElseThrow().likely()).isCloseTo(4, within(1e-4)); // 100 cd at 5 m
    }

    /** A hill of 20 m half way between a lamp and an eye 400 m apart hides it; one of 1 m does not. */
    @Test
    void groundHidesWhatStandsBehindIt() {
        Position eye = new Position(0, 400, 2);
        Position lamp = new Position(0, 0, 6);
        assertThat(new GroundLine(List.of(new GroundLine.Point(200, 20))).hides(lamp, eye))
                .isTrue();
        assertThat(new GroundLine(List.of(new GroundLine.Point(200, 1))).hides(lamp, eye))
                .isFalse();
        assertThat(new GroundLine(List.of(new GroundLine.Point(0, 90), new GroundLine.Point(400, 90))).hides(lamp, eye))
                .as("the ground under either is its own")
                .isFalse();
    }

    /** Over 60 km the curve of the enlarged Earth rises 30² km² / (2 × 7433 km) = 60.5 m in the middle. */
    @Test
    void groundIsMeasuredFromTheCurveOfTheEarth() {
        Position eye = new Position(0, 60_000, 50);
        Position lamp = new Position(0, 0, 50);
        assertThat(new GroundLine(List.of(new GroundLine.Point(30_000, -10))).hides(lamp, eye))
                .isTrue();
        assertThat(new GroundLine(List.of(new GroundLine.Point(30_000, -11))).hides(lamp, eye))
                .isFalse();
    }

    @Test
    void whatTheGroundHidesGivesNothing() {
        Observer behind = new Observer(
                "here",
                new Position(0, 400, 2),
                Direction.toward(Math.PI, 0),
                List.of(new Look(Look.ZENITH, Look.Purpose.SKY, Direction.UP)),
                Optional.empty(),
                OptionalDouble.empty(),
                new GroundLine(List.of(new GroundLine.Point(200, 20))));
        PlaceNumbers numbers = numbers(behind, lamp(0, 0, 6), lamp(1, 0, 6));
        assertThat(numbers.get(Measure.ILLUMINANCE)).isZero();
        assertThat(numbers.get(Measure.WINDOW_ILLUMINANCE)).isZero();
        assertThat(numbers.hidden()).isEqualTo(2);
        assertThat(numbers.get(Measure.SKY_ARTIFICIAL, 0)).isPositive();
    }
}
