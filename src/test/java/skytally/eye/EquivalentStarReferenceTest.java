package skytally.eye;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import skytally.Checks;
import skytally.photometry.Illuminance;
import skytally.photometry.LuminousFlux;
import skytally.photometry.LuminousIntensity;
import skytally.photometry.Magnitude;
import skytally.photometry.ZeroPoint;
import skytally.spectrum.SpectralClasses;

@DisplayName("The star a lamp equals")
class EquivalentStarReferenceTest {

    private static final String CHECKS = "eye-checks.csv";
    private static final Illuminance TEN_MICROLUX = new Illuminance(1e-5);

    @Test
    void tenMicrolux() {
        Checks.row(CHECKS, "Q01")
                .isMatchedBy(EquivalentStar.overhead(TEN_MICROLUX, ZeroPoint.TRADITIONAL)
                        .value());
        Checks.row(CHECKS, "Q02")
                .isMatchedBy(EquivalentStar.catalogue(TEN_MICROLUX, ZeroPoint.TRADITIONAL, 0.20, 1.99429)
                        .value());
    }

    /** The encyclopaedic formula is the traditional zero point with 0.192 mag of extinction folded in. */
    @Test
    void groundFormulaComesWithinAHundredth() {
        Magnitude byGround = EquivalentStar.overhead(TEN_MICROLUX, ZeroPoint.GROUND_14_18);
        Magnitude withoutAir = EquivalentStar.withoutAir(TEN_MICROLUX, ZeroPoint.TRADITIONAL);
        Magnitude overhead = EquivalentStar.overhead(TEN_MICROLUX, ZeroPoint.TRADITIONAL);
        Checks.row(CHECKS, "Q03").isMatchedBy(withoutAir.value() - byGround.value());
        Checks.row(CHECKS, "Q04").isMatchedBy(byGround.value() - overhead.value());
    }

    @Test
    void extinctionIsNotTakenOffTwice() {
        assertThat(EquivalentStar.overhead(TEN_MICROLUX, ZeroPoint.GROUND_14_18))
                .isEqualTo(ZeroPoint.GROUND_14_18.magnitude(TEN_MICROLUX));
        assertThat(EquivalentStar.catalogue(TEN_MICROLUX, ZeroPoint.GROUND_14_18, 0.2, 1.99429)
                        .value())
                .isCloseTo(ZeroPoint.GROUND_14_18.magnitude(TEN_MICROLUX).value() - 0.2 * 0.99429, within(1e-12));
    }

    @Test
    void toTheEyeAndBack() {
        Magnitude star = EquivalentStar.catalogue(TEN_MICROLUX, ZeroPoint.CALSPEC_SUN, 0.243, 2.9);
        assertThat(EquivalentStar.atEye(star, ZeroPoint.CALSPEC_SUN, 0.243, 2.9).lux())
                .isCloseTo(1e-5, within(1e-18));
    }

    /** Against a Sun-like star: LPS +2.5 mag, HPS +1.5, LED 4000 K +0.4. */
    @ParameterizedTest(name = "{0}")
    @CsvSource(textBlock = """
            lps, 2.5
            hps, 1.5
            led4000, 0.4
            """)
    void scotopicLight(String spectralClass, double expectedMag) {
        double lamp =
                SpectralClasses.byId(spectralClass).orElseThrow().spectrum().scotopicPhotopicRatio();
        double sun = SpectralClasses.sunLike().spectrum().scotopicPhotopicRatio();
        assertThat(EquivalentStar.inScotopicLight(new Magnitude(0), lamp, sun).value())
                .isCloseTo(expectedMag, within(0.05));
    }

    /** A bare source of 1500 lm from 1 km: −4.180. */
    @Test
    void standardMagnitude() {
        assertThat(EquivalentStar.standardMagnitude(
                                LuminousIntensity.allRound(new LuminousFlux(1500)), ZeroPoint.TRADITIONAL)
                        .value())
                .isCloseTo(-4.18012, within(0.000005));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.98, 38.1, Double.NaN})
    void refusesAnAirMassThatIsNone(double airMass) {
        assertThatThrownBy(() -> EquivalentStar.catalogue(TEN_MICROLUX, ZeroPoint.TRADITIONAL, 0.2, airMass))
                .hasMessageContaining("0.99 to 38");
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.1, 3.1, Double.NaN})
    void refusesAnExtinctionThatIsNone(double kV) {
        assertThatThrownBy(() -> EquivalentStar.catalogue(TEN_MICROLUX, ZeroPoint.TRADITIONAL, kV, 1))
                .hasMessageContaining("0 to 3");
    }

    @Test
    void noLightEqualsNoStar() {
        assertThatThrownBy(() -> EquivalentStar.overhead(Illuminance.DARK, ZeroPoint.TRADITIONAL))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
