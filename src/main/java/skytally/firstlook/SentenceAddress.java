package skytally.firstlook;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.springframework.util.MultiValueMap;
import org.springframework.web.util.UriComponentsBuilder;
import skytally.notation.NumberReader;

/**
 * Turns what the form sends into the plain address of the sentence: blanks that may be left open and were are left
 * out, feet become metres, and what cannot be read is carried along as typed, to be shown again with what is wrong.
 */
final class SentenceAddress {

    /** Marks a request that comes from the form. */
    static final String FORM = "form";

    /** A button that hangs the lights another way: the tilt in degrees, or nothing for as described. */
    static final String TILT_TO = "tiltTo";

    /** Names of the blanks whose guesses stood in the form; one that still stands there is still a guess. */
    static final String GUESSED = "guessed";

    /** The blanks the form asks for outright; the others may be left empty and are guessed then. */
    private static final List<Blank> ASKED_FOR = List.of(
            Blank.COUNT, Blank.LUMENS, Blank.SPECTRAL_CLASS, Blank.SHAPE, Blank.MOUNTING_HEIGHT, Blank.DISTANCE);

    private static final List<String> SWITCHES = List.of("units", "theme");
    private static final BigDecimal METRES_PER_FOOT = new BigDecimal("0.3048");
    /** More digits than a length is typed with. */
    private static final MathContext TYPED_FEET = new MathContext(15);
    /** For a length that was given in metres. */
    private static final MathContext SHOWN_FEET = new MathContext(5);

    private SentenceAddress() {}

    static boolean isAskedFor(Blank blank) {
        return ASKED_FOR.contains(blank);
    }

    /** Name of a length's field on a page in feet. */
    static String feetField(Blank blank) {
        return blank.field().substring(0, blank.field().length() - 1) + "Ft";
    }

    /** A length in metres as the feet to show in its field: as they were typed, if they were. */
    static String feet(String metres) {
        BigDecimal length = new BigDecimal(metres);
        BigDecimal typed = length.divide(METRES_PER_FOOT, TYPED_FEET);
        return typed.multiply(METRES_PER_FOOT).compareTo(length) == 0
                ? plain(typed)
                : plain(length.divide(METRES_PER_FOOT, SHOWN_FEET));
    }

    /** The least feet that are no less than these metres. */
    static BigDecimal feetFrom(BigDecimal metres) {
        return metres.divide(METRES_PER_FOOT, new MathContext(4, RoundingMode.CEILING));
    }

    /** The most whole feet that are no more than these metres. */
    static BigDecimal feetTo(BigDecimal metres) {
        return metres.divide(METRES_PER_FOOT, 0, RoundingMode.FLOOR);
    }

    /** The same where it is read and not typed: three figures. */
    static String feetToRead(String metres) {
        return plain(new BigDecimal(metres).divide(METRES_PER_FOOT, new MathContext(3)));
    }

    static String plainAddress(MultiValueMap<String, String> sent) {
        UriComponentsBuilder address = UriComponentsBuilder.fromPath("/");
        Map<String, Object> values = new HashMap<>();
        for (Blank blank : Blank.values()) {
            String text = text(blank, sent);
            boolean left = text != null && text.isBlank() && !isAskedFor(blank);
            if (text != null && !left && !isStillAGuess(blank, text, sent)) {
                address.queryParam(blank.field(), "{" + blank.field() + "}");
                values.put(blank.field(), asWritten(blank, text));
            }
        }
        for (String name : SWITCHES) {
            String word = sent.getFirst(name);
            if (word != null) {
                address.queryParam(name, "{" + name + "}");
                values.put(name, word);
            }
        }
        return address.encode().buildAndExpand(values).toUriString();
    }

    private static boolean isStillAGuess(Blank blank, String text, MultiValueMap<String, String> sent) {
        return sent.getOrDefault(GUESSED, List.of()).contains(blank.field())
                && asWritten(blank, text).equals(asWritten(blank, guessInForm(blank, sent)));
    }

    /** The guess as the form showed it, taken back to metres where it was shown in feet. */
    private static String guessInForm(Blank blank, MultiValueMap<String, String> sent) {
        String likely = Guesses.of(blank).likely();
        return blank.isLength() && sent.containsKey(feetField(blank)) ? metres(feet(likely)) : likely;
    }

    private static @Nullable String text(Blank blank, MultiValueMap<String, String> sent) {
        if (blank == Blank.TILT && sent.containsKey(TILT_TO)) {
            return sent.getFirst(TILT_TO);
        }
        if (blank.isLength() && sent.containsKey(feetField(blank))) {
            String feet = sent.getFirst(feetField(blank));
            return feet == null ? null : metres(feet);
        }
        return sent.getFirst(blank.field());
    }

    /** A number that may stand there, in plain notation, so that an address can be read; all else as it was typed. */
    private static String asWritten(Blank blank, String text) {
        if (blank.kind() == Blank.Kind.CHOICE) {
            return text;
        }
        return NumberReader.read(text, blank.kind() == Blank.Kind.WHOLE) instanceof NumberReader.Number number
                        && isOrdinary(number.value())
                        && number.value().compareTo(blank.least()) >= 0
                        && number.value().compareTo(blank.most()) <= 0
                ? plain(number.value())
                : text;
    }

    /** Feet as metres; what is no number stays as it was typed. */
    private static String metres(String feet) {
        NumberReader.Reading reading = NumberReader.read(feet, false);
        return reading instanceof NumberReader.Number number && isOrdinary(number.value())
                ? plain(number.value().multiply(METRES_PER_FOOT))
                : feet;
    }

    /** Short enough in plain notation to be carried in an address. */
    static boolean isOrdinary(BigDecimal value) {
        return Math.abs((long) value.scale()) < 40 && value.precision() < 40;
    }

    private static String plain(BigDecimal value) {
        BigDecimal shortest = value.stripTrailingZeros();
        return (shortest.scale() < 0 ? shortest.setScale(0) : shortest).toPlainString();
    }
}
