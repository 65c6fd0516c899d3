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
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Observer;
import skytally.skyglow.SingleScattering;

@DisplayName("Lamps gathered for the sky")
class GatheredLightsTest {

    private static final List<Lamp> TOWN = TestScenes.town(300);

    private static double sky(List<Lamp> lamps, Position eye, Look look) {
        Observer here = new Observer("here", eye, Direction.UP, List.of());
        return new SceneLights(TestScenes.scene(lamps, here))
                .over(eye)
                .along(look)
                .artificialCdM2();
    }

    private static double gathered(Position eye, Look look) {
        GatheredLights town = new GatheredLights(TOWN);
        return SkyLight.along(
                        look,
                        eye,
                        town.seenFrom(eye).along(look.direction(), GatheredLights.APART),
                        town.strands(),
                        0.12,
                        new SingleScattering(TestScenes.CLEAR, SpectralSum.WAVELENGTHS_NM))
                .artificialCdM2();
    }

    @Test
    void areNotGatheredWhereThereAreFew() {
        assertThat(new GatheredLights(TOWN)
                        .seenFrom(new Position(80_000, 0, 1.6))
                        .along(Direction.UP))
                .hasSize(300);
    }

    /** Lamp by lamp the scene of one lamp gathers nothing, so the sum over such scenes is the measure. */
    @ParameterizedTest(name = "{0} m away, {1}° up, {2}° beside")
    @CsvSource({"800, 90, 0", "1000, 30, 0", "1500, 30, 90", "3000, 90, 0", "3000, 30, 180", "10000, 20, 0"})
    void giveTheSkyOfTheSingleLamps(double distanceM, double altitudeDeg, double besideDeg) {
        Position eye = new Position(distanceM, 40, 1.6);
        Look look = new Look(
                "look",
                Look.Purpose.SKY,
                Direction.toward(Math.toRadians(270 + besideDeg), Math.toRadians(altitudeDeg)));
        double oneByOne =
                TOWN.stream().mapToDouble(lamp -> sky(List.of(lamp), eye, look)).sum();
        assertThat(gathered(eye, look)).isPositive().isCloseTo(oneByOne, within(0.005 * oneByOne));
    }

    @Test
    void areFewerTheFartherTheyAre() {
        GatheredLights gathered = new GatheredLights(TOWN);
        int near = gathered.seenFrom(new Position(0, 0, 1.6))
                .along(Direction.UP, GatheredLights.APART)
                .size();
        int far = gathered.seenFrom(new Position(5000, 0, 1.6))
                .along(Direction.UP, GatheredLights.APART)
                .size();
        int veryFar = gathered.seenFrom(new Position(80_000, 0, 1.6))
                .along(Direction.UP, GatheredLights.APART)
                .size();
        assertThat(near).isGreaterThan(100).isLessThanOrEqualTo(300);
        assertThat(far).isLessThan(near / 3);
        assertThat(veryFar).isEqualTo(1);
    }

    @Test
    void keepTheirLumensByKindAndDirection() {
        GatheredLights gathered = new GatheredLights(TOWN);
        double lumens =
                gathered.seenFrom(new Position(80_000, 0, 1.6)).along(Direction.UP, GatheredLights.APART).stream()
                        .flatMapToDouble(light -> java.util.Arrays.stream(light.lumens()))
                        .sum();
        assertThat(lumens)
                .isCloseTo(
                        TOWN.stream()
                                .mapToDouble(lamp -> lamp.allFlux().lumens())
                                .sum(),
                        within(1e-6));
    }

    @Test
    void leaveOutWhatIsOff() {
        Lamp off = TestScenes.lamp("flat-area", "led3000", 0, 3, new Position(5, 5, 6), Attitude.LEVEL);
        assertThat(new GatheredLights(List.of(off))
                        .seenFrom(new Position(100, 0, 1.6))
                        .along(Direction.UP))
                .isEmpty();
    }
}
