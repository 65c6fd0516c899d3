package skytally.photometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.Checks;

@DisplayName("Quantities of light against definitions and independent values")
class PhotometryReferenceTest {

    private static final String CHECKS = "photometry-checks.csv";
    private static final double SQUARE_ARCSECONDS = SurfaceBrightness.SQUARE_ARCSECONDS_PER_STERADIAN;

    /** Common practice: a bare source of 1500 lm gives 29.8 lx at 2 m. */
    @Test
    void aBareSourceOf1500LumensAt2Metres() {
        Illuminance at2m = Illuminance.from(LuminousIntensity.allRound(new LuminousFlux(1500)), 2, 0);
        Checks.row(CHECKS, "M02").isMatchedBy(at2m.lux());
        assertThat(at2m.lux()).isCloseTo(29.8, within(0.05));
    }

    @Test
    void theSameSourceFrom1Kilometre() {
        Illuminance at1km = Illuminance.from(LuminousIntensity.allRound(new LuminousFlux(1500)), 1000, 0);
        Checks.row(CHECKS, "M04")
                .isMatchedBy(ZeroPoint.TRADITIONAL.magnitude(at1km).value());
    }

    @Test
    void twiceAsFar() {
        LuminousIntensity lamp = new LuminousIntensity(80);
        Checks.row(CHECKS, "M05").isMatchedBy(magnitude(lamp, 200) - magnitude(lamp, 100));
    }

    private static double magnitude(LuminousIntensity lamp, double distanceM) {
        return ZeroPoint.TRADITIONAL
                .magnitude(Illuminance.from(lamp, distanceM, 0))
                .value();
    }

    /** Pogson's definition: five magnitudes are a factor of one hundred. */
    @Test
    void stepsOfMagnitude() {
        Checks.row(CHECKS, "M06").isMatchedBy(Magnitude.ratioOfDifference(5));
        Checks.row(CHECKS, "M06").isMatchedBy(new Magnitude(-1).timesBrighterThan(new Magnitude(4)));
        Checks.row(CHECKS, "M07").isMatchedBy(Magnitude.ratioOfDifference(1));
    }

    @Test
    void sourcesAddInLux() {
        Checks.row(CHECKS, "M08").isMatchedBy(together(3, 3));
        Checks.row(CHECKS, "M09").isMatchedBy(together(1, 2, 3));
        Checks.row(CHECKS, "M11").isMatchedBy(together(6, 6, 6, 6, 6, 6, 6, 6, 6, 6) - 6);
    }

    private static double together(double... magnitudes) {
        Illuminance sum = Illuminance.DARK;
        for (double magnitude : magnitudes) {
            sum = sum.plus(ZeroPoint.TRADITIONAL.illuminance(new Magnitude(magnitude)));
        }
        return ZeroPoint.TRADITIONAL.magnitude(sum).value();
    }

    @Test
    void groundZeroPoint() {
        Checks.row(CHECKS, "Z02").isMatchedBy(ZeroPoint.GROUND_14_18.zeroMagnitudeLx());
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("oneLux")
    void magnitudeOfOneLux(Checks.Row row) {
        row.isMatchedBy(ZeroPoint.spectral(row.input("E0"))
                .magnitude(new Illuminance(1))
                .value());
    }

    static Stream<Checks.Row> oneLux() {
        return Checks.of(CHECKS, "Z03");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("zeroPointLuminances")
    void zeroPointLuminanceIsDerived(Checks.Row row) {
        row.isMatchedBy(ZeroPoint.spectral(row.input("E0")).zeroPointLuminanceCdM2());
    }

    static Stream<Checks.Row> zeroPointLuminances() {
        return Checks.of(CHECKS, "Z04");
    }

    @Test
    void presetsHoldThoseLuminances() {
        Checks.row(CHECKS, "Z04-ALLEN").isMatchedBy(ZeroPoint.TRADITIONAL.zeroPointLuminanceCdM2());
        Checks.row(CHECKS, "Z04-CALSPEC-A0").isMatchedBy(ZeroPoint.CALSPEC_A0.zeroPointLuminanceCdM2());
        Checks.row(CHECKS, "Z04-CALSPEC-SUN").isMatchedBy(ZeroPoint.CALSPEC_SUN.zeroPointLuminanceCdM2());
        Checks.row(CHECKS, "V-K").isMatchedBy(ZeroPoint.TRADITIONAL.zeroPointLuminanceCdM2());
    }

    @Test
    void zeroPointBehindTheUsualSkyFormula() {
        Checks.row(CHECKS, "Z05").isMatchedBy(10.8e4 / SQUARE_ARCSECONDS);
    }

    /** 12200 lm/ft² of sunlight (JOSA 45, 483, 1955) at V = −26.74. */
    @Test
    void zeroPointFromSunlight() {
        double sunlightLx = Illuminance.ofFootcandles(12_200).lux();
        Checks.row(CHECKS, "Z16").isMatchedBy(sunlightLx * Magnitude.ratioOfDifference(-26.74));
    }

    /** Sirius −1.46, Vega 0.03, Venus −4.6, full Moon −12.74, Sun −26.74 (from memory) under each convention. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("bodies")
    void illuminanceOfABody(Checks.Row row) {
        ZeroPoint zeroPoint = preset(row);
        row.isMatchedBy(zeroPoint.illuminance(new Magnitude(row.input("m"))).lux());
        assertThat(zeroPoint.zeroMagnitudeLx()).isCloseTo(row.input("E0"), within(1e-11));
    }

    static Stream<Checks.Row> bodies() {
        return Checks.of(CHECKS, "I-");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("skies")
    void luminanceOfASky(Checks.Row row) {
        row.isMatchedBy(
                preset(row).luminance(new SurfaceBrightness(row.input("mu"))).candelaPerSquareMetre());
    }

    static Stream<Checks.Row> skies() {
        return Checks.of(CHECKS, "L-1", "L-2").filter(row -> row.inputs().startsWith("mu="));
    }

    private static ZeroPoint preset(Checks.Row row) {
        if (row.id().endsWith("ALLEN")) {
            return ZeroPoint.TRADITIONAL;
        }
        if (row.id().endsWith("CALSPEC-SUN")) {
            return ZeroPoint.CALSPEC_SUN;
        }
        return row.id().endsWith("GROUND-14.18")
                ? ZeroPoint.GROUND_14_18
                : ZeroPoint.spectral(10.8e4 / SQUARE_ARCSECONDS);
    }

    @Test
    void brightnessOfASky() {
        Checks.row(CHECKS, "L-174")
                .isMatchedBy(ZeroPoint.TRADITIONAL
                        .surfaceBrightness(new Luminance(174e-6))
                        .magArcsec2());
        Checks.row(CHECKS, "L-1mcd")
                .isMatchedBy(ZeroPoint.TRADITIONAL
                        .surfaceBrightness(new Luminance(1e-3))
                        .magArcsec2());
        Checks.row(CHECKS, "V-22")
                .isMatchedBy(ZeroPoint.TRADITIONAL
                        .luminance(new SurfaceBrightness(22))
                        .candelaPerSquareMetre());
    }

    /** Garstang and Schaefer's 34.08 exp(20.7233 − 0.92104 μ) nanolamberts: a neighbour of the traditional zero point. */
    @Test
    void nanolamberts() {
        Checks.row(CHECKS, "L-nL").isMatchedBy(Luminance.ofNanolamberts(1).candelaPerSquareMetre());
        Checks.row(CHECKS, "L-G0").isMatchedBy(34.08 * Math.exp(20.7233 - 0.92104 * 22));
        Checks.row(CHECKS, "L-G3")
                .isMatchedBy(Luminance.ofNanolamberts(34.08 * Math.exp(20.7233)).candelaPerSquareMetre()
                        / SQUARE_ARCSECONDS);
    }

    /** One star of magnitude 10 on each square degree. */
    @Test
    void tenthMagnitudeStars() {
        double magArcsec2 = 10 + Magnitude.differenceOfRatio(3600.0 * 3600.0);
        Checks.row(CHECKS, "L-S10").isMatchedBy(magArcsec2);
        Checks.row(CHECKS, "L-S10b")
                .isMatchedBy(ZeroPoint.TRADITIONAL
                        .luminance(new SurfaceBrightness(magArcsec2))
                        .candelaPerSquareMetre());
    }

    @Test
    void mattGround() {
        Checks.row(CHECKS, "G01")
                .isMatchedBy(Luminance.ofMattSurface(new Illuminance(10), 0.10).candelaPerSquareMetre());
        Checks.row(CHECKS, "G02").isMatchedBy(new LuminousFlux(1000).times(0.10).lumens());
    }

    /** A light reliably noticed at sea, 2e-7 lx. */
    @Test
    void magnitudeOfTheNavigationThreshold() {
        Checks.row(CHECKS, "A-mag")
                .isMatchedBy(
                        ZeroPoint.TRADITIONAL.magnitude(new Illuminance(2e-7)).value());
    }
}
