package skytally.firstlook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Random;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.assessment.Assessment;
import skytally.assessment.Assessor;
import skytally.assessment.Circumstance;
import skytally.assessment.Figure;
import skytally.assessment.Working;
import skytally.figures.NumberRow;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;
import skytally.web.Switches.Units;

@DisplayName("Every figure of a first look")
class EveryFigureTest {

    /** What a program's insides look like when they show; the one citation that prints 2.54e-6 is its author's. */
    private static final Pattern INSIDES =
            Pattern.compile("NaN|Infinity|∞|null|\\dE-?\\d|@[0-9a-f]{5,}|Optional|\\{\\d\\}|%[sdf]");

    /** Remembers what it worked out for the one test until the other asks for it. */
    private static final Answers SPREAD = answers();

    private static final long SEED = 20_240_601;

    static Stream<Map<String, String>> aSpreadOfSentences() {
        List<Map<String, String>> sentences = new ArrayList<>();
        for (Shape shape : Shapes.all()) {
            for (String distance : List.of("1", "30", "800", "30000", "200000")) {
                sentences.add(Map.of("shape", shape.id(), "distanceM", distance));
            }
            sentences.add(Map.of("shape", shape.id(), "tiltDeg", "15"));
            sentences.add(Map.of("shape", shape.id(), "tiltDeg", "90", "count", "24"));
            sentences.add(Map.of("shape", shape.id(), "tiltDeg", "180", "groundReflectance", "1"));
            sentences.add(Map.of("shape", shape.id(), "lumens", "0"));
            sentences.add(Map.of("shape", shape.id(), "mountingHeightM", "0", "eyeHeightM", "0"));
        }
        sentences.add(Map.of("eyeHeightM", "6")); // the eye level with the light
        sentences.add(Map.of("eyeHeightM", "3000", "mountingHeightM", "0", "distanceM", "1"));
        sentences.add(Map.of("lumens", "10000000", "count", "20000", "distanceM", "1"));
        sentences.add(Map.of());
        return sentences.stream();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("aSpreadOfSentences")
    void isAnOrderedRangeWithItsUnitAndAWorkingToDoAgainByHand(Map<String, String> typed) {
        Answer answer = SPREAD.to(sentence(typed));

        assertThat(answer.assessment().figures()).hasSizeGreaterThan(30);
        answer.assessment().figures().forEach((key, figure) -> {
            assertThat(figure.key()).isEqualTo(key).matches("here/[a-z0-9/-]+/early/clear");
            assertShown(figure);
        });
        answer.assessment().notes().forEach(note -> assertPlain(note.sentence()));
        assertThat(answer.assessment().has(Assessment.Topic.FIRST_SCATTERING)).isTrue();
    }

    private static void assertShown(Figure figure) {
        assertThat(figure.name()).as(figure.key()).isNotBlank();
        assertThat(figure.unit().symbol()).as(figure.key()).isNotBlank();
        figure.range().ifPresent(range -> {
            assertThat(List.of(range.low(), range.likely(), range.high()))
                    .as(figure.key())
                    .isSorted()
                    .allSatisfy(value -> assertThat(value).isFinite());
            if (figure.unit().isLinear() && !figure.key().contains("altitude")) {
                assertThat(range.low()).as(figure.key()).isNotNegative();
            }
        });
        Working working = figure.working();
        assertPlain(working.formula());
        assertPlain(working.substituted());
        assertThat(working.formula()).as(figure.key()).contains("=");
        assertThat(working.sources())
                .as(figure.key())
                .isNotEmpty()
                .allSatisfy(source -> assertThat(source.reference()).isNotBlank());
        working.notes().forEach(EveryFigureTest::assertPlain);
        working.inputs().forEach(input -> {
            for (String text : List.of(
                    input.name(), input.symbol(), input.value(), input.known().from())) {
                assertPlain(text);
            }
        });
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("aSpreadOfSentences")
    void isSaidOnThePageInPlainWordsInBothUnits(Map<String, String> typed) {
        Answer answer = SPREAD.to(sentence(typed));

        for (Units units : Units.values()) {
            FirstLookPage page = FirstLookPage.of(answer, units);

            assertThat(page.numbers())
                    .hasSameSizeAs(answer.assessment().figures().values());
            assertThat(page.numbers()).extracting(NumberRow::id).doesNotHaveDuplicates();
            assertPlain(page.heading());
            assertPlain(page.guessesHead());
            assertPlain(page.ladder().says());
            assertPlain(page.ladder().svg());
            assertThat(page.lines()).hasSizeBetween(4, 5).allSatisfy(line -> {
                assertPlain(line.toString().replace("range=null", "").replace("figure=null", ""));
                assertThat(page.numbers()).extracting(NumberRow::id).contains(line.door());
            });
        }
    }

    /** In bounds, nothing fails: a random walk, always the same one. */
    @Test
    void isThereForAnySentenceInBounds() {
        Random random = new Random(SEED);
        Answers answers = answers();
        for (int i = 0; i < 800; i++) {
            Map<String, String> typed = new HashMap<>();
            for (Blank blank : Blank.values()) {
                typed.put(blank.field(), anything(blank, random));
            }
            Answer answer = answers.to(sentence(typed));
            FirstLookPage page = FirstLookPage.of(answer, i % 2 == 0 ? Units.METRIC : Units.US);

            assertThat(answer.assessment().figures().values()).as("%s", typed).allSatisfy(EveryFigureTest::assertShown);
            assertThat(page.lines()).as("%s", typed).hasSizeBetween(4, 5);
        }
    }

    /** Either an end of the range, or somewhere in it, evenly in the logarithm. */
    private static String anything(Blank blank, Random random) {
        if (blank.kind() == Blank.Kind.CHOICE) {
            List<String> choices = SentenceReader.choices(blank);
            return choices.get(random.nextInt(choices.size()));
        }
        double least = blank.least().doubleValue();
        double most = blank.most().doubleValue();
        int way = random.nextInt(8);
        if (way < 2) {
            return (way == 0 ? blank.least() : blank.most()).toPlainString();
        }
        double from = Math.max(least, 1e-6);
        double value = from * Math.pow(most / from, random.nextDouble());
        return blank.kind() == Blank.Kind.WHOLE
                ? Long.toString(Math.round(value))
                : String.format(Locale.ROOT, "%.6f", Math.min(most, Math.max(least, value)));
    }

    @Test
    void isWrittenTheSameWhereverTheComputerStands() {
        Locale before = Locale.getDefault();
        List<String> written = new ArrayList<>();
        try {
            for (String tag : new String[] {"en-US", "de-DE", "ar-EG-u-nu-arab", "tr-TR", "hi-IN-u-nu-deva"}) {
                Locale.setDefault(Locale.forLanguageTag(tag));
                Answer answer =
                        answers().to(sentence(Map.of("distanceM", "1234.5", "count", "1200", "tiltDeg", "7,5")));
                written.add(answer.assessment() + " " + FirstLookPage.of(answer, Units.US));
            }
        } finally {
            Locale.setDefault(before);
        }
        assertThat(written).allSatisfy(one -> assertThat(one).isEqualTo(written.get(0)));
    }

    @Test
    void doesNotMoveWithAGuessThatHasNoRangeAndMovesWithOneThatHas() {
        Sentence typed = sentence(Map.of(
                "lumens",
                "5200",
                "spectralClass",
                "led3000",
                "shape",
                "all-round",
                "tiltDeg",
                "0",
                "mountingHeightM",
                "6",
                "eyeHeightM",
                "1.6",
                "air",
                "clear",
                "groundReflectance",
                "0.12"));
        Sentence oneGuess = sentence(Map.of(
                "spectralClass",
                "led3000",
                "shape",
                "all-round",
                "tiltDeg",
                "0",
                "mountingHeightM",
                "6",
                "eyeHeightM",
                "1.6",
                "air",
                "clear",
                "groundReflectance",
                "0.12"));

        assertThat(answers().to(typed).figure("direct/illuminance").range())
                .hasValueSatisfying(range -> assertThat(range.isOpen()).isFalse());
        // light is proportional to lumens, guessed at 5200 from 3500 to 8000
        assertThat(answers().to(oneGuess).figure("direct/illuminance").range()).hasValueSatisfying(range -> {
            assertThat(range.low() / range.likely()).isCloseTo(3500.0 / 5200, within(1e-9));
            assertThat(range.high() / range.likely()).isCloseTo(8000.0 / 5200, within(1e-9));
        });
    }

    private static Answers answers() {
        return new Answers(new Assessor(Circumstance.EARLY_CLEAR));
    }

    private static void assertPlain(String text) {
        assertThat(text).isNotBlank().doesNotContainPattern(INSIDES);
    }

    static Sentence sentence(Map<String, String> typed) {
        Map<String, List<String>> lists = new HashMap<>();
        typed.forEach((field, text) -> lists.put(field, Arrays.asList(text)));
        SentenceReader.Result read = SentenceReader.read(lists);
        assertThat(read.faults()).isEmpty();
        return read.sentence().orElseThrow();
    }
}
