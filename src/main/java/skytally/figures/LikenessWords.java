package skytally.figures;

import skytally.assessment.Likeness;
import skytally.notation.QuantityFormat;

/** A light beside a natural one, in the words that follow "about". */
public final class LikenessWords {

    private static final double AS_MUCH = 1.15;
    private static final double LEAST_PART = 0.1;

    private LikenessWords() {}

    /** Such as {@code 2.7 times Venus at its brightest}. */
    public static String of(Likeness like) {
        if (like.inMoons() && like.times() < LEAST_PART) {
            return "about 1 part in "
                    + QuantityFormat.significant(1 / like.times(), 2).plain() + " of " + like.natural();
        }
        return times(like.times(), like.natural(), like.inMoons());
    }

    /** How many times one natural light. */
    public static String times(double times, String natural, boolean exactly) {
        return !exactly && times < AS_MUCH
                ? "as much as " + natural
                : QuantityFormat.significant(times, 2).plain() + " times " + natural;
    }
}
