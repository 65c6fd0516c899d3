package skytally.skyglow;

import java.util.Arrays;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Molecules;

/**
 * The air and the ground as scattering needs them, wavelength by wavelength.
 *
 * @param aerosol        the haze's form; its depth is in {@code hazeDepth}
 * @param molecularDepth optical depth of the molecules overhead, for each wavelength
 * @param hazeDepth      the same of the haze
 * @param reflectance    of the ground, matt, 0 to 1, for each wavelength
 */
record LayeredAir(Aerosol aerosol, double[] molecularDepth, double[] hazeDepth, double[] reflectance) {

    LayeredAir {
        if (molecularDepth.length != hazeDepth.length || molecularDepth.length != reflectance.length) {
            throw new IllegalArgumentException("As many molecular depths, haze depths and reflectances, not "
                    + molecularDepth.length + ", " + hazeDepth.length + " and " + reflectance.length);
        }
        for (double share : reflectance) {
            if (!(share >= 0 && share <= 1)) {
                throw new IllegalArgumentException("Reflectance of the ground must be 0 to 1, not " + share);
            }
        }
    }

    static LayeredAir of(Atmosphere air, double[] reflectance, double[] wavelengthsNm) {
        return new LayeredAir(
                air.aerosol(),
                Arrays.stream(wavelengthsNm).map(air::molecularOpticalDepth).toArray(),
                Arrays.stream(wavelengthsNm).map(air.aerosol()::opticalDepth).toArray(),
                reflectance);
    }

    int wavelengths() {
        return molecularDepth.length;
    }

    /** Whether all numbers are the same. */
    boolean isSameAs(LayeredAir other) {
        return aerosol.equals(other.aerosol)
                && Arrays.equals(molecularDepth, other.molecularDepth)
                && Arrays.equals(hazeDepth, other.hazeDepth)
                && Arrays.equals(reflectance, other.reflectance);
    }

    /** Density of the molecules at a height, 1 at the ground; the same digits on every machine. */
    double molecules(double heightM) {
        return StrictMath.exp(-heightM / Molecules.SCALE_HEIGHT_M);
    }

    /** Density of the haze at a height, 1 at the ground. */
    double haze(double heightM) {
        return StrictMath.exp(-heightM / aerosol.scaleHeightM());
    }

    /** Share of the light met by molecules that is thrown on, per metre, per unit of depth and density. */
    double molecularScattering() {
        return 1 / Molecules.SCALE_HEIGHT_M;
    }

    /** The same of the haze. */
    double hazeScattering() {
        return aerosol.singleScatteringAlbedo() / aerosol.scaleHeightM();
    }
}
