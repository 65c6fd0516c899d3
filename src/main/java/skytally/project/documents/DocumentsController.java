package skytally.project.documents;

import jakarta.servlet.http.HttpServletRequest;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import org.springframework.http.ContentDisposition;
import org.springframework.http.HttpHeaders;
import org.springframework.http.HttpStatus;
import org.springframework.http.MediaType;
import org.springframework.http.ResponseEntity;
import org.springframework.stereotype.Controller;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.multipart.MultipartFile;
import org.springframework.web.server.ResponseStatusException;
import org.springframework.web.servlet.ModelAndView;
import skytally.project.Attachment;
import skytally.project.Document;
import skytally.project.KeptProject;
import skytally.project.Project;
import skytally.project.WholeProject;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Typed;
import skytally.project.entry.WhoCookie;
import skytally.project.entry.Words;

/** The papers the project rests on. */
@Controller
@RequestMapping("/projects/{id}/documents")
class DocumentsController {

    private static final String LIST = "project/documents/page";
    private static final String ONE = "project/documents/document";

    private final ProjectDesk desk;
    private final Words words;

    DocumentsController(ProjectDesk desk, Words words) {
        this.desk = desk;
        this.words = words;
    }

    /** A document, how many claims name it, and how large its file is, if it has one. */
    record Line(Document document, long claims, String size) {}

    @GetMapping
    ModelAndView list(@PathVariable UUID id, @RequestParam MultiValueMap<String, String> sent) {
        KeptProject kept = desk.open(id);
        return withList(desk.page(LIST, kept, new Typed(sent)), kept, DocumentForm.blank(kept.version()));
    }

    @PostMapping
    ModelAndView add(
            @PathVariable UUID id,
            @RequestParam MultiValueMap<String, String> sent,
            @RequestParam(name = "file", required = false) @Nullable MultipartFile file,
            HttpServletRequest request)
            throws IOException {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Project project = kept.project();
        SentFile sentFile = SentFile.of(file);
        DocumentForm form = sentFile.into(DocumentForm.sent(kept.version(), typed, words), words);
        if (form.isValid()) {
            try {
                List<Document> more = new ArrayList<>(project.documents());
                more.add(form.document(sentFile.attachment()));
                WholeProject changed = new WholeProject(project.withDocuments(more), sentFile.bytes());
                desk.save(kept, changed, WhoCookie.in(request), "saving.document.added", form.text("mark"));
                return desk.on(kept, "document-added", "documents");
            } catch (IllegalArgumentException refused) {
                form = form.refused("mark", String.valueOf(refused.getMessage()));
            }
        }
        return withList(desk.refusal(LIST, kept), kept, form);
    }

    /** The file itself: only ever to be saved, never to be shown, whatever is in it. */
    @GetMapping("/{mark}/file")
    ResponseEntity<byte[]> file(@PathVariable UUID id, @PathVariable String mark) {
        Attachment file = document(desk.open(id), mark).file();
        if (file == null) {
            throw new ResponseStatusException(HttpStatus.NOT_FOUND);
        }
        ContentDisposition saved = ContentDisposition.attachment()
                .filename(file.name(), StandardCharsets.UTF_8)
                .build();
        return ResponseEntity.ok()
                .contentType(MediaType.parseMediaType(file.mediaType()))
                .header(HttpHeaders.CONTENT_DISPOSITION, saved.toString())
                .header("X-Content-Type-Options", "nosniff")
                .body(desk.bytes(id, file));
    }

    @GetMapping("/{mark}")
    ModelAndView one(
            @PathVariable UUID id, @PathVariable String mark, @RequestParam MultiValueMap<String, String> sent) {
        KeptProject kept = desk.open(id);
        Document document = document(kept, mark);
        return withOne(
                desk.page(ONE, kept, new Typed(sent)), kept, document, DocumentForm.of(kept.version(), document));
    }

    @PostMapping(path = "/{mark}", params = "doing=save")
    ModelAndView save(
            @PathVariable UUID id,
            @PathVariable String mark,
            @RequestParam MultiValueMap<String, String> sent,
            @RequestParam(name = "file", required = false) @Nullable MultipartFile file,
            HttpServletRequest request)
            throws IOException {
        Typed typed = new Typed(sent);
        KeptProject kept = desk.openForChange(id, typed);
        Project project = kept.project();
        Document before = document(kept, mark);
        SentFile sentFile = SentFile.of(file);
        DocumentForm form = sentFile.into(DocumentForm.sent(kept.version(), typed, words), words);
        if (form.isValid()) {
            try {
                Document after = form.document(sentFile.instead(typed.has("withoutFile") ? null : before.file()));
                Project changed = Citing.renamed(project, mark, after.mark())
                        .withDocuments(project.documents().stream()
                                .map(document -> document.equals(before) ? after : document)
                                .toList());
                desk.save(
                        kept,
                        new WholeProject(changed, sentFile.bytes()),
                        WhoCookie.in(request),
                        "saving.document.changed",
                        mark);
                return desk.on(kept, "saved", "documents");
            } catch (IllegalArgumentException refused) {
                form = form.refused("mark", String.valueOf(refused.getMessage()));
            }
        }
        return withOne(desk.refusal(ONE, kept), kept, before, form);
    }

    @PostMapping(path = "/{mark}", params = "doing=remove")
    ModelAndView remove(
            @PathVariable UUID id,
            @PathVariable String mark,
            @RequestParam MultiValueMap<String, String> sent,
            HttpServletRequest request) {
        KeptProject kept = desk.openForChange(id, new Typed(sent));
        Document document = document(kept, mark);
        long claims = Citing.count(kept.project(), mark);
        if (claims > 0) {
            DocumentForm form = DocumentForm.of(kept.version(), document)
                    .refused("remove", words.say("documents.remove.not", claims));
            return withOne(desk.refusal(ONE, kept), kept, document, form);
        }
        desk.save(
                kept,
                kept.project()
                        .withDocuments(kept.project().documents().stream()
                                .filter(other -> !other.equals(document))
                                .toList()),
                WhoCookie.in(request),
                "saving.document.removed",
                mark);
        return desk.on(kept, "document-removed", "documents");
    }

    private static Document document(KeptProject kept, String mark) {
        return kept.project().document(mark).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }

    private static ModelAndView withList(ModelAndView page, KeptProject kept, DocumentForm form) {
        Project project = kept.project();
        return page.addObject("form", form)
                .addObject(
                        "lines",
                        project.documents().stream()
                                .map(document ->
                                        new Line(document, Citing.count(project, document.mark()), size(document)))
                                .toList());
    }

    private static String size(Document document) {
        Attachment file = document.file();
        return file == null ? "" : SentFile.size(file.size());
    }

    private static ModelAndView withOne(ModelAndView page, KeptProject kept, Document document, DocumentForm form) {
        return page.addObject("form", form)
                .addObject("document", document)
                .addObject("size", size(document))
                .addObject("claims", Citing.count(kept.project(), document.mark()));
    }
}
