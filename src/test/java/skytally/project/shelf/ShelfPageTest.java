package skytally.project.shelf;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.UUID;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.project.Cases;
import skytally.project.KeptProject;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.project.shelf.Visitor.Page;
import skytally.project.transfer.ProjectFile;

@DisplayName("The list of projects and their front pages")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class ShelfPageTest {

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    private Visitor visitor;

    @BeforeEach
    void sitDown() {
        visitor = new Visitor(port);
    }

    private KeptProject kept() {
        return projects.add(Copies.withFreshId(Cases.aSportsGround()), Saving.by("A. Planner", "for a test"));
    }

    @Test
    void makesAProjectByItsTitleAndListsIt() throws Exception {
        Page front = visitor.post("/projects", "title", " Car park <b>by</b> the meadow ", "who", "A. Planner");

        assertThat(front.status()).isEqualTo(200);
        assertThat(front.body()).contains("The project is kept.", "Car park &lt;b&gt;by&lt;/b&gt; the meadow</h1>");
        assertThat(front.body()).doesNotContain("<b>by</b>");
        Page list = visitor.get("/projects");
        assertThat(list.body())
                .contains("/projects/" + front.id(), "just now", "aria-current=\"page\"")
                .contains("value=\"A. Planner\"");
        assertThat(Cases.history(projects, UUID.fromString(front.id())).get(0).who())
                .isEqualTo("A. Planner");
    }

    @Test
    void asksForATitleBesideItsFieldAndKeepsNothing() throws Exception {
        int before = projects.list().size();

        Page page = visitor.post("/projects", "title", "  ");
        assertThat(page.status()).isEqualTo(400);
        assertThat(page.body()).contains("Enter a title", "href=\"#title\"", "aria-invalid=\"true\"");
        assertThat(visitor.post("/projects", "title", "x".repeat(401)).body()).contains("400 characters or fewer");
        assertThat(projects.list()).hasSize(before);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/projects/6f1d3c1e-3c4b-4a55-9d8e-0b9d2f6a7c99",
                "/projects/6F1D3C1E-3C4B-4A55-9D8E-0B9D2F6A7C99",
                "/projects/1-1-1-1-1",
                "/projects/no-id",
                "/projects/no-id/file",
                "/projects/no-id/delete",
                "/projects/no-id/history",
                "/projects/6f1d3c1e-3c4b-4a55-9d8e-0b9d2f6a7c99/history/1"
            })
    void hasNoPageForAnIdThatIsNoneOrNotKept(String path) throws Exception {
        Page page = visitor.get(path);

        assertThat(page.status()).isEqualTo(404);
        assertThat(page.body()).contains("There is no such page");
    }

    @Test
    void givesTheFileUnderASafeNameByteForByte() throws Exception {
        KeptProject kept = kept();

        Page file = visitor.get("/projects/" + kept.project().id() + "/file");
        assertThat(file.answer().body()).isEqualTo(ProjectFile.write(kept.project()));
        assertThat(file.answer().headers().firstValue("Content-Disposition"))
                .hasValue("attachment; filename=\"ground-by-the-lane-b.skytally.json\"");
    }

    @Test
    void makesSafeFileNamesOfAnyTitle() {
        assertThat(Copies.fileName("Plätze & Wege / 2")).isEqualTo("platze-wege-2.skytally.json");
        assertThat(Copies.fileName("../../etc\r\nX: y")).isEqualTo("etc-x-y.skytally.json");
        assertThat(Copies.fileName("夜")).isEqualTo("project.skytally.json");
        assertThat(Copies.fileName("a".repeat(400))).hasSize(60 + ".skytally.json".length());
    }

    @Test
    void renamesDuplicatesAndDeletes() throws Exception {
        KeptProject kept = kept();
        String path = "/projects/" + kept.project().id();

        Page renamed = visitor.post(path + "/title", "title", "Renamed", "version", version(path), "who", "B");
        assertThat(renamed.body()).contains("The new title is saved.", "Renamed</h1>");
        Page copy = visitor.post(path + "/copy");
        assertThat(copy.id()).isNotEqualTo(kept.project().id().toString());
        assertThat(copy.body()).contains("Copy of Renamed</h1>");

        Page ask = visitor.get(path + "/delete");
        assertThat(ask.body()).contains("What goes", "Its history of 2 saves goes with it.", "Save it as a file");
        Page list = visitor.post(path + "/delete", "version", ask.version());
        assertThat(list.path()).isEqualTo("/projects?done=deleted");
        assertThat(list.body()).contains("The project and its history are deleted.");
        assertThat(visitor.get(path).status()).isEqualTo(404);
        assertThat(Cases.history(projects, kept.project().id())).isEmpty();
    }

    private String version(String path) throws Exception {
        return visitor.get(path).version();
    }

    @Test
    void sayThatItWasChangedInTheMeantimeAndChangeNothing() throws Exception {
        KeptProject kept = kept();
        UUID id = kept.project().id();
        projects.save(Copies.titled(kept.project(), "First"), kept.version(), Saving.by("", ""));
        String stale = String.valueOf(kept.version());

        for (String path : new String[] {"/title", "/delete", "/history/undo"}) {
            Page clash = visitor.post("/projects/" + id + path, "version", stale, "title", "Second");
            assertThat(clash.status()).as(path).isEqualTo(409);
            assertThat(clash.body()).contains("It was changed in the meantime");
        }
        assertThat(projects.find(id).orElseThrow().project().title()).isEqualTo("First");
    }

    @Test
    void openEachSampleInOneClickAndAgainAsACopy() throws Exception {
        for (String name : new String[] {"ferrin-lane", "sillow-gateway", "ostrel-valley"}) {
            Page first = visitor.post("/projects/samples/" + name);
            assertThat(first.body()).contains("The sample is opened as a project of its own.");
            Page again = visitor.post("/projects/samples/" + name);
            assertThat(again.id()).isNotEqualTo(first.id());
        }
        assertThat(visitor.post("/projects/samples/none").status()).isEqualTo(404);
    }

    @Test
    void openASampleForSixPeopleAtOnce() throws Exception {
        UUID id = Samples.byName("ferrin-lane").orElseThrow().id();
        projects.find(id).ifPresent(kept -> projects.delete(id, kept.version()));
        ExecutorService people = Executors.newFixedThreadPool(6);
        Callable<Page> opening = () -> new Visitor(port).post("/projects/samples/ferrin-lane");
        List<String> opened = new ArrayList<>();
        for (Future<Page> page : people.invokeAll(Collections.nCopies(6, opening))) {
            assertThat(page.get().status()).isEqualTo(200);
            opened.add(page.get().id());
        }
        people.shutdown();
        assertThat(opened).doesNotHaveDuplicates().contains(id.toString());
    }

    @Test
    void opensAFileAndSaysWhenItHoldsWhatIsKeptAlready() throws Exception {
        Project project = Copies.withFreshId(Cases.aSportsGround());

        Page opened = visitor.upload("x.skytally.json", ProjectFile.write(project));
        assertThat(opened.path()).isEqualTo("/projects/" + project.id() + "?done=opened");
        assertThat(opened.body()).contains("D1: Luminaire schedule, revision A, 2026-10-01, from the club");
        Page again = visitor.upload("x.skytally.json", ProjectFile.write(project));
        assertThat(again.path()).endsWith("?done=same");
        assertThat(Cases.history(projects, project.id())).hasSize(1);
    }

    @Test
    void asksBeforeAFileReplacesWhatIsKept() throws Exception {
        KeptProject kept = kept();
        Project other = Copies.titled(kept.project(), "From <i>another</i> computer");

        Page ask = visitor.upload("x.skytally.json", ProjectFile.write(other));
        assertThat(ask.body())
                .contains("This project is kept already", "In the file: From &lt;i&gt;another&lt;/i&gt; computer");
        assertThat(projects.find(other.id()).orElseThrow()).isEqualTo(kept);

        Page both = visitor.post(ask.path() + "/keep-both");
        assertThat(both.id()).isNotEqualTo(other.id().toString());
        assertThat(visitor.get(ask.path()).path()).isEqualTo("/projects?done=gone");

        Page askAgain = visitor.upload("x.skytally.json", ProjectFile.write(other));
        Page replaced = visitor.post(askAgain.path() + "/replace", "version", askAgain.version());
        assertThat(replaced.path()).isEqualTo("/projects/" + other.id() + "?done=replaced");
        assertThat(projects.find(other.id()).orElseThrow().project()).isEqualTo(other);
        assertThat(Cases.history(projects, other.id())).hasSize(2);
    }

    @Test
    void refusesEveryFileThatIsNoneWithThePlaceInIt() throws Exception {
        String good = new String(ProjectFile.write(Copies.withFreshId(Cases.aSportsGround())), StandardCharsets.UTF_8);
        int before = projects.list().size();

        refused(good.substring(0, good.length() / 2), "The file is not whole or not JSON at line");
        refused(good.replace("\"formatVersion\" : 1", "\"formatVersion\" : 2"), "/formatVersion: is 2");
        refused(good.replace("\"formatVersion\" : 1,", ""), "/formatVersion: is missing");
        refused(
                good.replace("\"revision\" : \"A\"", "\"&lt;revision>\" : \"A\""),
                "/documents/0/&amp;lt;revision&gt;: is not known to this version");
        refused(good.replace("\"title\"", "\"title\" : \"x\", \"title\""), "names a member twice at line");
        refused("{\"a\":".repeat(10_000), "nested deeper than 32 levels");
        refused("", "The file is empty.");
        refused(good.replaceFirst("\"title\" : \"[^\"]*\"", "\"title\" : \" \""), "/title: must have 1 to 400");
        Page png = visitor.upload("x.png", new byte[] {(byte) 0x89, 'P', 'N', 'G', 13, 10, 26, 10, 0, 0, 0, 13});
        assertThat(png.status()).isEqualTo(400);
        assertThat(png.body()).contains("The file is not text in UTF-8, so it is no project file.");
        assertThat(visitor.upload("", new byte[0]).body()).contains("Choose a project file");
        assertThat(visitor.post("/projects/open").status()).isEqualTo(415);

        assertThat(projects.list()).hasSize(before);
    }

    private void refused(String text, String message) throws Exception {
        Page page = visitor.upload("x.skytally.json", text.getBytes(StandardCharsets.UTF_8));
        assertThat(page.status()).as(message).isEqualTo(400);
        assertThat(page.body()).contains("The file was not opened, and nothing was kept.", message, "href=\"#file\"");
    }

    @Test
    void refusesFortyMegabytesAndStillAnswers() throws Exception {
        int before = projects.list().size();

        Page page = visitor.upload("x.skytally.json", new byte[40 * 1024 * 1024]);
        assertThat(page.status()).isEqualTo(413);
        assertThat(page.body()).contains("Too much at once");
        assertThat(projects.list()).hasSize(before);
        assertThat(visitor.get("/projects").status()).isEqualTo(200);
    }

    @Test
    void escapesMarkupInEveryTextOnEveryPage() throws Exception {
        String bad = "<img src=x onerror=alert(1)>\\\"'&[[${7*7}]]";
        String file = new String(ProjectFile.write(Copies.withFreshId(Cases.aSportsGround())), StandardCharsets.UTF_8)
                .replaceAll(
                        "(\"(?:title|name|date|revision|from|reason|place|who)\" : )\"[^\"]*\"",
                        "$1\"" + java.util.regex.Matcher.quoteReplacement(bad) + "\"");
        Page front = visitor.upload("x.skytally.json", file.getBytes(StandardCharsets.UTF_8));
        assertThat(front.status()).isEqualTo(200);
        String path = "/projects/" + front.id();
        Page ask = visitor.upload(
                "x.skytally.json", file.replace("\"A2-01\"", "\"A2-02\"").getBytes(StandardCharsets.UTF_8));
        visitor.post(ask.path() + "/replace", "version", ask.version());

        for (Page page : new Page[] {
            front,
            ask,
            visitor.get("/projects"),
            visitor.get(path),
            visitor.get(path + "/delete"),
            visitor.get(path + "/history"),
            visitor.get(path + "/history/1")
        }) {
            assertThat(page.status()).as(page.path()).isEqualTo(200);
            assertThat(page.body())
                    .as(page.path())
                    .contains("&lt;img src=x onerror=alert(1)&gt;")
                    .doesNotContain("<img")
                    .contains("[[${7*7}]]");
        }
    }

    /** Values are text in the file; one that is no number, or beyond all numbers, is shown as it is and never fails. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "<img src=x onerror=alert(1)>",
                "NaN",
                "Infinity",
                "-Infinity",
                "1e308",
                "1e999999999",
                "-1e-400",
                "0x10",
                "999999999999999999999999999999999999999999999999",
                "’; DROP TABLE project; --"
            })
    void answersEveryPageWhateverTheValuesAre(String value) throws Exception {
        String quoted = "\"" + value + "\"";
        String file = new String(
                        ProjectFile.write(
                                Copies.withFreshId(Samples.byName("ferrin-lane").orElseThrow())),
                        StandardCharsets.UTF_8)
                .replaceAll(
                        "(\"(?:value|unit|low|high)\" : )\"[^\"]*\"",
                        "$1" + java.util.regex.Matcher.quoteReplacement(quoted));
        Page opened = visitor.upload("x.skytally.json", file.getBytes(StandardCharsets.UTF_8));
        if (opened.status() == 400) {
            assertThat(opened.body()).contains("The file was not opened, and nothing was kept. /");
            return;
        }
        assertThat(opened.status()).isEqualTo(200);

        List<String> pages = new ArrayList<>(ProjectPages.OF_FERRIN_LANE);
        pages.addAll(ProjectPages.MORE_OF_FERRIN_LANE);
        for (String page : pages) {
            Page answer = visitor.get("/projects/" + opened.id() + page);
            assertThat(answer.status()).as(page).isEqualTo(200);
            assertThat(answer.body()).as(page).doesNotContain("<img");
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"NaN", "Infinity", "1e308", "-1", "360"})
    void refusesADirectionThatIsNone(String bearing) throws Exception {
        int before = projects.list().size();
        String good = new String(ProjectFile.write(Copies.withFreshId(Cases.aSportsGround())), StandardCharsets.UTF_8);

        refused(
                good.replace("\"bearingDeg\" : \"200.0\"", "\"bearingDeg\" : \"" + bearing + "\""),
                "/places/0/looks/0: ");
        refused(good.replace("\"bearingDeg\" : \"200.0\"", "\"bearingDeg\" : NaN"), "not JSON at line");
        assertThat(projects.list()).hasSize(before);
    }

    @Test
    void tellsTheHistoryNewestFirstInWordsAndTakesStepsBack() throws Exception {
        KeptProject kept = kept();
        UUID id = kept.project().id();
        String path = "/projects/" + id + "/history";
        projects.save(Copies.titled(kept.project(), "Second title"), kept.version(), Saving.by("B", "Better words"));

        Page page = visitor.get(path);
        assertThat(page.body())
                .contains("Save 2: Better words", "by B", "Project: Title", "Take back save 2")
                .contains("Save 1: for a test", "by A. Planner")
                .contains("Type A1, What is proposed", "Lumens of each", "96000 lm", "1 other claim beside it")
                .contains("66 °", "assumed; 60 to 70; drawn so");
        assertThat(page.body().indexOf("Save 2")).isLessThan(page.body().indexOf("Save 1"));

        Page undone = visitor.post(path + "/undo", "version", page.version(), "who", "C");
        assertThat(undone.path()).isEqualTo(path + "?done=undone");
        assertThat(undone.body())
                .contains("Takes back save 2.", "Taken back by save 3.", "by C", "There is nothing to take back");
        assertThat(projects.find(id).orElseThrow().project().title())
                .isEqualTo(kept.project().title());
    }

    @Test
    void pagesThroughALongHistoryAndALongSave() throws Exception {
        Project sample = Copies.withFreshId(ProjectFile.read(java.nio.file.Files.readAllBytes(
                java.nio.file.Path.of("sample-projects", "ferrin-lane.skytally.json"))));
        KeptProject kept = projects.add(sample, Saving.by("", ""));
        for (int i = 2; i <= 30; i++) {
            kept = projects.save(Copies.titled(kept.project(), "Title " + i), kept.version(), Saving.by("", ""));
        }
        String path = "/projects/" + sample.id() + "/history";

        Page newest = visitor.get(path);
        assertThat(newest.body()).contains("id=\"step-30\"", "id=\"step-11\"", "before=11");
        assertThat(newest.body()).doesNotContain("id=\"step-10\"");
        Page older = visitor.get(path + "?before=11");
        assertThat(older.body()).contains("id=\"step-10\"", "id=\"step-1\"", "changes of save 1");
        Page whole = visitor.get(path + "/1?from=100");
        assertThat(whole.body()).contains("Changes 101 to 200 of");
        assertThat(visitor.get(path + "/31").status()).isEqualTo(404);
    }
}
