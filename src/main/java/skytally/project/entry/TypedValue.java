package skytally.project.entry;

import java.math.BigDecimal;
import java.time.DateTimeException;
import java.time.LocalTime;
import java.time.ZoneId;
import java.util.Optional;
import skytally.notation.NumberReader;
import skytally.project.Bounds;
import skytally.project.Field;
import skytally.project.Units;

/** Whether what was typed can stand in a field, and if not, what to type instead. */
final class TypedValue {

    private TypedValue() {}

    /** Nothing if it can. */
    static Optional<String> fault(Words words, Field field, String value, String unit) {
        return switch (field.kind()) {
            case TEXT -> text(words, field, value);
            case CHOICE ->
                field.choices().contains(value)
                        ? Optional.empty()
                        : Optional.of(words.say("entry.fault.choice", field.label(), shortened(value)));
            case WHOLE, NUMBER -> number(words, field, value, unit);
        };
    }

    /** The number, of what {@link #fault} found nothing wrong with. */
    static BigDecimal read(String value) {
        if (NumberReader.read(value, false) instanceof NumberReader.Number number) {
            return number.value();
        }
        throw new IllegalArgumentException("Not a number: " + value);
    }

    private static Optional<String> text(Words words, Field field, String value) {
        if (value.length() > Bounds.TEXT) {
            return Optional.of(words.say("entry.fault.long", field.label(), String.valueOf(Bounds.TEXT)));
        }
        try {
            if (field.name().equals("timeZone")) {
                ZoneId.of(value);
            } else if (field.name().equals("curfew")) {
                LocalTime.parse(value);
            }
            return Optional.empty();
        } catch (DateTimeException unknown) {
            return Optional.of(words.say("entry.fault." + field.name(), shortened(value)));
        }
    }

    private static Optional<String> number(Words words, Field field, String value, String unit) {
        if (!field.units().isEmpty() && !field.units().contains(unit)) {
            return Optional.of(words.say("entry.fault.unit", field.label(), String.join(", ", field.units())));
        }
        NumberReader.Reading reading = NumberReader.read(value, field.kind() == Field.Kind.WHOLE);
        if (reading instanceof NumberReader.Unreadable unreadable) {
            return Optional.of(words.say("entry.fault.number", field.label(), shortened(value), unreadable.why()));
        }
        BigDecimal number = ((NumberReader.Number) reading).value();
        BigDecimal inFirst = Units.inFirst(number, unit);
        BigDecimal least = field.least();
        BigDecimal most = field.most();
        if ((least != null && inFirst.compareTo(least) < 0) || (most != null && inFirst.compareTo(most) > 0)) {
            return Optional.of(words.say(
                    "entry.fault.bounds",
                    field.label(),
                    least == null ? words.say("entry.range.open") : least.toPlainString(),
                    most == null ? words.say("entry.range.open") : most.toPlainString(),
                    field.firstUnit(),
                    shortened(value) + (unit.isEmpty() ? "" : " " + unit)));
        }
        if (field.kind() == Field.Kind.WHOLE && number.stripTrailingZeros().scale() > 0) {
            return Optional.of(words.say("entry.fault.whole", field.label(), shortened(value)));
        }
        return Optional.empty();
    }

    static String shortened(String typed) {
        return typed.length() > 40 ? typed.substring(0, 40) + "…" : typed;
    }
}
