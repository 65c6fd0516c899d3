package skytally.review;

import org.jspecify.annotations.Nullable;
import skytally.figures.Quantity;

/**
 * A sentence with at most one number in it that is a door.
 *
 * @param before the number
 * @param number written out, or nothing
 * @param door   where it leads
 * @param after  the number
 */
public record Said(String before, @Nullable Quantity number, String door, String after) {

    public static Said words(String words) {
        return new Said(words, null, "", "");
    }
}
