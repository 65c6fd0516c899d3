package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The flux of a shape against closed forms. */
@DisplayName("The upward part of an emission, by zenith angle")
class UpwardShapeTest {

    @ParameterizedTest(name = "{0}")
    @ValueSource(strings = {"lambert", "ring0-30", "ring30-60", "ring80-90", "ring88-89"})
    void keepsTheFlux(String emission) {
        assertThat(UpwardShape.of(TestEmissions.named(emission)).flux()).isCloseTo(1, within(1e-9));
    }

    @Test
    void mattGroundSendsBackOne() {
        assertThat(UpwardShape.mattGround().flux()).isCloseTo(1, within(1e-9));
    }

    /** Matt ground is straight enough between the hats to be met closely. */
    @Test
    void mattGroundIsTheCosine() {
        UpwardShape ground = UpwardShape.mattGround();
        for (int hat = 0; hat < ZenithHats.COUNT; hat++) {
            assertThat(ground.weight(hat)).isCloseTo(Math.cos(ZenithHats.peak(hat)) / Math.PI, within(0.01));
        }
    }

    /**
     * A beam (n + 1)/2π cosⁿ of one unit, tilted from straight up: all of it goes up while it is narrow and high; half
     * of it where it points level, whatever its width.
     */
    @ParameterizedTest(name = "width {0}, {1}° from overhead")
    @CsvSource({
        "20000, 0, 1",
        "20000, 10, 1",
        "20000, 60, 1",
        "20000, 90, 0.5",
        "1, 90, 0.5",
        "300, 90, 0.5",
        "1, 180, 0"
    })
    void seesBeamsOfAnyWidth(double exponent, double fromOverheadDeg, double expected) {
        double tilt = Math.toRadians(fromOverheadDeg);
        double up = Math.cos(tilt);
        double ahead = Math.sin(tilt) * Math.cos(1);
        double left = Math.sin(tilt) * Math.sin(1);
        double half = Math.acos(Math.pow(0.5, 1 / exponent));
        List<Emission.Cone> edges = new ArrayList<>();
        for (double angle = half; angle < Math.PI / 2; angle *= 2) {
            edges.add(new Emission.Cone(ahead, left, up, Math.cos(angle)));
        }
        edges.add(new Emission.Cone(ahead, left, up, 0));
        Emission beam = TestEmissions.of(
                (a, l, u) -> {
                    double cosine = a * ahead + l * left + u * up;
                    return cosine > 0 ? (exponent + 1) / (2 * Math.PI) * Math.pow(cosine, exponent) : 0;
                },
                edges);
        assertThat(UpwardShape.of(beam).flux()).isCloseTo(expected, within(2e-3));
    }

    @Test
    void leavesOutWhatGoesDown() {
        Emission everywhere = TestEmissions.of((a, l, u) -> 1, List.of());
        Emission upward = TestEmissions.of((a, l, u) -> u > 0 ? 1 : 0, List.of());
        assertThat(UpwardShape.of(everywhere).flux()).isCloseTo(2 * Math.PI, within(1e-9));
        assertThat(UpwardShape.of(upward).flux()).isCloseTo(2 * Math.PI, within(1e-9));
    }

    @Test
    void doesNotMindWhereInAzimuthTheLightGoes() {
        Emission ahead = TestEmissions.of((a, l, u) -> u > 0 ? Math.max(0, a) : 0, List.of());
        Emission aside = TestEmissions.of((a, l, u) -> u > 0 ? Math.max(0, l) : 0, List.of());
        for (int hat = 0; hat < ZenithHats.COUNT; hat++) {
            assertThat(UpwardShape.of(ahead).weight(hat))
                    .isCloseTo(UpwardShape.of(aside).weight(hat), within(1e-3));
        }
    }
}
