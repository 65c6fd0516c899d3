package skytally.project.hours;

import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * When a row begins or ends.
 *
 * @param kind    dusk, dawn or a time of the clock
 * @param minutes after midnight, for a time of the clock
 */
record Moment(Kind kind, int minutes) {

    enum Kind {
        DUSK,
        DAWN,
        CLOCK
    }

    static final Moment DUSK = new Moment(Kind.DUSK, 0);
    static final Moment DAWN = new Moment(Kind.DAWN, 0);
    static final int DAY = 24 * 60;

    private static final int NOON = 12 * 60;
    private static final Pattern CLOCK = Pattern.compile("([01]?\\d|2[0-4]):([0-5]\\d)");

    static Moment clock(int minutes) {
        return new Moment(Kind.CLOCK, minutes);
    }

    /** Nothing if it is none. */
    static Optional<Moment> read(String word) {
        switch (word) {
            case "dusk":
                return Optional.of(DUSK);
            case "dawn":
                return Optional.of(DAWN);
            case "midnight":
                return Optional.of(clock(DAY));
            default:
                Matcher clock = CLOCK.matcher(word);
                if (!clock.matches()) {
                    return Optional.empty();
                }
                int minutes = Integer.parseInt(clock.group(1)) * 60 + Integer.parseInt(clock.group(2));
                return minutes > DAY ? Optional.empty() : Optional.of(clock(minutes));
        }
    }

    String written() {
        return switch (kind) {
            case DUSK -> "dusk";
            case DAWN -> "dawn";
            case CLOCK -> String.format(Locale.ROOT, "%02d:%02d", minutes / 60, minutes % 60);
        };
    }

    /** Minutes after noon, in the longest night. */
    int afterNoon() {
        return switch (kind) {
            case DUSK -> Hours.EARLIEST_DUSK - NOON;
            case DAWN -> Hours.LATEST_DAWN + NOON;
            case CLOCK -> (minutes + NOON) % DAY;
        };
    }
}
