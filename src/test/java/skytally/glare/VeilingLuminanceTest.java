package skytally.glare;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import skytally.glare.VeilingLuminance.AgeAdjustedStilesHolladay;
import skytally.glare.VeilingLuminance.CieGeneral;
import skytally.glare.VeilingLuminance.CieSmallAngle;
import skytally.glare.VeilingLuminance.StilesHolladay;
import skytally.photometry.Illuminance;
import skytally.photometry.Luminance;

@DisplayName("Veiling luminance")
class VeilingLuminanceTest {

    static Stream<VeilingLuminance> everyForm() {
        return Stream.of(
                StilesHolladay.CLASSIC,
                StilesHolladay.IN_STANDARDS,
                new AgeAdjustedStilesHolladay(70),
                new CieSmallAngle(35),
                new CieGeneral(35, 0),
                new CieGeneral(80, 1.2));
    }

    @ParameterizedTest
    @MethodSource("everyForm")
    void isRefusedOutsideItsRangeWithAMessageThatNamesIt(VeilingLuminance form) {
        AngleRange range = form.validity();
        for (double angleDeg :
                List.of(Math.nextDown(range.fromDeg()), Math.nextUp(range.toDeg()), 0.0, -5.0, Double.NaN)) {
            assertThatThrownBy(() -> form.from(new Illuminance(1), angleDeg))
                    .isInstanceOf(IllegalArgumentException.class)
                    .hasMessageContaining(range.toString());
        }
        assertThat(form.perLux(range.fromDeg())).isGreaterThan(form.perLux(range.toDeg()));
        assertThat(form.citation().reference()).isNotBlank();
    }

    @ParameterizedTest
    @MethodSource("everyForm")
    void fallsWithAngleAndGrowsInStepWithTheLight(VeilingLuminance form) {
        double step = (form.validity().toDeg() - form.validity().fromDeg()) / 200;
        for (int i = 1; i <= 200; i++) {
            double nearDeg = form.validity().fromDeg() + (i - 1) * step;
            double farDeg = Math.min(form.validity().toDeg(), nearDeg + step);
            assertThat(form.perLux(farDeg)).isLessThan(form.perLux(nearDeg));
        }
        double angleDeg = 10;
        assertThat(form.from(new Illuminance(3), angleDeg).candelaPerSquareMetre())
                .isCloseTo(3 * form.perLux(angleDeg), within(1e-15));
    }

    @ParameterizedTest
    @MethodSource("everyForm")
    void theAngleOfEqualityGivesBackTheLuminance(VeilingLuminance form) {
        Illuminance lamp = new Illuminance(0.01);
        Luminance compare = form.from(lamp, 12.5);
        double angleDeg = form.angleWhereVeilEquals(lamp, compare).angleDeg().orElseThrow();
        assertThat(angleDeg).isCloseTo(12.5, within(1e-12));
    }

    @ParameterizedTest
    @MethodSource("everyForm")
    void saysWhereNoAngleOfItsRangeIsTheAnswer(VeilingLuminance form) {
        assertThat(form.angleWhereVeilEquals(new Illuminance(1000), new Luminance(1e-6)))
                .isEqualTo(new VeilReach.Throughout(form.validity()));
        assertThat(form.angleWhereVeilEquals(new Illuminance(1e-9), new Luminance(1)))
                .isEqualTo(new VeilReach.Nowhere(form.validity()));
        assertThat(form.angleWhereVeilEquals(Illuminance.DARK, new Luminance(1)))
                .isEqualTo(new VeilReach.Nowhere(form.validity()));
    }

    @Test
    void isNotComparedWithDarkness() {
        assertThatThrownBy(() -> CieGeneral.DEFAULT.angleWhereVeilEquals(new Illuminance(1), new Luminance(0)))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @ParameterizedTest
    @ValueSource(doubles = {19.9, 80.1, 0, -1, Double.NaN})
    void refusesAnAgeOutside20To80(double ageYears) {
        assertThatThrownBy(() -> new CieGeneral(ageYears, 0.5)).hasMessageContaining("20 to 80");
        assertThatThrownBy(() -> new CieSmallAngle(ageYears)).hasMessageContaining("20 to 80");
        assertThatThrownBy(() -> new AgeAdjustedStilesHolladay(ageYears)).hasMessageContaining("20 to 80");
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.01, 1.21, Double.NaN})
    void refusesAPigmentOutside0To12(double pigment) {
        assertThatThrownBy(() -> new CieGeneral(35, pigment)).hasMessageContaining("0 (very dark eyes) to 1.2");
    }

    @Test
    void thresholdIncrementNeedsALitRoad() {
        assertThatThrownBy(() -> ThresholdIncrement.percent(new Luminance(0.1), new Luminance(0.05)))
                .hasMessageContaining("0.05 cd/m²");
    }

    @Test
    void glareRatingEndsBelowItsScale() {
        Luminance surroundings = GlareRating.veilOfSurroundings(new Illuminance(20), 0.25);
        assertThat(GlareRating.of(new Luminance(0), surroundings).isBelowScale())
                .isTrue();
        assertThat(GlareRating.of(new Luminance(0.3), surroundings).isBelowScale())
                .isFalse();
        assertThatThrownBy(() -> GlareRating.of(new Luminance(0.3), new Luminance(0)))
                .hasMessageContaining("lit ground");
    }
}
