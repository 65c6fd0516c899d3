package skytally.citation;

/** How well a source stands behind what is taken from it. */
public enum Standing {
    /** True by definition of the unit or the scale. */
    DEFINITION("by definition"),
    /** Read in the source itself or in a public excerpt of it. */
    SEEN("seen in the source"),
    /** Computed for this project, independently of its code. */
    COMPUTED("computed for this project"),
    /** Remembered; nobody here has seen it in the source. */
    FROM_MEMORY("from memory, not seen in the source"),
    /** A habit of the trade that no document is named for. */
    COMMON_PRACTICE("common practice, no source"),
    /** A choice of this project. */
    OWN_CHOICE("a choice of this project");

    private final String words;

    Standing(String words) {
        this.words = words;
    }

    /** The standing in words, as printed beside the source. */
    public String words() {
        return words;
    }
}
