package skytally.eye;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.Checks;
import skytally.photometry.Luminance;
import skytally.photometry.SurfaceBrightness;
import skytally.photometry.ZeroPoint;

@DisplayName("Limiting magnitude against Crumey (2014) and independent values")
class LimitingMagnitudeReferenceTest {

    private static final String CHECKS = "eye-checks.csv";

    /** The paper's own pair, m = −2.5 log E − 13.99 and μ = 12.58 − 2.5 log B: passed in, never used by the program. */
    private static double paperMagnitude(double lux) {
        return -2.5 * Math.log10(lux) - 13.99;
    }

    private static double paperLuminance(double magArcsec2) {
        return Math.pow(10, 0.4 * (12.58 - magArcsec2));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("equations34And53")
    void asPrinted(Checks.Row row) {
        double background = paperLuminance(row.input("mu"));
        row.isMatchedBy(
                paperMagnitude(2 * Crumey2014.eq34Lx(background)), paperMagnitude(2 * Crumey2014.eq53Lx(background)));
    }

    static Stream<Checks.Row> equations34And53() {
        return Checks.of(CHECKS, "CR-1", "CR-2");
    }

    /** Published by the paper itself: 6.93 (F = 1), 6.18 (F = 2), 24.94 at 2e-4 cd/m². */
    @Test
    void verificationsOfThePaper() {
        Checks.row(CHECKS, "CR-PUB1").isMatchedBy(paperMagnitude(Crumey2014.eq53Lx(2e-4)));
        Checks.row(CHECKS, "CR-PUB2").isMatchedBy(paperMagnitude(2 * Crumey2014.eq53Lx(2e-4)));
        Checks.row(CHECKS, "CR-PUB3").isMatchedBy(12.58 - 2.5 * Math.log10(Crumey2014.eq56CdM2(2e-4)));
    }

    /** Eq. 34 blends the branches: by day vision it comes within 0.1 mag of Eq. 33. */
    @Test
    void meetsTheDayBranch() {
        assertThat(paperMagnitude(Crumey2014.eq34Lx(10))).isCloseTo(paperMagnitude(Crumey2014.eq33Lx(10)), within(0.1));
    }

    @Test
    void isHeldAcrossTheDip() {
        Luminance background = new Luminance(paperLuminance(16.0));
        Checks.row(CHECKS, "CR-CLAMP")
                .isMatchedBy(paperMagnitude(
                        LimitingMagnitude.threshold(background, 2).lux()));
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource(textBlock = """
            CR-INV55, 5.5
            CR-INV60, 6.0
            """)
    void skyWhereTheLimitIs(String id, double limit) {
        double bright = 18;
        double dark = 22;
        for (int i = 0; i < 60; i++) {
            double middle = (bright + dark) / 2;
            double seen = paperMagnitude(LimitingMagnitude.threshold(new Luminance(paperLuminance(middle)), 2)
                    .lux());
            if (seen < limit) {
                bright = middle;
            } else {
                dark = middle;
            }
        }
        Checks.row(CHECKS, id).isMatchedBy(dark);
    }

    /** The table for the program's own zero point, computed for this project with the paper's: 0.01 mag apart at most. */
    @ParameterizedTest(name = "{0} mag/arcsec²")
    @CsvSource(textBlock = """
            22.0, 6.26, 6.65, 6.06
            21.5, 6.06, 6.45, 5.86
            21.0, 5.87, 6.25, 5.67
            20.5, 5.68, 6.07, 5.49
            20.0, 5.51, 5.90, 5.31
            19.0, 5.21, 5.59, 5.01
            18.0, 4.98, 5.36, 4.78
            17.0, 4.86, 5.25, 4.66
            16.0, 4.86, 5.24, 4.66
            """)
    void bandOnASky(double magArcsec2, double typical, double keen, double ordinary) {
        LimitingMagnitude.Band band = LimitingMagnitude.band(
                ZeroPoint.TRADITIONAL.luminance(new SurfaceBrightness(magArcsec2)), ZeroPoint.TRADITIONAL);
        assertThat(band.typical().value()).isCloseTo(typical, within(0.012));
        assertThat(band.keen().value()).isCloseTo(keen, within(0.012));
        assertThat(band.ordinary().value()).isCloseTo(ordinary, within(0.012));
    }
}
