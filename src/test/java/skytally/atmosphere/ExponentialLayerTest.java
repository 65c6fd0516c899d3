package skytally.atmosphere;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Against the integral of the density along the chord, summed from exact heights over a round Earth. */
@DisplayName("Air on a path")
class ExponentialLayerTest {

    private static final double R = Atmosphere.EARTH_RADIUS_M;
    private static final GaussIntegrator PIECE = new GaussIntegratorFactory().legendre(12);
    private static final double PIECE_M = 1000;

    /** Short paths between heights a lamp and an eye may have: the rule for short and nearly level ones. */
    @ParameterizedTest(name = "scale height {0} m")
    @ValueSource(doubles = {500, 1500, 8000})
    void isGoodToAMillionthOnShortPaths(double scaleHeightM) {
        for (double from : new double[] {0, 6, 30, 120}) {
            for (double to : new double[] {0, 1.6, 25, 100}) {
                for (double ground : new double[] {1, 20, 300, 1000, 5000, 10_000}) {
                    Chord chord = Chord.between(from, to, ground);
                    assertThat(chord.closed(scaleHeightM) / chord.summed(scaleHeightM))
                            .as("from %s m to %s m over %s m", from, to, ground)
                            .isCloseTo(1, within(1.2e-6));
                }
            }
        }
    }

    /** Paths of every slope and length, those that dip below their beginning included. */
    @ParameterizedTest(name = "scale height {0} m")
    @ValueSource(doubles = {1500, 8000})
    void isGoodToTwoTenThousandthsWithin100KmAndToAThousandthBeyond(double scaleHeightM) {
        for (double from : new double[] {0, 100, 3000, 20_000}) {
            for (double to : new double[] {0, 100, 3000, 20_000, 80_000}) {
                for (double ground : new double[] {1, 1000, 20_000, 100_000, 300_000}) {
                    Chord chord = Chord.between(from, to, ground);
                    boolean throughTheGround = chord.lowestM() < -1;
                    boolean farFromTheUpperEnd = from > to && ground > 100_000;
                    if (throughTheGround || farFromTheUpperEnd) {
                        continue;
                    }
                    double summed = chord.summed(scaleHeightM);
                    assertThat(chord.closed(scaleHeightM))
                            .as("from %s m to %s m over %s m", from, to, ground)
                            .isCloseTo(summed, within((ground <= 100_000 ? 2e-4 : 1e-3) * summed));
                }
            }
        }
    }

    @Test
    void doesNotJumpWhereTheRuleForShortPathsEnds() {
        for (double scaleHeightM : new double[] {1500, 8000}) {
            for (double rise = 0.09; rise < 0.11; rise += 0.0005) {
                Chord chord = Chord.between(0, rise * scaleHeightM, 3000);
                assertThat(chord.closed(scaleHeightM) / chord.summed(scaleHeightM))
                        .isCloseTo(1, within(2e-5));
            }
        }
    }

    @Test
    void isNothingOnNoPathAndOneFromGroundToSpace() {
        assertThat(ExponentialLayer.on(R, 8000, 100, 0.3, 0)).isZero();
        assertThat(ExponentialLayer.on(R, 1500, 0, 1, 80_000)).isCloseTo(1, within(1e-5));
    }

    /** A straight line between two heights, its ends apart by a distance along the ground. */
    private record Chord(double fromM, double toM, double lengthM, double zenithCosine) {

        static Chord between(double fromM, double toM, double groundM) {
            double turn = groundM / R;
            double half = Math.sin(turn / 2);
            double rise = toM - fromM;
            double length = Math.sqrt(rise * rise + 4 * (R + fromM) * (R + toM) * half * half);
            return new Chord(fromM, toM, length, (rise - (R + toM) * 2 * half * half) / length);
        }

        double heightM(double s) {
            double gained = s * (2 * (R + fromM) * zenithCosine + s);
            return fromM + gained / (R + fromM + Math.sqrt((R + fromM) * (R + fromM) + gained));
        }

        double lowestM() {
            return heightM(Math.max(0, Math.min(lengthM, -(R + fromM) * zenithCosine)));
        }

        double closed(double scaleHeightM) {
            return ExponentialLayer.between(
                    scaleHeightM,
                    R + fromM,
                    zenithCosine,
                    lengthM,
                    ExponentialLayer.density(scaleHeightM, fromM),
                    ExponentialLayer.density(scaleHeightM, toM));
        }

        double summed(double scaleHeightM) {
            int pieces = 1 + (int) (lengthM / PIECE_M);
            double sum = 0;
            for (int piece = 0; piece < pieces; piece++) {
                for (int i = 0; i < PIECE.getNumberOfPoints(); i++) {
                    double s = (piece + 0.5 + PIECE.getPoint(i) / 2) / pieces * lengthM;
                    sum += PIECE.getWeight(i) * Math.exp(-heightM(s) / scaleHeightM);
                }
            }
            return sum * lengthM / pieces / 2 / scaleHeightM;
        }
    }
}
