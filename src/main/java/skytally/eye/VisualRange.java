package skytally.eye;

/** Two distances both called visibility: how far a black thing can be told from the sky, by two contrasts. */
public enum VisualRange {
    /** Of weather reports: contrast 5 %. What is meant when nothing else is said. */
    WEATHER_REPORT(0.05),
    /** Koschmieder's meteorological range: contrast 2 %. */
    KOSCHMIEDER(0.02);

    private final double opticalDepth;

    VisualRange(double contrast) {
        this.opticalDepth = -StrictMath.log(contrast);
    }

    /**
     * Extinction along a level path, per metre.
     *
     * @param rangeM more than 0
     */
    public double extinctionPerMetre(double rangeM) {
        if (!(rangeM > 0 && rangeM < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("A visual range must be finite and more than 0 m, not " + rangeM);
        }
        return opticalDepth / rangeM;
    }

    /**
     * The range in metres.
     *
     * @param extinctionPerMetre more than 0
     */
    public double rangeM(double extinctionPerMetre) {
        if (!(extinctionPerMetre > 0 && extinctionPerMetre < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(
                    "Extinction must be finite and more than 0 per metre, not " + extinctionPerMetre);
        }
        return opticalDepth / extinctionPerMetre;
    }
}
