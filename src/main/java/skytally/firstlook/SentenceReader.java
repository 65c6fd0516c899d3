package skytally.firstlook;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import skytally.atmosphere.Clearness;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;
import skytally.notation.NumberReader;
import skytally.notation.QuantityFormat;
import skytally.spectrum.SpectralClass;
import skytally.spectrum.SpectralClasses;
import skytally.web.Switches.Units;

/** Reads the sentence from what was typed, and finds everything wrong with it at once. */
final class SentenceReader {

    private static final int QUOTED = 40;
    private static final int MOST_NOTES = 5;

    /** What may stand in an address beside the blanks. */
    private static final Map<String, List<String>> SWITCHES =
            Map.of("units", List.of("metric", "us"), "theme", List.of("day", "dark", "telescope"));

    /**
     * One thing wrong.
     *
     * @param blank   where
     * @param message what is there, what may be, and how to mend it
     */
    record Fault(Blank blank, String message) {}

    /**
     * What came of reading.
     *
     * @param sentence the sentence, when nothing is wrong
     * @param faults   everything wrong, in the order of the sentence
     */
    record Result(Optional<Sentence> sentence, List<Fault> faults) {}

    private final Map<Blank, String> texts = new EnumMap<>(Blank.class);
    private final Set<Blank> guessed = EnumSet.noneOf(Blank.class);
    private final List<Fault> faults = new ArrayList<>();
    private final Units units;

    private SentenceReader(Units units) {
        this.units = units;
    }

    /**
     * @param typed by field name, lengths in metres; a blank that is not among them is guessed
     */
    static Result read(Map<String, ? extends List<@Nullable String>> typed) {
        return read(typed, Units.METRIC);
    }

    /**
     * @param typed by field name, lengths in metres; a blank that is not among them is guessed
     * @param units that what is wrong is told in
     */
    static Result read(Map<String, ? extends List<@Nullable String>> typed, Units units) {
        SentenceReader reader = new SentenceReader(units);
        for (Blank blank : Blank.values()) {
            reader.read(blank, typed.get(blank.field()));
        }
        if (!reader.faults.isEmpty()) {
            return new Result(Optional.empty(), List.copyOf(reader.faults));
        }
        Sentence sentence = new Sentence(reader.texts, reader.guessed).withGuessesSettled();
        return new Result(Optional.of(sentence), List.of());
    }

    /** What stands in the address and means nothing here, in a sentence each, so that a slip of the pen is seen. */
    static List<String> passedOver(Map<String, ? extends List<@Nullable String>> typed) {
        List<String> notes = new ArrayList<>();
        for (Map.Entry<String, ? extends List<@Nullable String>> each : typed.entrySet()) {
            String name = each.getKey();
            String word = each.getValue().isEmpty() ? null : each.getValue().get(0);
            if (SWITCHES.containsKey(name)) {
                if (word != null && !SWITCHES.get(name).contains(word)) {
                    notes.add("“" + quoted(word) + "” is no choice of " + name + " and was passed over; there is "
                            + String.join(", ", SWITCHES.get(name)) + ".");
                }
            } else if (Blank.byField(name).isEmpty() && notes.size() < MOST_NOTES) {
                notes.add("“" + quoted(name) + "” is the name of no blank and was passed over.");
            }
        }
        return notes;
    }

    private void read(Blank blank, @Nullable List<@Nullable String> typed) {
        if (typed == null || typed.isEmpty()) {
            guessed.add(blank);
            texts.put(blank, Guesses.of(blank).likely());
            return;
        }
        if (typed.size() > 1) {
            fault(blank, "is there " + typed.size() + " times; leave one of them.");
            return;
        }
        String text = typed.get(0) == null ? "" : typed.get(0).strip();
        if (text.isEmpty()) {
            fault(blank, "is empty. Enter " + what(blank) + ".");
        } else if (blank.kind() == Blank.Kind.CHOICE) {
            readChoice(blank, text);
        } else {
            readNumber(blank, text);
        }
    }

    private void readChoice(Blank blank, String text) {
        List<String> choices = choices(blank);
        if (choices.contains(text)) {
            texts.put(blank, text);
        } else {
            fault(blank, "“" + quoted(text) + "” is not known. Choose one of: " + String.join(", ", choices) + ".");
        }
    }

    private void readNumber(Blank blank, String text) {
        NumberReader.Reading reading = NumberReader.read(text, blank.kind() == Blank.Kind.WHOLE);
        if (reading instanceof NumberReader.Unreadable unreadable) {
            fault(blank, "“" + quoted(text) + "” " + unreadable.why() + ". Enter " + what(blank) + ".");
        } else if (reading instanceof NumberReader.Number number) {
            checkNumber(blank, text, number.value());
        }
    }

    private void checkNumber(Blank blank, String text, BigDecimal value) {
        if (value.compareTo(blank.least()) < 0 || value.compareTo(blank.most()) > 0) {
            fault(blank, "“" + quoted(asTyped(blank, text, value)) + "” is out of bounds. Enter " + what(blank) + ".");
        } else if (blank.kind() == Blank.Kind.WHOLE
                && value.stripTrailingZeros().scale() > 0) {
            fault(blank, "“" + quoted(text) + "” is not a whole number. Enter " + what(blank) + ".");
        } else {
            texts.put(blank, plain(value));
        }
    }

    /** Feet on a page in feet, though the address has metres. */
    private String asTyped(Blank blank, String text, BigDecimal value) {
        return isInFeet(blank) && SentenceAddress.isOrdinary(value)
                ? SentenceAddress.feet(value.toPlainString())
                : text;
    }

    /** In bounds by now, so the plain notation is short; digits beyond the twentieth say nothing. */
    private static String plain(BigDecimal value) {
        BigDecimal shortest = value.setScale(Math.min(20, Math.max(0, value.scale())), RoundingMode.HALF_EVEN)
                .stripTrailingZeros();
        return (shortest.scale() < 0 ? shortest.setScale(0) : shortest).toPlainString();
    }

    private void fault(Blank blank, String rest) {
        String separator = rest.startsWith("“") ? ": " : " ";
        faults.add(new Fault(blank, blank.label() + separator + rest));
    }

    private String what(Blank blank) {
        String example = isInFeet(blank) ? SentenceAddress.feetToRead(blank.example()) : blank.example();
        return switch (blank.kind()) {
            case WHOLE -> "a whole number " + bounds(blank) + ", such as " + example;
            case NUMBER -> "a number " + bounds(blank) + ", such as " + example;
            case CHOICE -> "one of: " + String.join(", ", choices(blank));
        };
    }

    private boolean isInFeet(Blank blank) {
        return blank.isLength() && units == Units.US;
    }

    private String bounds(Blank blank) {
        if (isInFeet(blank)) {
            return "from " + QuantityFormat.asTyped(SentenceAddress.feetFrom(blank.least())) + " to "
                    + QuantityFormat.asTyped(SentenceAddress.feetTo(blank.most())) + "\u00a0ft";
        }
        String unit = blank.unit().isEmpty() || blank.unit().equals("°") ? blank.unit() : "\u00a0" + blank.unit();
        return "from " + QuantityFormat.asTyped(blank.least()) + " to " + QuantityFormat.asTyped(blank.most()) + unit;
    }

    private static String quoted(String text) {
        if (text.length() <= QUOTED) {
            return text;
        }
        boolean cutsACharacter = Character.isHighSurrogate(text.charAt(QUOTED - 1));
        return text.substring(0, cutsACharacter ? QUOTED - 1 : QUOTED) + "…";
    }

    /** The ids a blank may hold. */
    static List<String> choices(Blank blank) {
        return switch (blank) {
            case SPECTRAL_CLASS ->
                SpectralClasses.all().stream()
                        .filter(each -> !each.isReference())
                        .map(SpectralClass::id)
                        .toList();
            case SHAPE -> Shapes.all().stream().map(Shape::id).toList();
            case AIR -> Arrays.stream(Clearness.values()).map(Clearness::id).toList();
            default -> throw new IllegalArgumentException(blank + " is not a choice");
        };
    }
}
