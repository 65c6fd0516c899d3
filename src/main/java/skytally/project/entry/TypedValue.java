package skytally.project.entry;

import java.math.BigDecimal;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import skytally.notation.NumberReader;
import skytally.project.Bounds;
import skytally.project.Field;
import skytally.project.Misfit;

/** Whether what was typed can stand in a field, and if not, what to type instead. */
final class TypedValue {

    private TypedValue() {}

    /** Nothing if it can. */
    static Optional<String> fault(Words words, Field field, String value, String unit) {
        return Misfit.of(field, value, unit).map(misfit -> said(words, field, value, unit, misfit));
    }

    private static String said(Words words, Field field, String value, String unit, Misfit misfit) {
        String shown = shortened(value);
        return switch (misfit.reason()) {
            case LONG -> words.say("entry.fault.long", field.label(), String.valueOf(Bounds.TEXT));
            case UNIT -> words.say("entry.fault.unit", field.label(), String.join(", ", field.units()));
            case NUMBER -> words.say("entry.fault.number", field.label(), shown, misfit.why());
            case BOUNDS ->
                words.say(
                        "entry.fault.bounds",
                        field.label(),
                        bound(words, field.least()),
                        bound(words, field.most()),
                        field.firstUnit(),
                        shown + (unit.isEmpty() ? "" : " " + unit));
            case WHOLE -> words.say("entry.fault.whole", field.label(), shown);
            case CHOICE -> words.say("entry.fault.choice", field.label(), shown);
            case ZONE -> words.say("entry.fault.zone", field.label(), shown);
            case CLOCK -> words.say("entry.fault.clock", field.label(), shown);
            case LINES -> words.say("entry.fault.lines", field.label(), misfit.why());
        };
    }

    private static String bound(Words words, @Nullable BigDecimal bound) {
        return bound == null ? words.say("entry.range.open") : bound.toPlainString();
    }

    /** The number, of what {@link #fault} found nothing wrong with. */
    static BigDecimal read(String value) {
        if (NumberReader.read(value, false) instanceof NumberReader.Number number) {
            return number.value();
        }
        throw new IllegalArgumentException("Not a number: " + value);
    }

    static String shortened(String typed) {
        return typed.length() > 40 ? typed.substring(0, 40) + "…" : typed;
    }
}
