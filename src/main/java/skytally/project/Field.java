package skytally.project;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * What can be said about one kind of thing, and what may be typed there.
 *
 * @param subject  whose field it is
 * @param name     in files and addresses
 * @param group    the heading it stands under on its page, or empty
 * @param label    in words
 * @param kind     what may be typed
 * @param units    that may be chosen, the first the one results are reckoned in; none for words and plain numbers
 * @param least    in the first unit, or nothing
 * @param most     in the first unit, or nothing
 * @param choices  the words to choose from
 * @param standIn  what stands in while it is not known, or nothing
 */
public record Field(
        Subject subject,
        String name,
        String group,
        String label,
        Kind kind,
        List<String> units,
        @Nullable BigDecimal least,
        @Nullable BigDecimal most,
        List<String> choices,
        Optional<StandIn> standIn) {

    /** Whose field it is. */
    public enum Subject {
        SITE,
        TYPE,
        LIGHT,
        PLACE
    }

    /** What may be typed. */
    public enum Kind {
        /** Words on one line. */
        TEXT,
        /** Words on several. */
        NOTE,
        WHOLE,
        NUMBER,
        CHOICE,
        /** A zone of time: by its name, or an offset. */
        ZONE,
        /** A time of day. */
        CLOCK,
        /** {@link Outline}: a corner a line. */
        CORNERS,
        /** {@link skytally.project.hours.Hours}: a row a line. */
        SCHEDULE;

        public boolean isNumber() {
            return this == WHOLE || this == NUMBER;
        }

        /** Whether what is typed has a unit beside it, if its field has units. */
        public boolean hasUnit() {
            return isNumber() || this == CORNERS;
        }

        /** Whether what is typed stands on several lines. */
        public boolean isLines() {
            return this == NOTE || this == CORNERS || this == SCHEDULE;
        }
    }

    /**
     * A value for the time being, in the field's first unit.
     *
     * @param likely used
     * @param low    one end of its range
     * @param high   the other end
     * @param why    the reason, as printed
     */
    public record StandIn(String likely, String low, String high, String why) {}

    public Field {
        units = List.copyOf(units);
        choices = List.copyOf(choices);
    }

    /** The unit results are reckoned in, or empty. */
    public String firstUnit() {
        return units.isEmpty() ? "" : units.get(0);
    }
}
