package skytally.eye;

import skytally.photometry.Illuminance;
import skytally.photometry.LuminousIntensity;
import skytally.photometry.Magnitude;
import skytally.photometry.ZeroPoint;

/**
 * The star a lamp equals. The lamp's light is taken at the eye, after its own path; the star's passes the whole air:
 * <pre>
 *   m_E   = −2.5 log10(E / E0)           the star as it would be with no air
 *   m_cat = m_E − k_V X                  the star's number in a catalogue, seen at an altitude with air mass X
 * </pre>
 * Equal in photopic lux: fair for points brighter than about magnitude 4, looked at directly. Fainter, the
 * {@linkplain #inScotopicLight scotopic} line holds.
 *
 * <p>A zero point at the ground has one air mass in it already; only what exceeds it is taken off.
 */
public final class EquivalentStar {

    /** The named convention for "a star overhead": extinction in V, mag per air mass. */
    public static final double OVERHEAD_KV = 0.20;

    /** The named convention for "a star overhead": air mass. */
    public static final double OVERHEAD_AIR_MASS = 1;

    private static final double STANDARD_DISTANCE_M = 1000;

    private EquivalentStar() {}

    /** m_E: the star as it would be with no air between it and the eye. The light must be more than none. */
    public static Magnitude withoutAir(Illuminance atEye, ZeroPoint zeroPoint) {
        return zeroPoint.magnitude(atEye);
    }

    /** m_cat of the star overhead, by the named convention. */
    public static Magnitude overhead(Illuminance atEye, ZeroPoint zeroPoint) {
        return catalogue(atEye, zeroPoint, OVERHEAD_KV, OVERHEAD_AIR_MASS);
    }

    /**
     * m_cat of the star in one direction.
     *
     * @param kV      extinction in V, mag per air mass, 0 to 3
     * @param airMass of a star at that altitude (Kasten and Young), 0.99 to 38
     */
    public static Magnitude catalogue(Illuminance atEye, ZeroPoint zeroPoint, double kV, double airMass) {
        return new Magnitude(withoutAir(atEye, zeroPoint).value() - extinctionMag(zeroPoint, kV, airMass));
    }

    /**
     * The other way: what a star of a catalogue gives at the eye, {@code E0 · 10^(−0.4 (m + k_V X))}.
     *
     * @param kV      extinction in V, mag per air mass, 0 to 3
     * @param airMass 0.99 to 38
     */
    public static Illuminance atEye(Magnitude catalogue, ZeroPoint zeroPoint, double kV, double airMass) {
        return zeroPoint.illuminance(new Magnitude(catalogue.value() + extinctionMag(zeroPoint, kV, airMass)));
    }

    /**
     * The star that equals the lamp for the dark-adapted eye: {@code m − 2.5 log10((S/P) lamp / (S/P) star)}.
     *
     * @param photopic the star by photopic light
     * @param lampScotopicPhotopicRatio more than 0
     * @param starScotopicPhotopicRatio more than 0; 2.3 of a Sun-like star
     */
    public static Magnitude inScotopicLight(
            Magnitude photopic, double lampScotopicPhotopicRatio, double starScotopicPhotopicRatio) {
        return new Magnitude(
                photopic.value() - Magnitude.differenceOfRatio(lampScotopicPhotopicRatio / starScotopicPhotopicRatio));
    }

    /** A lamp's standard magnitude: as seen from 1 km, no air. */
    public static Magnitude standardMagnitude(LuminousIntensity lamp, ZeroPoint zeroPoint) {
        return zeroPoint.magnitude(Illuminance.from(lamp, STANDARD_DISTANCE_M, 0));
    }

    private static double extinctionMag(ZeroPoint zeroPoint, double kV, double airMass) {
        if (!(kV >= 0 && kV <= 3)) {
            throw new IllegalArgumentException("Extinction in V must be 0 to 3 mag per air mass, not " + kV);
        }
        if (!(airMass >= 0.99 && airMass <= 38)) {
            throw new IllegalArgumentException("The air mass of a star is 0.99 to 38, not " + airMass);
        }
        return kV * (zeroPoint.isMeantForSky() ? airMass : Math.max(0, airMass - 1));
    }
}
