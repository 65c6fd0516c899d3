package skytally.project.shelf;

import java.time.Duration;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/**
 * A moment in the past, in words and as a date.
 *
 * @param words such as "3 hours ago"
 * @param date  such as 2026-12-01 12:41 UTC
 * @param iso   the same for machines
 */
public record Ago(String words, String date, String iso) {

    private static final DateTimeFormatter TO_THE_MINUTE =
            DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm 'UTC'", Locale.ROOT).withZone(ZoneOffset.UTC);

    static Ago of(Instant at, Instant now) {
        return new Ago(words(Duration.between(at, now)), TO_THE_MINUTE.format(at), at.toString());
    }

    private static String words(Duration since) {
        if (since.toMinutes() < 1) {
            return "just now";
        }
        if (since.toHours() < 1) {
            return many(since.toMinutes(), "minute");
        }
        if (since.toDays() < 1) {
            return many(since.toHours(), "hour");
        }
        return many(since.toDays(), "day");
    }

    private static String many(long count, String what) {
        return count + " " + what + (count == 1 ? " ago" : "s ago");
    }
}
