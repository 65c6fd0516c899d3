package skytally.project.shelf;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.time.Clock;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.UUID;
import org.springframework.context.MessageSource;
import org.springframework.http.ContentDisposition;
import org.springframework.http.HttpHeaders;
import org.springframework.http.HttpStatus;
import org.springframework.http.MediaType;
import org.springframework.http.ResponseEntity;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.servlet.ModelAndView;
import skytally.project.KeptProject;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.project.WholeProject;
import skytally.project.entry.WhoCookie;
import skytally.project.entry.Words;
import skytally.project.transfer.ProjectFile;
import skytally.web.InvalidInputException.Fault;

/** The front page of a project, and what is done to it as a whole. */
@Controller
@RequestMapping("/projects/{id}")
class FrontController {

    /** What may have been done just now, as a word in the address. */
    private static final Set<String> DONE =
            Set.of("added", "opened", "same", "replaced", "sample", "kept", "renamed", "copied", "undone");

    private final Projects projects;
    private final MessageSource messages;
    private final Words words;
    private final Clock clock = Clock.systemUTC();

    FrontController(Projects projects, MessageSource messages, Words words) {
        this.projects = projects;
        this.messages = messages;
        this.words = words;
    }

    @GetMapping
    ModelAndView front(
            @PathVariable String id,
            @RequestParam(defaultValue = "") String done,
            @RequestParam(defaultValue = "") String scheme,
            HttpServletRequest request) {
        KeptProject kept = projects.require(id);
        ModelAndView page = page(kept, scheme, kept.project().title(), List.of(), request);
        page.addObject("done", DONE.contains(done) ? done : null);
        return page;
    }

    private ModelAndView page(
            KeptProject kept, String scheme, String typedTitle, List<Fault> faults, HttpServletRequest request) {
        ModelAndView page = new ModelAndView("project/front");
        page.addObject("kept", kept);
        page.addObject("complete", CompletePart.of(kept.project(), scheme, words));
        page.addObject("holding", Holding.of(kept.project()));
        page.addObject("changed", Ago.of(kept.changedAt(), clock.instant()));
        page.addObject("typedTitle", typedTitle);
        page.addObject("who", WhoCookie.in(request));
        page.addObject("faults", faults);
        if (!faults.isEmpty()) {
            page.setStatus(HttpStatus.BAD_REQUEST);
        }
        return page;
    }

    @GetMapping("/file")
    ResponseEntity<byte[]> file(@PathVariable String id) {
        Project project = projects.require(id).project();
        ContentDisposition saved = ContentDisposition.attachment()
                .filename(Copies.fileName(project.title()))
                .build();
        return ResponseEntity.ok()
                .contentType(MediaType.APPLICATION_JSON)
                .header(HttpHeaders.CONTENT_DISPOSITION, saved.toString())
                .body(ProjectFile.write(projects.whole(project)));
    }

    @PostMapping("/title")
    ModelAndView rename(
            @PathVariable String id,
            @RequestParam(defaultValue = "") String title,
            @RequestParam(defaultValue = "") String who,
            @RequestParam long version,
            HttpServletRequest request,
            HttpServletResponse response) {
        KeptProject kept = projects.require(id);
        List<Fault> faults = ShelfController.titleFaults(title, messages);
        if (!faults.isEmpty()) {
            return page(kept, "", title, faults, request);
        }
        String name = WhoCookie.taken(who, response);
        projects.save(Copies.titled(kept.project(), title.strip()), version, Saving.by(name, say("shelf.why.renamed")));
        return to(kept.project().id(), "renamed");
    }

    @PostMapping("/copy")
    ModelAndView copy(@PathVariable String id, HttpServletRequest request) {
        Project project = projects.require(id).project();
        Project copy = Copies.titled(Copies.withFreshId(project), Copies.copyTitle(project.title()));
        projects.add(
                new WholeProject(copy, projects.whole(project).attachments()),
                Saving.by(WhoCookie.in(request), say("shelf.why.copied")));
        return to(copy.id(), "copied");
    }

    @GetMapping("/delete")
    ModelAndView askBeforeDeleting(@PathVariable String id) {
        KeptProject kept = projects.require(id);
        ModelAndView page = new ModelAndView("project/delete");
        page.addObject("kept", kept);
        page.addObject("holding", Holding.of(kept.project()));
        page.addObject("steps", projects.countSteps(kept.project().id()));
        return page;
    }

    @PostMapping("/delete")
    ModelAndView delete(@PathVariable String id, @RequestParam long version) {
        projects.delete(projects.require(id).project().id(), version);
        return new ModelAndView("redirect:/projects?done=deleted");
    }

    private static ModelAndView to(UUID id, String done) {
        return new ModelAndView("redirect:/projects/" + id + "?done=" + done);
    }

    private String say(String key) {
        return messages.getMessage(key, null, Locale.ENGLISH);
    }
}
