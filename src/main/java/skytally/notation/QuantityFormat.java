package skytally.notation;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * How numbers are written, the same on every machine: a decimal point, a no-break space between thousands, a true
 * minus, and a power of ten below one ten-thousandth or from ten million on.
 *
 * <p>A number is first rounded to twelve significant digits, so that the last bits of a double, which may differ
 * between machines, never decide a printed digit.
 */
public final class QuantityFormat {

    private static final MathContext TWELVE_DIGITS = new MathContext(12, RoundingMode.HALF_EVEN);
    private static final BigDecimal SMALLEST_WRITTEN_OUT = new BigDecimal("0.0001");
    private static final BigDecimal LARGEST_WRITTEN_OUT = new BigDecimal("10000000");
    private static final String NO_BREAK_SPACE = "\u00a0";

    private QuantityFormat() {}

    /**
     * Rounded to a number of significant figures, trailing noughts kept ({@code 0.20}).
     *
     * @param value   finite
     * @param figures 1 to 12
     */
    public static Written significant(double value, int figures) {
        if (figures < 1 || figures > 12) {
            throw new IllegalArgumentException("Significant figures must be 1 to 12, not " + figures);
        }
        BigDecimal rounded = exact(value).round(new MathContext(figures, RoundingMode.HALF_UP));
        if (rounded.signum() == 0) {
            return new Written("0", 0);
        }
        BigDecimal size = rounded.abs();
        if (size.compareTo(SMALLEST_WRITTEN_OUT) >= 0 && size.compareTo(LARGEST_WRITTEN_OUT) < 0) {
            return new Written(grouped(withFigures(rounded, figures)), 0);
        }
        int power = size.precision() - size.scale() - 1;
        return new Written(grouped(withFigures(rounded.movePointLeft(power), figures)), power);
    }

    /** Rounded to a number of significant figures at most, trailing noughts left out ({@code 0.2}), as inputs are. */
    public static Written atMost(double value, int figures) {
        Written full = significant(value, figures);
        String digits = full.digits();
        return digits.indexOf('.') < 0 ? full : new Written(digits.replaceAll("\\.?0+$", ""), full.power());
    }

    /**
     * Rounded to a number of decimals, as magnitudes and angles are written.
     *
     * @param value    finite
     * @param decimals 0 to 9
     */
    public static Written decimals(double value, int decimals) {
        if (decimals < 0 || decimals > 9) {
            throw new IllegalArgumentException("Decimals must be 0 to 9, not " + decimals);
        }
        return new Written(grouped(exact(value).setScale(decimals, RoundingMode.HALF_UP)), 0);
    }

    /** As typed: no rounding, no trailing noughts after the point. */
    public static Written asTyped(BigDecimal value) {
        BigDecimal shortest = value.stripTrailingZeros();
        return new Written(grouped(shortest.scale() < 0 ? shortest.setScale(0) : shortest), 0);
    }

    private static BigDecimal exact(double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("Only a finite number can be written, not " + value);
        }
        return new BigDecimal(value).round(TWELVE_DIGITS);
    }

    private static BigDecimal withFigures(BigDecimal value, int figures) {
        int scale = figures - (value.precision() - value.scale());
        return value.setScale(Math.max(0, scale), RoundingMode.HALF_UP);
    }

    private static String grouped(BigDecimal value) {
        String plain = value.abs().toPlainString();
        int point = plain.indexOf('.');
        String whole = point < 0 ? plain : plain.substring(0, point);
        StringBuilder text = new StringBuilder(whole);
        if (whole.length() > 3) {
            for (int at = whole.length() - 3; at > 0; at -= 3) {
                text.insert(at, NO_BREAK_SPACE);
            }
        }
        if (point >= 0) {
            text.append(plain.substring(point));
        }
        boolean isNothing = plain.chars().allMatch(c -> c == '0' || c == '.');
        return value.signum() < 0 && !isNothing ? "−" + text : text.toString();
    }
}
