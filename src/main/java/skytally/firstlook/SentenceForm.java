package skytally.firstlook;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.springframework.util.MultiValueMap;
import skytally.atmosphere.Clearness;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;
import skytally.notation.NumberReader;
import skytally.notation.QuantityFormat;
import skytally.spectrum.SpectralClasses;
import skytally.web.InvalidInputException;
import skytally.web.Switches;

/**
 * The sentence as a form: what was typed stands in it, right or wrong.
 *
 * @param fields by the blank's name in addresses
 * @param faults everything wrong, each with the id of its field
 * @param tilted whether the lights hang in another way than described
 * @param guessed  names of the blanks whose guesses stand in the form
 * @param tiltTo   the tilt of the button that hangs the lights another way
 * @param upright  whether the fitting stands upright by its nature
 * @param switches the switches that stand in the address and must stay in it
 */
record SentenceForm(
        Map<String, Field> fields,
        List<InvalidInputException.Fault> faults,
        boolean tilted,
        List<String> guessed,
        String tiltTo,
        boolean upright,
        List<Option> switches) {

    /**
     * One blank.
     *
     * @param id      of the field on the page
     * @param name    it is sent under
     * @param label   in words, with its unit
     * @param value   what stands in it
     * @param guess   what is guessed while it is empty, or nothing
     * @param fault   what is wrong with it, or nothing
     * @param options to choose from, none for a number
     */
    record Field(
            String id,
            String name,
            String label,
            String value,
            String guess,
            @Nullable String fault,
            List<Option> options) {}

    /** A choice, or a value that is only carried along. */
    record Option(String value, String words) {}

    static SentenceForm of(MultiValueMap<String, String> sent, SentenceReader.Result read, Switches.Units units) {
        Map<Blank, String> faults = new EnumMap<>(Blank.class);
        read.faults().forEach(fault -> faults.putIfAbsent(fault.blank(), fault.message()));
        Map<String, Field> fields = new LinkedHashMap<>();
        for (Blank blank : Blank.values()) {
            fields.put(blank.field(), field(blank, sent, read.sentence(), faults.get(blank), units));
        }
        List<Option> switches = new ArrayList<>();
        for (String name : List.of("units", "theme")) {
            String word = sent.getFirst(name);
            if (word != null) {
                switches.add(new Option(name, word));
            }
        }
        return new SentenceForm(
                fields,
                read.faults().stream()
                        .map(fault ->
                                new InvalidInputException.Fault(fault.blank().field(), fault.message()))
                        .toList(),
                sent.containsKey(Blank.TILT.field()),
                Arrays.stream(Blank.values())
                        .filter(blank -> SentenceAddress.isAskedFor(blank) && !sent.containsKey(blank.field()))
                        .map(Blank::field)
                        .toList(),
                carelessTilt(usualTiltDeg(sent)),
                usualTiltDeg(sent) > 0,
                switches);
    }

    private static Field field(
            Blank blank,
            MultiValueMap<String, String> sent,
            Optional<Sentence> sentence,
            @Nullable String fault,
            Switches.Units units) {
        boolean inFeet = blank.isLength() && units == Switches.Units.US;
        String typed = sent.getFirst(blank.field());
        String value =
                typed != null ? typed : isAskedFor(blank) ? Guesses.of(blank).likely() : "";
        String guess = sentence.map(read -> read.guess(blank).likely())
                .orElse(Guesses.of(blank).likely());
        if (blank.kind() != Blank.Kind.CHOICE) {
            value = shown(value, blank, inFeet, fault != null);
            guess = inFeet ? SentenceAddress.feetToRead(guess) : guess;
        }
        String unit = inFeet ? "feet" : unitInWords(blank);
        return new Field(
                blank.field(),
                inFeet ? SentenceAddress.feetField(blank) : blank.field(),
                unit.isEmpty() ? blank.label() : blank.label() + ", " + unit,
                value,
                guess,
                fault,
                options(blank, value, usualTiltDeg(sent)));
    }

    /** A number as it stands in its field: what cannot be used is left as it was typed. */
    private static String shown(String typed, Blank blank, boolean inFeet, boolean faulty) {
        NumberReader.Reading reading = NumberReader.read(typed, blank.kind() == Blank.Kind.WHOLE);
        if (!(reading instanceof NumberReader.Number number) || !SentenceAddress.isOrdinary(number.value())) {
            return typed;
        }
        if (inFeet) {
            return SentenceAddress.feet(number.value().toPlainString());
        }
        return faulty ? typed : QuantityFormat.asTyped(number.value()).digits();
    }

    private static boolean isAskedFor(Blank blank) {
        return SentenceAddress.isAskedFor(blank);
    }

    private static String unitInWords(Blank blank) {
        return switch (blank.unit()) {
            case "m" -> "metres";
            case "lm" -> "lumens leaving the luminaire";
            case "°" -> "degrees";
            default -> "";
        };
    }

    private static List<Option> options(Blank blank, String value, double usualTiltDeg) {
        List<Option> options = new ArrayList<>();
        switch (blank) {
            case SPECTRAL_CLASS ->
                SpectralClasses.all().stream()
                        .filter(each -> !each.isReference())
                        .forEach(each -> options.add(new Option(each.id(), each.label())));
            case SHAPE -> Shapes.all().forEach(each -> options.add(new Option(each.id(), each.words())));
            case AIR -> {
                options.add(new Option("", "as on most clear nights"));
                for (Clearness air : Clearness.values()) {
                    options.add(new Option(air.id(), air.words()));
                }
            }
            case TILT -> options.addAll(tiltOptions(value, usualTiltDeg));
            default -> {
                return List.of();
            }
        }
        boolean known = options.stream().anyMatch(option -> option.value().equals(value));
        if (!known) {
            options.add(0, new Option(value, "“" + value + "”"));
        }
        return options;
    }

    /** As described, tilted carelessly, and whatever else stands in the address. */
    private static List<Option> tiltOptions(String value, double usualTiltDeg) {
        String careless = carelessTilt(usualTiltDeg);
        List<Option> options = new ArrayList<>();
        options.add(new Option("", "everything as described"));
        options.add(new Option(
                careless, usualTiltDeg == 0 ? "tilted " + careless + "° toward me" : "tipped 15° further up"));
        if (!value.isEmpty() && !value.equals(careless)) {
            options.add(new Option(
                    value,
                    usualTiltDeg == 0
                            ? "tilted " + value + "° toward me"
                            : "turned " + value + "° up from straight down"));
        }
        return options;
    }

    private static String carelessTilt(double usualTiltDeg) {
        return Answers.plain(usualTiltDeg + Answers.CARELESS_TILT_DEG);
    }

    private static double usualTiltDeg(MultiValueMap<String, String> sent) {
        String shape = sent.getFirst(Blank.SHAPE.field());
        return Shapes.byId(shape == null ? Guesses.of(Blank.SHAPE).likely() : shape)
                .map(Shape::usualTiltDeg)
                .orElse(0.0);
    }
}
