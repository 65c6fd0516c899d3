package skytally.firstlook;

import java.math.BigDecimal;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import skytally.assessment.Influence;
import skytally.atmosphere.Clearness;
import skytally.firstlook.FirstLookPage.GuessRow;
import skytally.luminaire.Shapes;
import skytally.notation.QuantityFormat;
import skytally.photometry.Magnitude;
import skytally.spectrum.SpectralClasses;
import skytally.web.Switches.Units;

/** The guesses of an answer, each with what it moves. */
final class GuessRows {

    /** The figures people ask about, by measure and in words. */
    private enum Asked {
        LIGHT("direct/illuminance", "light at your eye"),
        VEIL("beside/glare/veil", "the veil"),
        SKY("zenith/sky/increase", "sky glow overhead");

        private final String measure;
        private final String words;

        Asked(String measure, String words) {
            this.measure = measure;
            this.words = words;
        }
    }

    private record Move(Asked asked, Influence influence) {}

    private final Answer answer;
    private final Units units;

    GuessRows(Answer answer, Units units) {
        this.answer = answer;
        this.units = units;
    }

    String head() {
        int count = answer.sentence().guesses().size();
        if (count == 0) {
            return "This used no guesses";
        }
        String used = count == 1 ? "This used 1 guess" : "This used " + count + " guesses";
        return answer.sentence().guesses().stream()
                .flatMap(guess -> move(guess).stream())
                .max(Comparator.comparingDouble(move -> move.influence().strength()))
                .map(most -> used + "; the one that matters most is: "
                        + Blank.byField(most.influence().guess())
                                .orElseThrow()
                                .label()
                                .toLowerCase(Locale.ROOT))
                .orElse(used);
    }

    List<GuessRow> rows() {
        return answer.sentence().guesses().stream().map(this::row).toList();
    }

    private GuessRow row(Guess guess) {
        Blank blank = guess.blank();
        boolean inFeet = blank.isLength() && units == Units.US;
        return new GuessRow(
                blank.label(),
                inFeet ? "feet" : blank.unit(),
                words(blank, guess.low()),
                words(blank, guess.likely()),
                words(blank, guess.high()),
                move(guess)
                        .map(GuessRows::inWords)
                        .orElse(guess.hasRange() ? "nothing here" : "no range: an example or a choice"),
                guess.why());
    }

    private String words(Blank blank, String value) {
        return words(blank, value, units);
    }

    static String words(Blank blank, String value, Units units) {
        return switch (blank) {
            case SPECTRAL_CLASS -> SpectralClasses.byId(value).orElseThrow().label();
            case SHAPE -> Shapes.byId(value).orElseThrow().words();
            case AIR -> Clearness.byId(value).orElseThrow().words();
            default ->
                blank.isLength() && units == Units.US
                        ? SentenceAddress.feetToRead(value)
                        : QuantityFormat.asTyped(new BigDecimal(value)).digits();
        };
    }

    /** What a guess moves most, among the figures people ask about. */
    private Optional<Move> move(Guess guess) {
        return answer.assessment().influences().stream()
                .filter(influence -> influence.guess().equals(guess.blank().field()) && influence.strength() > 0)
                .flatMap(influence -> asked(influence).map(asked -> new Move(asked, influence)).stream())
                .max(Comparator.comparingDouble(move -> move.influence().strength()));
    }

    private Optional<Asked> asked(Influence influence) {
        for (Asked asked : Asked.values()) {
            if (answer.figure(asked.measure).key().equals(influence.figure())) {
                return Optional.of(asked);
            }
        }
        return Optional.empty();
    }

    private static String inWords(Move move) {
        double strength = move.influence().strength();
        if (strength == Double.POSITIVE_INFINITY) {
            return move.asked().words + ", from none to some";
        }
        double ratio = Magnitude.ratioOfDifference(strength);
        String howMuch = ratio >= 2
                ? QuantityFormat.significant(ratio, 2).plain() + " times"
                : "by " + QuantityFormat.significant(100 * (ratio - 1), 2).plain() + "\u00a0%";
        return move.asked().words + ", " + howMuch;
    }
}
