package skytally.guide;

import java.math.BigDecimal;
import java.util.List;
import java.util.Locale;
import org.springframework.context.MessageSource;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;
import skytally.notation.QuantityFormat;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.spectrum.SpectralClass;
import skytally.spectrum.SpectralClasses;

/**
 * What stands in for a value of a project while it is not known.
 *
 * @param subject site, type, light or place
 * @param label   of the value
 * @param likely  reckoned with, and its unit
 * @param low     one end of its range
 * @param high    the other
 * @param why     the reason
 */
record StandInRow(String subject, String label, String likely, String low, String high, String why) {

    static List<StandInRow> all(MessageSource messages) {
        return Fields.all().stream()
                .filter(field -> field.standIn().isPresent())
                .map(field -> of(field, field.standIn().orElseThrow(), messages))
                .toList();
    }

    private static StandInRow of(Field field, Field.StandIn standIn, MessageSource messages) {
        return new StandInRow(
                field.subject().name().toLowerCase(Locale.ROOT),
                field.label(),
                written(field, standIn.likely(), messages),
                written(field, standIn.low(), messages),
                written(field, standIn.high(), messages),
                standIn.why());
    }

    private static String written(Field field, String value, MessageSource messages) {
        return switch (field.kind()) {
            case TEXT, NOTE, CLOCK, ZONE, CORNERS, SCHEDULE -> value;
            case CHOICE -> choice(field, value, messages);
            case NUMBER, WHOLE -> {
                String digits = QuantityFormat.asTyped(new BigDecimal(value)).digits();
                String unit = field.firstUnit();
                yield unit.isEmpty() ? digits : digits + (unit.equals("°") ? "" : "\u00a0") + unit;
            }
        };
    }

    private static String choice(Field field, String value, MessageSource messages) {
        return Shapes.byId(value)
                .map(Shape::words)
                .or(() -> SpectralClasses.byId(value).map(SpectralClass::label))
                .orElseGet(() -> messages.getMessage("choice." + field.name() + "." + value, null, Locale.ENGLISH));
    }
}
