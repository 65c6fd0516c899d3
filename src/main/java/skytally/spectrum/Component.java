package skytally.spectrum;

/** One part of a modelled spectrum. Its power is a share of the whole radiant flux between 380 and 780 nm. */
sealed interface Component {

    /** Share of the radiant flux, more than 0, at most 1. */
    double power();

    /** All its power at one wavelength. */
    record Line(double wavelengthNm, double power) implements Component {

        public Line {
            requireVisible(wavelengthNm);
            requireShare(power);
        }
    }

    /** Power spread over wavelength; only the shape of {@link #at} counts, its scale does not. */
    sealed interface Continuum extends Component {

        double at(double wavelengthNm);
    }

    /**
     * Two halves of a Gaussian that meet at the peak:
     * {@code exp(−(λ − c)² / (2 s²))}, s = width / 2.354820, with its own full width at half maximum on each side.
     */
    record SkewedGaussian(double peakNm, double fwhmLeftNm, double fwhmRightNm, double power) implements Continuum {

        /** Full width at half maximum over standard deviation: 2 √(2 ln 2). */
        private static final double FWHM_PER_SIGMA = 2.354820;

        public SkewedGaussian {
            requireVisible(peakNm);
            requireShare(power);
            if (!(fwhmLeftNm > 0 && fwhmRightNm > 0 && fwhmLeftNm < 1000 && fwhmRightNm < 1000)) {
                throw new IllegalArgumentException(
                        "Widths must be more than 0 and less than 1000 nm, not " + fwhmLeftNm + " and " + fwhmRightNm);
            }
        }

        @Override
        public double at(double wavelengthNm) {
            double sigmaNm = (wavelengthNm < peakNm ? fwhmLeftNm : fwhmRightNm) / FWHM_PER_SIGMA;
            double away = (wavelengthNm - peakNm) / sigmaNm;
            return StrictMath.exp(-away * away / 2);
        }
    }

    /** Planck's law for a blackbody: {@code λ^−5 / (exp(c2 / (λ T)) − 1)}. */
    record Planck(double temperatureK, double power) implements Continuum {

        /** Second radiation constant (CODATA 2018), nm K. */
        static final double C2_NM_K = 1.438776877e7;

        public Planck {
            requireShare(power);
            if (!(temperatureK >= 500 && temperatureK <= 100_000)) {
                throw new IllegalArgumentException("Temperature must be 500 to 100 000 K, not " + temperatureK);
            }
        }

        @Override
        public double at(double wavelengthNm) {
            double micrometres = wavelengthNm / 1000;
            double fifth = micrometres * micrometres * micrometres * micrometres * micrometres;
            return 1 / (fifth * StrictMath.expm1(C2_NM_K / (wavelengthNm * temperatureK)));
        }
    }

    private static void requireVisible(double wavelengthNm) {
        if (!(wavelengthNm >= Spectrum.FROM_NM && wavelengthNm <= Spectrum.TO_NM)) {
            throw new IllegalArgumentException("Wavelength must be 380 to 780 nm, not " + wavelengthNm);
        }
    }

    private static void requireShare(double power) {
        if (!(power > 0 && power <= 1)) {
            throw new IllegalArgumentException("Power must be a share, more than 0 and at most 1, not " + power);
        }
    }
}
