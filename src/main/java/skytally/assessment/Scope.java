package skytally.assessment;

import java.util.Optional;

/**
 * How much of a scene is to be worked out: with many thousand lights and hundreds of places not everything is asked for
 * at once.
 *
 * @param place  mark of the one place that gets every figure; all places get them where there is none
 * @param others what is worked out for the other places
 */
public record Scope(Optional<String> place, Others others) {

    /** Of a place that is not looked at itself. */
    public enum Others {
        /** Nothing. */
        NOTHING,
        /** What each type adds to the light there and to the glare. */
        DIRECT,
        /** That, and what each type adds to the sky overhead, within 1 %. */
        DIRECT_AND_OVERHEAD
    }

    public static final Scope ALL = new Scope(Optional.empty(), Others.DIRECT_AND_OVERHEAD);

    public static Scope of(String place, Others others) {
        return new Scope(Optional.of(place), others);
    }

    /** The worst point of the property line has few figures and gets them wherever it is wanted. */
    boolean isInFull(String mark) {
        return place.map(mark::equals).orElse(true) || mark.equals(Assessment.PROPERTY_LINE);
    }

    boolean isWanted(String mark) {
        return others != Others.NOTHING || place.map(mark::equals).orElse(true);
    }
}
