package skytally.eye;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import skytally.photometry.Luminance;
import skytally.photometry.Magnitude;
import skytally.photometry.ZeroPoint;

@DisplayName("Limiting magnitude")
class LimitingMagnitudeTest {

    @Test
    void aBrighterSkyNeverShowsFainterStars() {
        double before = 0;
        for (double log = -6; log <= 4; log += 0.001) {
            double now = LimitingMagnitude.threshold(new Luminance(Math.pow(10, log)), 2)
                    .lux();
            assertThat(now).as("at 10^%s cd/m²", log).isGreaterThanOrEqualTo(before);
            before = now;
        }
    }

    @Test
    void isHeldInDeepDarkness() {
        assertThat(LimitingMagnitude.threshold(new Luminance(0), 2))
                .isEqualTo(LimitingMagnitude.threshold(new Luminance(1e-5), 2));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.99, 5.01, Double.NaN})
    void refusesAFieldFactorOutOfRange(double fieldFactor) {
        assertThatThrownBy(() -> LimitingMagnitude.threshold(new Luminance(1e-4), fieldFactor))
                .hasMessageContaining("1 to 5");
    }

    @Test
    void refusesAZeroPointWithExtinctionInIt() {
        assertThatThrownBy(() -> LimitingMagnitude.on(new Luminance(1e-4), 2, ZeroPoint.GROUND_14_18))
                .hasMessageContaining("GROUND_14_18");
    }

    @Test
    void aBandIsInOrder() {
        assertThatThrownBy(() -> new LimitingMagnitude.Band(new Magnitude(5), new Magnitude(6), new Magnitude(5.8)))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
