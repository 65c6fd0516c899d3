package skytally.luminaire;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.geometry.Attitude;

@DisplayName("Flux of the shapes, level and tilted")
class FluxShareTest {

    private static final IntensityDistribution LAMBERT =
            Shapes.byId("diffuse-down").orElseThrow().distribution();

    static Stream<Shape> everyShape() {
        return Shapes.all().stream();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyShape")
    void givesOutOneLumenForEachLumen(Shape shape) {
        assertThat(FluxShare.above(shape.distribution(), Attitude.LEVEL, -Math.PI / 2))
                .isCloseTo(1, within(1e-9));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyShape")
    void keepsItsFluxHoweverItHangs(Shape shape) {
        for (Attitude attitude : new Attitude[] {
            new Attitude(0, 15, 0), new Attitude(123, 47, 20), new Attitude(280, 90, -35), new Attitude(10, 180, 5)
        }) {
            double all = FluxShare.above(shape.distribution(), attitude, -Math.PI / 2);
            double up = FluxShare.upward(shape.distribution(), attitude);
            Attitude over = new Attitude(attitude.bearingDeg(), 180 - attitude.tiltDeg(), -attitude.rollDeg());
            assertThat(all).as("all of it, hung %s", attitude).isCloseTo(1, within(1e-9));
            assertThat(up).as("up, hung %s", attitude).isBetween(0.0, 1.0);
            assertThat(FluxShare.low(shape.distribution(), attitude))
                    .as("low, hung %s", attitude)
                    .isBetween(0.0, 1.0);
            if (shape.distribution().isRound() && attitude.rollDeg() == 0) {
                assertThat(up + FluxShare.upward(shape.distribution(), over)).isCloseTo(1, within(1e-9));
            }
        }
    }

    /** Analytic: a matt surface tilted by t sends (1 − cos t)/2 of its light above the level. */
    @ParameterizedTest(name = "{0}° gives {1} %")
    @CsvSource({
        "0, 0",
        "5, 0.190265096",
        "10, 0.759612349",
        "15, 1.70370869",
        "20, 3.01536896",
        "30, 6.69872981",
        "90, 50",
        "180, 100"
    })
    void lambertianTiltedGivesTheAnalyticShare(double tiltDeg, double expectedPercent) {
        assertThat(100 * FluxShare.upward(LAMBERT, new Attitude(77, tiltDeg, 0)))
                .isCloseTo(expectedPercent, within(1e-7));
    }

    /** Fine-grid integral of the exact distribution, computed for this project; street side raised. */
    @ParameterizedTest(name = "{0}° gives {1} %")
    @CsvSource({"5, 0.537", "10, 2.112", "15, 4.624", "20, 7.919", "30, 16.07"})
    void roadBatwingTiltedGivesTheFineGridShare(double tiltDeg, double expectedPercent) {
        assertThat(100 * FluxShare.upward(new RoadBatwing(), new Attitude(31, tiltDeg, 0)))
                .isCloseTo(expectedPercent, within(0.005));
    }

    @Test
    void rollRaisesTheLeftSide() {
        IntensityDistribution leftOnly = new IntensityDistribution() {
            @Override
            public double perLumen(double x, double y, double z) {
                return z < 0 && y > 0 ? -z * y * y * y : 0;
            }

            @Override
            public double[] breaksRad() {
                return new double[] {Math.PI / 2};
            }

            @Override
            public boolean isRound() {
                return false;
            }

            @Override
            public String formula() {
                return "cos γ sin³ φ on the left";
            }
        };
        double raised = FluxShare.upward(leftOnly, new Attitude(0, 0, 20));
        double lowered = FluxShare.upward(leftOnly, new Attitude(0, 0, -20));
        assertThat(raised).isGreaterThan(10 * Math.max(lowered, 1e-6));
    }

    /** Isotropic light: the band from the level to 10° holds sin 10° / 2 of it, by Archimedes. */
    @Test
    void theLowBandOfABareSourceIsArchimedes() {
        assertThat(FluxShare.low(Shapes.byId("all-round").orElseThrow().distribution(), Attitude.LEVEL))
                .isCloseTo(Math.sin(Math.toRadians(10)) / 2, within(1e-12));
    }

    @Test
    void everyBeamIsHalfAsStrongAtHalfItsWidth() {
        for (double width : new double[] {1, 5, 12, 30, 60, 120}) {
            IntensityDistribution beam = Shapes.beam(width);
            double half = Math.toRadians(width / 2);
            double edge = beam.perLumen(Math.sin(half), 0, -Math.cos(half));
            assertThat(edge / beam.perLumen(0, 0, -1)).isCloseTo(0.5, within(1e-9));
            assertThat(FluxShare.above(beam, Attitude.LEVEL, -Math.PI / 2)).isCloseTo(1, within(1e-7));
        }
    }

    /** 800 cos γ + 6000 sin⁴γ cos γ (1 + 0.4 cos H − 0.3 cos 2H), 2800π lm: a road fitting made up for checks. */
    private record RoadBatwing() implements IntensityDistribution {

        @Override
        public double perLumen(double x, double y, double z) {
            if (z >= 0) {
                return 0;
            }
            double sineSquared = x * x + y * y;
            double cosH = sineSquared == 0 ? 1 : x / Math.sqrt(sineSquared);
            double cos2H = 2 * cosH * cosH - 1;
            double candela = -z * (800 + 6000 * sineSquared * sineSquared * (1 + 0.4 * cosH - 0.3 * cos2H));
            return candela / (2800 * Math.PI);
        }

        @Override
        public double[] breaksRad() {
            return new double[] {Math.PI / 2};
        }

        @Override
        public boolean isRound() {
            return false;
        }

        @Override
        public String formula() {
            return "made up for checks";
        }
    }
}
