package skytally.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Our own numbers, held to 1e-12. A change here changes printed statements: its commit says by how much and why. */
@DisplayName("Spectra, frozen")
class SpectrumFrozenTest {

    @ParameterizedTest(name = "{0}")
    @CsvSource(textBlock = """
            led3000, 322.334216009941, 1.3018835292276099, 0.1272596043959521, 2.9311841568131196E-6
            hps, 382.47463448130844, 0.6040477544442353, 0.07932960487772092, 3.434681806543414E-6
            lps, 519.7880372258198, 0.23034074282020697, 0.0015, 3.6984859583637294E-6
            ref_natural_sky, 246.47284729162408, 1.8153182933062362, 0.26968238776430503, 2.771839264016399E-6
            """)
    void derivedValues(String id, double efficacy, double scotopicPhotopic, double below500, double zeroLx) {
        Spectrum spectrum = SpectralClasses.byId(id).orElseThrow().spectrum();
        assertThat(spectrum.luminousEfficacyLmPerW()).isCloseTo(efficacy, within(1e-12 * efficacy));
        assertThat(spectrum.scotopicPhotopicRatio()).isCloseTo(scotopicPhotopic, within(1e-12 * scotopicPhotopic));
        assertThat(spectrum.shareBetween(380, 500)).isCloseTo(below500, within(1e-12 * below500));
        assertThat(spectrum.zeroMagnitudeIlluminanceLx()).isCloseTo(zeroLx, within(1e-12 * zeroLx));
    }
}
