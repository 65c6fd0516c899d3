package skytally.project;

/**
 * A paper the project rests on.
 *
 * @param mark     unique in the project
 * @param title    as on it
 * @param date     on it, as typed, or empty
 * @param revision on it, or empty
 * @param from     whom it came from, or empty
 */
public record Document(String mark, String title, String date, String revision, String from) {

    public Document {
        Mark.require(mark);
    }
}
