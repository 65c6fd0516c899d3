package skytally.figures;

import skytally.notation.QuantityFormat;
import skytally.notation.Written;
import skytally.photometry.Illuminance;
import skytally.web.Switches.Units;

/**
 * A number with its unit, ready to be printed.
 *
 * @param number written out
 * @param unit   as printed after it
 */
public record Quantity(Written number, String unit) {

    private static final double METRES_PER_FOOT = 0.3048;
    private static final double METRES_PER_MILE = 1609.344;
    private static final double FAR_M = 10_000;

    /** Less light than any eye or meter tells from none. */
    private static final double LEAST_LX = 1e-12;

    private static final double LEAST_PERCENT = 0.01;

    public static Quantity lux(double lux, int figures) {
        if (lux > 0 && lux < LEAST_LX) {
            return new Quantity(new Written("under 1", -12), "lx");
        }
        return new Quantity(QuantityFormat.significant(lux, figures), "lx");
    }

    public static Quantity footcandles(double lux, int figures) {
        if (lux > 0 && lux < LEAST_LX) {
            return new Quantity(new Written("under 1", -13), "fc");
        }
        return new Quantity(QuantityFormat.significant(new Illuminance(lux).footcandles(), figures), "fc");
    }

    /** In the unit the reader asked for. */
    public static Quantity light(double lux, int figures, Units units) {
        return units == Units.US ? footcandles(lux, figures) : lux(lux, figures);
    }

    /** In the other unit. */
    public static Quantity lightOtherwise(double lux, int figures, Units units) {
        return units == Units.US ? lux(lux, figures) : footcandles(lux, figures);
    }

    public static Quantity length(double metres, int figures, Units units) {
        boolean feet = units == Units.US;
        if (metres >= FAR_M) {
            double far = feet ? metres / METRES_PER_MILE : metres / 1000;
            return new Quantity(QuantityFormat.atMost(far, figures), feet ? "miles" : "km");
        }
        double value = feet ? metres / METRES_PER_FOOT : metres;
        // whole metres are not rounded away: 1 234 m stays 1 234 m
        Written written =
                value >= 1000 ? QuantityFormat.decimals(value, 0) : QuantityFormat.atMost(value, Math.max(figures, 3));
        return new Quantity(written, feet ? "ft" : "m");
    }

    /** Luminance in the step that leaves the number readable: µcd/m², mcd/m² or cd/m². */
    public static Quantity luminance(double cdM2, int figures) {
        if (cdM2 == 0 || cdM2 >= 0.1) {
            return new Quantity(QuantityFormat.significant(cdM2, figures), "cd/m²");
        }
        return cdM2 >= 1e-4
                ? new Quantity(QuantityFormat.significant(cdM2 * 1e3, figures), "mcd/m²")
                : new Quantity(QuantityFormat.significant(cdM2 * 1e6, figures), "µcd/m²");
    }

    public static Quantity magnitude(double value, int decimals) {
        return new Quantity(QuantityFormat.decimals(value, decimals), "mag");
    }

    public static Quantity skyBrightness(double value, int decimals) {
        return new Quantity(QuantityFormat.decimals(value, decimals), "mag/arcsec²");
    }

    /** A percentage with its sign; below a hundredth of a percent the digits say nothing. */
    public static Quantity increase(double percent) {
        if (percent > 0 && percent < LEAST_PERCENT) {
            return new Quantity(new Written("under 0.01", 0), "%");
        }
        Written written = QuantityFormat.significant(percent, 2);
        return new Quantity(new Written((percent > 0 ? "+" : "") + written.digits(), written.power()), "%");
    }

    /** The unit with the no-break space that belongs before it; none before a degree sign. */
    public String spacedUnit() {
        return unit.isEmpty() || unit.startsWith("°") ? unit : "\u00a0" + unit;
    }

    /** All in one piece of text, number and unit kept on one line. */
    public String plain() {
        return number.plain() + spacedUnit();
    }

    @Override
    public String toString() {
        return plain();
    }
}
