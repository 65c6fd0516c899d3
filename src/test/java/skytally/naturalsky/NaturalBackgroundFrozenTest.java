package skytally.naturalsky;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import skytally.photometry.ZeroPoint;

/** Our own numbers, held to 1e-12. A change here changes printed statements: its commit says by how much and why. */
@DisplayName("Natural sky, frozen")
class NaturalBackgroundFrozenTest {

    private static final NaturalBackground SKY = NaturalBackground.reference(0.243);

    @ParameterizedTest(name = "Z = {0}")
    @CsvSource(textBlock = """
            0,  22.0,               1.8690387639166414E-4, 2.5090535843180395E-9
            45, 21.867409277177277, 2.1118088126923532E-4, 2.834955364851111E-9
            60, 21.751738874292183, 2.3492149666607586E-4, 3.1536564924325156E-9
            80, 21.610064293681457, 2.6766561935976627E-4, 3.5932233970685165E-9
            """)
    void bySightline(double zenithAngleDeg, double magArcsec2, double photopicCdM2, double radiance) {
        assertThat(SKY.brightnessAt(zenithAngleDeg).magArcsec2()).isCloseTo(magArcsec2, within(2e-11));
        assertThat(SKY.photopicLuminanceAt(zenithAngleDeg).candelaPerSquareMetre())
                .isCloseTo(photopicCdM2, within(1e-12 * photopicCdM2));
        assertThat(SKY.johnsonVRadianceAt(zenithAngleDeg)).isCloseTo(radiance, within(1e-12 * radiance));
    }

    @Test
    void onSurfaces() {
        assertThat(SKY.horizontalIlluminance(ZeroPoint.TRADITIONAL).lux())
                .isCloseTo(6.263257645838897E-4, within(1e-12 * 6.3e-4));
        assertThat(SKY.verticalIlluminance(ZeroPoint.TRADITIONAL).lux())
                .isCloseTo(3.4581621165872444E-4, within(1e-12 * 3.5e-4));
    }
}
