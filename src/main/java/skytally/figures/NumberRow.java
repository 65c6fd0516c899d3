package skytally.figures;

import org.jspecify.annotations.Nullable;
import skytally.assessment.Figure;
import skytally.assessment.Unit;
import skytally.assessment.Working;
import skytally.notation.QuantityFormat;
import skytally.notation.Written;
import skytally.web.Switches.Units;

/**
 * One figure of a list of numbers, and its working.
 *
 * @param id      of the working on the page
 * @param name    in words
 * @param value   written out, or nothing where there is none
 * @param range   from the least to the most, or nothing
 * @param working how it was worked out
 * @param open    whether the working is unfolded from the start
 */
public record NumberRow(
        String id,
        String name,
        @Nullable Quantity value,
        @Nullable RangeText range,
        Working working,
        boolean open) {

    /** A share of the flux no larger than this is nothing, by any file or shape. */
    private static final double WITHIN_THE_DATA_PERCENT = 0.05;

    private static final double LEAST_CD = 1e-6;

    /**
     * A figure as a row.
     *
     * @param name in words, with the direction it belongs to
     */
    public static NumberRow of(Figure figure, String name, Units units, boolean open) {
        return new NumberRow(
                door(figure),
                name,
                figure.range()
                        .map(range -> written(figure.unit(), range.likely(), units))
                        .orElse(null),
                RangeText.of(figure, units).orElse(null),
                figure.working(),
                open);
    }

    /** The id of a figure's working on its page: its key, with what an address cannot hold written as a number. */
    public static String door(Figure figure) {
        StringBuilder id = new StringBuilder("w-");
        figure.key().replace('/', '-').codePoints().forEach(point -> {
            if (isPlain(point)) {
                id.appendCodePoint(point);
            } else {
                id.append('_').append(Integer.toHexString(point));
            }
        });
        return id.toString();
    }

    private static boolean isPlain(int point) {
        return point < 0x80 && (Character.isLetterOrDigit(point) || point == '-' || point == '.');
    }

    /** A value of a unit in its usual digits. */
    public static Quantity written(Unit unit, double value, Units units) {
        return switch (unit) {
            case METRE -> Quantity.length(value, 4, units);
            case LUX -> Quantity.light(value, 3, units);
            case CANDELA_PER_SQUARE_METRE -> Quantity.luminance(value, 3);
            case MAGNITUDE -> Quantity.magnitude(value, 2);
            case MAGNITUDE_PER_SQUARE_ARCSECOND -> Quantity.skyBrightness(value, 2);
            case SHARE_PERCENT ->
                value <= WITHIN_THE_DATA_PERCENT
                        ? new Quantity(new Written("0 within the data", 0), "")
                        : new Quantity(QuantityFormat.significant(value, 3), unit.symbol());
            case CANDELA ->
                value > 0 && value < LEAST_CD
                        ? new Quantity(new Written("under 1", -6), unit.symbol())
                        : new Quantity(QuantityFormat.significant(value, 3), unit.symbol());
            case STARS -> new Quantity(QuantityFormat.significant(value, 2), unit.symbol());
            default -> new Quantity(QuantityFormat.significant(value, 3), unit.symbol());
        };
    }
}
