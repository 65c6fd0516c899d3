package skytally.naturalsky;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.Checks;
import skytally.photometry.Illuminance;
import skytally.photometry.Luminance;
import skytally.photometry.Magnitude;
import skytally.photometry.SurfaceBrightness;
import skytally.photometry.ZeroPoint;
import skytally.spectrum.SpectralClasses;

@DisplayName("Natural sky against independent values")
class NaturalBackgroundReferenceTest {

    private static final String CHECKS = "naturalsky-checks.csv";

    /** The rows' papers write L = 1.08e5 · 10^(−0.4 μ); the program's own zero point is not used on them. */
    private static final ZeroPoint OF_THE_PAPERS =
            ZeroPoint.spectral(1.08e5 / SurfaceBrightness.SQUARE_ARCSECONDS_PER_STERADIAN);

    @ParameterizedTest(name = "{0}")
    @MethodSource("altitudes")
    void brightnessOverTheZenith(Checks.Row row) {
        row.isMatchedBy(NaturalBackground.reference(0.15).relativeBrightness(row.input("Z")));
    }

    static Stream<Checks.Row> altitudes() {
        return Checks.of(CHECKS, "ALT-");
    }

    /** Brightening over the zenith in magnitudes, f = 0.6; computed for this project. Patat (2003): 0.08 at 30, 0.24 at 50. */
    @ParameterizedTest(name = "Z = {0}")
    @CsvSource(textBlock = """
            30, 0.08, 0.07, 0.06
            45, 0.18, 0.17, 0.13
            60, 0.36, 0.33, 0.24
            70, 0.54, 0.48, 0.33
            80, 0.76, 0.65, 0.37
            85, 0.84, 0.71, 0.35
            90, 0.88, 0.73, 0.33
            """)
    void brighteningOverTheZenith(double zenithAngleDeg, double at0113, double at015, double at025) {
        assertThat(brightening(0.113, zenithAngleDeg)).isCloseTo(at0113, within(0.0051));
        assertThat(brightening(0.15, zenithAngleDeg)).isCloseTo(at015, within(0.0051));
        assertThat(brightening(0.25, zenithAngleDeg)).isCloseTo(at025, within(0.0051));
    }

    private static double brightening(double kV, double zenithAngleDeg) {
        return 22.0
                - NaturalBackground.reference(kV).brightnessAt(zenithAngleDeg).magArcsec2();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("illuminances")
    void lightOnSurfaces(Checks.Row row) {
        NaturalBackground sky =
                new NaturalBackground(NaturalBackground.FALCHI_2016_ZENITH, row.input("f"), row.input("k"));
        Illuminance actual = row.id().startsWith("EH")
                ? sky.horizontalIlluminance(OF_THE_PAPERS)
                : sky.verticalIlluminance(OF_THE_PAPERS);
        row.isMatchedBy(actual.lux() * 1000);
    }

    static Stream<Checks.Row> illuminances() {
        return Checks.of(CHECKS, "EH-", "EV-");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("ratios")
    void brighteningByArtificialLight(Checks.Row row) {
        row.isMatchedBy(NaturalBackground.brighteningMag(row.input("r")));
    }

    static Stream<Checks.Row> ratios() {
        return Checks.of(CHECKS, "RATIO-");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("luminances")
    void luminanceOnThePapersScale(Checks.Row row) {
        row.isMatchedBy(
                OF_THE_PAPERS.luminance(new SurfaceBrightness(row.input("mu"))).candelaPerSquareMetre());
    }

    static Stream<Checks.Row> luminances() {
        return Checks.of(CHECKS, "CONV-2", "CONV-18", "CONV-S10");
    }

    /** Garstang's formula in nanolamberts belongs to papers; it lies within 0.8 % of the program's scale. */
    @Test
    void nanolamberts() {
        double nanolamberts = 34.08 * Math.exp(20.7233 - 0.92104 * 22);
        Checks.row(CHECKS, "CONV-nL").isMatchedBy(nanolamberts);
        Checks.row(CHECKS, "CONV-nL2").isMatchedBy(Luminance.ofNanolamberts(1).candelaPerSquareMetre());
        assertThat(Luminance.ofNanolamberts(nanolamberts).candelaPerSquareMetre())
                .isCloseTo(
                        ZeroPoint.TRADITIONAL
                                .luminance(new SurfaceBrightness(22))
                                .candelaPerSquareMetre(),
                        within(0.008 * 1.7e-4));
    }

    @Test
    void aStarOfMagnitudeZero() {
        assertThat(ZeroPoint.TRADITIONAL.illuminance(new Magnitude(0)).lux())
                .isEqualTo(Checks.row(CHECKS, "CONV-E").expectedValue());
    }

    /** 187 µcd/m² by the spectrum of the natural sky (range for measured skies 187-227, Bara et al. 2020), 171.27 traditional. */
    @Test
    void luminanceOfTheZenith() {
        NaturalBackground sky = NaturalBackground.reference(0.243);
        assertThat(sky.photopicLuminanceAt(0).candelaPerSquareMetre()).isCloseTo(187e-6, within(0.5e-6));
        assertThat(sky.luminanceAt(0, ZeroPoint.TRADITIONAL).candelaPerSquareMetre())
                .isCloseTo(171.27e-6, within(0.005e-6));
    }

    /** The natural spectrum's V radiance, turned to lux by that spectrum, is its photopic luminance: one scale, two ways. */
    @Test
    void radianceAndLuminanceTellOfTheSameSky() {
        NaturalBackground sky = NaturalBackground.reference(0.2);
        double perLux = SpectralClasses.naturalSky().spectrum().johnsonVFluxDensityPerLux();
        assertThat(sky.johnsonVRadianceAt(60) / perLux)
                .isCloseTo(sky.photopicLuminanceAt(60).candelaPerSquareMetre(), within(1e-16));
    }
}
