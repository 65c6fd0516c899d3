package skytally.firstlook;

import java.util.List;
import org.jspecify.annotations.Nullable;
import skytally.assessment.Assessment;
import skytally.assessment.Figure;
import skytally.figures.LadderPicture;
import skytally.figures.NumberRow;
import skytally.figures.Quantity;
import skytally.figures.RangeText;
import skytally.notation.QuantityFormat;
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

    /** A guess with what it moves. */
    record GuessRow(String name, String unit, String low, String likely, String high, String moves, String why) {}

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
                LadderMarks.picture(answer, units),
                numbers(answer, units));
    }

    private static String conditions(Sentence sentence) {
        return sentence.air().words() + " air, no cloud, ground "
                + QuantityFormat.asTyped(sentence.number(Blank.GROUND_REFLECTANCE))
                        .plain();
    }

    private static List<NumberRow> numbers(Answer answer, Units units) {
        return answer.assessment().figures().values().stream()
                .map(figure ->
                        NumberRow.of(figure, name(figure), units, figure.key().contains("/direct/illuminance/")))
                .toList();
    }

    private static String name(Figure figure) {
        if (figure.key().contains("/zenith/")) {
            return figure.name() + ", overhead";
        }
        return figure.key().contains("/toward-site/") ? figure.name() + ", toward the lights 30° up" : figure.name();
    }
}
