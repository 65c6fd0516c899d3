package skytally.project.documents;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.UUID;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.project.Attachment;
import skytally.project.Attachments;
import skytally.project.Bounds;
import skytally.project.Cases;
import skytally.project.Document;
import skytally.project.KeptProject;
import skytally.project.Pages;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.project.WholeProject;
import skytally.project.transfer.ProjectFile;

@DisplayName("The file of a document")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class DocumentFilesPageTest {

    private static final byte[] PDF = "%PDF-1.7 invented <script>alert(1)</script>".getBytes(StandardCharsets.UTF_8);

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    private Pages pages;
    private UUID id;
    private String at;

    @BeforeEach
    void aSportsGround() {
        pages = new Pages(port);
        Project ground = Cases.aSportsGround();
        Project fresh = new Project(
                UUID.randomUUID(), "Ground", ground.documents(), ground.site(), ground.schemes(), ground.places());
        id = projects.add(fresh, Saving.by("", "")).project().id();
        at = "/projects/" + id;
    }

    private Project project() {
        return projects.find(id).orElseThrow().project();
    }

    private Attachment file(String mark) {
        return project().document(mark).map(Document::file).orElseThrow();
    }

    @Test
    void isKeptAndOnlyEverSaved() throws Exception {
        Pages.Page saved =
                pages.upload(at + "/documents", "C:\\plans\\Plan “3” <b>.pdf", PDF, "mark", "D2", "title", "Site plan");
        assertThat(saved.words()).contains("The document was added.", "Plan “3” &lt;b&gt;.pdf , 43 bytes");
        assertThat(file("D2"))
                .isEqualTo(new Attachment(
                        "Plan “3” <b>.pdf",
                        "application/pdf",
                        PDF.length,
                        file("D2").sha256()));

        HttpResponse<byte[]> back = pages.bytes(at + "/documents/D2/file");
        assertThat(back.body()).isEqualTo(PDF);
        assertThat(back.headers().firstValue("Content-Disposition").orElseThrow())
                .startsWith("attachment;");
        assertThat(back.headers().allValues("X-Content-Type-Options")).containsOnly("nosniff");
        assertThat(back.headers().firstValue("Content-Type")).contains("application/pdf");
        assertThat(pages.bytes(at + "/documents/D1/file").statusCode()).isEqualTo(404);
    }

    @Test
    void isRefusedWhenItIsNotWhatItsNameSaysOrTooLarge() throws Exception {
        refused("page.html", "<html>".getBytes(StandardCharsets.UTF_8), "“page.html” cannot be kept. A file ends in");
        refused("plan.pdf", "<html>".getBytes(StandardCharsets.UTF_8), "“plan.pdf” cannot be kept");
        refused("table.csv", new byte[] {'a', 0, 'b'}, "“table.csv” cannot be kept");
        refused("plan.pdf", new byte[0], "“plan.pdf” is empty.");
        byte[] large = new byte[Bounds.FILE_BYTES + 1];
        System.arraycopy(PDF, 0, large, 0, PDF.length);
        refused("plan.pdf", large, "“plan.pdf” is larger than 5 MB, the most a file may be.");
        assertThat(project().documents()).hasSize(1);
    }

    private void refused(String name, byte[] bytes, String message) throws Exception {
        Pages.Page page = pages.upload(at + "/documents", name, bytes, "mark", "D2", "title", "Site plan");
        assertThat(page.status()).as(name).isEqualTo(400);
        assertThat(page.words()).contains(message);
        assertThat(page.body()).contains("value=\"Site plan\"");
    }

    @Test
    void isAskedForAgainWhenTheFormIsRefusedForAnotherReason() throws Exception {
        Pages.Page page = pages.upload(at + "/documents", "plan.pdf", PDF, "mark", "D2", "title", "");
        assertThat(page.status()).isEqualTo(400);
        assertThat(page.words()).contains("File: choose it again");
    }

    @Test
    void isTakenFromTheLargestToTheWholeProjectAndNotBeyond() throws Exception {
        byte[] most = new byte[Bounds.FILE_BYTES];
        System.arraycopy(PDF, 0, most, 0, PDF.length);
        for (int i = 2; i <= 4; i++) {
            most[PDF.length] = (byte) i;
            assertThat(pages.upload(at + "/documents", "plan.pdf", most, "mark", "D" + i, "title", "Plan")
                            .status())
                    .isEqualTo(200);
        }
        most[PDF.length] = 5;
        Pages.Page page = pages.upload(at + "/documents", "plan.pdf", most, "mark", "D5", "title", "Plan");
        assertThat(page.status()).isEqualTo(400);
        assertThat(page.words()).contains("larger than 25 MB");
        byte[] saved = pages.bytes(at + "/file").body();
        assertThat(saved.length).isLessThan(ProjectFile.LARGEST_BYTES);
        assertThat(ProjectFile.open(saved).project()).isEqualTo(project());
    }

    @Test
    void stepsBackAndGoesIntoTheFileTheCopyAndAnOpenedFile() throws Exception {
        pages.upload(at + "/documents/D1", "plan.pdf", PDF, "doing", "save", "mark", "D1", "title", "Plan");
        byte[] saved = pages.bytes(at + "/file").body();
        WholeProject opened = ProjectFile.open(saved);
        String hash = file("D1").sha256();
        assertThat(opened.project()).isEqualTo(project());
        assertThat(opened.attachments().bytes(hash)).contains(PDF);
        assertThat(ProjectFile.write(opened)).isEqualTo(saved);

        pages.post(at + "/documents/D1", "doing", "save", "mark", "D1", "title", "Plan", "withoutFile", "yes");
        assertThat(project().documents()).extracting(Document::file).containsOnlyNulls();
        KeptProject kept = projects.find(id).orElseThrow();
        projects.undo(id, kept.version(), "");
        assertThat(pages.bytes(at + "/documents/D1/file").body()).isEqualTo(PDF);
        assertThat(pages.bytes(at + "/file").body()).isEqualTo(saved);
        assertThat(pages.get(at + "/history").words()).contains("File", "plan.pdf application/pdf");

        Pages.Page copy = pages.postFrom(pages.get(at), at + "/copy");
        assertThat(copy.status()).isEqualTo(200);
        assertThat(pages.bytes(copy.path() + "/documents/D1/file").body()).isEqualTo(PDF);

        projects.delete(id, projects.find(id).orElseThrow().version());
        assertThat(projects.bytes(id, hash)).isEmpty();
        assertThat(pages.bytes(copy.path() + "/documents/D1/file").body()).isEqualTo(PDF);
        Pages.Page again = pages.uploadTo("/projects", "/projects/open", "x.skytally.json", saved);
        assertThat(again.status()).isEqualTo(200);
        assertThat(pages.bytes(at + "/documents/D1/file").body()).isEqualTo(PDF);
    }

    @Test
    void mustComeWithItsBytes() {
        Project named = project()
                .withDocuments(List.of(new Document("D1", "Plan", "", "", "").with(Attachment.of("plan.pdf", PDF))));
        long version = projects.find(id).orElseThrow().version();
        assertThatThrownBy(() -> projects.save(named, version, Saving.by("", "")))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageStartingWith("The bytes of a file are missing");
        assertThat(projects.find(id).orElseThrow().version()).isEqualTo(version);
        assertThat(Attachments.NONE.hashes()).isEmpty();
    }
}
