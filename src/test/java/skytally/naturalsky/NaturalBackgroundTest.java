package skytally.naturalsky;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import skytally.photometry.SurfaceBrightness;
import skytally.photometry.ZeroPoint;

@DisplayName("Natural background")
class NaturalBackgroundTest {

    @Test
    void isTheGivenValueOverhead() {
        assertThat(NaturalBackground.reference(0.3).brightnessAt(0)).isEqualTo(new SurfaceBrightness(22.0));
    }

    @Test
    void vanRhijnRunsFromOneToFive() {
        assertThat(NaturalBackground.vanRhijn(0)).isEqualTo(1);
        assertThat(NaturalBackground.vanRhijn(90)).isCloseTo(5, within(1e-12));
    }

    @Test
    void isOnlyIndicativeLowerThanTenDegrees() {
        assertThat(NaturalBackground.isIndicative(80)).isFalse();
        assertThat(NaturalBackground.isIndicative(80.1)).isTrue();
    }

    @Test
    void anEvenSkyLaysPiTimesItsLuminanceOnTheGroundAndHalfOfThatOnAWall() {
        NaturalBackground even = new NaturalBackground(new SurfaceBrightness(22.0), 0, 0);
        double luminance = ZeroPoint.TRADITIONAL.luminance(even.zenith()).candelaPerSquareMetre();
        assertThat(even.horizontalIlluminance(ZeroPoint.TRADITIONAL).lux() / luminance)
                .isCloseTo(Math.PI, within(1e-9));
        assertThat(even.verticalIlluminance(ZeroPoint.TRADITIONAL).lux() / luminance)
                .isCloseTo(Math.PI / 2, within(1e-9));
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.1, 90.1, Double.NaN})
    void refusesDirectionsThatAreNoSky(double zenithAngleDeg) {
        NaturalBackground sky = NaturalBackground.reference(0.2);
        assertThatThrownBy(() -> sky.brightnessAt(zenithAngleDeg)).hasMessageContaining("0 to 90 degrees");
        assertThatThrownBy(() -> NaturalBackground.isIndicative(zenithAngleDeg))
                .hasMessageContaining("0 to 90 degrees");
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.01, 3.1, Double.NaN})
    void refusesAnExtinctionOutOfRange(double kV) {
        assertThatThrownBy(() -> NaturalBackground.reference(kV)).hasMessageContaining("0 to 3");
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.01, 1.01, Double.NaN})
    void refusesAShareOutOfRange(double airglowShare) {
        assertThatThrownBy(() -> new NaturalBackground(new SurfaceBrightness(22), airglowShare, 0.2))
                .hasMessageContaining("0 to 1");
    }

    @Test
    void refusesAZeroPointThatIsNoneForASky() {
        NaturalBackground sky = NaturalBackground.reference(0.2);
        assertThatThrownBy(() -> sky.luminanceAt(0, ZeroPoint.GROUND_14_18))
                .isInstanceOf(IllegalStateException.class)
                .hasMessageContaining("cannot be used for a sky");
        assertThatThrownBy(() -> sky.horizontalIlluminance(ZeroPoint.GROUND_14_18))
                .isInstanceOf(IllegalStateException.class);
    }

    @Test
    void refusesLessThanNoLight() {
        assertThatThrownBy(() -> NaturalBackground.brighteningMag(-0.1)).isInstanceOf(IllegalArgumentException.class);
        assertThat(NaturalBackground.brighteningMag(0)).isZero();
    }
}
