package skytally.firstlook;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Optional;

/**
 * The blanks of the sentence: their names in addresses, and what may stand in them.
 *
 * <p>The names are a promise: addresses that were quoted must keep working.
 */
enum Blank {
    COUNT("count", "How many lights", Kind.WHOLE, "1", "20000", "", "24"),
    LUMENS("lumens", "Lumens of each light", Kind.NUMBER, "0", "10000000", "lm", "5200"),
    SPECTRAL_CLASS("spectralClass", "Kind of light source", Kind.CHOICE, "", "", "", "led3000"),
    SHAPE("shape", "Kind of fitting", Kind.CHOICE, "", "", "", "flat-area"),
    TILT("tiltDeg", "Tilt toward you", Kind.NUMBER, "0", "180", "°", "15"),
    MOUNTING_HEIGHT("mountingHeightM", "Height of the lights", Kind.NUMBER, "0", "500", "m", "6"),
    EYE_HEIGHT("eyeHeightM", "Height of your eye", Kind.NUMBER, "0", "3000", "m", "1.6"),
    DISTANCE("distanceM", "Distance to the lights", Kind.NUMBER, "1", "200000", "m", "800"),
    GLARE_ANGLE("glareAngleDeg", "Angle beside the lights at which you look", Kind.NUMBER, "0.1", "60", "°", "10"),
    AIR("air", "Clearness of the air", Kind.CHOICE, "", "", "", "clear"),
    GROUND_REFLECTANCE("groundReflectance", "Share of light the ground sends back", Kind.NUMBER, "0", "1", "", "0.12");

    /** What can be typed. */
    enum Kind {
        WHOLE,
        NUMBER,
        CHOICE
    }

    private final String field;
    private final String label;
    private final Kind kind;
    private final String least;
    private final String most;
    private final String unit;
    private final String example;

    Blank(String field, String label, Kind kind, String least, String most, String unit, String example) {
        this.field = field;
        this.label = label;
        this.kind = kind;
        this.least = least;
        this.most = most;
        this.unit = unit;
        this.example = example;
    }

    static Optional<Blank> byField(String field) {
        return Arrays.stream(values())
                .filter(blank -> blank.field.equals(field))
                .findFirst();
    }

    /** Name in addresses, and id of the field on the page. */
    String field() {
        return field;
    }

    String label() {
        return label;
    }

    Kind kind() {
        return kind;
    }

    BigDecimal least() {
        return new BigDecimal(least);
    }

    BigDecimal most() {
        return new BigDecimal(most);
    }

    String unit() {
        return unit;
    }

    String example() {
        return example;
    }

    /** Whether the value is a length in metres, which a page in feet shows and takes in feet. */
    boolean isLength() {
        return unit.equals("m");
    }
}
