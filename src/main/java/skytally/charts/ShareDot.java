package skytally.charts;

import skytally.notation.QuantityFormat;

/** A share as a dot whose area is the share, beside its number in a table: 15 units of radius are all of it. */
public final class ShareDot {

    private static final double RADIUS_OF_ALL = 15;
    private static final double SMALLEST_RADIUS = 0.9;

    private ShareDot() {}

    /** The number beside it: whole percents, tenths under ten. */
    public static String percent(double percent) {
        if (percent < 0.05) {
            return "<0.1";
        }
        return QuantityFormat.decimals(percent, percent < 9.95 ? 1 : 0).digits();
    }

    /**
     * The dot as one SVG element, hidden from those who hear the number.
     *
     * @param percent more than 0, at most 100
     */
    public static String svg(double percent) {
        double radius = RADIUS_OF_ALL * Math.sqrt(percent / 100);
        return new Svg()
                .open(
                        "svg",
                        "class",
                        "app-grid__dot",
                        "width",
                        32,
                        "height",
                        32,
                        "viewBox",
                        "-16 -16 32 32",
                        "aria-hidden",
                        "true")
                .add("circle", "r", Svg.fine(Math.max(SMALLEST_RADIUS, radius)))
                .close("svg")
                .toString();
    }
}
