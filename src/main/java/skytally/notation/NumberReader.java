package skytally.notation;

import java.math.BigDecimal;
import java.util.regex.Pattern;

/**
 * Reads a number as people type it, where it has one reading: {@code 5200}, {@code 5 200}, {@code 6.5}, {@code 6,5},
 * {@code 1,234,567}, {@code 1.234,5}, {@code 2e3}. What has two readings or none is not guessed.
 */
public final class NumberReader {

    /** More characters than any number needs; what is longer is not looked at. */
    public static final int LONGEST = 40;

    /** What came of reading. */
    public sealed interface Reading {}

    /** A number, exactly as typed. */
    public record Number(BigDecimal value) implements Reading {}

    /** No number, and why, as the end of a sentence that begins with what was typed. */
    public record Unreadable(String why) implements Reading {}

    private static final Pattern PLAIN = Pattern.compile("[+-]?(\\d+(\\.\\d*)?|\\.\\d+)([eE][+-]?\\d{1,4})?");
    private static final Pattern SPACED = Pattern.compile("[+-]?\\d{1,3}( \\d{3})+([.,]\\d+)?");
    private static final Pattern COMMAS_THEN_POINT = Pattern.compile("[+-]?\\d{1,3}(,\\d{3})+\\.\\d+");
    private static final Pattern MANY_COMMAS = Pattern.compile("[+-]?\\d{1,3}(,\\d{3}){2,}");
    private static final Pattern POINTS_THEN_COMMA = Pattern.compile("[+-]?\\d{1,3}(\\.\\d{3})+,\\d+");
    private static final Pattern MANY_POINTS = Pattern.compile("[+-]?\\d{1,3}(\\.\\d{3}){2,}");
    private static final Pattern ONE_COMMA = Pattern.compile("[+-]?\\d*,\\d+");
    private static final Pattern COMMA_OR_THOUSANDS = Pattern.compile("[+-]?[1-9]\\d{0,2},\\d{3}");

    private NumberReader() {}

    /**
     * @param typed     what stands in the field
     * @param wholeOnly whether only whole numbers make sense there, so that {@code 1,200} has one reading
     */
    public static Reading read(String typed, boolean wholeOnly) {
        if (typed.length() > LONGEST) {
            return new Unreadable("is longer than " + LONGEST + " characters");
        }
        String text = typed.replaceAll("[\\u00a0\\u2009\\u202f]", " ").strip().replace('−', '-');
        if (PLAIN.matcher(text).matches()) {
            return new Number(new BigDecimal(text));
        }
        if (SPACED.matcher(text).matches()) {
            return new Number(new BigDecimal(text.replace(" ", "").replace(',', '.')));
        }
        if (COMMAS_THEN_POINT.matcher(text).matches()
                || MANY_COMMAS.matcher(text).matches()) {
            return new Number(new BigDecimal(text.replace(",", "")));
        }
        if (POINTS_THEN_COMMA.matcher(text).matches()
                || MANY_POINTS.matcher(text).matches()) {
            return new Number(new BigDecimal(text.replace(".", "").replace(',', '.')));
        }
        if (COMMA_OR_THOUSANDS.matcher(text).matches()) {
            return wholeOnly
                    ? new Number(new BigDecimal(text.replace(",", "")))
                    : new Unreadable("can be read in two ways: write " + text.replace(",", "") + " or "
                            + text.replace(',', '.'));
        }
        if (ONE_COMMA.matcher(text).matches()) {
            return new Number(new BigDecimal(text.replace(',', '.')));
        }
        return new Unreadable("is not a number");
    }
}
