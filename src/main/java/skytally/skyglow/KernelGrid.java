package skytally.skyglow;

import java.util.Arrays;
import java.util.Locale;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Molecules;

/**
 * The kernels worked out once for all projects, and how those between follow from them without solving.
 *
 * <p>Kept are the hazes 0.05, 0.10, 0.20, 0.30 and 0.40 (depth at 550 nm, the last only to have something beyond
 * 0.30) over ground of reflectance 0.05, 0.15, 0.30 and 0.80 at sea level, each at seven wavelengths.
 *
 * <p>A wavelength matters to the air only through the depth of the molecules and that of the haze. So any depth of the
 * molecules, at whatever wavelength and height of the site, is looked up as the wavelength that has it at sea level,
 * and any depth of the haze as the haze that has it there. Between the nodes the logarithm of a field's size and
 * the field over its size follow polynomials: in ln λ and the reflectance through four nodes, in ln(haze + 0.05)
 * through all five.
 */
final class KernelGrid {

    static final double[] HAZE_DEPTHS = {0.05, 0.10, 0.20, 0.30, 0.40};
    static final double[] REFLECTANCES = {0.05, 0.15, 0.30, 0.80};
    static final double[] WAVELENGTHS_NM = {420, 470, 530, 580, 630, 690, 760};

    static final int COUNT = HAZE_DEPTHS.length * REFLECTANCES.length;

    /** The haze's form that all kernels share. */
    private static final Aerosol FORM = Aerosol.ofDepth(0);

    private static final double LEAST_HAZE = 0.05;
    private static final double MOST_HAZE = 0.30;
    private static final double LOWEST_GROUND_M = -500;
    private static final double HIGHEST_GROUND_M = 3000;
    /** As far as the polynomials are trusted beyond the outermost nodes. */
    private static final double LEAST_HAZE_REACHED = 0.045;

    private static final double SHORTEST_REACHED_NM = 412;
    private static final double LONGEST_REACHED_NM = 762;

    private static final int NEIGHBOURS = 4;
    /** Light scattered by haze is added to what molecules scatter: the logarithm of the sum is what runs straight. */
    private static final double MOLECULES_SHARE = 0.05;

    private final Kept kept;

    /** Where the kernels come from. */
    interface Kept {
        SkyglowKernel kernel(int haze, int reflectance);
    }

    KernelGrid(Kept kept) {
        this.kept = kept;
    }

    /** The air and the ground of one of the kernels kept. */
    static LayeredAir node(int haze, int reflectance) {
        double[] ground = new double[WAVELENGTHS_NM.length];
        Arrays.fill(ground, REFLECTANCES[reflectance]);
        Atmosphere air = new Atmosphere(Aerosol.ofDepth(HAZE_DEPTHS[haze]), 0);
        return LayeredAir.of(air, ground, WAVELENGTHS_NM);
    }

    /**
     * The kernel of this air over matt ground.
     *
     * @throws OutsideKernelGridException if it lies beyond the kernels kept
     */
    SkyglowKernel between(Atmosphere air, double reflectance, double... wavelengthsNm) {
        refuseOutside(air, reflectance);
        int wavelengths = wavelengthsNm.length;
        double[] ground = new double[wavelengths];
        Arrays.fill(ground, reflectance);
        LayeredAir layered = LayeredAir.of(air, ground, wavelengthsNm);
        double[] ofReflectance = Lagrange.weights(REFLECTANCES, reflectance, NEIGHBOURS);
        SkyglowKernel.Blend blend = new SkyglowKernel.Blend(layered, kept.kernel(0, 0));
        for (int w = 0; w < wavelengths; w++) {
            double alike = wavelengthAtSeaLevel(layered.molecularDepth()[w]);
            double haze = layered.hazeDepth()[w] / StrictMath.pow(alike / 550, -FORM.angstromExponent());
            refuseUnreached(wavelengthsNm[w], alike, haze);
            double[] ofWavelength = Lagrange.weights(logarithms(WAVELENGTHS_NM, 0), StrictMath.log(alike), NEIGHBOURS);
            double[] ofHaze = Lagrange.weights(
                    logarithms(HAZE_DEPTHS, MOLECULES_SHARE),
                    StrictMath.log(haze + MOLECULES_SHARE),
                    HAZE_DEPTHS.length);
            addNodes(blend, w, ofHaze, ofReflectance, ofWavelength);
        }
        return blend.kernel();
    }

    private void addNodes(
            SkyglowKernel.Blend blend, int w, double[] ofHaze, double[] ofReflectance, double[] ofWavelength) {
        for (int h = 0; h < ofHaze.length; h++) {
            for (int r = 0; r < ofReflectance.length; r++) {
                for (int n = 0; n < ofWavelength.length; n++) {
                    double weight = ofHaze[h] * ofReflectance[r] * ofWavelength[n];
                    if (weight != 0) {
                        blend.add(w, kept.kernel(h, r), n, weight);
                    }
                }
            }
        }
    }

    private static double[] logarithms(double[] values, double added) {
        return Arrays.stream(values).map(value -> StrictMath.log(value + added)).toArray();
    }

    /** The wavelength at which the molecules have this depth at sea level; they thin out steadily toward the red. */
    static double wavelengthAtSeaLevel(double molecularDepth) {
        for (double node : WAVELENGTHS_NM) {
            if (Molecules.opticalDepthAtSeaLevel(node) == molecularDepth) {
                return node; // halving would end a hair beside it
            }
        }
        double low = 300;
        double high = 1100;
        for (int i = 0; i < 60; i++) {
            double middle = (low + high) / 2;
            if (Molecules.opticalDepthAtSeaLevel(middle) > molecularDepth) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }

    private static void refuseOutside(Atmosphere air, double reflectance) {
        Aerosol haze = air.aerosol();
        require(haze.opticalDepthAt550(), LEAST_HAZE, MOST_HAZE, "Aerosol optical depth at 550 nm");
        require(reflectance, REFLECTANCES[0], REFLECTANCES[REFLECTANCES.length - 1], "Reflectance of the ground");
        require(air.groundHeightM(), LOWEST_GROUND_M, HIGHEST_GROUND_M, "Ground height in metres");
        if (haze.scaleHeightM() != FORM.scaleHeightM()
                || haze.singleScatteringAlbedo() != FORM.singleScatteringAlbedo()
                || haze.asymmetry() != FORM.asymmetry()) {
            throw new OutsideKernelGridException("The kernels kept are of haze with scale height "
                    + FORM.scaleHeightM() + " m, single-scattering albedo " + FORM.singleScatteringAlbedo()
                    + " and asymmetry " + FORM.asymmetry() + "; other haze has to be solved for itself");
        }
    }

    private static void require(double value, double low, double high, String what) {
        if (!(value >= low && value <= high)) {
            throw new OutsideKernelGridException(
                    what + " must be " + low + " to " + high + " to be found between the kernels kept, not " + value);
        }
    }

    private static void refuseUnreached(double wavelengthNm, double alike, double haze) {
        double most = HAZE_DEPTHS[HAZE_DEPTHS.length - 1];
        if (!(alike >= SHORTEST_REACHED_NM && alike <= LONGEST_REACHED_NM)) {
            throw new OutsideKernelGridException(String.format(
                    Locale.ROOT,
                    "At %.0f nm the molecules are as at %.0f nm at sea level; the kernels kept reach from %.0f to"
                            + " %.0f nm",
                    wavelengthNm,
                    alike,
                    SHORTEST_REACHED_NM,
                    LONGEST_REACHED_NM));
        }
        if (!(haze >= LEAST_HAZE_REACHED && haze <= most)) {
            throw new OutsideKernelGridException(String.format(
                    Locale.ROOT,
                    "At %.0f nm the haze is as one of depth %.3f; the kernels kept reach from %.3f to %.2f",
                    wavelengthNm,
                    haze,
                    LEAST_HAZE_REACHED,
                    most));
        }
    }
}
