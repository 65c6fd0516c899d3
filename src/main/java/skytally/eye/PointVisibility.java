package skytally.eye;

import skytally.citation.Bibliography;
import skytally.citation.Citation;
import skytally.photometry.Illuminance;
import skytally.photometry.Luminance;
import skytally.photometry.LuminousIntensity;

/**
 * How far off a lamp can still be seen. By Allard's law its light at the eye is
 * <pre>
 *   E(d) = I e^(−k d) / d²
 * </pre>
 * and it is seen while E exceeds a threshold. Thresholds differ by 25 to 35 between a light reliably noticed and one just made
 * out by somebody who knows where to look, so both are to be shown. Hills and the curve of the Earth come on top.
 */
public final class PointVisibility {

    /** A light reliably noticed at night on a dark background: the practice of navigation (IALA, COLREG Annex I). */
    public static final Illuminance NAVIGATION_PRACTICE = new Illuminance(2e-7);

    /** Which question a threshold answers, in the order they are shown. */
    public enum Threshold {
        RELIABLY_NOTICED("reliably noticed at night", "navigation-practice") {
            @Override
            public Illuminance on(Luminance background) {
                return NAVIGATION_PRACTICE;
            }
        },
        JUST_MADE_OUT("just made out by a dark-adapted eye that knows where to look", "crumey-2014") {
            @Override
            public Illuminance on(Luminance background) {
                return detection(background);
            }
        },
        JUST_MADE_OUT_BY_HECHT("the same, by an older formula", "hecht-schaefer") {
            @Override
            public Illuminance on(Luminance background) {
                return detectionByHecht(background);
            }
        };

        private final String words;
        private final String source;

        Threshold(String words, String source) {
            this.words = words;
            this.source = source;
        }

        /** The least illuminance at the eye; the background counts where the threshold depends on it. */
        public abstract Illuminance on(Luminance background);

        public String words() {
            return words;
        }

        public Citation citation() {
            return Bibliography.cite(source);
        }
    }

    private static final double HECHT_BRANCH_NL = 1500;

    private PointVisibility() {}

    /** Just made out by a dark-adapted eye that knows where to look: Crumey (2014), field factor 2. */
    public static Illuminance detection(Luminance background) {
        return LimitingMagnitude.threshold(background, LimitingMagnitude.CRUMEY_FIELD_FACTOR_TYPICAL);
    }

    /**
     * The same by an older formula, a second opinion: {@code C (1 + √(K B))²} footcandles, B in nanolamberts.
     *
     * @see "Hecht (1947) as used by Schaefer (1990); constants from memory"
     */
    public static Illuminance detectionByHecht(Luminance background) {
        double nanolamberts = background.nanolamberts();
        boolean dark = nanolamberts < HECHT_BRANCH_NL;
        double c = StrictMath.pow(10, dark ? -9.80 : -8.35);
        double k = StrictMath.pow(10, dark ? -1.90 : -5.90);
        double sum = 1 + Math.sqrt(k * nanolamberts);
        return Illuminance.ofFootcandles(c * sum * sum);
    }

    /**
     * The distance at which a lamp falls below a threshold, in metres; 0 for a lamp that gives no light.
     *
     * @param threshold          more than 0
     * @param extinctionPerMetre along the path, 0 or more; not the extinction of a star
     */
    public static double distanceWhereItDisappearsM(
            LuminousIntensity lamp, Illuminance threshold, double extinctionPerMetre) {
        if (!(threshold.lux() > 0)) {
            throw new IllegalArgumentException("A threshold must be more than 0 lx");
        }
        requireExtinction(extinctionPerMetre);
        double seenM = 0;
        double unseenM = Math.sqrt(lamp.candela()) / Math.sqrt(threshold.lux());
        if (extinctionPerMetre == 0) {
            return unseenM;
        }
        for (double middleM = unseenM / 2; middleM > seenM && middleM < unseenM; middleM = (seenM + unseenM) / 2) {
            if (illuminanceLx(lamp, middleM, extinctionPerMetre) > threshold.lux()) {
                seenM = middleM;
            } else {
                unseenM = middleM;
            }
        }
        return seenM;
    }

    /**
     * The lamp that is at the threshold at a distance, {@code I = E_t d² e^(k d)}.
     *
     * @param distanceM          0 or more
     * @param extinctionPerMetre 0 or more
     */
    public static LuminousIntensity intensityJustSeen(
            double distanceM, Illuminance threshold, double extinctionPerMetre) {
        if (!(distanceM >= 0)) {
            throw new IllegalArgumentException("Distance must be 0 or more metres, not " + distanceM);
        }
        requireExtinction(extinctionPerMetre);
        return new LuminousIntensity(
                threshold.lux() * distanceM * distanceM * StrictMath.exp(extinctionPerMetre * distanceM));
    }

    static double illuminanceLx(LuminousIntensity lamp, double distanceM, double extinctionPerMetre) {
        return lamp.candela() * StrictMath.exp(-extinctionPerMetre * distanceM) / (distanceM * distanceM);
    }

    private static void requireExtinction(double extinctionPerMetre) {
        if (!(extinctionPerMetre >= 0 && extinctionPerMetre < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(
                    "Extinction must be finite and 0 or more per metre, not " + extinctionPerMetre);
        }
    }
}
