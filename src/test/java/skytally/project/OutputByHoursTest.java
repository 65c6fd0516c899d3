package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import skytally.project.transfer.ProjectFile;
import skytally.scene.State;

@DisplayName("What hours give for the output")
class OutputByHoursTest {

    private static Values said(String... fieldsAndValues) {
        Values values = Values.NONE;
        for (int i = 0; i < fieldsAndValues.length; i += 2) {
            values = values.with(
                    fieldsAndValues[i],
                    Stated.of(Claim.given(fieldsAndValues[i + 1], "", Source.reason("test"), Party.APPLICANT)));
        }
        return values;
    }

    /**
     * The types of the samples, whose early and late percentages are claims of the schedule: what their hours give, by
     * hand from the words and the curfew of the site.
     */
    @ParameterizedTest(name = "{1} of {0}: {2} before, {3} after the curfew")
    @CsvSource(nullValues = "none", textBlock = """
            ferrin-lane,    A1,  100,  0,    worked out
            ferrin-lane,    A2,  100,  0,    worked out
            ferrin-lane,    A3,  100,  0,    worked out
            ferrin-lane,    A4,  100,  100,  worked out
            ferrin-lane,    A5,  100,  100,  worked out
            ferrin-lane,    A6,  100,  100,  worked out
            ferrin-lane,    A7,  100,  100,  assumed
            ferrin-lane,    A8,  100,  100,  worked out
            ferrin-lane,    A9,  none, none, none
            sillow-gateway, B1,  100,  50,   worked out
            sillow-gateway, B4,  100,  0,    worked out
            sillow-gateway, B6,  100,  100,  assumed
            sillow-gateway, B7,  100,  100,  worked out
            sillow-gateway, B8,  100,  0,    worked out
            sillow-gateway, B9,  100,  100,  worked out
            sillow-gateway, B12, 100,  100,  worked out
            ostrel-valley,  C1,  100,  100,  worked out
            """)
    void isTheWorstMoment(String sample, String mark, String early, String late, String state) throws Exception {
        Project project = ProjectFile.read(Files.readAllBytes(Path.of("sample-projects", sample + ".skytally.json")));
        Values type = project.scheme("proposed")
                .orElseThrow()
                .type(mark)
                .orElseThrow()
                .values();
        Optional<OutputByHours> byHours = OutputByHours.of(type, project.site());
        assertThat(byHours.map(hours -> hours.claim("earlyOutput").orElseThrow().value())
                        .orElse(null))
                .isEqualTo(early);
        assertThat(byHours.map(hours -> hours.claim("lateOutput").orElseThrow().value())
                        .orElse(null))
                .isEqualTo(late);
        assertThat(byHours.map(hours -> hours.state().words()).orElse(null)).isEqualTo(state);
    }

    /** The samples say of some types that their hours run past the curfew; the hours must say the same. */
    @ParameterizedTest
    @CsvSource({"ferrin-lane", "sillow-gateway", "ostrel-valley"})
    void isWhatTheSamplesClaimOfIt(String sample) throws Exception {
        Project project = ProjectFile.read(Files.readAllBytes(Path.of("sample-projects", sample + ".skytally.json")));
        int claims = 0;
        for (Scheme scheme : project.schemes()) {
            for (LuminaireType type : scheme.types()) {
                for (Claim claim : type.values().get("lateOutput").claims()) {
                    if (claim.state() == State.WORKED_OUT) {
                        claims++;
                        assertThat(OutputByHours.of(type.values(), project.site())
                                        .flatMap(hours -> hours.claim("lateOutput"))
                                        .map(Claim::value))
                                .as("%s of %s", type.mark(), scheme.mark())
                                .contains(claim.value());
                    }
                }
            }
        }
        assertThat(claims).isPositive();
    }

    @Test
    void comesFromTheRowsBeforeTheWords() {
        Values type = said("hours", "dusk to dawn", "schedule", "dusk 23:00 100%\n23:00 dawn 30%");
        OutputByHours byHours = OutputByHours.of(type, said("curfew", "23:00")).orElseThrow();
        assertThat(byHours.claim("lateOutput").orElseThrow().value()).isEqualTo("30");
        assertThat(byHours.claim("lateOutput").orElseThrow().source().reason())
                .isEqualTo("“23:00 dawn 30%”, curfew at 23:00, the hours row by row");
    }

    /** Without a curfew, the stand-in of the catalogue is 23:00. */
    @Test
    void isUsedOnlyWhereNoOutputIsStated() {
        Values hours = said("hours", "dusk to 23:00, then 30 %");
        assertThat(OutputByHours.reading("lateOutput", hours, Values.NONE).text())
                .isEqualTo("30");
        assertThat(OutputByHours.reading("lateOutput", hours, Values.NONE)
                        .known()
                        .state())
                .isEqualTo(State.WORKED_OUT);
        Values stated =
                hours.with("lateOutput", Stated.of(Claim.given("70", "%", Source.reason("test"), Party.APPLICANT)));
        assertThat(OutputByHours.reading("lateOutput", stated, Values.NONE).text())
                .isEqualTo("70");
        Values unread = said("hours", "match nights only");
        assertThat(OutputByHours.reading("lateOutput", unread, Values.NONE).text())
                .isEqualTo("100");
        assertThat(OutputByHours.reading("lateOutput", unread, Values.NONE)
                        .known()
                        .state())
                .isEqualTo(State.NOT_KNOWN);
    }

    @Test
    void dimsTheLampsOfTheScene() {
        Values type = new Values(Map.of(
                        "lumens", Stated.of(Claim.given("1000", "lm", Source.reason("test"), Party.APPLICANT)),
                        "count", Stated.of(Claim.given("2", "", Source.reason("test"), Party.APPLICANT))))
                .with("hours", said("hours", "dusk to 23:00, then 30 %").get("hours"));
        Scheme scheme = new Scheme(
                "proposed", Scheme.Kind.PROPOSED, "Proposed", List.of(new LuminaireType("A1", type)), List.of());
        Project project = Cases.aSportsGround()
                .withScheme(scheme)
                .withSite(Values.NONE.with(
                        "outline",
                        Stated.of(Claim.given("0 0; 20 0; 20 20; 0 20", "m", Source.reason("test"), Party.APPLICANT))));
        SceneDrawing.Drawn early = SceneDrawing.of(project, scheme, SceneDrawing.Period.EARLY);
        SceneDrawing.Drawn late = SceneDrawing.of(project, scheme, SceneDrawing.Period.LATE);
        assertThat(early.scene().drawn(Map.of()).unplaced().get(0).flux().lumens())
                .isEqualTo(1000);
        assertThat(late.scene().drawn(Map.of()).unplaced().get(0).flux().lumens())
                .isEqualTo(300);
        assertThat(late.unplaced()).containsExactly("A1");
        assertThat(late.scene().drawn(Map.of()).unplaced().get(0).position().eastM())
                .isCloseTo(10, within(1e-9));
        assertThat(late.scene().drawn(Map.of()).unplaced().get(0).position().northM())
                .isCloseTo(10, within(1e-9));
    }
}
