package skytally.skyglow;

import skytally.atmosphere.Atmosphere;

/**
 * The light scattered more than once around one light or several that stand together, ready to be looked at from any
 * place in any direction. Made by {@link SkyglowKernel#lit}.
 *
 * <p>The light counts as standing on the ground. Safe for use by several threads.
 */
public final class SkyField {

    /** Points on a line of sight: in the low air, and above. */
    private static final int LOW_NODES = 16;

    private static final int HIGH_NODES = 10;

    private final ScatteredField field;
    private final ThreadLocal<Look> look = ThreadLocal.withInitial(Look::new);

    SkyField(ScatteredField field) {
        this.field = field;
    }

    ScatteredField field() {
        return field;
    }

    /** What one thread needs to look along lines. */
    private final class Look {
        final Ray ray = new Ray(field.air());
        final ScatteredField.Gatherer gatherer = field.new Gatherer(LOW_NODES, HIGH_NODES);
    }

    /**
     * Radiance along a line of sight by light scattered at least twice, or sent back by the ground after having been
     * scattered, for each wavelength.
     *
     * @return per square metre: multiply W/sr in to get W/(m² sr) out
     */
    public double[] higherOrders(Sightline line) {
        double[] sum = new double[field.air().wavelengths()];
        Look own = look.get();
        double distance = own.ray.lookAlong(line, Atmosphere.TOP_M);
        own.gatherer.gather(own.ray, distance, sum);
        return sum;
    }
}
