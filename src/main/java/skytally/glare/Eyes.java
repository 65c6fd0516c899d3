package skytally.glare;

/** What the forms share about the observer. */
final class Eyes {

    /**
     * Youngest age computed. The forms rest on adults; at 20 their age term is already down to 1 % of the veil, so a
     * younger observer would not differ. A choice of this project, as is {@link #OLDEST_YEARS}.
     */
    static final double YOUNGEST_YEARS = 20;

    /** Oldest age computed: beyond it lenses clouded or replaced decide, and no fourth power of age does. */
    static final double OLDEST_YEARS = 80;

    private Eyes() {}

    static void requireAge(double ageYears) {
        if (!(ageYears >= YOUNGEST_YEARS && ageYears <= OLDEST_YEARS)) {
            throw new IllegalArgumentException("The observer's age is 20 to 80 years, not " + ageYears);
        }
    }

    /** 1 + (A / 62.5)⁴. */
    static double cieAgeFactor(double ageYears) {
        return 1 + fourthPower(ageYears / 62.5);
    }

    static double fourthPower(double x) {
        return x * x * x * x;
    }
}
