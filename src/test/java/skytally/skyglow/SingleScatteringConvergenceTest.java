package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.atmosphere.Aerosol;

/** The quick rule against the same integral written anew and pushed until nothing moves: {@link PlainScattering}. */
@DisplayName("First-order sky glow against the converged integral")
class SingleScatteringConvergenceTest {

    private static final double MOLECULES = 0.0975;
    private static final Aerosol HAZE = Aerosol.ofDepth(0.1);
    private static final SingleScattering AIR =
            new SingleScattering(HAZE, new double[] {MOLECULES}, new double[] {0.1});

    private static final double[] DISTANCES_M = {1, 10, 300, 1000, 10_000, 50_000, 100_000};
    private static final double[] ZENITH_ANGLES_DEG = {0, 30, 60, 85, 88};
    private static final double[] AZIMUTHS_DEG = {0, 90, 180};

    /** An emission with a name for the report. */
    private record Case(String name, Emission light) {

        @Override
        public String toString() {
            return name;
        }
    }

    static Stream<Case> broadLights() {
        return Stream.of(
                new Case("matt ground", TestEmissions.named("lambert")),
                new Case("ring from 75° to 85°", TestEmissions.named("ring75-85")),
                new Case("matt face 6 m up, raised by 20°", cosinePower(1, 20)),
                new Case("sharp-edged cone of 60° raised by 70°", sharpCone(60, 70)));
    }

    static Stream<Case> beams() {
        return Stream.of(
                new Case("beam of 10° straight up", beam(10, 180)),
                new Case("beam of 10° toward the viewer", beam(10, 60)),
                new Case("beam of 30° raised by 120°", beam(30, 120)),
                new Case("beam of 3° just below the level", beam(3, 85)),
                new Case("beam of 2° nearly overhead", beam(2, 170)));
    }

    private static Emission cosinePower(double exponent, double tiltDeg) {
        return axial(tiltDeg, cosine -> cosine > 0 ? Math.pow(cosine, exponent) : 0, 90);
    }

    private static Emission sharpCone(double halfAngleDeg, double tiltDeg) {
        double edge = Math.cos(Math.toRadians(halfAngleDeg));
        return axial(tiltDeg, cosine -> cosine >= edge ? 1 : 0, halfAngleDeg);
    }

    /** Cut as the house cuts its beams: at 1, 2, 4 and 8 half-widths and at its own level. */
    private static Emission beam(double widthDeg, double tiltDeg) {
        double half = widthDeg / 2;
        double exponent = Math.log(0.5) / Math.log(Math.cos(Math.toRadians(half)));
        return axial(
                tiltDeg,
                cosine -> cosine > 0 ? (exponent + 1) * Math.pow(cosine, exponent) : 0,
                half,
                2 * half,
                4 * half,
                Math.min(8 * half, 90),
                90);
    }

    private static Emission axial(double tiltDeg, java.util.function.DoubleUnaryOperator ofCosine, double... edgesDeg) {
        double ahead = Math.sin(Math.toRadians(tiltDeg));
        double up = -Math.cos(Math.toRadians(tiltDeg));
        List<Emission.Cone> edges = new ArrayList<>();
        for (double edge : edgesDeg) {
            edges.add(new Emission.Cone(ahead, 0, up, edge == 90 ? 0 : Math.cos(Math.toRadians(edge))));
        }
        return TestEmissions.at(6, (a, l, u) -> ofCosine.applyAsDouble(a * ahead + u * up), edges);
    }

    private static List<Sightline> lines(double eyeHeightM) {
        List<Sightline> lines = new ArrayList<>();
        for (double distance : DISTANCES_M) {
            for (double zenith : ZENITH_ANGLES_DEG) {
                for (double azimuth : AZIMUTHS_DEG) {
                    lines.add(Sightline.ofDegrees(distance, eyeHeightM, zenith, azimuth));
                }
            }
        }
        return lines;
    }

    private static double converged(Emission light, Sightline line) {
        return new PlainScattering(HAZE, MOLECULES, 0.1, light, line).converged();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("broadLights")
    void isWithinAThousandthAtWorstAndATenThousandthAsARule(Case light) {
        List<Double> misses = new ArrayList<>();
        for (double eyeHeight : new double[] {0, 1.6, 1000, 3000}) {
            for (Sightline line : lines(eyeHeight)) {
                double expected = converged(light.light(), line);
                double found = AIR.radiance(light.light(), line)[0];
                assertThat(found).as("%s", line).isCloseTo(expected, within(1e-3 * expected));
                misses.add(expected == 0 ? 0 : Math.abs(found / expected - 1));
            }
        }
        assertThat(misses.stream().sorted().toList().get(misses.size() * 9 / 10))
                .as("nine in ten")
                .isLessThan(1e-4);
    }

    /** What a beam lights at less than a millionth of what matt ground of like flux does is not looked at. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("beams")
    void seesABeamWhereverItCrossesOrGrazesTheLine(Case light) {
        for (double eyeHeight : new double[] {1.6, 3000}) {
            for (Sightline line : lines(eyeHeight)) {
                double expected = converged(light.light(), line);
                double noticeable = Math.max(expected, 1e-6 * AIR.radiance(TestEmissions.named("lambert"), line)[0]);
                assertThat(AIR.radiance(light.light(), line)[0])
                        .as("%s", line)
                        .isCloseTo(expected, within(1e-3 * noticeable));
            }
        }
    }

    /** So far and so low the light is a trillionth of a trillionth, and the curve's fourth order shows. */
    @Test
    void isWithinThreeThousandthsAt200Km() {
        for (double zenith : ZENITH_ANGLES_DEG) {
            for (double azimuth : AZIMUTHS_DEG) {
                Sightline line = Sightline.ofDegrees(200_000, 1000, zenith, azimuth);
                double expected = converged(TestEmissions.named("lambert"), line);
                assertThat(AIR.radiance(TestEmissions.named("lambert"), line)[0])
                        .as("%s", line)
                        .isCloseTo(expected, within(3e-3 * expected));
            }
        }
    }
}
