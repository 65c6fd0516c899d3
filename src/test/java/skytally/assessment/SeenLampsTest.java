package skytally.assessment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.assessment.SeenLamps.SeenLamp;
import skytally.geometry.Position;
import skytally.scene.Lamp;
import skytally.scene.Observer;
import skytally.scene.Scene;

@DisplayName("The lamps as one eye has them before it")
class SeenLampsTest {

    /**
     * By hand: 300 m east and 400 m north lie on bearing atan(3/4) = 36.8699°; 500 m off the curve of an Earth 7/6 of
     * 6371 km drops 500² / (2 · 7 432 833) = 0.01682 m, so 6 m stand atan((4.4 − 0.01682) / 500) = 0.50227° above an
     * eye at 1.6 m.
     */
    @Test
    void standAtTheBearingAndAltitudeOfAHandDerivation() {
        Lamp lamp = TestScenes.lamp("all-round", 1000, new Position(300, 400, 6));
        SeenLamp seen = only(lamp, TestScenes.observer(0, 1.6, 10));

        assertThat(seen.bearingDeg()).isCloseTo(36.8699, within(1e-4));
        assertThat(seen.altitudeDeg()).isCloseTo(0.50227, within(1e-5));
    }

    /** By hand: an all-round lamp of 1000 lm sends 1000 / 4π = 79.577 cd; at 500 m 3.1831e-4 lx before the air. */
    @Test
    void sendTheLightOfTheInverseSquareLessWhatTheAirTakes() {
        Lamp lamp = TestScenes.lamp("all-round", 1000, new Position(300, 400, 1.6));
        SeenLamp seen = only(lamp, TestScenes.observer(0, 1.6, 10));

        assertThat(seen.oneLx()).isLessThan(3.1831e-4).isCloseTo(3.1831e-4, within(0.15 * 3.1831e-4));
    }

    private static SeenLamp only(Lamp lamp, Observer observer) {
        List<SeenLamp> seen = SeenLamps.at(TestScenes.scene(List.of(lamp), observer), observer);
        assertThat(seen).hasSize(1);
        return seen.get(0);
    }

    @Test
    void addUpToTheLightAtTheEyeOfTheAssessment() {
        Observer observer = TestScenes.observer(3000, 20, 10);
        Scene scene = TestScenes.scene(TestScenes.town(60), observer);
        Assessment assessment = new Assessor(Circumstance.EARLY_CLEAR).assess(TestScenes.settled(scene));
        List<SeenLamp> seen = SeenLamps.at(scene, observer);

        double all = assessment.figure("here", "direct/illuminance").likely();
        double one = assessment.figure("here", "direct/one-lamp-illuminance").likely();
        assertThat(seen.stream().mapToDouble(SeenLamp::allLx).sum()).isCloseTo(all, within(1e-9 * all));
        assertThat(seen.stream().mapToDouble(SeenLamp::oneLx).max()).hasValueCloseTo(one, within(1e-9 * one));
    }

    @Test
    void areNotThereBehindTheHorizon() {
        Observer observer = TestScenes.observer(100_000, 1.6, 10);
        Scene scene = TestScenes.scene(List.of(TestScenes.lamp("all-round", 1000, new Position(0, 0, 6))), observer);

        assertThat(SeenLamps.at(scene, observer)).isEmpty();
    }
}
