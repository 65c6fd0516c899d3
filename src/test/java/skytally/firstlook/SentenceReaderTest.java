package skytally.firstlook;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.firstlook.SentenceReader.Fault;
import skytally.web.Switches.Units;

@DisplayName("The reader of the sentence")
class SentenceReaderTest {

    private static final String NO_BREAK = "\u00a0";

    /** What no blank takes, whatever it asks for. */
    private static final List<String> NEVER_TAKEN = List.of(
            "",
            "   ",
            "-5",
            "−0.001",
            "1e308",
            "-1e308",
            "1e99999",
            "NaN",
            "Infinity",
            "-Infinity",
            "twenty",
            "6 m",
            "<script>alert(1)</script>",
            "\"><b>",
            "${7*7}",
            "%n",
            "0x10",
            "٣",
            "-6,5",
            "9".repeat(10_000),
            "x".repeat(10_000),
            "\u0000");

    @Test
    void guessesWhatIsLeftOut() {
        Sentence sentence = read(Map.of());

        // the defaults an address without parameters has always meant
        assertThat(sentence.count()).isEqualTo(1);
        assertThat(sentence.lumens()).isEqualTo(5200);
        assertThat(sentence.spectralClass().id()).isEqualTo("led3000");
        assertThat(sentence.shape().id()).isEqualTo("flat-area");
        assertThat(sentence.tiltDeg()).isZero();
        assertThat(sentence.mountingHeightM()).isEqualTo(6);
        assertThat(sentence.eyeHeightM()).isEqualTo(1.6);
        assertThat(sentence.distanceM()).isEqualTo(800);
        assertThat(sentence.glareAngleDeg()).isEqualTo(10);
        assertThat(sentence.air().id()).isEqualTo("clear");
        assertThat(sentence.groundReflectance()).isEqualTo(0.12);
        assertThat(sentence.guessed()).containsExactlyInAnyOrder(Blank.values());
        Guess ground = sentence.guess(Blank.GROUND_REFLECTANCE);
        assertThat(ground.low()).isEqualTo("0.08");
        assertThat(ground.high()).isEqualTo("0.18");
    }

    @Test
    void takesEveryBlankAsTypedAndGuessesNoneOfThem() {
        Map<String, List<String>> typed = new LinkedHashMap<>();
        typed.put("count", List.of("1,200"));
        typed.put("lumens", List.of("5 200,5"));
        typed.put("spectralClass", List.of("hps"));
        typed.put("shape", List.of("all-round"));
        typed.put("tiltDeg", List.of("7,5"));
        typed.put("mountingHeightM", List.of("8"));
        typed.put("eyeHeightM", List.of("0"));
        typed.put("distanceM", List.of("1"));
        typed.put("glareAngleDeg", List.of("0.1"));
        typed.put("air", List.of("hazy"));
        typed.put("groundReflectance", List.of("1"));

        Sentence sentence = read(typed);

        assertThat(sentence.texts())
                .containsEntry(Blank.COUNT, "1200")
                .containsEntry(Blank.LUMENS, "5200.5")
                .containsEntry(Blank.TILT, "7.5")
                .containsEntry(Blank.AIR, "hazy")
                .containsEntry(Blank.EYE_HEIGHT, "0");
        assertThat(sentence.guesses()).isEmpty();
    }

    @ParameterizedTest(name = "{0} = {1}")
    @CsvSource({
        "lumens, 0",
        "lumens, 0.0",
        "lumens, -0",
        "lumens, 10000000",
        "tiltDeg, 0",
        "tiltDeg, 180",
        "mountingHeightM, 0",
        "mountingHeightM, 500",
        "eyeHeightM, 0",
        "eyeHeightM, 3000",
        "groundReflectance, 0",
        "groundReflectance, 1",
        "distanceM, 1",
        "distanceM, 200000",
        "glareAngleDeg, 0.1",
        "glareAngleDeg, 60",
        "count, 1",
        "count, 20000",
        "count, 24.0",
        "count, 2e1",
        "lumens, 1e-9999"
    })
    void takesNothingWhereNothingMeansSomethingAndBothEndsOfEveryRange(String field, String typed) {
        assertThat(SentenceReader.read(Map.of(field, List.of(typed))).faults()).isEmpty();
    }

    static Stream<Arguments> everyBlankWithEverythingItCannotTake() {
        List<Arguments> cases = new ArrayList<>();
        for (Blank blank : Blank.values()) {
            NEVER_TAKEN.forEach(typed -> cases.add(Arguments.of(blank, List.of(typed))));
            cases.add(Arguments.of(
                    blank, List.of(Guesses.of(blank).likely(), Guesses.of(blank).likely())));
            cases.add(Arguments.of(blank, Arrays.asList((String) null)));
        }
        for (Blank blank : List.of(Blank.COUNT, Blank.DISTANCE, Blank.GLARE_ANGLE)) {
            cases.add(Arguments.of(blank, List.of("0")));
        }
        cases.add(Arguments.of(Blank.COUNT, List.of("6,5")));
        cases.add(Arguments.of(Blank.LUMENS, List.of("1,500")));
        cases.add(Arguments.of(Blank.SPECTRAL_CLASS, List.of("LED3000")));
        cases.add(Arguments.of(Blank.SPECTRAL_CLASS, List.of("ref_sun5772")));
        cases.add(Arguments.of(Blank.SHAPE, List.of("flat_area")));
        return cases.stream();
    }

    @ParameterizedTest(name = "{0}: {1}")
    @MethodSource("everyBlankWithEverythingItCannotTake")
    void findsOneFaultAndSaysWhereAndWhatWouldBeRight(Blank blank, List<String> typed) {
        SentenceReader.Result read = SentenceReader.read(Map.of(blank.field(), typed));

        assertThat(read.sentence()).isEmpty();
        assertThat(read.faults()).singleElement().satisfies(fault -> {
            assertThat(fault.blank()).isEqualTo(blank);
            assertThat(fault.message())
                    .startsWith(blank.label())
                    .endsWith(".")
                    .containsPattern("must be .|Enter .|Choose one of: .|leave one of them")
                    .hasSizeLessThan(450);
        });
    }

    @ParameterizedTest(name = "{0} = {1}: {2}")
    @CsvSource(delimiter = '|', textBlock = """
            count             | ''     | How many lights is empty. Enter a whole number from 1 to 20~000, such as 24.
            count             | -5     | How many lights: “-5” is out of bounds. Enter a whole number from 1 to 20~000, such as 24.
            count             | 2.5    | How many lights: “2.5” is not a whole number. Enter a whole number from 1 to 20~000, such as 24.
            count             | 0      | How many lights: “0” is out of bounds. Enter a whole number from 1 to 20~000, such as 24.
            lumens            | 1e308  | Lumens of each light: “1e308” is out of bounds. Enter a number from 0 to 10~000~000~lm, such as 5200.
            lumens            | NaN    | Lumens of each light: “NaN” is not a number. Enter a number from 0 to 10~000~000~lm, such as 5200.
            lumens            | 1,500  | Lumens of each light: “1,500” can be read in two ways: write 1500 or 1.500. Enter a number from 0 to 10~000~000~lm, such as 5200.
            air               | foggy  | Clearness of the air: “foggy” is not known. Choose one of: very-clear, clear, average, hazy.
            air               | ''     | Clearness of the air is empty. Enter one of: very-clear, clear, average, hazy.
            tiltDeg           | -6,5   | Tilt toward you: “-6,5” is out of bounds. Enter a number from 0 to 180°, such as 15.
            mountingHeightM   | six    | Height of the lights: “six” is not a number. Enter a number from 0 to 500~m, such as 6.
            eyeHeightM        | <b>    | Height of your eye: “<b>” is not a number. Enter a number from 0 to 3~000~m, such as 1.6.
            distanceM         | 0,5    | Distance to the lights: “0,5” is out of bounds. Enter a number from 1 to 200~000~m, such as 800.
            glareAngleDeg     | 0      | Angle beside the lights at which you look: “0” is out of bounds. Enter a number from 0.1 to 60°, such as 10.
            groundReflectance | 12     | Share of light the ground sends back: “12” is out of bounds. Enter a number from 0 to 1, such as 0.12.
            """)
    void saysItInThesePlainWords(String field, String typed, String message) {
        assertThat(SentenceReader.read(Map.of(field, List.of(typed))).faults())
                .extracting(Fault::message)
                .containsExactly(message.replace("~", NO_BREAK));
    }

    @Test
    void quotesTheBeginningOfWhatIsLong() {
        assertThat(SentenceReader.read(Map.of("distanceM", List.of("x".repeat(10_000))))
                        .faults())
                .extracting(Fault::message)
                .containsExactly(
                        "Distance to the lights: “" + "x".repeat(40)
                                + "…” is longer than 40 characters. Enter a number from 1 to 200\u00a0000\u00a0m, such as 800.");
    }

    /** Half a character, a lone surrogate, is no text that could be sent. */
    @Test
    void neverCutsACharacterInTwo() {
        String typed = "x".repeat(39) + "\uD83D\uDE00".repeat(3);

        assertThat(SentenceReader.read(Map.of("count", List.of(typed))).faults())
                .singleElement()
                .satisfies(fault -> assertThat(fault.message()).contains("“" + "x".repeat(39) + "…”"));
    }

    @Test
    void saysHowOftenABlankThatIsThereTwiceIsThere() {
        assertThat(SentenceReader.read(Map.of("count", List.of("24", "24"))).faults())
                .containsExactly(new Fault(Blank.COUNT, "How many lights is there 2 times; leave one of them."));
    }

    @Test
    void findsEverythingWrongAtOnceInTheOrderOfTheSentence() {
        Map<String, List<String>> typed = new LinkedHashMap<>();
        List<Blank> backwards = new ArrayList<>(List.of(Blank.values()));
        Collections.reverse(backwards);
        backwards.forEach(blank -> typed.put(blank.field(), List.of("wrong")));

        assertThat(SentenceReader.read(typed).faults()).extracting(Fault::blank).containsExactly(Blank.values());
    }

    @Test
    void tellsLengthsInFeetOnAPageInFeetAndWhatItTellsIsTaken() {
        List<Fault> faults = SentenceReader.read(
                        Map.of("distanceM", List.of("far"), "mountingHeightM", List.of("501"), "lumens", List.of("-1")),
                        Units.US)
                .faults();

        assertThat(faults)
                .extracting(Fault::message)
                .containsExactly(
                        "Lumens of each light: “-1” is out of bounds. Enter a number from 0 to 10\u00a0000\u00a0000\u00a0lm, such as 5200.",
                        "Height of the lights: “1643.7” is out of bounds. Enter a number from 0 to 1\u00a0640\u00a0ft, such as 19.7.",
                        "Distance to the lights: “far” is not a number. Enter a number from 3.281 to 656\u00a0167\u00a0ft, such as 2620.");
        // a foot is 0.3048 m exactly (international yard and pound agreement, 1959)
        for (String[] told : new String[][] {
            {"distanceM", "3.281"}, {"distanceM", "656167"}, {"mountingHeightM", "1640"}, {"eyeHeightM", "9842"}
        }) {
            String metres =
                    new BigDecimal(told[1]).multiply(new BigDecimal("0.3048")).toPlainString();
            assertThat(SentenceReader.read(Map.of(told[0], List.of(metres))).faults())
                    .isEmpty();
        }
    }

    @ParameterizedTest
    @EnumSource
    void hasAGuessForEveryBlankThatItWouldTakeItself(Blank blank) {
        Guess guess = Guesses.of(blank);

        assertThat(guess.blank()).isEqualTo(blank);
        assertThat(guess.why()).isNotBlank().endsWith(".");
        for (String value : List.of(guess.likely(), guess.low(), guess.high(), exampleOr(blank, guess.likely()))) {
            SentenceReader.Result read = SentenceReader.read(Map.of(blank.field(), List.of(value)));
            assertThat(read.faults()).isEmpty();
            assertThat(read.sentence().orElseThrow().text(blank)).isEqualTo(value);
        }
        if (blank.kind() == Blank.Kind.CHOICE) {
            assertThat(SentenceReader.choices(blank)).contains(guess.likely(), guess.low(), guess.high());
        } else {
            assertThat(new BigDecimal(guess.low())).isLessThanOrEqualTo(new BigDecimal(guess.likely()));
            assertThat(new BigDecimal(guess.likely())).isLessThanOrEqualTo(new BigDecimal(guess.high()));
        }
    }

    @Test
    void guessesAnUprightPanelUpright() {
        Sentence sentence = read(Map.of("shape", List.of("self-lit-panel")));

        assertThat(sentence.tiltDeg()).isEqualTo(90);
        assertThat(sentence.guess(Blank.TILT).likely()).isEqualTo("90");
    }

    @Test
    void takesEveryChoiceItNames() {
        for (Blank blank : List.of(Blank.SPECTRAL_CLASS, Blank.SHAPE, Blank.AIR)) {
            assertThat(SentenceReader.choices(blank))
                    .isNotEmpty()
                    .allSatisfy(id -> assertThat(SentenceReader.read(Map.of(blank.field(), List.of(id)))
                                    .faults())
                            .isEmpty());
        }
        // ids that addresses were promised
        assertThat(SentenceReader.choices(Blank.SHAPE)).contains("all-round", "diffuse-down", "diffuse-up");
        assertThat(SentenceReader.choices(Blank.AIR)).containsExactly("very-clear", "clear", "average", "hazy");
    }

    private static String exampleOr(Blank blank, String otherwise) {
        return blank.example().isEmpty() ? otherwise : blank.example();
    }

    private static Sentence read(Map<String, List<String>> typed) {
        SentenceReader.Result read = SentenceReader.read(typed);
        assertThat(read.faults()).isEmpty();
        return read.sentence().orElseThrow();
    }
}
