package skytally.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

@DisplayName("The quick arcsine")
class ArcsineTest {

    @Test
    void isTheLibrarysToThreeInATrillion() {
        for (double sine = 1e-9; sine <= 1; sine += 1e-5) {
            assertThat(Arcsine.of(sine) / StrictMath.asin(sine))
                    .as("of %s", sine)
                    .isCloseTo(1, within(3e-12));
        }
    }

    @Test
    void isExactAtItsEnds() {
        assertThat(Arcsine.of(0)).isZero();
        assertThat(Arcsine.of(1)).isEqualTo(Math.PI / 2);
        assertThat(Arcsine.of(0.5)).isCloseTo(Math.PI / 6, within(3e-12));
        assertThat(Arcsine.of(Math.nextUp(0.5))).isCloseTo(Math.PI / 6, within(3e-12));
    }
}
