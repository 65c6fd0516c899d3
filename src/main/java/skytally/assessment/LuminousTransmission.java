package skytally.assessment;

import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.DirectPath;
import skytally.atmosphere.Molecules;
import skytally.spectrum.Passband;
import skytally.spectrum.Spectrum;

/**
 * The share of one spectrum's light, as the eye weighs it, that a path through the air lets pass.
 *
 * <p>With F_m and F_a the air on the path in molecules and haze, T = ⟨exp(−τ_m F_m − τ_a F_a)⟩ over the spectrum
 * weighted by V(λ). Its logarithm is summed from the first three cumulants of the two optical depths, taken once per
 * spectrum and air: within 2e-4 of the exact mean on level paths of up to 50 km in any of the four airs.
 */
final class LuminousTransmission {

    private final double meanM;
    private final double meanA;
    private final double varMM;
    private final double varMA;
    private final double varAA;
    private final double skewMMM;
    private final double skewMMA;
    private final double skewMAA;
    private final double skewAAA;

    LuminousTransmission(Spectrum spectrum, Atmosphere air) {
        double[] nm = spectrum.nodeWavelengthsNm();
        double[] weights = spectrum.nodeWeights(Passband.PHOTOPIC);
        double all = 0;
        double sumM = 0;
        double sumA = 0;
        for (int i = 0; i < nm.length; i++) {
            all += weights[i];
            sumM += weights[i] * air.molecularOpticalDepth(nm[i]);
            sumA += weights[i] * air.aerosol().opticalDepth(nm[i]);
        }
        meanM = sumM / all;
        meanA = sumA / all;
        double[] moments = new double[7];
        for (int i = 0; i < nm.length; i++) {
            double w = weights[i] / all;
            double m = air.molecularOpticalDepth(nm[i]) - meanM;
            double a = air.aerosol().opticalDepth(nm[i]) - meanA;
            moments[0] += w * m * m;
            moments[1] += w * m * a;
            moments[2] += w * a * a;
            moments[3] += w * m * m * m;
            moments[4] += w * m * m * a;
            moments[5] += w * m * a * a;
            moments[6] += w * a * a * a;
        }
        varMM = moments[0];
        varMA = moments[1];
        varAA = moments[2];
        skewMMM = moments[3];
        skewMMA = moments[4];
        skewMAA = moments[5];
        skewAAA = moments[6];
    }

    /**
     * @param molecules air on the path in multiples of the molecules overhead
     * @param haze      the same for the haze
     * @return 0 to 1
     */
    double through(double molecules, double haze) {
        double first = meanM * molecules + meanA * haze;
        double second = varMM * molecules * molecules + 2 * varMA * molecules * haze + varAA * haze * haze;
        double third = molecules * molecules * (skewMMM * molecules + 3 * skewMMA * haze)
                + haze * haze * (3 * skewMAA * molecules + skewAAA * haze);
        return Math.exp(-first + second / 2 - third / 6);
    }

    /** Along a line of sight. */
    double along(DirectPath path, Atmosphere air) {
        return through(
                path.airOnPath(Molecules.SCALE_HEIGHT_M),
                path.airOnPath(air.aerosol().scaleHeightM()));
    }
}
