package skytally.project.transfer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import skytally.project.Attachment;
import skytally.project.Attachments;
import skytally.project.Cases;
import skytally.project.Claim;
import skytally.project.Document;
import skytally.project.LuminaireType;
import skytally.project.Party;
import skytally.project.Place;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.WholeProject;

@DisplayName("Project files")
class ProjectFileTest {

    private static final String TEXT = new String(ProjectFile.write(Cases.aSportsGround()), StandardCharsets.UTF_8);

    @Test
    void openToTheSameProjectAndTheSameBytes() throws ProjectFileException {
        Project opened = ProjectFile.read(TEXT.getBytes(StandardCharsets.UTF_8));
        assertThat(opened).isEqualTo(Cases.aSportsGround());
        assertThat(new String(ProjectFile.write(opened), StandardCharsets.UTF_8))
                .isEqualTo(TEXT);
    }

    @ParameterizedTest(name = "{0} becomes {1}: {2}")
    @CsvSource(delimiter = '|', textBlock = """
            "formatVersion" : 1    | "formatVersion" : 7     | /formatVersion: is 7, but this version of the program reads 1. Open it with the program that wrote it.
            "formatVersion" : 1,   |                         | /formatVersion: is missing, so this is no project file.
            "mark" : "A2"          | "mark" : "A1"           | /schemes/1: Two luminaire types have the mark A1.
            "mark" : "A2"          | "mark" : "A 2"          | /schemes/1/types/1: A mark has 1 to 40 letters, digits, hyphens or points and begins with a letter or digit, such as A1 or VA8; not “A 2”.
            "kind" : "proposed"    | "kind" : "wished"       | /schemes/1: A scheme is existing, proposed or option, not “wished”.
            "title" : "Luminaire schedule" | "title" : 5     | /documents/0/title: must be a text in quotation marks, not a number.
            "party" : "objector"   | "party" : "press"       | /schemes/1/types/0/values/lumens/claims/1: A party is ours, applicant, authority, objector, not “press”.
            "revision" : "A"       | "revisoin" : "A"        | /documents/0/revisoin: is not known to this version. Remove it, or open the file with the version that wrote it.
            "id" : "6f1d           | "id" : "xf1d            | /id: must be 32 small hexadecimal digits in five groups with hyphens.
            "altitudeDeg" : "12.5" | "altitudeDeg" : "up"    | /places/0/looks/0/altitudeDeg: must be a number, not “up”.
            "type" : "A2"          | "type" : "A9"           | /schemes/1: Light A2-01 is of type A9, which the scheme does not have.
            """)
    void refuseWhatTheyDoNotKnowWithItsPath(String found, String instead, String message) {
        assertThat(TEXT).contains(found);
        String changed = TEXT.replaceFirst(java.util.regex.Pattern.quote(found), instead == null ? "" : instead);
        assertThatThrownBy(() -> ProjectFile.read(changed.getBytes(StandardCharsets.UTF_8)))
                .isInstanceOf(ProjectFileException.class)
                .hasMessage(message);
    }

    private static final byte[] PLAN = "%PDF-1.7 a plan".getBytes(StandardCharsets.UTF_8);
    private static final byte[] TABLE = "mark,lm\nA1,96000\n".getBytes(StandardCharsets.UTF_8);

    /** Two documents with the same file and one with another. */
    private static WholeProject withFiles() {
        Attachment plan = Attachment.of("plan.pdf", PLAN);
        return new WholeProject(
                Cases.aSportsGround()
                        .withDocuments(List.of(
                                new Document("D1", "Plan", "", "", "").with(plan),
                                new Document("D2", "Plan again", "", "", "").with(plan),
                                new Document("D3", "Table", "", "", "").with(Attachment.of("t.csv", TABLE)),
                                new Document("D4", "Letter", "", "", ""))),
                Attachments.NONE.with(TABLE).with(PLAN));
    }

    @Test
    void carryTheBytesOfEachFileOnceAndOpenToTheSame() throws ProjectFileException {
        byte[] written = ProjectFile.write(withFiles());
        WholeProject opened = ProjectFile.open(written);
        assertThat(opened.project()).isEqualTo(withFiles().project());
        // by sha256sum of GNU coreutils 9.1, of the same bytes
        assertThat(opened.attachments().hashes())
                .containsExactly(
                        "3cd67d980c9889915eb2d36e15243e15437ff5487176fe2da377b88ba05ae769",
                        "e2acaa49ee6d17e7cab5e14fde88de3300654b544c104fc5a6fbc0069a3da11d");
        assertThat(ProjectFile.write(opened)).isEqualTo(written);
        assertThat(ProjectFile.size(opened.project(), ProjectFile.write(opened.project())))
                .isGreaterThanOrEqualTo(written.length);
        assertThat(ProjectFile.read(ProjectFile.write(opened.project()))).isEqualTo(opened.project());
    }

    @ParameterizedTest(name = "{0} becomes {1}: {2}")
    @CsvSource(delimiter = '|', textBlock = """
            JVBERi0xLjcgYSBwbGFu     | JVBERi0xLjcgYSBwbGFO     | /attachments/0/sha256: does not fit the bytes beside it: the file was changed or cut. Take it again from where it was saved.
            JVBERi0xLjcgYSBwbGFu     | JVBERi0xL*cgYSBwbGFu     | /attachments/0/base64: is not base64: Illegal base64 character 2a.
            "size" : 15              | "size" : 16              | /documents/0/file: says 16 bytes of application/pdf, but the attachment has 15 bytes of application/pdf.
            "size" : 15              | "size" : 6000000         | /documents/0/file: A file has 1 to 5242880 bytes, not 6000000.
            "mediaType" : "text/csv" | "mediaType" : "text/html" | /documents/2/file: says 17 bytes of text/html, but the attachment has 17 bytes of text/csv.
            "name" : "plan.pdf"      | "name" : "plan.png"      | /documents/0/file: The file “plan.png” cannot be kept. A file ends in one of .pdf, .png, .jpg, .jpeg, .xlsx, .csv, .txt, .tsv, .ies, .ldt and holds what its end says.
            "name" : "plan.pdf"      | "name" : "../plan.pdf"   | /documents/0/file: The name of a file has no slash and no control character.
            "attachments"            | "attachement"            | /documents/0/file/sha256: names a file that is not among the attachments.
            "mark" : "D4",           | "mark" : "D4", "file" : { "name" : "a.pdf", "mediaType" : "application/pdf", "size" : 1, "sha256" : "x" }, | /documents/3/file: A hash has 64 small hexadecimal digits, not “x”.
            """)
    void refuseAFileThatIsNotWhatItsDocumentSays(String found, String instead, String message) {
        String text = new String(ProjectFile.write(withFiles()), StandardCharsets.UTF_8);
        assertThat(text).contains(found);
        String changed = text.replaceFirst(java.util.regex.Pattern.quote(found), instead);
        assertThatThrownBy(() -> ProjectFile.open(changed.getBytes(StandardCharsets.UTF_8)))
                .isInstanceOf(ProjectFileException.class)
                .hasMessage(message);
    }

    @ParameterizedTest(name = "{0} becomes {1}: {2}")
    @CsvSource(delimiter = '|', textBlock = """
            "lumens" : {             | "lumen" : {              | /schemes/1/types/0/values/lumen: is not known to this version. Remove it, or open the file with the version that wrote it.
            "value" : "96000"        | "value" : "many"         | /schemes/1/types/0/values/lumens/claims/0/value: “many” is not a number.
            "unit" : "lm"            | "unit" : "cd"            | /schemes/1/types/0/values/lumens/claims/0/value: has the unit “cd”, but must have one of lm.
            "value" : "52.4"         | "value" : "92.4"         | /site/latitude/claims/0/value: “92.4” is outside what may be typed, -90 to 90 °.
            "low" : "60"             | "low" : "x"              | /schemes/1/types/0/values/tilt/claims/0/low: “x” is not a number.
            "value" : "86"           | "value" : "1e9"          | /places/0/values/north/claims/0/value: “1e9” is outside what may be typed, -1000000 to 1000000 m.
            """)
    void refuseAValueThatItsFieldDoesNotTake(String found, String instead, String message) {
        assertThat(TEXT).contains(found);
        String changed = TEXT.replaceFirst(java.util.regex.Pattern.quote(found), instead);
        assertThatThrownBy(() -> ProjectFile.open(changed.getBytes(StandardCharsets.UTF_8)))
                .isInstanceOf(ProjectFileException.class)
                .hasMessage(message);
    }

    @ParameterizedTest(name = "{0} of {1}: {2}")
    @CsvSource(delimiter = '|', textBlock = """
            outline  | 0 0; 10 10; 10 0; 0 10 | The edge from line 3 to line 4 crosses or touches the edge from line 1 to line 2. Put the corners in their turn around the site.
            timeZone | Nowhere/Town           | “Nowhere/Town” is no zone of time such as Europe/London or +01:00.
            curfew   | 24:30                  | “24:30” is no time of day such as 23:00.
            zone     | E9                     | “E9” is not one of E0, E1, E2, E3, E4.
            drives   | 2.5                    | “2.5” is not a whole number.
            """)
    void refuseOfASiteWhatItsFieldsDoNotTake(String field, String value, String message) {
        String unit = field.equals("outline") ? "m" : "";
        Project project = Cases.aSportsGround()
                .withSite(new Values(
                        Map.of(field, Stated.of(Claim.given(value, unit, Source.reason("test"), Party.APPLICANT)))));
        assertThatThrownBy(() -> ProjectFile.open(ProjectFile.write(project)))
                .isInstanceOf(ProjectFileException.class)
                .hasMessage("/site/" + field + "/claims/0/value: " + message);
    }

    @Test
    void keepTheGroundTowardAPlaceAndRefuseWhatDoesNotRise() throws ProjectFileException {
        Project ground = Cases.aSportsGround();
        Project hilly = ground.withPlaces(List.of(new Place(
                "VA1",
                Values.NONE,
                List.of(),
                List.of(),
                List.of(new Place.GroundPoint(0, 96), new Place.GroundPoint(1000, 92.5)))));
        String text = new String(ProjectFile.write(hilly), StandardCharsets.UTF_8);
        assertThat(ProjectFile.open(text.getBytes(StandardCharsets.UTF_8)).project())
                .isEqualTo(hilly);
        assertThatThrownBy(() ->
                        ProjectFile.read(text.replace("\"1000.0\"", "\"0.0\"").getBytes(StandardCharsets.UTF_8)))
                .hasMessage("/places/0: Each distance of the ground is larger than the one before; 0.0 is not.");
        assertThatThrownBy(() ->
                        ProjectFile.read(text.replace("\"92.5\"", "\"9200.5\"").getBytes(StandardCharsets.UTF_8)))
                .hasMessage("/places/0/ground/1: A point of the ground lies 0 to 1000000 m away and -430 to 9000 m"
                        + " above the sea, not 1000.0 and 9200.5.");
        assertThat(Difference.applied(ground, Difference.between(ground, hilly)))
                .isEqualTo(hilly);
    }

    @Test
    void refuseAFileThatNoDocumentNames() {
        WholeProject whole = withFiles();
        String text = new String(ProjectFile.write(whole), StandardCharsets.UTF_8);
        Project without = whole.project().withDocuments(List.of());
        String tail = text.substring(text.indexOf("  \"attachments\""));
        String orphaned =
                new String(ProjectFile.write(without), StandardCharsets.UTF_8).replaceFirst("\n}\n$", ",\n") + tail;
        assertThatThrownBy(() -> ProjectFile.open(orphaned.getBytes(StandardCharsets.UTF_8)))
                .hasMessageStartingWith("/attachments: holds a file that no document names: ");
    }

    @Test
    void refuseARepeatedMember() {
        String twice = TEXT.replaceFirst("\"title\"", "\"title\" : \"x\",\n  \"title\"");
        assertThatThrownBy(() -> ProjectFile.read(twice.getBytes(StandardCharsets.UTF_8)))
                .isInstanceOf(ProjectFileException.class)
                .hasMessageStartingWith("The file names a member twice at line 5");
    }

    @Test
    void refuseATruncatedFileAtEveryLength() {
        byte[] whole = TEXT.getBytes(StandardCharsets.UTF_8);
        for (int length = 0; length < whole.length - 2; length += 37) {
            byte[] part = java.util.Arrays.copyOf(whole, length);
            assertThatThrownBy(() -> ProjectFile.read(part))
                    .as("cut after %d bytes", length)
                    .isInstanceOf(ProjectFileException.class);
        }
    }

    @Test
    void refuseWhatIsTooLargeOrTooDeepOrNoText() {
        assertThatThrownBy(() -> ProjectFile.read(new byte[40 * 1024 * 1024]))
                .hasMessageContaining("larger than 25 MB");
        String deep = "{\"a\":".repeat(10_000);
        assertThatThrownBy(() -> ProjectFile.read(deep.getBytes(StandardCharsets.UTF_8)))
                .hasMessageContaining("nested deeper than 32 levels");
        assertThatThrownBy(() -> ProjectFile.read(new byte[] {(byte) 0xC3, 0x28}))
                .hasMessageContaining("UTF-8");
        assertThatThrownBy(() -> ProjectFile.read(new byte[0])).hasMessage("The file is empty.");
        assertThatThrownBy(() -> ProjectFile.read("[]".getBytes(StandardCharsets.UTF_8)))
                .hasMessage("must be an object in braces, not a list.");
    }

    @Test
    void tellAndTakeBackEveryChange() throws ProjectFileException {
        Project before = Cases.aSportsGround();
        Scheme proposed = before.scheme("proposed").orElseThrow();
        LuminaireType first = proposed.types().get(0);
        Stated more = first.values().get("lumens").claimed(Claim.given("90000", "lm", Source.NONE, Party.AUTHORITY));
        Scheme changed = new Scheme(
                "proposed",
                Scheme.Kind.PROPOSED,
                "Mended",
                List.of(
                        new LuminaireType("A3", new Values(Map.of())),
                        new LuminaireType("A1", first.values().with("lumens", more))),
                List.of(proposed.placements().get(1), proposed.placements().get(0)));
        Project after = new Project(
                before.id(),
                "Another name",
                List.of(),
                Values.NONE,
                List.of(before.schemes().get(0), changed),
                List.of(before.places().get(1)));

        List<Difference.Change> changes = Difference.between(before, after);

        assertThat(changes)
                .extracting(Difference.Change::key)
                .contains(
                        "title",
                        "schemes/proposed/name",
                        "schemes/proposed/types/#order",
                        "schemes/proposed/types/A1/values/lumens",
                        "site/latitude",
                        "places/#order",
                        "documents/#order",
                        "documents/D1/title");
        assertThat(Difference.applied(before, changes)).isEqualTo(after);
        assertThat(Difference.applied(
                        after, changes.stream().map(Difference.Change::reversed).toList()))
                .isEqualTo(before);
    }

    @Test
    void doNotTakeBackWhatWasChangedAgain() {
        Project before = Cases.aSportsGround();
        Project renamed = titled(before, "First");
        Project again = titled(before, "Second");
        List<Difference.Change> back = Difference.between(before, renamed).stream()
                .map(Difference.Change::reversed)
                .toList();
        assertThatThrownBy(() -> Difference.applied(again, back))
                .hasMessage("/title: has been changed again since, so it cannot be undone by itself.");
    }

    private static Project titled(Project project, String title) {
        return new Project(
                project.id(), title, project.documents(), project.site(), project.schemes(), project.places());
    }
}
