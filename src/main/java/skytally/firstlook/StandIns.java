package skytally.firstlook;

import java.util.Arrays;
import java.util.List;
import skytally.web.Switches.Units;

/** What stands in for the blanks of the sentence, in words, for those who ask. */
public final class StandIns {

    /**
     * A blank.
     *
     * @param label  of the blank
     * @param likely reckoned with when it is left out, and its unit
     * @param low    one end of its range
     * @param high   the other; the same for an example or a choice
     * @param why    the reason
     */
    public record Row(String label, String likely, String low, String high, String why) {}

    private StandIns() {}

    /** One row a blank, in the order of the sentence. */
    public static List<Row> all() {
        return Arrays.stream(Blank.values()).map(StandIns::row).toList();
    }

    private static Row row(Blank blank) {
        Guess guess = Guesses.of(blank);
        return new Row(
                blank.label(),
                written(blank, guess.likely()),
                written(blank, guess.low()),
                written(blank, guess.high()),
                guess.why());
    }

    private static String written(Blank blank, String value) {
        String words = GuessRows.words(blank, value, Units.METRIC);
        String unit = blank.unit();
        return unit.isEmpty() ? words : words + (unit.equals("°") ? "" : "\u00a0") + unit;
    }
}
