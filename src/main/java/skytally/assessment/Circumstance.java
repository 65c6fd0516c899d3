package skytally.assessment;

/**
 * When and in what weather a figure holds.
 *
 * @param moment of the lighting hours
 * @param cloud  over the site
 */
public record Circumstance(Moment moment, Cloud cloud) {

    /** Early evening, everything lit, no cloud. */
    public static final Circumstance EARLY_CLEAR = new Circumstance(Moment.EARLY, Cloud.NONE);

    /** Before the curfew or after it. */
    public enum Moment {
        EARLY("early"),
        LATE("late");

        private final String word;

        Moment(String word) {
            this.word = word;
        }
    }

    /** What covers the sky. */
    public enum Cloud {
        NONE("clear");

        private final String word;

        Cloud(String word) {
            this.word = word;
        }
    }

    /** The end of a figure's key, such as {@code early/clear}. */
    public String path() {
        return moment.word + "/" + cloud.word;
    }
}
