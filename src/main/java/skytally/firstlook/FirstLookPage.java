package skytally.firstlook;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import skytally.assessment.Assessment;
import skytally.assessment.Figure;
import skytally.assessment.Unit;
import skytally.assessment.Working;
import skytally.notation.QuantityFormat;
import skytally.notation.Written;
import skytally.web.Switches.Units;

/**
 * The answer as the page shows it: every number written out, every sentence made.
 *
 * @param heading      over the answers
 * @param conditions   for the title block
 * @param lines        the answers
 * @param notes        what limits them
 * @param guessesHead  how many guesses, and which matters most
 * @param guesses      one row each
 * @param ladder       the picture and its table
 * @param numbers      every figure, each with its working
 */
record FirstLookPage(
        String heading,
        String conditions,
        List<KeyLine> lines,
        List<String> notes,
        String guessesHead,
        List<GuessRow> guesses,
        LadderPicture ladder,
        List<NumberRow> numbers) {

    /** A share of the flux no larger than this is nothing, by any file or shape. */
    private static final double WITHIN_THE_DATA_PERCENT = 0.05;

    private static final double LEAST_CD = 1e-6;

    /**
     * One answer.
     *
     * @param what   is answered
     * @param door   id of its working
     * @param figure the one number, or nothing where there is none
     * @param none   what stands in the number's place then
     * @param also   the same in other units
     * @param range  how far it may go, or nothing
     * @param says   what it means
     */
    record KeyLine(
            String what,
            String door,
            @Nullable Quantity figure,
            String none,
            List<Quantity> also,
            @Nullable RangeText range,
            List<String> says) {}

    /** From the least to the most. */
    record RangeText(Written low, Written high, String unit) {}

    /** A guess with what it moves. */
    record GuessRow(String name, String unit, String low, String likely, String high, String moves, String why) {}

    /**
     * One figure of the table of all numbers, and its working.
     *
     * @param id      of the working on the page
     * @param name    in words
     * @param value   written out, or why there is none
     * @param range   from the least to the most, or nothing
     * @param working how it was worked out
     */
    record NumberRow(
            String id,
            String name,
            @Nullable Quantity value,
            @Nullable RangeText range,
            Working working,
            boolean open) {}

    static FirstLookPage of(Answer answer, Units units) {
        Sentence sentence = answer.sentence();
        return new FirstLookPage(
                "What you would see, " + Quantity.length(sentence.distanceM(), 4, units) + " away",
                conditions(sentence),
                new KeyLines(answer, units).all(),
                answer.assessment().notes().stream()
                        .map(Assessment.Note::sentence)
                        .toList(),
                new GuessRows(answer, units).head(),
                new GuessRows(answer, units).rows(),
                LadderPicture.of(answer, units),
                numbers(answer, units));
    }

    private static String conditions(Sentence sentence) {
        return sentence.air().words() + " air, no cloud, ground "
                + QuantityFormat.asTyped(sentence.number(Blank.GROUND_REFLECTANCE))
                        .plain();
    }

    /** The id of a figure's working on the page. */
    static String door(Figure figure) {
        return "w-" + figure.key().replace('/', '-');
    }

    private static List<NumberRow> numbers(Answer answer, Units units) {
        List<NumberRow> rows = new ArrayList<>();
        for (Figure figure : answer.assessment().figures().values()) {
            boolean open = figure.key().contains("/direct/illuminance/");
            rows.add(new NumberRow(
                    door(figure),
                    name(figure),
                    figure.range()
                            .map(range -> written(figure.unit(), range.likely(), units))
                            .orElse(null),
                    figure.range()
                            .filter(range -> range.isOpen())
                            .map(range -> rangeText(figure.unit(), range.low(), range.high(), units))
                            .orElse(null),
                    figure.working(),
                    open));
        }
        return rows;
    }

    private static String name(Figure figure) {
        if (figure.key().contains("/zenith/")) {
            return figure.name() + ", overhead";
        }
        return figure.key().contains("/toward-site/") ? figure.name() + ", toward the lights 30° up" : figure.name();
    }

    /** A range in one unit: the smaller end decides the step. */
    private static RangeText rangeText(Unit unit, double low, double high, Units units) {
        Quantity from = written(unit, low, units);
        Quantity to = written(unit, high, units);
        if (from.unit().equals(to.unit())) {
            return new RangeText(from.number(), to.number(), to.unit());
        }
        double scale = to.unit().startsWith("m") ? 1e3 : 1;
        return new RangeText(QuantityFormat.significant(low * scale, 3), to.number(), to.unit());
    }

    private static Quantity written(Unit unit, double value, Units units) {
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
