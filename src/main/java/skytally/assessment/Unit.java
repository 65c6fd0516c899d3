package skytally.assessment;

/** The unit a figure is held in. */
public enum Unit {
    METRE("m"),
    DEGREE("°"),
    CANDELA("cd"),
    LUX("lx"),
    CANDELA_PER_SQUARE_METRE("cd/m²"),
    MAGNITUDE("mag"),
    MAGNITUDE_PER_SQUARE_ARCSECOND("mag/arcsec²"),
    PERCENT("%"),
    SHARE_PERCENT("% of its light"),
    NATURAL_SKIES("natural skies"),
    ARCMINUTE("arcminutes"),
    STARS("stars");

    private final String symbol;

    Unit(String symbol) {
        this.symbol = symbol;
    }

    public String symbol() {
        return symbol;
    }

    /** Whether a range of it spans factors rather than steps, so that it is not a logarithm already. */
    public boolean isLinear() {
        return this != MAGNITUDE && this != MAGNITUDE_PER_SQUARE_ARCSECOND;
    }
}
