package skytally.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

@DisplayName("Spectrum")
class SpectrumTest {

    @Test
    void aLineStandsAtItsExactWavelength() {
        Spectrum sodium = Spectrum.ofLine(589.3);
        assertThat(sodium.weighted(Passband.JOHNSON_V, wavelengthNm -> wavelengthNm))
                .isCloseTo(589.3 * Passband.JOHNSON_V.at(589.3), within(1e-12));
        assertThat(sodium.nodeWavelengthsNm()).containsExactly(589.3);
    }

    /** Equal energy from 380 to 780 nm: shares are widths, between points of the grid too. */
    @ParameterizedTest(name = "{0} to {1} nm")
    @CsvSource(textBlock = """
            380, 780, 1
            380, 500, 0.3
            405, 530, 0.3125
            500.1, 500.3, 0.0005
            620, 620, 0
            """)
    void sharesOfEqualEnergyAreWidths(double fromNm, double toNm, double share) {
        assertThat(Spectrum.ofContinuum(wavelengthNm -> 7).shareBetween(fromNm, toNm))
                .isCloseTo(share, within(1e-12));
    }

    @Test
    void sharesAddUp() {
        Spectrum spectrum = SpectralClasses.byId("hps").orElseThrow().spectrum();
        double sum = spectrum.shareBetween(380, 498.2)
                + spectrum.shareBetween(498.2, 568.5)
                + spectrum.shareBetween(568.5, 780);
        assertThat(sum).isCloseTo(1, within(1e-12));
    }

    @Test
    void aLineAtTheEdgeCountsOnce() {
        Spectrum line = Spectrum.ofLine(500);
        assertThat(line.shareBetween(380, 500)).isZero();
        assertThat(line.shareBetween(500, 780)).isEqualTo(1);
        assertThat(Spectrum.ofLine(780).shareBetween(500, 780)).isEqualTo(1);
    }

    @Test
    void oneLuxHoldsTheLightOfItsMagnitude() {
        Spectrum spectrum = SpectralClasses.byId("led4000").orElseThrow().spectrum();
        assertThat(spectrum.zeroMagnitudeIlluminanceLx() * spectrum.johnsonVFluxDensityPerLux())
                .isCloseTo(Spectrum.CALSPEC_V_ZERO_W_PER_M2_NM, within(1e-24));
    }

    @Test
    void arraysHandedOutAreCopies() {
        Spectrum spectrum = Spectrum.ofBlackbody(2700);
        spectrum.nodeWeights(Passband.PHOTOPIC)[400] = 1e9;
        spectrum.nodeWavelengthsNm()[400] = 0;
        assertThat(spectrum.weighted(Passband.PHOTOPIC)).isLessThan(1);
        assertThat(spectrum.nodeWavelengthsNm()).isSorted();
    }

    @Test
    void refusesPowersThatDoNotAddToOne() {
        assertThatThrownBy(() -> Spectrum.of(List.of(new Component.Line(500, 0.5))))
                .hasMessageContaining("add to 1");
        assertThatThrownBy(() -> Spectrum.of(List.of())).hasMessageContaining("add to 1");
    }

    @ParameterizedTest
    @ValueSource(doubles = {379.9, 780.1, 0, Double.NaN})
    void refusesALineThatIsNotSeen(double wavelengthNm) {
        assertThatThrownBy(() -> Spectrum.ofLine(wavelengthNm)).hasMessageContaining("380 to 780 nm");
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -1, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesAContinuumWithoutLight(double level) {
        assertThatThrownBy(() -> Spectrum.ofContinuum(wavelengthNm -> level))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 499, 100_001, Double.NaN})
    void refusesATemperatureThatDoesNotGlow(double temperatureK) {
        assertThatThrownBy(() -> Spectrum.ofBlackbody(temperatureK)).hasMessageContaining("500 to 100 000 K");
    }

    @Test
    void refusesAShareBackward() {
        Spectrum spectrum = Spectrum.ofBlackbody(2700);
        assertThatThrownBy(() -> spectrum.shareBetween(500, 499)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> spectrum.shareBetween(379, 500)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> spectrum.shareBetween(500, Double.NaN)).isInstanceOf(IllegalArgumentException.class);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "LED", "3000led", "led-3000", "../led"})
    void refusesAnIdThatIsNoFileName(String id) {
        Spectrum spectrum = Spectrum.ofLine(555);
        assertThatThrownBy(() -> new SpectralClass(id, "A lamp", spectrum)).hasMessageContaining("small letters");
        assertThatThrownBy(() -> new SpectralClass("led", " ", spectrum)).hasMessageContaining("no label");
    }
}
