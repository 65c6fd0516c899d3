package skytally.glare;

import skytally.photometry.Illuminance;
import skytally.photometry.Luminance;

/**
 * GR for lit areas and sports grounds, for views below eye level: 10 (unnoticeable) to 90 (unbearable).
 * <pre>
 *   GR = 27 + 24 log10(L_vl / L_ve^0.9),   L_ve = 0.035 ρ E_av / π
 * </pre>
 * It needs a lit ground and says nothing to a neighbour in the dark.
 *
 * @param value as computed, at least 10
 * @see "CIE 112:1994, coefficients from memory"
 */
public record GlareRating(double value) {

    private static final double LOWEST = 10;

    public GlareRating {
        if (!(value >= LOWEST && value < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("A glare rating is finite and at least 10, not " + value);
        }
    }

    /**
     * The rating from the two veils.
     *
     * @param veilOfLamps       Stiles-Holladay, summed over the luminaires
     * @param veilOfSurroundings from {@link #veilOfSurroundings}, more than 0
     */
    public static GlareRating of(Luminance veilOfLamps, Luminance veilOfSurroundings) {
        if (!(veilOfSurroundings.candelaPerSquareMetre() > 0)) {
            throw new IllegalArgumentException("A glare rating needs a lit ground");
        }
        double ratio =
                veilOfLamps.candelaPerSquareMetre() / StrictMath.pow(veilOfSurroundings.candelaPerSquareMetre(), 0.9);
        return new GlareRating(Math.max(LOWEST, 27 + 24 * StrictMath.log10(ratio)));
    }

    /**
     * The veil the lit ground itself makes.
     *
     * @param averageOnGround mean horizontal illuminance
     * @param reflectance     of the area, diffuse, 0 to 1
     */
    public static Luminance veilOfSurroundings(Illuminance averageOnGround, double reflectance) {
        return Luminance.ofMattSurface(averageOnGround, reflectance).times(0.035);
    }

    /** True where the scale has ended: to be printed "below 10". */
    public boolean isBelowScale() {
        return value == LOWEST;
    }
}
