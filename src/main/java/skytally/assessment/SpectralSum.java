package skytally.assessment;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import skytally.spectrum.Passband;
import skytally.spectrum.Spectrum;

/**
 * Turns what the air sends back at six wavelengths into what an eye or an instrument reads of one spectrum.
 *
 * <p>The kernel, smooth in wavelength, is carried between the six by a cubic through the four nearest in the
 * logarithm of both, and summed over the spectrum band by band: photopic with V(λ), instrument with Johnson V. The
 * two are never turned into one another afterwards.
 */
final class SpectralSum {

    /** The wavelengths at which the air is worked out, in nanometres. */
    static final double[] WAVELENGTHS_NM = {420, 470, 530, 580, 630, 690};

    private static final int POINTS = 4;
    private static final Map<Spectrum, SpectralSum> KEPT = new ConcurrentHashMap<>();
    private static final int MOST_KEPT = 500;

    private final double[] photopic;
    private final double[] johnsonV;
    private final int[] first;
    private final double[][] cubic;
    private final double photopicAll;
    private final double luminousEfficacy;

    private SpectralSum(Spectrum spectrum) {
        double[] nm = spectrum.nodeWavelengthsNm();
        photopic = spectrum.nodeWeights(Passband.PHOTOPIC);
        johnsonV = spectrum.nodeWeights(Passband.JOHNSON_V);
        luminousEfficacy = spectrum.luminousEfficacyLmPerW();
        photopicAll = sum(photopic);
        first = new int[nm.length];
        cubic = new double[nm.length][];
        for (int i = 0; i < nm.length; i++) {
            first[i] = firstOfFour(nm[i]);
            cubic[i] = lagrange(nm[i], first[i]);
        }
    }

    static SpectralSum of(Spectrum spectrum) {
        if (KEPT.size() > MOST_KEPT) {
            KEPT.clear();
        }
        return KEPT.computeIfAbsent(spectrum, SpectralSum::new);
    }

    /**
     * @param kernel 1/m² at each of {@link #WAVELENGTHS_NM}, for one candela sent out
     * @return luminance in cd/m² for one candela
     */
    double luminance(double[] kernel) {
        return weighted(kernel, photopic) / photopicAll;
    }

    /** Mean spectral radiance in the Johnson V band, W m⁻² sr⁻¹ nm⁻¹, for one candela sent out. */
    double johnsonV(double[] kernel) {
        return weighted(kernel, johnsonV) / (luminousEfficacy * Passband.JOHNSON_V.integralNm());
    }

    private double weighted(double[] kernel, double[] weights) {
        double[] logs = new double[kernel.length];
        for (int i = 0; i < kernel.length; i++) {
            if (!(kernel[i] > 0)) {
                return 0;
            }
            logs[i] = StrictMath.log(kernel[i]);
        }
        double total = 0;
        for (int i = 0; i < weights.length; i++) {
            if (weights[i] > 0) {
                double log = 0;
                for (int k = 0; k < POINTS; k++) {
                    log += cubic[i][k] * logs[first[i] + k];
                }
                total += weights[i] * StrictMath.exp(log);
            }
        }
        return total;
    }

    private static int firstOfFour(double nm) {
        int first = 0;
        while (first < WAVELENGTHS_NM.length - POINTS && nm > WAVELENGTHS_NM[first + 2]) {
            first++;
        }
        return first;
    }

    private static double[] lagrange(double nm, int first) {
        double x = StrictMath.log(nm);
        double[] weights = new double[POINTS];
        for (int k = 0; k < POINTS; k++) {
            weights[k] = 1;
            double own = StrictMath.log(WAVELENGTHS_NM[first + k]);
            for (int j = 0; j < POINTS; j++) {
                if (j != k) {
                    double other = StrictMath.log(WAVELENGTHS_NM[first + j]);
                    weights[k] *= (x - other) / (own - other);
                }
            }
        }
        return weights;
    }

    private static double sum(double[] values) {
        double sum = 0;
        for (double value : values) {
            sum += value;
        }
        return sum;
    }
}
