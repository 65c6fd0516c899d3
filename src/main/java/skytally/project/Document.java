package skytally.project;

import org.jspecify.annotations.Nullable;

/**
 * A paper the project rests on.
 *
 * @param mark     unique in the project
 * @param title    as on it
 * @param date     on it, as typed, or empty
 * @param revision on it, or empty
 * @param from     whom it came from, or empty
 * @param file     what it came as, or nothing
 */
public record Document(
        String mark,
        String title,
        String date,
        String revision,
        String from,
        @Nullable Attachment file) {

    public Document {
        Mark.require(mark);
    }

    /** A paper that is not at hand as a file. */
    public Document(String mark, String title, String date, String revision, String from) {
        this(mark, title, date, revision, from, null);
    }

    /** The same paper with a file, or without one. */
    public Document with(@Nullable Attachment other) {
        return new Document(mark, title, date, revision, from, other);
    }
}
