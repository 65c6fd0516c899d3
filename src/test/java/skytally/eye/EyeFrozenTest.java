package skytally.eye;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import skytally.photometry.LuminousIntensity;
import skytally.photometry.Magnitude;
import skytally.photometry.SurfaceBrightness;
import skytally.photometry.ZeroPoint;

/** Our own numbers, held to 1e-12. A change here changes printed statements: its commit says by how much and why. */
@DisplayName("The eye, frozen")
class EyeFrozenTest {

    @ParameterizedTest(name = "{0} mag/arcsec²")
    @CsvSource(textBlock = """
            22, 6.258662449897311
            20, 5.511340196084272
            18, 4.978030578053897
            16, 4.859438675327807
            """)
    void limitingMagnitude(double magArcsec2, double expected) {
        assertThat(LimitingMagnitude.on(
                                ZeroPoint.TRADITIONAL.luminance(new SurfaceBrightness(magArcsec2)),
                                LimitingMagnitude.CRUMEY_FIELD_FACTOR_TYPICAL,
                                ZeroPoint.TRADITIONAL)
                        .value())
                .isCloseTo(expected, within(5e-12));
    }

    @Test
    void starsAndDistances() {
        assertThat(StarCount.wholeSky(new Magnitude(6))).isCloseTo(5030.032602796402, within(5e-9));
        assertThat(PointVisibility.distanceWhereItDisappearsM(
                        new LuminousIntensity(1000), PointVisibility.NAVIGATION_PRACTICE, 1e-4))
                .isCloseTo(22713.097289766094, within(2e-8));
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource(textBlock = """
            polaris,      3.161008885427508E-7
            sirius,       8.106506151955934E-6
            venus,        1.2169998273532767E-4
            quarter-moon, 0.019792038022983804
            full-moon,    0.21942722793409916
            """)
    void rungs(String id, double lux) {
        assertThat(NaturalAnchors.byId(id)
                        .orElseThrow()
                        .illuminance(ZeroPoint.TRADITIONAL)
                        .lux())
                .isCloseTo(lux, within(1e-12 * lux));
    }
}
