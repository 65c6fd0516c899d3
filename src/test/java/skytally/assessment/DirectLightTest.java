package skytally.assessment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.atmosphere.DirectPath;
import skytally.geometry.Attitude;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.glare.VeilingLuminance;
import skytally.scene.Lamp;

@DisplayName("Direct light of many lamps")
class DirectLightTest {

    private static final Direction SOUTH = Direction.toward(Math.PI, 0);
    private static final Direction LOOK = Direction.toward(2.8, 0.2);
    private static final DirectLight.Veil VEIL =
            angleDeg -> VeilingLuminance.CieGeneral.DEFAULT.unchecked(Math.max(0.1, angleDeg));
    private static final List<Position> EYES =
            List.of(new Position(0, 800, 1.6), new Position(700, -20, 4.5), new Position(-300, 9000, 60));

    private static DirectLight.Sum sum(List<Lamp> lamps, Position eye) {
        DirectLight.Sum sum = new DirectLight.Sum();
        new DirectLight(lamps, TestScenes.CLEAR).at(eye, SOUTH, LOOK, VEIL, sum);
        return sum;
    }

    @Test
    void isTheSumOfSingleLamps() {
        List<Lamp> town = TestScenes.town(60);
        for (Position eye : EYES) {
            double seen = 0;
            double window = 0;
            double vacuum = 0;
            double veil = 0;
            for (Lamp lamp : town) {
                DirectLight.Sum one = sum(List.of(lamp), eye);
                seen += one.seenLx();
                window += one.windowLx();
                vacuum += one.inVacuumLx();
                veil += one.veilCdM2();
            }
            DirectLight.Sum all = sum(town, eye);
            assertThat(seen).isPositive();
            assertThat(all.seenLx()).isCloseTo(seen, within(1e-12 * seen));
            assertThat(all.windowLx()).isCloseTo(window, within(1e-12 * window));
            assertThat(all.inVacuumLx()).isCloseTo(vacuum, within(1e-12 * vacuum));
            assertThat(all.veilCdM2()).isCloseTo(veil, within(1e-12 * veil));
        }
    }

    @Test
    void doesNotDependOnTheOrderOfTheLamps() {
        List<Lamp> town = TestScenes.town(60);
        List<Lamp> shuffled = new ArrayList<>(town);
        Collections.shuffle(shuffled, new Random(7));
        for (Position eye : EYES) {
            DirectLight.Sum one = sum(town, eye);
            DirectLight.Sum other = sum(shuffled, eye);
            assertThat(other.seenLx()).isCloseTo(one.seenLx(), within(1e-12 * one.seenLx()));
            assertThat(other.veilCdM2()).isCloseTo(one.veilCdM2(), within(1e-12 * one.veilCdM2()));
            assertThat(shuffled.get(other.brightest())).isSameAs(town.get(one.brightest()));
        }
    }

    /** One pair at a time, by the line of sight and the spectral mean: no series, no stored densities. */
    @Test
    void agreesWithTheLineOfSightTakenPairByPair() {
        for (Lamp lamp : TestScenes.town(120)) {
            for (Position eye : EYES) {
                DirectPath path = DirectPath.between(
                        lamp.position().heightM(),
                        eye.heightM(),
                        lamp.position().groundDistanceTo(eye));
                Direction toEye = Direction.toward(lamp.position().bearingTo(eye), path.altitudeAtLampRad());
                Direction toLamp = Direction.toward(eye.bearingTo(lamp.position()), path.altitudeAtEyeRad());
                Direction own = lamp.attitude().rotation().turnBack(toEye);
                double vacuum = lamp.allFlux().lumens()
                        * lamp.light().perLumen(own.x(), own.y(), own.z())
                        / (path.lengthM() * path.lengthM());
                double seen = vacuum
                        * new LuminousTransmission(lamp.spectrum(), TestScenes.CLEAR).along(path, TestScenes.CLEAR);
                double veil = seen * VEIL.perLux(Math.toDegrees(LOOK.angleTo(toLamp)));
                DirectLight.Sum found = sum(List.of(lamp), eye);
                assertThat(found.inVacuumLx()).isCloseTo(vacuum, within(1e-7 * vacuum));
                assertThat(found.seenLx()).isCloseTo(seen, within(1e-7 * seen));
                assertThat(found.windowLx()).isCloseTo(vacuum * Math.max(0, SOUTH.dot(toLamp)), within(1e-7 * vacuum));
                assertThat(found.veilCdM2()).isCloseTo(veil, within(1e-6 * veil));
            }
        }
    }

    @Test
    void turningTheWholeSceneAboutTheVerticalChangesNothing() {
        double turn = Math.toRadians(73);
        List<Lamp> turned = TestScenes.town(40).stream()
                .map(lamp -> new Lamp(
                        lamp.mark(),
                        lamp.type(),
                        lamp.count(),
                        turned(lamp.position(), turn),
                        new Attitude(
                                (lamp.attitude().bearingDeg() + 73) % 360,
                                lamp.attitude().tiltDeg(),
                                lamp.attitude().rollDeg()),
                        lamp.flux(),
                        lamp.light(),
                        lamp.spectrum(),
                        lamp.luminousSizeM(),
                        lamp.nearestM()))
                .toList();
        for (Position eye : EYES) {
            DirectLight.Sum before = sum(TestScenes.town(40), eye);
            DirectLight.Sum after = new DirectLight.Sum();
            new DirectLight(turned, TestScenes.CLEAR)
                    .at(
                            turned(eye, turn),
                            Direction.toward(Math.PI + turn, 0),
                            Direction.toward(2.8 + turn, 0.2),
                            VEIL,
                            after);
            assertThat(after.seenLx()).isCloseTo(before.seenLx(), within(1e-10 * before.seenLx()));
            assertThat(after.windowLx()).isCloseTo(before.windowLx(), within(1e-10 * before.windowLx()));
            assertThat(after.veilCdM2()).isCloseTo(before.veilCdM2(), within(1e-10 * before.veilCdM2()));
        }
    }

    private static Position turned(Position position, double clockwiseRad) {
        double c = Math.cos(clockwiseRad);
        double s = Math.sin(clockwiseRad);
        return new Position(
                position.eastM() * c + position.northM() * s,
                position.northM() * c - position.eastM() * s,
                position.heightM());
    }

    /** Many dim lamps at one point outshine one bright one together, and are not the brightest single lamp. */
    @Test
    void theBrightestLampIsASingleOne() {
        List<Lamp> lamps = List.of(
                TestScenes.lamp("all-round", "led3000", 100, 1000, new Position(0, 0, 5), Attitude.LEVEL),
                TestScenes.lamp("all-round", "led3000", 5000, 1, new Position(1, 0, 5), Attitude.LEVEL),
                TestScenes.lamp("all-round", "led3000", 9000, 0, new Position(2, 0, 5), Attitude.LEVEL));
        DirectLight.Sum sum = sum(lamps, new Position(0, 400, 1.6));
        assertThat(sum.brightest()).isEqualTo(1);
        assertThat(sum.brightestLx())
                .isCloseTo(sum(lamps.subList(1, 2), new Position(0, 400, 1.6)).seenLx(), within(1e-15));
        assertThat(sum.seenLx()).isGreaterThan(20 * sum.brightestLx());
    }

    /** 3.57 (√h₁ + √h₂) km and refraction: 13.6 km from 6 m to 1.6 m. */
    @Test
    void endsAtTheHorizon() {
        List<Lamp> lamp = List.of(TestScenes.lamp("all-round", 5000, new Position(0, 0, 6)));
        double horizon = DirectPath.horizonDistanceM(6) + DirectPath.horizonDistanceM(1.6);
        assertThat(sum(lamp, new Position(0, horizon - 1, 1.6)).seenLx()).isPositive();
        DirectLight.Sum beyond = sum(lamp, new Position(0, horizon + 1, 1.6));
        assertThat(beyond.seenLx()).isZero();
        assertThat(beyond.inVacuumLx()).isZero();
        assertThat(beyond.veilCdM2()).isZero();
        assertThat(beyond.brightest()).isEqualTo(-1);
    }

    @Test
    void noLumensGiveNoLight() {
        DirectLight.Sum sum = sum(List.of(TestScenes.lamp("all-round", 0, new Position(0, 0, 6))), EYES.get(0));
        assertThat(sum.seenLx()).isZero();
        assertThat(sum.veilCdM2()).isZero();
        assertThat(sum.brightest()).isEqualTo(-1);
        assertThat(sum(List.of(), EYES.get(0)).seenLx()).isZero();
    }

    @Test
    void straightBelowIsLikeAnywhere() {
        DirectLight.Sum sum =
                sum(List.of(TestScenes.lamp("diffuse-down", 1000, new Position(3, 4, 6))), new Position(3, 4, 1));
        assertThat(sum.inVacuumLx()).isCloseTo(1000 / Math.PI / 25, within(1e-9));
        assertThat(sum.windowLx()).isZero();
    }

    @Test
    void refusesALampInTheEye() {
        Position here = new Position(1, 2, 1.6);
        assertThatThrownBy(() -> sum(List.of(TestScenes.lamp("all-round", 1, here)), here))
                .hasMessageContaining("apart");
    }

    @Test
    void furtherIsDarker() {
        List<Lamp> lamp = List.of(TestScenes.lamp("all-round", 5000, new Position(0, 0, 6)));
        double before = Double.POSITIVE_INFINITY;
        for (double distance = 1; distance < 13_000; distance *= 1.2) {
            double here = sum(lamp, new Position(0, distance, 1.6)).seenLx();
            assertThat(here).isPositive().isLessThan(before);
            before = here;
        }
    }

    @Test
    void noVeilIsReckonedWhereNoneIsAskedFor() {
        DirectLight.Sum sum = new DirectLight.Sum();
        DirectLight direct = new DirectLight(TestScenes.town(10), TestScenes.CLEAR);
        direct.at(EYES.get(0), SOUTH, LOOK, DirectLight.Veil.NONE, sum);
        assertThat(sum.veilCdM2()).isZero();
        assertThat(sum.seenLx()).isEqualTo(sum(TestScenes.town(10), EYES.get(0)).seenLx());
    }

    /** Two hundred lamps at a thousand places, then as many again: what is made anew must not grow with the pairs. */
    @Test
    void makesNothingAnewInTheLoop() {
        DirectLight direct = new DirectLight(TestScenes.town(200), TestScenes.CLEAR);
        DirectLight.Sum sum = new DirectLight.Sum();
        ThreadMXBean thread = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long id = Thread.currentThread().getId();
        long least = Long.MAX_VALUE;
        for (int round = 0; round < 5; round++) {
            long before = thread.getThreadAllocatedBytes(id);
            for (int i = 0; i < 1000; i++) {
                direct.at(EYES.get(0), SOUTH, LOOK, VEIL, sum);
            }
            least = Math.min(least, thread.getThreadAllocatedBytes(id) - before);
        }
        assertThat(sum.seenLx()).isPositive();
        assertThat(least).as("bytes for 200 000 pairs").isLessThan(10_000);
    }
}
