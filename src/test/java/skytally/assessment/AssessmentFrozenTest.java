package skytally.assessment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import skytally.geometry.Attitude;
import skytally.geometry.Position;
import skytally.scene.Lamp;
import skytally.scene.Observer;

/**
 * Our own headline numbers, held to 1e-10. A change here changes printed statements: its commit says by how much and why.
 * To renew a number, copy the actual value from the failure's message.
 */
@DisplayName("Assessments, frozen")
class AssessmentFrozenTest {

    /** One flat lens, 800 m off: the sentence as it stands before anything is typed. */
    private static final Assessment ONE_FLAT_LENS = assessed(
            TestScenes.lamp("flat-area", "led3000", 5200, 1, new Position(0, 0, 6), Attitude.LEVEL),
            TestScenes.observer(800, 1.6, 10));

    /** Forty sodium road lamps, carelessly tilted, 3 km off and seen from a hill. */
    private static final Assessment FORTY_TILTED = assessed(
            TestScenes.lamp("flat-road", "hps", 11_000, 40, new Position(0, 0, 10), new Attitude(0, 15, 0)),
            TestScenes.observer(3000, 60, 5));

    /** Two bare globes of cold light across the garden. */
    private static final Assessment TWO_GLOBES = assessed(
            TestScenes.lamp("all-round", "led4000", 1500, 2, new Position(0, 0, 3), Attitude.LEVEL),
            TestScenes.observer(25, 4.5, 30));

    private static Assessment assessed(Lamp lamp, Observer observer) {
        return new Assessor(Circumstance.EARLY_CLEAR)
                .assess(TestScenes.settled(TestScenes.scene(List.of(lamp), observer)));
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource(textBlock = """
            direct/distance, 800.0125085122561
            direct/intensity, 0.9574343072969007
            direct/illuminance, 1.4093823791513645E-6
            direct/window-illuminance, 1.4959221396720305E-6
            direct/magnitude, 0.6395121980137699
            direct/one-lamp-star-overhead, 0.4395121980137699
            beside/glare/veil, 1.0089629148286417E-7
            beside/glare/halo, 7.827445946665327E-7
            zenith/sky/artificial, 2.3806513387717992E-7
            zenith/sky/increase, 0.12604485499056217
            toward-site/sky/increase, 0.736668610035251
            zenith/eye/limit, 6.258107385553919
            """)
    void oneFlatLens(String measure, double frozen) {
        isFrozen(ONE_FLAT_LENS, measure, frozen);
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource(textBlock = """
            direct/distance, 3000.4307419073266
            direct/intensity, 1234.4004927774033
            direct/illuminance, 0.004446224713010572
            direct/window-illuminance, 0.005483869173016134
            direct/magnitude, -8.107894229050743
            direct/one-lamp-star-overhead, -4.302744250730837
            lamp/upward-share, 1.9512704943479267
            beside/glare/veil, 0.001331822852707
            beside/glare/halo, 0.0019982019491358084
            zenith/sky/artificial, 4.42143941488887E-6
            zenith/sky/increase, 1.9488413395790969
            toward-site/sky/increase, 17.324040335987796
            zenith/eye/limit, 6.250162795257702
            """)
    void fortyTiltedRoadLamps(String measure, double frozen) {
        isFrozen(FORTY_TILTED, measure, frozen);
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource(textBlock = """
            direct/distance, 25.044972163038334
            direct/intensity, 119.36620731892151
            direct/illuminance, 0.3798782921778554
            direct/window-illuminance, 0.37991803882367187
            direct/one-lamp-star-overhead, -12.384451911477
            beside/glare/veil, 0.0035951441159020707
            beside/glare/halo, 1.8603411145070027E-4
            zenith/sky/artificial, 3.041473230569057E-5
            zenith/sky/increase, 16.59935459118433
            toward-site/sky/increase, 72.41817585536229
            """)
    void twoGlobes(String measure, double frozen) {
        isFrozen(TWO_GLOBES, measure, frozen);
    }

    private static void isFrozen(Assessment assessment, String measure, double frozen) {
        assertThat(assessment.figure("here", measure).likely())
                .as(measure)
                .isCloseTo(frozen, within(1e-10 * Math.abs(frozen)));
    }
}
