package skytally.project.entry;

import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.Stated;

/**
 * What stands in the inputs of one value.
 *
 * @param value as typed
 * @param unit  chosen
 * @param low   as typed, or empty
 * @param high  as typed, or empty
 * @param own   mark of a document of its own, {@link #NO_DOCUMENT}, or empty for the one at the top
 * @param place in the document, or empty
 * @param why   a reason of its own, or empty
 * @param again whether it is to be stated anew although it is unchanged
 * @param used  index of the claim to use
 */
public record Asked(
        String value,
        String unit,
        String low,
        String high,
        String own,
        String place,
        String why,
        boolean again,
        String used) {

    /** In place of a document of its own: none, whatever stands at the top. No mark begins so. */
    public static final String NO_DOCUMENT = "-";

    /** As an untouched form has it. */
    static Asked standing(Field field, Stated stated) {
        Claim claim = stated.inUse();
        return new Asked(
                claim.value(),
                claim.unit().isEmpty() ? field.firstUnit() : claim.unit(),
                claim.low(),
                claim.high(),
                "",
                "",
                "",
                false,
                String.valueOf(stated.used()));
    }

    /** As it was sent; what did not come with the form stands as it was. */
    static Asked sent(Field field, Stated stated, Typed typed) {
        Asked standing = standing(field, stated);
        String name = field.name();
        return new Asked(
                typed.has(name) ? typed.text(name) : standing.value,
                typed.has(name + "-unit") ? typed.text(name + "-unit") : standing.unit,
                typed.has(name + "-low") ? typed.text(name + "-low") : standing.low,
                typed.has(name + "-high") ? typed.text(name + "-high") : standing.high,
                typed.text(name + "-own"),
                typed.text(name + "-place"),
                typed.text(name + "-why"),
                typed.has(name + "-again"),
                typed.has(name + "-used") ? typed.text(name + "-used") : standing.used);
    }

    /** Whether the value, its unit and its range are those in use. */
    boolean sameAs(Field field, Stated stated) {
        Asked standing = standing(field, stated);
        return same(value, standing.value)
                && (value.isEmpty() || unit.equals(standing.unit))
                && same(low, standing.low)
                && same(high, standing.high);
    }

    /** A browser changes the white space of what it shows, which is no change of the value. */
    private static boolean same(String one, String other) {
        return one.strip().replaceAll("\\s+", " ").equals(other.strip().replaceAll("\\s+", " "));
    }

    boolean hasMore(Stated stated) {
        return !own.isEmpty()
                || !place.isEmpty()
                || !why.isEmpty()
                || again
                || !used.equals(String.valueOf(stated.used()));
    }
}
