package skytally.project;

/** How much one project may hold, each with a message that says so. */
public final class Bounds {

    public static final int LIGHTS = 20_000;
    public static final int TYPES = 500;
    public static final int PLACES = 200;
    public static final int SCHEMES = 6;
    public static final int DOCUMENTS = 500;
    /** Bytes of one file of a document. */
    public static final int FILE_BYTES = 5 * 1024 * 1024;
    /** Lines of one list typed as text. */
    public static final int LINES = 1000;
    /** Characters of text in one field. */
    public static final int TEXT = 65_536;

    private Bounds() {}

    /**
     * @throws IllegalArgumentException when there are more than may be
     */
    public static void require(int count, int most, String what) {
        if (count > most) {
            throw new IllegalArgumentException("At most " + most + " " + what + " fit, not " + count);
        }
    }
}
