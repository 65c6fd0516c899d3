package skytally.project;

import java.math.BigDecimal;
import java.time.DateTimeException;
import java.time.LocalTime;
import java.time.ZoneId;
import java.util.Optional;
import skytally.notation.NumberReader;
import skytally.project.hours.Hours;

/**
 * Why a value cannot stand in its field.
 *
 * @param reason which of the field's conditions it breaks
 * @param why    more about it where there is more, or empty
 */
public record Misfit(Reason reason, String why) {

    /** The conditions of fields. */
    public enum Reason {
        LONG,
        UNIT,
        NUMBER,
        BOUNDS,
        WHOLE,
        CHOICE,
        ZONE,
        CLOCK,
        LINES
    }

    /** Nothing if it can. */
    public static Optional<Misfit> of(Field field, String value, String unit) {
        if (value.length() > Bounds.TEXT) {
            return misfit(Reason.LONG, "");
        }
        if (field.kind().hasUnit() && !field.units().isEmpty() && !field.units().contains(unit)) {
            return misfit(Reason.UNIT, "");
        }
        return switch (field.kind()) {
            case TEXT, NOTE -> Optional.empty();
            case CHOICE -> field.choices().contains(value) ? Optional.empty() : misfit(Reason.CHOICE, "");
            case WHOLE, NUMBER -> number(field, value, unit);
            case ZONE -> parsed(Reason.ZONE, () -> ZoneId.of(value));
            case CLOCK -> parsed(Reason.CLOCK, () -> LocalTime.parse(value));
            case CORNERS -> lines(() -> Outline.read(value, unit));
            case SCHEDULE -> lines(() -> Hours.read(value));
        };
    }

    private static Optional<Misfit> number(Field field, String value, String unit) {
        NumberReader.Reading reading = NumberReader.read(value, field.kind() == Field.Kind.WHOLE);
        if (reading instanceof NumberReader.Unreadable unreadable) {
            return misfit(Reason.NUMBER, unreadable.why());
        }
        BigDecimal number = ((NumberReader.Number) reading).value();
        BigDecimal inFirst = Units.inFirst(number, unit);
        BigDecimal least = field.least();
        BigDecimal most = field.most();
        if ((least != null && inFirst.compareTo(least) < 0) || (most != null && inFirst.compareTo(most) > 0)) {
            return misfit(Reason.BOUNDS, "");
        }
        return field.kind() == Field.Kind.WHOLE && number.stripTrailingZeros().scale() > 0
                ? misfit(Reason.WHOLE, "")
                : Optional.empty();
    }

    private static Optional<Misfit> parsed(Reason reason, Runnable reader) {
        try {
            reader.run();
            return Optional.empty();
        } catch (DateTimeException unknown) {
            return misfit(reason, "");
        }
    }

    private static Optional<Misfit> lines(Runnable reader) {
        try {
            reader.run();
            return Optional.empty();
        } catch (IllegalArgumentException refused) {
            return misfit(Reason.LINES, String.valueOf(refused.getMessage()));
        }
    }

    private static Optional<Misfit> misfit(Reason reason, String why) {
        return Optional.of(new Misfit(reason, why));
    }
}
