package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.atmosphere.Aerosol;

/**
 * The sum of all orders against independent deterministic and Monte Carlo solutions, computed for this project by other
 * programs: {@code reference/skyglow-solutions.csv} and {@code reference/skyglow-zenith.csv}. The deterministic
 * ones are good to about 1 %, 4 % far out in haze; the Monte Carlo ones carry their standard error.
 */
@DisplayName("Sky glow of all orders against independent solutions")
class SkyglowKernelReferenceTest {

    /** The airs and grounds of the solutions, solved side by side as if they were wavelengths of one. */
    private static final double[] MOLECULES = {0.0975, 0.22, 0.0975, 0.0975, 0.0975, 0.0975};

    private static final double[] HAZE = {0.1, 0.13, 0.1, 0.05, 0.2, 0.3};
    private static final double[] GROUND = {0.15, 0.1, 0.6, 0.15, 0.15, 0.15};

    private static final double PER_KM2 = 1e6;

    private static SkyglowKernel kernel;

    @BeforeAll
    static void solve() {
        kernel = SkyglowKernel.solve(new LayeredAir(Aerosol.ofDepth(0.1), MOLECULES, HAZE, GROUND), share -> {});
    }

    private static int place(double molecules, double haze, double ground) {
        for (int i = 0; i < MOLECULES.length; i++) {
            if (MOLECULES[i] == molecules && HAZE[i] == haze && GROUND[i] == ground) {
                return i;
            }
        }
        throw new IllegalArgumentException("No such air: " + molecules + ", " + haze + ", " + ground);
    }

    /** One row of the solutions, and what is found for it. */
    record Row(String what, double found, double once, double monteCarlo, double standardError, double deterministic) {

        double missOfDeterministic() {
            return Math.abs(found / (once + deterministic) - 1);
        }

        @Override
        public String toString() {
            return what;
        }
    }

    static Stream<Row> rows() {
        return ReferenceRows.of("/reference/skyglow-solutions.csv").map(part -> {
            assertThat(List.of(part.text("H_R_km"), part.text("H_a_km"), part.text("w_a"), part.text("g")))
                    .containsExactly("8.0", "1.5", "0.95", "0.65");
            double zenithAngle = part.number("z_deg");
            Sightline line = Sightline.ofDegrees(part.number("D_km") * 1000, 0, zenithAngle, part.number("az_deg"));
            int air = place(part.number("tauR"), part.number("tauA"), part.number("albedo"));
            return new Row(
                    part.text("emission") + " in case " + part.text("case") + ", " + line,
                    kernel.radiance(TestEmissions.named(part.text("emission")), line)[air] * PER_KM2,
                    part.number("L1"),
                    part.number("Lmulti_mc"),
                    part.number("Lmulti_mc_se"),
                    part.number("Lmulti_det"));
        });
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("rows")
    void agreesWithMonteCarloWithinATenthAndThreeStandardErrors(Row row) {
        double expected = row.once() + row.monteCarlo();
        assertThat(row.found()).isCloseTo(expected, within(0.1 * expected + 3 * row.standardError()));
    }

    @Test
    void agreesWithTheDeterministicSolutions() {
        List<Row> rows = rows().toList();
        assertThat(rows)
                .hasSizeGreaterThan(50)
                .allSatisfy(row ->
                        assertThat(row.missOfDeterministic()).as(row.what()).isLessThan(0.07));
        List<Double> misses =
                rows.stream().map(Row::missOfDeterministic).sorted().toList();
        assertThat(misses.get(misses.size() / 2)).as("median").isLessThan(0.005);
    }

    /** Overhead up to 100 km within 3 %, as far as the solutions themselves are good; beyond within 6 %. */
    @ParameterizedTest(name = "{0} km")
    @CsvFileSource(resources = "/reference/skyglow-zenith.csv", numLinesToSkip = 1)
    void agreesOverheadAtAllDistances(
            double distanceKm, double at005, double at010, double at020, double at030, double totalPerKm2) {
        Emission ground = TestEmissions.named("lambert");
        Sightline overhead = Sightline.ofDegrees(distanceKm * 1000, 0, 0, 0);
        double[] all = kernel.radiance(ground, overhead);
        double[] once = kernel.firstOrder().radiance(ground, overhead);
        Percentage tolerance = Percentage.withPercentage(distanceKm <= 100 ? 3 : 6);

        List<Double> expected = List.of(at005, at010, at020, at030);
        double[] haze = {0.05, 0.1, 0.2, 0.3};
        List<Double> found = new ArrayList<>();
        for (double depth : haze) {
            int air = place(0.0975, depth, 0.15);
            found.add(all[air] / once[air]);
        }
        for (int i = 0; i < expected.size(); i++) {
            assertThat(found.get(i)).as("haze %s", haze[i]).isCloseTo(expected.get(i), tolerance);
        }
        assertThat(all[place(0.0975, 0.1, 0.15)] * PER_KM2).isCloseTo(totalPerKm2, tolerance);
    }
}
