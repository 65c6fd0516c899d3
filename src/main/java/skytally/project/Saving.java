package skytally.project;

import org.jspecify.annotations.Nullable;

/**
 * Who saves and why.
 *
 * @param who    a name typed once, or empty
 * @param why    in words, or empty
 * @param undoes the step this save takes back, if it does
 */
public record Saving(String who, String why, @Nullable Long undoes) {

    /** Characters of a name. */
    public static final int LONGEST_WHO = 200;

    private static final int LONGEST_WHY = 1000;

    public Saving {
        Bounds.require(who.length(), LONGEST_WHO, "characters of a name");
        Bounds.require(why.length(), LONGEST_WHY, "characters of a reason");
    }

    public static Saving by(String who, String why) {
        return new Saving(who, why, null);
    }
}
