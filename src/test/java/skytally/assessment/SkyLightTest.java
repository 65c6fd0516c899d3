package skytally.assessment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import skytally.geometry.Attitude;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.glare.VeilingLuminance;
import skytally.luminaire.FluxShare;
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Observer;
import skytally.scene.Scene;
import skytally.scene.Surroundings;

@DisplayName("Sky light of a scene")
class SkyLightTest {

    private static final Observer HERE = TestScenes.observer(3000, 1.6, 10);
    private static final Look ZENITH = HERE.looks().get(1);
    private static final Look TOWARD_SITE = HERE.looks().get(2);

    private static SkyLight along(Look look, List<Lamp> lamps) {
        return new SceneLights(TestScenes.scene(lamps, HERE)).over(HERE.eye()).along(look);
    }

    @Test
    void addsOverLamps() {
        List<Lamp> town = TestScenes.town(12);
        // gathered, and carried between six wavelengths together rather than each by itself
        double together = 2e-3;
        for (Look look : List.of(ZENITH, TOWARD_SITE)) {
            double lamps = 0;
            double ground = 0;
            double johnsonV = 0;
            for (Lamp lamp : town) {
                SkyLight one = along(look, List.of(lamp));
                lamps += one.lampsCdM2();
                ground += one.groundCdM2();
                johnsonV += one.johnsonV();
            }
            SkyLight all = along(look, town);
            assertThat(all.lampsCdM2()).isPositive().isCloseTo(lamps, within(together * lamps));
            assertThat(all.groundCdM2()).isPositive().isCloseTo(ground, within(together * ground));
            assertThat(all.johnsonV()).isCloseTo(johnsonV, within(together * johnsonV));
        }
    }

    @Test
    void countsEveryLampThatHangsAtAPoint() {
        Position there = new Position(0, 0, 6);
        SkyLight one = along(ZENITH, List.of(TestScenes.lamp("flat-area", "hps", 4000, 1, there, Attitude.LEVEL)));
        SkyLight five = along(ZENITH, List.of(TestScenes.lamp("flat-area", "hps", 4000, 5, there, Attitude.LEVEL)));
        assertThat(five.artificialCdM2()).isCloseTo(5 * one.artificialCdM2(), within(1e-15));
    }

    /** A round fitting hung level looks the same from all sides, so its bearing may not matter. */
    @Test
    void turningARoundFittingAboutTheVerticalChangesNothing() {
        for (String shape : List.of("flat-area", "diffuse-down", "all-round", "diffuse-up", "beam-30")) {
            SkyLight north = along(TOWARD_SITE, List.of(hung(shape, new Attitude(0, 0, 0))));
            for (double bearing : new double[] {17, 90, 233}) {
                SkyLight turned = along(TOWARD_SITE, List.of(hung(shape, new Attitude(bearing, 0, 0))));
                assertThat(turned.artificialCdM2())
                        .isCloseTo(north.artificialCdM2(), within(1e-9 * north.artificialCdM2()));
            }
        }
    }

    private static Lamp hung(String shape, Attitude attitude) {
        return TestScenes.lamp(shape, "led3000", 5000, 1, new Position(0, 0, 6), attitude);
    }

    @Test
    void theSharesUpAndDownDoNotDependOnTheBearing() {
        for (Lamp lamp : TestScenes.town(22)) {
            Attitude hang = lamp.attitude();
            double up = FluxShare.upward(lamp.light(), hang);
            double turned = FluxShare.upward(
                    lamp.light(), new Attitude((hang.bearingDeg() + 140) % 360, hang.tiltDeg(), hang.rollDeg()));
            assertThat(turned).isCloseTo(up, within(1e-12));
        }
    }

    @Test
    void darkGroundSendsNothingBack() {
        SkyLight onlyLamp = new SceneLights(
                        new Scene(TestScenes.town(3), List.of(HERE), new Surroundings(TestScenes.CLEAR, 0)))
                .over(HERE.eye())
                .along(ZENITH);
        assertThat(onlyLamp.groundCdM2()).isZero();
        assertThat(onlyLamp.lampsCdM2()).isPositive();
    }

    /**
     * The light the air scatters beside a bare lamp in view, as a share of the Stiles-Holladay veil 10 E / θ², in the
     * default air: worked by hand from L = E (d / sin θ) ∫ [β_m p_m + ω β_a p_a] dγ, for this project.
     */
    @ParameterizedTest(name = "{0} m, {1}° beside: {2}")
    @CsvSource({
        "300, 5, 0.24", "300, 10, 0.38", "300, 20, 0.50", "300, 30, 0.52",
        "1000, 5, 0.77", "1000, 10, 1.2", "1000, 20, 1.5", "1000, 30, 1.5",
        "2000, 5, 1.5", "2000, 10, 2.3", "2000, 20, 2.7", "2000, 30, 2.6",
    })
    void theHaloOfALampInViewIsAShareOfTheVeil(double distanceM, double angleDeg, double share) {
        Position eye = new Position(0, distanceM, 10);
        Lamp lamp = TestScenes.lamp("all-round", 5000, new Position(0, 0, 10));
        double angle = Math.toRadians(angleDeg);
        Look beside = new Look(Look.BESIDE, Look.Purpose.GLARE, Direction.toward(Math.PI, angle));
        double halo = new SceneLights(TestScenes.scene(List.of(lamp), HERE))
                .over(eye)
                .along(beside)
                .lampsCdM2();
        DirectLight.Sum sum = new DirectLight.Sum();
        new DirectLight(List.of(lamp), TestScenes.CLEAR)
                .at(eye, Direction.toward(Math.PI, 0), beside.direction(), DirectLight.Veil.NONE, sum);
        double veil = sum.seenLx() * VeilingLuminance.StilesHolladay.CLASSIC.perLux(angleDeg);
        assertThat(halo / veil).isCloseTo(share, within(0.1 * share));
    }
}
