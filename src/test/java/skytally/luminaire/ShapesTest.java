package skytally.luminaire;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import skytally.geometry.Attitude;
import skytally.geometry.Direction;
import skytally.geometry.Rotation;

/** Walks every shape. */
@DisplayName("Plain shapes")
class ShapesTest {

    /** The ids stand in addresses that people keep: none may change or go. */
    @Test
    void keepTheirIds() {
        assertThat(Shapes.all())
                .extracting(Shape::id)
                .contains("flat-area", "flat-road", "diffuse-down", "all-round", "all-round-capped", "beam-60")
                .contains("beam-30", "beam-10", "self-lit-panel", "diffuse-up", "narrow-up")
                .doesNotHaveDuplicates()
                .allMatch(id -> id.matches("[a-z0-9-]+"));
        assertThat(Shapes.all().get(0).id()).isEqualTo("flat-area");
    }

    @ParameterizedTest
    @MethodSource("skytally.luminaire.Shapes#all")
    void areFoundByTheirIdAndSpeak(Shape shape) {
        assertThat(Shapes.byId(shape.id())).contains(shape);
        assertThat(shape.words()).isNotBlank();
        assertThat(shape.distribution().formula()).isNotBlank();
        assertThat(Shapes.byId(shape.id() + "x")).isEmpty();
    }

    @ParameterizedTest
    @MethodSource("skytally.luminaire.Shapes#all")
    void giveNoLessThanNothingAnyWhere(Shape shape) {
        for (double gammaDeg = 0; gammaDeg <= 180; gammaDeg += 0.5) {
            for (double phiDeg = 0; phiDeg < 360; phiDeg += 5) {
                double sine = Math.sin(Math.toRadians(gammaDeg));
                double phi = Math.toRadians(phiDeg);
                double intensity = shape.distribution()
                        .perLumen(sine * Math.cos(phi), sine * Math.sin(phi), -Math.cos(Math.toRadians(gammaDeg)));
                assertThat(intensity)
                        .as("at %s°, %s°", gammaDeg, phiDeg)
                        .isNotNegative()
                        .isFinite();
            }
        }
    }

    @ParameterizedTest
    @MethodSource("skytally.luminaire.Shapes#all")
    void thatAreRoundAreTheSameAllRound(Shape shape) {
        double most = 0;
        for (double gammaDeg = 1; gammaDeg < 180; gammaDeg += 3) {
            double sine = Math.sin(Math.toRadians(gammaDeg));
            double up = -Math.cos(Math.toRadians(gammaDeg));
            double street = shape.distribution().perLumen(sine, 0, up);
            double left = shape.distribution().perLumen(0, sine, up);
            double behind = shape.distribution().perLumen(-sine, 0, up);
            most = Math.max(most, Math.abs(street - left) + Math.abs(street - behind));
        }
        assertThat(most < 1e-12).isEqualTo(shape.distribution().isRound());
    }

    /** The breaks rise and lie inside; between them a straight line through close points misses by little. */
    @ParameterizedTest
    @MethodSource("skytally.luminaire.Shapes#all")
    void nameTheirBreaksRising(Shape shape) {
        double[] breaks = shape.distribution().breaksRad();
        double before = 0;
        for (double here : breaks) {
            assertThat(here).isGreaterThan(before).isLessThan(Math.PI);
            before = here;
        }
    }

    @ParameterizedTest(name = "{0} hangs at {1}°")
    @CsvSource({"self-lit-panel, 90", "flat-area, 0", "beam-30, 0", "diffuse-up, 0", "narrow-up, 0", "all-round, 0"})
    void hangAsOneMeansThem(String id, double tiltDeg) {
        assertThat(Shapes.byId(id).orElseThrow().usualTiltDeg()).isEqualTo(tiltDeg);
    }

    /** Common practice, no source: five times the bright part, ten times for beams under 10°. */
    @ParameterizedTest(name = "{0} from {1} m")
    @CsvSource({"flat-area, 2", "self-lit-panel, 10", "beam-60, 2.5", "beam-10, 1.5"})
    void knowFromWhereTheInverseSquareHolds(String id, double nearestM) {
        Shape shape = Shapes.byId(id).orElseThrow();
        assertThat(shape.nearestM()).isCloseTo(nearestM, within(1e-12));
        assertThat(shape.isFarEnough(nearestM * 1.0001)).isTrue();
        assertThat(shape.isFarEnough(nearestM * 0.9999)).isFalse();
    }

    @Test
    void aNarrowBeamNeedsTenTimesItsSize() {
        Shape narrow = new Shape("narrow", "a narrow beam", Shapes.beam(9), 0, 0.3, 9);
        assertThat(narrow.nearestM()).isCloseTo(3, within(1e-12));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.9, 121, Double.NaN, -5})
    void refuseABeamOfNoSensibleWidth(double widthDeg) {
        assertThatThrownBy(() -> Shapes.beam(widthDeg)).hasMessageContaining("1 to 120 degrees");
    }

    /**
     * Directions drawn evenly over the sphere, weighed by the intensity: the share above the level, and between it and
     * 10°, must lie within three standard errors of the exact ones. Every shape, tilted and rolled.
     */
    @ParameterizedTest
    @MethodSource("skytally.luminaire.Shapes#all")
    void sendUpWhatAMonteCarloCountFinds(Shape shape) {
        Random random = new Random(19_630_101L + shape.id().hashCode());
        for (Attitude attitude : new Attitude[] {
            new Attitude(30, shape.usualTiltDeg() + 10, 0), new Attitude(200, 65, 25), new Attitude(0, 100, -40)
        }) {
            Rotation hang = attitude.rotation();
            int draws = 400_000;
            double up = 0;
            double upSquares = 0;
            double low = 0;
            double lowSquares = 0;
            for (int i = 0; i < draws; i++) {
                double z = 2 * random.nextDouble() - 1;
                double level = Math.sqrt(1 - z * z);
                double phi = 2 * Math.PI * random.nextDouble();
                Direction own = hang.turnBack(Direction.of(level * Math.cos(phi), level * Math.sin(phi), z));
                double flux = 4 * Math.PI * shape.distribution().perLumen(own.x(), own.y(), own.z());
                if (z >= 0) {
                    up += flux;
                    upSquares += flux * flux;
                }
                if (z >= 0 && z < Math.sin(Math.toRadians(10))) {
                    low += flux;
                    lowSquares += flux * flux;
                }
            }
            assertWithinThreeErrors(FluxShare.upward(shape.distribution(), attitude), up, upSquares, draws);
            assertWithinThreeErrors(FluxShare.low(shape.distribution(), attitude), low, lowSquares, draws);
        }
    }

    private static void assertWithinThreeErrors(double exact, double sum, double squares, int draws) {
        double mean = sum / draws;
        double error = Math.sqrt((squares / draws - mean * mean) / draws);
        assertThat(mean).isCloseTo(exact, within(3 * error + 1e-9));
    }
}
