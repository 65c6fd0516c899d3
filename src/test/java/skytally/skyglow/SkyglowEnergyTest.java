package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.ExponentialLayer;
import skytally.atmosphere.Molecules;

/**
 * Conservation of energy, which nothing in the method enforces: what leaves the air at the top, what the haze absorbs
 * and what the ground absorbs add up to what was sent up. Derived by hand: the air absorbs (1 − ω) β times the
 * radiance from all sides, the ground (1 − ρ) times what falls on it, and through the top goes the radiance of the
 * downward look times its cosine.
 */
@DisplayName("Energy of the light sent up")
class SkyglowEnergyTest {

    private static final double[] MOLECULES = {0.0975, 0.22, 0.0975};
    private static final double[] HAZE = {0.1, 0.13, 0.3};
    private static final double[] GROUND = {0.15, 0.8, 0.3};
    private static final LayeredAir AIR = new LayeredAir(Aerosol.ofDepth(0.1), MOLECULES, HAZE, GROUND);

    private static final double EARTH = Atmosphere.EARTH_RADIUS_M;
    private static final double TOP = Atmosphere.TOP_M;
    private static final double FURTHEST_M = 1_500_000;

    private static SkyglowKernel kernel;

    @BeforeAll
    static void solve() {
        kernel = SkyglowKernel.solve(AIR, share -> {});
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource({"lambert", "ring60-80"})
    void isAllAccountedFor(String emission) {
        Emission light = TestEmissions.named(emission);
        UpwardShape shape = UpwardShape.of(light);
        double[] escaping = escapingStraight(light);
        double[] escapingScattered = escapingScattered(shape);
        double[] inHaze = absorbedByHaze(light, kernel.lit(shape).field());
        double[] inGround = absorbedByGround(kernel.lit(shape).field());
        for (int w = 0; w < HAZE.length; w++) {
            double sum = escaping[w] + escapingScattered[w] + inHaze[w] + inGround[w];
            assertThat(sum)
                    .as(
                            "molecules %s, haze %s, ground %s: straight out %.4f, out %.4f, haze %.4f, ground %.4f",
                            MOLECULES[w], HAZE[w], GROUND[w], escaping[w], escapingScattered[w], inHaze[w], inGround[w])
                    .isCloseTo(1, within(0.01));
        }
    }

    /** Light that meets nothing on its way out, by the midpoint rule in the cosine of the zenith angle. */
    private static double[] escapingStraight(Emission light) {
        double[] sum = new double[HAZE.length];
        int steps = 20_000;
        for (int i = 0; i < steps; i++) {
            double up = (i + 0.5) / steps;
            double flux = 2 * Math.PI * light.toward(Math.sqrt(1 - up * up), 0, up) / steps;
            double root = Math.sqrt(EARTH * EARTH * up * up + TOP * (2 * EARTH + TOP));
            double[] through = through(up, root - EARTH * up);
            for (int w = 0; w < sum.length; w++) {
                sum[w] += flux * through[w];
            }
        }
        return sum;
    }

    /** What comes through of light sent up from the ground at this cosine, after this length. */
    private static double[] through(double up, double length) {
        double[] through = new double[HAZE.length];
        double molecules = ExponentialLayer.on(EARTH, Molecules.SCALE_HEIGHT_M, 0, up, length);
        double haze = ExponentialLayer.on(EARTH, AIR.aerosol().scaleHeightM(), 0, up, length);
        for (int w = 0; w < through.length; w++) {
            through[w] = Math.exp(-MOLECULES[w] * molecules - HAZE[w] * haze);
        }
        return through;
    }

    /** Rings of the sphere at the top of the air, in equal steps of the logarithm of their distance along the ground. */
    private interface Ring {
        void at(double distance, double width);
    }

    private static void overRings(double nearest, int count, Ring ring) {
        double step = Math.log(FURTHEST_M / nearest) / count;
        for (int i = 0; i < count; i++) {
            double distance = nearest * Math.exp((i + 0.5) * step);
            ring.at(distance, distance * step);
        }
    }

    private static double[] escapingScattered(UpwardShape shape) {
        double[] sum = new double[HAZE.length];
        ScatteredField field = kernel.lit(shape).field();
        ScatteredField.Gatherer again = field.new Gatherer(24, 16);
        OnceScattered once = new OnceScattered(AIR, 40, 24);
        DirectionRule directions = new DirectionRule(new DirectionRule.Density(40, 12, 12, 16));
        Ray ray = new Ray(AIR);
        double[] more = new double[HAZE.length];
        double[] byHat = new double[HAZE.length * ZenithHats.COUNT];
        overRings(1000, 40, (distance, width) -> {
            double turn = distance / EARTH;
            double up = TOP - (EARTH + TOP) * 2 * Math.sin(turn / 2) * Math.sin(turn / 2);
            double straight = Math.hypot(up, (EARTH + TOP) * Math.sin(turn));
            double area = 2 * Math.PI * (EARTH + TOP) * (EARTH + TOP) * Math.sin(turn) * width / EARTH;
            directions.lookAround(straight, up, TOP);
            for (int i = 0; i < directions.count(); i++) {
                if (directions.rising(i) >= 0) {
                    continue;
                }
                double climb = directions.upward(i) * Math.sqrt(1 - up / straight * (up / straight))
                        - directions.towardLight(i) * up / straight;
                ray.begin(straight, up, TOP, directions.rising(i), directions.towardLight(i), climb, TOP);
                once.gather(ray, straight, byHat);
                again.gather(ray, straight, more);
                double weight = -area * directions.rising(i) * directions.solidAngle(i);
                for (int w = 0; w < sum.length; w++) {
                    sum[w] += weight * more[w];
                    for (int hat = 0; hat < ZenithHats.COUNT; hat++) {
                        sum[w] += weight * shape.weight(hat) * byHat[w * ZenithHats.COUNT + hat];
                    }
                }
            }
        });
        return sum;
    }

    /** Sum over shells and rings of (1 − ω) β times what passes from all sides, straight from the light and scattered. */
    private static double[] absorbedByHaze(Emission light, ScatteredField field) {
        double[] sum = new double[HAZE.length];
        double scaleHeight = AIR.aerosol().scaleHeightM();
        double absorbed = (1 - AIR.aerosol().singleScatteringAlbedo()) / scaleHeight;
        int shells = 240;
        for (int i = 0; i < shells; i++) {
            double height = 12 * scaleHeight * (i + 0.5) * (i + 0.5) / (shells * shells);
            double depth = 12 * scaleHeight * (2 * i + 1) / (shells * shells);
            double density = Math.exp(-height / scaleHeight);
            overRings(1, 400, (distance, width) -> {
                double turn = distance / EARTH;
                double volume =
                        2 * Math.PI * (EARTH + height) * (EARTH + height) * Math.sin(turn) * width / EARTH * depth;
                double up = height - (EARTH + height) * 2 * Math.sin(turn / 2) * Math.sin(turn / 2);
                double straight = Math.hypot(up, (EARTH + height) * Math.sin(turn));
                double[] passing = fromAllSides(field, straight, height);
                double cosine = up / straight;
                double intensity = cosine > 0 ? light.toward(Math.sqrt(1 - cosine * cosine), 0, cosine) : 0;
                double[] through = intensity > 0 ? through(cosine, straight) : new double[HAZE.length];
                for (int w = 0; w < sum.length; w++) {
                    passing[w] += intensity / (straight * straight) * through[w];
                    sum[w] += absorbed * HAZE[w] * density * volume * passing[w];
                }
            });
        }
        return sum;
    }

    /** The radiance summed over the sphere: the moment of degree 0. */
    private static double[] fromAllSides(ScatteredField field, double distance, double height) {
        FieldGrid.Cell cell = new FieldGrid.Cell();
        FieldGrid grid = field.grid();
        grid.find(distance, height, cell);
        int near = cell.row * grid.levels() + cell.level;
        int far = near + grid.levels();
        double[] sum = new double[HAZE.length];
        for (int w = 0; w < sum.length; w++) {
            double kept = (1 - cell.beyond)
                            * ((1 - cell.below) * field.moments()[near][w] + cell.below * field.moments()[near + 1][w])
                    + cell.beyond
                            * ((1 - cell.below) * field.moments()[far][w] + cell.below * field.moments()[far + 1][w]);
            sum[w] = kept * size(field, cell, w) / distance;
        }
        return sum;
    }

    private static double size(ScatteredField field, FieldGrid.Cell cell, int w) {
        double near = field.logSize()[cell.row * HAZE.length + w];
        double far = field.logSize()[(cell.row + 1) * HAZE.length + w];
        return Math.exp(near + cell.beyond * (far - near));
    }

    private static double[] absorbedByGround(ScatteredField field) {
        double[] sum = new double[HAZE.length];
        FieldGrid.Cell cell = new FieldGrid.Cell();
        overRings(1, 2000, (distance, width) -> {
            double turn = distance / EARTH;
            double straight = 2 * EARTH * Math.sin(turn / 2);
            field.grid().find(straight, 0, cell);
            for (int w = 0; w < sum.length; w++) {
                double near = field.onGround()[cell.row * HAZE.length + w];
                double far = field.onGround()[(cell.row + 1) * HAZE.length + w];
                double falling = (near + cell.beyond * (far - near)) * size(field, cell, w) / straight;
                sum[w] += (1 - GROUND[w]) * falling * 2 * Math.PI * EARTH * Math.sin(turn) * width;
            }
        });
        return sum;
    }
}
