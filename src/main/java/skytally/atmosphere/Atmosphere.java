package skytally.atmosphere;

/**
 * The air over a site: molecules and haze, each thinning out exponentially with height.
 *
 * <p>The molecules are those of sea level less what lies below the site's ground; the haze starts at the site's
 * ground. Ozone has a part in the extinction of stars ({@link #extinctionMagPerAirMass()}) and none in the sky below
 * it.
 *
 * @param aerosol       the haze
 * @param groundHeightM of the site above sea level, −500 to 5000 m
 */
public record Atmosphere(Aerosol aerosol, double groundHeightM) {

    /** Mean radius of the Earth, in metres. */
    public static final double EARTH_RADIUS_M = 6_371_000;

    /** Top of the air that is reckoned with, in metres above the ground. */
    public static final double TOP_M = 80_000;

    /** Magnitudes per unit of optical depth: 2.5 log10 e. */
    public static final double MAGNITUDES_PER_OPTICAL_DEPTH = 2.5 * StrictMath.log10(Math.E);

    /** Optical depth of the ozone layer near 550 nm (from memory). */
    public static final double OZONE_OPTICAL_DEPTH = 0.027;

    public Atmosphere {
        if (!(groundHeightM >= -500 && groundHeightM <= 5000)) {
            throw new IllegalArgumentException(
                    "Ground height must be -500 to 5000 m above sea level, not " + groundHeightM);
        }
    }

    /** Air of this clearness over ground at sea level. */
    public static Atmosphere atSeaLevel(Clearness clearness) {
        return new Atmosphere(Aerosol.ofDepth(clearness.aerosolDepthAt550()), 0);
    }

    /** Optical depth of the molecules overhead, seen from the site's ground. */
    public double molecularOpticalDepth(double wavelengthNm) {
        return Molecules.opticalDepthAtSeaLevel(wavelengthNm)
                * StrictMath.exp(-groundHeightM / Molecules.SCALE_HEIGHT_M);
    }

    /**
     * k_V, the extinction of a star by one air mass, in magnitudes:
     * {@code 1.0857 (τ_molecules + τ_aerosol + τ_ozone)} at 550 nm.
     */
    public double extinctionMagPerAirMass() {
        return MAGNITUDES_PER_OPTICAL_DEPTH
                * (molecularOpticalDepth(550) + aerosol.opticalDepth(550) + OZONE_OPTICAL_DEPTH);
    }

    /** Extinction along level ground, per metre: what the near-ground range of view follows from. */
    public double extinctionPerMetre(double wavelengthNm) {
        return molecularOpticalDepth(wavelengthNm) / Molecules.SCALE_HEIGHT_M
                + aerosol.opticalDepth(wavelengthNm) / aerosol.scaleHeightM();
    }

    /** Share of the light of one wavelength that comes through a path, 0 to 1. */
    public double transmission(DirectPath path, double wavelengthNm) {
        double depth = molecularOpticalDepth(wavelengthNm) * path.airOnPath(Molecules.SCALE_HEIGHT_M)
                + aerosol.opticalDepth(wavelengthNm) * path.airOnPath(aerosol.scaleHeightM());
        return StrictMath.exp(-depth);
    }
}
