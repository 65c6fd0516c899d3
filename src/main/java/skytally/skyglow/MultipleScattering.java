package skytally.skyglow;

import java.util.Arrays;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.DoubleConsumer;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import skytally.atmosphere.Atmosphere;

/**
 * The field of radiance around a light on the ground, light of all orders of scattering together, by successive
 * orders: what is scattered once is summed over all directions at each point of a grid, what that sends on along the
 * lines through each point is summed again, and so on. The ground sends back its share, matt, at every order.
 *
 * <p>Worked out for nine hats of zenith angle and all wavelengths in one pass. The points of one order do not depend
 * on one another and each writes its own moments only, in a fixed order of sums: the digits are the same however
 * many threads there are, and on every machine, for beside the arithmetic only {@link StrictMath} is used.
 *
 * @see "Garstang, R. H. (1989), Night-sky brightness at observatories and sites, PASP 101, 306: the first model with a
 *     second order and the Earth's curve"
 * @see "Chandrasekhar, S. (1950), Radiative Transfer: the equation that successive orders solve"
 */
final class MultipleScattering {

    /** Where lines end at the points of the grid; above is a two-thousandth of the molecules. */
    private static final double TOP_M = 60_000;

    /** No order is taken to be brighter than this share of the one before it, so that the sum of the rest is finite. */
    private static final double HIGHEST_RATIO = 0.95;
    /** Nor is that share taken to end above this. */
    private static final double HIGHEST_LIMIT = 0.8;

    private final LayeredAir air;
    private final Resolution resolution;
    private final FieldGrid grid;
    private final int lanes;
    private final int points;
    private final DoubleConsumer progress;
    private final AtomicInteger pointsDone = new AtomicInteger();
    private final AtomicReference<@Nullable RuntimeException> stopped = new AtomicReference<>();

    /** What an order comes to, as it is: moments for each point by function and lane; illuminance of the ground by row and lane. */
    private record Order(double[][] moments, double[] illuminance) {}

    private MultipleScattering(LayeredAir air, Resolution resolution, DoubleConsumer progress) {
        this.air = air;
        this.resolution = resolution;
        this.grid = new FieldGrid(resolution.distances(), resolution.levels());
        this.lanes = air.wavelengths() * ZenithHats.COUNT;
        this.points = grid.points();
        this.progress = progress;
    }

    /**
     * Works out the field, on as many threads as the common pool has.
     *
     * @param progress told the share done, 0 to 1, again and again and from any thread; an exception from it stops the
     *                 work and is thrown on
     */
    static ScatteredField solve(LayeredAir air, Resolution resolution, DoubleConsumer progress) {
        MultipleScattering work = new MultipleScattering(air, resolution, progress);
        try {
            return work.solved();
        } catch (RuntimeException e) {
            // threads hand on an exception of the same kind, not always the one that was thrown
            RuntimeException first = work.stopped.get();
            throw first == null ? e : first;
        }
    }

    private ScatteredField solved() {
        Order once = once();
        double[][] total = Arrays.stream(once.moments()).map(double[]::clone).toArray(double[][]::new);
        double[] totalIlluminance = once.illuminance().clone();
        int[] places = resolution.laterBasis().placesIn(resolution.firstBasis());

        Order last = new Order(chosen(once.moments(), places), once.illuminance());
        Order beforeLast = last;
        for (int n = 2; n <= resolution.orders(); n++) {
            Order next = scatteredAgain(last);
            if (n == resolution.orders()) {
                addTheRest(n, beforeLast, last, next);
            }
            addTo(total, next.moments(), places);
            for (int i = 0; i < totalIlluminance.length; i++) {
                totalIlluminance[i] += next.illuminance()[i];
            }
            beforeLast = last;
            last = next;
        }
        return ScatteredField.of(air, grid, resolution.firstBasis(), lanes, total, totalIlluminance);
    }

    private void done() {
        RuntimeException before = stopped.get();
        if (before != null) {
            throw before;
        }
        try {
            progress.accept(pointsDone.incrementAndGet() / (double) (points * resolution.orders()));
        } catch (RuntimeException e) {
            stopped.compareAndSet(null, e);
            throw e;
        }
    }

    // ---- one order ----

    private Order once() {
        Order order = empty(resolution.firstBasis());
        IntStream.range(0, points).parallel().forEach(point -> {
            OnceScattered light = new OnceScattered(air, resolution.firstLow(), resolution.firstHigh());
            double distance = grid.distance(point / grid.levels());
            receive(
                    point,
                    resolution.first(),
                    resolution.firstBasis(),
                    order,
                    (ray, sum) -> light.gather(ray, distance, sum));
            done();
        });
        return order;
    }

    private Order scatteredAgain(Order last) {
        ScatteredField field =
                ScatteredField.of(air, grid, resolution.laterBasis(), lanes, last.moments(), last.illuminance());
        Order order = empty(resolution.laterBasis());
        IntStream.range(0, points).parallel().forEach(point -> {
            ScatteredField.Gatherer light = field.new Gatherer(resolution.laterLow(), resolution.laterHigh());
            double distance = grid.distance(point / grid.levels());
            receive(
                    point,
                    resolution.later(),
                    resolution.laterBasis(),
                    order,
                    (ray, sum) -> light.gather(ray, distance, sum));
            done();
        });
        return order;
    }

    private Order empty(AngularBasis basis) {
        return new Order(new double[points][basis.size() * lanes], new double[grid.distances() * lanes]);
    }

    /** Where the light comes from that a line of sight meets. */
    private interface Source {
        void gather(Ray ray, double[] into);
    }

    /** Sums what one point receives from all sides; a point on the ground also by what falls on level ground. */
    private void receive(int point, DirectionRule.Density density, AngularBasis basis, Order order, Source source) {
        int row = point / grid.levels();
        int level = point % grid.levels();
        double distance = grid.distance(row);
        double height = grid.height(row, level);
        double up = height - (distance * distance - height * height) / (2 * Atmosphere.EARTH_RADIUS_M);
        double zenithCosine = up / distance;
        double zenithSine = Math.sqrt(Math.max(0, 1 - zenithCosine * zenithCosine));
        DirectionRule directions = new DirectionRule(density);
        directions.lookAround(distance, up, height);

        Ray ray = new Ray(air);
        double[] radiance = new double[lanes];
        double[] function = new double[basis.size()];
        double[][] moments = new double[basis.size()][lanes]; // arrays of their own, which the loop over lanes likes
        for (int i = 0; i < directions.count(); i++) {
            double towardLight = directions.towardLight(i);
            double upward = directions.upward(i);
            double climb = upward * zenithSine - towardLight * zenithCosine;
            double rising = directions.rising(i);
            ray.begin(distance, up, height, rising, towardLight, climb, TOP_M);
            source.gather(ray, radiance);
            basis.at(towardLight, upward, function);
            addMoments(radiance, function, directions.solidAngle(i), moments);
            if (level == grid.levels() - 1 && rising > 0) {
                for (int lane = 0; lane < lanes; lane++) {
                    order.illuminance()[row * lanes + lane] += directions.solidAngle(i) * rising * radiance[lane];
                }
            }
        }
        for (int k = 0; k < basis.size(); k++) {
            System.arraycopy(moments[k], 0, order.moments()[point], k * lanes, lanes);
        }
    }

    private static void addMoments(double[] radiance, double[] function, double solidAngle, double[][] moments) {
        for (int k = 0; k < function.length; k++) {
            double weight = solidAngle * function[k];
            double[] sum = moments[k];
            for (int lane = 0; lane < radiance.length; lane++) {
                sum[lane] += weight * radiance[lane];
            }
        }
    }

    private double[][] chosen(double[][] moments, int[] places) {
        double[][] some = new double[points][places.length * lanes];
        for (int point = 0; point < points; point++) {
            for (int k = 0; k < places.length; k++) {
                System.arraycopy(moments[point], places[k] * lanes, some[point], k * lanes, lanes);
            }
        }
        return some;
    }

    private void addTo(double[][] total, double[][] moments, int[] places) {
        for (int point = 0; point < points; point++) {
            for (int k = 0; k < places.length; k++) {
                for (int lane = 0; lane < lanes; lane++) {
                    total[point][places[k] * lanes + lane] += moments[point][k * lanes + lane];
                }
            }
        }
    }

    // ---- the orders that are not worked out ----

    /**
     * Raises the last order by those above it. The ratio of neighbouring orders, of the mean radiance at each point,
     * falls with n toward a limit as c + k/n; both follow from the last two ratios.
     */
    private void addTheRest(int n, Order beforeLast, Order last, Order next) {
        int size = resolution.laterBasis().size();
        for (int point = 0; point < points; point++) {
            boolean isGround = point % grid.levels() == grid.levels() - 1;
            for (int lane = 0; lane < lanes; lane++) {
                double ratioBefore =
                        ratio(last.moments()[point][lane], beforeLast.moments()[point][lane]);
                double ratio = ratio(next.moments()[point][lane], last.moments()[point][lane]);
                double factor = withTheRest(n, ratioBefore, ratio);
                for (int k = 0; k < size; k++) {
                    next.moments()[point][k * lanes + lane] *= factor;
                }
                if (isGround) {
                    next.illuminance()[point / grid.levels() * lanes + lane] *= factor;
                }
            }
        }
    }

    private static double ratio(double over, double under) {
        return under > 0 ? Math.max(0, over / under) : 0;
    }

    /** 1 + r(n+1) + r(n+1) r(n+2) + … */
    private static double withTheRest(int n, double ratioBefore, double ratio) {
        double slope = Math.max(0, (ratioBefore - ratio) * n * (n - 1));
        double limit = Math.min(ratio - slope / n, HIGHEST_LIMIT);
        if (limit < 0) {
            limit = 0;
            slope = ratio * n;
        }
        double sum = 1;
        double product = 1;
        for (int m = n + 1; product > 1e-9 && m < n + 400; m++) {
            product *= Math.min(HIGHEST_RATIO, limit + slope / m);
            sum += product;
        }
        return sum;
    }
}
