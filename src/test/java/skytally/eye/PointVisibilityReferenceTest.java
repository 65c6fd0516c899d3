package skytally.eye;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import skytally.Checks;
import skytally.eye.PointVisibility.Threshold;
import skytally.photometry.Illuminance;
import skytally.photometry.Luminance;
import skytally.photometry.LuminousIntensity;
import skytally.photometry.SurfaceBrightness;
import skytally.photometry.ZeroPoint;

@DisplayName("How far a lamp is seen")
class PointVisibilityReferenceTest {

    private static final String CHECKS = "eye-checks.csv";
    private static final double NAUTICAL_MILE_M = 1852;

    /** 33 CFR 84.15: I = 3.43e6 T D² K^−D; the constant is 1852² rounded, hence 1e-4. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("navigationLights")
    void navigationLight(Checks.Row row) {
        double intensityCd = navigationLightCd(row.input("range"));
        assertThat(intensityCd).isCloseTo(row.expectedValue(), withinPercentage(0.01));
    }

    static Stream<Checks.Row> navigationLights() {
        return Checks.of(CHECKS, "A-1", "A-2", "A-3", "A-5", "A-6")
                .filter(row -> !row.id().contains("nm"));
    }

    /** The table printed in 33 CFR 84.15. */
    @ParameterizedTest(name = "{0} nautical miles")
    @CsvSource(textBlock = """
            1, 0.9
            2, 4.3
            3, 12
            4, 27
            5, 52
            6, 94
            """)
    void navigationLightAsPrinted(double miles, BigDecimal candela) {
        assertThat(new BigDecimal(navigationLightCd(miles))
                        .round(new MathContext(candela.precision()))
                        .doubleValue())
                .isEqualTo(candela.doubleValue());
    }

    private static double navigationLightCd(double miles) {
        double extinctionPerMetre = -Math.log(0.8) / NAUTICAL_MILE_M;
        return PointVisibility.intensityJustSeen(
                        miles * NAUTICAL_MILE_M, PointVisibility.NAVIGATION_PRACTICE, extinctionPerMetre)
                .candela();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("distances")
    void distanceOfDisappearance(Checks.Row row) {
        double extinctionPerMetre = row.inputs().contains("no extinction")
                ? 0
                : VisualRange.WEATHER_REPORT.extinctionPerMetre(row.input("visual range"));
        LuminousIntensity lamp =
                new LuminousIntensity(Double.parseDouble(row.inputs().split(" ")[0]));
        row.isMatchedBy(PointVisibility.distanceWhereItDisappearsM(
                lamp, PointVisibility.NAVIGATION_PRACTICE, extinctionPerMetre));
    }

    static Stream<Checks.Row> distances() {
        return Checks.of(CHECKS, "A-vac", "A-10nm");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("hecht")
    void secondOpinion(Checks.Row row) {
        row.isMatchedBy(PointVisibility.detectionByHecht(
                        ZeroPoint.TRADITIONAL.luminance(new SurfaceBrightness(row.input("background"))))
                .lux());
    }

    static Stream<Checks.Row> hecht() {
        return Checks.of(CHECKS, "A-hecht");
    }

    /** The short form, 7.93 − 5 log10(10^(4.316 − μ/5) + 1), is said to agree to 0.01 mag. */
    @Test
    void secondOpinionAsAMagnitude() {
        double magnitude = ZeroPoint.TRADITIONAL
                .magnitude(PointVisibility.detectionByHecht(ZeroPoint.TRADITIONAL.luminance(new SurfaceBrightness(21))))
                .value();
        assertThat(magnitude).isCloseTo(Checks.row(CHECKS, "A-nelm-21").expectedValue(), within(0.011));
    }

    /** Crumey (2014), F = 2; computed for this project with the paper's μ scale, 0.4 % darker than ours, so a digit is given. */
    @ParameterizedTest(name = "{0} mag/arcsec²")
    @CsvSource(textBlock = """
            22, 8.0e-9, 0.05e-9
            21, 1.14e-8, 0.005e-8
            20, 1.58e-8, 0.01e-8
            18, 2.6e-8, 0.05e-8
            """)
    void detection(double magArcsec2, double lux, double halfDigit) {
        assertThat(PointVisibility.detection(ZeroPoint.TRADITIONAL.luminance(new SurfaceBrightness(magArcsec2)))
                        .lux())
                .isCloseTo(lux, within(halfDigit));
    }

    @Test
    void allard() {
        Illuminance atEye = new Illuminance(PointVisibility.illuminanceLx(
                new LuminousIntensity(1000), 5000, VisualRange.KOSCHMIEDER.extinctionPerMetre(20_000)));
        Checks.row(CHECKS, "A-Allard").isMatchedBy(atEye.lux());
        Checks.row(CHECKS, "A-Allard-m")
                .isMatchedBy(
                        EquivalentStar.withoutAir(atEye, ZeroPoint.TRADITIONAL).value());
    }

    @Test
    void visualRanges() {
        Checks.row(CHECKS, "A-Kos").isMatchedBy(VisualRange.KOSCHMIEDER.extinctionPerMetre(1));
        Checks.row(CHECKS, "A-beta20").isMatchedBy(VisualRange.KOSCHMIEDER.extinctionPerMetre(20_000) * 1000);
        Checks.row(CHECKS, "A-Vmet").isMatchedBy(VisualRange.KOSCHMIEDER.rangeM(0.0787998e-3) / 1000);
        assertThat(VisualRange.WEATHER_REPORT.extinctionPerMetre(1)).isCloseTo(2.996, within(0.0005));
    }

    /** 25 (Crumey) to 35 (Hecht) between a light reliably noticed and one just made out, under a natural sky. */
    @Test
    void thresholdsAnswerDifferentQuestions() {
        Luminance sky = ZeroPoint.TRADITIONAL.luminance(new SurfaceBrightness(22));
        double noticed = Threshold.RELIABLY_NOTICED.on(sky).lux();
        assertThat(noticed / Threshold.JUST_MADE_OUT.on(sky).lux()).isCloseTo(25, within(0.5));
        assertThat(noticed / Threshold.JUST_MADE_OUT_BY_HECHT.on(sky).lux()).isCloseTo(35, within(0.5));
        for (Threshold threshold : Threshold.values()) {
            assertThat(threshold.words()).isNotBlank();
            assertThat(threshold.citation().reference()).isNotBlank();
        }
    }

    @Test
    void aLampThatGivesNothingIsSeenFromNowhere() {
        assertThat(PointVisibility.distanceWhereItDisappearsM(
                        new LuminousIntensity(0), PointVisibility.NAVIGATION_PRACTICE, 1e-4))
                .isZero();
    }

    @Test
    void evenTheBrightestLampDisappearsSomewhere() {
        assertThat(PointVisibility.distanceWhereItDisappearsM(
                        new LuminousIntensity(1e308), PointVisibility.NAVIGATION_PRACTICE, 1e-4))
                .isFinite()
                .isPositive();
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1e-9, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesAnExtinctionThatIsNone(double extinctionPerMetre) {
        assertThatThrownBy(() -> PointVisibility.distanceWhereItDisappearsM(
                        new LuminousIntensity(1), PointVisibility.NAVIGATION_PRACTICE, extinctionPerMetre))
                .hasMessageContaining("per metre");
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -1, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesAVisualRangeThatIsNone(double rangeM) {
        assertThatThrownBy(() -> VisualRange.KOSCHMIEDER.extinctionPerMetre(rangeM))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
