package skytally.scene;

/** How well a value is known. */
public enum State {
    /** In the file, or typed by the user. */
    GIVEN("given"),
    /** From given values, shown. */
    WORKED_OUT("worked out"),
    /** Our value, with why and a range. */
    ASSUMED("assumed"),
    /** Left open. */
    NOT_KNOWN("not known");

    private final String words;

    State(String words) {
        this.words = words;
    }

    public String words() {
        return words;
    }
}
