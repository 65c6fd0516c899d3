package skytally.glare;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import skytally.glare.VeilingLuminance.CieGeneral;
import skytally.photometry.Illuminance;
import skytally.photometry.Luminance;

/** Our own numbers, held to 1e-12. A change here changes printed statements: its commit says by how much and why. */
@DisplayName("Veil, frozen")
class VeilingLuminanceFrozenTest {

    @ParameterizedTest(name = "{0} degrees")
    @CsvSource(textBlock = """
            0.1, 10549.722902479998
            1,   15.547892048
            10,  0.0716589728
            30,  0.009552861748148147
            60,  0.0037370628740740737
            """)
    void whatTheToolPrintsByDefault(double angleDeg, double perLux) {
        assertThat(CieGeneral.DEFAULT.perLux(angleDeg)).isCloseTo(perLux, within(1e-12 * perLux));
    }

    @Test
    void angleOfEquality() {
        assertThat(CieGeneral.DEFAULT
                        .angleWhereVeilEquals(new Illuminance(0.01), new Luminance(1.7e-4))
                        .angleDeg())
                .hasValueCloseTo(21.27699399764607, within(2e-11));
    }
}
