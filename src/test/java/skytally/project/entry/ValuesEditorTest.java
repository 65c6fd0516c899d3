package skytally.project.entry;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.context.support.ResourceBundleMessageSource;
import org.springframework.util.LinkedMultiValueMap;
import skytally.project.Bounds;
import skytally.project.Cases;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.KeptProject;
import skytally.project.Party;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.scene.State;
import skytally.web.InvalidInputException.Fault;

@DisplayName("A form of values")
class ValuesEditorTest {

    private static final Instant NOON = Instant.parse("2026-12-01T12:00:00Z");
    private static final KeptProject KEPT = new KeptProject(Cases.aSportsGround(), 3, NOON);
    private static final List<Field> FIELDS = Fields.of(Field.Subject.TYPE);
    private static final Heading FROM_D1 = new Heading("D1", "applicant", "A. Planner", "");
    private static final Heading OURS = new Heading("", "applicant", "A. Planner", "looked at the poles");
    private static final Heading NO_REASON = new Heading("", "", "", "");

    private final ValuesEditor editor = editor();

    private static ValuesEditor editor() {
        ResourceBundleMessageSource messages = new ResourceBundleMessageSource();
        messages.setBasename("messages");
        messages.setDefaultEncoding("UTF-8");
        messages.setFallbackToSystemLocale(false);
        Words words = new Words(messages);
        return new ValuesEditor(words, new ValueWords(words), Clock.fixed(NOON, ZoneOffset.UTC));
    }

    private Reading read(Values values, Heading heading, String... namesAndValues) {
        LinkedMultiValueMap<String, String> sent = new LinkedMultiValueMap<>();
        for (int i = 0; i < namesAndValues.length; i += 2) {
            sent.add(namesAndValues[i], namesAndValues[i + 1]);
        }
        return editor.read(KEPT, FIELDS, values, new Typed(sent), heading, Set.of());
    }

    private static String onlyFault(Reading reading) {
        assertThat(reading.isValid()).isFalse();
        assertThat(reading.form().faults()).hasSize(1);
        return reading.form().faults().get(0).message();
    }

    @Test
    void keepsANumberAsTypedAndGivenFromTheDocumentAtTheTop() {
        Claim claim = read(Values.NONE, FROM_D1, "mountingHeight", "20", "mountingHeight-unit", "ft")
                .values()
                .get("mountingHeight")
                .inUse();
        assertThat(claim)
                .isEqualTo(new Claim(
                        "20",
                        "ft",
                        State.GIVEN,
                        "",
                        "",
                        Source.document("D1", ""),
                        Party.APPLICANT,
                        "2026-12-01",
                        "A. Planner"));
    }

    @Test
    void assumesWhatHasNoDocumentAndAsksForAReason() {
        Claim claim = read(Values.NONE, OURS, "tilt", "15", "tilt-low", "10", "tilt-high", "20")
                .values()
                .get("tilt")
                .inUse();
        assertThat(claim.state()).isEqualTo(State.ASSUMED);
        assertThat(claim.party()).isEqualTo(Party.OURS);
        assertThat(claim.source()).isEqualTo(Source.reason("looked at the poles"));
        assertThat(List.of(claim.low(), claim.high())).containsExactly("10", "20");

        Reading without = read(Values.NONE, NO_REASON, "tilt", "15", "lumens", "5200");
        assertThat(without.form().faults()).extracting(Fault::field).containsExactly("why");
        assertThat(without.values()).isEqualTo(Values.NONE);
    }

    @Test
    void letsAValueNameItsOwnSource() {
        Values said = read(
                        Values.NONE,
                        FROM_D1,
                        "tilt",
                        "15",
                        "tilt-own",
                        "-",
                        "tilt-why",
                        "measured",
                        "lumens",
                        "5200",
                        "lumens-place",
                        "row A1")
                .values();
        assertThat(said.get("tilt").inUse().state()).isEqualTo(State.ASSUMED);
        assertThat(said.get("tilt").inUse().source()).isEqualTo(Source.reason("measured"));
        assertThat(said.get("lumens").inUse().source()).isEqualTo(Source.document("D1", "row A1"));
    }

    @Test
    void makesNoClaimOfWhatIsUnchangedOrBlank() {
        Values said =
                read(Values.NONE, FROM_D1, "lumens", "5 200", "use", "car park").values();
        Reading again = read(
                said, OURS, "lumens", "5 200", "lumens-unit", "lm", "use", " car park ", "tilt", "", "tilt-unit", "°");
        assertThat(again.isValid()).isTrue();
        assertThat(again.values()).isEqualTo(said);
    }

    @Test
    void addsAClaimToThoseThereWereAndCanGoBack() {
        Values said = read(Values.NONE, FROM_D1, "lumens", "5200").values();
        Values disputed = read(said, OURS, "lumens", "4800").values();
        assertThat(disputed.get("lumens").claims()).extracting(Claim::value).containsExactly("5200", "4800");
        assertThat(disputed.get("lumens").used()).isEqualTo(1);

        Values back =
                read(disputed, NO_REASON, "lumens", "4800", "lumens-used", "0").values();
        assertThat(back.get("lumens")).isEqualTo(disputed.get("lumens").using(0));
        assertThat(onlyFault(read(disputed, OURS, "lumens", "1", "lumens-used", "0")))
                .contains("Do one or the other");
        assertThat(onlyFault(read(disputed, OURS, "lumens-used", "7"))).contains("no such claim");
    }

    @Test
    void statesAnewWhatIsUnchangedOnlyWhenAsked() {
        Values said = read(Values.NONE, OURS, "lumens", "5200").values();
        Stated anew = read(said, FROM_D1, "lumens", "5200", "lumens-again", "yes")
                .values()
                .get("lumens");
        assertThat(anew.claims()).extracting(Claim::state).containsExactly(State.ASSUMED, State.GIVEN);
    }

    @Test
    void takesBackAValueThatIsEmptied() {
        Values said = read(Values.NONE, FROM_D1, "tilt", "15", "tilt-low", "10", "tilt-high", "20")
                .values();
        Stated none = read(said, OURS, "tilt", "", "tilt-low", "10", "tilt-high", "20")
                .values()
                .get("tilt");
        assertThat(none.inUse().state()).isEqualTo(State.NOT_KNOWN);
        assertThat(none.claims()).hasSize(2);
    }

    @Test
    void saysWhichValueIsWrongAndHowToMendItAndKeepsWhatWasTyped() {
        Reading reading = read(Values.NONE, FROM_D1, "lumens", "<b>many", "use", "kept");
        assertThat(onlyFault(reading))
                .isEqualTo("Lumens of each: “<b>many” is not a number. Write it as in 6.5 or 5200.");
        assertThat(reading.form().rows())
                .filteredOn(row -> row.id().equals("lumens") || row.id().equals("use"))
                .extracting(row -> row.asked().value())
                .containsExactlyInAnyOrder("<b>many", "kept");
        assertThat(reading.values()).isEqualTo(Values.NONE);
    }

    @Test
    void holdsTheBoundsInTheUnitTyped() {
        assertThat(read(Values.NONE, FROM_D1, "mountingHeight", "1640", "mountingHeight-unit", "ft")
                        .isValid())
                .isTrue();
        assertThat(onlyFault(read(Values.NONE, FROM_D1, "mountingHeight", "1641", "mountingHeight-unit", "ft")))
                .contains("“1641 ft”", "0 to 500 m");
        assertThat(onlyFault(read(Values.NONE, FROM_D1, "tilt", "-1"))).contains("0 to 180 °");
        assertThat(onlyFault(read(Values.NONE, FROM_D1, "lumens", "1e9999"))).contains("0 to 10000000 lm");
        assertThat(onlyFault(read(Values.NONE, FROM_D1, "count", "2.5"))).contains("whole number");
        assertThat(onlyFault(read(Values.NONE, FROM_D1, "lumens", "1,200"))).contains("two ways");
        assertThat(onlyFault(read(Values.NONE, FROM_D1, "mountingHeight", "6", "mountingHeight-unit", "mi")))
                .contains("m, ft");
        assertThat(onlyFault(read(Values.NONE, FROM_D1, "shape", "round"))).contains("“round”");
        assertThat(onlyFault(read(Values.NONE, FROM_D1, "note", "x".repeat(Bounds.TEXT + 1))))
                .contains("at most 65536 characters");
        assertThat(onlyFault(read(Values.NONE, FROM_D1, "tilt", "15", "tilt-low", "16")))
                .contains("range");
        assertThat(onlyFault(read(Values.NONE, FROM_D1, "tilt-low", "16"))).contains("range needs a value");
        assertThat(onlyFault(read(Values.NONE, new Heading("D9", "", "", ""), "tilt", "1")))
                .contains("D9");
    }

    @Test
    void leavesWhatAnotherProgramWroteUntouched() {
        Values odd = new Values(Map.of(
                "shape", Stated.of(Claim.given("odd", "", Source.NONE, Party.OURS)),
                "mountingHeight", Stated.of(Claim.given("3", "rod", Source.NONE, Party.OURS))));
        Reading reading = read(odd, OURS, "shape", "odd", "mountingHeight", "3", "mountingHeight-unit", "rod");
        assertThat(reading.isValid()).isTrue();
        assertThat(reading.values()).isEqualTo(odd);
    }
}
