package skytally.atmosphere;

/**
 * Haze: particles that thin out quickly with height and scatter mostly forward.
 *
 * @param opticalDepthAt550        overhead from the ground up, at 550 nm; 0 to 5
 * @param angstromExponent         how fast the depth falls with wavelength: {@code τ(λ) = τ(550) (λ/550)^−α}; 0 to 3
 * @param scaleHeightM             height over which it thins out by a factor e; 100 to 10 000 m
 * @param singleScatteringAlbedo   share of the light met that is scattered rather than absorbed; 0 to 1
 * @param asymmetry                mean cosine of the scattering angle, g of Henyey and Greenstein; −0.95 to 0.95
 */
public record Aerosol(
        double opticalDepthAt550,
        double angstromExponent,
        double scaleHeightM,
        double singleScatteringAlbedo,
        double asymmetry) {

    public Aerosol {
        require(opticalDepthAt550, 0, 5, "Aerosol optical depth");
        require(angstromExponent, 0, 3, "Angstrom exponent");
        require(scaleHeightM, 100, 10_000, "Aerosol scale height in metres");
        require(singleScatteringAlbedo, 0, 1, "Single-scattering albedo");
        require(asymmetry, -0.95, 0.95, "Asymmetry");
    }

    /** Haze of this depth, the rest as usual inland: α 1.3, 1.5 km, 0.95, 0.65 (from memory). */
    public static Aerosol ofDepth(double opticalDepthAt550) {
        return new Aerosol(opticalDepthAt550, 1.3, 1500, 0.95, 0.65);
    }

    private static void require(double value, double low, double high, String what) {
        if (!(value >= low && value <= high)) {
            throw new IllegalArgumentException(what + " must be " + low + " to " + high + ", not " + value);
        }
    }

    /** Optical depth overhead at a wavelength. */
    public double opticalDepth(double wavelengthNm) {
        return opticalDepthAt550 * StrictMath.pow(wavelengthNm / 550, -angstromExponent);
    }

    /**
     * Phase function, 1/sr: {@code (1 − g²) / (4π (1 + g² − 2 g cos θ)^1.5)}.
     *
     * @see "Henyey, L. G. and Greenstein, J. L. (1941), Diffuse radiation in the Galaxy, ApJ 93, 70"
     */
    public double phase(double cosine) {
        double g = asymmetry;
        double base = 1 + g * g - 2 * g * cosine;
        return (1 - g * g) / (4 * Math.PI * base * Math.sqrt(base));
    }
}
