package skytally.eye;

import skytally.citation.Bibliography;
import skytally.citation.Citation;
import skytally.photometry.Illuminance;
import skytally.photometry.Luminance;
import skytally.photometry.Magnitude;
import skytally.photometry.ZeroPoint;

/**
 * The faintest star an eye sees on a background, at the eye: the star's extinction is not in it.
 *
 * <p>Crumey's equation 34 times a field factor, with two repairs he and others ask for: a brighter sky never shows
 * fainter stars (the equation dips by 0.03 mag between 15.9 and 16.7 mag/arcsec²), and below 1e-5 cd/m² nothing changes.
 * In a city it is a best case: glare and poor adaptation are not in the background unless a veil is added to it.
 */
public final class LimitingMagnitude {

    /** Between people the field factor runs from this, practised eyes, ... */
    public static final double CRUMEY_FIELD_FACTOR_KEEN = 1.4;

    /** ... over this, the usual one, ... */
    public static final double CRUMEY_FIELD_FACTOR_TYPICAL = 2;

    /** ... to this, just visible without effort. */
    public static final double CRUMEY_FIELD_FACTOR_ORDINARY = 2.4;

    /** Darker than this the threshold is held, cd/m². */
    private static final double CRUMEY_DARKEST_CD_M2 = 1e-5;

    /** Where equation 34 is highest before its dip, and how high; field factor 1. */
    private static final double BRIGHTEST_BEFORE_DIP_CD_M2 = brightestBeforeDip();

    private static final double HIGHEST_BEFORE_DIP_LX = Crumey2014.eq34Lx(BRIGHTEST_BEFORE_DIP_CD_M2);

    private LimitingMagnitude() {}

    /**
     * What different people see; the smaller the magnitude, the fewer stars.
     *
     * @param keen     field factor 1.4
     * @param typical  field factor 2
     * @param ordinary field factor 2.4
     */
    public record Band(Magnitude keen, Magnitude typical, Magnitude ordinary) {

        public Band {
            if (!(keen.value() >= typical.value() && typical.value() >= ordinary.value())) {
                throw new IllegalArgumentException(
                        "Keen eyes see the faintest star: " + keen + ", " + typical + ", " + ordinary);
            }
        }
    }

    /**
     * The least illuminance at the eye by which a point is seen.
     *
     * @param background  the sky around it, and any veil in the eye
     * @param fieldFactor 1 (laboratory) to 5
     */
    public static Illuminance threshold(Luminance background, double fieldFactor) {
        if (!(fieldFactor >= 1 && fieldFactor <= 5)) {
            throw new IllegalArgumentException("The field factor must be 1 to 5, not " + fieldFactor);
        }
        return new Illuminance(fieldFactor * risingThresholdLx(background.candelaPerSquareMetre()));
    }

    /** Equation 34 held in the dark and across its dip. */
    private static double risingThresholdLx(double backgroundCdM2) {
        double asPrinted = Crumey2014.eq34Lx(Math.max(backgroundCdM2, CRUMEY_DARKEST_CD_M2));
        return backgroundCdM2 > BRIGHTEST_BEFORE_DIP_CD_M2 ? Math.max(asPrinted, HIGHEST_BEFORE_DIP_LX) : asPrinted;
    }

    /**
     * The faintest star, at the eye.
     *
     * @param zeroPoint one above the atmosphere
     */
    public static Magnitude on(Luminance background, double fieldFactor, ZeroPoint zeroPoint) {
        if (!zeroPoint.isMeantForSky()) {
            throw new IllegalArgumentException(
                    zeroPoint + " has extinction folded in; a limiting magnitude at the eye has none");
        }
        return zeroPoint.magnitude(threshold(background, fieldFactor));
    }

    /** What different people see on one background. */
    public static Band band(Luminance background, ZeroPoint zeroPoint) {
        return new Band(
                on(background, CRUMEY_FIELD_FACTOR_KEEN, zeroPoint),
                on(background, CRUMEY_FIELD_FACTOR_TYPICAL, zeroPoint),
                on(background, CRUMEY_FIELD_FACTOR_ORDINARY, zeroPoint));
    }

    public static Citation citation() {
        return Bibliography.cite("crumey-2014");
    }

    /** The one maximum of equation 34 between 0.01 and 0.04 cd/m², by thirds. */
    private static double brightestBeforeDip() {
        double low = 0.01;
        double high = 0.04;
        for (int i = 0; i < 200; i++) {
            double third = (high - low) / 3;
            if (Crumey2014.eq34Lx(low + third) < Crumey2014.eq34Lx(high - third)) {
                low += third;
            } else {
                high -= third;
            }
        }
        return low;
    }
}
