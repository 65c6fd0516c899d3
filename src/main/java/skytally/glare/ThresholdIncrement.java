package skytally.glare;

import skytally.photometry.Luminance;

/**
 * TI: by how many per cent more a thing on the road must differ from it to be seen through the veil.
 * <pre>
 *   TI = 65 L_v / L_av^0.8       0.05 &lt; L_av ≤ 5 cd/m²
 *   TI = 95 L_v / L_av^1.05      L_av &gt; 5 cd/m²
 * </pre>
 * The branches do not meet: at 5 cd/m² they lie 2 % apart.
 *
 * @see "CIE 140 and EN 13201-3, coefficients from memory"
 */
public final class ThresholdIncrement {

    private static final double DARKEST_CD_M2 = 0.05;
    private static final double BRANCH_CD_M2 = 5;

    private ThresholdIncrement() {}

    /**
     * The increment in per cent.
     *
     * @param veil           summed over the luminaires
     * @param averageOfRoad  mean road luminance, more than 0.05 cd/m²
     */
    public static double percent(Luminance veil, Luminance averageOfRoad) {
        return veil.candelaPerSquareMetre() * percentPerVeil(averageOfRoad);
    }

    /**
     * The veil that gives a threshold increment.
     *
     * @param percent       zero or more
     * @param averageOfRoad mean road luminance, more than 0.05 cd/m²
     */
    public static Luminance veilFor(double percent, Luminance averageOfRoad) {
        return new Luminance(percent / percentPerVeil(averageOfRoad));
    }

    private static double percentPerVeil(Luminance averageOfRoad) {
        double average = averageOfRoad.candelaPerSquareMetre();
        if (!(average > DARKEST_CD_M2)) {
            throw new IllegalArgumentException(
                    "Threshold increment needs a road of more than 0.05 cd/m², not " + average);
        }
        return average <= BRANCH_CD_M2 ? 65 / StrictMath.pow(average, 0.8) : 95 / StrictMath.pow(average, 1.05);
    }
}
