package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ForkJoinPool;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;

/** Nothing moves much when every step is made finer, nor when light is followed further; and the digits are always the same. */
@DisplayName("Convergence of the sky of all orders")
class SkyglowKernelConvergenceTest {

    /** Clear air over dark ground and haze over bright ground, side by side. */
    private static final LayeredAir AIRS = new LayeredAir(
            Aerosol.ofDepth(0.1), new double[] {0.0975, 0.0975}, new double[] {0.1, 0.3}, new double[] {0.15, 0.6});

    private static final double[] DISTANCES_M = {500, 3000, 10_000, 30_000, 100_000};
    private static final double[] EYE_HEIGHTS_M = {0, 3000};
    private static final double[] ZENITH_ANGLES_DEG = {0, 45, 75, 85};
    private static final double[] AZIMUTHS_DEG = {0, 45, 180};

    /** About four times the work. */
    private static final Resolution FINER = new Resolution(
            38,
            18,
            6,
            new DirectionRule.Density(20, 14, 5, 12),
            24,
            14,
            new AngularBasis(18, 4),
            new DirectionRule.Density(20, 6, 4, 6),
            12,
            8,
            new AngularBasis(12, 3));

    private static List<Double> totals(SkyglowKernel kernel) {
        List<Double> totals = new ArrayList<>();
        for (String emission : List.of("lambert", "ring80-90")) {
            Emission light = TestEmissions.named(emission);
            SkyField field = kernel.lit(UpwardShape.of(light));
            for (Sightline line : lines()) {
                double[] once = kernel.firstOrder().radiance(light, line);
                double[] more = field.higherOrders(line);
                for (int air = 0; air < once.length; air++) {
                    totals.add(once[air] + more[air]);
                }
            }
        }
        return totals;
    }

    private static List<Sightline> lines() {
        List<Sightline> lines = new ArrayList<>();
        for (double distance : DISTANCES_M) {
            for (double eyeHeight : EYE_HEIGHTS_M) {
                for (double zenithAngle : ZENITH_ANGLES_DEG) {
                    for (double azimuth : AZIMUTHS_DEG) {
                        lines.add(Sightline.ofDegrees(distance, eyeHeight, zenithAngle, azimuth));
                    }
                }
            }
        }
        return lines;
    }

    private static List<Double> differences(List<Double> found, List<Double> expected) {
        List<Double> differences = new ArrayList<>();
        for (int i = 0; i < found.size(); i++) {
            differences.add(Math.abs(found.get(i) / expected.get(i) - 1));
        }
        return differences.stream().sorted().toList();
    }

    @Test
    void aFinerSolutionIsTheSame() {
        SkyglowKernel usual = SkyglowKernel.solve(AIRS, share -> {});
        SkyglowKernel finer = SkyglowKernel.solve(AIRS, FINER, share -> {});
        List<Double> differences = differences(totals(usual), totals(finer));
        assertThat(differences.get(differences.size() / 2)).as("median").isLessThan(0.003);
        assertThat(differences.get(differences.size() * 95 / 100))
                .as("19 in 20")
                .isLessThan(0.02);
        assertThat(differences.get(differences.size() - 1)).as("worst").isLessThan(0.04);
    }

    /** The orders beyond the last are guessed from how the last ones fell; each order more makes that matter less. */
    @Test
    void followingLightFurtherChangesLessAndLess() {
        List<List<Double>> byOrders = new ArrayList<>();
        for (int orders = 3; orders <= 9; orders += 2) {
            byOrders.add(totals(SkyglowKernel.solve(AIRS, TestResolutions.COARSE.withOrders(orders), share -> {})));
        }
        double before = Double.POSITIVE_INFINITY;
        for (int i = 1; i < byOrders.size(); i++) {
            List<Double> differences = differences(byOrders.get(i), byOrders.get(i - 1));
            double worst = differences.get(differences.size() - 1);
            assertThat(worst).isLessThan(0.6 * before);
            before = worst;
        }
        assertThat(before).as("haze over bright ground, from 7 to 9 orders").isLessThan(0.02);
    }

    /** Sums are taken in the same order on any number of threads. */
    @Test
    void isTheSameToTheLastDigitOnAnyNumberOfThreads() throws Exception {
        byte[] alone = contentOn(1);
        assertThat(contentOn(2)).isEqualTo(alone);
        assertThat(contentOn(5)).isEqualTo(alone);
    }

    private static byte[] contentOn(int threads) throws Exception {
        ForkJoinPool pool = new ForkJoinPool(threads);
        try {
            return KernelFile.content(pool.submit(() -> SkyglowKernel.solve(
                            LayeredAir.of(
                                    Atmosphere.atSeaLevel(Clearness.CLEAR),
                                    new double[] {0.15, 0.15},
                                    new double[] {450, 600}),
                            TestResolutions.COARSE,
                            share -> {}))
                    .get());
        } finally {
            pool.shutdown();
        }
    }
}
