package skytally.skyglow;

import java.util.Arrays;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;

/**
 * The radiance around a light, kept as moments on a grid, for one or more shapes of emission and wavelengths together
 * ("lanes", wavelength by wavelength), and what it sends on along a line of sight.
 *
 * <p>At each point the moments are over directions about the way to the light, {@link AngularBasis}. What is kept is
 * distance times moment over the row's usual size: that hardly changes from point to point, so that straight lines
 * between the points do, while the air's density is put in exactly where the light is scattered.
 */
final class ScatteredField {

    private final LayeredAir air;
    private final FieldGrid grid;
    private final AngularBasis basis;
    private final int wavelengths;
    private final int lanes;
    /** An array for each point: by function of direction, then by lane. */
    private final float[][] moments;
    /** Logarithm of the usual size of a row, by row, then by wavelength. */
    private final double[] logSize;
    /** What falls on the ground, times distance over usual size; by row, then by lane. */
    private final double[] onGround;

    ScatteredField(
            LayeredAir air,
            FieldGrid grid,
            AngularBasis basis,
            int lanes,
            float[][] moments,
            double[] logSize,
            double[] onGround) {
        this.air = air;
        this.grid = grid;
        this.basis = basis;
        this.wavelengths = air.wavelengths();
        this.lanes = lanes;
        this.moments = moments;
        this.logSize = logSize;
        this.onGround = onGround;
    }

    /** Of moments and illuminances of the ground as they are: works out the usual sizes and takes them out. */
    static ScatteredField of(
            LayeredAir air, FieldGrid grid, AngularBasis basis, int lanes, double[][] moments, double[] illuminance) {
        int wavelengths = air.wavelengths();
        int shapes = lanes / wavelengths;
        int perPoint = basis.size() * lanes;
        float[][] kept = new float[grid.points()][perPoint];
        double[] logSize = new double[grid.distances() * wavelengths];
        double[] onGround = new double[illuminance.length];
        for (int row = 0; row < grid.distances(); row++) {
            double distance = grid.distance(row);
            double[] factor = new double[lanes];
            for (int w = 0; w < wavelengths; w++) {
                double sum = 0;
                for (int level = 0; level < grid.levels(); level++) {
                    for (int lane = w * shapes; lane < (w + 1) * shapes; lane++) {
                        sum += moments[row * grid.levels() + level][lane];
                    }
                }
                double size = Math.max(sum * distance / (grid.levels() * shapes), Double.MIN_NORMAL);
                logSize[row * wavelengths + w] = StrictMath.log(size);
                Arrays.fill(factor, w * shapes, (w + 1) * shapes, distance / size);
            }
            for (int point = row * grid.levels(); point < (row + 1) * grid.levels(); point++) {
                for (int i = 0; i < perPoint; i++) {
                    kept[point][i] = (float) (moments[point][i] * factor[i % lanes]);
                }
            }
            for (int lane = 0; lane < lanes; lane++) {
                onGround[row * lanes + lane] = illuminance[row * lanes + lane] * factor[lane];
            }
        }
        return new ScatteredField(air, grid, basis, lanes, kept, logSize, onGround);
    }

    LayeredAir air() {
        return air;
    }

    FieldGrid grid() {
        return grid;
    }

    AngularBasis basis() {
        return basis;
    }

    float[][] moments() {
        return moments;
    }

    double[] logSize() {
        return logSize;
    }

    double[] onGround() {
        return onGround;
    }

    /**
     * Sums what the field's light, scattered once more or sent back by the ground, adds to a line of sight. One for
     * each thread.
     */
    final class Gatherer {

        /** Keeps the nodes spread where the line passes the light: metres, and share of the distance. */
        private static final double LEAST_M = 1;

        private static final double LEAST_SHARE = 0.01;

        private final GaussRule low;
        private final GaussRule high;
        private final Turning byHaze;
        private final Turning byMolecules;
        private final double[] function;
        private final float[] between;
        private final float[] fromHaze;
        private final float[] fromMolecules;
        private final FieldGrid.Cell cell = new FieldGrid.Cell();

        Gatherer(int lowNodes, int highNodes) {
            low = GaussRule.of(lowNodes);
            high = GaussRule.of(highNodes);
            function = new double[basis.size()];
            between = new float[basis.size() * lanes];
            fromHaze = new float[lanes];
            fromMolecules = new float[lanes];
            double g = air.aerosol().asymmetry();
            byHaze = new Turning(degree -> StrictMath.pow(g, degree) * air.hazeScattering());
            byMolecules = new Turning(degree -> rayleigh(degree) * air.molecularScattering());
        }

        /** Rayleigh's function has two moments; Henyey and Greenstein's has g to the degree. */
        private static double rayleigh(int degree) {
            return switch (degree) {
                case 0 -> 1;
                case 2 -> 0.1;
                default -> 0;
            };
        }

        /** How one kind of scatterer turns light: by how much each function of direction counts. */
        private final class Turning {

            /** The functions that count at all, filled up with others that do not to a multiple of four. */
            final int[] which;

            private final double[] weight;

            Turning(IntToDoubleFunction moment) {
                int[] counting = IntStream.range(0, basis.size())
                        .filter(k -> moment.applyAsDouble(basis.degree(k)) != 0)
                        .toArray();
                which = Arrays.copyOf(counting, (counting.length + 3) / 4 * 4);
                weight = new double[which.length];
                for (int i = 0; i < counting.length; i++) {
                    int degree = basis.degree(counting[i]);
                    weight[i] = (2 * degree + 1)
                            * basis.multiplicity(counting[i])
                            / (4 * Math.PI)
                            * moment.applyAsDouble(degree);
                }
            }

            float weight(int i, double[] function) {
                return (float) (weight[i] * function[which[i]]);
            }
        }

        /**
         * @param distance of the ray's beginning from the light
         * @param into     set to the radiance, by lane
         */
        void gather(Ray ray, double distance, double[] into) {
            Arrays.fill(into, 0);
            double share = LEAST_SHARE * distance;
            double scale = Math.sqrt(ray.nearestDistance() * ray.nearestDistance() + share * share + LEAST_M * LEAST_M);
            for (int piece = 0; piece < ray.pieces(); piece++) {
                addPiece(ray, piece, scale, into);
            }
            if (ray.endsOnGround()) {
                addGround(ray, into);
            }
        }

        private void addPiece(Ray ray, int piece, double scale, double[] into) {
            GaussRule rule = ray.isLow(piece) ? low : high;
            double begin = asinh((ray.from(piece) - ray.nearest()) / scale);
            double half = (asinh((ray.to(piece) - ray.nearest()) / scale) - begin) / 2;
            for (int i = 0; i < rule.count(); i++) {
                double grown = StrictMath.exp(begin + half * (1 + rule.nodes()[i]));
                double shrunk = 1 / grown;
                double s = ray.nearest() + scale * (grown - shrunk) / 2;
                addPoint(ray, s, scale * (grown + shrunk) / 2 * half * rule.weights()[i], into);
            }
        }

        private static double asinh(double x) {
            double size = Math.abs(x);
            return Math.copySign(StrictMath.log(size + Math.sqrt(size * size + 1)), x);
        }

        private void addPoint(Ray ray, double s, double ds, double[] into) {
            ray.goTo(s);
            double towardLight = ray.pointTowardLight(s);
            basis.at(towardLight, ray.pointUpward(towardLight), function);
            grid.find(ray.pointDistance(), ray.pointHeight(), cell);
            sumMoments();
            double molecularAir = ray.moleculesOnWay(s);
            double hazyAir = ray.hazeOnWay(s);
            double molecules = ray.molecules() * ds / ray.pointDistance();
            double haze = ray.haze() * ds / ray.pointDistance();
            int shapes = lanes / wavelengths;
            for (int w = 0; w < wavelengths; w++) {
                double molecularDepth = air.molecularDepth()[w];
                double hazeDepth = air.hazeDepth()[w];
                double through = StrictMath.exp(logSize(w) - molecularDepth * molecularAir - hazeDepth * hazyAir);
                double molecularPart = molecularDepth * molecules * through;
                double hazyPart = hazeDepth * haze * through;
                for (int lane = w * shapes; lane < (w + 1) * shapes; lane++) {
                    into[lane] += molecularPart * fromMolecules[lane] + hazyPart * fromHaze[lane];
                }
            }
        }

        private double logSize(int w) {
            int i = cell.row * wavelengths + w;
            return logSize[i] + cell.beyond * (logSize[i + wavelengths] - logSize[i]);
        }

        /** The moments between the four points, summed over the functions: once as haze, once as molecules turn light. */
        private void sumMoments() {
            int near = cell.row * grid.levels() + cell.level;
            int far = near + grid.levels();
            float farLow = (float) (cell.beyond * cell.below);
            float farHigh = (float) (cell.beyond * (1 - cell.below));
            float nearLow = (float) ((1 - cell.beyond) * cell.below);
            float nearHigh = (float) ((1 - cell.beyond) * (1 - cell.below));
            float[] atNearHigh = moments[near]; // arrays of their own: else the loop is five times slower
            float[] atNearLow = moments[near + 1];
            float[] atFarHigh = moments[far];
            float[] atFarLow = moments[far + 1];
            for (int i = 0; i < between.length; i++) {
                between[i] = nearHigh * atNearHigh[i]
                        + nearLow * atNearLow[i]
                        + farHigh * atFarHigh[i]
                        + farLow * atFarLow[i];
            }
            sum(byHaze, fromHaze);
            sum(byMolecules, fromMolecules);
        }

        /** Four functions at a time, which keeps the inner loop long enough to be quick. */
        private void sum(Turning turning, float[] into) {
            Arrays.fill(into, 0);
            for (int i = 0; i < turning.which.length; i += 4) {
                float weight0 = turning.weight(i, function);
                float weight1 = turning.weight(i + 1, function);
                float weight2 = turning.weight(i + 2, function);
                float weight3 = turning.weight(i + 3, function);
                int first0 = turning.which[i] * lanes;
                int first1 = turning.which[i + 1] * lanes;
                int first2 = turning.which[i + 2] * lanes;
                int first3 = turning.which[i + 3] * lanes;
                for (int lane = 0; lane < into.length; lane++) {
                    into[lane] += weight0 * between[first0 + lane]
                            + weight1 * between[first1 + lane]
                            + weight2 * between[first2 + lane]
                            + weight3 * between[first3 + lane];
                }
            }
        }

        /** What the ground at the ray's end sends back. */
        private void addGround(Ray ray, double[] into) {
            ray.goTo(ray.end());
            grid.find(ray.pointDistance(), 0, cell);
            double molecularAir = ray.moleculesOnWay(ray.end());
            double hazyAir = ray.hazeOnWay(ray.end());
            int shapes = lanes / wavelengths;
            for (int w = 0; w < wavelengths; w++) {
                double depth = air.molecularDepth()[w] * molecularAir + air.hazeDepth()[w] * hazyAir;
                double sentBack =
                        air.reflectance()[w] / Math.PI * StrictMath.exp(logSize(w) - depth) / ray.pointDistance();
                for (int lane = w * shapes; lane < (w + 1) * shapes; lane++) {
                    int i = cell.row * lanes + lane;
                    into[lane] += sentBack * (onGround[i] + cell.beyond * (onGround[i + lanes] - onGround[i]));
                }
            }
        }
    }
}
