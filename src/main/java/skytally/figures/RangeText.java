package skytally.figures;

import java.util.Optional;
import java.util.function.DoubleFunction;
import skytally.assessment.Figure;
import skytally.assessment.Range;
import skytally.assessment.Unit;
import skytally.notation.QuantityFormat;
import skytally.notation.Written;
import skytally.web.Switches.Units;

/**
 * From the least to the most a figure may be, in one unit.
 *
 * @param low  written out
 * @param high written out
 * @param unit as printed after both
 */
public record RangeText(Written low, Written high, String unit) {

    /** In the figure's usual digits; nothing where there is no width to it. */
    static Optional<RangeText> of(Figure figure, Units units) {
        return figure.range().filter(Range::isOpen).map(range -> of(figure.unit(), range.low(), range.high(), units));
    }

    /** In digits of one's own; nothing where both ends are printed alike. */
    public static Optional<RangeText> of(Figure figure, DoubleFunction<Quantity> written) {
        return figure.range()
                .filter(Range::isOpen)
                .map(range -> {
                    Quantity low = written.apply(range.low());
                    Quantity high = written.apply(range.high());
                    return new RangeText(low.number(), high.number(), high.unit());
                })
                .filter(range -> !range.low().equals(range.high()));
    }

    /** The smaller end decides the step. */
    private static RangeText of(Unit unit, double low, double high, Units units) {
        Quantity from = NumberRow.written(unit, low, units);
        Quantity to = NumberRow.written(unit, high, units);
        if (from.unit().equals(to.unit())) {
            return new RangeText(from.number(), to.number(), to.unit());
        }
        double scale = to.unit().startsWith("m") ? 1e3 : 1;
        return new RangeText(QuantityFormat.significant(low * scale, 3), to.number(), to.unit());
    }
}
