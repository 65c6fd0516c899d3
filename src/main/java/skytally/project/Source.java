package skytally.project;

/**
 * Where a claim comes from.
 *
 * @param document mark of a document of the project, or empty
 * @param place    within the document, such as "sheet 3, row A1", or empty
 * @param reason   why, in words, where there is no document or more is to be said; or empty
 */
public record Source(String document, String place, String reason) {

    public static final Source NONE = new Source("", "", "");

    public static Source document(String mark, String place) {
        return new Source(mark, place, "");
    }

    public static Source reason(String reason) {
        return new Source("", "", reason);
    }

    /** Whether it says anything. */
    public boolean isNone() {
        return equals(NONE);
    }
}
