package skytally.project;

import java.util.Arrays;
import java.util.Optional;

/**
 * The lighting class of a road, and the luminance a driver's eye is adapted to on it.
 *
 * @see "CIE 150:2017, threshold increment by road class: the adaptation luminances are from memory and agree with the
 *     veils of EN 12193 at 15 %"
 */
enum RoadClass {
    NONE("none", 0.1),
    M1("M1", 5),
    M2("M2", 5),
    M3("M3", 2),
    M4("M4", 2),
    M5("M5", 1),
    M6("M6", 1);

    private final String id;
    private final double adaptationCdM2;

    RoadClass(String id, double adaptationCdM2) {
        this.id = id;
        this.adaptationCdM2 = adaptationCdM2;
    }

    /** The class of that word in the catalogue of fields. */
    static Optional<RoadClass> byId(String id) {
        return Arrays.stream(values()).filter(one -> one.id.equals(id)).findFirst();
    }

    double adaptationCdM2() {
        return adaptationCdM2;
    }
}
