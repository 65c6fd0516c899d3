package skytally.atmosphere;

/**
 * Scattering by the molecules of clean air (Rayleigh); it takes nothing away for good.
 *
 * <p>Optical depth of the whole atmosphere at sea level (1013.25 hPa, 45° latitude, 360 ppm CO2), λ in micrometres:
 * <pre>
 *   τ = 0.0021520 (1.0455996 − 341.29061 λ⁻² − 0.90230850 λ²) / (1 + 0.0027059889 λ⁻² − 85.968563 λ²)
 * </pre>
 * Depolarisation is left out of the phase function (about 1.5 %).
 *
 * @see "Bodhaine, B. A. et al. (1999), On Rayleigh optical depth calculations, J. Atmos. Oceanic Technol. 16, 1854;
 *     the approximation, coefficients from memory and checked against the full method"
 */
public final class Molecules {

    /** Height over which the molecules thin out by a factor e, in metres: the value the sky solutions use. */
    public static final double SCALE_HEIGHT_M = 8000;

    private static final double SHORTEST_NM = 300;
    private static final double LONGEST_NM = 1100;

    private Molecules() {}

    /**
     * Optical depth overhead at sea level.
     *
     * @param wavelengthNm 300 to 1100 nm
     */
    public static double opticalDepthAtSeaLevel(double wavelengthNm) {
        if (!(wavelengthNm >= SHORTEST_NM && wavelengthNm <= LONGEST_NM)) {
            throw new IllegalArgumentException("Wavelength must be 300 to 1100 nm, not " + wavelengthNm);
        }
        double square = wavelengthNm * wavelengthNm * 1e-6; // µm²
        return 0.0021520
                * (1.0455996 - 341.29061 / square - 0.90230850 * square)
                / (1 + 0.0027059889 / square - 85.968563 * square);
    }

    /** Phase function, 1/sr: {@code 3 / (16π) (1 + cos²θ)}, θ the angle light is turned by. */
    public static double phase(double cosine) {
        return 3 / (16 * Math.PI) * (1 + cosine * cosine);
    }
}
