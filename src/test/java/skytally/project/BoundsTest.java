package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.UUID;
import java.util.function.IntFunction;
import java.util.stream.IntStream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.project.entry.ValuesEditor;
import skytally.project.transfer.ProjectFile;

@DisplayName("The bounds of a project")
class BoundsTest {

    private static final Project EMPTY = Project.named(UUID.randomUUID(), "Large");

    private static <T> List<T> many(int count, IntFunction<T> one) {
        return IntStream.range(0, count).mapToObj(one).toList();
    }

    private static Scheme schemeOf(List<LuminaireType> types, List<Placement> lights) {
        return new Scheme("proposed", Scheme.Kind.PROPOSED, "Proposed", types, lights);
    }

    @Test
    void areTwentyThousandLights() {
        List<LuminaireType> type = List.of(new LuminaireType("A1", Values.NONE));
        assertThat(schemeOf(type, many(20_000, i -> new Placement("A1-" + i, "A1", Values.NONE)))
                        .placements())
                .hasSize(20_000);
        assertThatThrownBy(() -> schemeOf(type, many(20_001, i -> new Placement("A1-" + i, "A1", Values.NONE))))
                .hasMessage("At most 20000 lights in a scheme fit, not 20001");
    }

    @Test
    void areFiveHundredTypes() {
        assertThat(schemeOf(many(500, i -> new LuminaireType("A" + i, Values.NONE)), List.of())
                        .types())
                .hasSize(500);
        assertThatThrownBy(() -> schemeOf(many(501, i -> new LuminaireType("A" + i, Values.NONE)), List.of()))
                .hasMessage("At most 500 luminaire types in a scheme fit, not 501");
    }

    @Test
    void areTwoHundredPlacesAndFiveHundredDocumentsAndSixSchemes() {
        assertThat(EMPTY.withPlaces(many(200, i -> new Place("V" + i, Values.NONE, List.of(), List.of())))
                        .places())
                .hasSize(200);
        assertThatThrownBy(() ->
                        EMPTY.withPlaces(many(201, i -> new Place("V" + i, Values.NONE, List.of(), List.of()))))
                .hasMessage("At most 200 places in a project fit, not 201");
        assertThatThrownBy(() -> EMPTY.withDocuments(many(501, i -> new Document("D" + i, "", "", "", ""))))
                .hasMessage("At most 500 documents in a project fit, not 501");
        assertThatThrownBy(() -> new Project(
                        EMPTY.id(),
                        "x",
                        List.of(),
                        Values.NONE,
                        many(7, i -> new Scheme("s" + i, Scheme.Kind.OPTION, "", List.of(), List.of())),
                        List.of()))
                .hasMessage("At most 6 schemes in a project fit, not 7");
    }

    @Test
    void areAThousandPointsOfAPlace() {
        assertThatThrownBy(() -> new Place(
                        "V1", Values.NONE, List.of(), List.of(), many(1001, i -> new Place.GroundPoint(i, 0))))
                .hasMessage("At most 1000 points of the ground toward a place fit, not 1001");
    }

    @Test
    void are64KiBOfTextInAField() throws Exception {
        String most = "x".repeat(65_536);
        Project project = EMPTY.withSite(note(most));
        assertThat(ProjectFile.open(ProjectFile.write(project)).project()).isEqualTo(project);
        byte[] more = ProjectFile.write(EMPTY.withSite(note(most + "x")));
        assertThatThrownBy(() -> ProjectFile.open(more))
                .hasMessage("/site/zoneReason/claims/0/value: is longer than 65536 characters.");
        Field field = Fields.find(Field.Subject.SITE, "zoneReason").orElseThrow();
        assertThat(Misfit.of(field, most, "")).isEmpty();
        assertThat(Misfit.of(field, most + "x", "").orElseThrow().reason()).isEqualTo(Misfit.Reason.LONG);
    }

    private static Values note(String text) {
        return Values.NONE.with("zoneReason", Stated.of(Claim.given(text, "", Source.reason("test"), Party.APPLICANT)));
    }

    /** As many lights as fit, each placed and turned as the page does it in a block, must fit into a file as well. */
    @Test
    void leaveRoomForAllLightsInAFile() throws Exception {
        Claim basis = Claim.given("0", "m", Source.document("D1", "plan, sheet 3"), Party.APPLICANT)
                .typed("A. Planner", "2026-12-01");
        List<Placement> lights = many(20_000, i -> {
            String how =
                    "light " + i % 200 + " of 200 in row " + i / 200 + " of 100 of a block from 0\u00a0m east, 0\u00a0m"
                            + " north, 10\u00a0m apart on a bearing of 0°, the rows 10\u00a0m apart to its right";
            Stated east = Stated.of(ValuesEditor.workedOut(basis, String.valueOf(i / 2.0), "m", how));
            Stated north = Stated.of(ValuesEditor.workedOut(basis, "0", "m", how));
            Stated bearing = Stated.of(Claim.given("90", "°", Source.document("D1", "plan, sheet 3"), Party.APPLICANT)
                    .typed("A. Planner", "2026-12-01"));
            return new Placement(
                    "A1-" + i,
                    "A1",
                    Values.NONE.with("east", east).with("north", north).with("bearing", bearing));
        });
        Project large = EMPTY.withScheme(schemeOf(List.of(new LuminaireType("A1", Values.NONE)), lights));
        byte[] written = ProjectFile.write(large);
        assertThat(written.length).isLessThan(ProjectFile.LARGEST_BYTES);
        assertThat(ProjectFile.read(written)).isEqualTo(large);
    }
}
