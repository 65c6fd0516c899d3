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
import skytally.project.Cases;
import skytally.project.Claim;
import skytally.project.LuminaireType;
import skytally.project.Party;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;

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
