package skytally.project.completeness;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.text.MessageFormat;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.Properties;
import java.util.UUID;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.project.Claim;
import skytally.project.Document;
import skytally.project.LuminaireType;
import skytally.project.Party;
import skytally.project.Place;
import skytally.project.Placement;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.transfer.ProjectFile;
import skytally.scene.State;

/** The expected answers of the samples were worked out from their tables apart from this program. */
@DisplayName("Is it complete?")
class CompletenessTest {

    private static final Properties WORDS = words();

    private static Properties words() {
        try (Reader file = new InputStreamReader(
                Objects.requireNonNull(CompletenessTest.class.getResourceAsStream("/messages.properties")),
                StandardCharsets.UTF_8)) {
            Properties words = new Properties();
            words.load(file);
            return words;
        } catch (IOException cannot) {
            throw new IllegalStateException(cannot);
        }
    }

    private static String sentence(Answer answer) {
        String pattern = Objects.requireNonNull(WORDS.getProperty(answer.key()), answer.key());
        return new MessageFormat(pattern, Locale.ENGLISH)
                .format(answer.with().toArray())
                .replace('\u00a0', ' ');
    }

    private static Answer answer(Question question, Project project, String scheme) {
        return Completeness.of(project, project.scheme(scheme).orElseThrow()).stream()
                .filter(one -> one.question() == question)
                .findFirst()
                .orElseThrow();
    }

    private static Project sample(String name) throws Exception {
        return ProjectFile.read(Files.readAllBytes(Path.of("sample-projects", name + ".skytally.json")));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            ferrin-lane | proposed | WINDOW | YES | VA1, Bedroom window, end house of the lane: 4.5 m up, facing 180°, 50.4 m from the nearest light. Whether a nearer one was left out, only a visit tells. | places/VA1
            ferrin-lane | proposed | COUNTS | YES | 68 of 68 lights are on the plan, of each type as many as the schedule says; together 2 818 000 lm. | lights/proposed/positions
            ferrin-lane | proposed | TILT | NO | Turned above level: A8. In no paper: the tilt of A3, A8. | lights/proposed/types/A8#tilt
            ferrin-lane | proposed | UPWARD | NOT_KNOWN | Told for 7 of 9 types; for A7, A8 it rests on what we assumed. | lights/proposed/types/A7#upwardShare
            ferrin-lane | proposed | INITIAL | NOT_KNOWN | No paper says so of A8. | lights/proposed/types/A8#lumensBasis
            ferrin-lane | proposed | ZONE | NOT_KNOWN | E2 is used: village edge; E1 argued by the society. Another claim, an objector's: E1, argued by the society. | site#zone
            ferrin-lane | proposed | LATE | NOT_KNOWN | Every type has one, but the claims differ for A5, A6, A7, A8, and we assumed that of A9. | lights/proposed/types/A5#lateOutput
            ferrin-lane | proposed | READING | NO | 20.9 mag/arcsec², D11 Reading of the sky, one reading, one person, one night; but no date. | site#existingZenithBrightness
            ferrin-lane | proposed | OBSERVATORY | YES | VA8, Observatory, slit of the main dome: 6 000 m on a bearing of 28°. | places/VA8
            ferrin-lane | proposed | SHIELDS | NOT_KNOWN | 2 of 9 types have one; no paper about the product says so of A5, A6. | lights/proposed/types/A5#shield
            ferrin-lane | mended | TILT | YES | Every type has one; the greatest is that of A9, 90°. | lights/mended/types/A9#tilt
            ferrin-lane | mended | COUNTS | YES | 66 of 66 lights are on the plan, of each type as many as the schedule says; together 2 308 000 lm. | lights/mended/positions
            sillow-gateway | proposed | WINDOW | YES | VB1, Bedroom window, house 7 (nearest): 4.877 m up, facing 180°, 20.7 m from the nearest light. Whether a nearer one was left out, only a visit tells. | places/VB1
            sillow-gateway | proposed | ZONE | NOT_KNOWN | LZ2 is used: argued by the applicant as LZ3. Another claim, the applicant's: LZ3, argued by the applicant. | site#lightingZone
            sillow-gateway | proposed | READING | NO | None is stated. | site#existingZenithBrightness
            sillow-gateway | proposed | OBSERVATORY | NO | None is listed, only 2 viewing places. If none lies within reach, the papers should say so. | places
            sillow-gateway | proposed | SHIELDS | NO | B3: D4 Cut sheets says “none stated”, D2 Site lighting plan E-101 says “type 4 with house-side shield”. | lights/proposed/types/B3#shield
            ostrel-valley | proposed | WINDOW | YES | VC1, Farmhouse bedroom: 4.2 m up, facing 0°, 74.5 m from the nearest light. Whether a nearer one was left out, only a visit tells. | places/VC1
            ostrel-valley | proposed | TILT | YES | Every type has one; the greatest is that of C5, 50°. | lights/proposed/types/C5#tilt
            ostrel-valley | proposed | UPWARD | YES | Types for which it is stated: 6; worked out from shape and tilt: 0. | lights
            ostrel-valley | proposed | INITIAL | YES | So say the papers of every type (6). | lights
            ostrel-valley | proposed | ZONE | YES | E1: D12 Regional plan. | site#zone
            ostrel-valley | proposed | LATE | YES | Every type says what is on after 22:00. | lights
            ostrel-valley | proposed | OBSERVATORY | YES | VC3, Reserve boundary gate: 3 590 m on a bearing of 18°. | places/VC3
            ostrel-valley | existing | COUNTS | NO | 98 lights are on the plan; how many there are is said in more than one way for C4. | lights/existing/types/C4#count
            """)
    void isAnsweredForTheSamples(String name, String scheme, Question question, Reply reply, String says, String page)
            throws Exception {
        Answer answer = answer(question, sample(name), scheme);

        assertThat(sentence(answer)).isEqualTo(says);
        assertThat(answer.reply()).isEqualTo(reply);
        assertThat(answer.page()).isEqualTo(page);
    }

    @ParameterizedTest
    @CsvSource({"ferrin-lane", "sillow-gateway", "ostrel-valley"})
    void isTenQuestionsThoseToBeMendedFirstForEveryScheme(String name) throws Exception {
        Project project = sample(name);
        for (Scheme scheme : project.schemes()) {
            List<Answer> answers = Completeness.of(project, scheme);

            assertThat(answers).extracting(Answer::question).containsExactlyInAnyOrder(Question.values());
            assertThat(answers).extracting(Answer::reply).isSorted();
            assertThat(answers).allSatisfy(answer -> {
                assertThat(sentence(answer)).doesNotContain("{", "null").isNotBlank();
                assertThat(WORDS)
                        .containsKeys(
                                "complete." + answer.question().id(),
                                "complete." + answer.reply().id(),
                                "complete.go." + answer.about());
            });
        }
    }

    @Test
    void isMostlyNotKnownOfNothing() {
        Project empty = Project.named(UUID.randomUUID(), "Nothing yet");
        List<Answer> answers = Completeness.of(empty, empty.scheme("proposed").orElseThrow());

        assertThat(answers.stream().filter(one -> one.reply() == Reply.NO).map(Answer::question))
                .containsExactly(Question.WINDOW, Question.ZONE, Question.READING, Question.OBSERVATORY);
        assertThat(answers.subList(4, 10)).allSatisfy(answer -> {
            assertThat(answer.reply()).isEqualTo(Reply.NOT_KNOWN);
            assertThat(sentence(answer)).isEqualTo("The schedule has no type yet.");
        });
    }

    private static Stated given(String value) {
        return given(value, "", "D1");
    }

    private static Stated given(String value, String unit, String document) {
        return Stated.of(Claim.given(value, unit, Source.document(document, ""), Party.APPLICANT));
    }

    private static Stated assumed(String value) {
        return Stated.of(
                new Claim(value, "", State.ASSUMED, "", "", Source.reason("a guess"), Party.OURS, "2026-11-01", ""));
    }

    private static Values values(Object... namesAndValues) {
        Map<String, Stated> values = new HashMap<>();
        for (int i = 0; i < namesAndValues.length; i += 2) {
            values.put(
                    (String) namesAndValues[i],
                    namesAndValues[i + 1] instanceof Stated stated ? stated : given((String) namesAndValues[i + 1]));
        }
        return new Values(values);
    }

    /** One type A with that said of it, and as many lights of it on the plan. */
    private static Project lights(int placed, Object... said) {
        List<Placement> placements = new ArrayList<>();
        for (int i = 0; i < placed; i++) {
            placements.add(new Placement("A-" + i, "A", values("east", "0", "north", String.valueOf(10 * i))));
        }
        return project(Values.NONE, List.of(new LuminaireType("A", values(said))), placements, List.of());
    }

    private static Project places(Values... places) {
        return project(
                Values.NONE,
                List.of(new LuminaireType("A", Values.NONE)),
                List.of(new Placement("A-1", "A", values("east", "0", "north", "100"))),
                Arrays.stream(places)
                        .map(place -> new Place("P" + place.text("eyeHeight"), place, List.of(), List.of()))
                        .toList());
    }

    private static Project site(Object... said) {
        return project(values(said), List.of(), List.of(), List.of());
    }

    private static Project project(
            Values site, List<LuminaireType> types, List<Placement> placements, List<Place> places) {
        return new Project(
                UUID.randomUUID(),
                "A case",
                List.of(
                        new Document("D1", "Schedule", "", "", ""),
                        new Document("D2", "Data sheet", "2026-10-03", "", "")),
                site,
                List.of(new Scheme("proposed", Scheme.Kind.PROPOSED, "", types, placements)),
                places);
    }

    private static Values window(String eyeHeight, Object... more) {
        List<Object> all = new ArrayList<>(List.of(
                "kind",
                "home-window",
                "eyeHeight",
                eyeHeight.isEmpty() ? Stated.NOTHING : given(eyeHeight, "m", "D1")));
        all.addAll(List.of(more));
        return values(all.toArray());
    }

    static Stream<Arguments> cases() {
        Object[] there = {"east", "0", "north", "130"};
        Object[] facing = {"east", "0", "north", "140", "facing", given("180", "°", "D1")};
        Stated twoCounts = given("2")
                .claimed(Claim.given("3", "", Source.document("D2", ""), Party.AUTHORITY))
                .using(0);
        Stated bySheet = given("visor", "", "D2");
        return Stream.of(
                of(
                        places(window("1.6", facing)),
                        Question.WINDOW,
                        Reply.NO,
                        "1 window of a home is listed, none of" + " them 3 m up or more."),
                of(places(window("", facing)), Question.WINDOW, Reply.NOT_KNOWN, "P: how high it is, is not stated."),
                of(places(window("4")), Question.WINDOW, Reply.NOT_KNOWN, "P4 is 4 m up, but has no position."),
                of(
                        places(window("4", there), window("5", facing)),
                        Question.WINDOW,
                        Reply.NOT_KNOWN,
                        "P4 is 4 m up;"
                                + " which way it faces is not stated, so there is no plane to reckon the light in."),
                of(
                        places(window("3", facing)),
                        Question.WINDOW,
                        Reply.YES,
                        "P3: 3 m up, facing 180°, 40 m from the"
                                + " nearest light. Whether a nearer one was left out, only a visit tells."),
                of(
                        lights(2, "count", "3"),
                        Question.COUNTS,
                        Reply.NO,
                        "2 lights are on the plan, 3 on the schedule;" + " they differ for A."),
                of(
                        lights(2, "count", twoCounts),
                        Question.COUNTS,
                        Reply.NO,
                        "2 lights are on the plan; how many there" + " are is said in more than one way for A."),
                of(
                        lights(2),
                        Question.COUNTS,
                        Reply.NOT_KNOWN,
                        "2 lights are on the plan; the schedule gives no number" + " for A."),
                of(
                        lights(2, "count", "2"),
                        Question.COUNTS,
                        Reply.NOT_KNOWN,
                        "2 of 2 lights are on the plan; without" + " the lumens of A there is no total."),
                of(
                        lights(2, "count", "2", "lumens", "5 200"),
                        Question.COUNTS,
                        Reply.YES,
                        "2 of 2 lights are on the"
                                + " plan, of each type as many as the schedule says; together 10 400 lm."),
                of(lights(1), Question.TILT, Reply.NOT_KNOWN, "In no paper: the tilt of A."),
                of(lights(1, "tilt", assumed("20")), Question.TILT, Reply.NOT_KNOWN, "In no paper: the tilt of A."),
                of(lights(1, "tilt", "91"), Question.TILT, Reply.NO, "Turned above level: A."),
                of(
                        lights(1, "tilt", "90"),
                        Question.TILT,
                        Reply.YES,
                        "Every type has one; the greatest is that of A, 90°."),
                of(lights(1), Question.UPWARD, Reply.NO, "Told for 0 of 1 type; for A neither it nor shape and tilt."),
                of(
                        lights(1, "shape", "beam-60", "tilt", "20"),
                        Question.UPWARD,
                        Reply.YES,
                        "Types for which it is" + " stated: 0; worked out from shape and tilt: 1."),
                of(
                        lights(1, "shape", assumed("beam-60"), "tilt", "20"),
                        Question.UPWARD,
                        Reply.NOT_KNOWN,
                        "Told" + " for 0 of 1 type; for A it rests on what we assumed."),
                of(
                        lights(1, "lumensBasis", "luminaire-maintained"),
                        Question.INITIAL,
                        Reply.NO,
                        "Those of A are of an" + " aged luminaire, which flatters."),
                of(site("zone", assumed("E2")), Question.ZONE, Reply.YES, "E2: a guess."),
                of(
                        site("zone", Stated.of(Claim.given("E2", "", Source.NONE, Party.OURS))),
                        Question.ZONE,
                        Reply.NO,
                        "E2 is stated, without a document and without a reason."),
                of(
                        site(
                                "zone",
                                assumed("E2"),
                                "lightingZone",
                                Stated.of(Claim.given("LZ1", "", Source.NONE, Party.OURS))),
                        Question.ZONE,
                        Reply.NO,
                        "LZ1 is stated, without a document and without a reason."),
                of(
                        lights(1, "earlyOutput", "100"),
                        Question.LATE,
                        Reply.NO,
                        "Neither hours nor a late output are" + " stated for A."),
                of(
                        lights(1, "hours", "dusk to dawn"),
                        Question.LATE,
                        Reply.YES,
                        "Every type says what is on after" + " 23:00."),
                of(
                        site("existingZenithBrightness", assumed("20.9")),
                        Question.READING,
                        Reply.NO,
                        "20.9, a guess; but" + " no date."),
                of(
                        site("existingZenithBrightness", given("20.9", "mag/arcsec²", "D2")),
                        Question.READING,
                        Reply.YES,
                        "20.9 mag/arcsec² on 2026-10-03: D2 Data sheet."),
                of(
                        site(
                                "existingZenithBrightness",
                                Stated.of(Claim.given(
                                        "20.9", "", Source.reason("read on 2026-09-14 at 23:10"), Party.OURS))),
                        Question.READING,
                        Reply.YES,
                        "20.9 on 2026-09-14: read on 2026-09-14 at 23:10."),
                of(places(values("kind", "observatory")), Question.OBSERVATORY, Reply.NOT_KNOWN, "P has no position."),
                of(
                        places(),
                        Question.OBSERVATORY,
                        Reply.NO,
                        "None is listed. If none lies within reach, the papers" + " should say so."),
                of(lights(1), Question.SHIELDS, Reply.NOT_KNOWN, "Nothing is said of a shield for A."),
                of(lights(1, "shield", "none"), Question.SHIELDS, Reply.YES, "No type relies on one."),
                of(
                        lights(1, "shield", "visor"),
                        Question.SHIELDS,
                        Reply.NOT_KNOWN,
                        "1 of 1 type has one; no paper" + " about the product says so of A."),
                of(
                        lights(1, "shield", bySheet),
                        Question.SHIELDS,
                        Reply.YES,
                        "Papers about the product show those of" + " A."));
    }

    private static Arguments of(Project project, Question question, Reply reply, String says) {
        return Arguments.of(question, reply, says, project);
    }

    @ParameterizedTest(name = "{0} {1}: {2}")
    @MethodSource("cases")
    void isAnsweredFromWhatWasSaid(Question question, Reply reply, String says, Project project) {
        Answer answer = answer(question, project, "proposed");

        assertThat(sentence(answer)).isEqualTo(says);
        assertThat(answer.reply()).isEqualTo(reply);
    }

    @Test
    void asksNothingOfATypeOfWhichThereAreToBeNone() {
        Project none = lights(0, "count", "0", "tilt", "170");

        assertThat(sentence(answer(Question.TILT, none, "proposed"))).isEqualTo("The schedule has no type yet.");
    }

    @Test
    void takesTheOwnTiltsOfLightsForThatOfTheirType() {
        List<Placement> own = List.of(
                new Placement("A-1", "A", values("tilt", "30")), new Placement("A-2", "A", values("tilt", "95")));
        LuminaireType type = new LuminaireType("A", Values.NONE);

        Project steep = project(Values.NONE, List.of(type), own, List.of());
        assertThat(sentence(answer(Question.TILT, steep, "proposed"))).isEqualTo("Turned above level: A.");
        Project level = project(Values.NONE, List.of(type), own.subList(0, 1), List.of());
        assertThat(answer(Question.TILT, level, "proposed").reply()).isEqualTo(Reply.YES);
    }
}
