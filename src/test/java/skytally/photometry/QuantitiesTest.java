package skytally.photometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

@DisplayName("Quantities of light")
class QuantitiesTest {

    @ParameterizedTest
    @ValueSource(doubles = {-1e-300, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void refuseWhatIsNoAmountOfLight(double amount) {
        assertThatThrownBy(() -> new Illuminance(amount)).hasMessageContaining("lux");
        assertThatThrownBy(() -> new Luminance(amount)).hasMessageContaining("cd/m²");
        assertThatThrownBy(() -> new LuminousFlux(amount)).hasMessageContaining("lumens");
        assertThatThrownBy(() -> new LuminousIntensity(amount)).hasMessageContaining("candelas");
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void refuseWhatIsNoMagnitude(double value) {
        assertThatThrownBy(() -> new Magnitude(value)).hasMessageContaining("finite");
        assertThatThrownBy(() -> new SurfaceBrightness(value)).hasMessageContaining("finite");
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -1, Double.NaN})
    void noDistanceNoIlluminance(double distanceM) {
        assertThatThrownBy(() -> Illuminance.from(new LuminousIntensity(1), distanceM, 0))
                .hasMessageContaining("metres");
    }

    @Test
    void lightFromBehindAddsNothing() {
        assertThat(Illuminance.from(new LuminousIntensity(100), 5, Math.PI)).isEqualTo(Illuminance.DARK);
        assertThat(Illuminance.from(new LuminousIntensity(100), 5, Math.PI / 3).lux())
                .isCloseTo(2, within(1e-12));
    }

    @Test
    void fallsWithDistance() {
        Illuminance before = Illuminance.from(new LuminousIntensity(100), 1, 0);
        for (double distanceM = 2; distanceM < 1e5; distanceM *= 1.5) {
            Illuminance now = Illuminance.from(new LuminousIntensity(100), distanceM, 0);
            assertThat(now).isLessThan(before);
            before = now;
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-9, 0.3, 1, 12_200})
    void unitsRunBothWays(double amount) {
        assertThat(Illuminance.ofFootcandles(amount).footcandles()).isCloseTo(amount, within(1e-15 * amount));
        assertThat(Luminance.ofNanolamberts(amount).nanolamberts()).isCloseTo(amount, within(1e-15 * amount));
    }

    /** One footcandle is one lumen on a square foot of 0.3048² m². */
    @Test
    void aFootcandle() {
        assertThat(Illuminance.ofFootcandles(1).lux()).isCloseTo(10.763910, within(5e-7));
    }

    @ParameterizedTest
    @MethodSource("skytally.photometry.ZeroPoint#presets")
    void luxAndMagnitudesRunBothWays(ZeroPoint zeroPoint) {
        for (double magnitude : List.of(-26.74, -1.46, 0.0, 6.5)) {
            assertThat(zeroPoint
                            .magnitude(zeroPoint.illuminance(new Magnitude(magnitude)))
                            .value())
                    .isCloseTo(magnitude, within(1e-12));
        }
        assertThat(zeroPoint.citation().reference()).isNotBlank();
    }

    @ParameterizedTest
    @MethodSource("skytally.photometry.ZeroPoint#presets")
    void onlyAZeroPointAboveTheAirIsOneForASky(ZeroPoint zeroPoint) {
        if (zeroPoint.isMeantForSky()) {
            Luminance sky = zeroPoint.luminance(new SurfaceBrightness(21.3));
            assertThat(zeroPoint.surfaceBrightness(sky).magArcsec2()).isCloseTo(21.3, within(1e-12));
        } else {
            assertThat(zeroPoint).isSameAs(ZeroPoint.GROUND_14_18);
            assertThatThrownBy(() -> zeroPoint.luminance(new SurfaceBrightness(21.3)))
                    .isInstanceOf(IllegalStateException.class)
                    .hasMessageContaining("cannot be used for a sky");
            assertThatThrownBy(() -> zeroPoint.surfaceBrightness(new Luminance(1e-3)))
                    .isInstanceOf(IllegalStateException.class);
            assertThatThrownBy(zeroPoint::zeroPointLuminanceCdM2).isInstanceOf(IllegalStateException.class);
        }
    }

    @Test
    void noLightHasNoMagnitude() {
        assertThatThrownBy(() -> ZeroPoint.TRADITIONAL.magnitude(Illuminance.DARK))
                .hasMessageContaining("no light");
        assertThatThrownBy(() -> ZeroPoint.TRADITIONAL.surfaceBrightness(new Luminance(0)))
                .hasMessageContaining("no light");
        assertThatThrownBy(() -> Magnitude.differenceOfRatio(0)).isInstanceOf(IllegalArgumentException.class);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -1, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesAZeroPointWithoutLight(double zeroMagnitudeLx) {
        assertThatThrownBy(() -> ZeroPoint.spectral(zeroMagnitudeLx)).hasMessageContaining("E0");
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.01, 1.01, Double.NaN})
    void refusesAReflectanceThatIsNoShare(double reflectance) {
        assertThatThrownBy(() -> Luminance.ofMattSurface(new Illuminance(1), reflectance))
                .hasMessageContaining("0 to 1");
    }

    @Test
    void readTheSameInEveryCountry() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            assertThat(new Illuminance(0.25)).hasToString("0.2500 lx");
            assertThat(new SurfaceBrightness(22)).hasToString("22.000 mag/arcsec²");
        } finally {
            Locale.setDefault(before);
        }
    }
}
